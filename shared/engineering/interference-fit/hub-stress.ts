/** Stress in the hub and what it may be. */
import { requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Length, Pressure } from '../quantities/quantity'
import { metre, pascal } from '../quantities/units'
import { ringRatios, type HubRing } from './annulus'

export interface HubStress {
  /** Hoop tension at the bore, from the fit and from rotation. */
  hoopAtBore: Pressure
  /** Hoop tension at the outside, from the fit alone. */
  hoopAtOutside: Pressure
  /** Von Mises equivalent stress at the bore. */
  equivalent: Pressure
}

/**
 * Stresses of a hub under interface pressure and rotation.
 *
 * Model: thick ring (Lamé), plane stress; at the bore s_t = p(1+Q²)/(1−Q²) + s_rot, s_r = −p,
 * s_v = √(s_t² − s_t s_r + s_r²); outside s_t = 2pQ²/(1−Q²).
 * @param pressure [Pa] interface pressure, ≥ 0
 * @param seatDiameter [m] joint diameter, > 0
 * @param hub [m] outer diameter greater than the seat; material
 * @param rotationHoop [Pa] hoop stress of rotation at the bore, ≥ 0
 * @returns [Pa] hoop tension at bore and outside, equivalent stress at the bore
 * @throws EngineeringInputError `notPositive`, `negative`, `boreNotInside`
 *
 * Validity: away from the hub ends; short hubs and thin hollow shafts see up to 20 % more at the bore (fe-press-fit).
 * Source: shigley-9 Eqs. 3-58, 3-59, 7-44 to 7-47; lame
 * Example: ugural press fit, 18.1 MPa in 100/250 mm: 25 MPa hoop tension at the bore
 */
export function hubStress(
  pressure: Pressure,
  seatDiameter: Length,
  hub: HubRing,
  rotationHoop: Pressure,
): HubStress {
  requireNonNegative(pressure, 'pressure')
  requireNonNegative(rotationHoop, 'rotationHoop')
  const square = ringRatios(seatDiameter, metre(0), hub.outerDiameter).hub ** 2
  const hoop = (pressure * (1 + square)) / (1 - square) + rotationHoop
  return {
    hoopAtBore: pascal(hoop),
    hoopAtOutside: pascal((2 * pressure * square) / (1 - square)),
    equivalent: pascal(Math.sqrt(hoop * hoop + hoop * pressure + pressure * pressure)),
  }
}

/**
 * Safety of the hub against yielding, or of a brittle hub against cracking.
 *
 * Model: ductile hubs yield strength over von Mises stress; brittle hubs tensile strength over hoop tension.
 * @param stress [Pa] from `hubStress`
 * @param hub [Pa] material with strengths
 * @returns [-] strength over stress, null without stress
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: usual limits 1.0 to 1.3 ductile (1.1 typical), 2 to 3 brittle (from memory).
 * Source: shigley-9 chapter 5; din-7190-1
 * Example: no published number; 300 MPa yield at 100 MPa equivalent stress gives 3
 */
export function hubSafety(stress: HubStress, hub: HubRing): number | null {
  const { isBrittle, tensileStrength, yieldStrength } = hub.material
  const strength = isBrittle ? tensileStrength : yieldStrength
  requirePositive(strength, 'hub.material.strength')
  const value = isBrittle ? stress.hoopAtBore : stress.equivalent
  return value > 0 ? strength / value : null
}

/**
 * Most pressure the hub bears with a given safety.
 *
 * Model: von Mises (c²+c+1)p² + (2c+1)s p + s² = (Re/S)² with c = (1+Q²)/(1−Q²) and rotation hoop s; brittle
 * c p + s = Rm/S.
 * @param safety [-] safety asked, > 0
 * @param seatDiameter [m] joint diameter, > 0
 * @param hub [m] outer diameter greater than the seat; material
 * @param rotationHoop [Pa] hoop stress of rotation at the bore, ≥ 0
 * @returns [Pa] permissible pressure, ≥ 0; 0 when rotation alone uses up the strength
 * @throws EngineeringInputError `notPositive`, `negative`, `boreNotInside`
 *
 * Validity: as `hubStress`.
 * Source: shigley-9 chapter 5; ugural press fit (from a limiting hoop stress)
 * Example: ugural, hoop limit 25 MPa in 100/250 mm: 18.1 MPa
 */
export function permissibleHubPressure(
  safety: number,
  seatDiameter: Length,
  hub: HubRing,
  rotationHoop: Pressure,
): Pressure {
  requirePositive(safety, 'safety')
  requireNonNegative(rotationHoop, 'rotationHoop')
  const square = ringRatios(seatDiameter, metre(0), hub.outerDiameter).hub ** 2
  const c = (1 + square) / (1 - square)
  const { isBrittle, tensileStrength, yieldStrength } = hub.material
  if (isBrittle) return pascal(Math.max(0, (tensileStrength / safety - rotationHoop) / c))
  const limit = yieldStrength / safety
  if (rotationHoop >= limit) return pascal(0)
  const quadratic = c * c + c + 1
  const linear = (2 * c + 1) * rotationHoop
  const constant = rotationHoop * rotationHoop - limit * limit
  return pascal((-linear + Math.sqrt(linear * linear - 4 * quadratic * constant)) / (2 * quadratic))
}

/**
 * Growth of the hub outside when the fit is made.
 *
 * Model: thick ring (Lamé), D_a · 2pQ²/(E(1−Q²)).
 * @param pressure [Pa] interface pressure, ≥ 0
 * @param seatDiameter [m] joint diameter, > 0
 * @param hub [m] outer diameter greater than the seat; material
 * @returns [m] diametral growth, ≥ 0
 * @throws EngineeringInputError `notPositive`, `negative`, `boreNotInside`
 *
 * Validity: plain rings; a webbed wheel grows unevenly.
 * Source: shigley-9 Eq. 3-59; lame
 * Example: no published number; 75 MPa in 65/105 mm steel (206 GPa) gives 47.5 µm
 */
export function outerDiameterGrowth(pressure: Pressure, seatDiameter: Length, hub: HubRing): Length {
  requireNonNegative(pressure, 'pressure')
  const square = ringRatios(seatDiameter, metre(0), hub.outerDiameter).hub ** 2
  return metre((hub.outerDiameter * 2 * pressure * square) / (hub.material.youngsModulus * (1 - square)))
}
