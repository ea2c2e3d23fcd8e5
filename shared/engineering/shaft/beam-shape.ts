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
  const slopeY = cubicSlope(solution.planeY, element * 2, inside, h)
  const slopeZ = cubicSlope(solution.planeZ, element * 2, inside, h)
  return {
    deflectionY: metre(cubicValue(solution.planeY, element * 2, inside, h) + beyond * slopeY),
    deflectionZ: metre(cubicValue(solution.planeZ, element * 2, inside, h) + beyond * slopeZ),
    slopeY: radian(slopeY),
    slopeZ: radian(slopeZ),
  }
}

/** Deflection and slope in both planes, one value for each station. */
export interface ShapeCurves {
  deflectionY: Float64Array
  deflectionZ: Float64Array
  slopeY: Float64Array
  slopeZ: Float64Array
}

/**
 * Deflection and slope of the shaft at many stations.
 *
 * Model: the cubic between the nodes of an element, which is exact there.
 * @param beam [m] mesh from `factorBeam`
 * @param solution [m, rad] from `solveBeam`
 * @param stations [m] places on the shaft, rising
 * @returns [m, rad] one value for each station in both planes
 * @throws EngineeringInputError never; the arguments come from the solver
 *
 * Validity: as `factorBeam`.
 * Source: beam-theory; gere nonprismatic beam
 * Example: gere, middle half twice as stiff: 3 PL³/(256 EI) at midspan
 */
export function shapeCurves(
  beam: FactoredBeam,
  solution: BeamSolution,
  stations: readonly { station: Length }[],
): ShapeCurves {
  const { nodes } = beam.mesh
  const count = stations.length
  const curves: ShapeCurves = {
    deflectionY: new Float64Array(count),
    deflectionZ: new Float64Array(count),
    slopeY: new Float64Array(count),
    slopeZ: new Float64Array(count),
  }
  let element = 0
  for (let index = 0; index < count; index += 1) {
    const station = (stations[index] as { station: Length }).station
    while (element < nodes.length - 2 && (nodes[element + 1] as number) < station) element += 1
    const start = nodes[element] as number
    const h = (nodes[element + 1] as number) - start
    const inside = Math.min(1, Math.max(0, (station - start) / h))
    curves.deflectionY[index] = cubicValue(solution.planeY, element * 2, inside, h)
    curves.deflectionZ[index] = cubicValue(solution.planeZ, element * 2, inside, h)
    curves.slopeY[index] = cubicSlope(solution.planeY, element * 2, inside, h)
    curves.slopeZ[index] = cubicSlope(solution.planeZ, element * 2, inside, h)
  }
  return curves
}

// Hermite cubic: w0 + t0 s + (3 Δ − 2 t0 − t1) s² + (t0 + t1 − 2 Δ) s³ with Δ = w1 − w0 and slopes times h

function cubicValue(plane: Float64Array, first: number, s: number, h: number): number {
  const w0 = plane[first] as number
  const t0 = (plane[first + 1] as number) * h
  const step = (plane[first + 2] as number) - w0
  const t1 = (plane[first + 3] as number) * h
  return w0 + s * (t0 + s * (3 * step - 2 * t0 - t1 + s * (t0 + t1 - 2 * step)))
}

function cubicSlope(plane: Float64Array, first: number, s: number, h: number): number {
  const t0 = (plane[first + 1] as number) * h
  const step = (plane[first + 2] as number) - (plane[first] as number)
  const t1 = (plane[first + 3] as number) * h
  return (t0 + s * (2 * (3 * step - 2 * t0 - t1) + 3 * s * (t0 + t1 - 2 * step))) / h
}
