/** Plays a list of pointer events to a tool the way the canvas does, and keeps what it asks for. */
import { hitTest } from '@/features/editor/tools/hit-test'
import type { Modifiers, Tool, ToolContext, ToolEffect, ToolPointer } from '@/features/editor/tools/tool'
import { applyOperations } from '@shared/layout/apply-operations'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'

const NO_KEYS: Modifiers = { shift: false, alt: false, control: false }

export interface Hand<State> {
  down: (stationMm: number, heightMm: number, keys?: Partial<Modifiers>) => ToolEffect[]
  move: (stationMm: number, heightMm: number, keys?: Partial<Modifiers>) => ToolEffect[]
  up: (stationMm: number, heightMm: number, keys?: Partial<Modifiers>) => ToolEffect[]
  cancel: () => ToolEffect[]
  state: () => State
  /** Everything asked for so far. */
  effects: ToolEffect[]
  context: ToolContext
}

export function takeUp<State>(
  tool: Tool<State>,
  document: LayoutDocument,
  more: Partial<ToolContext> & { isTouch?: boolean } = {},
): Hand<State> {
  let state = tool.initial
  let count = 0
  const { isTouch = false, ...given } = more
  const context: ToolContext = {
    document,
    canEdit: true,
    selectedIds: [],
    loadCaseId: 'run',
    hubRole: 'gear',
    // 2 px per mm: the pull of 7 px reaches 3.5 mm.
    mmPerPx: 0.5,
    newPartId: (prefix) => `${prefix}-new-${++count}`,
    ...given,
  }
  const effects: ToolEffect[] = []
  const keep = (step: { state: State; effects: ToolEffect[] }) => {
    state = step.state
    for (const effect of step.effects) {
      if (effect.type === 'select') context.selectedIds = effect.ids
      effects.push(effect)
    }
    return step.effects
  }
  const pointer = (stationMm: number, heightMm: number, keys: Partial<Modifiers>): ToolPointer => ({
    ...NO_KEYS,
    ...keys,
    stationMm,
    heightMm,
    xPx: stationMm / context.mmPerPx,
    yPx: -heightMm / context.mmPerPx,
    isTouch,
    hit: hitTest({ ...context, stationMm, heightMm, isTouch }),
  })
  const send =
    (type: 'down' | 'move' | 'up') =>
    (stationMm: number, heightMm: number, keys: Partial<Modifiers> = {}) =>
      keep(tool.step(state, { type, pointer: pointer(stationMm, heightMm, keys) }, context))
  return {
    down: send('down'),
    move: send('move'),
    up: send('up'),
    cancel: () => keep(tool.step(state, { type: 'cancel' }, context)),
    state: () => state,
    effects,
    context,
  }
}

export const commits = (effects: readonly ToolEffect[]) =>
  effects.flatMap((effect) => (effect.type === 'commit' ? [effect] : []))

export const previews = (effects: readonly ToolEffect[]) =>
  effects.flatMap((effect) => (effect.type === 'preview' ? [effect] : []))

/** The document after the operations; throws when one of them does nothing, so that no dead operation hides. */
export function after(document: LayoutDocument, operations: Operation[] | undefined): LayoutDocument {
  const result = applyOperations(document, operations ?? [])
  if (result.dropped.length > 0) throw new Error(`dropped: ${JSON.stringify(result.dropped)}`)
  return result.document
}
