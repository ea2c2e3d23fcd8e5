/** Load cases: what acts on the hubs together, at which speed and temperatures. */
import { useState } from 'react'
import { Button } from '@/components/button'
import { EmptyState } from '@/components/empty-state'
import { Icon } from '@/components/icon'
import { commitProblem } from '@/fields/layout-field'
import { useLayoutSession } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'
import { useResultsStore, WORST_CASE } from '@/stores/results-store'
import { LoadCaseDetails } from './load-case-details'
import { addLoadCase, type LoadCaseEdit } from './load-case-operations'

export function LoadCasesPanel() {
  const layout = useLayoutStore((state) => state.visible)
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  const session = useLayoutSession()
  const selectedForResults = useResultsStore((state) => state.selectedLoadCaseId)
  const findings = useResultsStore((state) => state.results?.findings)
  const [shownId, setShownId] = useState<string | null>(
    selectedForResults === WORST_CASE ? null : selectedForResults,
  )
  const [problem, setProblem] = useState<string | null>(null)
  if (layout === null) return null

  const run = ({ label, operations, showId }: LoadCaseEdit) => {
    const refused = commitProblem(session.commit(label, operations))
    setProblem(refused)
    if (refused === null) setShownId(showId)
  }
  const shown = layout.loadCases.find(({ id }) => id === shownId) ?? layout.loadCases[0]
  const addButton = canEdit && (
    <Button size="sm" icon={<Icon name="add" />} onClick={() => run(addLoadCase(layout))}>
      Add load case
    </Button>
  )

  if (shown === undefined) {
    return (
      <EmptyState title="No load case yet" action={addButton}>
        A load case is a set of torques and forces that act together. Without one, only the stresses of the
        fits are known.
      </EmptyState>
    )
  }
  return (
    <div className="grid items-start gap-x-5 gap-y-3 px-4 py-3 lg:grid-cols-[13rem_minmax(0,1fr)]">
      <nav aria-label="Load cases" className="grid gap-2">
        <ul className="flex flex-wrap gap-1 lg:grid">
          {layout.loadCases.map(({ id, name }) => {
            const failing =
              findings?.filter((finding) => finding.severity === 'fails' && finding.loadCase === id).length ??
              0
            const isShown = id === shown.id
            return (
              <li key={id}>
                <button
                  type="button"
                  aria-current={isShown ? 'true' : undefined}
                  onClick={() => setShownId(id)}
                  className={`flex w-full items-baseline justify-between gap-2 rounded-md px-2.5 py-1.5 text-left text-sm ${isShown ? 'bg-steel-soft font-bold text-steel' : 'hover:bg-paper'}`}
                >
                  <span className="truncate">{name}</span>
                  {failing > 0 && (
                    <span className="text-xs font-bold whitespace-nowrap text-bad">
                      <span aria-hidden="true">✕ </span>
                      {failing} {failing === 1 ? 'fails' : 'fail'}
                    </span>
                  )}
                </button>
              </li>
            )
          })}
        </ul>
        {addButton}
        {problem !== null && (
          <p role="alert" className="text-xs font-medium text-bad">
            {problem}
          </p>
        )}
      </nav>
      <LoadCaseDetails key={shown.id} loadCase={shown} layout={layout} canEdit={canEdit} run={run} />
    </div>
  )
}
