import { ConfirmDialog } from '@/components/confirm-dialog'
import { showToast } from '@/components/toast-store'
import { messageOf } from '@/lib/http-client'
import { nextRevisionLetter } from '@shared/protocol/revision-letter'
import { useNextRevision } from '../api/change-status'

export function NextRevisionDialog({
  workspaceId,
  layoutId,
  letter,
  onStarted,
  onClose,
}: {
  workspaceId: string
  layoutId: string
  letter: string
  onStarted?: () => void
  onClose: () => void
}) {
  const start = useNextRevision(workspaceId, layoutId)
  const next = nextRevisionLetter(letter)
  return (
    <ConfirmDialog
      title={`Start revision ${next}`}
      confirmLabel={`Start revision ${next}`}
      isBusy={start.isPending}
      error={start.error ? messageOf(start.error) : null}
      onConfirm={() =>
        start.mutate(undefined, {
          onSuccess: () => {
            showToast(`Revision ${next} is a draft now.`)
            onClose()
            onStarted?.()
          },
        })
      }
      onClose={onClose}
    >
      <p>
        Revision {next} starts as a draft with everything that revision {letter} has. Release {letter} stays
        as it is, with its sheet.
      </p>
    </ConfirmDialog>
  )
}
