import { EngineeringInputError, requireFinite, requirePositive } from '../engineering-input-error'
import type { Angle, Force, Length, Moment } from '../quantities/quantity'
import { metre, newton } from '../quantities/units'
import { loadAtContact, type ResolvedLoad } from './resolved-load'

/** Components of a tooth force: tangential in the sense of the torque, radial towards the own centre, axial by sign. */
export interface ToothForces {
  tangential: Force
  radial: Force
  axial: Force
}

function requireAcute(angle: number, path: string): void {
  requireFinite(angle, path)
  if (angle < 0 || angle >= Math.PI / 2)
    throw new EngineeringInputError('outOfRange', path, `${path} must be from 0 to below 90°`)
}

/**
 * Pitch diameter of a spur or helical gear.
 *
 * Model: d = z m_n / cos β.
 * @param teeth [1] number of teeth, > 0
 * @param normalModule [m] module in the normal section, > 0
 * @param helixAngle [rad] 0 to below π/2; 0 for a spur gear
 * @returns [m] pitch diameter
 * @throws EngineeringInputError `notPositive`, `outOfRange`
 *
 * Validity: standard centre distance; with profile shift give the operating pitch diameter instead.
 * Source: shigley-9 chapter 13
 * Example: shigley-9 Example 13-9, 18 teeth, 12 per inch normal pitch, 30°: 1.732 in (from memory)
 */
export function pitchDiameter(teeth: number, normalModule: Length, helixAngle: Angle): Length {
  requirePositive(teeth, 'teeth')
  requirePositive(normalModule, 'normalModule')
  requireAcute(helixAngle, 'helixAngle')
  return metre((teeth * normalModule) / Math.cos(helixAngle))
}

export type Hand = 'right' | 'left'

/**
 * Tooth forces of a spur or helical gear.
 *
 * Model: F_t = 2 T/d; tan α_t = tan α_n / cos β; F_r = F_t tan α_t; |F_a| = F_t tan β. A right-hand tooth pushes
 * towards −x when its torque is positive, a left-hand one towards +x.
 * @param gear.torque [N·m] torque on this gear, positive when the mesh drives the shaft
 * @param gear.pitchDiameter [m] operating pitch diameter, > 0
 * @param gear.normalPressureAngle [rad] 0 to below π/2
 * @param gear.helixAngle [rad] 0 to below π/2
 * @param gear.hand [-] hand of the helix of this gear, of no effect when β = 0
 * @returns [N] tangential (sign of the torque), radial (towards the centre, ≥ 0), axial (towards +x)
 * @throws EngineeringInputError `notPositive`, `notFinite`, `outOfRange`
 *
 * Validity: forces at the pitch point, without tooth friction; internal gears are not covered.
 * Source: shigley-9 chapter 13
 * Example: shigley-9 Example 13-7, 2.5 kW, 1750 rpm, module 2.5, 20 teeth: 0.546 kN and 0.199 kN (from memory)
 */
export function helicalToothForces(gear: {
  torque: Moment
  pitchDiameter: Length
  normalPressureAngle: Angle
  helixAngle: Angle
  hand: Hand
}): ToothForces {
  requireFinite(gear.torque, 'torque')
  requirePositive(gear.pitchDiameter, 'pitchDiameter')
  requireAcute(gear.normalPressureAngle, 'normalPressureAngle')
  requireAcute(gear.helixAngle, 'helixAngle')
  const tangential = (2 * gear.torque) / gear.pitchDiameter
  const transverse = Math.tan(gear.normalPressureAngle) / Math.cos(gear.helixAngle)
  const towardsPlus = gear.hand === 'left' ? 1 : -1
  return {
    tangential: newton(tangential),
    radial: newton(Math.abs(tangential) * transverse),
    axial: newton(towardsPlus * tangential * Math.tan(gear.helixAngle)),
  }
}

/**
 * Tooth forces of a straight bevel gear at its mean diameter.
 *
 * Model: F_t = 2 T/d_m; F_r = F_t tan α cos γ; F_a = F_t tan α sin γ, pushing from the apex towards the large end.
 * @param gear.torque [N·m] torque on this gear, positive when the mesh drives the shaft
 * @param gear.meanDiameter [m] pitch diameter at the middle of the face, > 0
 * @param gear.pressureAngle [rad] 0 to below π/2
 * @param gear.pitchConeAngle [rad] of this gear, 0 to below π/2
 * @param gear.largeEnd [-] side of the gear's large end
 * @returns [N] tangential (sign of the torque), radial (towards the centre, ≥ 0), axial (towards +x)
 * @throws EngineeringInputError `notPositive`, `notFinite`, `outOfRange`
 *
 * Validity: straight teeth, force at the middle of the face; spiral teeth are not covered.
 * Source: shigley-9 chapter 13
 * Example: shigley-9 Example 13-8, 5 hp, 600 rpm, 1.293 in: 406, 46.6 and 140 lbf on the gear (from memory)
 */
export function bevelToothForces(gear: {
  torque: Moment
  meanDiameter: Length
  pressureAngle: Angle
  pitchConeAngle: Angle
  largeEnd: 'left' | 'right'
}): ToothForces {
  requireFinite(gear.torque, 'torque')
  requirePositive(gear.meanDiameter, 'meanDiameter')
  requireAcute(gear.pressureAngle, 'pressureAngle')
  requireAcute(gear.pitchConeAngle, 'pitchConeAngle')
  const tangential = (2 * gear.torque) / gear.meanDiameter
  const separating = Math.abs(tangential) * Math.tan(gear.pressureAngle)
  return {
    tangential: newton(tangential),
    radial: newton(separating * Math.cos(gear.pitchConeAngle)),
    axial: newton((gear.largeEnd === 'right' ? 1 : -1) * separating * Math.sin(gear.pitchConeAngle)),
  }
}

/**
 * Tooth forces as a load on the shaft.
 *
 * Model: the contact lies on the pitch circle towards the mate; the radial force pushes away from it.
 * @param forces [N] from `helicalToothForces` or `bevelToothForces`
 * @param diameter [m] pitch or mean diameter, > 0
 * @param matePosition [rad] direction of the mate's centre from +y, positive in the sense of rotation
 * @returns [N, N·m] load at the centre line
 * @throws EngineeringInputError `notPositive`, `notFinite`
 *
 * Validity: external gears on parallel or crossing axes.
 * Source: statics
 * Example: shigley-9 Example 13-7, mate on top: 199 N downwards, 546 N sideways (from memory)
 */
export function gearMeshLoad(forces: ToothForces, diameter: Length, matePosition: Angle): ResolvedLoad {
  requirePositive(diameter, 'diameter')
  requireFinite(matePosition, 'matePosition')
  return loadAtContact(
    metre(diameter / 2),
    matePosition,
    newton(-forces.radial),
    forces.tangential,
    forces.axial,
  )
}
