/** What a drag with the select tool changes: a shift of parts, one face of a part, or one load. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import { movableIds, moveLabel, movePartsOperations } from './move-parts'
import { type PartRef, partExtent, partName, roundMm } from './part'
import { type PartFace, resizeOperations, stepOwner } from './resize-part'
import { gridStepMm, roundToGrid, snapShift, snapStation, type SnapTarget, snapTargets } from './snapping'
import type { ToolContext, ToolPointer } from './tool'

interface DragBase {
  /** The document when the pointer went down. */
  start: LayoutDocument
  fromStationMm: number
  label: string
  hint: string
  movingIds: readonly string[]
  targets: readonly SnapTarget[]
}

export type Drag =
  | (DragBase & { kind: 'move'; facesMm: readonly number[] })
  | (DragBase & { kind: 'resize'; part: PartRef; face: PartFace; faceMm: number; fromHeightMm: number })
  | (DragBase & { kind: 'load'; loadCaseId: string; loadId: string; loadMm: number })

const MOVE_HINT = 'Alt: free value, no snapping. Escape: put it back.'
const STEP_HINT = 'Shift: everything to the right goes along. Alt: free value. Escape: put it back.'

/** The drag a press may turn into; null when there is nothing to drag. */
export function dragOf(
  pointer: ToolPointer,
  selectedIds: readonly string[],
  context: ToolContext,
): Drag | null {
  const { document } = context
  const { hit } = pointer
  if (hit === null) return null
  const base = { start: document, fromStationMm: pointer.stationMm, hint: MOVE_HINT }
  if (hit.kind === 'load') return loadDrag(base, hit, document)
  if (hit.kind === 'handle') return resizeDrag(base, pointer, hit, document)
  const ids = movableIds(document, selectedIds)
  if (!ids.includes(hit.part.id)) return null
  // The grid counts from the part in hand, so its faces come first.
  const ordered = [hit.part.id, ...ids.filter((id) => id !== hit.part.id)]
  return {
    ...base,
    kind: 'move',
    label: moveLabel(document, ordered),
    movingIds: ordered,
    targets: snapTargets(document, ordered),
    facesMm: ordered.flatMap((id) => {
      const extent = partExtent(document, id)
      return extent ? [extent.leftMm, extent.rightMm] : []
    }),
  }
}

type Base = Pick<DragBase, 'start' | 'fromStationMm' | 'hint'>

function loadDrag(
  base: Base,
  hit: { loadCaseId: string; loadId: string; hubId: string },
  document: LayoutDocument,
): Drag | null {
  const loadCase = document.loadCases.find(({ id }) => id === hit.loadCaseId)
  const load = loadCase?.loads.find(({ id }) => id === hit.loadId)
  if (!load) return null
  const hub = partExtent(document, hit.hubId)
  return {
    ...base,
    kind: 'load',
    label: `Move load of ${partName(document, hit.hubId)}`,
    movingIds: [],
    // A load belongs to its hub: the hub's faces and its middle are where it is usually wanted.
    targets: hub
      ? [hub.leftMm, (hub.leftMm + hub.rightMm) / 2, hub.rightMm].map((stationMm) => ({
          stationMm: roundMm(stationMm),
          kind: 'hub face' as const,
        }))
      : [],
    loadCaseId: hit.loadCaseId,
    loadId: hit.loadId,
    loadMm: load.stationMm,
  }
}

function resizeDrag(
  base: Base,
  pointer: ToolPointer,
  hit: { part: PartRef; face: PartFace },
  document: LayoutDocument,
): Drag | null {
  const extent = partExtent(document, hit.part.id)
  if (!extent) return null
  const isStep = hit.part.kind === 'section' && hit.face !== 'outside'
  if (isStep && stepOwner(document, hit.part.id, hit.face) === null) return null
  const faceMm =
    hit.face === 'outside' ? extent.outerRadiusMm : hit.face === 'left' ? extent.leftMm : extent.rightMm
  return {
    ...base,
    kind: 'resize',
    part: hit.part,
    face: hit.face,
    faceMm,
    fromHeightMm: Math.abs(pointer.heightMm),
    label:
      hit.face === 'outside'
        ? `Change diameter of ${partName(document, hit.part.id)}`
        : `Change length of ${partName(document, hit.part.id)}`,
    hint: isStep ? STEP_HINT : MOVE_HINT,
    movingIds: [hit.part.id],
    targets: snapTargets(document, [hit.part.id]).filter(
      (target) => Math.abs(target.stationMm - faceMm) > 1e-6 || hit.part.kind !== 'section',
    ),
  }
}

/** The edit for where the pointer is now, counted from where the drag began. */
export function draggedOperations(
  drag: Drag,
  pointer: ToolPointer,
  context: ToolContext,
): { operations: Operation[]; guides: SnapTarget[] } {
  const settings = { mmPerPx: context.mmPerPx, isFree: pointer.alt }
  const shiftMm = pointer.stationMm - drag.fromStationMm
  if (drag.kind === 'move') {
    const { deltaMm, guides } = snapShift(drag.targets, drag.facesMm, shiftMm, settings)
    return { operations: movePartsOperations(drag.start, drag.movingIds, deltaMm), guides }
  }
  if (drag.kind === 'load') {
    const { stationMm, guides } = snapStation(drag.targets, drag.loadMm + shiftMm, settings)
    const target = { kind: 'load' as const, loadCaseId: drag.loadCaseId, id: drag.loadId }
    return {
      operations:
        stationMm === drag.loadMm
          ? []
          : [{ type: 'set', target, field: 'stationMm', before: drag.loadMm, value: stationMm }],
      guides,
    }
  }
  if (drag.face === 'outside') {
    const radiusMm = drag.faceMm + Math.abs(pointer.heightMm) - drag.fromHeightMm
    // Diameters are whole grid steps, so radii are half of them.
    const gridded = roundToGrid(2 * radiusMm, gridStepMm(context.mmPerPx)) / 2
    const value = pointer.alt ? roundMm(radiusMm) : gridded
    return { operations: resizeOperations(drag.start, drag.part, 'outside', value, false), guides: [] }
  }
  const { stationMm, guides } = snapStation(drag.targets, drag.faceMm + shiftMm, settings)
  const isStep = drag.part.kind === 'section'
  return {
    operations: resizeOperations(drag.start, drag.part, drag.face, stationMm, isStep && pointer.shift),
    guides,
  }
}
