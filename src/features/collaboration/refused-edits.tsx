/** Edits the server did not take. They stay for their author, who can save them as a file or let them go. */
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { saveBlob } from '@/lib/download'
import { useLayoutSession } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'
import type { RefusedEdit } from '@/stores/layout-state'

function saveAsFile(edits: readonly RefusedEdit[], layoutName: string): void {
  const content = edits.map(({ label, reason, message, operations }) => ({
    label,
    reason,
    message,
    operations,
  }))
  const blob = new Blob([JSON.stringify(content, null, 2)], { type: 'application/json' })
  saveBlob(blob, `${layoutName.replace(/[^\p{L}\p{N}]+/gu, '-').slice(0, 60)}-refused-edits.json`)
}

export function RefusedEdits() {
  const session = useLayoutSession()
  const edits = useLayoutStore((state) => state.refusedEdits)
  const layoutName = useLayoutStore((state) => state.visible?.name ?? 'layout')
  if (edits.length === 0) return null
  return (
    <Banner
      tone="bad"
      title={edits.length === 1 ? 'One edit was not taken' : `${edits.length} edits were not taken`}
      action={
        <Button size="sm" onClick={() => saveAsFile(edits, layoutName)}>
          Save as file
        </Button>
      }
    >
      <ul className="mt-1 flex flex-col gap-1" data-testid="refused-edits">
        {edits.map((edit) => (
          <li key={edit.editId} className="flex items-baseline justify-between gap-3">
            <span>
              <span className="font-semibold">{edit.label}</span>: {edit.message}
            </span>
            <button
              type="button"
              className="shrink-0 font-semibold text-steel underline"
              onClick={() => session.dismissRefused(edit.editId)}
            >
              Let go
            </button>
          </li>
        ))}
      </ul>
    </Banner>
  )
}
