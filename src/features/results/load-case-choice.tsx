import { useLayoutStore } from '@/stores/layout-store'
import { useResultsStore, WORST_CASE } from '@/stores/results-store'

/** Chooses whose numbers are shown: the governing case of each, or one case. */
export function LoadCaseChoice() {
  const loadCases = useLayoutStore((state) => state.visible?.loadCases)
  const selected = useResultsStore((state) => state.selectedLoadCaseId)
  const select = useResultsStore((state) => state.selectLoadCase)
  if (loadCases === undefined) return null
  return (
    <label className="inline-flex items-center gap-1 text-sm font-semibold">
      <span>Case:</span>
      <select
        value={selected ?? WORST_CASE}
        onChange={(event) => select(event.target.value)}
        className="max-w-56 cursor-pointer truncate rounded-sm bg-transparent py-0.5 font-semibold hover:underline"
      >
        <option value={WORST_CASE}>{loadCases.length > 1 ? 'worst of each' : 'worst'}</option>
        {loadCases.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </select>
    </label>
  )
}
