/** The stored fit schedule. */
import { Cell, ColumnHead, DataTable } from '@/components/data-table'
import { JudgedNumber, safetyVerdict } from '@/components/judged-number'
import { InterferenceWindow, WindowSign } from '@/drawings/interference-window'
import { formatGiven, formatResult, formatResultPair, formatSafety } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import {
  windowScale,
  windowState,
  windowStateWords,
  windowValuesOf,
} from '@shared/drawing/interference-window-geometry'
import type { Hub } from '@shared/layout/layout-document'
import type { HubResult } from '@shared/recalculation/layout-results'
import type { Release } from '../api/release'
import { fitWords, loadCaseName } from '../place-words'

export function ReleaseSchedule({ release, units }: { release: Release; units: UnitSystem }) {
  const { document, results } = release
  const scale = windowScale(results.hubs.map(windowValuesOf))
  if (document.hubs.length === 0) return <p className="text-sm">The layout has no hubs.</p>
  return (
    <DataTable label="Fit schedule">
      <thead>
        <tr>
          <ColumnHead align="right">Item</ColumnHead>
          <ColumnHead>Hub</ColumnHead>
          <ColumnHead>Seat and fit</ColumnHead>
          <ColumnHead>Interference, made</ColumnHead>
          <ColumnHead className="min-w-56">
            Window, {formatResultPair(scale.fromUm, scale.toUm, 'interference', units, ' to ').text}
          </ColumnHead>
          <ColumnHead align="right">Torque held / required</ColumnHead>
          <ColumnHead align="right">Slip safety</ColumnHead>
          <ColumnHead align="right">Hub yield safety</ColumnHead>
          <ColumnHead>Joining</ColumnHead>
          <ColumnHead>Order, side</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {document.hubs.map((hub, index) => {
          const result = results.hubs.find((each) => each.id === hub.id)
          return (
            <tr key={hub.id} className="align-top">
              <Cell align="right" className="font-semibold">
                {index + 1}
              </Cell>
              <Cell className="min-w-40 font-semibold">{hub.name}</Cell>
              {result ? (
                <HubCells release={release} hub={hub} result={result} scale={scale} units={units} />
              ) : (
                <Cell colSpan={8} className="text-quiet">
                  not computed
                </Cell>
              )}
            </tr>
          )
        })}
      </tbody>
    </DataTable>
  )
}

function HubCells({
  release,
  hub,
  result,
  scale,
  units,
}: {
  release: Release
  hub: Hub
  result: HubResult
  scale: ReturnType<typeof windowScale>
  units: UnitSystem
}) {
  const values = windowValuesOf(result)
  const governing = result.loadCases.find((each) => each.loadCase === result.governingLoadCase)
  const hubSafeties = [result.atRest.hubYieldSafety, ...result.loadCases.map((each) => each.hubYieldSafety)]
  const knownSafeties = hubSafeties.filter((value) => value !== null)
  const slip = governing?.slipSafety ?? null
  const limit = governing?.slipSafetyLimit ?? null
  return (
    <>
      <Cell className="whitespace-nowrap tabular-nums">
        ⌀{formatGiven(result.seat.diameterMm, 'length', units).text} {fitWords(hub.fit)}
      </Cell>
      <Cell className="whitespace-nowrap tabular-nums">
        {formatResultPair(values.minUm, values.maxUm, 'interference', units, ' to ').text}
      </Cell>
      <Cell>
        <InterferenceWindow values={values} size="row" units={units} scale={scale} />
        <span className="mt-1 flex items-center gap-1 text-xs">
          <WindowSign state={windowState(values)} />
          {windowStateWords(values)}
        </span>
      </Cell>
      <Cell align="right" className="whitespace-nowrap tabular-nums">
        {governing
          ? formatResultPair(governing.torqueCapacityNm, governing.requiredTorqueNm, 'torque', units).text
          : 'no demand'}
      </Cell>
      <Cell align="right" className="tabular-nums">
        <JudgedNumber
          text={formatSafety(slip, limit)}
          verdict={safetyVerdict(slip, limit)}
          label={`slip safety of ${hub.name}`}
        />
        {governing && (
          <span className="block text-xs text-quiet">
            {limit !== null && `at least ${formatSafety(limit)}, `}
            {loadCaseName(release.document, governing.loadCase)}
          </span>
        )}
      </Cell>
      <Cell align="right" className="tabular-nums">
        {formatSafety(knownSafeties.length === 0 ? null : Math.min(...knownSafeties))}
      </Cell>
      <Cell className="whitespace-nowrap tabular-nums">
        {hub.joining.method === 'press'
          ? `press, ${formatResult(result.assembly.pressForceMaxN, 'force', units).text}`
          : `oven ${formatResult(result.assembly.ovenC, 'temperature', units).text}`}
      </Cell>
      <Cell className="whitespace-nowrap">
        {result.assembly.order === null
          ? 'cannot be mounted'
          : `${result.assembly.order}, ${result.assembly.side}`}
      </Cell>
    </>
  )
}
