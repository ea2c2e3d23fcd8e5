/** Joins actions to the open layout: reads the stores at the moment an action is used. */
import { createContext, useContext } from 'react'
import { useLayoutStore } from '@/stores/layout-store'
import { useSelectionStore } from '@/stores/selection-store'
import type { LayoutSession } from '@/sync/layout-session'
import type { ActionContext, EditorAction } from './actions/action'
import type { Nudger } from './actions/nudge'
import type { ToolDriver } from './tool-driver'
import { useToolStore } from './tool-store'

export interface BenchActions {
  driver: ToolDriver
  nudger: Nudger
  context: () => ActionContext | null
  run: (action: EditorAction) => void
}

export function createBenchActions(
  session: LayoutSession,
  driver: ToolDriver,
  nudger: Nudger,
  showHelp: () => void,
): BenchActions {
  const context = (): ActionContext | null => {
    const { visible, access, canUndo, canRedo } = useLayoutStore.getState()
    if (!visible) return null
    return {
      session,
      driver,
      document: visible,
      selectedIds: useSelectionStore.getState().selectedIds,
      canEdit: access?.canEdit ?? false,
      canUndo,
      canRedo,
      toolId: useToolStore.getState().toolId,
      showHelp,
    }
  }
  return {
    driver,
    nudger,
    context,
    run(action) {
      nudger.settle()
      const now = context()
      if (now && action.isAvailable(now)) action.perform(now)
    },
  }
}

export const BenchActionsContext = createContext<BenchActions | null>(null)

export function useBenchActions(): BenchActions {
  const actions = useContext(BenchActionsContext)
  if (!actions) throw new Error('useBenchActions needs the editor around it')
  return actions
}
