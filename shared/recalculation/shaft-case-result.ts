/** One load case of the shaft: reactions, curves, stresses and fatigue, in the keys of the results. */
import { EngineeringInputError } from '../engineering/engineering-input-error'
import { torqueBalance } from '../engineering/load-cases/torque-balance'
import type { Pressure } from '../engineering/quantities/quantity'
import { mm, newton, newtonMetre, toMPa, toMrad, toUm } from '../engineering/quantities/units'
import { shapeAt, type ShapePoint } from '../engineering/shaft/beam-shape'
import { solveBeam, type BeamSolution, type FactoredBeam } from '../engineering/shaft/beam-solver'
import { sectionForces, type DiagramStation, type SectionForces } from '../engineering/shaft/section-forces'
import { segmentAt, type ShaftLoad, type ShaftModel } from '../engineering/shaft/shaft-model'
import { equivalentStressUnderSeat, nominalStress } from '../engineering/shaft/shaft-stress'
import type { ShaftDiagrams, ShaftLoadCaseResult, StationValue } from './layout-results'
import { notchResults } from './notch-results'
import type { Notch } from './notches'

export interface SeatPressure {
  startMm: number
  endMm: number
  pressure: Pressure
}

interface Place {
  part: string
  stationMm: number
}

export interface ShaftCaseInputs {
  loadCaseId: string
  applicationFactor: number
  model: ShaftModel
  beam: FactoredBeam
  stations: readonly DiagramStation[]
  loads: readonly ShaftLoad[]
  bearings: readonly Place[]
  locatingId: string | null
  /** Where slope and deflection are reported. */
  places: readonly Place[]
  pressures: readonly SeatPressure[]
  notches: readonly Notch[]
}

export function shaftCaseResult(inputs: ShaftCaseInputs): ShaftLoadCaseResult {
  const solution = solveBeam(inputs.beam, inputs.loads)
  const reactions = reactionsOf(inputs, solution)
  const forces = sectionForces([...inputs.loads, ...reactionLoads(inputs, reactions)], inputs.stations)
  const diagrams = diagramsOf(inputs, solution, forces)
  const notches = notchResults(inputs, forces)
  const equivalentMaxMPa = largest(diagrams.stationMm, diagrams.equivalentMPa)
  const yieldMPa = toMPa(inputs.model.material.yieldStrength)
  const weakest = notches.reduce<StationValue | null>(
    (least, notch) =>
      notch.fatigueSafety !== null && (least === null || notch.fatigueSafety < least.value)
        ? { value: notch.fatigueSafety, stationMm: notch.stationMm }
        : least,
    null,
  )
  const shapes = inputs.places.map((place) => ({
    ...place,
    shape: shapeAt(inputs.beam, solution, mm(place.stationMm)),
  }))
  const result: ShaftLoadCaseResult = {
    loadCase: inputs.loadCaseId,
    reactions,
    torqueMaxNm: diagrams.torqueNm.reduce((most, torque) => Math.max(most, Math.abs(torque)), 0),
    bendingMaxNm: largest(diagrams.stationMm, diagrams.bendingNm),
    deflectionMaxUm: largest(diagrams.stationMm, diagrams.deflectionUm),
    slopes: shapes.map(({ part, stationMm, shape }) => ({ part, stationMm, mrad: slopeMrad(shape) })),
    equivalentMaxMPa,
    yieldSafety: equivalentMaxMPa && equivalentMaxMPa.value > 0 ? yieldMPa / equivalentMaxMPa.value : null,
    fatigueSafety: weakest,
    diagrams,
    torqueResidualNm: torqueBalance(inputs.loads.map((load) => load.torque)).residual,
    deflections: shapes.map(({ part, stationMm, shape }) => ({ part, stationMm, um: deflectionUm(shape) })),
    notches,
  }
  requireFiniteResult(result)
  return result
}

const slopeMrad = (shape: ShapePoint) => Math.hypot(toMrad(shape.slopeY), toMrad(shape.slopeZ))
const deflectionUm = (shape: ShapePoint) => Math.hypot(toUm(shape.deflectionY), toUm(shape.deflectionZ))

function reactionsOf(inputs: ShaftCaseInputs, solution: BeamSolution): ShaftLoadCaseResult['reactions'] {
  const axial = inputs.loads.reduce((sum, load) => sum + load.axialForce, 0)
  return inputs.bearings.map((bearing, index) => ({
    bearing: bearing.part,
    yN: solution.reactions[index]?.y ?? 0,
    zN: solution.reactions[index]?.z ?? 0,
    // without −0, which reads oddly on screen
    axialN: bearing.part === inputs.locatingId && axial !== 0 ? -axial : 0,
  }))
}

function reactionLoads(inputs: ShaftCaseInputs, reactions: ShaftLoadCaseResult['reactions']): ShaftLoad[] {
  return reactions.map((reaction, index) => ({
    station: mm(inputs.bearings[index]?.stationMm ?? 0),
    torque: newtonMetre(0),
    forceY: newton(reaction.yN),
    forceZ: newton(reaction.zN),
    axialForce: newton(reaction.axialN),
    momentY: newtonMetre(0),
    momentZ: newtonMetre(0),
  }))
}

function diagramsOf(inputs: ShaftCaseInputs, solution: BeamSolution, forces: SectionForces): ShaftDiagrams {
  const { stations, model, applicationFactor } = inputs
  const diagrams: ShaftDiagrams = {
    stationMm: [],
    torqueNm: Array.from(forces.torque),
    bendingYNm: Array.from(forces.bendingY),
    bendingZNm: Array.from(forces.bendingZ),
    deflectionUm: [],
    equivalentMPa: [],
    bendingNm: [],
    shearYN: Array.from(forces.shearY),
    shearZN: Array.from(forces.shearZ),
    deflectionYUm: [],
    deflectionZUm: [],
    slopeMrad: [],
  }
  const pressureAt = pressureLookup(inputs.pressures)
  stations.forEach(({ station, side }, index) => {
    const shape = shapeAt(inputs.beam, solution, station)
    const bending = Math.hypot(forces.bendingY[index] as number, forces.bendingZ[index] as number)
    diagrams.stationMm.push(station * 1e3)
    diagrams.bendingNm.push(bending)
    diagrams.deflectionUm.push(deflectionUm(shape))
    diagrams.deflectionYUm.push(toUm(shape.deflectionY))
    diagrams.deflectionZUm.push(toUm(shape.deflectionZ))
    diagrams.slopeMrad.push(slopeMrad(shape))
    const segment = segmentAt(model, side === 'left' ? station - 1e-9 : station + 1e-9, side)
    if (!segment) return
    // stresses are judged with the application factor, forces and deflections are shown without
    const stress = nominalStress(
      newtonMetre(bending * applicationFactor),
      newtonMetre((forces.torque[index] as number) * applicationFactor),
      newton((forces.axialForce[index] as number) * applicationFactor),
      segment.outerDiameter,
      segment.bore,
    )
    const pressure = pressureAt(station * 1e3, side)
    diagrams.equivalentMPa.push(
      toMPa(equivalentStressUnderSeat(stress, pressure, segment.outerDiameter, segment.bore)),
    )
  })
  return diagrams
}

/** Pressure of the seat under a station; at an edge the side decides. */
function pressureLookup(pressures: readonly SeatPressure[]) {
  return (stationMm: number, side: 'left' | 'right'): Pressure => {
    const inside = side === 'left' ? stationMm - 1e-6 : stationMm + 1e-6
    let most = 0
    for (const seat of pressures)
      if (inside > seat.startMm && inside < seat.endMm && seat.pressure > most) most = seat.pressure
    return most as Pressure
  }
}

function largest(stations: readonly number[], values: readonly number[]): StationValue | null {
  let found: StationValue | null = null
  values.forEach((value, index) => {
    if (found === null || value > found.value) found = { value, stationMm: stations[index] ?? 0 }
  })
  return found
}

/** Sizes far outside engineering can overflow; then the whole case is "not computable". */
function requireFiniteResult(result: ShaftLoadCaseResult): void {
  const isFiniteList = (values: readonly number[]) => values.every(Number.isFinite)
  const numbers = [
    ...result.reactions.flatMap((reaction) => [reaction.yN, reaction.zN, reaction.axialN]),
    ...result.slopes.map((slope) => slope.mrad),
    ...result.deflections.map((deflection) => deflection.um),
    ...result.notches.flatMap((notch) => [notch.equivalentMPa, notch.bendingNm, notch.torqueNm]),
    result.torqueResidualNm,
    result.yieldSafety ?? 0,
    result.fatigueSafety?.value ?? 0,
  ]
  if (!isFiniteList(numbers) || !Object.values(result.diagrams).every(isFiniteList))
    throw new EngineeringInputError(
      'notFinite',
      'shaft',
      'The sizes or loads of the shaft are out of any range',
    )
}
