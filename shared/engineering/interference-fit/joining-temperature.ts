/** Heating the hub, cooling the shaft, and how much interference either can join. */
import { requireFinite, requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Material } from '../materials/material'
import type { Length, Temperature } from '../quantities/quantity'
import { celsius, kelvin, metre } from '../quantities/units'

/** The coldest a shaft gets in liquid nitrogen. */
export const LIQUID_NITROGEN_TEMPERATURE = celsius(-196)

export interface HeatedJoint {
  seatDiameter: Length
  /** Clearance while the hub travels. */
  clearance: Length
  /** Room temperature, from which the hub is heated. */
  ambient: Temperature
  /** Temperature of the shaft while joining; equal to `ambient` when it is not cooled. */
  shaftTemperature: Temperature
  hub: Material
  shaft: Material
}

/** Change of the shaft diameter per metre; contraction per kelvin is smaller than expansion. */
function shaftStrain(joint: HeatedJoint): number {
  const rise = joint.shaftTemperature - joint.ambient
  return rise * (rise < 0 ? joint.shaft.coolingExpansion : joint.shaft.expansion)
}

/**
 * Temperature the hub needs so that it slides on with clearance.
 *
 * Model: t_A = t_0 + (d_max + s)/(α_A D) + (α_I/α_A)(t_I − t_0), interference before embedding.
 * @param maxInterference [m] most as-made diametral interference
 * @param joint [m, K] seat, clearance ≥ 0, temperatures and materials
 * @returns [K] hub temperature; the ambient one when nothing has to be heated
 * @throws EngineeringInputError `notPositive`, `negative`, `notFinite`
 *
 * Validity: mean expansion from 20 °C; use the 20 to 200 °C value for hot hubs. Hub evenly heated.
 * Source: din-7190-1 (from memory); singer-pytel Problem 267 read backwards
 * Example: singer-pytel, 1.287 mm on 2 m at 11.7e-6/K without clearance: 80 °C from 25 °C
 */
export function joiningTemperature(maxInterference: Length, joint: HeatedJoint): Temperature {
  requireFinite(maxInterference, 'maxInterference')
  requirePositive(joint.seatDiameter, 'seatDiameter')
  requireNonNegative(joint.clearance, 'clearance')
  requirePositive(joint.hub.expansion, 'hub.material.expansion')
  const strain = (maxInterference + joint.clearance) / joint.seatDiameter + shaftStrain(joint)
  return kelvin(joint.ambient + Math.max(0, strain) / joint.hub.expansion)
}

/**
 * Temperature the shaft must be cooled to so that it slides in with clearance, the hub at room temperature.
 *
 * Model: t_I = t_0 − (d_max + s)/(α_I,cool D).
 * @param maxInterference [m] most as-made diametral interference
 * @param joint [m, K] seat, clearance ≥ 0, ambient temperature and materials
 * @returns [K] shaft temperature, at or below ambient
 * @throws EngineeringInputError `notPositive`, `negative`, `notFinite`
 *
 * Validity: mean contraction from 20 to −196 °C; liquid nitrogen gives at most about 0.19 % on steel.
 * Source: din-7190-1 (from memory)
 * Example: no published number; 0.093 mm on 50 mm steel at 8.5e-6/K needs −199 °C, which nitrogen does not reach
 */
export function coolingTemperature(maxInterference: Length, joint: HeatedJoint): Temperature {
  requireFinite(maxInterference, 'maxInterference')
  requirePositive(joint.seatDiameter, 'seatDiameter')
  requireNonNegative(joint.clearance, 'clearance')
  requirePositive(joint.shaft.coolingExpansion, 'shaft.material.coolingExpansion')
  const strain = Math.max(0, maxInterference + joint.clearance) / joint.seatDiameter
  return kelvin(joint.ambient - strain / joint.shaft.coolingExpansion)
}

/**
 * Most interference that heating up to a limit can still join.
 *
 * Model: `joiningTemperature` solved for d_max, with the handling allowance taken off the limit.
 * @param limit [K] hottest the hub may get in the oven
 * @param handlingAllowance [K] temperature lost between oven and seat, ≥ 0
 * @param joint [m, K] seat, clearance ≥ 0, temperatures and materials
 * @returns [m] most as-made diametral interference; negative when even clearance cannot be reached
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: as `joiningTemperature`.
 * Source: din-7190-1 (from memory)
 * Example: singer-pytel Problem 267 backwards, 80 °C on 2 m from 25 °C: 1.287 mm
 */
export function interferenceForHeatLimit(
  limit: Temperature,
  handlingAllowance: number,
  joint: HeatedJoint,
): Length {
  requirePositive(joint.seatDiameter, 'seatDiameter')
  requireNonNegative(handlingAllowance, 'handlingAllowance')
  requireNonNegative(joint.clearance, 'clearance')
  const hubStrain = (limit - handlingAllowance - joint.ambient) * joint.hub.expansion
  return metre((hubStrain - shaftStrain(joint)) * joint.seatDiameter - joint.clearance)
}

/**
 * Most interference that cooling the shaft down to a limit can still join.
 *
 * Model: `coolingTemperature` solved for d_max.
 * @param coldest [K] coldest the shaft can be made
 * @param joint [m, K] seat, clearance ≥ 0, ambient temperature and materials
 * @returns [m] most as-made diametral interference; negative when even clearance cannot be reached
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: as `coolingTemperature`.
 * Source: din-7190-1 (from memory)
 * Example: no published number; −196 °C on 50 mm steel without clearance: 92 µm (about 0.18 %)
 */
export function interferenceForColdLimit(coldest: Temperature, joint: HeatedJoint): Length {
  requirePositive(joint.seatDiameter, 'seatDiameter')
  requireNonNegative(joint.clearance, 'clearance')
  const strain = (joint.ambient - coldest) * joint.shaft.coolingExpansion
  return metre(strain * joint.seatDiameter - joint.clearance)
}
