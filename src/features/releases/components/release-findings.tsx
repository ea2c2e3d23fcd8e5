/** Findings at freezing, and the reasons for which failing ones were accepted. */
import { Sign } from '@/components/sign'
import { formatWithUnit } from '@/lib/format-quantity'
import { findingKey } from '@shared/protocol/releases'
import type { Severity } from '@shared/recalculation/layout-results'
import type { ReleaseDetails } from '../api/release'
import { loadCaseName, partName } from '../place-words'

const SEVERITIES = {
  fails: { word: 'Fails', sign: 'cross', ink: 'text-bad' },
  warns: { word: 'Warns', sign: 'warning', ink: 'text-straw-ink' },
  notes: { word: 'Note', sign: 'info', ink: 'text-quiet' },
} as const satisfies Record<Severity, object>
const ORDER: Severity[] = ['fails', 'warns', 'notes']

export function ReleaseFindings({ release }: { release: ReleaseDetails }) {
  const { document, results, acceptances } = release
  const reasons = new Map(acceptances.map((acceptance) => [findingKey(acceptance), acceptance.reason]))
  const findings = ORDER.flatMap((severity) =>
    results.findings.filter((finding) => finding.severity === severity),
  )
  if (findings.length === 0)
    return (
      <p className="flex items-center gap-2 text-sm">
        <Sign name="check" className="size-4 text-good" />
        Nothing was found at freezing.
      </p>
    )
  return (
    <ul className="divide-y divide-hairline text-sm">
      {findings.map((finding, index) => {
        const { word, sign, ink } = SEVERITIES[finding.severity]
        const reason = finding.severity === 'fails' ? reasons.get(findingKey(finding)) : undefined
        return (
          <li key={index} className="grid gap-x-8 gap-y-2 py-3 md:grid-cols-2">
            <div className="flex items-start gap-2">
              <Sign name={sign} className={`mt-0.5 size-4 shrink-0 ${ink}`} />
              <div className="min-w-0">
                <p className="font-semibold">
                  {word}: {partName(document, finding.part)}
                  {finding.loadCase !== null && `, ${loadCaseName(document, finding.loadCase)}`}
                  {finding.value !== null && (
                    <span className="font-normal tabular-nums">
                      {' '}
                      {formatWithUnit(finding.value, finding.unit)}
                      {finding.limit !== null && ` against ${formatWithUnit(finding.limit, finding.unit)}`}
                    </span>
                  )}
                </p>
                <p>{finding.message}</p>
                {reason === undefined && <p className="text-quiet">{finding.remedy}</p>}
              </div>
            </div>
            {reason !== undefined && (
              <div className="border-l-2 border-straw pl-4">
                <p className="font-semibold">Accepted by {release.frozenByName}</p>
                <p className="wrap-break-word">{reason}</p>
              </div>
            )}
          </li>
        )
      })}
    </ul>
  )
}
