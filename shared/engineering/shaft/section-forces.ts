/** Section forces of the shaft by statics, with both sides given where they jump. */
import type { Length } from '../quantities/quantity'
import type { ShaftLoad } from './shaft-model'

/** A station of a diagram. At a jump the same station comes twice, left side first. */
export interface DiagramStation {
  station: Length
  side: 'left' | 'right'
}

/** One value for each diagram station. */
export interface SectionForces {
  /** Torque that the parts on the left drive the rest with. */
  torque: Float64Array
  /** Tension positive. */
  axialForce: Float64Array
  shearY: Float64Array
  shearZ: Float64Array
  /** Moments about the y and z axes on the face that looks to +x; E I y″ is the moment about z. */
  bendingY: Float64Array
  bendingZ: Float64Array
}

/** Stations closer than a nanometre are one place. */
const SAME_PLACE = 1e-9

/**
 * Stations of the diagrams: every station named twice (left and right side), the rest between them once.
 *
 * Model: curves are straight or cubic between named stations, so these points draw them without loss.
 * @param jumps [m] stations where something may jump: loads, supports, steps, seat edges, ends
 * @param largestStep [m] greatest distance between neighbouring stations, > 0
 * @returns [m] station-ordered; both sides of each named station, the left one first
 * @throws EngineeringInputError never; stations closer than a nanometre are one
 *
 * Validity: any finite stations.
 * Source: statics
 * Example: no published number; jumps at 0 and 10 mm with a step of 5 mm give 0, 0, 5, 10, 10 mm
 */
export function diagramStations(jumps: readonly number[], largestStep: number): DiagramStation[] {
  const sorted = [...jumps].sort((one, other) => one - other)
  const stations: DiagramStation[] = []
  let last: number | null = null
  for (const station of sorted) {
    if (last !== null) {
      if (station - last < SAME_PLACE) continue
      const parts = Math.min(200, Math.ceil((station - last) / largestStep))
      for (let part = 1; part < parts; part += 1)
        stations.push({ station: (last + ((station - last) * part) / parts) as Length, side: 'right' })
    }
    stations.push({ station: station as Length, side: 'left' }, { station: station as Length, side: 'right' })
    last = station
  }
  return stations
}

/**
 * Torque, axial force, shear and bending moments along the shaft.
 *
 * Model: equilibrium of everything to the left of the cut; supports enter as loads.
 * @param loads [N, N·m, m] loads and support reactions, in any order, signs by the axes
 * @param stations [m] station-ordered, left side before right side
 * @returns [N, N·m] one value for each station; left of a load excludes it, right of it includes it
 * @throws EngineeringInputError never; arguments come from checked inputs
 *
 * Validity: exact for point loads; at the right end the rest of an unbalanced case is left over.
 * Source: statics; shigley-9 Example 7-2
 * Example: shigley-9 Example 7-2: total bending moment 3651 lbf·in at 7.5 in
 */
export function sectionForces(
  loads: readonly ShaftLoad[],
  stations: readonly DiagramStation[],
): SectionForces {
  const ordered = [...loads].sort((one, other) => one.station - other.station)
  const count = stations.length
  const forces: SectionForces = {
    torque: new Float64Array(count),
    axialForce: new Float64Array(count),
    shearY: new Float64Array(count),
    shearZ: new Float64Array(count),
    bendingY: new Float64Array(count),
    bendingZ: new Float64Array(count),
  }
  let next = 0
  let place = ordered[0]?.station ?? 0
  let torque = 0
  let axial = 0
  let y = 0
  let z = 0
  let momentY = 0
  let momentZ = 0
  for (let index = 0; index < count; index += 1) {
    const { station, side } = stations[index] as DiagramStation
    const reach = side === 'right' ? station + SAME_PLACE : station - SAME_PLACE
    for (let load = ordered[next]; load && load.station <= reach; load = ordered[next]) {
      // moments move along with the cut, so that far-away forces do not cancel in large products
      momentZ += y * (load.station - place) - load.momentZ
      momentY -= z * (load.station - place) + load.momentY
      place = load.station
      torque += load.torque
      axial += load.axialForce
      y += load.forceY
      z += load.forceZ
      next += 1
    }
    // left of the first load there is nothing to carry
    const arm = next > 0 ? station - place : 0
    forces.torque[index] = torque
    forces.axialForce[index] = -axial
    forces.shearY[index] = y
    forces.shearZ[index] = z
    forces.bendingZ[index] = momentZ + y * arm
    forces.bendingY[index] = momentY - z * arm
  }
  return forces
}
