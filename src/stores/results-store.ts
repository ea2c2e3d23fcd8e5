/**
 * The latest results of the layout on screen. Derived, never synced, never stored. `document` is
 * what they were calculated from; while the layout has moved on, `isStale` is true and panels say
 * "updating" instead of showing old numbers as current.
 */
import { create } from 'zustand'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { LayoutResults } from '@shared/recalculation/layout-results'

/** Shows, for each hub and for the shaft, the load case that comes nearest to its limit. */
export const WORST_CASE = 'worst'

export interface ResultsState {
  results: LayoutResults | null
  document: LayoutDocument | null
  isStale: boolean
  /** Plain words when the calculation could not run. */
  failure: string | null
  /** A load case id, or `'worst'`. */
  selectedLoadCaseId: string | null
  selectLoadCase: (loadCaseId: string) => void
}

export const useResultsStore = create<ResultsState>()((set) => ({
  results: null,
  document: null,
  isStale: false,
  failure: null,
  selectedLoadCaseId: WORST_CASE,
  selectLoadCase: (loadCaseId) => set({ selectedLoadCaseId: loadCaseId }),
}))
