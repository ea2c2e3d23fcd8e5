/** The face a hub is said to be pushed against, and whether something stands there. */
import { facesTouch, hasShoulder } from '../engineering/assembly/neighbours'
import { mm } from '../engineering/quantities/units'
import type { Hub, LayoutDocument } from '../layout/layout-document'
import { seatUnder, shoulders } from '../layout/shaft-geometry'
import type { Finding } from './layout-results'
import { capitalised, millimetreText } from './wording'

export function abutmentFindings(document: LayoutDocument, hub: Hub): Finding[] {
  const stationMm = hub.abutmentStationMm
  if (stationMm === null || stationMm === undefined) return []
  if (hasAbutment(document, hub, stationMm)) return []
  const faceMm = pushedFaceMm(hub)
  const isAtFace = facesTouch(mm(stationMm), mm(faceMm))
  return [
    {
      code: 'abutment-missing',
      severity: 'fails',
      part: hub.id,
      loadCase: null,
      value: stationMm,
      limit: null,
      unit: 'mm',
      message: isAtFace
        ? `${capitalised(hub.name)} has no shoulder at ${millimetreText(stationMm)} to be pushed against from the ${hub.joining.side}.`
        : `${capitalised(hub.name)} is said to be pushed against ${millimetreText(stationMm)}, but its face is at ${millimetreText(faceMm)}.`,
      remedy: isAtFace
        ? 'Give the shaft a step there that is larger than the bore, or use a spacer and clear the abutment.'
        : `Move the hub to the shoulder, or set the abutment to ${millimetreText(faceMm)}.`,
      stationMm,
    },
  ]
}

/** A part from the left is pushed with its right face, and the other way round. */
const pushedFaceMm = (hub: Hub) =>
  hub.joining.side === 'left' ? hub.stationMm + hub.lengthMm : hub.stationMm

/** A shoulder of the shaft, or the face of another part, where the hub is pushed. */
export function hasAbutment(document: LayoutDocument, hub: Hub, stationMm: number): boolean {
  const station = mm(stationMm)
  if (!facesTouch(station, mm(pushedFaceMm(hub)))) return false
  const steps = shoulders(document).map((shoulder) => ({
    station: mm(shoulder.stationMm),
    leftDiameter: mm(shoulder.leftDiameterMm),
    rightDiameter: mm(shoulder.rightDiameterMm),
  }))
  const underMm = document.shaft.sections.length > 0 ? boreOf(document, hub) : null
  if (underMm === null) return false
  if (hasShoulder(station, mm(underMm), hub.joining.side, steps)) return true
  const otherFaces = [
    ...document.hubs
      .filter((other) => other.id !== hub.id)
      .map((other) => (hub.joining.side === 'left' ? other.stationMm : other.stationMm + other.lengthMm)),
    ...document.bearings
      .filter((bearing) => bearing.housing === 'ring')
      .map((bearing) => bearing.stationMm + (hub.joining.side === 'left' ? -1 : 1) * (bearing.widthMm / 2)),
  ]
  return otherFaces.some((face) => facesTouch(station, mm(face)))
}

function boreOf(document: LayoutDocument, hub: Hub): number | null {
  return hub.boreDiameterMm ?? seatUnder(document, hub)?.span.section.outerDiameterMm ?? null
}
