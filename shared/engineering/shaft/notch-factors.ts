/** Fatigue notch factors of seat edges and shoulder fillets. */
import { requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Length, Pressure } from '../quantities/quantity'
import { toInch, toMPa } from '../quantities/units'

export interface NotchFactors {
  bending: number
  torsion: number
}

/** Torsion is less sensitive to the edge of a seat than bending. */
const SEAT_TORSION_SHARE = 0.65

/**
 * Fatigue notch factors at the edge of an interference-fit seat, on the nominal stress of the seat diameter.
 *
 * Model: β_σ = 2.7 (Rm/1000 MPa)^0.43, β_τ = 0.65 β_σ; tested values that contain fretting and surface.
 * @param tensileStrength [Pa] of the shaft, > 0
 * @returns [-] bending and torsion, not below 1
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: tested at 40 mm, Rm 400 to 1200 MPa; larger shafts are up to 5 % worse (size correction left out).
 * Source: din-743 part 2 (from memory); horger-maulbetsch (2 to 3 for 2 in axles)
 * Example: din-743, 800 MPa: 2.5 in bending and 1.6 in torsion
 */
export function seatEdgeNotchFactors(tensileStrength: Pressure): NotchFactors {
  requirePositive(tensileStrength, 'tensileStrength')
  const bending = 2.7 * (toMPa(tensileStrength) / 1000) ** 0.43
  return { bending: Math.max(1, bending), torsion: Math.max(1, SEAT_TORSION_SHARE * bending) }
}

/** Rows D/d, A, b of Kt = A (r/d)^b; the D/d = 1.5 row of bending and 1.33 and 2 of torsion were read. */
const BENDING_FIT = [
  [1.01, 0.91938, -0.17032],
  [1.03, 0.98061, -0.18381],
  [1.05, 0.98137, -0.19653],
  [1.07, 0.97527, -0.20958],
  [1.1, 0.9512, -0.23757],
  [1.2, 0.97098, -0.21796],
  [1.5, 0.93836, -0.25759],
  [2, 0.90879, -0.28598],
  [3, 0.89334, -0.3086],
  [6, 0.87868, -0.33243],
] as const
const TORSION_FIT = [
  [1.09, 0.90337, -0.12692],
  [1.2, 0.83425, -0.21649],
  [1.33, 0.84897, -0.23161],
  [2, 0.86331, -0.23865],
] as const

/** The charts behind the fits end here. */
const SMALLEST_RADIUS_SHARE = 0.005
const LARGEST_RADIUS_SHARE = 0.3
/** A fillet that is not known is taken as sharp: r/d = 0.02, a common first estimate. */
export const SHARP_RADIUS_SHARE = 0.02

/** Between rows and below the first one (down to no step at all) the factor is interpolated in D/d. */
function fromFit(
  rows: readonly (readonly [number, number, number])[],
  ratio: number,
  radiusShare: number,
): number {
  const factorOf = ([, a, b]: readonly [number, number, number]) => Math.max(1, a * radiusShare ** b)
  let lowerRatio = 1
  let lower = 1
  for (const row of rows) {
    const factor = factorOf(row)
    if (ratio <= row[0]) return lower + ((factor - lower) * (ratio - lowerRatio)) / (row[0] - lowerRatio)
    lowerRatio = row[0]
    lower = factor
  }
  return lower
}

/**
 * Theoretical stress concentration factors of a shoulder fillet.
 *
 * Model: power-law fits Kt = A (r/d)^b, interpolated in D/d, 1 without a step.
 * @param largeDiameter [m] D, ≥ d
 * @param smallDiameter [m] d, > 0
 * @param filletRadius [m] r, ≥ 0; 0 is taken as r/d = 0.02
 * @returns [-] bending and torsion, not below 1
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: r/d 0.005 to 0.3, held at the ends; charts and fits differ by up to 4 %.
 * Source: norton Figs. E-2 and E-3; shigley-9 Figs. A-15-8 and A-15-9
 * Example: shigley-9 Example 7-1, D/d 1.5, r/d 0.1: chart 1.68 and 1.42 (within 4 %)
 */
export function shoulderConcentration(
  largeDiameter: Length,
  smallDiameter: Length,
  filletRadius: Length,
): NotchFactors {
  requirePositive(smallDiameter, 'smallDiameter')
  requireNonNegative(filletRadius, 'filletRadius')
  const ratio = Math.max(1, largeDiameter / smallDiameter)
  const given = filletRadius === 0 ? SHARP_RADIUS_SHARE : filletRadius / smallDiameter
  const share = Math.min(LARGEST_RADIUS_SHARE, Math.max(SMALLEST_RADIUS_SHARE, given))
  return { bending: fromFit(BENDING_FIT, ratio, share), torsion: fromFit(TORSION_FIT, ratio, share) }
}

const KPSI_PER_MPA = 1 / 6.894757293168361

/**
 * Fatigue notch factors from stress concentration by notch sensitivity.
 *
 * Model: Kf = 1 + (Kt − 1)/(1 + √a/√r) with Neuber's constant as a polynomial of Rm (kpsi, √in).
 * @param concentration [-] Kt in bending and torsion, ≥ 1
 * @param notchRadius [m] r, > 0
 * @param tensileStrength [Pa] > 0
 * @returns [-] bending and torsion, between 1 and Kt
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: steels, Rm up to about 1700 MPa; the torsion polynomial is from memory.
 * Source: shigley-9 Eqs. 6-32 to 6-35
 * Example: shigley-9 Example 6-6, Kt 1.65, r 3 mm, 690 MPa: Kf 1.55
 */
export function fatigueNotchFactors(
  concentration: NotchFactors,
  notchRadius: Length,
  tensileStrength: Pressure,
): NotchFactors {
  requirePositive(notchRadius, 'notchRadius')
  requirePositive(tensileStrength, 'tensileStrength')
  // the cubic turns upward beyond its data; hard steels are fully notch sensitive
  const s = Math.min(250, toMPa(tensileStrength) * KPSI_PER_MPA)
  const inBending = Math.max(0, 0.245799 - 3.07794e-3 * s + 1.50874e-5 * s ** 2 - 2.66978e-8 * s ** 3)
  const inTorsion = Math.max(0, 0.19 - 2.51e-3 * s + 1.35e-5 * s ** 2 - 2.67e-8 * s ** 3)
  const root = Math.sqrt(toInch(notchRadius))
  return {
    bending: 1 + (concentration.bending - 1) / (1 + inBending / root),
    torsion: 1 + (concentration.torsion - 1) / (1 + inTorsion / root),
  }
}
