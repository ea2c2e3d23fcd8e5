import { useState } from 'react'
import { useNavigate } from 'react-router'
import { Icon } from '@/components/icon'
import { Menu } from '@/components/menu'
import { paths } from '@/config/paths'
import { CreateWorkspaceDialog } from '@/features/accounts/components/create-workspace-dialog'
import { useSignedIn, useNearestWorkspace } from '../workspace-context'

export function WorkspaceSwitcher() {
  const { workspaces } = useSignedIn()
  const current = useNearestWorkspace()
  const navigate = useNavigate()
  const [isCreating, setIsCreating] = useState(false)
  const open = (workspaceId: string) => void navigate(paths.layouts(workspaceId))

  return (
    <>
      <Menu
        label="Workspace"
        align="start"
        buttonClassName="flex min-w-0 items-center gap-2 rounded-md border border-bar-line px-2.5 py-1.5 text-sm font-semibold hover:bg-bar-line/50"
        button={
          <>
            <span className="max-w-40 truncate">{current?.name ?? 'Choose a workspace'}</span>
            <Icon name="chevronDown" className="size-3.5" />
          </>
        }
        items={[
          ...workspaces.map((workspace) => ({
            kind: 'choice' as const,
            label: workspace.name,
            isChosen: workspace.id === current?.id,
            onSelect: () => open(workspace.id),
          })),
          { kind: 'separator' },
          { label: 'New workspace', icon: 'add', onSelect: () => setIsCreating(true) },
        ]}
      />
      {isCreating && <CreateWorkspaceDialog onCreated={open} onClose={() => setIsCreating(false)} />}
    </>
  )
}
