/** Shaft results of every load case, and the critical speeds. */
import { torqueBalance } from '../engineering/load-cases/torque-balance'
import { toRpm } from '../engineering/quantities/units'
import { factorBeam, type FactoredBeam } from '../engineering/shaft/beam-solver'
import { lateralFrequencies } from '../engineering/shaft/lateral-frequencies'
import { diagramStations, type DiagramStation } from '../engineering/shaft/section-forces'
import { segmentAt, type ShaftSegment } from '../engineering/shaft/shaft-model'
import { torsionalFrequencies } from '../engineering/shaft/torsional-frequencies'
import type { LayoutDocument, LoadCase } from '../layout/layout-document'
import { attempt } from './attempt'
import type { HubCalculation } from './hub-result'
import type { LayoutResults, ShaftLoadCaseResult } from './layout-results'
import { memoise } from './memoise'
import { notchesOf, type Notch } from './notches'
import { shaftCaseResult } from './shaft-case-result'
import { shaftInputs, shaftLoads, type ShaftInputs } from './shaft-inputs'

/** A shaft ready for any load case: what depends on geometry only. */
export interface PreparedShaft {
  /** Different for every shaft that was prepared; stands for all its inputs in the keys of load cases. */
  id: number
  beam: FactoredBeam
  stations: DiagramStation[]
  /** Section under each station, on its side of a step. */
  sections: ShaftSegment[]
  /** Index of the hub over each station, −1 beside hubs; at a seat edge the side decides. */
  hubOver: Int16Array
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

let lastPreparedId = 0

const frequencyCache = memoise<{ lateralCriticalRpm: number[]; torsionalHz: number[] }>(20)
const preparedCache = memoise<{ prepared: PreparedShaft | null; reason: string | null }>(20)
const caseCache = memoise<{ result: ShaftLoadCaseResult | null; reason: string | null }>(60)

export function calculateShaft(document: LayoutDocument, hubs: readonly HubCalculation[]): ShaftCalculation {
  const inputs = shaftInputs(document)
  const notched = attempt(() => (inputs.model ? notchesOf(document, inputs) : []))
  const notches = notched.value ?? []
  const { prepared, reason } = prepareShaft(document, inputs)
  let failure = reason ?? notched.reason
  const context = prepared && caseContext(document, inputs, hubs, notches, prepared)
  const loadCases = document.loadCases.map((loadCase, index) => {
    const solved = context && solveCase(context, loadCase, index)
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
    const sections = stations.flatMap(
      ({ station, side }) => segmentAt(model, besides(station, side), side) ?? [],
    )
    const hubOver = hubsOver(document, stations)
    lastPreparedId += 1
    return { prepared: { id: lastPreparedId, beam: beam.value, stations, sections, hubOver }, reason: null }
  })
}

/** A touch to one side, so that a step or an edge at the station itself is on the other. */
const besides = (station: number, side: 'left' | 'right') =>
  side === 'left' ? station - 1e-9 : station + 1e-9

function hubsOver(document: LayoutDocument, stations: readonly DiagramStation[]): Int16Array {
  return Int16Array.from(stations, ({ station, side }) => {
    const placeMm = besides(station, side) * 1e3
    return document.hubs.findIndex((hub) => placeMm > hub.stationMm && placeMm < hub.stationMm + hub.lengthMm)
  })
}

/** What load cases of one shaft share, gathered once. */
interface CaseContext {
  document: LayoutDocument
  inputs: ShaftInputs
  hubs: readonly HubCalculation[]
  notches: readonly Notch[]
  prepared: PreparedShaft
  bearings: { part: string; stationMm: number }[]
  /** Everything above that the id of the prepared shaft does not stand for. */
  key: string
}

function caseContext(
  document: LayoutDocument,
  inputs: ShaftInputs,
  hubs: readonly HubCalculation[],
  notches: readonly Notch[],
  prepared: PreparedShaft,
): CaseContext {
  const bearings = inputs.supporting.map(({ bearing }) => ({
    part: bearing.id,
    stationMm: bearing.stationMm,
  }))
  const notchInputs = notches.flatMap((notch) => [
    notch.stationMm,
    notch.kind,
    notch.part,
    notch.diameterMm,
    notch.boreMm,
    notch.factors.bending,
    notch.factors.torsion,
    notch.endurance,
  ])
  const parts = [...bearings.map(({ part }) => part), ...document.hubs.map((hub) => hub.id)]
  const key = JSON.stringify([prepared.id, inputs.locatingId, parts, notchInputs])
  return { document, inputs, hubs, notches, prepared, bearings, key }
}

function solveCase(context: CaseContext, loadCase: LoadCase, caseIndex: number) {
  const { document, inputs, prepared } = context
  const { model } = inputs
  const loads = shaftLoads(document, loadCase, inputs.lengthMm)
  // at the most interference; hubs without numbers press with nothing
  const pressures = context.hubs.map((hub) => hub.states[caseIndex]?.pressureMax ?? 0)
  const firstLoads = new Map([...loadCase.loads].reverse().map((load) => [load.hub, load.stationMm]))
  const places = document.hubs.map((hub) => ({
    part: hub.id,
    stationMm: firstLoads.get(hub.id) ?? hub.stationMm + hub.lengthMm / 2,
  }))
  const key = JSON.stringify([
    context.key,
    loadCase.id,
    loadCase.applicationFactor,
    loads.map((load): unknown[] => Object.values(load)),
    pressures,
    places.map((place) => place.stationMm),
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
            bearings: context.bearings,
            locatingId: inputs.locatingId,
            places: [...context.bearings, ...places],
            pressures: pressureCourse(prepared, pressures),
            sections: prepared.sections,
            notches: context.notches,
          })
        : null,
    )
    return { result: solved.value, reason: solved.reason }
  })
}

/** Pressure over each station from the pressure of each hub. */
function pressureCourse({ hubOver }: PreparedShaft, ofHubs: readonly number[]): Float64Array {
  return Float64Array.from(hubOver, (hub) => (hub < 0 ? 0 : (ofHubs[hub] ?? 0)))
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
