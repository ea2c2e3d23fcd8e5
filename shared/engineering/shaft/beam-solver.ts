/** Deflections and support reactions of the shaft by finite elements, in two planes. */
import { EngineeringInputError } from '../engineering-input-error'
import {
  addEntry,
  bandMatrix,
  factorBand,
  fixFreedom,
  rowProduct,
  solveBand,
  type BandMatrix,
} from '../linear-algebra/band-matrix'
import { beamMesh, nearestNode, type BeamMesh } from './beam-mesh'
import { requireShaft, shaftLength, type ShaftLoad, type ShaftModel, type Support } from './shaft-model'

/** Freedoms of a node: deflection and its derivative along x. */
const FREEDOMS = 2
const HALF_BANDWIDTH = 3

/** A shaft on its supports, factored once for any number of load cases. */
export interface FactoredBeam {
  mesh: BeamMesh
  supportNodes: readonly number[]
  supports: readonly Support[]
  /** Without supports, for reactions. */
  free: BandMatrix
  factored: BandMatrix
}

export interface Reaction {
  y: number
  z: number
}

export interface BeamSolution {
  /** Deflection and slope of each node, alternating, in the plane of y and in that of z. */
  planeY: Float64Array
  planeZ: Float64Array
  /** Force of each support on the shaft, in the order of the supports. */
  reactions: Reaction[]
}

/**
 * Prepares a stepped shaft on its supports.
 *
 * Model: two-node cubic beam elements of constant section (Euler-Bernoulli, no shear flexibility, no weight);
 * supports are points, rigid or elastic; hubs add no stiffness. Exact at the nodes for point loads.
 * @param model [m] segments without gaps; [Pa] Young's modulus of the material
 * @param supports [m, N/m] at least two different stations on the shaft; null stiffness is rigid
 * @param loadStations [m] where loads will act, on the shaft
 * @returns [N/m] the mesh and the factored stiffness matrix
 * @throws EngineeringInputError `emptyShaft`, `boreNotInside`, `notPositive`, `unsupportedShaft`, `numericallySingular`
 *
 * Validity: slender shafts; below about span/diameter 5 shear adds deflection that is not counted.
 * Source: beam-theory stiffness matrix; beam-reference (euler) statics
 * Example: gere, middle half twice as stiff: 3 PL³/(256 EI) at midspan
 */
export function factorBeam(
  model: ShaftModel,
  supports: readonly Support[],
  loadStations: readonly number[],
): FactoredBeam {
  requireShaft(model)
  const mesh = beamMesh(model, [...supports.map((support) => support.station), ...loadStations])
  const supportNodes = supports.map((support) => nearestNode(mesh, support.station))
  requireSupported(supports, supportNodes, shaftLength(model))
  const free = stiffnessMatrix(mesh)
  const factored: BandMatrix = { ...free, entries: Float64Array.from(free.entries) }
  applySupports(factored, supports, supportNodes)
  if (factorBand(factored) > 0 || factored.entries.some((entry) => !Number.isFinite(entry)))
    throw new EngineeringInputError(
      'numericallySingular',
      'shaft',
      'The shaft cannot be solved with these sizes',
    )
  return { mesh, supportNodes, supports, free, factored }
}

function requireSupported(supports: readonly Support[], nodes: readonly number[], length: number): void {
  for (const support of supports) {
    if (support.station < 0 || support.station > length)
      throw new EngineeringInputError('outOfRange', 'supports.station', 'A support is not on the shaft')
  }
  if (new Set(nodes).size < 2)
    throw new EngineeringInputError(
      'unsupportedShaft',
      'supports',
      'The shaft needs two bearings at different stations',
    )
}

/** Cubic beam elements: 12, 6h, 4h², 2h² times EI/h³. */
export function stiffnessMatrix(mesh: BeamMesh): BandMatrix {
  const matrix = bandMatrix(mesh.nodes.length * FREEDOMS, HALF_BANDWIDTH)
  for (let element = 0; element < mesh.bendingStiffness.length; element += 1) {
    const h = (mesh.nodes[element + 1] as number) - (mesh.nodes[element] as number)
    const k = (mesh.bendingStiffness[element] as number) / (h * h * h)
    const first = element * FREEDOMS
    addEntry(matrix, first, first, 12 * k)
    addEntry(matrix, first, first + 1, 6 * h * k)
    addEntry(matrix, first, first + 2, -12 * k)
    addEntry(matrix, first, first + 3, 6 * h * k)
    addEntry(matrix, first + 1, first + 1, 4 * h * h * k)
    addEntry(matrix, first + 1, first + 2, -6 * h * k)
    addEntry(matrix, first + 1, first + 3, 2 * h * h * k)
    addEntry(matrix, first + 2, first + 2, 12 * k)
    addEntry(matrix, first + 2, first + 3, -6 * h * k)
    addEntry(matrix, first + 3, first + 3, 4 * h * h * k)
  }
  return matrix
}

/** Rigid supports take their freedom out; elastic ones add a spring. A rigid one beside springs takes all. */
export function applySupports(
  matrix: BandMatrix,
  supports: readonly Support[],
  nodes: readonly number[],
): void {
  supports.forEach((support, index) => {
    if (support.stiffness === null) return
    const freedom = (nodes[index] as number) * FREEDOMS
    addEntry(matrix, freedom, freedom, support.stiffness)
  })
  supports.forEach((support, index) => {
    if (support.stiffness !== null) return
    const freedom = (nodes[index] as number) * FREEDOMS
    const width = matrix.halfBandwidth + 1
    fixFreedom(matrix, freedom, Math.abs(matrix.entries[freedom * width] as number) || 1)
  })
}

/**
 * Deflections, slopes and reactions for one set of loads.
 *
 * Model: linear statics; a load beside a node acts on it with the same force and its moment; in the plane of z a
 * moment about y turns the shaft by −dw/dx.
 * @param beam [N/m] from `factorBeam`
 * @param loads [N, N·m, m] forces, moments and stations on the shaft, signs by the axes
 * @returns [m, rad, N] deflection and slope of each node in both planes; force of each support on the shaft
 * @throws EngineeringInputError `numericallySingular`
 *
 * Validity: as `factorBeam`; deflections small against the diameter.
 * Source: beam-theory; statics; shigley-9 Example 7-2
 * Example: shigley-9 Example 7-2: reactions 115.0, 356.7, 1776.0 and 725.3 lbf
 */
export function solveBeam(beam: FactoredBeam, loads: readonly ShaftLoad[]): BeamSolution {
  const size = beam.mesh.nodes.length * FREEDOMS
  const loadY = new Float64Array(size)
  const loadZ = new Float64Array(size)
  for (const load of loads) {
    const node = nearestNode(beam.mesh, load.station)
    const arm = load.station - (beam.mesh.nodes[node] as number)
    const freedom = node * FREEDOMS
    loadY[freedom] = (loadY[freedom] as number) + load.forceY
    loadY[freedom + 1] = (loadY[freedom + 1] as number) + load.momentZ + load.forceY * arm
    loadZ[freedom] = (loadZ[freedom] as number) + load.forceZ
    loadZ[freedom + 1] = (loadZ[freedom + 1] as number) - load.momentY + load.forceZ * arm
  }
  const planeY = displacements(beam, loadY)
  const planeZ = displacements(beam, loadZ)
  const reactions = beam.supports.map((_support, index) => ({
    y: reaction(beam, index, planeY, loadY),
    z: reaction(beam, index, planeZ, loadZ),
  }))
  if (!planeY.every(Number.isFinite) || !planeZ.every(Number.isFinite))
    throw new EngineeringInputError(
      'numericallySingular',
      'loads',
      'The shaft cannot be solved with these loads',
    )
  return { planeY, planeZ, reactions }
}

function displacements(beam: FactoredBeam, load: Float64Array): Float64Array {
  const result = Float64Array.from(load)
  beam.supports.forEach((support, index) => {
    if (support.stiffness === null) result[(beam.supportNodes[index] as number) * FREEDOMS] = 0
  })
  solveBand(beam.factored, result)
  return result
}

/** What the support pushes with. Rigid supports that share a node share its force. */
function reaction(beam: FactoredBeam, index: number, plane: Float64Array, load: Float64Array): number {
  const node = beam.supportNodes[index] as number
  const freedom = node * FREEDOMS
  const stiffness = beam.supports[index]?.stiffness ?? null
  const rigidHere = beam.supports.filter(
    (support, other) => support.stiffness === null && beam.supportNodes[other] === node,
  ).length
  if (stiffness !== null) return rigidHere > 0 ? 0 : -stiffness * (plane[freedom] as number)
  return (rowProduct(beam.free, freedom, plane) - (load[freedom] as number)) / rigidHere
}
