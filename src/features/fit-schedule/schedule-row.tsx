import { type MouseEvent, memo } from 'react'
import { Cell } from '@/components/data-table'
import { JudgedNumber, safetyVerdict } from '@/components/judged-number'
import { InterferenceWindow, WindowSign } from '@/drawings/interference-window'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { LayoutTextField } from '@/fields/layout-text-field'
import { hubAddress } from '@/fields/part-address'
import { formatGiven } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { useDerivationStore } from '@/stores/derivation-store'
import { useSelectionStore } from '@/stores/selection-store'
import {
  type WindowScale,
  windowState,
  windowStateWords,
  windowValuesOf,
} from '@shared/drawing/interference-window-geometry'
import type { InterferenceFit, LayoutDocument } from '@shared/layout/layout-document'
import { formatFit, parseFit } from './fit-entry'
import { interferenceText, isTooHot, joiningText, orderText, safetyCells } from './schedule-cells'
import type { ScheduleRow } from './schedule-rows'

interface ScheduleRowViewProps {
  row: ScheduleRow
  layout: LayoutDocument
  scale: WindowScale
  units: UnitSystem
}

export const ScheduleRowView = memo(
  ScheduleRowContent,
  (before, after) =>
    before.row.hub === after.row.hub &&
    before.row.number === after.row.number &&
    before.row.result === after.row.result &&
    before.row.shown === after.row.shown &&
    before.layout.criteria === after.layout.criteria &&
    before.layout.loadCases === after.layout.loadCases &&
    before.scale.fromUm === after.scale.fromUm &&
    before.scale.toUm === after.scale.toUm &&
    before.units === after.units,
)

function ScheduleRowContent({ row, layout, scale, units }: ScheduleRowViewProps) {
  const { hub, number, result, shown } = row
  const isSelected = useSelectionStore((state) => state.selectedIds.includes(hub.id))
  const isHovered = useSelectionStore((state) => state.hoveredId === hub.id)
  const select = useSelectionStore((state) => state.select)
  const toggle = useSelectionStore((state) => state.toggle)
  const hover = useSelectionStore((state) => state.hover)
  const openDerivation = useDerivationStore((state) => state.open)

  const choose = (event: MouseEvent) => {
    if (event.ctrlKey || event.metaKey || event.shiftKey) toggle(hub.id)
    else select([hub.id])
  }
  const values = result === null ? null : windowValuesOf(result)
  const seat = result?.seat.diameterMm

  return (
    <tr
      aria-selected={isSelected}
      className={isSelected ? 'bg-steel-soft' : isHovered ? 'bg-paper' : 'bg-card'}
      onClick={choose}
      onFocus={() => !isSelected && select([hub.id])}
      onPointerEnter={() => hover(hub.id)}
      onPointerLeave={() => hover(null)}
    >
      <Cell className="px-1.5! py-1! pl-4!">
        <button
          type="button"
          aria-pressed={isSelected}
          aria-label={`Select ${hub.name}`}
          className={`min-w-6 rounded px-1 text-left tabular-nums ${isSelected ? 'font-bold text-steel' : 'text-quiet'}`}
        >
          {number}
        </button>
      </Cell>
      <th
        scope="row"
        className="sticky left-0 w-[22%] border-b border-hairline bg-inherit py-1 pr-2 text-left font-normal"
      >
        <LayoutTextField
          label={`Name of ${hub.name}`}
          arrangement="cell"
          address={hubAddress([hub], 'name')}
          className="min-w-44"
        />
      </th>
      <NumberCell label={`Left face of ${hub.name}`} row={row} field="stationMm" min={-20_000} max={20_000} />
      <NumberCell label={`Length of ${hub.name}`} row={row} field="lengthMm" min={0} max={5_000} />
      <NumberCell
        label={`Outer diameter of ${hub.name}`}
        row={row}
        field="outerDiameterMm"
        min={0}
        max={10_000}
      />
      <Cell align="right" className="px-1.5! py-1! tabular-nums">
        {seat == null ? (
          <span className="text-bad">no seat</span>
        ) : (
          formatGiven(Number(seat.toFixed(3)), 'length', units).number
        )}
      </Cell>
      <Cell className="px-0! py-1!">
        <LayoutTextField
          label={`Fit of ${hub.name}`}
          arrangement="cell"
          address={hubAddress([hub], 'fit')}
          format={(stored) => formatFit(stored as InterferenceFit, units)}
          read={(text) => parseFit(text, units)}
          className="w-24"
        />
      </Cell>
      <Cell align="right" className="px-1.5! py-1! whitespace-nowrap tabular-nums">
        {interferenceText(row, units)}
      </Cell>
      <Cell className="px-1.5! py-1!">
        {values === null ? (
          <span className="text-quiet">calculating</span>
        ) : (
          <div className="grid grid-cols-[minmax(7rem,1fr)_6.75rem] items-center gap-3">
            <InterferenceWindow values={values} size="row" scale={scale} units={units} />
            <span className="truncate text-xs" title={windowStateWords(values)}>
              <WindowSign state={windowState(values)} /> {windowStateWords(values)}
            </span>
          </div>
        )}
      </Cell>
      {safetyCells(row, layout).map(({ quantity, label, value, limit, text }) => (
        <Cell key={quantity} align="right" className="px-1.5! py-1! whitespace-nowrap">
          <JudgedNumber
            text={text}
            verdict={safetyVerdict(value, limit)}
            label={`${label} of ${hub.name}`}
            onOpen={
              shown === null
                ? undefined
                : () => openDerivation({ kind: 'hubCase', hub: hub.id, loadCase: shown.loadCase, quantity })
            }
          />
        </Cell>
      ))}
      <Cell align="right" className="px-1.5! py-1! whitespace-nowrap tabular-nums">
        {isTooHot(row) && <span className="font-bold text-bad">✕ over limit </span>}
        {joiningText(row, units)}
      </Cell>
      <Cell className="py-1! pr-4! pl-1.5! whitespace-nowrap">
        {result?.assembly.order === null ? (
          <span className="font-bold text-bad">✕ blocked</span>
        ) : (
          orderText(row)
        )}
      </Cell>
    </tr>
  )
}

function NumberCell({
  label,
  row,
  field,
  min,
  max,
}: {
  label: string
  row: ScheduleRow
  field: 'stationMm' | 'lengthMm' | 'outerDiameterMm'
  min: number
  max: number
}) {
  return (
    <Cell align="right" className="px-0! py-1!">
      <LayoutQuantityField
        label={label}
        kind="length"
        arrangement="cell"
        address={hubAddress([row.hub], field)}
        min={min}
        isMinExclusive={field !== 'stationMm'}
        max={max}
        className="ml-auto w-18"
      />
    </Cell>
  )
}
