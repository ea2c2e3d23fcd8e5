/** Runs one tool at a time and hides the type of its memory from the driver. */
import { bearingTool } from './bearing-tool'
import { hubTool } from './hub-tool'
import { loadTool } from './load-tool'
import { measureTool } from './measure-tool'
import { panTool } from './pan-tool'
import { sectionTool } from './section-tool'
import { selectTool } from './select-tool'
import type { Tool, ToolContext, ToolDisplay, ToolEffect, ToolEvent, ToolId } from './tool'

export interface RunningTool {
  readonly id: ToolId
  send: (event: ToolEvent, context: ToolContext) => ToolEffect[]
  display: () => ToolDisplay
}

function run<State>(tool: Tool<State>): RunningTool {
  let state = tool.initial
  return {
    id: tool.id,
    send(event, context) {
      const next = tool.step(state, event, context)
      state = next.state
      return next.effects
    },
    display: () => tool.display(state),
  }
}

const STARTERS: Record<ToolId, () => RunningTool> = {
  select: () => run(selectTool),
  section: () => run(sectionTool),
  hub: () => run(hubTool),
  bearing: () => run(bearingTool),
  load: () => run(loadTool),
  measure: () => run(measureTool),
  pan: () => run(panTool),
}

export const startTool = (id: ToolId): RunningTool => STARTERS[id]()

/** Tools that only look, for people who may not edit. */
export const READING_TOOLS: readonly ToolId[] = ['select', 'measure', 'pan']
