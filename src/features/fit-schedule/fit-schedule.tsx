/** Every hub's numbers and its window on a common scale, in step with the drawing. */
import { type KeyboardEvent, useState } from 'react'
import type { Sorting } from '@/components/data-table'
import { EmptyState } from '@/components/empty-state'
import { Cautions } from '@/drawings/cautions'
import { formatGiven } from '@/lib/format-quantity'
import { displayUnit } from '@/lib/quantity-units'
import { useLayoutStore } from '@/stores/layout-store'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useResultsStore } from '@/stores/results-store'
import { windowScale, windowValuesOf } from '@shared/drawing/interference-window-geometry'
import { ScheduleHead } from './schedule-head'
import { ScheduleList } from './schedule-list'
import { ScheduleRowView } from './schedule-row'
import { type ScheduleColumn, scheduleRows, sortRows } from './schedule-rows'
import { ScheduleTotals } from './schedule-totals'

export function FitSchedule() {
  const layout = useLayoutStore((state) => state.visible)
  const results = useResultsStore((state) => state.results)
  const selectedLoadCase = useResultsStore((state) => state.selectedLoadCaseId)
  const units = usePreferencesStore((state) => state.units)
  const [sorting, setSorting] = useState<Sorting<ScheduleColumn>>({ key: 'number', direction: 'ascending' })
  /** While somebody types in the table the rows stay where they are, whatever the numbers do. */
  const [heldOrder, setHeldOrder] = useState<string[] | null>(null)
  if (layout === null) return null
  if (layout.hubs.length === 0) {
    return <EmptyState title="No hubs yet">Add a hub on the drawing; its fit appears here.</EmptyState>
  }

  const rows = scheduleRows(layout, results, selectedLoadCase)
  const sorted = sortRows(rows, sorting)
  const place = (id: string) => {
    const index = heldOrder?.indexOf(id) ?? -1
    return index < 0 ? Infinity : index
  }
  const ordered =
    heldOrder === null
      ? sorted
      : [...sorted].sort((one, other) => place(one.hub.id) - place(other.hub.id) || 0)
  const scale = windowScale(
    rows.flatMap(({ result }) => (result === null ? [] : [windowValuesOf(result)])),
    displayUnit('interference', units).factor,
  )
  const scaleText = `${formatGiven(scale.fromUm, 'interference', units).number} to ${formatGiven(scale.toUm, 'interference', units).text}`

  return (
    <div>
      <div
        className="hidden sm:block"
        onFocus={(event) => {
          if (event.target instanceof HTMLInputElement)
            setHeldOrder((held) => held ?? ordered.map(({ hub }) => hub.id))
        }}
        onBlur={(event) => {
          const isStillTyping =
            event.relatedTarget instanceof HTMLInputElement &&
            event.currentTarget.contains(event.relatedTarget)
          if (!isStillTyping) setHeldOrder(null)
        }}
      >
        <table className="w-full border-collapse text-sm" onKeyDown={moveBetweenRows}>
          <caption className="sr-only">Fit schedule</caption>
          <ScheduleHead sorting={sorting} onSort={setSorting} scaleText={scaleText} units={units} />
          <tbody>
            {ordered.map((row) => (
              <ScheduleRowView key={row.hub.id} row={row} layout={layout} scale={scale} units={units} />
            ))}
          </tbody>
          <ScheduleTotals rows={rows} layout={layout} units={units} />
        </table>
      </div>
      <ScheduleList rows={sorted} layout={layout} scale={scale} units={units} />
      <Cautions className="px-4 py-2" />
    </div>
  )
}

/** Enter commits (the field does that) and goes to the same column one row down, with Shift one up. */
function moveBetweenRows(event: KeyboardEvent<HTMLTableElement>) {
  const { target } = event
  if (event.key !== 'Enter' || !(target instanceof HTMLInputElement)) return
  const cell = target.closest('td,th')
  const row = target.closest('tr')
  if (cell === null || row === null) return
  const column = [...row.children].indexOf(cell)
  const next = event.shiftKey ? row.previousElementSibling : row.nextElementSibling
  // The field shows what is wrong with the value only after this event; then one stays in it.
  setTimeout(() => {
    if (target.getAttribute('aria-invalid') === 'true') return
    next?.children[column]?.querySelector('input')?.focus()
  })
}
