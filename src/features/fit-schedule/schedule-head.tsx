import { nextSorting, type Sorting } from '@/components/data-table'
import { Icon } from '@/components/icon'
import { displayUnit, type UnitSystem } from '@/lib/quantity-units'
import type { ScheduleColumn } from './schedule-rows'

interface ScheduleHeadProps {
  sorting: Sorting<ScheduleColumn>
  onSort: (sorting: Sorting<ScheduleColumn>) => void
  /** Range of the common scale of the windows. */
  scaleText: string
  units: UnitSystem
}

/** Two short lines instead of one long one: fifteen columns have to fit. */
const HEAD =
  'border-b border-hairline px-1.5 py-1.5 text-xs leading-tight font-semibold whitespace-nowrap text-quiet align-bottom first:pl-4'

export function ScheduleHead({ sorting, onSort, scaleText, units }: ScheduleHeadProps) {
  const mm = displayUnit('length', units).symbol
  const um = displayUnit('interference', units).symbol
  const head = (
    columnKey: ScheduleColumn,
    lines: readonly string[],
    align: 'left' | 'right' = 'right',
    className = '',
  ) => {
    const isSorted = sorting.key === columnKey
    return (
      <th
        scope="col"
        aria-sort={isSorted ? sorting.direction : 'none'}
        className={`${HEAD} ${align === 'right' ? 'text-right' : 'text-left'} ${className}`}
      >
        <button
          type="button"
          className={`inline-flex items-end gap-0.5 rounded font-semibold hover:text-ink ${isSorted ? 'text-ink' : ''} ${align === 'right' ? 'flex-row-reverse text-right' : 'text-left'}`}
          onClick={() => onSort(nextSorting(sorting, columnKey))}
        >
          <span>
            {lines.map((line) => (
              <span key={line} className="block">
                {line}{' '}
              </span>
            ))}
          </span>
          {isSorted && (
            <Icon
              name={sorting.direction === 'descending' ? 'arrowDown' : 'arrowUp'}
              className="mb-0.5 size-3"
            />
          )}
        </button>
      </th>
    )
  }
  return (
    <thead className="sticky top-0 z-10 bg-card">
      <tr>
        {head('number', ['#'], 'left')}
        {head('name', ['Hub'], 'left', 'sticky left-0 bg-card')}
        {head('station', ['From z', mm])}
        {head('length', ['Length', mm])}
        {head('outerDiameter', ['Outer ⌀', mm])}
        {head('seatDiameter', ['Seat ⌀', mm])}
        <th scope="col" className={`${HEAD} text-left`}>
          Fit
        </th>
        {head('interference', ['Least … most', um])}
        <th scope="col" className={`${HEAD} min-w-60 text-left`}>
          Window, {scaleText}
        </th>
        {head('torque', ['Torque', 'safety'])}
        {head('axial', ['Axial', 'safety'])}
        {head('slip', ['Combined', 'slip'])}
        {head('hubStress', ['Hub', 'stress'])}
        {head('joining', ['Join at'])}
        {head('order', ['Order, side'], 'left')}
      </tr>
    </thead>
  )
}
