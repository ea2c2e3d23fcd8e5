/** The tables under the drawing. The chosen one stands in the address, so that a link opens it. */
import { lazy, type ReactNode, Suspense } from 'react'
import { useSearchParams } from 'react-router'
import { Tabs } from '@/components/tabs'
import { FitSchedule } from '@/features/fit-schedule/fit-schedule'
import { FindingsList } from '@/features/results/findings-list'
import { useResultsStore } from '@/stores/results-store'
import { PageLoading } from '../../page-loading'

// Tables that are not in sight at first come when they are opened.
const AssemblyPlan = lazy(async () => ({
  default: (await import('@/features/assembly-plan/assembly-plan')).AssemblyPlan,
}))
const LoadCasesPanel = lazy(async () => ({
  default: (await import('@/features/load-cases/load-cases-panel')).LoadCasesPanel,
}))
const ShaftSectionsPanel = lazy(async () => ({
  default: (await import('@/features/shaft-sections/shaft-sections-panel')).ShaftSectionsPanel,
}))

export interface TableTab {
  id: string
  label: ReactNode
  content: ReactNode
}

/** "Findings 3", the three in the colour and with the sign of failing. */
function FindingsLabel() {
  const failing = useResultsStore(
    (state) => state.results?.findings.filter(({ severity }) => severity === 'fails').length ?? 0,
  )
  const others = useResultsStore(
    (state) => state.results?.findings.filter(({ severity }) => severity === 'warns').length ?? 0,
  )
  return (
    <span className="inline-flex items-baseline gap-1.5">
      Findings
      {failing > 0 && (
        <span className="rounded-full bg-bad-soft px-1.5 text-xs text-bad">
          <span aria-hidden="true">✕ </span>
          {failing}
          <span className="sr-only"> failing</span>
        </span>
      )}
      {failing === 0 && others > 0 && (
        <span className="rounded-full bg-straw-soft px-1.5 text-xs text-straw-ink">
          {others}
          <span className="sr-only"> warnings</span>
        </span>
      )}
    </span>
  )
}

export const TABLE_TABS: readonly TableTab[] = [
  { id: 'schedule', label: 'Fit schedule', content: <FitSchedule /> },
  { id: 'findings', label: <FindingsLabel />, content: <FindingsList /> },
  { id: 'load-cases', label: 'Load cases', content: <LoadCasesPanel /> },
  { id: 'sections', label: 'Shaft sections', content: <ShaftSectionsPanel /> },
  { id: 'assembly', label: 'Assembly plan', content: <AssemblyPlan /> },
]

export function BenchTables({ tabs, panelClassName }: { tabs: readonly TableTab[]; panelClassName: string }) {
  const [search, setSearch] = useSearchParams()
  const shown = tabs.find(({ id }) => id === search.get('tab')) ?? tabs[0]
  if (!shown) return null
  return (
    <Tabs
      label="Tables"
      items={tabs}
      selectedId={shown.id}
      onSelect={(id) =>
        setSearch(
          (current) => {
            current.set('tab', id)
            return current
          },
          { replace: true },
        )
      }
      panelClassName={panelClassName}
    >
      <Suspense fallback={<PageLoading label="Loading the table" />}>{shown.content}</Suspense>
    </Tabs>
  )
}
