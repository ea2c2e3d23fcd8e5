import { useMemo } from 'react'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useResultsStore } from '@/stores/results-store'
import { stateOf, usePartStates } from '../part-states'
import type { WordsContext } from './part-words'

/** Everything the words of the outline are made from; null before the layout is there. */
export function useWordsContext(document: LayoutDocument | null): WordsContext | null {
  const states = usePartStates()
  const results = useResultsStore((state) => state.results)
  const selectedLoadCaseId = useResultsStore((state) => state.selectedLoadCaseId)
  const units = usePreferencesStore((state) => state.units)
  return useMemo(
    () =>
      document && {
        document,
        results,
        selectedLoadCaseId,
        units,
        stateOf: (id: string) => stateOf(states, id),
      },
    [document, results, selectedLoadCaseId, units, states],
  )
}
