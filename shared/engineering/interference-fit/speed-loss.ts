/** What rotation takes from an interference fit. a = D/2, b = D_a/2, i = D_i/2. */
import { requireNonNegative } from '../engineering-input-error'
import type { AngularSpeed, Length, Pressure } from '../quantities/quantity'
import { metre, pascal, radianPerSecond } from '../quantities/units'
import { ringRatios } from './annulus'
import type { SeatRings } from './interface-pressure'

/** Diametral loss for a speed of 1 rad/s; the loss grows with the square of the speed. */
function lossPerSpeedSquare({ seatDiameter, shaft, hub }: SeatRings): number {
  ringRatios(seatDiameter, shaft.bore, hub.outerDiameter)
  const a = seatDiameter / 2
  const b = hub.outerDiameter / 2
  const i = shaft.bore / 2
  const outer = hub.material
  const inner = shaft.material
  const hubBore =
    ((outer.density * a) / (4 * outer.youngsModulus)) *
    ((3 + outer.poissonRatio) * b * b + (1 - outer.poissonRatio) * a * a)
  const shaftSurface =
    ((inner.density * a) / (4 * inner.youngsModulus)) *
    ((1 - inner.poissonRatio) * a * a + (3 + inner.poissonRatio) * i * i)
  return 2 * (hubBore - shaftSurface)
}

/**
 * Interference lost because the hub widens more than the shaft under rotation.
 *
 * Model: uniform rotating disks in plane stress; 2 (u_A − u_I), u_A = ρω²a/(4E)((3+ν)b² + (1−ν)a²),
 * u_I = ρω²a/(4E)((1−ν)a² + (3+ν)i²).
 * @param rings [m] seat diameter, shaft bore and hub outside, with materials
 * @param speed [rad/s] angular speed, ≥ 0
 * @returns [m] diametral loss; negative only when a heavy soft shaft widens more than its hub
 * @throws EngineeringInputError `notPositive`, `negative`, `boreNotInside`
 *
 * Validity: hubs short against their diameter; teeth, blades and bolts outside D_a are not included.
 * Source: brown-marks Eqs. 3.41 to 3.47; timoshenko-2 rotating disks; din-7190-1
 * Example: ugural-fenster, 0.5 m disk on a 0.1 m shaft at 6900 rpm: 5.26e-5 m on the radius (last digit off by one)
 */
export function speedLoss(rings: SeatRings, speed: AngularSpeed): Length {
  requireNonNegative(speed, 'speed')
  return metre(lossPerSpeedSquare(rings) * speed * speed)
}

/**
 * Speed at which rotation has used up the interference.
 *
 * Model: p(ω) = p(0)(1 − (ω/ω_L)²), ω_L = ω √(d/(2(u_A − u_I))).
 * @param rings [m] seat diameter, shaft bore and hub outside, with materials
 * @param effectiveInterference [m] interference at rest after embedding and temperature
 * @returns [rad/s] loosening speed; 0 without interference, null when rotation does not loosen the seat
 * @throws EngineeringInputError `notPositive`, `negative`, `boreNotInside`
 *
 * Validity: as `speedLoss`; keep the running speed below 0.6 to 0.7 of it (from memory).
 * Source: timoshenko-2 rotating disks; brown-marks Eqs. 3.41 to 3.47
 * Example: ugural-fenster, 0.1 m shaft in a 0.5 m disk with 0.105 mm: 6900 rpm
 */
export function looseningSpeed(rings: SeatRings, effectiveInterference: Length): AngularSpeed | null {
  if (effectiveInterference <= 0) return radianPerSecond(0)
  const perSquare = lossPerSpeedSquare(rings)
  return perSquare > 0 ? radianPerSecond(Math.sqrt(effectiveInterference / perSquare)) : null
}

/**
 * Hoop stress that rotation alone raises at the hub bore.
 *
 * Model: uniform rotating disk with a free bore, ρω²/4 ((3+ν)b² + (1−ν)a²).
 * @param rings [m] seat diameter and hub outside, with materials
 * @param speed [rad/s] angular speed, ≥ 0
 * @returns [Pa] tension at the bore, ≥ 0
 * @throws EngineeringInputError `notPositive`, `negative`, `boreNotInside`
 *
 * Validity: as `speedLoss`.
 * Source: timoshenko-2 rotating disks; brown-marks Eq. 3.43
 * Example: ugural-fenster, the disk loose at 6900 rpm: 212 MPa
 */
export function rotationHoopStress({ seatDiameter, shaft, hub }: SeatRings, speed: AngularSpeed): Pressure {
  ringRatios(seatDiameter, shaft.bore, hub.outerDiameter)
  requireNonNegative(speed, 'speed')
  const a = seatDiameter / 2
  const b = hub.outerDiameter / 2
  const { density, poissonRatio } = hub.material
  return pascal(((density * speed * speed) / 4) * ((3 + poissonRatio) * b * b + (1 - poissonRatio) * a * a))
}
