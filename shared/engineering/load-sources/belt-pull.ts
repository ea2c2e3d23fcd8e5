import { EngineeringInputError, requireFinite, requirePositive } from '../engineering-input-error'
import type { Angle, Force, Length, Moment } from '../quantities/quantity'
import { newton, newtonMetre } from '../quantities/units'
import type { ResolvedLoad } from './resolved-load'

export interface StrandForces {
  tight: Force
  slack: Force
}

/**
 * Strand forces of a belt held by friction.
 *
 * Model: F_1 − F_2 = 2 T/d; F_1/F_2 = exp(μ_eff φ) at the limit of slip, times the reserve against it;
 * V-belts enter μ / sin(half the groove angle).
 * @param belt.torque [N·m] torque of the pulley, any sign
 * @param belt.pitchDiameter [m] > 0
 * @param belt.effectiveFriction [1] > 0
 * @param belt.wrapAngle [rad] angle of contact, above 0 to 2π
 * @param belt.reserve [1] how much tighter than the slip limit it runs, ≥ 1
 * @returns [N] tight and slack strand, both ≥ 0
 * @throws EngineeringInputError `notFinite`, `notPositive`, `outOfRange`
 *
 * Validity: without centrifugal tension; the static tension of a stopped belt is not zero and is not covered.
 * Source: belt-friction
 * Example: belt-friction, friction 0.3 over half a turn: tight over slack 2.566
 */
export function beltStrandForces(belt: {
  torque: Moment
  pitchDiameter: Length
  effectiveFriction: number
  wrapAngle: Angle
  reserve: number
}): StrandForces {
  requireFinite(belt.torque, 'torque')
  requirePositive(belt.pitchDiameter, 'pitchDiameter')
  requirePositive(belt.effectiveFriction, 'effectiveFriction')
  requirePositive(belt.wrapAngle, 'wrapAngle')
  if (belt.wrapAngle > 2 * Math.PI)
    throw new EngineeringInputError('outOfRange', 'wrapAngle', 'The belt touches at most one full turn')
  requireFinite(belt.reserve, 'reserve')
  if (belt.reserve < 1)
    throw new EngineeringInputError('outOfRange', 'reserve', 'A belt below its slip limit does not carry')
  const pull = Math.abs((2 * belt.torque) / belt.pitchDiameter)
  const ratio = Math.exp(belt.effectiveFriction * belt.wrapAngle)
  const slack = (pull / (ratio - 1)) * belt.reserve
  return { tight: newton(slack + pull), slack: newton(slack) }
}

/**
 * Pull of a belt or chain on the shaft from the effective pull and a factor.
 *
 * Model: shaft load = factor · 2 T/d; common practice: V-belt 1.5 to 2, flat 2 to 2.5, toothed 1.1 to 1.5,
 * roller chain 1.0 to 1.25 plus shock (from memory).
 * @param torque [N·m] torque of the pulley, any sign
 * @param pitchDiameter [m] > 0
 * @param factor [1] shaft load over effective pull, ≥ 1
 * @returns [N] pull on the shaft, ≥ 0
 * @throws EngineeringInputError `notFinite`, `notPositive`, `outOfRange`
 *
 * Validity: a first estimate; replace it by the maker's figure for the drive.
 * Source: belt-friction
 * Example: belt-friction, 100 N·m on 200 mm with factor 2: 2 kN (common practice)
 */
export function pullByFactor(torque: Moment, pitchDiameter: Length, factor: number): Force {
  requireFinite(torque, 'torque')
  requirePositive(pitchDiameter, 'pitchDiameter')
  requireFinite(factor, 'factor')
  if (factor < 1)
    throw new EngineeringInputError('outOfRange', 'factor', 'The shaft carries at least the effective pull')
  return newton(Math.abs((2 * torque) / pitchDiameter) * factor)
}

/**
 * Vector sum of two strands as a load on the shaft.
 *
 * Model: each strand pulls along its own direction away from the pulley.
 * @param torque [N·m] torque of the pulley, positive when it drives the shaft
 * @param strands [N] tight and slack strand, each ≥ 0
 * @param centreDirection [rad] direction of the other pulley from +y, positive in the sense of rotation
 * @param strandAngle [rad] angle between one strand and the centre line, 0 for parallel strands
 * @returns [N, N·m] load at the centre line
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: open drive of two pulleys in one plane.
 * Source: statics
 * Example: statics, 300 and 100 N parallel, other pulley on top: 400 N upwards
 */
export function beltLoad(
  torque: Moment,
  strands: StrandForces,
  centreDirection: Angle,
  strandAngle: Angle,
): ResolvedLoad {
  requireFinite(torque, 'torque')
  requireFinite(centreDirection, 'centreDirection')
  requireFinite(strandAngle, 'strandAngle')
  // The tight strand lies on the side that pulls the pulley in the sense of its torque.
  const side = Math.sign(torque) * strandAngle
  const tight = centreDirection + side
  const slack = centreDirection - side
  return {
    torque,
    forceY: newton(strands.tight * Math.cos(tight) + strands.slack * Math.cos(slack)),
    forceZ: newton(strands.tight * Math.sin(tight) + strands.slack * Math.sin(slack)),
    axial: newton(0),
    momentY: newtonMetre(0),
    momentZ: newtonMetre(0),
  }
}
