/** Places a bearing with one click; its width follows the seat under it. */
import { firstBearingWidthMm, newBearing, seatDiameterAt } from './new-parts'
import { roundMm } from './part'
import { snapShift, type SnapTarget, snapTargets } from './snapping'
import { IDLE_DISPLAY, type PlacementMark, type Tool, type ToolContext, type ToolPointer } from './tool'

export interface BearingToolState {
  isPressed: boolean
  mark: PlacementMark | null
  guides: SnapTarget[]
}

const IDLE: BearingToolState = { isPressed: false, mark: null, guides: [] }

function markUnder(
  pointer: ToolPointer,
  context: ToolContext,
): { mark: PlacementMark; guides: SnapTarget[]; stationMm: number } {
  const seatMm = seatDiameterAt(context.document, pointer.stationMm)
  const widthMm = firstBearingWidthMm(seatMm)
  const leftMm = pointer.stationMm - widthMm / 2
  const { deltaMm, guides } = snapShift(snapTargets(context.document, []), [leftMm, leftMm + widthMm], 0, {
    mmPerPx: context.mmPerPx,
    isFree: pointer.alt,
  })
  const left = roundMm(leftMm + deltaMm)
  return {
    stationMm: left + widthMm / 2,
    guides,
    mark: {
      kind: 'bearing',
      leftMm: left,
      rightMm: left + widthMm,
      innerRadiusMm: seatMm / 2,
      outerRadiusMm: seatMm / 2 + Math.min(widthMm, seatMm * 0.45),
      caption: `${widthMm} mm wide on ⌀${seatMm}`,
    },
  }
}

export const bearingTool: Tool<BearingToolState> = {
  id: 'bearing',
  initial: IDLE,
  step(state, event, context) {
    if (event.type === 'cancel') {
      return { state: IDLE, effects: state.isPressed ? [] : [{ type: 'finish' }] }
    }
    if (event.type === 'leave') return { state: state.isPressed ? state : IDLE, effects: [] }
    const { mark, guides, stationMm } = markUnder(event.pointer, context)
    if (event.type === 'up' && state.isPressed) {
      const bearing = newBearing(context.document, context.newPartId('bearing'), stationMm)
      const index = context.document.bearings.length
      return {
        state: IDLE,
        effects: [
          {
            type: 'commit',
            label: `Add bearing ${bearing.name}`,
            operations: [{ type: 'add', collection: 'bearings', index, item: bearing }],
          },
          { type: 'select', ids: [bearing.id] },
          { type: 'finish' },
        ],
      }
    }
    return { state: { isPressed: state.isPressed || event.type === 'down', mark, guides }, effects: [] }
  },
  display: (state) => ({
    ...IDLE_DISPLAY,
    cursor: 'crosshair',
    placement: state.mark,
    guides: state.guides,
    hint: 'Click to place a bearing. Alt: no snapping. Escape: leave the tool.',
  }),
}
