import { EngineeringInputError } from '../engineering-input-error'
import { requireMeshable, type ContactHub, type ContactModel } from './contact-model'
import { gradedLines, type Focus } from './graded-lines'

/** Sizes relative to the seat diameter. */
export interface MeshQuality {
  edge: number
  growth: number
  largest: number
  /** At the foot of a web or rim, relative to `largest`. */
  foot: number
}

/** The recommendation of the mesh study: mean within 0.5 %, profile beyond 0.04 d within 3 %. */
export const FINE_MESH: MeshQuality = { edge: 0.01, growth: 0.3, largest: 0.1, foot: 0.1 }
/** For dragging: mean within about 2 %. */
export const COARSE_MESH: MeshQuality = { edge: 0.05, growth: 0.5, largest: 0.25, foot: 0.5 }

/** Grid places, of which a good half become nodes; above it a browser tab would run short of memory. */
const MAX_GRID_PLACES = 120_000

/** One pair of matching seat nodes. */
export interface SeatPair {
  shaftNode: number
  hubNode: number
  station: number
}

export interface ContactMesh {
  nodeCount: number
  radius: Float64Array
  station: Float64Array
  /** Four nodes an element: (left, inner), (right, inner), (right, outer), (left, outer). */
  quads: Int32Array
  /** Per element: 0 the shaft, k + 1 the hub k. */
  part: Int32Array
  /** Per hub, left to right. */
  seats: SeatPair[][]
  /** Per hub, its outermost nodes left to right. */
  outside: number[][]
  /** The shaft's outermost node at each grid line. */
  shaftSurface: number[]
}

function distinct(values: readonly number[], tolerance: number): number[] {
  const kept: number[] = []
  for (const value of [...values].sort((a, b) => a - b))
    if (kept.length === 0 || value - kept[kept.length - 1]! > tolerance) kept.push(value)
  return kept
}

function axialLines(model: ContactModel, quality: MeshQuality, tolerance: number): number[] {
  const keys = distinct(
    [
      ...model.sections.flatMap((s) => [s.start, s.end]),
      ...model.hubs.flatMap((h) => [
        h.start,
        h.end,
        ...h.rings.flatMap((ring) => [h.start + ring.start, h.start + ring.end]),
      ]),
    ],
    tolerance,
  )
  const foci: Focus[] = model.hubs.flatMap((hub) => {
    const edge = quality.edge * hub.seatDiameter
    const foot = quality.foot * quality.largest * hub.seatDiameter
    return [
      { at: hub.start, size: edge },
      { at: hub.end, size: edge },
      ...hub.rings.slice(1).flatMap((ring) => [
        { at: hub.start + ring.start, size: foot },
        { at: hub.start + ring.end, size: foot },
      ]),
    ]
  })
  const diameterAt = (station: number) => {
    let diameter = 0
    for (const s of model.sections)
      if (station >= s.start - tolerance && station <= s.end + tolerance)
        diameter = Math.max(diameter, s.outerDiameter)
    return diameter
  }
  return gradedLines(keys, foci, quality.growth, (station) => quality.largest * diameterAt(station))
}

function hubRadialLines(hub: ContactHub, quality: MeshQuality, tolerance: number): number[] {
  const keys = distinct([hub.seatDiameter / 2, ...hub.rings.map((ring) => ring.outerDiameter / 2)], tolerance)
  const foot = quality.foot * quality.largest * hub.seatDiameter
  const foci: Focus[] = [
    { at: hub.seatDiameter / 2, size: quality.edge * hub.seatDiameter },
    ...hub.rings.slice(0, -1).map((ring) => ({ at: ring.outerDiameter / 2, size: foot })),
  ]
  return gradedLines(keys, foci, quality.growth, () => quality.largest * hub.seatDiameter)
}

function shaftRadialLines(model: ContactModel, quality: MeshQuality, tolerance: number): number[] {
  const keys = distinct(
    model.sections.flatMap((s) => [s.boreDiameter / 2, s.outerDiameter / 2]),
    tolerance,
  )
  const seats = distinct(
    model.hubs.map((hub) => hub.seatDiameter / 2),
    tolerance,
  )
  const foci = seats.map((radius) => ({ at: radius, size: quality.edge * 2 * radius }))
  const smallest = Math.min(...model.hubs.map((hub) => hub.seatDiameter))
  return gradedLines(keys, foci, quality.growth, () => quality.largest * smallest)
}

type HasCell = (column: number, row: number) => boolean

/** A node exists where at least one of the four cells round it does. */
const isTouched = (has: HasCell, column: number, row: number) =>
  has(column, row) || has(column - 1, row) || has(column, row - 1) || has(column - 1, row - 1)

function shaftCells(model: ContactModel, stations: readonly number[], radii: readonly number[]): HasCell {
  const sectionOf = stations.slice(0, -1).map((from, column) => {
    const middle = 0.5 * (from + stations[column + 1]!)
    return model.sections.find((s) => middle > s.start && middle < s.end)
  })
  return (column, row) => {
    const section = sectionOf[column]
    if (!section || row < 0 || row + 1 >= radii.length) return false
    const middle = radii[row]! + radii[row + 1]!
    return middle > section.boreDiameter && middle < section.outerDiameter
  }
}

function hubCells(hub: ContactHub, stations: readonly number[], radii: readonly number[]): HasCell {
  return (column, row) => {
    if (column < 0 || column + 1 >= stations.length || row < 0 || row + 1 >= radii.length) return false
    const along = 0.5 * (stations[column]! + stations[column + 1]!) - hub.start
    const diameter = radii[row]! + radii[row + 1]!
    let inner: number = hub.seatDiameter
    for (const ring of hub.rings) {
      if (diameter > inner && diameter < ring.outerDiameter) return along > ring.start && along < ring.end
      inner = ring.outerDiameter
    }
    return false
  }
}

/**
 * Mesh of the shaft with all its hubs, seat nodes of shaft and hub matching.
 *
 * Model: rectangles on grid lines common to all parts along the shaft, small at every seat edge. Nodes are
 * numbered along the shaft, shaft and hub side by side, which keeps the bandwidth of the matrix small.
 * @param model [SI] shaft sections and hubs
 * @param quality [1] sizes relative to the seat diameter
 * @returns [m] nodes and elements, seat pairs, surface nodes
 * @throws EngineeringInputError as `requireMeshable`; `outOfRange` when its grid has more than 120 000 places
 *
 * Validity: sharp edges (chamfers shorten the seat, they are not modelled), no crowning.
 * Source: fe-press-fit mesh study; finite-elements
 * Example: fe-press-fit, ten hubs at edge d/100, growth 0.3, largest d/10: about 11 000 freedoms
 */
export function buildContactMesh(model: ContactModel, quality: MeshQuality): ContactMesh {
  requireMeshable(model)
  const tolerance = Math.min(...model.hubs.map((hub) => hub.seatDiameter)) * 1e-6
  const stations = axialLines(model, quality, tolerance)
  const shaftRadii = shaftRadialLines(model, quality, tolerance)
  const hubRadii = model.hubs.map((hub) => hubRadialLines(hub, quality, tolerance))
  const places = stations.length * (shaftRadii.length + Math.max(...hubRadii.map((lines) => lines.length)))
  if (places > MAX_GRID_PLACES)
    throw new EngineeringInputError(
      'outOfRange',
      'hubs',
      'This layout needs a larger mesh than is solved here',
    )

  const shaftHas = shaftCells(model, stations, shaftRadii)
  const hubHas = model.hubs.map((hub, k) => hubCells(hub, stations, hubRadii[k]!))
  const radius: number[] = []
  const station: number[] = []
  const seats: SeatPair[][] = model.hubs.map(() => [])
  const outside: number[][] = model.hubs.map(() => [])
  const shaftSurface: number[] = []
  const newNode = (r: number, z: number) => {
    radius.push(r)
    station.push(z)
    return radius.length - 1
  }
  const quads: number[] = []
  const part: number[] = []
  const addCells = (has: HasCell, column: number, left: Int32Array, right: Int32Array, partIndex: number) => {
    for (let row = 0; row + 1 < left.length; row++) {
      if (!has(column, row)) continue
      quads.push(left[row]!, right[row]!, right[row + 1]!, left[row + 1]!)
      part.push(partIndex)
    }
  }
  const column = (has: HasCell, index: number, radii: readonly number[], z: number) =>
    Int32Array.from(radii, (r, row) => (isTouched(has, index, row) ? newNode(r, z) : -1))

  let previousShaft: Int32Array | null = null
  const previousHub: (Int32Array | null)[] = model.hubs.map(() => null)
  stations.forEach((z, index) => {
    const shaftColumn = column(shaftHas, index, shaftRadii, z)
    shaftSurface.push(shaftColumn.findLast((node) => node >= 0) ?? -1)
    if (previousShaft) addCells(shaftHas, index - 1, previousShaft, shaftColumn, 0)
    previousShaft = shaftColumn
    model.hubs.forEach((hub, k) => {
      if (z < hub.start - tolerance || z > hub.end + tolerance) {
        previousHub[k] = null
        return
      }
      const hubColumn = column(hubHas[k]!, index, hubRadii[k]!, z)
      const left = previousHub[k]
      if (left) addCells(hubHas[k]!, index - 1, left, hubColumn, k + 1)
      previousHub[k] = hubColumn
      const outermost = hubColumn.findLast((node) => node >= 0)
      if (outermost !== undefined) outside[k]!.push(outermost)
      const row = shaftRadii.findIndex((r) => Math.abs(r - hub.seatDiameter / 2) <= tolerance)
      seats[k]!.push({ shaftNode: shaftColumn[row]!, hubNode: hubColumn[0]!, station: z })
    })
  })
  return {
    nodeCount: radius.length,
    radius: Float64Array.from(radius),
    station: Float64Array.from(station),
    quads: Int32Array.from(quads),
    part: Int32Array.from(part),
    seats,
    outside,
    shaftSurface,
  }
}
