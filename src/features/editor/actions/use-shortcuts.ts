/**
 * The keyboard of the bench. Keys typed into a field, a menu or a dialog are not shortcuts, and
 * copying marked text stays copying text.
 */
import { useEffect } from 'react'
import { useLayoutStore } from '@/stores/layout-store'
import { useSelectionStore } from '@/stores/selection-store'
import { useViewStore } from '../view-store'
import { type ActionContext, matchesChord } from './action'
import { ALL_ACTIONS } from './all-actions'
import { type Nudger, nudgeStepMm } from './nudge'

// The outline is a list of parts, not a field: what it does not use itself are shortcuts.
const FIELD = 'input, textarea, select, [contenteditable], dialog, [role=menu]'
const OWN_ARROWS = '[role=tablist], [role=radiogroup], [role=separator], [role=slider], [data-own-arrows]'

const isIn = (event: KeyboardEvent, selector: string) =>
  event.target instanceof Element && event.target.closest(selector) !== null

export function useShortcuts(context: () => ActionContext | null, nudger: Nudger): void {
  useEffect(() => {
    const onArrow = (event: KeyboardEvent): boolean => {
      if (event.key !== 'ArrowLeft' && event.key !== 'ArrowRight') return false
      if (event.ctrlKey || event.metaKey || isIn(event, OWN_ARROWS)) return false
      const { access, visible, preview } = useLayoutStore.getState()
      const { selectedIds } = useSelectionStore.getState()
      if (!access?.canEdit || !visible || selectedIds.length === 0) return false
      // Somebody else's preview, such as a drag in hand or a half-typed number, is not built upon.
      if (preview && !nudger.isOpen()) return false
      const mmPerPx = 1 / useViewStore.getState().view.pxPerMm
      const step = nudgeStepMm({ shift: event.shiftKey, alt: event.altKey }, mmPerPx)
      return nudger.nudge(visible, selectedIds, event.key === 'ArrowLeft' ? -step : step)
    }

    const onKeyDown = (event: KeyboardEvent) => {
      if (event.defaultPrevented || isIn(event, FIELD)) return
      const now = context()
      if (!now) return
      now.driver.modifiers({
        shift: event.shiftKey,
        alt: event.altKey,
        control: event.ctrlKey || event.metaKey,
      })
      if (event.key === ' ' && !isIn(event, 'button, a, summary, [role=option]')) {
        event.preventDefault()
        now.driver.holdPan(true)
        return
      }
      if (event.key === 'Escape' && nudger.cancel()) return
      if (onArrow(event)) {
        event.preventDefault()
        return
      }
      const action = ALL_ACTIONS.find(({ chords }) => chords.some((chord) => matchesChord(event, chord)))
      if (!action) return
      const isTextCopy = action.id === 'copy' && (window.getSelection()?.toString() ?? '') !== ''
      if (isTextCopy) return
      nudger.settle()
      const settled = context()
      if (!settled || !action.isAvailable(settled)) return
      event.preventDefault()
      action.perform(settled)
    }

    const onKeyUp = (event: KeyboardEvent) => {
      const now = context()
      if (!now) return
      now.driver.modifiers({
        shift: event.shiftKey,
        alt: event.altKey,
        control: event.ctrlKey || event.metaKey,
      })
      if (event.key === ' ') now.driver.holdPan(false)
      // Alt alone would move the focus into the browser's menu.
      if (event.key === 'Alt') event.preventDefault()
    }

    const onBlur = () => {
      nudger.settle()
      context()?.driver.holdPan(false)
    }
    window.addEventListener('keydown', onKeyDown)
    window.addEventListener('keyup', onKeyUp)
    window.addEventListener('blur', onBlur)
    return () => {
      window.removeEventListener('keydown', onKeyDown)
      window.removeEventListener('keyup', onKeyUp)
      window.removeEventListener('blur', onBlur)
      nudger.settle()
    }
  }, [context, nudger])
}
