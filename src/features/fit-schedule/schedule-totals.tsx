import { formatResult, formatSafety } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { extreme } from '@/stores/shown-load-case'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { ScheduleRow } from './schedule-rows'

interface ScheduleTotalsProps {
  rows: readonly ScheduleRow[]
  layout: LayoutDocument
  units: UnitSystem
}

/** The foot of the table: how many, how heavy, and which hub is nearest to slipping, in which case. */
export function ScheduleTotals({ rows, layout, units }: ScheduleTotalsProps) {
  return (
    <tfoot>
      <tr>
        <td colSpan={15} className="px-3 py-2 text-xs text-quiet">
          {totalsWords(rows, layout, units)}
        </td>
      </tr>
    </tfoot>
  )
}

export function totalsWords(rows: readonly ScheduleRow[], layout: LayoutDocument, units: UnitSystem): string {
  const massKg = rows.reduce((sum, { hub }) => sum + (hub.massKg ?? 0), 0)
  const withoutMass = rows.filter(({ hub }) => hub.massKg == null).length
  const inside = rows.filter(({ result }) => result?.verdict === 'passes').length
  const worst = extreme(
    rows,
    ({ shown }) => (shown?.slipSafety == null ? null : shown.slipSafety / shown.slipSafetyLimit),
    'least',
  )
  const caseName = layout.loadCases.find(({ id }) => id === worst?.shown?.loadCase)?.name
  return [
    `${rows.length} ${rows.length === 1 ? 'hub' : 'hubs'}, ${inside} without a failing check`,
    massKg > 0
      ? `mass given ${formatResult(massKg, 'mass', units).text}${withoutMass > 0 ? `, ${withoutMass} by size` : ''}`
      : '',
    worst?.shown
      ? `nearest to slipping: ${worst.hub.name}, ${formatSafety(worst.shown.slipSafety, worst.shown.slipSafetyLimit)} against ${worst.shown.slipSafetyLimit}${caseName === undefined ? '' : ` in case “${caseName}”`}`
      : '',
  ]
    .filter((words) => words !== '')
    .join('; ')
}
