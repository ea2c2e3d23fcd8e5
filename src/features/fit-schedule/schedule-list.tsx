import { JudgedNumber, safetyVerdict } from '@/components/judged-number'
import { InterferenceWindow, WindowSign } from '@/drawings/interference-window'
import { formatGiven } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { useSelectionStore } from '@/stores/selection-store'
import {
  type WindowScale,
  windowState,
  windowStateWords,
  windowValuesOf,
} from '@shared/drawing/interference-window-geometry'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { formatFit } from './fit-entry'
import { interferenceText, joiningText, orderText, safetyCells } from './schedule-cells'
import type { ScheduleRow } from './schedule-rows'
import { totalsWords } from './schedule-totals'

interface ScheduleListProps {
  rows: readonly ScheduleRow[]
  layout: LayoutDocument
  scale: WindowScale
  units: UnitSystem
}

/** The schedule for narrow screens: to read and to select, not to edit. */
export function ScheduleList({ rows, layout, scale, units }: ScheduleListProps) {
  const selectedIds = useSelectionStore((state) => state.selectedIds)
  const select = useSelectionStore((state) => state.select)
  return (
    <div className="sm:hidden">
      <ol>
        {rows.map((row) => {
          const { hub, number, result } = row
          const values = result === null ? null : windowValuesOf(result)
          const isSelected = selectedIds.includes(hub.id)
          return (
            <li
              key={hub.id}
              className={`border-b border-hairline px-4 py-3 ${isSelected ? 'bg-steel-soft' : ''}`}
            >
              <button
                type="button"
                aria-pressed={isSelected}
                onClick={() => select([hub.id])}
                className="w-full text-left"
              >
                <span className="flex flex-wrap items-baseline justify-between gap-x-3">
                  <span className="font-bold">
                    <span className="font-normal text-quiet">{number}</span> {hub.name}
                  </span>
                  {values !== null && (
                    <span className="text-xs font-semibold">
                      <WindowSign state={windowState(values)} /> {windowStateWords(values)}
                    </span>
                  )}
                </span>
                <span className="mt-0.5 block text-xs text-quiet tabular-nums">
                  {formatFit(hub.fit, units)}
                  {result?.seat.diameterMm != null &&
                    ` on ⌀${formatGiven(Number(result.seat.diameterMm.toFixed(3)), 'length', units).text}`}
                  , {interferenceText(row, units)} {units === 'inch' ? 'thou' : 'µm'}
                </span>
              </button>
              {values !== null && (
                <div className="mt-1.5">
                  <InterferenceWindow values={values} size="row" scale={scale} units={units} />
                </div>
              )}
              <dl className="mt-1.5 grid grid-cols-2 gap-x-4 text-xs">
                {safetyCells(row, layout).map(({ quantity, label, value, limit, text }) => (
                  <div key={quantity} className="flex justify-between gap-2">
                    <dt className="text-quiet">{label.replace(' safety', '')}</dt>
                    <dd>
                      <JudgedNumber
                        text={text}
                        verdict={safetyVerdict(value, limit)}
                        label={`${label} of ${hub.name}`}
                      />
                    </dd>
                  </div>
                ))}
                <div className="flex justify-between gap-2">
                  <dt className="text-quiet">join at</dt>
                  <dd className="font-semibold tabular-nums">{joiningText(row, units)}</dd>
                </div>
                <div className="flex justify-between gap-2">
                  <dt className="text-quiet">order</dt>
                  <dd className="font-semibold">{orderText(row)}</dd>
                </div>
              </dl>
            </li>
          )
        })}
      </ol>
      <p className="px-4 py-2 text-xs text-quiet">{totalsWords(rows, layout, units)}</p>
    </div>
  )
}
