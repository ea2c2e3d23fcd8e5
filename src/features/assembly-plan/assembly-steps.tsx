import { Cell, ColumnHead } from '@/components/data-table'
import { ValueButton } from '@/components/value-button'
import { JOINING_METHODS, JOINING_SIDES } from '@/fields/joining-options'
import { LayoutChoiceField } from '@/fields/layout-choice-field'
import { hubAddress } from '@/fields/part-address'
import { formatResult, NOT_COMPUTED } from '@/lib/format-quantity'
import { displayUnit, type UnitSystem } from '@/lib/quantity-units'
import { useDerivationStore } from '@/stores/derivation-store'
import { useSelectionStore } from '@/stores/selection-store'
import type { Bearing, Hub, LayoutDocument } from '@shared/layout/layout-document'
import type { HubResult, LayoutResults } from '@shared/recalculation/layout-results'

interface AssemblyStepsProps {
  layout: LayoutDocument
  results: LayoutResults
  units: UnitSystem
  nameOf: (id: string) => string
}

/** In order of assembly; what has no place in the order stands at the end. */
export function AssemblySteps({ layout, results, units, nameOf }: AssemblyStepsProps) {
  const { order } = results.assembly
  const ordered = order.map(({ part, side }, index) => ({ id: part, side, place: index + 1 }))
  const without = layout.hubs
    .filter(({ id }) => !order.some(({ part }) => part === id))
    .map(({ id, joining }) => ({ id, side: joining.side, place: null }))
  const degrees = displayUnit('temperature', units).symbol
  return (
    <div className="max-sm:overflow-x-auto">
      <table className="w-full border-collapse text-sm">
        <caption className="sr-only">Order of assembly</caption>
        <thead className="top-0 z-10 sm:sticky sm:bg-card">
          <tr>
            <ColumnHead className="pl-0">Step</ColumnHead>
            <ColumnHead>Part</ColumnHead>
            <ColumnHead>Side</ColumnHead>
            <ColumnHead>Method</ColumnHead>
            <ColumnHead align="right">Joins at, {degrees}</ColumnHead>
            <ColumnHead align="right">Oven, {degrees}</ColumnHead>
            <ColumnHead align="right">Limit, {degrees}</ColumnHead>
            <ColumnHead align="right">Press force, at most</ColumnHead>
            <ColumnHead>Against</ColumnHead>
          </tr>
        </thead>
        <tbody>
          {[...ordered, ...without].map(({ id, side, place }) => {
            const hub = layout.hubs.find((item) => item.id === id)
            const bearing = layout.bearings.find((item) => item.id === id)
            const result = results.hubs.find((item) => item.id === id)
            if (hub !== undefined && result !== undefined) {
              return <HubStep key={id} hub={hub} result={result} place={place} units={units} />
            }
            return (
              <OtherStep key={id} name={nameOf(id)} id={id} place={place} side={side} bearing={bearing} />
            )
          })}
        </tbody>
      </table>
    </div>
  )
}

function Place({ place }: { place: number | null }) {
  return place === null ? (
    <span className="font-bold text-bad">✕ none</span>
  ) : (
    <span className="tabular-nums">{place}</span>
  )
}

function usePartRow(id: string) {
  const isSelected = useSelectionStore((state) => state.selectedIds.includes(id))
  const isHovered = useSelectionStore((state) => state.hoveredId === id)
  const select = useSelectionStore((state) => state.select)
  const hover = useSelectionStore((state) => state.hover)
  return {
    select: () => select([id]),
    row: {
      className: isSelected ? 'bg-steel-soft' : isHovered ? 'bg-paper' : '',
      onClick: () => select([id]),
      onPointerEnter: () => hover(id),
      onPointerLeave: () => hover(null),
    },
  }
}

function HubStep({
  hub,
  result,
  place,
  units,
}: {
  hub: Hub
  result: HubResult
  place: number | null
  units: UnitSystem
}) {
  const { row, select } = usePartRow(hub.id)
  const open = useDerivationStore((state) => state.open)
  const { joiningC, ovenC, limitC, pressForceMaxN } = result.assembly
  const isPressed = hub.joining.method === 'press'
  const isTooHot = !isPressed && ovenC !== null && limitC !== null && ovenC > limitC
  const degrees = (value: number | null) => formatResult(value, 'temperature', units).number
  return (
    <tr {...row}>
      <Cell className="py-1! pl-0!">
        <Place place={place} />
      </Cell>
      <th scope="row" className="border-b border-hairline min-w-32 px-3 py-1 text-left">
        <button type="button" className="text-left font-semibold" onClick={select}>
          {hub.name}
        </button>
      </th>
      <Cell className="py-1! pl-1!">
        <LayoutChoiceField
          label={`Side of ${hub.name}`}
          arrangement="cell"
          address={hubAddress([hub], 'joining.side')}
          options={JOINING_SIDES}
          className="w-36"
        />
      </Cell>
      <Cell className="py-1! pl-1!">
        <LayoutChoiceField
          label={`Method of ${hub.name}`}
          arrangement="cell"
          address={hubAddress([hub], 'joining.method')}
          options={JOINING_METHODS}
          className="w-44"
        />
      </Cell>
      <Cell align="right" className="py-1! font-semibold tabular-nums">
        {isPressed ? (
          NOT_COMPUTED
        ) : (
          <ValueButton
            label={`formula of the joining temperature of ${hub.name}`}
            onOpen={() => open({ kind: 'hub', hub: hub.id, quantity: 'joiningTemperature' })}
          >
            {degrees(joiningC)}
          </ValueButton>
        )}
      </Cell>
      <Cell align="right" className={`py-1! font-semibold tabular-nums ${isTooHot ? 'text-bad' : ''}`}>
        {isTooHot && <span>✕ too hot </span>}
        {isPressed ? (
          NOT_COMPUTED
        ) : (
          <ValueButton
            label={`formula of the oven temperature of ${hub.name}`}
            onOpen={() => open({ kind: 'hub', hub: hub.id, quantity: 'ovenTemperature' })}
          >
            {degrees(ovenC)}
          </ValueButton>
        )}
      </Cell>
      <Cell align="right" className="py-1! tabular-nums">
        {isPressed ? NOT_COMPUTED : degrees(limitC)}
      </Cell>
      <Cell align="right" className={`py-1! tabular-nums ${isPressed ? 'font-semibold' : 'text-quiet'}`}>
        <ValueButton
          label={`formula of the press force of ${hub.name}`}
          onOpen={() => open({ kind: 'hub', hub: hub.id, quantity: 'pressForce' })}
        >
          {formatResult(pressForceMaxN, 'force', units).text}
          {!isPressed && ' if cold'}
        </ValueButton>
      </Cell>
      <Cell className="py-1! text-quiet">
        {hub.abutmentStationMm == null
          ? 'nothing'
          : `face at z ${formatResult(hub.abutmentStationMm, 'length', units).text}`}
      </Cell>
    </tr>
  )
}

function OtherStep({
  name,
  id,
  place,
  side,
  bearing,
}: {
  name: string
  id: string
  place: number | null
  side: 'left' | 'right'
  bearing: Bearing | undefined
}) {
  const { row, select } = usePartRow(id)
  return (
    <tr {...row}>
      <Cell className="py-1! pl-0!">
        <Place place={place} />
      </Cell>
      <th scope="row" className="border-b border-hairline min-w-32 px-3 py-1.5 text-left">
        <button type="button" className="text-left font-semibold first-letter:uppercase" onClick={select}>
          {name}
        </button>
      </th>
      <Cell className="py-1! pl-3!">from the {side}</Cell>
      <Cell colSpan={6} className="py-1! text-quiet">
        {bearing?.housing === 'split'
          ? 'closed around the shaft afterwards'
          : 'slides on, by the maker’s instructions'}
      </Cell>
    </tr>
  )
}
