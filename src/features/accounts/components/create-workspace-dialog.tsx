import { Dialog } from '@/components/dialog'
import { CreateWorkspaceForm } from './create-workspace-form'

export function CreateWorkspaceDialog({
  onCreated,
  onClose,
}: {
  onCreated: (workspaceId: string) => void
  onClose: () => void
}) {
  return (
    <Dialog title="New workspace" description="You become its admin." size="sm" onClose={onClose}>
      <CreateWorkspaceForm
        onCreated={(workspaceId) => {
          onClose()
          onCreated(workspaceId)
        }}
      />
    </Dialog>
  )
}
