/** Stresses at the tightest: in the case shown, and at rest at 20 °C, which holds without any load case. */
import { formatResult, formatResultPair } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { useResultsStore } from '@/stores/results-store'
import { extreme } from '@/stores/shown-load-case'
import type { Criteria } from '@shared/layout/layout-document'
import type { HubLoadCaseResult, HubResult } from '@shared/recalculation/layout-results'
import { ResultRow } from './inspector-parts'
import { inCase, ofHub } from './result-references'

interface ServiceStressProps {
  result: HubResult
  shown: HubLoadCaseResult
  /** Those that hold in the case shown. */
  criteria: Criteria
  units: UnitSystem
}

/** A brittle hub is judged by its hoop tension, a ductile one by its equivalent stress. */
const hubLimit = ({ isBrittle }: HubResult, { brittleSafety, hubYieldSafety }: Criteria) =>
  isBrittle ? brittleSafety : hubYieldSafety

export function ServiceStress({ result, shown, criteria, units }: ServiceStressProps) {
  const { id, isBrittle } = result
  const stress = (value: number | null) => formatResult(value, 'stress', units).text
  const hubSafety = {
    value: shown.hubYieldSafety,
    limit: hubLimit(result, criteria),
    reference: inCase(id, shown, 'hubYieldSafety'),
  }
  return (
    <>
      <ResultRow
        label="Interface pressure"
        value={stress(shown.pressureMaxMPa)}
        reference={inCase(id, shown, 'pressureMax')}
      />
      <ResultRow
        label={isBrittle ? 'Hub bore, hoop, brittle' : 'Hub bore, hoop'}
        value={stress(shown.hubHoopMaxMPa)}
        reference={inCase(id, shown, 'hubHoopMax')}
        safety={isBrittle ? hubSafety : undefined}
      />
      <ResultRow
        label="Hub bore, equivalent"
        value={stress(shown.hubEquivalentMaxMPa)}
        reference={inCase(id, shown, 'hubEquivalentMax')}
        safety={isBrittle ? undefined : hubSafety}
      />
      <ResultRow
        label="Shaft under the seat"
        value={stress(shown.shaftEquivalentMaxMPa)}
        reference={inCase(id, shown, 'shaftEquivalentMax')}
        safety={{
          value: shown.shaftYieldSafety,
          limit: criteria.shaftYieldSafety,
          reference: inCase(id, shown, 'shaftYieldSafety'),
        }}
      />
      <SeatEdge hub={id} loadCase={shown.loadCase} limit={criteria.fatigueSafety} />
    </>
  )
}

/** The seat edge of this hub with the least fatigue safety. */
function SeatEdge({ hub, loadCase, limit }: { hub: string; loadCase: string; limit: number }) {
  const notches = useResultsStore(
    (state) => state.results?.shaft.loadCases.find((item) => item.loadCase === loadCase)?.notches,
  )
  const edge = extreme(
    notches?.filter(({ part, kind }) => part === hub && kind === 'seatEdge') ?? [],
    ({ fatigueSafety }) => fatigueSafety,
    'least',
  )
  if (edge === null) return null
  return (
    <ResultRow
      label={
        <>
          Shaft at seat edge, fatigue, K<sub>f</sub> {edge.fatigueNotchFactor.toFixed(1)}
        </>
      }
      name="shaft fatigue at the seat edge"
      value=""
      safety={{
        value: edge.fatigueSafety,
        limit,
        reference: { kind: 'shaftCase', loadCase, quantity: 'fatigueSafety', stationMm: edge.stationMm },
      }}
    />
  )
}

interface RestStressProps {
  result: HubResult
  /** Those of the layout: no load case is at work. */
  criteria: Criteria
  units: UnitSystem
}

export function RestStress({ result, criteria, units }: RestStressProps) {
  const { id, atRest, isBrittle, outerDiameterGrowthUm } = result
  const value = isBrittle ? atRest.hubHoopMaxMPa : atRest.hubEquivalentMaxMPa
  return (
    <>
      <ResultRow
        label={isBrittle ? 'Hub bore, hoop, at rest' : 'Hub bore, equivalent, at rest'}
        value={formatResult(value, 'stress', units).text}
        reference={isBrittle ? undefined : ofHub(id, 'hubEquivalentAtRest')}
        safety={{
          value: atRest.hubYieldSafety,
          limit: hubLimit(result, criteria),
          reference: ofHub(id, 'hubYieldSafetyAtRest'),
        }}
      />
      <ResultRow
        label="Outer diameter grows by"
        value={
          formatResultPair(outerDiameterGrowthUm.min, outerDiameterGrowthUm.max, 'interference', units, ' … ')
            .text
        }
        reference={ofHub(id, 'outerDiameterGrowth')}
      />
    </>
  )
}
