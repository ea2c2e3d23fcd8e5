/** The two rings of a seat. */
import { EngineeringInputError, requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Material } from '../materials/material'
import type { Length } from '../quantities/quantity'

/** The shaft under a seat; `bore` is 0 for a solid shaft. */
export interface ShaftRing {
  bore: Length
  material: Material
}

/** The hub around a seat, taken as a plain ring (root diameter of a gear, boss of a webbed wheel). */
export interface HubRing {
  outerDiameter: Length
  material: Material
}

export interface RingRatios {
  /** Q_A = seat diameter over hub outside diameter. */
  hub: number
  /** Q_I = shaft bore over seat diameter; 0 when solid. */
  shaft: number
}

/**
 * Diameter ratios of the two rings of a seat.
 *
 * Model: concentric rings; Q_A = D/D_a, Q_I = D_i/D.
 * @param seatDiameter [m] joint diameter D, > 0
 * @param shaftBore [m] bore of the shaft D_i, ≥ 0 and smaller than the seat
 * @param hubOuterDiameter [m] outside of the hub D_a, greater than the seat
 * @returns [-] ratios between 0 and 1
 * @throws EngineeringInputError `notPositive`, `negative`, `boreNotInside`
 *
 * Validity: any concentric rings.
 * Source: shigley-9 section 3-14
 * Example: brown-marks Example 6, 100 mm seat in a 160 mm collar: Q_A = 0.625
 */
export function ringRatios(seatDiameter: Length, shaftBore: Length, hubOuterDiameter: Length): RingRatios {
  requirePositive(seatDiameter, 'seatDiameter')
  requireNonNegative(shaftBore, 'shaft.bore')
  requirePositive(hubOuterDiameter, 'hub.outerDiameter')
  if (shaftBore >= seatDiameter)
    throw new EngineeringInputError(
      'boreNotInside',
      'shaft.bore',
      'The shaft bore is not smaller than the seat',
    )
  if (hubOuterDiameter <= seatDiameter)
    throw new EngineeringInputError(
      'boreNotInside',
      'hub.outerDiameter',
      'The hub is not larger than its bore',
    )
  return { hub: seatDiameter / hubOuterDiameter, shaft: shaftBore / seatDiameter }
}
