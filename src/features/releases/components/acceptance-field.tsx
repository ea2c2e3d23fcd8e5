import { Icon } from '@/components/icon'
import { TextAreaField } from '@/components/text-area-field'
import { formatWithUnit } from '@/lib/format-quantity'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Finding } from '@shared/recalculation/layout-results'
import { codeWords, loadCaseName, partName } from '../place-words'

/** One failing finding and why it is accepted. */
export function AcceptanceField({
  finding,
  document,
  reason,
  error,
  onChange,
}: {
  finding: Finding
  document: LayoutDocument
  reason: string
  error: string | undefined
  onChange: (reason: string) => void
}) {
  const part = partName(document, finding.part)
  const place = finding.loadCase === null ? part : `${part}, ${loadCaseName(document, finding.loadCase)}`
  return (
    <div className="grid gap-3 border-l-2 border-bad pl-4 md:grid-cols-2 md:gap-6">
      <div>
        <p className="flex items-start gap-1.5 font-semibold">
          <Icon name="cross" className="mt-0.5 size-4 shrink-0 text-bad" />
          <span>
            {place}
            {finding.value !== null && (
              <span className="text-bad tabular-nums">
                {' '}
                {formatWithUnit(finding.value, finding.unit)}
                {finding.limit !== null && (
                  <span className="font-normal text-quiet">
                    {' '}
                    against {formatWithUnit(finding.limit, finding.unit)}
                  </span>
                )}
              </span>
            )}
          </span>
        </p>
        <p className="mt-1">{finding.message}</p>
        <p className="mt-1 text-quiet">{finding.remedy}</p>
      </div>
      <TextAreaField
        label={`Why ${codeWords(finding.code)} of ${place} is accepted`}
        value={reason}
        maxLength={1000}
        error={error}
        onChange={(event) => onChange(event.target.value)}
      />
    </div>
  )
}
