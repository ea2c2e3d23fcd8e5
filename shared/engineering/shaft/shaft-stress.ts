/** Nominal stress of the shaft from its section forces, and together with the stress of a fit. */
import { requireFinite, requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Force, Length, Moment, Pressure } from '../quantities/quantity'
import { pascal } from '../quantities/units'

export interface NominalStress {
  /** Amplitude at the surface. */
  bending: Pressure
  /** Tension positive. */
  axial: Pressure
  torsion: Pressure
}

/**
 * Nominal stresses of a round section.
 *
 * Model: beam theory; σ_b = 32 M d_o/(π(d_o⁴ − d_i⁴)), τ = 16 T d_o/(π(d_o⁴ − d_i⁴)), σ_a = 4N/(π(d_o² − d_i²)).
 * @param bending [N·m] resultant bending moment, ≥ 0
 * @param torque [N·m] torque, any sign
 * @param axialForce [N] tension positive
 * @param outerDiameter [m] > 0
 * @param bore [m] ≥ 0 and smaller than the outside
 * @returns [Pa] bending and torsion as magnitudes, axial signed
 * @throws EngineeringInputError `notFinite`, `notPositive`
 *
 * Validity: away from steps; notch factors are applied separately.
 * Source: shigley-9 Eqs. 7-5 and 7-6
 * Example: singer-pytel Problem 302, 12 kN·m on 113.98 mm: 41.27 MPa in torsion
 */
export function nominalStress(
  bending: Moment,
  torque: Moment,
  axialForce: Force,
  outerDiameter: Length,
  bore: Length,
): NominalStress {
  requireFinite(bending, 'bending')
  requireFinite(torque, 'torque')
  requireFinite(axialForce, 'axialForce')
  requirePositive(outerDiameter, 'outerDiameter')
  const outerSquare = outerDiameter * outerDiameter
  const boreSquare = bore * bore
  const square = Math.PI * (outerSquare - boreSquare)
  const fourth = square * (outerSquare + boreSquare)
  return {
    bending: pascal((32 * Math.abs(bending) * outerDiameter) / fourth),
    axial: pascal((4 * axialForce) / square),
    torsion: pascal((16 * Math.abs(torque) * outerDiameter) / fourth),
  }
}

/**
 * Equivalent stress of bending, axial force and torsion.
 *
 * Model: von Mises, √((σ_b + |σ_a|)² + 3τ²).
 * @param stress [Pa] from `nominalStress`
 * @returns [Pa] equivalent stress, ≥ 0
 * @throws EngineeringInputError never; the stresses are checked where they are made
 *
 * Validity: ductile shafts under peak loads, nominal stress.
 * Source: shigley-9 Eq. 7-15
 * Example: no published number; 56 MPa bending with 27.5 MPa torsion gives 73.5 MPa
 */
export function equivalentStress(stress: NominalStress): Pressure {
  return pascal(Math.sqrt((stress.bending + Math.abs(stress.axial)) ** 2 + 3 * stress.torsion ** 2))
}

/**
 * Equivalent stress under a seat: bending, axial force, torsion and the pressure of the fit together.
 *
 * Model: von Mises with hoop and radial stress of the fit at the surface, and at the bore of a hollow shaft; bending
 * taken with the sign that is worse.
 * @param stress [Pa] from `nominalStress`
 * @param pressure [Pa] interface pressure at the most interference, ≥ 0
 * @param outerDiameter [m] seat diameter, > 0
 * @param bore [m] ≥ 0 and smaller than the seat
 * @returns [Pa] the larger of surface and bore, ≥ 0
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: under the seat; at its edges the notch factor of the seat takes over.
 * Source: lame; shigley-9 Eqs. 3-58 and 7-15
 * Example: no published number; without pressure it equals `equivalentStress`, without loads a solid shaft gives p
 */
export function equivalentStressUnderSeat(
  stress: NominalStress,
  pressure: Pressure,
  outerDiameter: Length,
  bore: Length,
): Pressure {
  requireNonNegative(pressure, 'pressure')
  requirePositive(outerDiameter, 'outerDiameter')
  return pascal(worstUnderSeat(stress.bending, stress.axial, stress.torsion, pressure, bore / outerDiameter))
}

/** What the stress along the shaft is made of, one value for each station of the diagrams. */
export interface StressCourse {
  bending: Float64Array
  torque: Float64Array
  axialForce: Float64Array
  /** Interface pressure of the seat over the station; 0 beside seats. */
  pressure: Float64Array
  sections: readonly { outerDiameter: Length; bore: Length }[]
}

/**
 * Equivalent stress at every station of the diagrams.
 *
 * Model: `nominalStress` and `equivalentStressUnderSeat` at each station, forces multiplied by a factor.
 * @param course [N·m, N, Pa, m] resultant bending moment, torque, axial force, pressure and section of each station
 * @param loadFactor [-] application factor on the forces, > 0; the pressure of the fit is not multiplied
 * @returns [Pa] one value for each station, ≥ 0
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: nominal stress, ductile shafts.
 * Source: shigley-9 Eqs. 7-5, 7-6 and 7-15; lame
 * Example: singer-pytel Problem 302, 12 kN·m on 113.98 mm: √3 times 41.27 MPa
 */
export function equivalentStressCourse(course: StressCourse, loadFactor: number): Float64Array {
  requirePositive(loadFactor, 'loadFactor')
  const result = new Float64Array(course.bending.length)
  for (let index = 0; index < result.length; index += 1) {
    const section = course.sections[index]
    if (!section) continue
    const { outerDiameter, bore } = section
    const outerSquare = outerDiameter * outerDiameter
    const boreSquare = bore * bore
    const square = Math.PI * (outerSquare - boreSquare)
    const fourth = square * (outerSquare + boreSquare)
    const bending = (32 * loadFactor * (course.bending[index] as number) * outerDiameter) / fourth
    const axial = (4 * loadFactor * (course.axialForce[index] as number)) / square
    const torsion = (16 * loadFactor * (course.torque[index] as number) * outerDiameter) / fourth
    result[index] = worstUnderSeat(
      bending,
      axial,
      torsion,
      course.pressure[index] as number,
      bore / outerDiameter,
    )
  }
  return result
}

/** Surface, and the bore when hollow; bending with the sign that is worse. */
function worstUnderSeat(
  bending: number,
  axial: number,
  torsion: number,
  pressure: number,
  ratio: number,
): number {
  const square = ratio * ratio
  const hoop = (-pressure * (1 + square)) / (1 - square)
  const atSurface = Math.max(
    vonMises(axial + bending, hoop, -pressure, torsion),
    vonMises(axial - bending, hoop, -pressure, torsion),
  )
  if (ratio === 0) return atSurface
  const hoopAtBore = (-2 * pressure) / (1 - square)
  return Math.max(
    atSurface,
    vonMises(axial + bending * ratio, hoopAtBore, 0, torsion * ratio),
    vonMises(axial - bending * ratio, hoopAtBore, 0, torsion * ratio),
  )
}

function vonMises(axial: number, hoop: number, radial: number, shear: number): number {
  const one = axial - hoop
  const two = hoop - radial
  const three = radial - axial
  return Math.sqrt((one * one + two * two + three * three) / 2 + 3 * shear * shear)
}
