import { ColumnHead, SortableColumnHead, type Sorting } from '@/components/data-table'
import { displayUnit, type UnitSystem } from '@/lib/quantity-units'
import type { ScheduleColumn } from './schedule-rows'

interface ScheduleHeadProps {
  sorting: Sorting<ScheduleColumn>
  onSort: (sorting: Sorting<ScheduleColumn>) => void
  /** Range of the common scale of the windows. */
  scaleText: string
  units: UnitSystem
}

export function ScheduleHead({ sorting, onSort, scaleText, units }: ScheduleHeadProps) {
  const mm = displayUnit('length', units).symbol
  const um = displayUnit('interference', units).symbol
  const head = (columnKey: ScheduleColumn, text: string, align: 'left' | 'right' = 'right') => (
    <SortableColumnHead columnKey={columnKey} sorting={sorting} onSort={onSort} align={align}>
      {text}
    </SortableColumnHead>
  )
  return (
    <thead className="sticky top-0 z-10 bg-card">
      <tr>
        {head('number', '#', 'left')}
        {head('name', 'Hub', 'left')}
        {head('station', `From z, ${mm}`)}
        {head('length', `Length, ${mm}`)}
        {head('outerDiameter', `Outer ⌀, ${mm}`)}
        {head('seatDiameter', `Seat ⌀, ${mm}`)}
        <ColumnHead>Fit</ColumnHead>
        {head('interference', `Least … most, ${um}`)}
        <ColumnHead className="w-[18%] min-w-48">Window, {scaleText}</ColumnHead>
        {head('torque', 'Torque safety')}
        {head('axial', 'Axial safety')}
        {head('slip', 'Combined slip')}
        {head('hubStress', 'Hub stress')}
        {head('joining', 'Join at')}
        {head('order', 'Order, side', 'left')}
      </tr>
    </thead>
  )
}
