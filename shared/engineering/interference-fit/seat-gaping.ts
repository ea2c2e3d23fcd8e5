/** Radial force and tilting moment on a seat: they shift the pressure without changing its mean. */
import { requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Force, Length, Moment, Pressure } from '../quantities/quantity'
import { pascal } from '../quantities/units'

export interface PressureShift {
  fromForce: Pressure
  fromMoment: Pressure
}

/**
 * Largest change of the pressure round and along a seat.
 *
 * Model: cosine round the circumference; Δp_F = 2 F_r/(π D L) uniform along the seat, Δp_M = 12 M_b/(π D L²)
 * linear along it.
 * @param radialForce [N] resultant across the shaft with the application factor, ≥ 0
 * @param tiltingMoment [N·m] about the middle of the seat with the application factor, ≥ 0
 * @param seatDiameter [m] > 0
 * @param seatLength [m] length that carries, > 0
 * @returns [Pa] shifts at the worst edge, both ≥ 0
 * @throws EngineeringInputError `negative`, `notPositive`
 *
 * Validity: rigid hub and shaft; long thin hubs bend and shift more at their ends.
 * Source: seat-equilibrium
 * Example: seat-equilibrium, integrating the shifted pressure gives force and moment back
 */
export function pressureShift(
  radialForce: Force,
  tiltingMoment: Moment,
  seatDiameter: Length,
  seatLength: Length,
): PressureShift {
  requireNonNegative(radialForce, 'radialForce')
  requireNonNegative(tiltingMoment, 'tiltingMoment')
  requirePositive(seatDiameter, 'seatDiameter')
  requirePositive(seatLength, 'seatLength')
  return {
    fromForce: pascal((2 * radialForce) / (Math.PI * seatDiameter * seatLength)),
    fromMoment: pascal((12 * tiltingMoment) / (Math.PI * seatDiameter * seatLength ** 2)),
  }
}

/**
 * Reserve of a seat against opening at its worst edge.
 *
 * Model: pressure over the sum of both shifts; gaping starts where it falls to 1.
 * @param pressure [Pa] least interface pressure in service, ≥ 0
 * @param shift [Pa] from `pressureShift`
 * @returns [-] pressure over shift; null when nothing tilts the hub
 * @throws EngineeringInputError `negative`
 *
 * Validity: ask 1.2 or more; gaping brings fretting and oil into the seat even while the torque is held (practice).
 * Source: seat-equilibrium
 * Example: seat-equilibrium, 30 MPa against shifts of 10 and 5 MPa: 2
 */
export function gapingReserve(pressure: Pressure, shift: PressureShift): number | null {
  requireNonNegative(pressure, 'pressure')
  const total = shift.fromForce + shift.fromMoment
  return total > 0 ? pressure / total : null
}
