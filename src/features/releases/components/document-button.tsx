import { useState } from 'react'
import { Button, type ButtonSize, type ButtonVariant } from '@/components/button'
import { Icon } from '@/components/icon'
import { showToast } from '@/components/toast-store'
import { download } from '@/lib/download'
import { messageOf } from '@/lib/http-client'

/** Saves a document of a release; a refusal becomes a message, never a saved error page. */
export function DocumentButton({
  releaseId,
  file,
  label,
  variant,
  size,
}: {
  releaseId: string
  file: 'sheet.pdf' | 'document.json'
  label: string
  variant?: ButtonVariant
  size?: ButtonSize
}) {
  const [isBusy, setIsBusy] = useState(false)
  const save = async () => {
    setIsBusy(true)
    try {
      await download(`/api/releases/${releaseId}/${file}`, file)
    } catch (error) {
      showToast(messageOf(error), 'bad')
    } finally {
      setIsBusy(false)
    }
  }
  return (
    <Button
      variant={variant}
      size={size}
      icon={<Icon name="download" />}
      isBusy={isBusy}
      onClick={() => void save()}
    >
      {label}
    </Button>
  )
}
