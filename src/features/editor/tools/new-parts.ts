/** What a part placed with a tool starts as: values a designer would expect and then changes. */
import type { Bearing, Hub, LayoutDocument, Load } from '@shared/layout/layout-document'
import { seatUnder, sectionAt, totalLengthMm } from '@shared/layout/shaft-geometry'
import { roundMm } from './part'

const ROLE_NAMES: Record<Hub['role'], string> = {
  gear: 'Gear',
  cam: 'Cam',
  pulley: 'Pulley',
  disc: 'Disc',
  ring: 'Ring',
  other: 'Hub',
}

/** "Gear 2" when there is a "Gear 1": the next number that is free. */
export function freeName(word: string, taken: readonly string[]): string {
  let number = 1
  while (taken.includes(`${word} ${number}`)) number += 1
  return `${word} ${number}`
}

/** Letters for bearings, as on a drawing: A, B, C … then "Bearing 27". */
function freeBearingName(taken: readonly string[]): string {
  const letter = [...'ABCDEFGHIJKLMNOPQRSTUVWXYZ'].find((candidate) => !taken.includes(candidate))
  return letter ?? freeName('Bearing', taken)
}

const DEFAULT_SEAT_MM = 50
export const DEFAULT_HUB_LENGTH_MM = 40

export const seatDiameterAt = (document: LayoutDocument, stationMm: number): number =>
  sectionAt(document, stationMm)?.section.outerDiameterMm ?? DEFAULT_SEAT_MM

/** A wall of about 0.4 of the seat is common practice for a first try; rounded to whole 5 mm. */
export const firstOuterDiameterMm = (seatDiameterMm: number) => Math.ceil((seatDiameterMm * 1.8) / 5) * 5

export function newHub(
  document: LayoutDocument,
  place: { id: string; role: Hub['role']; leftMm: number; lengthMm: number },
): Hub {
  const hub = { stationMm: roundMm(place.leftMm), lengthMm: roundMm(place.lengthMm) }
  const seatMm = seatUnder(document, hub)?.span.section.outerDiameterMm ?? DEFAULT_SEAT_MM
  const middleMm = hub.stationMm + hub.lengthMm / 2
  return {
    id: place.id,
    name: freeName(
      ROLE_NAMES[place.role],
      document.hubs.map(({ name }) => name),
    ),
    role: place.role,
    ...hub,
    chamferLeftMm: 1,
    chamferRightMm: 1,
    outerDiameterMm: firstOuterDiameterMm(seatMm),
    material: document.hubs.at(-1)?.material ?? 'C45-N',
    roughnessRzUm: 6.3,
    fit: { kind: 'iso286', hole: 'H7', shaft: 's6' },
    friction: { circumferential: 0.14, axial: 0.14, pressing: 0.12 },
    joining: {
      method: 'heat-hub',
      side: middleMm < totalLengthMm(document) / 2 ? 'left' : 'right',
      ambientC: 20,
      clearanceUm: Math.round(seatMm),
      handlingAllowanceK: 20,
    },
    ...(place.role === 'cam' ? { phaseDeg: 0 } : {}),
  }
}

/** Width of a medium-series bearing on this seat, near enough for a first sketch. */
export const firstBearingWidthMm = (seatDiameterMm: number) => Math.max(5, Math.round(seatDiameterMm * 0.4))

export function newBearing(document: LayoutDocument, id: string, stationMm: number): Bearing {
  const hasLocating = document.bearings.some(({ kind }) => kind === 'locating')
  return {
    id,
    name: freeBearingName(document.bearings.map(({ name }) => name)),
    stationMm: roundMm(stationMm),
    widthMm: firstBearingWidthMm(seatDiameterAt(document, stationMm)),
    kind: hasLocating ? 'floating' : 'locating',
    housing: 'ring',
    side: stationMm < totalLengthMm(document) / 2 ? 'left' : 'right',
  }
}

export const newLoad = (place: { id: string; hub: string; stationMm: number; forceYN: number }): Load => ({
  id: place.id,
  hub: place.hub,
  stationMm: roundMm(place.stationMm),
  torqueNm: 0,
  forceYN: place.forceYN,
  forceZN: 0,
  axialN: 0,
  momentYNm: 0,
  momentZNm: 0,
})
