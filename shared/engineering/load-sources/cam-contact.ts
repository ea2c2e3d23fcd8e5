import {
  EngineeringInputError,
  requireFinite,
  requireNonNegative,
  requirePositive,
} from '../engineering-input-error'
import type { Angle, AngularSpeed, Force, Length, Mass } from '../quantities/quantity'
import { metre, newton } from '../quantities/units'
import { loadAtContact, type ResolvedLoad } from './resolved-load'

/** Follower at one angle of the cam; derivatives of the lift by the cam angle. */
export interface FollowerMotion {
  lift: Length
  /** ds/dθ, m/rad */
  liftRate: Length
  /** d²s/dθ², m/rad² */
  liftAcceleration: Length
}

/**
 * Force of the follower along its own guide.
 *
 * Model: F = F_spring(s) + other force + m a ω², spring F_0 + c s, a = d²s/dθ².
 * @param follower.motion [m] lift and its derivatives by the cam angle
 * @param follower.mass [kg] moving mass reduced to the follower, ≥ 0
 * @param follower.preload [N] spring force at zero lift, ≥ 0
 * @param follower.springRate [N/m] ≥ 0
 * @param follower.otherForce [N] gas, process or friction force against the lift
 * @param speed [rad/s] cam speed, ≥ 0
 * @returns [N] force on the cam along the follower; not positive: the follower lifts off
 * @throws EngineeringInputError `notFinite`, `negative`
 *
 * Validity: rigid follower; peaks at over-speed decide on lift-off.
 * Source: machine-dynamics
 * Example: machine-dynamics, 0.1 kg, 0.02 m/rad², 100 rad/s, no spring: 20 N
 */
export function followerForce(
  follower: {
    motion: FollowerMotion
    mass: Mass
    preload: Force
    springRate: number
    otherForce: Force
  },
  speed: AngularSpeed,
): Force {
  requireFinite(follower.motion.lift, 'motion.lift')
  requireFinite(follower.motion.liftAcceleration, 'motion.liftAcceleration')
  requireNonNegative(follower.mass, 'mass')
  requireNonNegative(follower.preload, 'preload')
  requireNonNegative(follower.springRate, 'springRate')
  requireFinite(follower.otherForce, 'otherForce')
  requireNonNegative(speed, 'speed')
  return newton(
    follower.preload +
      follower.springRate * follower.motion.lift +
      follower.otherForce +
      follower.mass * follower.motion.liftAcceleration * speed * speed,
  )
}

/**
 * Load of a cam with a roller or flat follower.
 *
 * Model: the follower pushes towards the cam's centre along its guide; energy balance gives the torque,
 * T = −F ds/dθ (lifting brakes the shaft), which for a roller equals the side force F tan φ at the contact radius.
 * @param force [N] along the follower, ≥ 0, from `followerForce`
 * @param liftRate [m/rad] ds/dθ at this angle, any sign
 * @param contactRadius [m] distance of the contact from the shaft's centre line, > 0
 * @param guideDirection [rad] direction of the follower from +y, positive in the sense of rotation
 * @returns [N, N·m] load at the centre line
 * @throws EngineeringInputError `notFinite`, `negative`, `notPositive`, `outOfRange`
 *
 * Validity: pressure angle up to 45°; guide through the shaft's centre line.
 * Source: machine-dynamics
 * Example: machine-dynamics, 1000 N while lifting 10 mm/rad: −10 N·m
 */
export function camLoad(
  force: Force,
  liftRate: Length,
  contactRadius: Length,
  guideDirection: Angle,
): ResolvedLoad {
  requireNonNegative(force, 'force')
  requireFinite(liftRate, 'liftRate')
  requirePositive(contactRadius, 'contactRadius')
  requireFinite(guideDirection, 'guideDirection')
  if (Math.abs(liftRate) > contactRadius)
    throw new EngineeringInputError('outOfRange', 'liftRate', 'The pressure angle is above 45°')
  const tangential = newton((-force * liftRate) / contactRadius)
  return loadAtContact(metre(contactRadius), guideDirection, newton(-force), tangential, newton(0))
}
