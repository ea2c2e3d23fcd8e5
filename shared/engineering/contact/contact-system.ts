import {
  addToEnvelope,
  emptyEnvelope,
  factoriseEnvelope,
  solveEnvelope,
  type EnvelopeMatrix,
} from '../linear-algebra/envelope-cholesky'
import { buildContactMesh, type ContactMesh, type MeshQuality } from './contact-mesh'
import type { ContactModel } from './contact-model'
import { emptyRingElement, ringElement } from './ring-element'

/** Mesh and element matrices: all that depends on geometry and materials alone. */
export interface ContactSystem {
  model: ContactModel
  mesh: ContactMesh
  /** 64, 8 and 8 numbers an element. */
  stiffness: Float64Array
  thermal: Float64Array
  spin: Float64Array
  /** Elements whose inner edge lies on a seat, and their hub. */
  seatElements: Int32Array
}

/** Hub seat nodes that have come off the shaft, and those that cannot slide along it. */
export interface SeatBonds {
  open: ReadonlySet<number>
  stuck: ReadonlySet<number>
}

export const FRICTIONLESS_CLOSED: SeatBonds = { open: new Set(), stuck: new Set() }

/** A factorised system with its seats closed, open or stuck as `bonds` says. */
export interface ContactFactor {
  bonds: SeatBonds
  /** Equation of each nodal displacement (2 a node), −1 where it is held. */
  freedom: Int32Array
  factor: EnvelopeMatrix
}

/**
 * Mesh and element matrices of a shaft with all its hubs.
 *
 * Model: `buildContactMesh` with `ringElement` on each rectangle.
 * @param model [SI] shaft and hubs
 * @param quality [1] mesh sizes relative to the seat diameter
 * @returns [SI] the system, ready to be factorised
 * @throws EngineeringInputError as `buildContactMesh`
 *
 * Validity: as the mesh and the element.
 * Source: finite-elements; fe-press-fit
 * Example: fe-press-fit, case A: some 1 700 freedoms at the recommended sizes
 */
export function prepareContact(model: ContactModel, quality: MeshQuality): ContactSystem {
  const mesh = buildContactMesh(model, quality)
  const count = mesh.part.length
  const stiffness = new Float64Array(64 * count)
  const thermal = new Float64Array(8 * count)
  const spin = new Float64Array(8 * count)
  const element = emptyRingElement()
  const seatNodes = new Set(mesh.seats.flatMap((seat) => seat.map((pair) => pair.hubNode)))
  const seatElements: number[] = []
  for (let e = 0; e < count; e++) {
    const corner = mesh.quads[4 * e]!
    const opposite = mesh.quads[4 * e + 2]!
    const part = mesh.part[e]!
    const material = part === 0 ? model.shaftMaterial : model.hubs[part - 1]!.material
    ringElement(
      mesh.station[corner]!,
      mesh.station[opposite]!,
      mesh.radius[corner]!,
      mesh.radius[opposite]!,
      material,
      element,
    )
    stiffness.set(element.stiffness, 64 * e)
    thermal.set(element.thermal, 8 * e)
    spin.set(element.spin, 8 * e)
    if (part > 0 && seatNodes.has(corner)) seatElements.push(e)
  }
  return { model, mesh, stiffness, thermal, spin, seatElements: Int32Array.from(seatElements) }
}

function numberFreedoms({ mesh }: ContactSystem, bonds: SeatBonds): { freedom: Int32Array; size: number } {
  const partner = new Map<number, number>()
  const held = new Set<number>([0]) // one axial support of the shaft
  for (const seat of mesh.seats) {
    for (const pair of seat) if (!bonds.open.has(pair.hubNode)) partner.set(pair.hubNode, pair.shaftNode)
    // A hub that nothing holds along the shaft is held at the middle of its seat; nothing pulls there.
    if (!seat.some((pair) => bonds.stuck.has(pair.hubNode))) held.add(seat[seat.length >> 1]!.hubNode)
  }
  const freedom = new Int32Array(2 * mesh.nodeCount)
  let size = 0
  for (let node = 0; node < mesh.nodeCount; node++) {
    const shaftNode = partner.get(node)
    if (shaftNode !== undefined) freedom[2 * node] = freedom[2 * shaftNode]!
    else freedom[2 * node] = mesh.radius[node] === 0 ? -1 : size++
    if (shaftNode !== undefined && bonds.stuck.has(node)) freedom[2 * node + 1] = freedom[2 * shaftNode + 1]!
    else freedom[2 * node + 1] = held.has(node) ? -1 : size++
  }
  return { freedom, size }
}

/**
 * Factorises the system for one state of its seats.
 *
 * Model: a closed pair shares its radial freedom, a stuck pair the axial one as well, so that contact costs no
 * extra equations and the matrix stays positive definite.
 * @param system [SI] from `prepareContact`
 * @param bonds [-] which seat nodes are open or stuck
 * @returns [SI] the factor, for any interference, temperature and speed
 * @throws EngineeringInputError `numericallySingular`
 *
 * Validity: linear elastic; the bonds are right only while `solveContact` confirms them.
 * Source: george-liu-envelope; finite-elements
 * Example: fe-press-fit, flush at both ends: the pressure of the two-cylinder formula everywhere
 */
export function factoriseContact(system: ContactSystem, bonds: SeatBonds): ContactFactor {
  const { mesh, stiffness } = system
  const { freedom, size } = numberFreedoms(system, bonds)
  const first = Int32Array.from({ length: size }, (_, i) => i)
  const rows = new Int32Array(8)
  const rowsOf = (e: number) => {
    for (let i = 0; i < 8; i++) rows[i] = freedom[2 * mesh.quads[4 * e + (i >> 1)]! + (i & 1)]!
  }
  for (let e = 0; e < mesh.part.length; e++) {
    rowsOf(e)
    let lowest = size
    for (const row of rows) if (row >= 0 && row < lowest) lowest = row
    for (const row of rows) if (row >= 0 && lowest < first[row]!) first[row] = lowest
  }
  const matrix = emptyEnvelope(first)
  for (let e = 0; e < mesh.part.length; e++) {
    rowsOf(e)
    for (let i = 0; i < 8; i++) {
      if (rows[i]! < 0) continue
      for (let j = 0; j <= i; j++)
        if (rows[j]! >= 0) addToEnvelope(matrix, rows[i]!, rows[j]!, stiffness[64 * e + 8 * i + j]!)
    }
  }
  factoriseEnvelope(matrix)
  return { bonds, freedom, factor: matrix }
}

/** Numbers of the unit loads: interference of hub k, temperature of part k (0 the shaft), speed. */
export function unitLoadCount(system: ContactSystem): number {
  return 2 * system.model.hubs.length + 2
}

function visitLoads(
  system: ContactSystem,
  { freedom, bonds }: ContactFactor,
  add: (freedom: number, load: number, value: number) => void,
): void {
  const { mesh, stiffness, thermal, spin } = system
  const hubCount = system.model.hubs.length
  const speedLoad = 2 * hubCount + 1
  const isOffset = new Uint8Array(mesh.nodeCount)
  for (const seat of mesh.seats)
    for (const pair of seat) if (!bonds.open.has(pair.hubNode)) isOffset[pair.hubNode] = 1
  for (let e = 0; e < mesh.part.length; e++) {
    const part = mesh.part[e]!
    for (let i = 0; i < 8; i++) {
      const row = freedom[2 * mesh.quads[4 * e + (i >> 1)]! + (i & 1)]!
      if (row < 0) continue
      add(row, hubCount + part, thermal[8 * e + i]!)
      add(row, speedLoad, spin[8 * e + i]!)
      if (part === 0) continue
      // The bore of a tight hub stands half the diametral interference further out than the shaft's surface.
      for (let node = 0; node < 4; node++)
        if (isOffset[mesh.quads[4 * e + node]!])
          add(row, part - 1, -0.5 * stiffness[64 * e + 8 * i + 2 * node]!)
    }
  }
}

/**
 * Solutions for one metre of interference at each hub, one kelvin in each part and one rad²/s² of speed squared.
 *
 * Model: linear elasticity; any state with the same bonds is a superposition of these.
 * @param system [SI] from `prepareContact`
 * @param factor [N/m] from `factoriseContact`
 * @returns [m per unit load] equation i of load k at i · count + k
 * @throws nothing
 *
 * Validity: as the factor.
 * Source: finite-elements
 * Example: fe-press-fit, doubling the interference of case A doubles its pressure
 */
export function unitSolutions(system: ContactSystem, factor: ContactFactor): Float64Array {
  const count = unitLoadCount(system)
  const sides = new Float64Array(factor.factor.size * count)
  visitLoads(system, factor, (row, load, value) => {
    sides[row * count + load]! += value
  })
  solveEnvelope(factor.factor, sides, count)
  return sides
}

/** The one load vector of a state, `coefficients` in the order of the unit loads. */
export function combinedLoad(
  system: ContactSystem,
  factor: ContactFactor,
  coefficients: Float64Array,
): Float64Array {
  const side = new Float64Array(factor.factor.size)
  visitLoads(system, factor, (row, load, value) => {
    side[row]! += coefficients[load]! * value
  })
  return side
}
