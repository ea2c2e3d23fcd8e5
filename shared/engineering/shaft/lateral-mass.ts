import { addEntry, bandMatrix, type BandMatrix } from '../linear-algebra/band-matrix'
import { nearestNode, type BeamMesh } from './beam-mesh'
import type { CarriedMass } from './shaft-model'

const HALF_BANDWIDTH = 3

/** Consistent mass of cubic elements: 156, 22h, 54, −13h, 4h², −3h² times mass per length times h/420. */
export function lateralMassMatrix(mesh: BeamMesh, masses: readonly CarriedMass[]): BandMatrix {
  const matrix = bandMatrix(mesh.nodes.length * 2, HALF_BANDWIDTH)
  for (let element = 0; element < mesh.massPerLength.length; element += 1) {
    const h = (mesh.nodes[element + 1] as number) - (mesh.nodes[element] as number)
    const m = ((mesh.massPerLength[element] as number) * h) / 420
    const first = element * 2
    addEntry(matrix, first, first, 156 * m)
    addEntry(matrix, first, first + 1, 22 * h * m)
    addEntry(matrix, first, first + 2, 54 * m)
    addEntry(matrix, first, first + 3, -13 * h * m)
    addEntry(matrix, first + 1, first + 1, 4 * h * h * m)
    addEntry(matrix, first + 1, first + 2, 13 * h * m)
    addEntry(matrix, first + 1, first + 3, -3 * h * h * m)
    addEntry(matrix, first + 2, first + 2, 156 * m)
    addEntry(matrix, first + 2, first + 3, -22 * h * m)
    addEntry(matrix, first + 3, first + 3, 4 * h * h * m)
  }
  for (const carried of masses) {
    const freedom = nearestNode(mesh, carried.station) * 2
    addEntry(matrix, freedom, freedom, carried.mass)
    addEntry(matrix, freedom + 1, freedom + 1, carried.diametralInertia)
  }
  return matrix
}
