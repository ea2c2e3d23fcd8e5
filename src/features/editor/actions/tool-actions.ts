/** Taking up a tool. */
import type { ToolId } from '../tools/tool'
import { READING_TOOLS } from '../tools/tool-runner'
import type { EditorAction } from './action'

interface ToolWords {
  id: ToolId
  label: string
  key: string
  /** What the tool does, for the help. */
  help: string
}

/** In the order of the list beside the drawing. */
export const TOOLS: readonly ToolWords[] = [
  { id: 'select', label: 'Select', key: 'v', help: 'Select, move and resize parts' },
  { id: 'section', label: 'Section', key: 's', help: 'Split or draw a shaft section' },
  { id: 'hub', label: 'Hub', key: 'h', help: 'Place a gear, cam, pulley or disc' },
  { id: 'bearing', label: 'Bearing', key: 'b', help: 'Place a bearing' },
  { id: 'load', label: 'Load', key: 'l', help: 'Put a force on a hub' },
  { id: 'measure', label: 'Measure', key: 'm', help: 'Measure a distance along the shaft' },
  { id: 'pan', label: 'Pan', key: 'p', help: 'Shift the drawing' },
]

export const TOOL_ACTIONS: readonly EditorAction[] = TOOLS.map(({ id, key, help }) => ({
  id: `tool-${id}`,
  label: help,
  group: 'Tools',
  chords: [{ key }],
  isAvailable: ({ canEdit }) => canEdit || READING_TOOLS.includes(id),
  perform: ({ driver }) => driver.takeUp(id),
}))
