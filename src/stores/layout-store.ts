/**
 * The one store of the open layout. src/sync writes it; everything else reads it. The factory
 * exists so that a test can run several people side by side in one process.
 */
import { create, type StoreApi, type UseBoundStore } from 'zustand'
import type { LayoutState } from './layout-state'

export type LayoutStore = Pick<StoreApi<LayoutState>, 'getState' | 'setState' | 'subscribe'>

export const EMPTY_LAYOUT_STATE: LayoutState = {
  layoutId: null,
  confirmed: null,
  revision: 0,
  epoch: null,
  pending: [],
  preview: null,
  visible: null,
  access: null,
  you: null,
  people: [],
  connection: 'connecting',
  refusedReason: null,
  notices: [],
  refusedEdits: [],
  storageFailure: null,
  canUndo: false,
  canRedo: false,
  undoLabel: null,
  redoLabel: null,
}

export function createLayoutStore(): UseBoundStore<StoreApi<LayoutState>> {
  return create<LayoutState>()(() => EMPTY_LAYOUT_STATE)
}

export const useLayoutStore = createLayoutStore()
