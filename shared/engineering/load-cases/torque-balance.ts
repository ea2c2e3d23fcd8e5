import { requireFinite } from '../engineering-input-error'
import type { Moment } from '../quantities/quantity'
import { newtonMetre } from '../quantities/units'

export interface TorqueBalance {
  /** What is left over: the sum of all torques. */
  residual: Moment
  isBalanced: boolean
}

/** A residual within this share of the largest torque is rounding of the entered values. */
const BALANCE_SHARE = 0.005

/**
 * Sum of the torques of a load case.
 *
 * Model: a shaft at constant speed is in balance when driving and driven torques add to zero; bearing friction left out.
 * @param torques [N·m] torque of each load, positive when the part drives the shaft
 * @returns [N·m] residual and whether it is within 0.5 % of the largest torque
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: steady running; a shaft that speeds up keeps a residual on purpose.
 * Source: statics
 * Example: no published number; 1015, −990 and −25 N·m are in balance
 */
export function torqueBalance(torques: readonly Moment[]): TorqueBalance {
  let sum = 0
  let largest = 0
  for (const torque of torques) {
    requireFinite(torque, 'torque')
    sum += torque
    largest = Math.max(largest, Math.abs(torque))
  }
  return { residual: newtonMetre(sum), isBalanced: Math.abs(sum) <= BALANCE_SHARE * largest }
}
