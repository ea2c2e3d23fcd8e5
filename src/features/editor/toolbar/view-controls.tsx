/** Undo, redo, zoom and help under the drawing. */
import type { ReactNode } from 'react'
import { IconButton } from '@/components/icon-button'
import { useLayoutStore } from '@/stores/layout-store'
import { chordText } from '../actions/action'
import { actionById } from '../actions/all-actions'
import { useBenchActions } from '../bench-actions'

function shortcutOf(id: string): string {
  const [chord] = actionById(id).chords
  return chord ? ` (${chordText(chord)})` : ''
}

function HistoryControls() {
  const { run } = useBenchActions()
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  const canUndo = useLayoutStore((state) => state.canUndo)
  const canRedo = useLayoutStore((state) => state.canRedo)
  const undoLabel = useLayoutStore((state) => state.undoLabel)
  const redoLabel = useLayoutStore((state) => state.redoLabel)
  if (!canEdit) return null
  return (
    <span className="contents max-md:hidden">
      <IconButton
        icon="undo"
        label={`Undo${undoLabel ? `: ${undoLabel}` : ''}${shortcutOf('undo')}`}
        disabled={!canUndo}
        onClick={() => run(actionById('undo'))}
      />
      <IconButton
        icon="redo"
        label={`Redo${redoLabel ? `: ${redoLabel}` : ''}${shortcutOf('redo')}`}
        disabled={!canRedo}
        onClick={() => run(actionById('redo'))}
      />
    </span>
  )
}

const TEXT_BUTTON =
  'flex h-8 min-w-8 items-center justify-center rounded px-2 text-[13px] font-semibold text-ink hover:bg-steel-soft'

export function ViewControls({ children }: { children?: ReactNode }) {
  const { run } = useBenchActions()
  return (
    <div role="group" aria-label="View" className="ml-auto flex shrink-0 items-center">
      <HistoryControls />
      <button
        type="button"
        className={TEXT_BUTTON}
        aria-label="Zoom out"
        title={`Zoom out${shortcutOf('zoom-out')}`}
        onClick={() => run(actionById('zoom-out'))}
      >
        −
      </button>
      <button
        type="button"
        className={TEXT_BUTTON}
        aria-label="Zoom in"
        title={`Zoom in${shortcutOf('zoom-in')}`}
        onClick={() => run(actionById('zoom-in'))}
      >
        +
      </button>
      <button
        type="button"
        className={TEXT_BUTTON}
        title={`Show the whole shaft${shortcutOf('zoom-to-whole')}`}
        onClick={() => run(actionById('zoom-to-whole'))}
      >
        Whole
      </button>
      <button
        type="button"
        className={`${TEXT_BUTTON} max-md:hidden`}
        aria-label="Keyboard shortcuts"
        title={`Keyboard shortcuts${shortcutOf('help')}`}
        onClick={() => run(actionById('help'))}
      >
        ?
      </button>
      {children}
    </div>
  )
}
