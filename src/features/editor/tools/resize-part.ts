/** Edits that move one face of a part: its left or right face, or its outside. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation, Target } from '@shared/layout/operations'
import { sectionSpans } from '@shared/layout/shaft-geometry'
import { followStepOperations } from './move-parts'
import { type PartRef, partExtent, roundMm } from './part'

export type PartFace = 'left' | 'right' | 'outside'

/** Nothing shrinks away under the pointer; the exact value can still be typed. */
export const MIN_LENGTH_MM = 0.5
const MIN_WALL_MM = 0.5

const set = (target: Target, field: string, before: number, value: number): Operation[] =>
  before === value ? [] : [{ type: 'set', target, field, before, value }]

/**
 * Moves the left or right face of a hub or bearing to a station; the other face stays. For a
 * section see `moveStepOperations`.
 */
function moveFaceOperations(
  document: LayoutDocument,
  part: PartRef,
  face: 'left' | 'right',
  stationMm: number,
): Operation[] {
  const extent = partExtent(document, part.id)
  if (!extent) return []
  const leftMm = face === 'left' ? Math.min(stationMm, extent.rightMm - MIN_LENGTH_MM) : extent.leftMm
  const rightMm = face === 'right' ? Math.max(stationMm, extent.leftMm + MIN_LENGTH_MM) : extent.rightMm
  if (part.kind === 'hub') {
    const hub = document.hubs.find((candidate) => candidate.id === part.id)
    if (!hub) return []
    const target = { kind: 'hub' as const, id: hub.id }
    return [
      ...set(target, 'stationMm', hub.stationMm, roundMm(leftMm)),
      ...set(target, 'lengthMm', hub.lengthMm, roundMm(rightMm - leftMm)),
    ]
  }
  const bearing = document.bearings.find((candidate) => candidate.id === part.id)
  if (!bearing) return []
  const target = { kind: 'bearing' as const, id: bearing.id }
  return [
    ...set(target, 'stationMm', bearing.stationMm, roundMm((leftMm + rightMm) / 2)),
    ...set(target, 'widthMm', bearing.widthMm, roundMm(rightMm - leftMm)),
  ]
}

/**
 * Moves the right face of a section. Alone, only this step moves: the next section gives or takes
 * the length and every part keeps its place. With `followsAlong` the shaft gets longer or shorter
 * and all that lies right of the step goes along.
 */
export function moveStepOperations(
  document: LayoutDocument,
  sectionId: string,
  stationMm: number,
  followsAlong: boolean,
): Operation[] {
  const spans = sectionSpans(document)
  const index = spans.findIndex(({ section }) => section.id === sectionId)
  const span = spans[index]
  if (!span) return []
  const next = spans[index + 1]
  const least = span.startMm + MIN_LENGTH_MM
  const most = next && !followsAlong ? next.endMm - MIN_LENGTH_MM : Infinity
  const stepMm = Math.min(Math.max(stationMm, least), most)
  const deltaMm = roundMm(stepMm - span.endMm)
  if (deltaMm === 0) return []
  const target = { kind: 'section' as const, id: sectionId }
  const own = set(target, 'lengthMm', span.section.lengthMm, roundMm(span.section.lengthMm + deltaMm))
  if (followsAlong) return [...own, ...followStepOperations(document, span.endMm, deltaMm)]
  if (!next) return own
  const nextTarget = { kind: 'section' as const, id: next.section.id }
  return [
    ...own,
    ...set(nextTarget, 'lengthMm', next.section.lengthMm, roundMm(next.section.lengthMm - deltaMm)),
  ]
}

/** Sets the outer diameter. A bearing's outside is not ours to change. */
function moveOutsideOperations(document: LayoutDocument, part: PartRef, radiusMm: number): Operation[] {
  const extent = partExtent(document, part.id)
  if (!extent || part.kind === 'bearing') return []
  const diameterMm = roundMm(2 * Math.max(radiusMm, extent.innerRadiusMm + MIN_WALL_MM))
  if (part.kind === 'hub') {
    const hub = document.hubs.find((candidate) => candidate.id === part.id)
    return hub ? set({ kind: 'hub', id: hub.id }, 'outerDiameterMm', hub.outerDiameterMm, diameterMm) : []
  }
  const section = document.shaft.sections.find((candidate) => candidate.id === part.id)
  return section
    ? set({ kind: 'section', id: section.id }, 'outerDiameterMm', section.outerDiameterMm, diameterMm)
    : []
}

/** A section's left face is the right face of the section before it; the first one is the datum. */
export function stepOwner(document: LayoutDocument, sectionId: string, face: PartFace): string | null {
  if (face !== 'left') return sectionId
  const index = document.shaft.sections.findIndex((section) => section.id === sectionId)
  return document.shaft.sections[index - 1]?.id ?? null
}

/** `value` is a station for the left and right face, a radius for the outside. */
export function resizeOperations(
  document: LayoutDocument,
  part: PartRef,
  face: PartFace,
  valueMm: number,
  followsAlong: boolean,
): Operation[] {
  if (face === 'outside') return moveOutsideOperations(document, part, valueMm)
  if (part.kind !== 'section') return moveFaceOperations(document, part, face, valueMm)
  const owner = stepOwner(document, part.id, face)
  return owner === null ? [] : moveStepOperations(document, owner, valueMm, followsAlong)
}
