/** Nodes and elements of the stepped shaft. */
import type { Length } from '../quantities/quantity'
import { metre } from '../quantities/units'
import { secondMomentOfArea, sectionArea } from './section-properties'
import { segmentAt, shaftLength, type ShaftModel } from './shaft-model'

export interface BeamMesh {
  /** Stations of the nodes, rising. */
  nodes: Float64Array
  /** One value for each element between neighbouring nodes. */
  bendingStiffness: Float64Array
  torsionalStiffness: Float64Array
  massPerLength: Float64Array
  /** ρI per length: rotary inertia of the shaft itself about a diameter; twice that about its axis. */
  rotaryPerLength: Float64Array
}

/**
 * Elements shorter than this share of the shaft lose digits (12EI/h³ grows without bound), so
 * stations closer than that share a node and loads are carried over to it with their moment.
 */
export const NODE_SHARE = 2e-4

/** Wanted stations in order of importance: earlier ones keep their place when two are too close. */
export function beamMesh(model: ShaftModel, wanted: readonly number[], largestElement = Infinity): BeamMesh {
  const length = shaftLength(model)
  const nodes = chosenNodes(length, [...wanted, ...model.segments.map((segment) => segment.start)])
  const fine = Number.isFinite(largestElement) ? subdivided(nodes, largestElement) : nodes
  const elements = fine.length - 1
  const mesh: BeamMesh = {
    nodes: Float64Array.from(fine),
    bendingStiffness: new Float64Array(elements),
    torsionalStiffness: new Float64Array(elements),
    massPerLength: new Float64Array(elements),
    rotaryPerLength: new Float64Array(elements),
  }
  const { youngsModulus, poissonRatio, density } = model.material
  const shearModulus = youngsModulus / (2 * (1 + poissonRatio))
  for (let element = 0; element < elements; element += 1) {
    const middle = ((fine[element] as number) + (fine[element + 1] as number)) / 2
    const segment = segmentAt(model, middle, 'right')
    if (!segment) continue
    const inertia = secondMomentOfArea(segment.outerDiameter, segment.bore)
    mesh.bendingStiffness[element] = youngsModulus * inertia
    mesh.torsionalStiffness[element] = shearModulus * 2 * inertia
    mesh.massPerLength[element] = density * sectionArea(segment.outerDiameter, segment.bore)
    mesh.rotaryPerLength[element] = density * inertia
  }
  return mesh
}

function chosenNodes(length: number, wanted: readonly number[]): number[] {
  const closest = length * NODE_SHARE
  const nodes = [0, length]
  for (const station of wanted) {
    const place = insertionPlace(nodes, station)
    const left = nodes[place - 1]
    const right = nodes[place]
    if (left !== undefined && station - left < closest) continue
    if (right !== undefined && right - station < closest) continue
    if (station < 0 || station > length) continue
    nodes.splice(place, 0, station)
  }
  return nodes
}

function insertionPlace(nodes: readonly number[], station: number): number {
  let low = 0
  let high = nodes.length
  while (low < high) {
    const middle = (low + high) >> 1
    if ((nodes[middle] as number) <= station) low = middle + 1
    else high = middle
  }
  return low
}

function subdivided(nodes: readonly number[], largest: number): number[] {
  const fine: number[] = []
  for (let index = 0; index + 1 < nodes.length; index += 1) {
    const start = nodes[index] as number
    const span = (nodes[index + 1] as number) - start
    const parts = Math.max(1, Math.ceil(span / largest))
    for (let part = 0; part < parts; part += 1) fine.push(start + (span * part) / parts)
  }
  fine.push(nodes[nodes.length - 1] as number)
  return fine
}

/** The node nearest to a station. */
export function nearestNode(mesh: BeamMesh, station: number): number {
  const { nodes } = mesh
  const right = Math.min(nodes.length - 1, elementAt(mesh, station) + 1)
  const left = right - 1
  return station - (nodes[left] as number) <= (nodes[right] as number) - station ? left : right
}

/** The element that holds a station; the left one at a node, the end ones beyond the ends. */
export function elementAt(mesh: BeamMesh, station: number): number {
  const { nodes } = mesh
  let low = 0
  let high = nodes.length - 2
  while (low < high) {
    const middle = (low + high) >> 1
    if ((nodes[middle + 1] as number) < station) low = middle + 1
    else high = middle
  }
  return low
}

export const nodeStation = (mesh: BeamMesh, node: number): Length => metre(mesh.nodes[node] as number)
