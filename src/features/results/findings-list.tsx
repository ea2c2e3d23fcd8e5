/** What fails, warns and is worth knowing: where, why, by how much, and what would mend it. */
import { useState } from 'react'
import { Checkbox } from '@/components/checkbox'
import { Cautions } from '@/drawings/cautions'
import { useResultsStore } from '@/stores/results-store'
import { useSelectionStore } from '@/stores/selection-store'
import type { Severity } from '@shared/recalculation/layout-results'
import { findingKey } from './announcement'
import { FindingEntry } from './finding-entry'
import { SEVERITIES, SEVERITY_WORDS } from './finding-words'
import { useLasting } from './use-lasting'

export function FindingsList() {
  const findings = useResultsStore((state) => state.results?.findings)
  const document = useResultsStore((state) => state.document)
  const isUpdating = useLasting(
    useResultsStore((state) => state.isStale),
    document,
  )
  const selectedIds = useSelectionStore((state) => state.selectedIds)
  const [hidden, setHidden] = useState<readonly Severity[]>([])
  const [isOnlySelected, setIsOnlySelected] = useState(false)

  if (findings === undefined || document === null)
    return <p className="px-4 py-3 text-sm text-quiet">Calculating…</p>

  const inScope = findings.filter(({ part }) => !isOnlySelected || selectedIds.includes(part))
  const groups = SEVERITIES.map((severity) => ({
    severity,
    findings: inScope.filter((finding) => finding.severity === severity),
  }))
  const toggle = (severity: Severity) =>
    setHidden(
      hidden.includes(severity) ? hidden.filter((other) => other !== severity) : [...hidden, severity],
    )

  return (
    <section aria-label="Findings" aria-busy={isUpdating}>
      <div className="flex flex-wrap items-center gap-2 px-4 pt-3">
        {groups.map(({ severity, findings: list }) => {
          const { heading, sign, ink } = SEVERITY_WORDS[severity]
          const isShown = !hidden.includes(severity)
          return (
            <button
              key={severity}
              type="button"
              aria-pressed={isShown}
              onClick={() => toggle(severity)}
              className={`rounded-full border px-2.5 py-0.5 text-[13px] font-semibold ${isShown ? 'border-edge bg-card' : 'border-hairline text-quiet line-through'}`}
            >
              <span aria-hidden="true" className={ink}>
                {sign}
              </span>{' '}
              {heading} <span className="tabular-nums">{list.length}</span>
            </button>
          )
        })}
        <Checkbox label="Only selected parts" checked={isOnlySelected} onCheckedChange={setIsOnlySelected} />
        {isUpdating && <span className="text-xs text-quiet">updating…</span>}
      </div>
      {inScope.length === 0 && (
        <p className="px-4 py-4 text-sm">
          {isOnlySelected
            ? 'Nothing found on the selected parts.'
            : 'Nothing found: every check of this model passes.'}
        </p>
      )}
      <div className={isUpdating ? 'opacity-60' : ''}>
        {groups
          .filter(({ severity, findings: list }) => list.length > 0 && !hidden.includes(severity))
          .map(({ severity, findings: list }) => (
            <section key={severity} aria-label={SEVERITY_WORDS[severity].heading}>
              <h3 className={`px-4 pt-3 text-[13px] font-bold ${SEVERITY_WORDS[severity].ink}`}>
                <span aria-hidden="true">{SEVERITY_WORDS[severity].sign}</span>{' '}
                {SEVERITY_WORDS[severity].heading}
              </h3>
              <ul>
                {list.map((finding) => (
                  <FindingEntry key={findingKey(finding)} finding={finding} document={document} />
                ))}
              </ul>
            </section>
          ))}
      </div>
      <Cautions className="px-4 py-3" />
    </section>
  )
}
