/** Shaft results of every load case, and the critical speeds. */
import { torqueBalance } from '../engineering/load-cases/torque-balance'
import { toRpm } from '../engineering/quantities/units'
import { factorBeam, type FactoredBeam } from '../engineering/shaft/beam-solver'
import { lateralFrequencies } from '../engineering/shaft/lateral-frequencies'
import { diagramStations, type DiagramStation } from '../engineering/shaft/section-forces'
import { torsionalFrequencies } from '../engineering/shaft/torsional-frequencies'
import type { LayoutDocument, LoadCase } from '../layout/layout-document'
import { attempt } from './attempt'
import type { HubCalculation } from './hub-result'
import type { LayoutResults, ShaftLoadCaseResult } from './layout-results'
import { memoise } from './memoise'
import { notchesOf, type Notch } from './notches'
import { shaftCaseResult, type SeatPressure } from './shaft-case-result'
import { shaftInputs, shaftLoads, type ShaftInputs } from './shaft-inputs'

/** A shaft ready for any load case: what depends on geometry only. */
export interface PreparedShaft {
  key: string
  beam: FactoredBeam
  stations: DiagramStation[]
}

export interface ShaftCalculation {
  results: LayoutResults['shaft']
  inputs: ShaftInputs
  notches: Notch[]
  prepared: PreparedShaft | null
  /** Why the beam has no results; null when it has. */
  reason: string | null
}

/** Curves are drawn with at least this many points along the shaft. */
const CURVE_POINTS = 40
const LATERAL_COUNT = 3
const TORSIONAL_COUNT = 3

const frequencyCache = memoise<{ lateralCriticalRpm: number[]; torsionalHz: number[] }>(20)
const preparedCache = memoise<{ prepared: PreparedShaft | null; reason: string | null }>(20)
const caseCache = memoise<{ result: ShaftLoadCaseResult | null; reason: string | null }>(200)

export function calculateShaft(document: LayoutDocument, hubs: readonly HubCalculation[]): ShaftCalculation {
  const inputs = shaftInputs(document)
  const notches = inputs.model ? notchesOf(document, inputs) : []
  const { prepared, reason } = prepareShaft(document, inputs)
  let failure = reason
  const loadCases = document.loadCases.map((loadCase) => {
    const solved = prepared && solveCase(document, loadCase, inputs, hubs, notches, prepared)
    failure ??= solved?.reason ?? null
    return solved?.result ?? withoutBeam(document, loadCase, inputs)
  })
  return { results: { loadCases, ...frequencies(inputs) }, inputs, notches, prepared, reason: failure }
}

function prepareShaft(document: LayoutDocument, inputs: ShaftInputs) {
  const { model, supporting, lengthMm } = inputs
  if (!model) return { prepared: null, reason: 'the shaft has no sections that can be calculated' }
  const onShaft = (stationMm: number) => Math.min(lengthMm, Math.max(0, stationMm)) / 1e3
  const loadStations = document.loadCases.flatMap((loadCase) =>
    loadCase.loads.map((load) => onShaft(load.stationMm)),
  )
  const partStations = [
    ...document.hubs.flatMap((hub) => [
      hub.stationMm,
      hub.stationMm + hub.lengthMm,
      hub.stationMm + hub.lengthMm / 2,
    ]),
    ...document.bearings.flatMap((bearing) => [
      bearing.stationMm - bearing.widthMm / 2,
      bearing.stationMm + bearing.widthMm / 2,
    ]),
  ].map(onShaft)
  const key = JSON.stringify([model, supporting.map(({ support }) => support), loadStations, partStations])
  return preparedCache(key, () => {
    const beam = attempt(() =>
      factorBeam(
        model,
        supporting.map(({ support }) => support),
        loadStations,
      ),
    )
    if (beam.reason !== null) return { prepared: null, reason: beam.reason }
    const jumps = [
      0,
      lengthMm / 1e3,
      ...model.segments.map((segment) => segment.end),
      ...supporting.map(({ support }) => support.station),
      ...loadStations,
      ...partStations,
    ]
    const stations = diagramStations(jumps, lengthMm / 1e3 / CURVE_POINTS)
    return { prepared: { key, beam: beam.value, stations }, reason: null }
  })
}

function solveCase(
  document: LayoutDocument,
  loadCase: LoadCase,
  inputs: ShaftInputs,
  hubs: readonly HubCalculation[],
  notches: readonly Notch[],
  prepared: PreparedShaft,
) {
  const { model } = inputs
  const loads = shaftLoads(document, loadCase, inputs.lengthMm)
  const pressures = seatPressures(document, loadCase, hubs)
  const places = document.hubs.map((hub) => ({
    part: hub.id,
    stationMm:
      loadCase.loads.find((load) => load.hub === hub.id)?.stationMm ?? hub.stationMm + hub.lengthMm / 2,
  }))
  const bearings = inputs.supporting.map(({ bearing }) => ({
    part: bearing.id,
    stationMm: bearing.stationMm,
  }))
  const key = JSON.stringify([
    loadCase.id,
    loadCase.applicationFactor,
    prepared.key,
    loads,
    pressures,
    notches,
    places,
    bearings,
    inputs.locatingId,
  ])
  return caseCache(key, () => {
    const solved = attempt(() =>
      model
        ? shaftCaseResult({
            loadCaseId: loadCase.id,
            applicationFactor: loadCase.applicationFactor,
            model,
            beam: prepared.beam,
            stations: prepared.stations,
            loads,
            bearings,
            locatingId: inputs.locatingId,
            places: [...bearings, ...places],
            pressures,
            notches,
          })
        : null,
    )
    return { result: solved.value, reason: solved.reason }
  })
}

/** Pressure of each seat at its most interference in this load case. */
function seatPressures(
  document: LayoutDocument,
  loadCase: LoadCase,
  hubs: readonly HubCalculation[],
): SeatPressure[] {
  return document.hubs.flatMap((hub, index) => {
    const state = hubs[index]?.states.find((one) => one.seatCase.id === loadCase.id)
    return state
      ? [{ startMm: hub.stationMm, endMm: hub.stationMm + hub.lengthMm, pressure: state.pressureMax }]
      : []
  })
}

/** What remains known when the beam cannot be solved: the torques. */
function withoutBeam(document: LayoutDocument, loadCase: LoadCase, inputs: ShaftInputs): ShaftLoadCaseResult {
  const loads = shaftLoads(document, loadCase, inputs.lengthMm).sort(
    (one, other) => one.station - other.station,
  )
  let sum = 0
  let largest = 0
  for (const load of loads) {
    sum += load.torque
    largest = Math.max(largest, Math.abs(sum))
  }
  return {
    loadCase: loadCase.id,
    reactions: [],
    torqueMaxNm: largest,
    bendingMaxNm: null,
    deflectionMaxUm: null,
    slopes: [],
    equivalentMaxMPa: null,
    yieldSafety: null,
    fatigueSafety: null,
    diagrams: {
      stationMm: [],
      torqueNm: [],
      bendingYNm: [],
      bendingZNm: [],
      deflectionUm: [],
      equivalentMPa: [],
      bendingNm: [],
      shearYN: [],
      shearZN: [],
      deflectionYUm: [],
      deflectionZUm: [],
      slopeMrad: [],
    },
    torqueResidualNm: torqueBalance(loads.map((load) => load.torque)).residual,
    deflections: [],
    notches: [],
  }
}

function frequencies(inputs: ShaftInputs): { lateralCriticalRpm: number[]; torsionalHz: number[] } {
  const { model, supporting, masses } = inputs
  if (!model) return { lateralCriticalRpm: [], torsionalHz: [] }
  const supports = supporting.map(({ support }) => support)
  return frequencyCache(JSON.stringify([model, supports, masses]), () => {
    const lateral = attempt(() => lateralFrequencies(model, supports, masses, LATERAL_COUNT))
    const torsional = attempt(() => torsionalFrequencies(model, masses, TORSIONAL_COUNT))
    return {
      lateralCriticalRpm: (lateral.value ?? []).map(toRpm).filter(Number.isFinite),
      torsionalHz: (torsional.value ?? []).filter(Number.isFinite),
    }
  })
}
