/** Distances along the shaft: gaps between parts, and the steps a part lies over. */
import { requireFinite } from '../engineering-input-error'
import type { Length } from '../quantities/quantity'
import { metre } from '../quantities/units'
import type { ShaftEnd } from './passage'

export interface Extent {
  id: string
  start: Length
  end: Length
}

export interface NeighbourGap {
  left: string
  right: string
  /** Negative when the parts overlap by that much. */
  gap: Length
}

/**
 * Gaps between neighbouring parts, and every overlap.
 *
 * Model: parts sorted by their left faces; the gap runs from the right-most face so far to the next left face.
 * @param parts [m] left and right face of each part
 * @returns [m] one entry for each pair of neighbours, negative when they overlap
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: faces square to the axis; hubs and bearings alike.
 * Source: assembly-practice
 * Example: no published number; parts at 0 to 20 mm and 31 to 53 mm are 11 mm apart
 */
export function neighbourGaps(parts: readonly Extent[]): NeighbourGap[] {
  for (const part of parts) {
    requireFinite(part.start, 'parts.start')
    requireFinite(part.end, 'parts.end')
  }
  const row = [...parts].sort((one, other) => one.start - other.start)
  const gaps: NeighbourGap[] = []
  let furthest = row[0]
  for (const part of row.slice(1)) {
    if (!furthest) break
    gaps.push({ left: furthest.id, right: part.id, gap: metre(part.start - furthest.end) })
    if (part.end > furthest.end) furthest = part
  }
  return gaps
}

export interface Step {
  station: Length
  leftDiameter: Length
  rightDiameter: Length
}

/** Faces count as one when they are closer than a machinist would see. */
const FACE_TOLERANCE = 1e-4

/**
 * Whether a shoulder stands where a hub is said to be pushed against it.
 *
 * Model: a part that comes from the left stops at a step whose right side is larger than its bore, and the other way
 * round; the step must be at the face asked for, within 0.1 mm.
 * @param station [m] face the part is pushed against
 * @param bore [m] bore of the part, > 0
 * @param from [-] end the part comes from
 * @param steps [m] steps of diameter along the shaft
 * @returns [-] true when the shoulder exists
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: shoulders of the shaft; spacers and neighbours are looked at by the caller.
 * Source: assembly-practice
 * Example: no published number; a 70 mm hub from the right finds no stop where the shaft steps from 66 up to 70 mm
 */
export function hasShoulder(station: Length, bore: Length, from: ShaftEnd, steps: readonly Step[]): boolean {
  requireFinite(station, 'station')
  requireFinite(bore, 'bore')
  return steps.some((step) => {
    const beyond = from === 'left' ? step.rightDiameter : step.leftDiameter
    return Math.abs(step.station - station) <= FACE_TOLERANCE && beyond > bore + FACE_TOLERANCE
  })
}

/**
 * Whether two faces stand at one place.
 *
 * Model: equal within 0.1 mm.
 * @param one [m] station of a face
 * @param other [m] station of the other face
 * @returns [-] true when they touch
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: faces square to the axis.
 * Source: assembly-practice
 * Example: no published number; 132 and 132.05 mm touch, 132 and 132.2 mm do not
 */
export function facesTouch(one: Length, other: Length): boolean {
  requireFinite(one, 'one')
  requireFinite(other, 'other')
  return Math.abs(one - other) <= FACE_TOLERANCE
}
