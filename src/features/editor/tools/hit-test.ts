/**
 * What lies under the pointer, worked out from the document. Konva draws without its own hit
 * drawing: this is cheaper with many parts, can be generous to fingers, and needs no canvas in tests.
 */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { type LoadMark, loadMarks } from './load-marks'
import { type PartExtent, partExtent, partExtents } from './part'
import { type PartFace, stepOwner } from './resize-part'
import type { HitTarget } from './tool'

export interface HitQuery {
  document: LayoutDocument
  stationMm: number
  heightMm: number
  mmPerPx: number
  selectedIds: readonly string[]
  loadCaseId: string | null
  canEdit: boolean
  isTouch: boolean
}

const HANDLE_RADIUS_PX = 9
const TOUCH_RADIUS_PX = 20
const OUTSIDE_DEPTH_PX = 3

export interface HandlePlace {
  face: PartFace
  stationMm: number
  heightMm: number
}

/** Handles stand where the picture has them: the faces on the centre line, the outside at the top. */
export function handlePlaces(document: LayoutDocument, extent: PartExtent): HandlePlace[] {
  const middleMm = (extent.leftMm + extent.rightMm) / 2
  const places: HandlePlace[] = []
  const isDatum = extent.kind === 'section' && stepOwner(document, extent.id, 'left') === null
  if (!isDatum) places.push({ face: 'left', stationMm: extent.leftMm, heightMm: 0 })
  places.push({ face: 'right', stationMm: extent.rightMm, heightMm: 0 })
  if (extent.kind !== 'bearing') {
    places.push({ face: 'outside', stationMm: middleMm, heightMm: extent.outerRadiusMm })
  }
  return places
}

function handleUnder(query: HitQuery): HitTarget | null {
  const [onlyId] = query.selectedIds
  if (!query.canEdit || query.selectedIds.length !== 1 || onlyId === undefined) return null
  const extent = partExtent(query.document, onlyId)
  if (!extent) return null
  const reachMm = (query.isTouch ? TOUCH_RADIUS_PX : HANDLE_RADIUS_PX) * query.mmPerPx
  const distanceMm = ({ stationMm, heightMm }: HandlePlace) =>
    Math.hypot(stationMm - query.stationMm, heightMm - query.heightMm)
  // The outside is taken from outside: within the part a finger means the part itself.
  const isReachable = ({ face, heightMm }: HandlePlace) =>
    face !== 'outside' || query.heightMm >= heightMm - OUTSIDE_DEPTH_PX * query.mmPerPx
  const nearest = handlePlaces(query.document, extent)
    .filter((place) => distanceMm(place) <= reachMm && isReachable(place))
    .sort((a, b) => distanceMm(a) - distanceMm(b))[0]
  return nearest ? { kind: 'handle', part: { kind: extent.kind, id: extent.id }, face: nearest.face } : null
}

function isOnLoad(mark: LoadMark, query: HitQuery): boolean {
  const reachMm = (query.isTouch ? TOUCH_RADIUS_PX : HANDLE_RADIUS_PX) * query.mmPerPx
  const lengthMm = Math.max(18, Math.abs(mark.forceYPx)) * query.mmPerPx
  const belowMm = -query.heightMm - mark.radiusMm
  return Math.abs(query.stationMm - mark.stationMm) <= reachMm && belowMm >= 0 && belowMm <= lengthMm
}

function isOn(extent: PartExtent, query: HitQuery): boolean {
  const heightMm = Math.abs(query.heightMm)
  // A whole section is solid to the touch even when it is hollow: there is nothing else inside it.
  const innerMm = extent.kind === 'section' ? 0 : extent.innerRadiusMm
  return (
    query.stationMm >= extent.leftMm &&
    query.stationMm <= extent.rightMm &&
    heightMm >= innerMm &&
    heightMm <= extent.outerRadiusMm
  )
}

export function hitTest(query: HitQuery): HitTarget | null {
  const handle = handleUnder(query)
  if (handle) return handle
  const load = loadMarks(query.document, query.loadCaseId).find((mark) => isOnLoad(mark, query))
  if (load) return { kind: 'load', loadCaseId: load.loadCaseId, loadId: load.loadId, hubId: load.hubId }
  const part = partExtents(query.document)
    .filter((extent) => isOn(extent, query))
    .at(-1)
  return part ? { kind: 'part', part: { kind: part.kind, id: part.id } } : null
}
