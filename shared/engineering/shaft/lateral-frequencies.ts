import { fixFreedom } from '../linear-algebra/band-matrix'
import { lowestEigenvalues } from '../linear-algebra/lowest-eigenvalues'
import type { AngularSpeed } from '../quantities/quantity'
import { radianPerSecond } from '../quantities/units'
import { beamMesh, nearestNode } from './beam-mesh'
import { applySupports, stiffnessMatrix } from './beam-solver'
import { lateralMassMatrix } from './lateral-mass'
import { requireShaft, shaftLength, type CarriedMass, type ShaftModel, type Support } from './shaft-model'

/** Elements no longer than this share of the shaft keep the third mode within 0.1 %. */
const ELEMENT_SHARE = 1 / 16

/**
 * Lowest lateral natural frequencies of the shaft with its hubs: its critical speeds.
 *
 * Model: cubic beam elements with consistent mass (Euler-Bernoulli), hubs as masses with diametral inertia, point
 * supports; not rotating, so gyroscopic stiffening of overhung disks is left out.
 * @param model [m, Pa, kg/m³] segments and material; density 0 leaves the mass of the shaft out
 * @param supports [m, N/m] at least two different stations; null stiffness is rigid
 * @param masses [m, kg, kg·m²] carried masses on the shaft
 * @param count [-] how many, ≥ 1
 * @returns [rad/s] rising; fewer when the model has fewer
 * @throws EngineeringInputError `emptyShaft`, `boreNotInside`, `notPositive`
 *
 * Validity: slender shafts; bearing and housing flexibility lowers the first one, often by 10 to 30 %.
 * Source: vibration-theory; beam-theory; shigley-9 section 7-6; beam-reference
 * Example: shigley-9 Example 7-5, two weights on 31 in: between 120.4 (Dunkerley) and 124.8 rad/s (Rayleigh)
 */
export function lateralFrequencies(
  model: ShaftModel,
  supports: readonly Support[],
  masses: readonly CarriedMass[],
  count: number,
): AngularSpeed[] {
  requireShaft(model)
  const wanted = [...supports, ...masses].map((item) => item.station)
  const mesh = beamMesh(model, wanted, shaftLength(model) * ELEMENT_SHARE)
  const nodes = supports.map((support) => nearestNode(mesh, support.station))
  if (new Set(nodes).size < 2) return []
  const stiffness = stiffnessMatrix(mesh)
  const mass = lateralMassMatrix(mesh, masses)
  applySupports(stiffness, supports, nodes)
  supports.forEach((support, index) => {
    if (support.stiffness === null) fixFreedom(mass, (nodes[index] as number) * 2, 0)
  })
  return lowestEigenvalues(stiffness, mass, count).map((square) => radianPerSecond(Math.sqrt(square)))
}
