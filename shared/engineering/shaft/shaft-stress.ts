/** Nominal stress of the shaft from its section forces, and together with the stress of a fit. */
import { requireFinite, requirePositive } from '../engineering-input-error'
import { shaftSeatStress } from '../interference-fit/shaft-seat-stress'
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
  const fourth = Math.PI * (outerDiameter ** 4 - bore ** 4)
  const square = Math.PI * (outerDiameter * outerDiameter - bore * bore)
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
  if (pressure === 0) return equivalentStress(stress)
  const fit = shaftSeatStress(pressure, outerDiameter, { bore })
  const atSurface = worstOfBothSigns(stress, 1, fit.hoopAtSurface, -pressure)
  if (bore === 0) return pascal(atSurface)
  return pascal(Math.max(atSurface, worstOfBothSigns(stress, bore / outerDiameter, fit.hoopAtBore, 0)))
}

/** `share` is the distance from the axis over the radius: bending and torsion grow with it. */
function worstOfBothSigns(stress: NominalStress, share: number, hoop: number, radial: number): number {
  const torsion = stress.torsion * share
  const one = vonMises(stress.axial + stress.bending * share, hoop, radial, torsion)
  const other = vonMises(stress.axial - stress.bending * share, hoop, radial, torsion)
  return Math.max(one, other)
}

function vonMises(axial: number, hoop: number, radial: number, shear: number): number {
  return Math.sqrt(
    ((axial - hoop) ** 2 + (hoop - radial) ** 2 + (radial - axial) ** 2) / 2 + 3 * shear * shear,
  )
}
