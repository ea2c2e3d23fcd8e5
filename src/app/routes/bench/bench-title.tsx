/** Where one is, in the bar: workspace, layout, revision and status, and whether all edits are saved. */
import { useState } from 'react'
import { Link } from 'react-router'
import { Button } from '@/components/button'
import { Dialog } from '@/components/dialog'
import { Icon } from '@/components/icon'
import { TextField } from '@/components/text-field'
import { paths } from '@/config/paths'
import { SavingChip } from '@/features/collaboration/saving-chip'
import { commitEdit } from '@/features/editor/commit-edit'
import { useLayoutSession } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'
import { nameSchema } from '@shared/layout/layout-document'
import type { LayoutStatus } from '@shared/protocol/layouts'
import { useWorkspace } from '../../workspace-context'

const STATUS_WORDS: Record<LayoutStatus, string> = {
  draft: 'Draft',
  inReview: 'In review',
  released: 'Released',
  withdrawn: 'Withdrawn',
}

export function BenchTitle() {
  const workspace = useWorkspace()
  const name = useLayoutStore((state) => state.visible?.name ?? 'Layout')
  const status = useLayoutStore((state) => state.access?.status ?? null)
  const letter = useLayoutStore((state) => state.access?.revisionLetter ?? '')
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  const [isRenaming, setIsRenaming] = useState(false)
  return (
    <>
      <nav aria-label="Where you are" className="flex min-w-0 items-baseline gap-2 text-sm">
        <Link
          to={paths.layouts(workspace.id)}
          className="shrink-0 rounded text-bar-quiet hover:text-bar-ink max-lg:hidden"
        >
          {workspace.name}
        </Link>
        <span aria-hidden="true" className="text-bar-quiet max-lg:hidden">
          /
        </span>
        <h1 className="truncate font-semibold" title={name}>
          {name}
        </h1>
      </nav>
      {canEdit && (
        <button
          type="button"
          aria-label="Rename the layout"
          title="Rename the layout"
          className="-ml-2 shrink-0 rounded p-1 text-bar-quiet hover:text-bar-ink max-md:hidden"
          onClick={() => setIsRenaming(true)}
        >
          <Icon name="edit" className="size-3.5" />
        </button>
      )}
      {status && (
        <span className="inline-flex shrink-0 items-center gap-1 rounded-full bg-bar-line px-2.5 py-0.5 text-[13px] font-semibold whitespace-nowrap text-straw-bright">
          {(status === 'released' || status === 'withdrawn') && <Icon name="lock" className="size-3" />}
          <span className={status === 'draft' ? 'max-sm:hidden' : ''}>{STATUS_WORDS[status]}</span> {letter}
        </span>
      )}
      <SavingChip />
      {isRenaming && <RenameDialog name={name} onClose={() => setIsRenaming(false)} />}
    </>
  )
}

function RenameDialog({ name, onClose }: { name: string; onClose: () => void }) {
  const session = useLayoutSession()
  const [text, setText] = useState(name)
  const [error, setError] = useState<string | undefined>(undefined)
  const rename = () => {
    const parsed = nameSchema.safeParse(text)
    if (!parsed.success) {
      setError(parsed.error.issues[0]?.message ?? 'Give it a name')
      return
    }
    commitEdit(session, 'Rename the layout', [
      { type: 'set', target: { kind: 'layout' }, field: 'name', before: name, value: parsed.data },
    ])
    onClose()
  }
  return (
    <Dialog
      title="Rename the layout"
      size="sm"
      onClose={onClose}
      footer={
        <>
          <Button variant="quiet" onClick={onClose}>
            Cancel
          </Button>
          <Button variant="primary" onClick={rename}>
            Rename
          </Button>
        </>
      }
    >
      <form
        onSubmit={(event) => {
          event.preventDefault()
          rename()
        }}
      >
        <TextField
          label="Name"
          value={text}
          error={error}
          onChange={(event) => setText(event.target.value)}
        />
      </form>
    </Dialog>
  )
}
