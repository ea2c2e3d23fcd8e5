import { useState } from 'react'
import type { HttpError } from '@/lib/http-client'

/** State of a form that sends itself without the query cache; what was typed stays in the form. */
export function useSubmission() {
  const [isBusy, setIsBusy] = useState(false)
  const [error, setError] = useState<HttpError | Error | null>(null)

  const submit = async (send: () => Promise<void>): Promise<boolean> => {
    setIsBusy(true)
    setError(null)
    try {
      await send()
      return true
    } catch (thrown) {
      setError(thrown instanceof Error ? thrown : new Error('unknown'))
      return false
    } finally {
      setIsBusy(false)
    }
  }
  return { isBusy, error, submit }
}
