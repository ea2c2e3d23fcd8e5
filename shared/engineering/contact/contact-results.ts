import type { Force, Length, Pressure } from '../quantities/quantity'
import type { ContactSystem } from './contact-system'
import type { ContactSolution } from './contact-solution'

/** Along one seat, left to right; values in the order of `station`. */
export interface SeatProfile {
  station: Float64Array
  pressure: Float64Array
  isOpen: boolean[]
  /** Stresses at the surface of the hub's bore, Pa. */
  boreHoop: Float64Array
  boreEquivalent: Float64Array
}

export interface ContactHubResult {
  hub: string
  profile: SeatProfile
  meanPressure: Pressure
  middlePressure: Pressure
  /** Smallest and largest, leaving out 0.02 d at each edge, where the value depends on the mesh. */
  smallestPressure: Pressure
  largestPressure: Pressure
  /** The value at the sharp edge: depends on the mesh, never a result by itself. */
  edgePressure: { left: Pressure; right: Pressure }
  openLength: Length
  openZones: { from: Length; to: Length }[]
  boreHoopMiddle: Pressure
  boreHoopLargest: Pressure
  boreEquivalentLargest: Pressure
  /** ∫ p dA: times the coefficient of friction it is the axial capacity. */
  normalForce: Force
  outsideGrowth: { smallest: Length; largest: Length }
}

export interface ShaftSurfaceResult {
  station: Float64Array
  axial: Float64Array
  hoop: Float64Array
  equivalent: Float64Array
  /** True outside every seat by at least 0.02 d: where a stress value does not depend on the mesh. */
  isFree: boolean[]
}

/** Share of the diameter at each edge where values depend on the mesh. */
const EDGE_ZONE = 0.02

function tributary(stations: ArrayLike<number>, index: number): number {
  const left = index > 0 ? stations[index]! - stations[index - 1]! : 0
  const right = index + 1 < stations.length ? stations[index + 1]! - stations[index]! : 0
  return (left + right) / 2
}

function interpolate(stations: ArrayLike<number>, values: ArrayLike<number>, at: number): number {
  let i = 0
  while (i + 2 < stations.length && stations[i + 1]! < at) i++
  const share = (at - stations[i]!) / (stations[i + 1]! - stations[i]!)
  return values[i]! + share * (values[i + 1]! - values[i]!)
}

/** Hoop and axial stress at a free or pressed surface from its own strains. */
function surfaceStress(
  material: { youngsModulus: number; poissonRatio: number },
  hoopStrain: number,
  axialStrain: number,
  radialStress: number,
) {
  const { youngsModulus: E, poissonRatio: nu } = material
  const a = E * hoopStrain + nu * radialStress
  const b = E * axialStrain + nu * radialStress
  const hoop = (a + nu * b) / (1 - nu * nu)
  const axial = (b + nu * a) / (1 - nu * nu)
  const equivalent = Math.sqrt(
    ((hoop - axial) ** 2 + (axial - radialStress) ** 2 + (radialStress - hoop) ** 2) / 2,
  )
  return { hoop, axial, equivalent }
}

/** Axial strain along a row of nodes by differences to both neighbours. */
function axialStrain(
  displacement: Float64Array,
  stations: ArrayLike<number>,
  nodes: readonly number[],
  index: number,
) {
  const left = Math.max(0, index - 1)
  const right = Math.min(nodes.length - 1, index + 1)
  return (
    (displacement[2 * nodes[right]! + 1]! - displacement[2 * nodes[left]! + 1]!) /
    (stations[right]! - stations[left]!)
  )
}

/**
 * Pressure, stresses and growth of each hub.
 *
 * Model: pressure is nodal force over the node's share of the seat; stresses at the bore come from the surface's own
 * strains and the pressure, not from extrapolated element stresses, which converge slowly.
 * @param system [SI] from `prepareContact`
 * @param solution [SI] from `solveContact`
 * @returns [SI] one result a hub, stations from the left datum
 * @throws nothing
 *
 * Validity: values within 0.02 d of a sharp edge depend on the mesh and are kept apart as `edgePressure`.
 * Source: fe-press-fit
 * Example: fe-press-fit, case A: mean 78.8 MPa, middle 76.8 MPa, against 77.25 MPa of the two-cylinder formula
 */
export function contactHubResults(system: ContactSystem, solution: ContactSolution): ContactHubResult[] {
  const { mesh, model } = system
  const { displacement, seatForce, state } = solution
  return mesh.seats.map((seat, k) => {
    const hub = model.hubs[k]!
    const seatRadius = hub.seatDiameter / 2
    const station = Float64Array.from(seat, (pair) => pair.station)
    const nodes = seat.map((pair) => pair.hubNode)
    const pressure = Float64Array.from(
      nodes,
      (node, i) => seatForce[node]! / (seatRadius * tributary(station, i)),
    )
    const isOpen = nodes.map((node) => solution.open.has(node))
    const freeStrain = hub.material.expansion * state.temperatureRise[k + 1]!
    const stresses = nodes.map((node, i) =>
      surfaceStress(
        hub.material,
        displacement[2 * node]! / seatRadius - freeStrain,
        axialStrain(displacement, station, nodes, i) - freeStrain,
        -pressure[i]!,
      ),
    )
    const boreHoop = Float64Array.from(stresses, (s) => s.hoop)
    const boreEquivalent = Float64Array.from(stresses, (s) => s.equivalent)
    const edge = EDGE_ZONE * hub.seatDiameter
    const inner = nodes
      .map((_, i) => i)
      .filter((i) => station[i]! >= hub.start + edge && station[i]! <= hub.end - edge)
    const middle = (hub.start + hub.end) / 2
    const total = nodes.reduce((sum, node) => sum + seatForce[node]!, 0)
    const openZones: { from: Length; to: Length }[] = []
    isOpen.forEach((open, i) => {
      if (!open) return
      const last = openZones[openZones.length - 1]
      if (last && isOpen[i - 1]) last.to = station[i]! as Length
      else openZones.push({ from: station[i]! as Length, to: station[i]! as Length })
    })
    const growth = mesh.outside[k]!.map((node) => 2 * displacement[2 * node]!)
    const over = (values: ArrayLike<number>, pick: (...numbers: number[]) => number) =>
      inner.length > 0 ? pick(...inner.map((i) => values[i]!)) : interpolate(station, values, middle)
    return {
      hub: hub.id,
      profile: { station, pressure, isOpen, boreHoop, boreEquivalent },
      meanPressure: (total / (seatRadius * (hub.end - hub.start))) as Pressure,
      middlePressure: interpolate(station, pressure, middle) as Pressure,
      smallestPressure: over(pressure, Math.min) as Pressure,
      largestPressure: over(pressure, Math.max) as Pressure,
      edgePressure: { left: pressure[0]! as Pressure, right: pressure[pressure.length - 1]! as Pressure },
      openLength: isOpen.reduce((sum, open, i) => (open ? sum + tributary(station, i) : sum), 0) as Length,
      openZones,
      boreHoopMiddle: interpolate(station, boreHoop, middle) as Pressure,
      boreHoopLargest: over(boreHoop, Math.max) as Pressure,
      boreEquivalentLargest: over(boreEquivalent, Math.max) as Pressure,
      normalForce: (2 * Math.PI * total) as Force,
      outsideGrowth: { smallest: Math.min(...growth) as Length, largest: Math.max(...growth) as Length },
    }
  })
}

/**
 * Stresses at the surface of the shaft, under the hubs and between them.
 *
 * Model: from the surface's own strains, with the seat pressure where a hub sits.
 * @param system [SI] from `prepareContact`
 * @param solution [SI] from `solveContact`
 * @returns [SI] along the shaft; `isFree` marks where values do not depend on the mesh
 * @throws nothing
 *
 * Validity: at steps of diameter and within 0.02 d of a seat edge the value depends on the mesh.
 * Source: fe-press-fit
 * Example: fe-press-fit, between close cams the axial tension of the surface doubles from 40 to 79 MPa
 */
export function shaftSurfaceResult(system: ContactSystem, solution: ContactSolution): ShaftSurfaceResult {
  const { mesh, model } = system
  const { displacement, seatForce, state } = solution
  const nodes = mesh.shaftSurface.filter((node) => node >= 0)
  const station = Float64Array.from(nodes, (node) => mesh.station[node]!)
  const pressureAt = new Map<number, number>()
  mesh.seats.forEach((seat, k) => {
    const radius = model.hubs[k]!.seatDiameter / 2
    const stations = seat.map((pair) => pair.station)
    seat.forEach((pair, i) => {
      pressureAt.set(pair.shaftNode, seatForce[pair.hubNode]! / (radius * tributary(stations, i)))
    })
  })
  const freeStrain = model.shaftMaterial.expansion * state.temperatureRise[0]!
  const stresses = nodes.map((node, i) =>
    surfaceStress(
      model.shaftMaterial,
      displacement[2 * node]! / mesh.radius[node]! - freeStrain,
      axialStrain(displacement, station, nodes, i) - freeStrain,
      -(pressureAt.get(node) ?? 0),
    ),
  )
  return {
    station,
    axial: Float64Array.from(stresses, (s) => s.axial),
    hoop: Float64Array.from(stresses, (s) => s.hoop),
    equivalent: Float64Array.from(stresses, (s) => s.equivalent),
    isFree: Array.from(station, (z) =>
      model.hubs.every((hub) => {
        const edge = EDGE_ZONE * hub.seatDiameter
        return z <= hub.start - edge || z >= hub.end + edge
      }),
    ),
  }
}
