/**
 * The end view as pure geometry. Angles count from +y in the sense of rotation as seen from the
 * drive end (left): clockwise from the left, anticlockwise from the right. Reading a lobe angle
 * from the wrong end is a classic mistake, so the side is part of every function here.
 */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { hubExtent } from '../tools/part'

export type ViewedFrom = 'left' | 'right'

/** Screen vector of length 1 at an angle: x to the right, y down. */
export function direction(angleDeg: number, from: ViewedFrom): { x: number; y: number } {
  const angle = (angleDeg * Math.PI) / 180
  return { x: (from === 'left' ? 1 : -1) * Math.sin(angle), y: -Math.cos(angle) }
}

/** Angle of a force in the plane of the end view, 0 to 360. */
export function forceAngleDeg(forceYN: number, forceZN: number): number {
  const angle = (Math.atan2(forceZN, forceYN) * 180) / Math.PI
  return angle < 0 ? angle + 360 : angle
}

export interface PhaseMark {
  hubId: string
  name: string
  isCam: boolean
  phaseDeg: number
  /** Angle of the timing chart, when it has one. */
  requiredDeg: number | null
  toleranceDeg: number
  boreRadiusMm: number
  outerRadiusMm: number
  isOff: boolean
}

export interface ForceMark {
  hubId: string
  name: string
  angleDeg: number
  forceN: number
  outerRadiusMm: number
}

/** Smallest turn from one angle to another, -180 to 180. */
export const angleBetween = (fromDeg: number, toDeg: number) =>
  ((((toDeg - fromDeg) % 360) + 540) % 360) - 180

const ANGLE_DUST_DEG = 1e-9

export function phaseMarks(document: LayoutDocument): PhaseMark[] {
  return document.hubs.flatMap((hub) => {
    const timing = document.timing.find((entry) => entry.hub === hub.id)
    const phaseDeg = hub.phaseDeg ?? null
    if (phaseDeg === null) return []
    // An angle of zero on a gear nobody times is the file's way of saying that it does not matter.
    if (hub.role !== 'cam' && phaseDeg === 0 && !timing) return []
    const extent = hubExtent(document, hub)
    const off = timing ? Math.abs(angleBetween(timing.phaseDeg, phaseDeg)) : 0
    return [
      {
        hubId: hub.id,
        name: hub.name,
        isCam: hub.role === 'cam',
        phaseDeg,
        requiredDeg: timing?.phaseDeg ?? null,
        toleranceDeg: timing?.toleranceDeg ?? 0,
        boreRadiusMm: extent.innerRadiusMm,
        outerRadiusMm: extent.outerRadiusMm,
        isOff: timing !== undefined && off > timing.toleranceDeg + ANGLE_DUST_DEG,
      },
    ]
  })
}

export function forceMarks(document: LayoutDocument, loadCaseId: string | null): ForceMark[] {
  const loadCase = document.loadCases.find(({ id }) => id === loadCaseId)
  return (loadCase?.loads ?? []).flatMap((load) => {
    const hub = document.hubs.find(({ id }) => id === load.hub)
    const forceN = Math.hypot(load.forceYN, load.forceZN)
    if (!hub || forceN === 0) return []
    return [
      {
        hubId: hub.id,
        name: hub.name,
        angleDeg: forceAngleDeg(load.forceYN, load.forceZN),
        forceN,
        outerRadiusMm: hubExtent(document, hub).outerRadiusMm,
      },
    ]
  })
}

/**
 * A cam: base circle and nose, joined by tangents. The document knows bore and outside only, so the
 * base circle is drawn between them: the shape shows the angle, not the lift.
 * @returns an SVG path about the origin, in the unit of the radii
 */
export function lobePath(
  boreRadius: number,
  outerRadius: number,
  angleDeg: number,
  from: ViewedFrom,
): string {
  const base = Math.max(outerRadius * 0.6, boreRadius + (outerRadius - boreRadius) * 0.2)
  const nose = Math.min(outerRadius * 0.22, base * 0.9)
  const centre = outerRadius - nose
  // Half the angle between the two tangent points, seen from the cam's axis.
  const tangent = (Math.acos((base - nose) / centre) * 180) / Math.PI
  const at = (radius: number, degrees: number, along: number) => {
    const axis = direction(angleDeg, from)
    const turned = direction(angleDeg + degrees, from)
    return `${(axis.x * along + turned.x * radius).toFixed(3)} ${(axis.y * along + turned.y * radius).toFixed(3)}`
  }
  const sweepBase = from === 'left' ? 1 : 0
  return [
    `M${at(base, tangent, 0)}`,
    `A${base.toFixed(3)} ${base.toFixed(3)} 0 1 ${sweepBase} ${at(base, -tangent, 0)}`,
    `L${at(nose, -tangent, centre)}`,
    `A${nose.toFixed(3)} ${nose.toFixed(3)} 0 0 ${sweepBase} ${at(nose, tangent, centre)}`,
    'Z',
  ].join('')
}

/**
 * How far out each angle's words stand, so that neighbours on the circle do not cover each other.
 * @returns a row from 0 outward for each angle, in the order given
 */
export function labelRows(anglesDeg: readonly number[], clearanceDeg: number): number[] {
  const placed: { angle: number; row: number }[] = []
  return anglesDeg.map((angle) => {
    let row = 0
    const collides = () =>
      placed.some((other) => other.row === row && Math.abs(angleBetween(other.angle, angle)) < clearanceDeg)
    while (row < 3 && collides()) row += 1
    placed.push({ angle, row })
    return row
  })
}
