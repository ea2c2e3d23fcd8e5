import type { Angle, Length } from '../quantities/quantity'
import { metre, radian } from '../quantities/units'
import { elementAt } from './beam-mesh'
import type { BeamSolution, FactoredBeam } from './beam-solver'

export interface ShapePoint {
  deflectionY: Length
  deflectionZ: Length
  /** dy/dx and dz/dx. */
  slopeY: Angle
  slopeZ: Angle
}

/**
 * Deflection and slope of the shaft at any station.
 *
 * Model: the cubic between the nodes of an element, which is exact there; straight beyond the ends.
 * @param beam [m] mesh from `factorBeam`
 * @param solution [m, rad] from `solveBeam`
 * @param station [m] place along the shaft
 * @returns [m, rad] deflection and slope in both planes
 * @throws EngineeringInputError never; both arguments come from the solver
 *
 * Validity: as `factorBeam`.
 * Source: beam-theory; gere nonprismatic beam
 * Example: gere, middle half twice as stiff: end slope 5 PL²/(128 EI)
 */
export function shapeAt(beam: FactoredBeam, solution: BeamSolution, station: Length): ShapePoint {
  const { nodes } = beam.mesh
  const element = elementAt(beam.mesh, station)
  const start = nodes[element] as number
  const h = (nodes[element + 1] as number) - start
  const inside = Math.min(1, Math.max(0, (station - start) / h))
  const beyond = station - (start + inside * h)
  const y = cubicAt(solution.planeY, element * 2, inside, h)
  const z = cubicAt(solution.planeZ, element * 2, inside, h)
  return {
    deflectionY: metre(y[0] + beyond * y[1]),
    deflectionZ: metre(z[0] + beyond * z[1]),
    slopeY: radian(y[1]),
    slopeZ: radian(z[1]),
  }
}

/** Hermite cubic from deflection and slope at both nodes. */
function cubicAt(plane: Float64Array, first: number, s: number, h: number): [value: number, slope: number] {
  const w0 = plane[first] as number
  const t0 = (plane[first + 1] as number) * h
  const w1 = plane[first + 2] as number
  const t1 = (plane[first + 3] as number) * h
  const step = w1 - w0
  // w0 + t0 s + (3 step − 2 t0 − t1) s² + (t0 + t1 − 2 step) s³
  const second = 3 * step - 2 * t0 - t1
  const third = t0 + t1 - 2 * step
  return [w0 + s * (t0 + s * (second + s * third)), (t0 + s * (2 * second + 3 * s * third)) / h]
}
