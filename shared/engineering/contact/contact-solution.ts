import { requireFinite, requireNonNegative } from '../engineering-input-error'
import { solveEnvelope } from '../linear-algebra/envelope-cholesky'
import type { AngularSpeed, Length } from '../quantities/quantity'
import {
  combinedLoad,
  factoriseContact,
  FRICTIONLESS_CLOSED,
  unitLoadCount,
  unitSolutions,
  type ContactFactor,
  type ContactSystem,
} from './contact-system'

/** What may change without a new mesh. */
export interface ContactState {
  /** Diametral interference of each hub, in the order of the model. */
  interference: Length[]
  /** Rise over the temperature of joining, K: the shaft, then each hub. */
  temperatureRise: number[]
  speed: AngularSpeed
  /** Coefficient of friction of each seat while the hub shrinks on; 0 or left out: it slides freely. */
  friction?: number[]
}

/** A system with the solutions of its unit loads for closed, freely sliding seats. */
export interface ContactBasis {
  system: ContactSystem
  closed: ContactFactor
  /** Null above a number of hubs from which on one solution a state is cheaper than all unit solutions. */
  units: Float64Array | null
}

/** Unit solutions grow with the square of the hubs, one solution a state with their number. */
const MOST_HUBS_WITH_UNITS = 12

export interface ContactSolution {
  state: ContactState
  /** Radial and axial displacement of each node, m. */
  displacement: Float64Array
  /** Force of the shaft on each hub seat node per radian, N: radial (outward positive) and axial. */
  seatForce: Float64Array
  seatShear: Float64Array
  open: ReadonlySet<number>
  slipping: ReadonlySet<number>
  /** Factorisations beyond the first that the contact needed. */
  passes: number
  /** False when the passes ran out before the contact settled: the result must not be shown as one. */
  hasSettled: boolean
}

/** Each pass is a new factorisation; webs at speed need four or so. */
const MAX_PASSES = 40

/**
 * Makes a system ready for many states.
 *
 * Model: `factoriseContact` with all seats closed and free to slide, and its unit solutions.
 * @param system [SI] from `prepareContact`
 * @returns [SI] the basis of `solveContact`
 * @throws EngineeringInputError `numericallySingular`
 *
 * Validity: as its parts.
 * Source: finite-elements
 * Example: fe-press-fit, ten hubs: one factorisation and 22 unit solutions
 */
export function contactBasis(system: ContactSystem): ContactBasis {
  const closed = factoriseContact(system, FRICTIONLESS_CLOSED)
  const units = system.model.hubs.length <= MOST_HUBS_WITH_UNITS ? unitSolutions(system, closed) : null
  return { system, closed, units }
}

function requireState(system: ContactSystem, state: ContactState): void {
  const hubs = system.model.hubs.length
  for (let k = 0; k < hubs; k++) {
    requireFinite(state.interference[k] ?? NaN, `interference.${k}`)
    requireNonNegative(state.friction?.[k] ?? 0, `friction.${k}`)
  }
  for (let k = 0; k <= hubs; k++) requireFinite(state.temperatureRise[k] ?? NaN, `temperatureRise.${k}`)
  requireFinite(state.speed, 'speed')
}

function coefficientsOf(system: ContactSystem, state: ContactState): Float64Array {
  const coefficients = new Float64Array(unitLoadCount(system))
  coefficients.set(state.interference, 0)
  coefficients.set(state.temperatureRise, state.interference.length)
  coefficients[coefficients.length - 1] = state.speed * state.speed
  return coefficients
}

function nodalDisplacement(
  system: ContactSystem,
  { freedom, bonds }: ContactFactor,
  state: ContactState,
  valueOf: (row: number) => number,
): Float64Array {
  const displacement = new Float64Array(freedom.length)
  for (let i = 0; i < freedom.length; i++) if (freedom[i]! >= 0) displacement[i] = valueOf(freedom[i]!)
  system.mesh.seats.forEach((seat, k) => {
    for (const pair of seat)
      if (!bonds.open.has(pair.hubNode)) displacement[2 * pair.hubNode]! += state.interference[k]! / 2
  })
  return displacement
}

/** Nodal forces of the shaft on the hub from the equilibrium of the hub's own elements along the seat. */
function seatForces(system: ContactSystem, state: ContactState, displacement: Float64Array) {
  const { mesh, stiffness, thermal, spin, seatElements } = system
  const radial = new Float64Array(mesh.nodeCount)
  const axial = new Float64Array(mesh.nodeCount)
  const speedSquare = state.speed * state.speed
  for (const e of seatElements) {
    const rise = state.temperatureRise[mesh.part[e]!]!
    for (let i = 0; i < 4; i++) {
      let force = -rise * thermal[8 * e + i]! - speedSquare * spin[8 * e + i]!
      for (let j = 0; j < 8; j++)
        force += stiffness[64 * e + 8 * i + j]! * displacement[2 * mesh.quads[4 * e + (j >> 1)]! + (j & 1)]!
      const node = mesh.quads[4 * e + (i >> 1)]!
      if ((i & 1) === 0) radial[node]! += force
      else axial[node]! += force
    }
  }
  return { radial, axial }
}

interface Contact {
  open: Set<number>
  /** Hub seat nodes that slide against friction, with the axial force on the hub. */
  slipping: Map<number, number>
}

/** Opens what pulls, closes what overlaps; returns whether anything changed. */
function updateOpenings(
  system: ContactSystem,
  state: ContactState,
  displacement: Float64Array,
  radial: Float64Array,
  contact: Contact,
): boolean {
  let largest = 0
  for (const seat of system.mesh.seats)
    for (const pair of seat) largest = Math.max(largest, Math.abs(radial[pair.hubNode]!))
  let hasChanged = false
  system.mesh.seats.forEach((seat, k) => {
    for (const { hubNode, shaftNode } of seat) {
      if (!contact.open.has(hubNode)) {
        if (radial[hubNode]! >= -1e-9 * largest) continue
        contact.open.add(hubNode)
        contact.slipping.delete(hubNode)
        hasChanged = true
      } else {
        const gap = displacement[2 * hubNode]! - displacement[2 * shaftNode]! - state.interference[k]! / 2
        if (gap >= -1e-9 * Math.abs(state.interference[k]!) - 1e-15) continue
        contact.open.delete(hubNode)
        hasChanged = true
      }
    }
  })
  return hasChanged
}

/** Lets slide what exceeds friction, holds what would slide backwards, follows the pressure of what slides. */
function updateSlip(
  system: ContactSystem,
  state: ContactState,
  displacement: Float64Array,
  forces: { radial: Float64Array; axial: Float64Array },
  contact: Contact,
): boolean {
  let hasChanged = false
  system.mesh.seats.forEach((seat, k) => {
    const friction = state.friction?.[k] ?? 0
    if (friction === 0) return
    for (const { hubNode, shaftNode } of seat) {
      if (contact.open.has(hubNode)) continue
      const limit = friction * Math.max(0, forces.radial[hubNode]!)
      const applied = contact.slipping.get(hubNode)
      if (applied === undefined) {
        if (Math.abs(forces.axial[hubNode]!) <= limit * (1 + 1e-6)) continue
        contact.slipping.set(hubNode, Math.sign(forces.axial[hubNode]!) * limit)
        hasChanged = true
        continue
      }
      const slip = displacement[2 * hubNode + 1]! - displacement[2 * shaftNode + 1]!
      const wanted = Math.sign(applied) * limit
      if (slip * applied > 0) {
        contact.slipping.delete(hubNode)
        hasChanged = true
      } else if (Math.abs(wanted - applied) > 1e-4 * limit) {
        contact.slipping.set(hubNode, wanted)
        hasChanged = true
      }
    }
  })
  return hasChanged
}

function stuckNodes(system: ContactSystem, state: ContactState, contact: Contact): Set<number> {
  const stuck = new Set<number>()
  system.mesh.seats.forEach((seat, k) => {
    if ((state.friction?.[k] ?? 0) === 0) return
    for (const { hubNode } of seat)
      if (!contact.open.has(hubNode) && !contact.slipping.has(hubNode)) stuck.add(hubNode)
  })
  return stuck
}

/**
 * Contact of all hubs with the shaft in one state.
 *
 * Model: unilateral contact by an active set: seat nodes that pull are opened, open ones that overlap are
 * closed, until neither remains. With friction, Coulomb's law on the whole relative displacement (a hub that
 * shrinks on radially): nodes stick until their shear reaches friction times pressure, then slide at it.
 * While all seats stay closed and slide freely the state is a superposition of unit solutions.
 * @param basis [SI] from `contactBasis`
 * @param state [SI] interference, temperatures, speed, friction
 * @returns [SI] displacements, seat forces, open and sliding nodes; `hasSettled` false when it did not converge
 * @throws EngineeringInputError `notFinite`, `negative`, `numericallySingular`
 *
 * Validity: linear elastic, small displacements, proportional loading; the pressure at a sharp edge depends on
 * the mesh.
 * Source: fe-press-fit; kikuchi-oden
 * Example: fe-press-fit, case K, a webbed hub at 10 000 rpm: open over 8 to 9 mm in the middle
 */
export function solveContact(basis: ContactBasis, state: ContactState): ContactSolution {
  const { system } = basis
  requireState(system, state)
  const coefficients = coefficientsOf(system, state)
  const contact: Contact = { open: new Set(), slipping: new Map() }
  const hasFriction = state.friction?.some((value) => value > 0) ?? false

  let factor = hasFriction
    ? factoriseContact(system, { open: new Set(), stuck: stuckNodes(system, state, contact) })
    : basis.closed
  let displacement =
    hasFriction || basis.units === null
      ? solveWith(system, factor, state, coefficients, contact)
      : superpose(basis, basis.units, state, coefficients)
  let forces = seatForces(system, state, displacement)
  let passes = 0
  let hasSettled = false
  for (; passes < MAX_PASSES; passes++) {
    const hasOpened = updateOpenings(system, state, displacement, forces.radial, contact)
    const hasSlipped = hasFriction && updateSlip(system, state, displacement, forces, contact)
    if (!hasOpened && !hasSlipped) {
      hasSettled = true
      break
    }
    factor = factoriseContact(system, {
      open: new Set(contact.open),
      stuck: stuckNodes(system, state, contact),
    })
    displacement = solveWith(system, factor, state, coefficients, contact)
    forces = seatForces(system, state, displacement)
  }
  for (const node of contact.open) forces.radial[node] = forces.axial[node] = 0
  return {
    state,
    displacement,
    seatForce: forces.radial,
    seatShear: forces.axial,
    open: contact.open,
    slipping: new Set(contact.slipping.keys()),
    passes,
    hasSettled,
  }
}

function solveWith(
  system: ContactSystem,
  factor: ContactFactor,
  state: ContactState,
  coefficients: Float64Array,
  contact: Contact,
): Float64Array {
  const side = combinedLoad(system, factor, coefficients)
  const push = (node: number, force: number) => {
    const row = factor.freedom[2 * node + 1]!
    if (row >= 0) side[row]! += force
  }
  for (const seat of system.mesh.seats)
    for (const { hubNode, shaftNode } of seat) {
      const force = contact.slipping.get(hubNode)
      if (force === undefined) continue
      push(hubNode, force)
      push(shaftNode, -force)
    }
  solveEnvelope(factor.factor, side, 1)
  return nodalDisplacement(system, factor, state, (row) => side[row]!)
}

function superpose(
  { system, closed }: ContactBasis,
  units: Float64Array,
  state: ContactState,
  coefficients: Float64Array,
): Float64Array {
  const count = coefficients.length
  return nodalDisplacement(system, closed, state, (row) => {
    let value = 0
    for (let k = 0; k < count; k++) value += coefficients[k]! * units[row * count + k]!
    return value
  })
}
