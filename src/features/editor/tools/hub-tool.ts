/** Places a hub: a click puts one of usual length, a drag draws its length. The tool then hands back to select. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { DEFAULT_HUB_LENGTH_MM, firstOuterDiameterMm, newHub, seatDiameterAt } from './new-parts'
import { roundMm } from './part'
import { gridStepMm, roundToGrid, snapShift, snapStation, type SnapTarget, snapTargets } from './snapping'
import {
  IDLE_DISPLAY,
  isPastThreshold,
  type PlacementMark,
  type Tool,
  type ToolContext,
  type ToolPointer,
} from './tool'

interface Span {
  leftMm: number
  rightMm: number
  guides: SnapTarget[]
}

export interface HubToolState {
  pressedAt: ToolPointer | null
  mark: PlacementMark | null
  guides: SnapTarget[]
}

const IDLE: HubToolState = { pressedAt: null, mark: null, guides: [] }

const settingsOf = (pointer: ToolPointer, context: ToolContext) => ({
  mmPerPx: context.mmPerPx,
  isFree: pointer.alt,
})

/** A hub of usual length with its middle under the pointer. */
function spanUnder(pointer: ToolPointer, context: ToolContext): Span {
  const leftMm = pointer.stationMm - DEFAULT_HUB_LENGTH_MM / 2
  const { deltaMm, guides } = snapShift(
    snapTargets(context.document, []),
    [leftMm, leftMm + DEFAULT_HUB_LENGTH_MM],
    0,
    settingsOf(pointer, context),
  )
  const left = roundMm(leftMm + deltaMm)
  return { leftMm: left, rightMm: left + DEFAULT_HUB_LENGTH_MM, guides }
}

/** From where the pointer went down to where it is. */
function spanDrawn(from: ToolPointer, to: ToolPointer, context: ToolContext): Span {
  const targets = snapTargets(context.document, [])
  const a = snapStation(targets, from.stationMm, settingsOf(to, context))
  const b = snapStation(targets, to.stationMm, settingsOf(to, context))
  const leftMm = Math.min(a.stationMm, b.stationMm)
  const least = gridStepMm(context.mmPerPx)
  return {
    leftMm,
    rightMm: Math.max(a.stationMm, b.stationMm, leftMm + least),
    guides: [...a.guides, ...b.guides],
  }
}

function markOf(document: LayoutDocument, span: Span): PlacementMark {
  const seatMm = seatDiameterAt(document, (span.leftMm + span.rightMm) / 2)
  return {
    kind: 'hub',
    leftMm: span.leftMm,
    rightMm: span.rightMm,
    innerRadiusMm: seatMm / 2,
    outerRadiusMm: firstOuterDiameterMm(seatMm) / 2,
    caption: `${roundToGrid(span.rightMm - span.leftMm, 0.001)} mm on ⌀${seatMm}`,
  }
}

export const hubTool: Tool<HubToolState> = {
  id: 'hub',
  initial: IDLE,
  step(state, event, context) {
    if (event.type === 'cancel') {
      return state.pressedAt ? { state: IDLE, effects: [] } : { state: IDLE, effects: [{ type: 'finish' }] }
    }
    if (event.type === 'leave') return { state: state.pressedAt ? state : IDLE, effects: [] }
    const { pointer } = event
    const pressedAt = event.type === 'down' ? pointer : state.pressedAt
    const span =
      pressedAt && isPastThreshold(pressedAt, pointer)
        ? spanDrawn(pressedAt, pointer, context)
        : spanUnder(pointer, context)
    if (event.type === 'up' && state.pressedAt) {
      const hub = newHub(context.document, {
        id: context.newPartId('hub'),
        role: context.hubRole,
        leftMm: span.leftMm,
        lengthMm: span.rightMm - span.leftMm,
      })
      return {
        state: IDLE,
        effects: [
          {
            type: 'commit',
            label: `Add ${hub.name}`,
            operations: [{ type: 'add', collection: 'hubs', index: context.document.hubs.length, item: hub }],
          },
          { type: 'select', ids: [hub.id] },
          { type: 'finish' },
        ],
      }
    }
    return { state: { pressedAt, mark: markOf(context.document, span), guides: span.guides }, effects: [] }
  },
  display: (state) => ({
    ...IDLE_DISPLAY,
    cursor: 'crosshair',
    placement: state.mark,
    guides: state.guides,
    hint: 'Click to place a hub, or drag to draw its length. Alt: no snapping. Escape: leave the tool.',
  }),
}
