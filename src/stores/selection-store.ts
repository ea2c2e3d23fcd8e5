/**
 * Which parts are selected and which one the pointer or the keyboard is on. Ids are hub, bearing
 * and section ids; they are unique over the three kinds within a layout.
 */
import { create } from 'zustand'

interface SelectionState {
  selectedIds: string[]
  hoveredId: string | null
  /** Replaces the selection. */
  select: (ids: readonly string[]) => void
  /** Adds the part, or takes it out when it is in. */
  toggle: (id: string) => void
  hover: (id: string | null) => void
  clear: () => void
}

/** One constant, so that clearing an empty selection changes nothing for subscribers. */
const NOTHING: string[] = []

const isSameList = (a: readonly string[], b: readonly string[]) =>
  a.length === b.length && a.every((id, index) => id === b[index])

export const useSelectionStore = create<SelectionState>()((set) => ({
  selectedIds: NOTHING,
  hoveredId: null,
  select: (ids) =>
    set((state) => {
      const unique = [...new Set(ids)].filter((id) => id !== '')
      if (isSameList(unique, state.selectedIds)) return state
      return { selectedIds: unique.length === 0 ? NOTHING : unique }
    }),
  toggle: (id) =>
    set((state) => {
      if (id === '') return state
      const rest = state.selectedIds.filter((other) => other !== id)
      if (rest.length === state.selectedIds.length) return { selectedIds: [...rest, id] }
      return { selectedIds: rest.length === 0 ? NOTHING : rest }
    }),
  hover: (id) => set((state) => (state.hoveredId === id ? state : { hoveredId: id })),
  clear: () => set((state) => (state.selectedIds.length === 0 ? state : { selectedIds: NOTHING })),
}))
