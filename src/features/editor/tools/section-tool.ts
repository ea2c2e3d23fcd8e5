/**
 * Adds shaft. Nothing that is there moves: a click on the shaft splits the section at that place,
 * a drag over a section turns the dragged stretch into a section of its own with the diameter
 * under the pointer, and right of the shaft the drag draws a new last section.
 */
import type { LayoutDocument, ShaftSection } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import { sectionAt, type SectionSpan, totalLengthMm } from '@shared/layout/shaft-geometry'
import { roundMm } from './part'
import { MIN_LENGTH_MM } from './resize-part'
import { gridStepMm, roundToGrid, snapStation, type SnapTarget, snapTargets } from './snapping'
import {
  IDLE_DISPLAY,
  isPastThreshold,
  type PlacementMark,
  type Tool,
  type ToolContext,
  type ToolPointer,
} from './tool'

type Plan =
  | { kind: 'append'; leftMm: number; rightMm: number; diameterMm: number }
  | { kind: 'split'; span: SectionSpan; atMm: number }
  | { kind: 'carve'; span: SectionSpan; leftMm: number; rightMm: number; diameterMm: number }

export interface SectionToolState {
  pressedAt: ToolPointer | null
  plan: Plan | null
  guides: SnapTarget[]
}

const IDLE: SectionToolState = { pressedAt: null, plan: null, guides: [] }
const DEFAULT_LENGTH_MM = 40
const DEFAULT_DIAMETER_MM = 50

function planOf(
  from: ToolPointer | null,
  to: ToolPointer,
  context: ToolContext,
): { plan: Plan | null; guides: SnapTarget[] } {
  const { document } = context
  const settings = { mmPerPx: context.mmPerPx, isFree: to.alt }
  const targets = snapTargets(document, [])
  const isDrawn = from !== null && isPastThreshold(from, to)
  const end = snapStation(targets, to.stationMm, settings)
  const startMm = isDrawn ? snapStation(targets, from.stationMm, settings).stationMm : end.stationMm
  const lengthMm = totalLengthMm(document)
  const lastDiameterMm = document.shaft.sections.at(-1)?.outerDiameterMm ?? DEFAULT_DIAMETER_MM
  const anchorMm = from?.stationMm ?? to.stationMm

  if (anchorMm >= lengthMm) {
    const rightMm = isDrawn
      ? Math.max(end.stationMm, lengthMm + gridStepMm(context.mmPerPx))
      : lengthMm + DEFAULT_LENGTH_MM
    const diameterMm = isDrawn ? drawnDiameterMm(to, context) : lastDiameterMm
    return {
      plan: { kind: 'append', leftMm: roundMm(lengthMm), rightMm: roundMm(rightMm), diameterMm },
      guides: end.guides,
    }
  }
  const span = sectionAt(document, Math.max(0, anchorMm))
  if (!span) return { plan: null, guides: [] }
  if (!isDrawn) {
    const isInside =
      end.stationMm > span.startMm + MIN_LENGTH_MM && end.stationMm < span.endMm - MIN_LENGTH_MM
    return { plan: isInside ? { kind: 'split', span, atMm: end.stationMm } : null, guides: end.guides }
  }
  const leftMm = Math.max(span.startMm, Math.min(startMm, end.stationMm))
  const rightMm = Math.min(span.endMm, Math.max(startMm, end.stationMm))
  if (rightMm - leftMm < MIN_LENGTH_MM) return { plan: null, guides: end.guides }
  return {
    plan: { kind: 'carve', span, leftMm, rightMm, diameterMm: drawnDiameterMm(to, context) },
    guides: end.guides,
  }
}

function drawnDiameterMm(pointer: ToolPointer, context: ToolContext): number {
  const step = pointer.alt ? 0.1 : gridStepMm(context.mmPerPx)
  return Math.max(2, roundToGrid(2 * Math.abs(pointer.heightMm), step))
}

const withoutFillet = ({ rightFilletMm: _, ...section }: ShaftSection): ShaftSection => section

function operationsOf(
  plan: Plan,
  document: LayoutDocument,
  newId: () => string,
): { operations: Operation[]; id: string; label: string } {
  const id = newId()
  const add = (index: number, item: ShaftSection): Operation => ({
    type: 'add',
    collection: 'sections',
    index,
    item,
  })
  if (plan.kind === 'append') {
    const item: ShaftSection = {
      id,
      lengthMm: roundMm(plan.rightMm - plan.leftMm),
      outerDiameterMm: plan.diameterMm,
      boreDiameterMm: 0,
      roughnessRzUm: 4,
    }
    return { operations: [add(document.shaft.sections.length, item)], id, label: 'Add a section' }
  }
  const { section, startMm, endMm } = plan.span
  const index = document.shaft.sections.findIndex((candidate) => candidate.id === section.id)
  const shorten = (toMm: number): Operation => ({
    type: 'set',
    target: { kind: 'section', id: section.id },
    field: 'lengthMm',
    before: section.lengthMm,
    value: roundMm(toMm - startMm),
  })
  if (plan.kind === 'split') {
    const right = { ...section, id, lengthMm: roundMm(endMm - plan.atMm) }
    return { operations: [shorten(plan.atMm), add(index + 1, right)], id, label: 'Split a section' }
  }
  const middle = {
    ...withoutFillet(section),
    id,
    lengthMm: roundMm(plan.rightMm - plan.leftMm),
    outerDiameterMm: plan.diameterMm,
  }
  const hasLeft = plan.leftMm - startMm >= MIN_LENGTH_MM
  const hasRight = endMm - plan.rightMm >= MIN_LENGTH_MM
  const operations: Operation[] = []
  if (hasLeft) operations.push(shorten(plan.leftMm))
  else operations.push({ type: 'remove', target: { kind: 'section', id: section.id } })
  const firstIndex = hasLeft ? index + 1 : index
  operations.push(add(firstIndex, middle))
  if (hasRight) {
    operations.push(add(firstIndex + 1, { ...section, id: newId(), lengthMm: roundMm(endMm - plan.rightMm) }))
  }
  return { operations, id, label: 'Add a section' }
}

function markOf(plan: Plan): PlacementMark {
  if (plan.kind === 'split') {
    const radius = plan.span.section.outerDiameterMm / 2
    return {
      kind: 'step',
      leftMm: plan.atMm,
      rightMm: plan.atMm,
      innerRadiusMm: 0,
      outerRadiusMm: radius,
      caption: `Split at ${plan.atMm} mm`,
    }
  }
  return {
    kind: 'section',
    leftMm: plan.leftMm,
    rightMm: plan.rightMm,
    innerRadiusMm: 0,
    outerRadiusMm: plan.diameterMm / 2,
    caption: `⌀${plan.diameterMm}, ${roundMm(plan.rightMm - plan.leftMm)} mm long`,
  }
}

export const sectionTool: Tool<SectionToolState> = {
  id: 'section',
  initial: IDLE,
  step(state, event, context) {
    if (event.type === 'cancel') {
      return { state: IDLE, effects: state.pressedAt ? [] : [{ type: 'finish' }] }
    }
    if (event.type === 'leave') return { state: state.pressedAt ? state : IDLE, effects: [] }
    const { pointer } = event
    const pressedAt = event.type === 'down' ? pointer : state.pressedAt
    const { plan, guides } = planOf(pressedAt, pointer, context)
    if (event.type !== 'up' || !state.pressedAt) return { state: { pressedAt, plan, guides }, effects: [] }
    if (!plan) return { state: IDLE, effects: [] }
    const { operations, id, label } = operationsOf(plan, context.document, () => context.newPartId('section'))
    return {
      state: IDLE,
      effects: [{ type: 'commit', label, operations }, { type: 'select', ids: [id] }, { type: 'finish' }],
    }
  },
  display: (state) => ({
    ...IDLE_DISPLAY,
    cursor: 'crosshair',
    placement: state.plan ? markOf(state.plan) : null,
    guides: state.guides,
    hint: 'Click on the shaft to split a section, drag to draw one; right of the shaft a new end is added. Escape: leave the tool.',
  }),
}
