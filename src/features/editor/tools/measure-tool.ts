/** Measures a distance along the shaft. It changes nothing; the result stays until the next press. */
import { snapStation, type SnapTarget, snapTargets } from './snapping'
import { IDLE_DISPLAY, type SpanMark, type Tool, type ToolContext, type ToolPointer } from './tool'

export interface MeasureToolState {
  isDragging: boolean
  /** Where a measurement would begin. */
  atMm: number | null
  span: SpanMark | null
  guides: SnapTarget[]
}

const IDLE: MeasureToolState = { isDragging: false, atMm: null, span: null, guides: [] }

const placeOf = (pointer: ToolPointer, context: ToolContext) =>
  snapStation(snapTargets(context.document, []), pointer.stationMm, {
    mmPerPx: context.mmPerPx,
    isFree: pointer.alt,
  })

export const measureTool: Tool<MeasureToolState> = {
  id: 'measure',
  initial: IDLE,
  step(state, event, context) {
    if (event.type === 'cancel') {
      return { state: IDLE, effects: state.span ? [] : [{ type: 'finish' }] }
    }
    if (event.type === 'leave') return { state: { ...state, atMm: null, guides: [] }, effects: [] }
    const { stationMm, guides } = placeOf(event.pointer, context)
    if (event.type === 'down') {
      const span = { fromMm: stationMm, toMm: stationMm }
      return { state: { isDragging: true, atMm: stationMm, span, guides }, effects: [] }
    }
    if (state.isDragging && state.span) {
      const span = { fromMm: state.span.fromMm, toMm: stationMm }
      const isDone = event.type === 'up'
      const isNothing = isDone && span.fromMm === span.toMm
      return {
        state: { isDragging: !isDone, atMm: stationMm, span: isNothing ? null : span, guides },
        effects: [],
      }
    }
    return { state: { ...state, atMm: stationMm, guides }, effects: [] }
  },
  display: (state) => ({
    ...IDLE_DISPLAY,
    cursor: 'crosshair',
    guides: state.guides,
    measure: state.span,
    hint: 'Drag from one place to another. Faces and steps pull; Alt: free. Escape: leave the tool.',
  }),
}
