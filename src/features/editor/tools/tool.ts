/**
 * The shape every tool has: a state machine without React, konva or stores. It receives plain
 * pointer records and answers with its next state and a list of effects; a driver outside carries
 * the effects out. That is why a tool can be tested with a list of events.
 */
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import type { PartIdPrefix } from '@shared/layout/new-ids'
import type { PartRef } from './part'
import type { PartFace } from './resize-part'
import type { SnapTarget } from './snapping'

export type ToolId = 'select' | 'section' | 'hub' | 'bearing' | 'load' | 'measure' | 'pan'

export interface Modifiers {
  shift: boolean
  alt: boolean
  control: boolean
}

export type HitTarget =
  | { kind: 'part'; part: PartRef }
  | { kind: 'handle'; part: PartRef; face: PartFace }
  | { kind: 'load'; loadCaseId: string; loadId: string; hubId: string }

export interface ToolPointer extends Modifiers {
  stationMm: number
  /** Above the centre line positive. */
  heightMm: number
  xPx: number
  yPx: number
  isTouch: boolean
  hit: HitTarget | null
}

export type ToolEvent =
  | { type: 'down' | 'move' | 'up'; pointer: ToolPointer }
  /** The pointer left the drawing: hovering ends, a drag goes on. */
  | { type: 'leave' }
  /** Escape, or the drag was taken away by the browser. */
  | { type: 'cancel' }

export interface ToolContext {
  document: LayoutDocument
  canEdit: boolean
  selectedIds: readonly string[]
  /** New loads go into this load case. */
  loadCaseId: string | null
  /** What the hub tool places: a gear, a cam, a pulley… */
  hubRole: Hub['role']
  mmPerPx: number
  newPartId: (prefix: PartIdPrefix) => string
}

export type ToolEffect =
  | { type: 'select'; ids: string[] }
  | { type: 'toggle'; id: string }
  | { type: 'hover'; id: string | null }
  | { type: 'preview'; label: string; operations: Operation[] }
  | { type: 'dropPreview' }
  | { type: 'commit'; label: string; operations: Operation[] }
  | { type: 'pan'; dxPx: number; dyPx: number }
  /** The tool has done its work: go back to selecting. */
  | { type: 'finish' }

export interface SpanMark {
  fromMm: number
  toMm: number
}

export interface Marquee {
  leftMm: number
  rightMm: number
  topMm: number
  bottomMm: number
}

/** Where a new part would land. */
export interface PlacementMark {
  kind: 'section' | 'step' | 'hub' | 'bearing' | 'load'
  leftMm: number
  rightMm: number
  innerRadiusMm: number
  outerRadiusMm: number
  /** Says what a press would do: "Split here", "40 mm on ⌀50". */
  caption: string
}

/** What the drawing shows of a tool at work. */
export interface ToolDisplay {
  cursor:
    'default' | 'pointer' | 'crosshair' | 'grab' | 'grabbing' | 'ew-resize' | 'ns-resize' | 'not-allowed'
  /** Parts under the hand: drawn on top, with live dimensions. */
  movingIds: readonly string[]
  guides: readonly SnapTarget[]
  placement: PlacementMark | null
  marquee: Marquee | null
  measure: SpanMark | null
  /** One line of help for the status bar while the tool is busy. */
  hint: string | null
}

export const IDLE_DISPLAY: ToolDisplay = {
  cursor: 'default',
  movingIds: [],
  guides: [],
  placement: null,
  marquee: null,
  measure: null,
  hint: null,
}

export interface ToolStep<State> {
  state: State
  effects: ToolEffect[]
}

export interface Tool<State> {
  id: ToolId
  initial: State
  step: (state: State, event: ToolEvent, context: ToolContext) => ToolStep<State>
  display: (state: State) => ToolDisplay
}

/** Further than this on screen a press becomes a drag. */
export const DRAG_THRESHOLD_PX = 3

export const isPastThreshold = (from: ToolPointer, to: ToolPointer) =>
  Math.hypot(to.xPx - from.xPx, to.yPx - from.yPx) > DRAG_THRESHOLD_PX * (to.isTouch ? 2.5 : 1)
