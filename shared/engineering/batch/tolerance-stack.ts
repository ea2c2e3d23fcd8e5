import { EngineeringInputError, requireFinite, requirePositive } from '../engineering-input-error'
import type { Length } from '../quantities/quantity'
import { metre } from '../quantities/units'
import { normalProbability } from './normal-distribution'

/** One dimension of a chain: where its limits stand and with which sign it counts. */
export interface ToleranceMember {
  nominal: Length
  /** Limits as deviations from nominal, lower ≤ upper. */
  lower: Length
  upper: Length
  /** +1 or −1; interference is shaft minus bore. */
  sign: 1 | -1
}

export interface ToleranceStack {
  worstLow: Length
  worstHigh: Length
  mean: Length
  standardDeviation: Length
}

/**
 * Worst case and root-sum-square of a chain of dimensions.
 *
 * Model: worst case from the limits; σ² = Σ (T_i/(6 C_p))², each member centred in its limits.
 * @param members [m] nominal, deviations and sign of each dimension
 * @param capability [1] process capability C_p, > 0; 1 when the tolerance is six standard deviations
 * @returns [m] limits, mean and standard deviation of the sum
 * @throws EngineeringInputError `notFinite`, `notPositive`, `outOfRange`
 *
 * Validity: independent members; RSS assumes normal, centred processes and is not for sorting or single units.
 * Source: shigley-9 section 1-14
 * Example: shigley-9 Example 1-7, gap of a screw with three parts: 0.005 in, worst case ± 0.010 in (from memory)
 */
export function toleranceStack(members: readonly ToleranceMember[], capability: number): ToleranceStack {
  requirePositive(capability, 'capability')
  let worstLow = 0
  let worstHigh = 0
  let mean = 0
  let variance = 0
  members.forEach(({ nominal, lower, upper, sign }, index) => {
    requireFinite(nominal, `members.${index}.nominal`)
    requireFinite(lower, `members.${index}.lower`)
    requireFinite(upper, `members.${index}.upper`)
    if (lower > upper)
      throw new EngineeringInputError(
        'outOfRange',
        `members.${index}.lower`,
        'The lower limit is above the upper',
      )
    worstLow += sign * (nominal + (sign > 0 ? lower : upper))
    worstHigh += sign * (nominal + (sign > 0 ? upper : lower))
    mean += sign * (nominal + (lower + upper) / 2)
    variance += ((upper - lower) / (6 * capability)) ** 2
  })
  return {
    worstLow: metre(worstLow),
    worstHigh: metre(worstHigh),
    mean: metre(mean),
    standardDeviation: metre(Math.sqrt(variance)),
  }
}

/**
 * Chance that the sum of a chain falls below a value.
 *
 * Model: P = Φ((limit − mean)/σ).
 * @param stack [m] from `toleranceStack`
 * @param limit [m] value asked about
 * @returns [1] probability from 0 to 1
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: normal, independent members; inspection that cuts off the tails makes it smaller.
 * Source: shigley-9 section 1-14
 * Example: abramowitz-stegun Table 26.1, three standard deviations below the mean: 0.00135
 */
export function chanceBelow(stack: ToleranceStack, limit: Length): number {
  requireFinite(limit, 'limit')
  if (stack.standardDeviation === 0) return limit > stack.mean ? 1 : 0
  return normalProbability((limit - stack.mean) / stack.standardDeviation)
}
