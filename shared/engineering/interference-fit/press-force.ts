import { requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Force, Length, Pressure } from '../quantities/quantity'
import { newton } from '../quantities/units'

/**
 * Force at the end of pressing the hub on.
 *
 * Model: friction over the full seat at the largest pressure, F = μ_in p π D L; it rises linearly with travel.
 * @param pressure [Pa] pressure at the most interference, ≥ 0
 * @param seatDiameter [m] joint diameter, > 0
 * @param effectiveLength [m] seat length that carries, > 0
 * @param pressingFriction [-] upper coefficient while pressing, > 0
 * @returns [N] press force, ≥ 0
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: lead-in present, parts oiled, slow travel; choose a press 1.5 to 2 times stronger (from memory).
 * Source: din-7190-1 (from memory); ugural press fit
 * Example: ugural, 18.1 MPa on 100 mm by 100 mm at 0.15: 85.3 kN
 */
export function pressForce(
  pressure: Pressure,
  seatDiameter: Length,
  effectiveLength: Length,
  pressingFriction: number,
): Force {
  requireNonNegative(pressure, 'pressure')
  requirePositive(seatDiameter, 'seatDiameter')
  requirePositive(effectiveLength, 'effectiveLength')
  requirePositive(pressingFriction, 'friction.pressing')
  return newton(pressingFriction * pressure * Math.PI * seatDiameter * effectiveLength)
}
