/** One quiet line under the drawing: what the tool in hand expects, else whose loads are drawn. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { useResultsStore } from '@/stores/results-store'
import { isWorst } from '@/stores/shown-load-case'
import { useShownLoadCaseId } from '../shown-loads'
import { useToolStore } from '../tool-store'

export function StatusLine({ document }: { document: LayoutDocument }) {
  const hint = useToolStore((state) => state.display.hint)
  const loadCaseId = useShownLoadCaseId(document)
  const isWorstShown = useResultsStore((state) => isWorst(state.selectedLoadCaseId))
  const loadCase = document.loadCases.find(({ id }) => id === loadCaseId)
  const words =
    hint ??
    (loadCase
      ? `Loads and diagrams: case “${loadCase.name}”${isWorstShown && document.loadCases.length > 1 ? ', hardest on the shaft' : ''}`
      : 'No load case yet')
  return (
    <p className="min-w-0 flex-1 truncate text-xs text-quiet" title={words}>
      {words}
    </p>
  )
}
