/**
 * Shifts by arrow keys. While a key is held or pressed again quickly the shift is a preview that
 * grows; letting go commits it as one edit, so that ten presses are one undo step.
 */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import { sectionSpans } from '@shared/layout/shaft-geometry'
import type { LayoutSession } from '@/sync/layout-session'
import { commitEdit } from '../commit-edit'
import { movableIds, moveLabel, movePartsOperations } from '../tools/move-parts'
import { partName, roundMm } from '../tools/part'
import { moveStepOperations } from '../tools/resize-part'
import { gridStepMm } from '../tools/snapping'

/** After this long without another press the shift is one finished edit. */
const SETTLE_MS = 450

export interface NudgeModifiers {
  shift: boolean
  alt: boolean
}

export const nudgeStepMm = ({ shift, alt }: NudgeModifiers, mmPerPx: number): number =>
  alt ? 0.1 : shift ? 10 : Math.max(1, gridStepMm(mmPerPx))

/** Hubs and bearings shift; of a lone section the right step moves. */
export function nudgeEdit(
  document: LayoutDocument,
  ids: readonly string[],
  deltaMm: number,
): { label: string; operations: Operation[] } | null {
  const movable = movableIds(document, ids)
  if (movable.length > 0) {
    return {
      label: moveLabel(document, movable),
      operations: movePartsOperations(document, movable, deltaMm),
    }
  }
  const [only] = ids
  const span = sectionSpans(document).find(({ section }) => section.id === only)
  if (!span || ids.length !== 1) return null
  return {
    label: `Change length of ${partName(document, span.section.id)}`,
    operations: moveStepOperations(document, span.section.id, roundMm(span.endMm + deltaMm), false),
  }
}

export interface Nudger {
  /** True while the preview on screen is the nudge's own. */
  isOpen: () => boolean
  nudge: (document: LayoutDocument, ids: readonly string[], deltaMm: number) => boolean
  /** Escape: nothing has happened. */
  cancel: () => boolean
  /** Commits what is open, at once. */
  settle: () => void
}

export function createNudger(session: LayoutSession): Nudger {
  let open: { start: LayoutDocument; ids: readonly string[]; deltaMm: number } | null = null
  let timer: ReturnType<typeof setTimeout> | undefined

  const settle = () => {
    clearTimeout(timer)
    if (!open) return
    const edit = nudgeEdit(open.start, open.ids, open.deltaMm)
    open = null
    if (edit && edit.operations.length > 0) commitEdit(session, edit.label, edit.operations)
    else session.clearPreview()
  }

  return {
    isOpen: () => open !== null,
    nudge(document, ids, deltaMm) {
      const isSame = open !== null && open.ids.join() === ids.join()
      if (!isSame) settle()
      open =
        isSame && open
          ? { ...open, deltaMm: roundMm(open.deltaMm + deltaMm) }
          : { start: document, ids, deltaMm }
      const edit = nudgeEdit(open.start, open.ids, open.deltaMm)
      if (!edit) {
        open = null
        return false
      }
      if (edit.operations.length > 0) session.setPreview(edit.label, edit.operations)
      else session.clearPreview()
      clearTimeout(timer)
      timer = setTimeout(settle, SETTLE_MS)
      return true
    },
    cancel() {
      clearTimeout(timer)
      if (!open) return false
      open = null
      session.clearPreview()
      return true
    },
    settle,
  }
}
