import { requireFinite } from '../engineering-input-error'
import type { Length } from '../quantities/quantity'
import { metre } from '../quantities/units'
import { limitsOfClass } from '../tolerances/iso286-limits'

/** As-made diametral interference, positive when the shaft is larger than the bore. */
export interface InterferenceLimits {
  min: Length
  max: Length
  /** Largest seat above nominal, and smallest bore; what passes what depends on them. */
  seatUpperDeviation: Length
  boreLowerDeviation: Length
}

/**
 * Least and most interference that two ISO 286 classes can produce.
 *
 * Model: d_max = es − EI, d_min = ei − ES at 20 °C.
 * @param size [m] nominal joint diameter, > 0, up to 500 mm
 * @param holeClass [-] class of the bore, such as `H7`
 * @param shaftClass [-] class of the seat, such as `u6`
 * @returns [m] limits; a negative one is clearance
 * @throws EngineeringInputError `notPositive`, `sizeOutOfRange`, `unknownToleranceClass`
 *
 * Validity: nominal sizes over 0 up to 500 mm at 20 °C.
 * Source: iso-286-1 clause 4; shigley-9 section 7-8
 * Example: 50 H7/s6 gives 18 to 59 µm (jis-b-0401: s6 at 50 mm is +59/+43; H7 is +25/0)
 */
export function interferenceOfClasses(
  size: Length,
  holeClass: string,
  shaftClass: string,
): InterferenceLimits {
  const hole = limitsOfClass(size, holeClass)
  const shaft = limitsOfClass(size, shaftClass)
  return {
    min: metre(shaft.lowerDeviation - hole.upperDeviation),
    max: metre(shaft.upperDeviation - hole.lowerDeviation),
    seatUpperDeviation: shaft.upperDeviation,
    boreLowerDeviation: hole.lowerDeviation,
  }
}

/**
 * Interference limits that a person gives directly.
 *
 * Model: the smaller value is the least; sizes read as hole basis (smallest bore = nominal).
 * @param one [m] one limit of the diametral interference, any sign
 * @param other [m] the other limit
 * @returns [m] limits in order
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: any finite pair.
 * Source: iso-286-1 clause 3 (interference as difference of sizes)
 * Example: no published number; 52 and 35 µm give 35 to 52 µm
 */
export function interferenceOfLimits(one: Length, other: Length): InterferenceLimits {
  requireFinite(one, 'fit.minInterference')
  requireFinite(other, 'fit.maxInterference')
  const max = one > other ? one : other
  return { min: one > other ? other : one, max, seatUpperDeviation: max, boreLowerDeviation: metre(0) }
}
