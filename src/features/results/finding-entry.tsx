import { formatWithUnit } from '@/lib/format-quantity'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useResultsStore } from '@/stores/results-store'
import { useSelectionStore } from '@/stores/selection-store'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Finding } from '@shared/recalculation/layout-results'
import { partName } from './announcement'
import { FINDING_WORDS, SEVERITY_WORDS } from './finding-words'

interface FindingEntryProps {
  finding: Finding
  document: LayoutDocument
}

/** One finding. Pressing it selects the part and shows the numbers of its load case. */
export function FindingEntry({ finding, document }: FindingEntryProps) {
  const { code, severity, part, loadCase, value, limit, unit, message, remedy } = finding
  const isSelected = useSelectionStore((state) => part !== '' && state.selectedIds.includes(part))
  const select = useSelectionStore((state) => state.select)
  const clear = useSelectionStore((state) => state.clear)
  const hover = useSelectionStore((state) => state.hover)
  const selectLoadCase = useResultsStore((state) => state.selectLoadCase)
  const units = usePreferencesStore((state) => state.units)
  const caseName = document.loadCases.find(({ id }) => id === loadCase)?.name

  const go = () => {
    if (part === '') clear()
    else select([part])
    if (loadCase !== null) selectLoadCase(loadCase)
  }

  return (
    <li className="border-b border-hairline last:border-b-0">
      <button
        type="button"
        onClick={go}
        onPointerEnter={() => part !== '' && hover(part)}
        onPointerLeave={() => hover(null)}
        className={`block w-full px-4 py-2 text-left text-sm hover:bg-paper ${isSelected ? 'bg-steel-soft' : ''}`}
      >
        <span className="flex max-w-3xl flex-wrap items-baseline justify-between gap-x-4">
          <span className="font-semibold">
            <span className={SEVERITY_WORDS[severity].ink}>{FINDING_WORDS[code]}</span>
            <span className="sr-only"> ({SEVERITY_WORDS[severity].one})</span>
            {part !== '' && <span>: {partName(document, part)}</span>}
            {caseName !== undefined && <span className="font-normal text-quiet">, case “{caseName}”</span>}
          </span>
          {value !== null && (
            <span className="whitespace-nowrap tabular-nums">
              <span className={severity === 'fails' ? 'font-bold text-bad' : 'font-bold'}>
                {formatWithUnit(value, unit, units)}
              </span>
              {limit !== null && (
                <span className="text-quiet"> against {formatWithUnit(limit, unit, units)}</span>
              )}
            </span>
          )}
        </span>
        <span className="block text-[13px]">{message}</span>
        {remedy !== '' && <span className="block text-[13px] text-quiet">{remedy}</span>}
      </button>
    </li>
  )
}
