import { type DragEvent, useState } from 'react'
import { useNavigate } from 'react-router'
import { Button } from '@/components/button'
import { Icon } from '@/components/icon'
import { paths } from '@/config/paths'
import { LayoutBrowser } from '@/features/layouts/components/layout-browser'
import { NewLayoutDialog, type NewLayoutSource } from '@/features/layouts/components/new-layout-dialog'
import { readLayoutFile, type ReadLayoutFile } from '@/features/layouts/read-layout-file'
import { roleCovers } from '@shared/protocol/roles'
import { PageHeading } from '../../page-heading'
import { useWorkspace } from '../../workspace-context'

const holdsFiles = (event: DragEvent) => event.dataTransfer.types.includes('Files')

export default function LayoutsRoute() {
  const workspace = useWorkspace()
  const navigate = useNavigate()
  const [creating, setCreating] = useState<{ source: NewLayoutSource; file: ReadLayoutFile | null } | null>(
    null,
  )
  const canEdit = roleCovers(workspace.role, 'designer')
  const start = (source: NewLayoutSource) => setCreating({ source, file: null })

  const takeFile = async (file: File | undefined) => {
    if (file) setCreating({ source: 'file', file: await readLayoutFile(file) })
  }

  return (
    <div
      className="min-h-full"
      onDragOver={(event) => {
        if (canEdit && holdsFiles(event)) event.preventDefault()
      }}
      onDrop={(event) => {
        if (!canEdit || !holdsFiles(event)) return
        event.preventDefault()
        void takeFile(event.dataTransfer.files[0])
      }}
    >
      <PageHeading
        title="Layouts"
        actions={
          canEdit && (
            <>
              <Button icon={<Icon name="upload" />} onClick={() => start('file')}>
                Import
              </Button>
              <Button variant="primary" icon={<Icon name="add" />} onClick={() => start('blank')}>
                New layout
              </Button>
            </>
          )
        }
      />
      <LayoutBrowser
        workspaceId={workspace.id}
        canEdit={canEdit}
        startActions={
          canEdit && (
            <>
              <Button variant="primary" onClick={() => start('example')}>
                Start from an example
              </Button>
              <Button onClick={() => start('blank')}>Blank layout</Button>
            </>
          )
        }
      />
      {creating && (
        <NewLayoutDialog
          workspaceId={workspace.id}
          initialSource={creating.source}
          initialFile={creating.file}
          onCreated={(layout) => void navigate(paths.bench(workspace.id, layout.id))}
          onClose={() => setCreating(null)}
        />
      )}
    </div>
  )
}
