/**
 * One quiet line under the drawing: what the tool in hand expects, else what is under the pointer
 * (names that found no room on the drawing are read here), else whose loads are drawn.
 */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { useResultsStore } from '@/stores/results-store'
import { useSelectionStore } from '@/stores/selection-store'
import { isWorst } from '@/stores/shown-load-case'
import { itemWords } from '../outline/part-words'
import { useWordsContext } from '../outline/use-words-context'
import { useShownLoadCaseId } from '../shown-loads'
import { useToolStore } from '../tool-store'

export function StatusLine({ document }: { document: LayoutDocument }) {
  const hint = useToolStore((state) => state.display.hint)
  const hoveredId = useSelectionStore((state) => state.hoveredId)
  const context = useWordsContext(document)
  const loadCaseWords = useLoadCaseWords(document)
  const words = hint ?? ((hoveredId !== null && context && itemWords(context, hoveredId)) || loadCaseWords)
  return (
    <p className="min-w-0 flex-1 truncate text-xs text-quiet" title={words}>
      {words}
    </p>
  )
}

function useLoadCaseWords(document: LayoutDocument): string {
  const loadCaseId = useShownLoadCaseId(document)
  const isWorstShown = useResultsStore((state) => isWorst(state.selectedLoadCaseId))
  const loadCase = document.loadCases.find(({ id }) => id === loadCaseId)
  if (!loadCase) return 'No load case yet'
  const isOneOfMany = isWorstShown && document.loadCases.length > 1
  return `Loads and diagrams: case “${loadCase.name}”${isOneOfMany ? ', hardest on the shaft' : ''}`
}
