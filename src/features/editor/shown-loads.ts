/** The one load case a drawing can show: the chosen one, else the one that is hardest on the shaft. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { useResultsStore } from '@/stores/results-store'
import { isWorst, shownShaftCase } from '@/stores/shown-load-case'

export function shownLoadCaseId(document: LayoutDocument): string | null {
  const { results, selectedLoadCaseId } = useResultsStore.getState()
  const wanted = isWorst(selectedLoadCaseId)
    ? results && shownShaftCase(results, selectedLoadCaseId)?.loadCase
    : selectedLoadCaseId
  const found = document.loadCases.find(({ id }) => id === wanted) ?? document.loadCases[0]
  return found?.id ?? null
}

/** The same for components: they redraw when the answer changes. */
export const useShownLoadCaseId = (document: LayoutDocument | null): string | null =>
  useResultsStore(() => (document ? shownLoadCaseId(document) : null))
