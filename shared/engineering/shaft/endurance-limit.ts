/** Endurance limit of a steel shaft with its factors by name. */
import { requirePositive } from '../engineering-input-error'
import type { Length, Pressure } from '../quantities/quantity'
import { mPa, pascal, toMm, toMPa } from '../quantities/units'

export type SurfaceFinish = 'ground' | 'machined' | 'hotRolled' | 'asForged'

/** ka = a Rm^b with Rm in MPa (Shigley Table 6-2). */
const SURFACE_FIT: Readonly<Record<SurfaceFinish, readonly [a: number, b: number]>> = {
  ground: [1.58, -0.085],
  machined: [4.51, -0.265],
  hotRolled: [57.7, -0.718],
  asForged: [272, -0.995],
}

/** Half the tensile strength, but no more than 700 MPa. */
const LARGEST_SPECIMEN_LIMIT = mPa(700)

export interface EnduranceLimit {
  value: Pressure
  /** Se′ of the rotating specimen. */
  specimen: Pressure
  surfaceFactor: number
  sizeFactor: number
  reliabilityFactor: number
}

/**
 * Size factor of a rotating round shaft.
 *
 * Model: (d/7.62 mm)^−0.107 from 2.79 to 51 mm, 1.51 d^−0.157 (d in mm) above; 1 below 2.79 mm.
 * @param diameter [m] > 0
 * @returns [-] k_b
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: 2.79 to 254 mm in bending and torsion; beyond 254 mm extrapolated.
 * Source: shigley-9 Eq. 6-20
 * Example: shigley-9 Example 7-1, 1.1 in: 0.870
 */
export function sizeFactor(diameter: Length): number {
  requirePositive(diameter, 'diameter')
  const millimetres = toMm(diameter)
  if (millimetres < 2.79) return 1
  return millimetres <= 51 ? (millimetres / 7.62) ** -0.107 : 1.51 * millimetres ** -0.157
}

/**
 * Surface factor.
 *
 * Model: k_a = a Rm^b, not above 1.
 * @param tensileStrength [Pa] > 0
 * @param finish [-] how the surface was made
 * @returns [-] k_a
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: steels.
 * Source: shigley-9 Table 6-2, Eq. 6-19
 * Example: shigley-9 Example 7-1, machined, 105 kpsi: 0.787
 */
export function surfaceFactor(tensileStrength: Pressure, finish: SurfaceFinish): number {
  requirePositive(tensileStrength, 'tensileStrength')
  const [a, b] = SURFACE_FIT[finish]
  return Math.min(1, a * toMPa(tensileStrength) ** b)
}

/**
 * Endurance limit of a shaft.
 *
 * Model: Se = k_a k_b k_e Se′ with Se′ = 0.5 Rm up to 1400 MPa, 700 MPa above; load factor 1 because torsion enters
 * by von Mises; room temperature.
 * @param tensileStrength [Pa] > 0
 * @param diameter [m] > 0
 * @param finish [-] surface
 * @param reliabilityFactor [-] 1 for 50 %, 0.814 for 99 %
 * @returns [Pa] limit and its factors
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: steels; other metals have no such limit, the result is then a guess.
 * Source: shigley-9 Eqs. 6-8 and 6-18
 * Example: shigley-9 Example 7-1: 29.3 kpsi
 */
export function enduranceLimit(
  tensileStrength: Pressure,
  diameter: Length,
  finish: SurfaceFinish,
  reliabilityFactor: number,
): EnduranceLimit {
  requirePositive(reliabilityFactor, 'reliabilityFactor')
  const surface = surfaceFactor(tensileStrength, finish)
  const size = sizeFactor(diameter)
  const specimen = pascal(Math.min(tensileStrength / 2, LARGEST_SPECIMEN_LIMIT))
  return {
    value: pascal(surface * size * reliabilityFactor * specimen),
    specimen,
    surfaceFactor: surface,
    sizeFactor: size,
    reliabilityFactor,
  }
}
