/** Which tool is in hand and what it shows. The tool itself runs in the tool driver. */
import { create } from 'zustand'
import type { Hub } from '@shared/layout/layout-document'
import { IDLE_DISPLAY, type ToolDisplay, type ToolId } from './tools/tool'

interface ToolState {
  toolId: ToolId
  display: ToolDisplay
  hubRole: Hub['role']
  setHubRole: (role: Hub['role']) => void
}

export const useToolStore = create<ToolState>()((set) => ({
  toolId: 'select',
  display: IDLE_DISPLAY,
  hubRole: 'gear',
  setHubRole: (hubRole) => set({ hubRole }),
}))
