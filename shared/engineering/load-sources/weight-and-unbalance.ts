import { requireFinite, requireNonNegative } from '../engineering-input-error'
import type { Angle, AngularSpeed, Length, Mass } from '../quantities/quantity'
import { newton, newtonMetre } from '../quantities/units'
import type { ResolvedLoad } from './resolved-load'

/** Standard acceleration of free fall, m/s² (exact by definition, ISO 80000-3). */
export const STANDARD_GRAVITY = 9.80665

function transverse(magnitude: number, direction: number): ResolvedLoad {
  return {
    torque: newtonMetre(0),
    forceY: newton(magnitude * Math.cos(direction)),
    forceZ: newton(magnitude * Math.sin(direction)),
    axial: newton(0),
    momentY: newtonMetre(0),
    momentZ: newtonMetre(0),
  }
}

/**
 * Weight of a part on a horizontal shaft.
 *
 * Model: m g along the direction of gravity.
 * @param mass [kg] ≥ 0
 * @param down [rad] direction of gravity from +y; π when +y points up
 * @returns [N] load at the centre line
 * @throws EngineeringInputError `negative`, `notFinite`
 *
 * Validity: horizontal shaft; on a vertical one the weight is an axial force.
 * Source: iso-80000-3
 * Example: iso-80000-3, 1 kg: 9.80665 N
 */
export function weightLoad(mass: Mass, down: Angle): ResolvedLoad {
  requireNonNegative(mass, 'mass')
  requireFinite(down, 'down')
  return transverse(mass * STANDARD_GRAVITY, down)
}

/**
 * Centrifugal force of an unbalance, taken at one angle.
 *
 * Model: F = m e ω², turning with the shaft.
 * @param mass [kg] mass of the part, ≥ 0
 * @param eccentricity [m] distance of its centre of mass from the centre line, ≥ 0
 * @param speed [rad/s] ≥ 0
 * @param position [rad] angle of the heavy side from +y
 * @returns [N] load at the centre line
 * @throws EngineeringInputError `negative`, `notFinite`
 *
 * Validity: rigid shaft, well below the first critical speed.
 * Source: machine-dynamics
 * Example: machine-dynamics, 10 kg, 50 µm, 100 rad/s: 5 N
 */
export function unbalanceLoad(
  mass: Mass,
  eccentricity: Length,
  speed: AngularSpeed,
  position: Angle,
): ResolvedLoad {
  requireNonNegative(mass, 'mass')
  requireNonNegative(eccentricity, 'eccentricity')
  requireNonNegative(speed, 'speed')
  requireFinite(position, 'position')
  return transverse(mass * eccentricity * speed * speed, position)
}
