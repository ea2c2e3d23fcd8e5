/** The order in which the parts go on, from which side and how, and what cannot go on. */
import { Banner } from '@/components/banner'
import { EmptyState } from '@/components/empty-state'
import { Cautions } from '@/drawings/cautions'
import { useLayoutStore } from '@/stores/layout-store'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useResultsStore } from '@/stores/results-store'
import { AssemblySteps } from './assembly-steps'
import { joiningCautions } from './joining-cautions'

export function AssemblyPlan() {
  const layout = useLayoutStore((state) => state.visible)
  const results = useResultsStore((state) => state.results)
  const units = usePreferencesStore((state) => state.units)
  if (layout === null) return null
  if (layout.hubs.length === 0) {
    return (
      <EmptyState title="Nothing to assemble yet">
        Add a hub on the drawing; its place in the order appears here.
      </EmptyState>
    )
  }
  if (results === null) return <p className="px-4 py-3 text-sm text-quiet">Calculating…</p>

  const nameOf = (id: string) =>
    layout.hubs.find((hub) => hub.id === id)?.name ??
    (layout.bearings.some((bearing) => bearing.id === id)
      ? `bearing ${layout.bearings.find((bearing) => bearing.id === id)?.name}`
      : id)
  const { feasible, blocked } = results.assembly
  return (
    <div className="grid gap-3 px-4 py-3">
      {!feasible && (
        <Banner tone="bad" title="This layout cannot be assembled">
          {blocked.length === 0 ? (
            <p>No order exists in which every part reaches its seat.</p>
          ) : (
            <ul>
              {blocked.map(({ part, reason }) => (
                <li key={part}>
                  <span className="font-semibold">{nameOf(part)}:</span> {reason}
                </li>
              ))}
            </ul>
          )}
        </Banner>
      )}
      <AssemblySteps layout={layout} results={results} units={units} nameOf={nameOf} />
      <section aria-label="Cautions" className="max-w-4xl">
        <h3 className="text-[13px] font-bold text-plum">Cautions</h3>
        <ul className="mt-1 list-disc pl-5 text-[13px]">
          {joiningCautions(
            layout.hubs,
            results.hubs.some(({ isBrittle }) => isBrittle),
          ).map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
        </ul>
      </section>
      <Cautions />
    </div>
  )
}
