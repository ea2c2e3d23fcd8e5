/**
 * Puts a load on a hub. A click gives 1 kN downwards, dragging up or down sets the force. The load
 * goes into the load case on screen; without any load case the first one is made in the same edit.
 */
import type { LoadCase } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import { newLoad } from './new-parts'
import { hubExtent, type PartExtent, roundMm } from './part'
import { roundToGrid, snapStation, type SnapTarget } from './snapping'
import {
  IDLE_DISPLAY,
  isPastThreshold,
  type PlacementMark,
  type Tool,
  type ToolContext,
  type ToolPointer,
} from './tool'

interface Plan {
  hub: PartExtent
  stationMm: number
  forceYN: number
}

export interface LoadToolState {
  pressed: { at: ToolPointer; hubId: string; stationMm: number } | null
  plan: Plan | null
  guides: SnapTarget[]
  isOffHub: boolean
}

const IDLE: LoadToolState = { pressed: null, plan: null, guides: [], isOffHub: false }
const DEFAULT_FORCE_N = -1_000
/** One pixel of drag is this much force, in steps of 100 N. */
const FORCE_PER_PX_N = 50
const FORCE_STEP_N = 100

function hubUnder(pointer: ToolPointer, context: ToolContext): PartExtent | null {
  const hubs = context.document.hubs.map((hub) => hubExtent(context.document, hub))
  return hubs.find((hub) => pointer.stationMm >= hub.leftMm && pointer.stationMm <= hub.rightMm) ?? null
}

function placeOn(hub: PartExtent, pointer: ToolPointer, context: ToolContext) {
  const middleMm = roundMm((hub.leftMm + hub.rightMm) / 2)
  const targets: SnapTarget[] = [{ stationMm: middleMm, kind: 'hub face' }]
  const { stationMm, guides } = snapStation(targets, pointer.stationMm, {
    mmPerPx: context.mmPerPx,
    isFree: pointer.alt,
  })
  return { stationMm: Math.min(Math.max(stationMm, hub.leftMm), hub.rightMm), guides }
}

function drawnForceN(from: ToolPointer, to: ToolPointer): number {
  if (!isPastThreshold(from, to)) return DEFAULT_FORCE_N
  const dragged = roundToGrid((from.yPx - to.yPx) * FORCE_PER_PX_N, FORCE_STEP_N)
  return dragged === 0 ? DEFAULT_FORCE_N : dragged
}

function commitOf(plan: Plan, context: ToolContext): { label: string; operations: Operation[] } {
  const load = newLoad({
    id: context.newPartId('load'),
    hub: plan.hub.id,
    stationMm: plan.stationMm,
    forceYN: plan.forceYN,
  })
  const hub = context.document.hubs.find(({ id }) => id === plan.hub.id)
  const label = `Add a load to ${hub?.name ?? plan.hub.id}`
  const loadCase =
    context.document.loadCases.find(({ id }) => id === context.loadCaseId) ?? context.document.loadCases[0]
  if (loadCase) {
    const index = loadCase.loads.length
    return {
      label,
      operations: [{ type: 'add', collection: 'loads', loadCaseId: loadCase.id, index, item: load }],
    }
  }
  const first: LoadCase = {
    id: context.newPartId('case'),
    name: 'Running',
    speedRpm: 1_000,
    applicationFactor: 1.25,
    shaftC: 20,
    hubC: 20,
    loads: [load],
  }
  return { label, operations: [{ type: 'add', collection: 'loadCases', index: 0, item: first }] }
}

const markOf = ({ hub, stationMm, forceYN }: Plan): PlacementMark => ({
  kind: 'load',
  leftMm: stationMm,
  rightMm: stationMm,
  innerRadiusMm: 0,
  outerRadiusMm: forceYN > 0 ? -hub.outerRadiusMm : hub.outerRadiusMm,
  caption: `${Math.abs(forceYN)} N ${forceYN > 0 ? 'up' : 'down'} at ${stationMm} mm`,
})

export const loadTool: Tool<LoadToolState> = {
  id: 'load',
  initial: IDLE,
  step(state, event, context) {
    if (event.type === 'cancel') {
      return { state: IDLE, effects: state.pressed ? [] : [{ type: 'finish' }] }
    }
    if (event.type === 'leave') return { state: state.pressed ? state : IDLE, effects: [] }
    const { pointer } = event
    const { pressed } = state
    if (pressed) {
      const hub = context.document.hubs.find(({ id }) => id === pressed.hubId)
      if (!hub) return { state: IDLE, effects: [] }
      const plan: Plan = {
        hub: hubExtent(context.document, hub),
        stationMm: pressed.stationMm,
        forceYN: drawnForceN(pressed.at, pointer),
      }
      if (event.type !== 'up') return { state: { ...state, plan }, effects: [] }
      return {
        state: IDLE,
        effects: [
          { type: 'commit', ...commitOf(plan, context) },
          { type: 'select', ids: [hub.id] },
          { type: 'finish' },
        ],
      }
    }
    const hub = hubUnder(pointer, context)
    if (!hub) return { state: { ...IDLE, isOffHub: true }, effects: [] }
    const { stationMm, guides } = placeOn(hub, pointer, context)
    const plan: Plan = { hub, stationMm, forceYN: DEFAULT_FORCE_N }
    const isDown = event.type === 'down'
    return {
      state: {
        pressed: isDown ? { at: pointer, hubId: hub.id, stationMm } : null,
        plan,
        guides,
        isOffHub: false,
      },
      effects: [],
    }
  },
  display: (state) => ({
    ...IDLE_DISPLAY,
    cursor: state.isOffHub ? 'not-allowed' : 'crosshair',
    placement: state.plan ? markOf(state.plan) : null,
    guides: state.guides,
    hint: 'Press on a hub and drag up or down to set the force. Escape: leave the tool.',
  }),
}
