import { useId, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { Dialog } from '@/components/dialog'
import { TextAreaField } from '@/components/text-area-field'
import { showToast } from '@/components/toast-store'
import { formErrors } from '@/lib/form-errors'
import { useAskReview } from '../api/change-status'

export function ReviewDialog({
  workspaceId,
  layoutId,
  letter,
  onClose,
}: {
  workspaceId: string
  layoutId: string
  letter: string
  onClose: () => void
}) {
  const [note, setNote] = useState('')
  const formId = useId()
  const ask = useAskReview(workspaceId, layoutId)
  const errors = formErrors(ask.error, ['note'])
  return (
    <Dialog
      title={`Ask for review of revision ${letter}`}
      size="sm"
      onClose={onClose}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button variant="primary" type="submit" form={formId} isBusy={ask.isPending}>
            Ask for review
          </Button>
        </>
      }
    >
      <form
        id={formId}
        className="grid gap-4 text-sm"
        onSubmit={(event) => {
          event.preventDefault()
          ask.mutate(note.trim(), {
            onSuccess: () => {
              showToast('Review is asked. The team gets an e-mail.')
              onClose()
            },
          })
        }}
      >
        <p>
          The layout goes on the release desk and the team gets an e-mail. It can still be edited, and anyone
          who edits it can take the question back.
        </p>
        {errors.form && <Banner tone="bad">{errors.form}</Banner>}
        <TextAreaField
          label="Note for the reviewer"
          hint="Optional"
          value={note}
          maxLength={1000}
          error={errors.fields.note}
          onChange={(event) => setNote(event.target.value)}
        />
      </form>
    </Dialog>
  )
}
