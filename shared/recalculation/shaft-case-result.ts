/** One load case of the shaft: reactions, curves, stresses and fatigue, in the keys of the results. */
import { EngineeringInputError } from '../engineering/engineering-input-error'
import { torqueBalance } from '../engineering/load-cases/torque-balance'
import { mm, newton, newtonMetre, toMPa, toMrad, toUm } from '../engineering/quantities/units'
import { shapeAt, shapeCurves, type ShapePoint } from '../engineering/shaft/beam-shape'
import { solveBeam, type BeamSolution } from '../engineering/shaft/beam-solver'
import { sectionForces, type SectionForces } from '../engineering/shaft/section-forces'
import type { ShaftLoad } from '../engineering/shaft/shaft-model'
import { equivalentStressCourse } from '../engineering/shaft/shaft-stress'
import type { ShaftDiagrams, ShaftLoadCaseResult, StationValue } from './layout-results'
import { notchResults } from './notch-results'
import type { ShaftCaseInputs } from './shaft-case-inputs'

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
  const shape = shapeCurves(inputs.beam, solution, inputs.stations)
  const bending = lengths(forces.bendingY, forces.bendingZ, 1)
  // stresses are judged with the application factor, forces and deflections are shown without
  const stress = equivalentStressCourse(
    {
      bending,
      torque: forces.torque,
      axialForce: forces.axialForce,
      pressure: inputs.pressures,
      sections: inputs.sections,
    },
    inputs.applicationFactor,
  )
  return {
    stationMm: inputs.stations.map(({ station }) => station * 1e3),
    torqueNm: Array.from(forces.torque),
    bendingYNm: Array.from(forces.bendingY),
    bendingZNm: Array.from(forces.bendingZ),
    deflectionUm: Array.from(lengths(shape.deflectionY, shape.deflectionZ, 1e6)),
    equivalentMPa: Array.from(scaled(stress, 1e-6)),
    bendingNm: Array.from(bending),
    shearYN: Array.from(forces.shearY),
    shearZN: Array.from(forces.shearZ),
    deflectionYUm: Array.from(scaled(shape.deflectionY, 1e6)),
    deflectionZUm: Array.from(scaled(shape.deflectionZ, 1e6)),
    slopeMrad: Array.from(lengths(shape.slopeY, shape.slopeZ, 1e3)),
  }
}

/** Resultants of two planes, in the unit of the results. */
function lengths(one: Float64Array, other: Float64Array, unit: number): Float64Array {
  const result = new Float64Array(one.length)
  for (let index = 0; index < result.length; index += 1) {
    const a = one[index] as number
    const b = other[index] as number
    result[index] = Math.sqrt(a * a + b * b) * unit
  }
  return result
}

function scaled(values: Float64Array, unit: number): Float64Array {
  const result = new Float64Array(values.length)
  for (let index = 0; index < result.length; index += 1) result[index] = (values[index] as number) * unit
  return result
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
  // a sum is finite only when every term is
  let sum = result.torqueResidualNm + (result.yieldSafety ?? 0) + (result.fatigueSafety?.value ?? 0)
  for (const reaction of result.reactions) sum += reaction.yN + reaction.zN + reaction.axialN
  for (const slope of result.slopes) sum += slope.mrad
  for (const deflection of result.deflections) sum += deflection.um
  for (const notch of result.notches) sum += notch.equivalentMPa + notch.bendingNm + notch.torqueNm
  for (const curve of Object.values(result.diagrams) as number[][]) for (const value of curve) sum += value
  if (!Number.isFinite(sum))
    throw new EngineeringInputError(
      'notFinite',
      'shaft',
      'The sizes or loads of the shaft are out of any range',
    )
}
