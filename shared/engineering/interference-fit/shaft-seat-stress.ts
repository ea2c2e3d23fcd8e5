/** Stress that the fit alone raises in the shaft. */
import { requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Length, Pressure } from '../quantities/quantity'
import { pascal } from '../quantities/units'
import type { ShaftRing } from './annulus'

export interface ShaftSeatStress {
  /** Hoop stress at the seat surface, compressive. */
  hoopAtSurface: Pressure
  /** Hoop stress at the bore, compressive; equal to −p in a solid shaft. */
  hoopAtBore: Pressure
  /** Largest von Mises stress of the section: at the bore when hollow. */
  equivalent: Pressure
}

/**
 * Stresses of the shaft under interface pressure.
 *
 * Model: thick ring under outside pressure, plane stress; surface −p(1+Q²)/(1−Q²), bore −2p/(1−Q²); solid −p everywhere.
 * @param pressure [Pa] interface pressure, ≥ 0
 * @param seatDiameter [m] joint diameter, > 0
 * @param shaft [m] bore ≥ 0 and smaller than the seat
 * @returns [Pa] hoop stresses (negative) and the largest equivalent stress
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: under the seat, away from its edges; bending and torque come on top.
 * Source: shigley-9 Eqs. 3-58, 7-44 to 7-47; lame; timoshenko-2
 * Example: timoshenko-2, 4/6 in inner cylinder under 4051 psi: no published figure, −14583 psi at the bore by the formula
 */
export function shaftSeatStress(
  pressure: Pressure,
  seatDiameter: Length,
  shaft: Pick<ShaftRing, 'bore'>,
): ShaftSeatStress {
  requireNonNegative(pressure, 'pressure')
  requirePositive(seatDiameter, 'seatDiameter')
  const square = (shaft.bore / seatDiameter) ** 2
  if (square === 0) {
    return { hoopAtSurface: pascal(-pressure), hoopAtBore: pascal(-pressure), equivalent: pressure }
  }
  const hoopAtBore = (-2 * pressure) / (1 - square)
  return {
    hoopAtSurface: pascal((-pressure * (1 + square)) / (1 - square)),
    hoopAtBore: pascal(hoopAtBore),
    // at the bore the radial stress is zero, so the hoop stress alone counts
    equivalent: pascal(-hoopAtBore),
  }
}

/**
 * Most pressure the shaft bears with a given safety, the fit alone.
 *
 * Model: von Mises in plane stress; hollow Re(1−Q²)/2, solid Re.
 * @param safety [-] safety asked, > 0
 * @param seatDiameter [m] joint diameter, > 0
 * @param shaft [m] bore ≥ 0 and smaller than the seat; material
 * @returns [Pa] permissible pressure, ≥ 0
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: as `shaftSeatStress`.
 * Source: shigley-9 chapter 5; din-7190-1
 * Example: no published number; 450 MPa, bore 20 in 32 mm at safety 1.5: 91.4 MPa
 */
export function permissibleShaftPressure(safety: number, seatDiameter: Length, shaft: ShaftRing): Pressure {
  requirePositive(safety, 'safety')
  requirePositive(seatDiameter, 'seatDiameter')
  const square = (shaft.bore / seatDiameter) ** 2
  const limit = shaft.material.yieldStrength / safety
  return pascal(square === 0 ? limit : (limit * (1 - square)) / 2)
}
