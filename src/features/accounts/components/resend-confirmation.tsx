import { Button } from '@/components/button'
import { messageOf } from '@/lib/http-client'
import { useState } from 'react'
import { sendConfirmation } from '../api/auth-endpoints'
import { useSubmission } from '../hooks/use-submission'

export function ResendConfirmation({ email, next }: { email: string; next: string | null }) {
  const { isBusy, error, submit } = useSubmission()
  const [isSent, setIsSent] = useState(false)
  return (
    <div className="mt-2 grid justify-items-start gap-2">
      <Button
        size="sm"
        isBusy={isBusy}
        onClick={() => void submit(() => sendConfirmation(email, next)).then(setIsSent)}
      >
        Send the mail again
      </Button>
      <p role="status" className="text-[13px]">
        {error ? messageOf(error) : isSent ? 'Sent. It can take a minute.' : ''}
      </p>
    </div>
  )
}
