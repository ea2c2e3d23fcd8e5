import type { EditorAction } from './action'
import { EDIT_ACTIONS } from './edit-actions'
import { TOOL_ACTIONS } from './tool-actions'
import { VIEW_ACTIONS } from './view-actions'

export const ALL_ACTIONS: readonly EditorAction[] = [...TOOL_ACTIONS, ...EDIT_ACTIONS, ...VIEW_ACTIONS]

/** What the menu of a part offers. */
export const PART_MENU_IDS = ['duplicate', 'flip-side', 'copy', 'cut', 'paste', 'delete'] as const

export function actionById(id: string): EditorAction {
  const action = ALL_ACTIONS.find((candidate) => candidate.id === id)
  if (!action) throw new Error(`No action "${id}"`)
  return action
}
