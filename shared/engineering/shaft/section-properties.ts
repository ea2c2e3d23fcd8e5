/** Geometry of a round solid or hollow section. */
import { requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Area, Length, SecondMomentOfArea } from '../quantities/quantity'
import { metre4, squareMetre } from '../quantities/units'

/**
 * Second moment of area of a round section about a diameter.
 *
 * Model: I = π (d_o⁴ − d_i⁴)/64; the polar moment is twice as large.
 * @param outerDiameter [m] > 0
 * @param bore [m] ≥ 0 and smaller than the outside; 0 when solid
 * @returns [m⁴] second moment of area
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: round sections without keyways.
 * Source: shigley-9 section 3-10
 * Example: shigley-9 Example 7-5, 1 in: 0.04909 in⁴
 */
export function secondMomentOfArea(outerDiameter: Length, bore: Length): SecondMomentOfArea {
  requirePositive(outerDiameter, 'outerDiameter')
  requireNonNegative(bore, 'bore')
  return metre4((Math.PI * (outerDiameter ** 4 - bore ** 4)) / 64)
}

/**
 * Area of a round section.
 *
 * Model: A = π (d_o² − d_i²)/4.
 * @param outerDiameter [m] > 0
 * @param bore [m] ≥ 0 and smaller than the outside; 0 when solid
 * @returns [m²] area
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: round sections.
 * Source: shigley-9 section 3-10
 * Example: no published number; 20 mm solid: 314.2 mm²
 */
export function sectionArea(outerDiameter: Length, bore: Length): Area {
  requirePositive(outerDiameter, 'outerDiameter')
  requireNonNegative(bore, 'bore')
  return squareMetre((Math.PI * (outerDiameter * outerDiameter - bore * bore)) / 4)
}
