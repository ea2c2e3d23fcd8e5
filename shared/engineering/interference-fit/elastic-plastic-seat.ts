/** A hub that yields from the bore outwards while the shaft stays elastic. */
import { EngineeringInputError, requireFinite, requireNonNegative } from '../engineering-input-error'
import type { Length, Pressure } from '../quantities/quantity'
import { metre, pascal } from '../quantities/units'
import { ringRatios } from './annulus'
import type { SeatRings } from './interface-pressure'

export interface ElasticPlasticSeat {
  pressure: Pressure
  /** Outside of the yielded ring; equal to the seat while the hub is elastic. */
  plasticDiameter: Length
  /** Yielded share of the hub's section, 0 to 1. */
  plasticShare: number
  /** False where the derivation no longer holds; the reasons say why. */
  isValid: boolean
  reasons: ElasticPlasticLimit[]
}

export type ElasticPlasticLimit =
  /** No equilibrium: the whole hub would flow. */
  | 'fullyPlastic'
  /** More than 30 % of the section has yielded (from memory). */
  | 'plasticShare'
  /** Hoop stress would turn to compression in the yielded ring: p > 2 Re/√3. */
  | 'hoopCompression'
  | 'brittleHub'
  | 'shaftYields'

/** Most yielded section commonly accepted (from memory of the DIN 7190 family). */
export const LARGEST_PLASTIC_SHARE = 0.3

/**
 * Pressure of a hub that has yielded to a given diameter.
 *
 * Model: p = k (2 ln ζ + 1 − ζ² Q_A²), k = Re/√3; elastic-ideally plastic, modified shear criterion, plane stress.
 * @param rings [m] seat diameter and hub outside; material with yield strength
 * @param plasticRatio [-] ζ = plastic diameter over seat diameter, 1 to 1/Q_A
 * @returns [Pa] interface pressure
 * @throws EngineeringInputError `outOfRange`, `boreNotInside`, `notPositive`
 *
 * Validity: ductile hubs, 2 Re/√3 as the upper bound of the pressure.
 * Source: din-7190-1 (from memory; derivation by equilibrium and compatibility)
 * Example: no published number; 100/200 mm, 300 MPa, ζ = 1.25: 182.8 MPa, the same by Runge-Kutta integration
 */
export function pressureAtPlasticRatio(rings: SeatRings, plasticRatio: number): Pressure {
  const { hub: ratio } = ringRatios(rings.seatDiameter, rings.shaft.bore, rings.hub.outerDiameter)
  requireFinite(plasticRatio, 'plasticRatio')
  if (plasticRatio < 1 || plasticRatio > 1 / ratio + 1e-12)
    throw new EngineeringInputError('outOfRange', 'plasticRatio', 'The yielded ring ends inside the hub')
  const k = rings.hub.material.yieldStrength / Math.sqrt(3)
  return pascal(k * (2 * Math.log(plasticRatio) + 1 - (plasticRatio * ratio) ** 2))
}

/**
 * Interference that makes a hub yield to a given diameter.
 *
 * Model: d/D = (2 k ζ² − (1 − ν_A) p)/E_A + p ((1 + Q_I²)/(1 − Q_I²) − ν_I)/E_I.
 * @param rings [m] seat, shaft bore and hub outside, with materials
 * @param plasticRatio [-] ζ, 1 to 1/Q_A
 * @returns [m] diametral interference
 * @throws EngineeringInputError `outOfRange`, `boreNotInside`, `notPositive`
 *
 * Validity: as `pressureAtPlasticRatio`; elastic shaft.
 * Source: din-7190-1 (from memory; derivation by equilibrium and compatibility)
 * Example: no published number; 100/200 mm, 300 MPa, ζ = 1.25, steel on solid steel of 210 GPa: 0.2577 mm
 */
export function interferenceAtPlasticRatio(rings: SeatRings, plasticRatio: number): Length {
  const pressure = pressureAtPlasticRatio(rings, plasticRatio)
  const { shaft: shaftRatio } = ringRatios(rings.seatDiameter, rings.shaft.bore, rings.hub.outerDiameter)
  const { hub, shaft } = rings
  const k = hub.material.yieldStrength / Math.sqrt(3)
  const hubStrain =
    (2 * k * plasticRatio ** 2 - (1 - hub.material.poissonRatio) * pressure) / hub.material.youngsModulus
  const square = shaftRatio ** 2
  const shaftStrain =
    (pressure * ((1 + square) / (1 - square) - shaft.material.poissonRatio)) / shaft.material.youngsModulus
  return metre(rings.seatDiameter * (hubStrain + shaftStrain))
}

function limitsReached(rings: SeatRings, pressure: number, share: number): ElasticPlasticLimit[] {
  const reasons: ElasticPlasticLimit[] = []
  if (share > LARGEST_PLASTIC_SHARE) reasons.push('plasticShare')
  if (pressure > (2 * rings.hub.material.yieldStrength) / Math.sqrt(3)) reasons.push('hoopCompression')
  if (rings.hub.material.isBrittle) reasons.push('brittleHub')
  const square = (rings.shaft.bore / rings.seatDiameter) ** 2
  // Modified shear criterion: the bore of a hollow shaft governs, a solid one bears 2 Re/√3.
  const shaftLimit =
    square > 0
      ? (rings.shaft.material.yieldStrength * (1 - square)) / Math.sqrt(3)
      : (2 * rings.shaft.material.yieldStrength) / Math.sqrt(3)
  if (pressure > shaftLimit) reasons.push('shaftYields')
  return reasons
}

/**
 * Pressure and yielded ring of a seat whose interference goes beyond the elastic limit of its hub.
 *
 * Model: ζ from `interferenceAtPlasticRatio` by bisection (it rises with ζ); below first yield the elastic ring.
 * @param rings [m] seat, shaft bore and hub outside, with materials
 * @param interference [m] diametral interference without embedding, ≥ 0
 * @returns [Pa, m, -] pressure, plastic diameter and share, validity with reasons
 * @throws EngineeringInputError `negative`, `boreNotInside`, `notPositive`
 *
 * Validity: ductile hub (10 % elongation or more), static joint, yielded share at most 0.3 (from memory), elastic shaft.
 * Use the actual or largest yield strength for press force, the least for holding; heating must not relieve it.
 * Source: din-7190-1 (from memory; derivation by equilibrium and compatibility)
 * Example: no published number; 100/200 mm, 300 MPa, 0.2577 mm: 182.8 MPa, 125 mm, 18.8 % of the section
 */
export function elasticPlasticSeat(rings: SeatRings, interference: Length): ElasticPlasticSeat {
  requireNonNegative(interference, 'interference')
  const { hub: ratio } = ringRatios(rings.seatDiameter, rings.shaft.bore, rings.hub.outerDiameter)
  const atFirstYield = interferenceAtPlasticRatio(rings, 1)
  const whole = 1 / ratio
  if (interference <= atFirstYield) {
    const pressure = pascal((pressureAtPlasticRatio(rings, 1) * interference) / atFirstYield)
    const reasons = limitsReached(rings, pressure, 0).filter((reason) => reason === 'shaftYields')
    return {
      pressure,
      plasticDiameter: rings.seatDiameter,
      plasticShare: 0,
      isValid: reasons.length === 0,
      reasons,
    }
  }
  if (interference >= interferenceAtPlasticRatio(rings, whole)) {
    const pressure = pressureAtPlasticRatio(rings, whole)
    const reasons: ElasticPlasticLimit[] = ['fullyPlastic', ...limitsReached(rings, pressure, 1)]
    return { pressure, plasticDiameter: rings.hub.outerDiameter, plasticShare: 1, isValid: false, reasons }
  }
  let low = 1
  let high = whole
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2
    if (interferenceAtPlasticRatio(rings, middle) < interference) low = middle
    else high = middle
  }
  const pressure = pressureAtPlasticRatio(rings, low)
  const share = ((low * low - 1) * ratio * ratio) / (1 - ratio * ratio)
  const reasons = limitsReached(rings, pressure, share)
  return {
    pressure,
    plasticDiameter: metre(low * rings.seatDiameter),
    plasticShare: share,
    isValid: reasons.length === 0,
    reasons,
  }
}
