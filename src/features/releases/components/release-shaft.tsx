/** The stored results of the shaft, one row a load case. */
import { Cell, ColumnHead, DataTable } from '@/components/data-table'
import { formatGiven, formatResult, formatSafety } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import type { StationValue } from '@shared/recalculation/layout-results'
import type { ReleaseDetails } from '../api/release'
import { loadCaseName, partName } from '../place-words'

export function ReleaseShaft({ release, units }: { release: ReleaseDetails; units: UnitSystem }) {
  const { document, results } = release
  const [critical] = results.shaft.lateralCriticalRpm
  const at = (found: StationValue | null) =>
    found === null ? '' : ` at ${formatGiven(found.stationMm, 'length', units).text}`
  if (results.shaft.loadCases.length === 0)
    return <p className="text-sm">There are no results of the shaft: no load case, or no support.</p>
  return (
    <div className="grid grid-cols-1 gap-6">
      <p className="text-sm">
        {critical === undefined
          ? 'Lateral critical speeds are not computed.'
          : `First lateral critical speed ${formatResult(critical, 'speed', units).text}.`}
      </p>
      <DataTable label="Shaft by load case">
        <thead>
          <tr>
            <ColumnHead>Load case</ColumnHead>
            <ColumnHead align="right">Most torque</ColumnHead>
            <ColumnHead align="right">Most bending moment</ColumnHead>
            <ColumnHead align="right">Most deflection</ColumnHead>
            <ColumnHead align="right">Most equivalent stress</ColumnHead>
            <ColumnHead align="right">Yield safety</ColumnHead>
            <ColumnHead align="right">Fatigue safety</ColumnHead>
          </tr>
        </thead>
        <tbody>
          {results.shaft.loadCases.map((each) => (
            <tr key={each.loadCase} className="tabular-nums">
              <Cell className="font-semibold">{loadCaseName(document, each.loadCase)}</Cell>
              <Cell align="right">{formatResult(each.torqueMaxNm, 'torque', units).text}</Cell>
              <Cell align="right">
                {formatResult(each.bendingMaxNm?.value ?? null, 'torque', units).text}
                {at(each.bendingMaxNm)}
              </Cell>
              <Cell align="right">
                {formatResult(each.deflectionMaxUm?.value ?? null, 'interference', units).text}
                {at(each.deflectionMaxUm)}
              </Cell>
              <Cell align="right">
                {formatResult(each.equivalentMaxMPa?.value ?? null, 'stress', units).text}
                {at(each.equivalentMaxMPa)}
              </Cell>
              <Cell align="right">{formatSafety(each.yieldSafety)}</Cell>
              <Cell align="right">
                {formatSafety(each.fatigueSafety?.value ?? null)}
                {at(each.fatigueSafety)}
              </Cell>
            </tr>
          ))}
        </tbody>
      </DataTable>
      <DataTable label="Bearing reactions">
        <thead>
          <tr>
            <ColumnHead>Bearing</ColumnHead>
            <ColumnHead>Load case</ColumnHead>
            <ColumnHead align="right">Radial</ColumnHead>
            <ColumnHead align="right">Axial</ColumnHead>
            <ColumnHead align="right">Slope</ColumnHead>
          </tr>
        </thead>
        <tbody>
          {results.shaft.loadCases.flatMap((each) =>
            each.reactions.map((reaction) => (
              <tr key={`${each.loadCase} ${reaction.bearing}`} className="tabular-nums">
                <Cell className="font-semibold">{partName(document, reaction.bearing)}</Cell>
                <Cell>{loadCaseName(document, each.loadCase)}</Cell>
                <Cell align="right">
                  {formatResult(Math.hypot(reaction.yN, reaction.zN), 'force', units).text}
                </Cell>
                <Cell align="right">{formatResult(reaction.axialN, 'force', units).text}</Cell>
                <Cell align="right">
                  {
                    formatResult(
                      each.slopes.find((slope) => slope.part === reaction.bearing)?.mrad ?? null,
                      'slope',
                      units,
                    ).text
                  }
                </Cell>
              </tr>
            )),
          )}
        </tbody>
      </DataTable>
    </div>
  )
}
