/** Whirl of the turning shaft: gyroscopic splitting into forward and backward modes, critical speeds, unbalance. */
import { requireNonNegative } from '../engineering-input-error'
import {
  addEntry,
  bandMatrix,
  factorBand,
  fixFreedom,
  solveBand,
  type BandMatrix,
} from '../linear-algebra/band-matrix'
import type { AngularSpeed, Length } from '../quantities/quantity'
import { metre, radianPerSecond } from '../quantities/units'
import { beamMesh, nearestNode, type BeamMesh } from './beam-mesh'
import { applySupports, stiffnessMatrix } from './beam-solver'
import { lateralMassMatrix } from './lateral-mass'
import { requireShaft, shaftLength, type CarriedMass, type ShaftModel, type Support } from './shaft-model'

/** Matrices of one plane; equal bearings in both planes let one complex displacement y + iz serve both. */
export interface WhirlModel {
  mesh: BeamMesh
  stiffness: BandMatrix
  mass: BandMatrix
  /** Polar inertia of shaft and hubs: what couples the planes when the shaft turns. */
  gyroscopic: BandMatrix
}

const HALF_BANDWIDTH = 3
/** Elements no longer than this share of the shaft keep the first four modes within 0.2 %. */
const ELEMENT_SHARE = 1 / 14
const BISECTIONS = 34
const FIRST_GUESS: number = 1
const LARGEST = 1e9

/**
 * Prepares a shaft for whirl calculations.
 *
 * Model: beam elements with consistent mass, rotary inertia of shaft and hubs and gyroscopic terms; bearings alike in
 * all directions, rigid or elastic; no damping.
 * @param model [m, Pa, kg/m³] segments and material
 * @param supports [m, N/m] at least two different stations; null stiffness is rigid
 * @param masses [m, kg, kg·m²] hubs on the shaft
 * @returns [SI] matrices; null when fewer than two bearings carry the shaft
 * @throws EngineeringInputError `emptyShaft`, `boreNotInside`, `notPositive`
 *
 * Validity: bearings and housings alike in both planes; rigid hubs.
 * Source: beam-theory; vibration-theory; rotor-dynamics
 * Example: beam-reference, two discs on rigid bearings: 164.1 Hz at rest (Euler-Bernoulli)
 */
export function whirlModel(
  model: ShaftModel,
  supports: readonly Support[],
  masses: readonly CarriedMass[],
): WhirlModel | null {
  requireShaft(model)
  const wanted = [...supports, ...masses].map((item) => item.station)
  const mesh = beamMesh(model, wanted, shaftLength(model) * ELEMENT_SHARE)
  const nodes = supports.map((support) => nearestNode(mesh, support.station))
  if (new Set(nodes).size < 2) return null
  const stiffness = stiffnessMatrix(mesh)
  const mass = lateralMassMatrix(mesh, masses)
  const gyroscopic = polarMatrix(mesh, masses)
  addRotary(mass, mesh, 1)
  applySupports(stiffness, supports, nodes)
  supports.forEach((support, index) => {
    if (support.stiffness !== null) return
    fixFreedom(mass, (nodes[index] as number) * 2, 0)
    fixFreedom(gyroscopic, (nodes[index] as number) * 2, 0)
  })
  return { mesh, stiffness, mass, gyroscopic }
}

/** Consistent rotary inertia of cubic elements: 36, 3h, 4h², −h² times ρI/(30h); `factor` 2 gives the polar one. */
function addRotary(matrix: BandMatrix, mesh: BeamMesh, factor: number): void {
  for (let element = 0; element < mesh.rotaryPerLength.length; element += 1) {
    const h = (mesh.nodes[element + 1] as number) - (mesh.nodes[element] as number)
    const j = (factor * (mesh.rotaryPerLength[element] as number)) / (30 * h)
    const first = element * 2
    addEntry(matrix, first, first, 36 * j)
    addEntry(matrix, first, first + 1, 3 * h * j)
    addEntry(matrix, first, first + 2, -36 * j)
    addEntry(matrix, first, first + 3, 3 * h * j)
    addEntry(matrix, first + 1, first + 1, 4 * h * h * j)
    addEntry(matrix, first + 1, first + 2, -3 * h * j)
    addEntry(matrix, first + 1, first + 3, -h * h * j)
    addEntry(matrix, first + 2, first + 2, 36 * j)
    addEntry(matrix, first + 2, first + 3, -3 * h * j)
    addEntry(matrix, first + 3, first + 3, 4 * h * h * j)
  }
}

function polarMatrix(mesh: BeamMesh, masses: readonly CarriedMass[]): BandMatrix {
  const matrix = bandMatrix(mesh.nodes.length * 2, HALF_BANDWIDTH)
  addRotary(matrix, mesh, 2)
  for (const carried of masses) {
    const freedom = nearestNode(mesh, carried.station) * 2 + 1
    addEntry(matrix, freedom, freedom, carried.polarInertia)
  }
  return matrix
}

/** Number of negative eigenvalues of K + g G − m M. */
function negativeCount(model: WhirlModel, work: BandMatrix, g: number, m: number): number {
  const { stiffness, gyroscopic, mass } = model
  for (let i = 0; i < work.entries.length; i += 1)
    work.entries[i] =
      (stiffness.entries[i] as number) +
      g * (gyroscopic.entries[i] as number) -
      m * (mass.entries[i] as number)
  return factorBand(work)
}

/** Finds where a count that never falls with ω passes 0, 1, 2 … */
function countedRoots(countBelow: (omega: number) => number, count: number, largest: number): number[] {
  const roots: number[] = []
  let low = 0
  let high = FIRST_GUESS
  for (let index = 0; index < count; index += 1) {
    if (high <= low) high = low * 2
    while (countBelow(high) <= index) {
      if (high >= largest) return roots
      low = high
      high *= 2
    }
    let lower = low
    let upper = high
    for (let step = 0; step < BISECTIONS; step += 1) {
      const middle = (lower + upper) / 2
      if (countBelow(middle) > index) upper = middle
      else lower = middle
    }
    roots.push((lower + upper) / 2)
    low = lower
    high = upper
  }
  return roots
}

export interface WhirlFrequencies {
  forward: AngularSpeed[]
  backward: AngularSpeed[]
}

/**
 * Whirl frequencies at one speed of rotation.
 *
 * Model: (K ± ωΩG − ω²M) x = 0; for every shape one forward and one backward frequency exist, so the number of
 * negative pivots counts them and none can be missed.
 * @param model [SI] from `whirlModel`
 * @param speed [rad/s] rotation Ω, ≥ 0
 * @param count [-] how many of each, ≥ 1
 * @returns [rad/s] rising magnitudes, forward (with the rotation) and backward
 * @throws EngineeringInputError `negative`, `notFinite`
 *
 * Validity: as `whirlModel`.
 * Source: rotor-dynamics; vibration-theory
 * Example: rotor-dynamics, an overhung disk on a massless shaft: the roots of its own quadratic equations
 */
export function whirlFrequencies(model: WhirlModel, speed: AngularSpeed, count: number): WhirlFrequencies {
  requireNonNegative(speed, 'speed')
  const work: BandMatrix = { ...model.stiffness, entries: new Float64Array(model.stiffness.entries.length) }
  const along = (sense: 1 | -1) =>
    countedRoots(
      (omega) => negativeCount(model, work, sense * omega * speed, omega * omega),
      count,
      LARGEST,
    ).map(radianPerSecond)
  return { forward: along(1), backward: along(-1) }
}

/**
 * Speeds at which an unbalance meets a forward whirl: the critical speeds of the turning shaft.
 *
 * Model: (K − Ω²(M − G)) x = 0; disks with more polar than diametral inertia may have fewer of them.
 * @param model [SI] from `whirlModel`
 * @param count [-] how many, ≥ 1
 * @returns [rad/s] rising
 * @throws nothing
 *
 * Validity: as `whirlModel`.
 * Source: rotor-dynamics; vibration-theory
 * Example: rotor-dynamics, a thin disk at the middle of a simply supported shaft does not tilt: √(48EI/(l³m))
 */
export function criticalSpeeds(model: WhirlModel, count: number): AngularSpeed[] {
  const work: BandMatrix = { ...model.stiffness, entries: new Float64Array(model.stiffness.entries.length) }
  return countedRoots(
    (omega) => negativeCount(model, work, omega * omega, omega * omega),
    count,
    LARGEST,
  ).map(radianPerSecond)
}

export interface Unbalance {
  station: Length
  /** Mass times eccentricity, kg·m. */
  amount: number
}

/**
 * Deflection of the turning shaft under unbalances that lie in one plane.
 *
 * Model: (K − Ω²(M − G)) x = Ω² Σ m e, without damping: near a critical speed the real shaft moves less, by its damping.
 * @param model [SI] from `whirlModel`
 * @param unbalances [m, kg·m] stations and amounts, signs relative to each other
 * @param speed [rad/s] ≥ 0
 * @param stations [m] where the deflection is asked for
 * @returns [m] amplitudes at the stations
 * @throws EngineeringInputError `negative`, `notFinite`
 *
 * Validity: outside about ± 5 % of a critical speed.
 * Source: rotor-dynamics
 * Example: rotor-dynamics, a middle disk with eccentricity e: e r²/(1 − r²) with r = Ω/ω
 */
export function unbalanceResponse(
  model: WhirlModel,
  unbalances: readonly Unbalance[],
  speed: AngularSpeed,
  stations: readonly Length[],
): Length[] {
  requireNonNegative(speed, 'speed')
  const square = speed * speed
  const work: BandMatrix = { ...model.stiffness, entries: new Float64Array(model.stiffness.entries.length) }
  negativeCount(model, work, square, square)
  const right = new Float64Array(model.stiffness.size)
  for (const { station, amount } of unbalances) {
    const freedom = nearestNode(model.mesh, station) * 2
    // a rigid bearing takes the force of an unbalance at its own station
    if ((model.mass.entries[freedom * (HALF_BANDWIDTH + 1)] as number) === 0) continue
    right[freedom] = (right[freedom] as number) + square * amount
  }
  solveBand(work, right)
  return stations.map((station) => metre(Math.abs(right[nearestNode(model.mesh, station) * 2] as number)))
}
