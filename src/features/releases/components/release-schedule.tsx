/** The stored fit schedule: a table, and a list on phones. */
import type { ReactNode } from 'react'
import { Cell, ColumnHead, DataTable } from '@/components/data-table'
import { JudgedNumber, safetyVerdict } from '@/components/judged-number'
import { InterferenceWindow, WindowSign } from '@/drawings/interference-window'
import { formatResultPair } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import {
  type WindowScale,
  windowScale,
  windowState,
  windowStateWords,
  windowValuesOf,
} from '@shared/drawing/interference-window-geometry'
import type { Hub } from '@shared/layout/layout-document'
import type { HubResult } from '@shared/recalculation/layout-results'
import type { ReleaseDetails } from '../api/release'
import { type ScheduleTexts, scheduleTexts } from '../schedule-texts'

interface Row {
  hub: Hub
  item: number
  /** Null where the engine of that day gave nothing for the hub. */
  computed: { result: HubResult; texts: ScheduleTexts } | null
}

export function ReleaseSchedule({ release, units }: { release: ReleaseDetails; units: UnitSystem }) {
  const { document, results } = release
  if (document.hubs.length === 0) return <p className="text-sm">The layout has no hubs.</p>
  const scale = windowScale(results.hubs.map(windowValuesOf))
  const axis = formatResultPair(scale.fromUm, scale.toUm, 'interference', units, ' to ').text
  const rows = document.hubs.map((hub, index): Row => {
    const result = results.hubs.find((each) => each.id === hub.id)
    return {
      hub,
      item: index + 1,
      computed: result ? { result, texts: scheduleTexts(document, hub, result, units) } : null,
    }
  })
  return (
    <>
      <div className="max-md:hidden">
        <ScheduleTable rows={rows} scale={scale} axis={axis} units={units} />
      </div>
      <div className="md:hidden">
        <p className="pb-1 text-xs text-quiet">All windows from {axis}</p>
        <ol className="divide-y divide-hairline border-y border-hairline">
          {rows.map((row) => (
            <ScheduleEntry key={row.hub.id} row={row} scale={scale} units={units} />
          ))}
        </ol>
      </div>
    </>
  )
}

function ScheduleTable({
  rows,
  scale,
  axis,
  units,
}: {
  rows: readonly Row[]
  scale: WindowScale
  axis: string
  units: UnitSystem
}) {
  return (
    <DataTable label="Fit schedule">
      <thead>
        <tr>
          <ColumnHead align="right">Item</ColumnHead>
          <ColumnHead>Hub</ColumnHead>
          <ColumnHead>Seat and fit</ColumnHead>
          <ColumnHead>Interference, made</ColumnHead>
          <ColumnHead className="min-w-56">Window, {axis}</ColumnHead>
          <ColumnHead align="right">Torque held / required</ColumnHead>
          <ColumnHead align="right">Slip safety</ColumnHead>
          <ColumnHead align="right">Hub yield safety</ColumnHead>
          <ColumnHead>Joining</ColumnHead>
          <ColumnHead>Order, side</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ hub, item, computed }) => (
          <tr key={hub.id} className="align-top tabular-nums">
            <Cell align="right" className="font-semibold">
              {item}
            </Cell>
            <Cell className="min-w-40 font-semibold">{hub.name}</Cell>
            {computed ? (
              <>
                <Cell className="whitespace-nowrap">{computed.texts.seat}</Cell>
                <Cell className="whitespace-nowrap">{computed.texts.interference}</Cell>
                <Cell>
                  <HubWindow result={computed.result} scale={scale} units={units} />
                </Cell>
                <Cell align="right" className="whitespace-nowrap">
                  {computed.texts.torque}
                </Cell>
                <Cell align="right" className="min-w-32">
                  <SlipSafety hub={hub} slip={computed.texts.slip} />
                  <span className="block text-xs text-quiet">{computed.texts.slip.note}</span>
                </Cell>
                <Cell align="right">{computed.texts.hubYield}</Cell>
                <Cell className="whitespace-nowrap">{computed.texts.joining}</Cell>
                <Cell className="whitespace-nowrap">{computed.texts.order}</Cell>
              </>
            ) : (
              <Cell colSpan={8} className="text-quiet">
                not computed
              </Cell>
            )}
          </tr>
        ))}
      </tbody>
    </DataTable>
  )
}

function ScheduleEntry({
  row: { hub, item, computed },
  scale,
  units,
}: {
  row: Row
  scale: WindowScale
  units: UnitSystem
}) {
  return (
    <li className="py-3 text-sm">
      <p className="font-semibold">
        {item}. {hub.name}
      </p>
      {computed ? (
        <>
          <p className="tabular-nums">
            {computed.texts.seat}, {computed.texts.interference}
          </p>
          <div className="py-1.5">
            <HubWindow result={computed.result} scale={scale} units={units} />
          </div>
          <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-0.5 tabular-nums">
            <Pair term="Slip safety">
              <SlipSafety hub={hub} slip={computed.texts.slip} />
              {computed.texts.slip.note !== '' && (
                <span className="text-quiet"> {computed.texts.slip.note}</span>
              )}
            </Pair>
            <Pair term="Torque held / required">{computed.texts.torque}</Pair>
            <Pair term="Hub yield safety">{computed.texts.hubYield}</Pair>
            <Pair term="Joining">{computed.texts.joining}</Pair>
            <Pair term="Order, side">{computed.texts.order}</Pair>
          </dl>
        </>
      ) : (
        <p className="text-quiet">not computed</p>
      )}
    </li>
  )
}

function Pair({ term, children }: { term: string; children: ReactNode }) {
  return (
    <>
      <dt className="text-quiet">{term}</dt>
      <dd>{children}</dd>
    </>
  )
}

function SlipSafety({ hub, slip }: { hub: Hub; slip: ScheduleTexts['slip'] }) {
  return (
    <JudgedNumber
      text={slip.text}
      verdict={safetyVerdict(slip.value, slip.limit)}
      label={`slip safety of ${hub.name}`}
    />
  )
}

function HubWindow({ result, scale, units }: { result: HubResult; scale: WindowScale; units: UnitSystem }) {
  const values = windowValuesOf(result)
  return (
    <>
      <InterferenceWindow values={values} size="row" units={units} scale={scale} />
      <span className="mt-1 flex items-center gap-1 text-xs">
        <WindowSign state={windowState(values)} />
        {windowStateWords(values)}
      </span>
    </>
  )
}
