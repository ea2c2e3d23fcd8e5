/**
 * Selects, moves along the shaft, resizes by a face, and draws a selection rectangle. A drag keeps
 * the document it started from: its preview is always start + total shift, so nothing adds up.
 */
import type { Operation } from '@shared/layout/operations'
import { dragOf, type Drag, draggedOperations } from './drag'
import { partExtents } from './part'
import {
  IDLE_DISPLAY,
  isPastThreshold,
  type Marquee,
  type Tool,
  type ToolContext,
  type ToolDisplay,
  type ToolEffect,
  type ToolPointer,
  type ToolStep,
} from './tool'
import type { SnapTarget } from './snapping'

export type SelectState =
  | { name: 'idle'; over: ToolPointer['hit'] }
  | { name: 'pressed'; from: ToolPointer; drag: Drag | null }
  | { name: 'dragging'; drag: Drag; operations: Operation[]; guides: SnapTarget[] }
  | { name: 'marquee'; from: ToolPointer; to: ToolPointer }
  | { name: 'panning'; last: ToolPointer }

const IDLE: SelectState = { name: 'idle', over: null }

const stay = (state: SelectState): ToolStep<SelectState> => ({ state, effects: [] })

export const selectTool: Tool<SelectState> = {
  id: 'select',
  initial: IDLE,
  step(state, event, context) {
    if (event.type === 'cancel') return cancel(state, context)
    if (event.type === 'leave') {
      return state.name === 'idle' ? { state: IDLE, effects: [{ type: 'hover', id: null }] } : stay(state)
    }
    const { pointer } = event
    switch (state.name) {
      case 'idle':
        return event.type === 'down' ? press(pointer, context) : hover(pointer)
      case 'pressed':
        if (event.type === 'up') return release(state, pointer, context)
        return event.type === 'move' && isPastThreshold(state.from, pointer)
          ? startDragging(state, pointer, context)
          : stay(state)
      case 'dragging':
        return event.type === 'up' ? drop(state) : drag(state.drag, pointer, context)
      case 'marquee':
        if (event.type !== 'up') return stay({ ...state, to: pointer })
        return { state: IDLE, effects: [{ type: 'select', ids: partsInside(state, pointer, context) }] }
      case 'panning':
        if (event.type === 'up') return stay(IDLE)
        return {
          state: { name: 'panning', last: pointer },
          effects: [{ type: 'pan', dxPx: pointer.xPx - state.last.xPx, dyPx: pointer.yPx - state.last.yPx }],
        }
    }
  },
  display,
}

const hitId = (hit: ToolPointer['hit']): string | null =>
  hit === null ? null : hit.kind === 'load' ? hit.hubId : hit.part.id

function hover(pointer: ToolPointer): ToolStep<SelectState> {
  return { state: { name: 'idle', over: pointer.hit }, effects: [{ type: 'hover', id: hitId(pointer.hit) }] }
}

function press(pointer: ToolPointer, context: ToolContext): ToolStep<SelectState> {
  const id = hitId(pointer.hit)
  const isSelected = id !== null && context.selectedIds.includes(id)
  const effects: ToolEffect[] = []
  let selectedIds = context.selectedIds
  // Shift adds on release, so that Shift can also begin a drag of what is selected.
  if (id !== null && !isSelected && !pointer.shift) {
    selectedIds = [id]
    effects.push({ type: 'select', ids: [id] })
  }
  // A finger on something not selected yet scrolls the drawing, as fingers do.
  const mayDrag = context.canEdit && (!pointer.isTouch || isSelected)
  return {
    state: { name: 'pressed', from: pointer, drag: mayDrag ? dragOf(pointer, selectedIds, context) : null },
    effects,
  }
}

function release(
  state: Extract<SelectState, { name: 'pressed' }>,
  pointer: ToolPointer,
  context: ToolContext,
): ToolStep<SelectState> {
  const id = hitId(state.from.hit)
  const over: SelectState = { name: 'idle', over: pointer.hit }
  if (id === null) {
    return { state: over, effects: pointer.shift ? [] : [{ type: 'select', ids: [] }] }
  }
  if (state.from.shift) return { state: over, effects: [{ type: 'toggle', id }] }
  const isOneOfMany = context.selectedIds.length > 1 && context.selectedIds.includes(id)
  return { state: over, effects: isOneOfMany ? [{ type: 'select', ids: [id] }] : [] }
}

function startDragging(
  state: Extract<SelectState, { name: 'pressed' }>,
  pointer: ToolPointer,
  context: ToolContext,
): ToolStep<SelectState> {
  if (state.drag) return drag(state.drag, pointer, context)
  if (pointer.isTouch) {
    return {
      state: { name: 'panning', last: pointer },
      effects: [{ type: 'pan', dxPx: pointer.xPx - state.from.xPx, dyPx: pointer.yPx - state.from.yPx }],
    }
  }
  return stay({ name: 'marquee', from: state.from, to: pointer })
}

function drag(current: Drag, pointer: ToolPointer, context: ToolContext): ToolStep<SelectState> {
  const { operations, guides } = draggedOperations(current, pointer, context)
  return {
    state: { name: 'dragging', drag: current, operations, guides },
    effects: [
      operations.length === 0
        ? { type: 'dropPreview' }
        : { type: 'preview', label: current.label, operations },
    ],
  }
}

function drop(state: Extract<SelectState, { name: 'dragging' }>): ToolStep<SelectState> {
  const { operations, drag: dropped } = state
  return {
    state: IDLE,
    effects: [
      operations.length === 0
        ? { type: 'dropPreview' }
        : { type: 'commit', label: dropped.label, operations },
    ],
  }
}

function cancel(state: SelectState, context: ToolContext): ToolStep<SelectState> {
  if (state.name === 'dragging') return { state: IDLE, effects: [{ type: 'dropPreview' }] }
  if (state.name !== 'idle') return stay(IDLE)
  return { state: IDLE, effects: context.selectedIds.length > 0 ? [{ type: 'select', ids: [] }] : [] }
}

const marqueeOf = (from: ToolPointer, to: ToolPointer): Marquee => ({
  leftMm: Math.min(from.stationMm, to.stationMm),
  rightMm: Math.max(from.stationMm, to.stationMm),
  topMm: Math.max(from.heightMm, to.heightMm),
  bottomMm: Math.min(from.heightMm, to.heightMm),
})

/** Parts that lie whole between the sides of the rectangle and are touched by it; Shift keeps the others. */
function partsInside(
  state: Extract<SelectState, { name: 'marquee' }>,
  pointer: ToolPointer,
  context: ToolContext,
): string[] {
  const box = marqueeOf(state.from, pointer)
  const inside = partExtents(context.document)
    .filter((part) => part.leftMm >= box.leftMm && part.rightMm <= box.rightMm)
    .filter((part) => box.topMm >= -part.outerRadiusMm && box.bottomMm <= part.outerRadiusMm)
    .filter((part) => box.topMm >= part.innerRadiusMm || box.bottomMm <= -part.innerRadiusMm)
  const placed = inside.filter((part) => part.kind !== 'section')
  const ids = (placed.length > 0 ? placed : inside).map((part) => part.id)
  return pointer.shift ? [...context.selectedIds, ...ids] : ids
}

function display(state: SelectState): ToolDisplay {
  switch (state.name) {
    case 'idle':
      return { ...IDLE_DISPLAY, cursor: hoverCursor(state.over) }
    case 'pressed':
      return { ...IDLE_DISPLAY, cursor: hoverCursor(state.from.hit) }
    case 'dragging':
      return {
        ...IDLE_DISPLAY,
        cursor: state.drag.kind === 'resize' && state.drag.face === 'outside' ? 'ns-resize' : 'ew-resize',
        movingIds: state.drag.movingIds,
        guides: state.guides,
        hint: state.drag.hint,
      }
    case 'marquee':
      return { ...IDLE_DISPLAY, cursor: 'crosshair', marquee: marqueeOf(state.from, state.to) }
    case 'panning':
      return { ...IDLE_DISPLAY, cursor: 'grabbing' }
  }
}

function hoverCursor(hit: ToolPointer['hit']): ToolDisplay['cursor'] {
  if (hit === null) return 'default'
  if (hit.kind === 'handle') return hit.face === 'outside' ? 'ns-resize' : 'ew-resize'
  return 'pointer'
}
