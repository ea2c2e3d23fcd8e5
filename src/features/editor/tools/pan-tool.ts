/** Shifts the drawing. Also used while the space bar or the middle button is held in any other tool. */
import { IDLE_DISPLAY, type Tool, type ToolPointer } from './tool'

export interface PanToolState {
  last: Pick<ToolPointer, 'xPx' | 'yPx'> | null
}

export const panTool: Tool<PanToolState> = {
  id: 'pan',
  initial: { last: null },
  step(state, event) {
    if (event.type === 'cancel') {
      return { state: { last: null }, effects: state.last ? [] : [{ type: 'finish' }] }
    }
    if (event.type === 'leave') return { state, effects: [] }
    const { xPx, yPx } = event.pointer
    if (event.type === 'down') return { state: { last: { xPx, yPx } }, effects: [] }
    if (!state.last) return { state, effects: [] }
    const pan = { type: 'pan' as const, dxPx: xPx - state.last.xPx, dyPx: yPx - state.last.yPx }
    return { state: { last: event.type === 'up' ? null : { xPx, yPx } }, effects: [pan] }
  },
  display: (state) => ({ ...IDLE_DISPLAY, cursor: state.last ? 'grabbing' : 'grab' }),
}
