/**
 * The shaft in half section as plain shapes in millimetres: x from the left datum, radii from the
 * axis. Pure, so that the printed sheet draws from stored documents what the screen showed. Above
 * the axis hubs and bored shafts are cut; a solid shaft is not cut lengthwise (drawing practice of
 * ISO 128, from memory).
 */
import type { Hub, LayoutDocument } from '../layout/layout-document'
import { seatUnder, sectionSpans, totalLengthMm } from '../layout/shaft-geometry'

export interface Point {
  x: number
  y: number
}

export interface DrawnSection {
  id: string
  fromMm: number
  toMm: number
  outerRadiusMm: number
  boreRadiusMm: number
}

export interface DrawnHub {
  id: string
  name: string
  /** 1-based, in the order of the document: the item number on drawing and schedule. */
  item: number
  fromMm: number
  toMm: number
  boreRadiusMm: number
  outerRadiusMm: number
  /** The cut half above the axis, bore chamfers included. */
  cut: Point[]
  /** Two touching hubs get opposite hatching, as adjacent parts do on drawings. */
  hatch: 'rising' | 'falling'
}

export interface DrawnBearing {
  id: string
  name: string
  kind: 'locating' | 'floating'
  fromMm: number
  toMm: number
  boreRadiusMm: number
  outerRadiusMm: number
}

export interface HalfSection {
  lengthMm: number
  fromMm: number
  toMm: number
  largestRadiusMm: number
  sections: DrawnSection[]
  /** Upper outline of the shaft from the left axis point to the right one, fillets included. */
  outline: Point[]
  isBored: boolean
  hubs: DrawnHub[]
  bearings: DrawnBearing[]
}

const FILLET_STEPS = 6
/** A bearing's outside is not part of the layout; it is drawn this much larger than its bore. */
const BEARING_RADIUS_FACTOR = 1.6

export function halfSection(document: LayoutDocument): HalfSection {
  const spans = sectionSpans(document)
  const lengthMm = totalLengthMm(document)
  const sections = spans.map(({ section, startMm, endMm }) => ({
    id: section.id,
    fromMm: startMm,
    toMm: endMm,
    outerRadiusMm: section.outerDiameterMm / 2,
    boreRadiusMm: Math.min(section.boreDiameterMm, section.outerDiameterMm) / 2,
  }))
  const hubs = drawnHubs(document)
  const bearings = document.bearings.map((bearing) => {
    const seat = seatUnder(document, {
      stationMm: bearing.stationMm - bearing.widthMm / 2,
      lengthMm: bearing.widthMm,
    })
    const boreRadiusMm = (bearing.boreDiameterMm ?? seat?.span.section.outerDiameterMm ?? 0) / 2
    return {
      id: bearing.id,
      name: bearing.name,
      kind: bearing.kind,
      fromMm: bearing.stationMm - bearing.widthMm / 2,
      toMm: bearing.stationMm + bearing.widthMm / 2,
      boreRadiusMm,
      outerRadiusMm: Math.max(boreRadiusMm * BEARING_RADIUS_FACTOR, boreRadiusMm + bearing.widthMm * 0.4),
    }
  })
  const parts = [...hubs, ...bearings]
  return {
    lengthMm,
    fromMm: Math.min(0, ...parts.map((part) => part.fromMm)),
    toMm: Math.max(lengthMm, ...parts.map((part) => part.toMm)),
    largestRadiusMm: Math.max(
      0,
      ...sections.map((section) => section.outerRadiusMm),
      ...parts.map((part) => part.outerRadiusMm),
    ),
    sections,
    outline: shaftOutline(document),
    isBored: sections.some((section) => section.boreRadiusMm > 0),
    hubs,
    bearings,
  }
}

function drawnHubs(document: LayoutDocument): DrawnHub[] {
  const hubs = document.hubs.map((hub, index) => drawnHub(document, hub, index + 1))
  const byStation = [...hubs].sort((a, b) => a.fromMm - b.fromMm)
  byStation.forEach((hub, index) => {
    const left = byStation[index - 1]
    if (left && hub.fromMm - left.toMm < 0.5) hub.hatch = left.hatch === 'rising' ? 'falling' : 'rising'
  })
  return hubs
}

function drawnHub(document: LayoutDocument, hub: Hub, item: number): DrawnHub {
  const fromMm = hub.stationMm
  const toMm = hub.stationMm + hub.lengthMm
  const seatDiameterMm = seatUnder(document, hub)?.span.section.outerDiameterMm ?? 0
  const boreRadiusMm = (hub.boreDiameterMm ?? seatDiameterMm) / 2
  const outerRadiusMm = Math.max(hub.outerDiameterMm / 2, boreRadiusMm)
  const wallMm = outerRadiusMm - boreRadiusMm
  const left = Math.min(hub.chamferLeftMm, wallMm, hub.lengthMm / 2)
  const right = Math.min(hub.chamferRightMm, wallMm, hub.lengthMm / 2)
  return {
    id: hub.id,
    name: hub.name,
    item,
    fromMm,
    toMm,
    boreRadiusMm,
    outerRadiusMm,
    cut: [
      { x: fromMm, y: boreRadiusMm + left },
      { x: fromMm + left, y: boreRadiusMm },
      { x: toMm - right, y: boreRadiusMm },
      { x: toMm, y: boreRadiusMm + right },
      { x: toMm, y: outerRadiusMm },
      { x: fromMm, y: outerRadiusMm },
    ],
    hatch: 'rising',
  }
}

function shaftOutline(document: LayoutDocument): Point[] {
  const spans = sectionSpans(document)
  const points: Point[] = []
  spans.forEach(({ section, startMm, endMm }, index) => {
    const radius = section.outerDiameterMm / 2
    const previous = spans[index - 1]?.section
    const next = spans[index + 1]?.section
    if (!previous) points.push({ x: startMm, y: 0 })
    const leftStep = previous ? previous.outerDiameterMm / 2 - radius : 0
    const rightStep = next ? next.outerDiameterMm / 2 - radius : 0
    const room = section.lengthMm / 2
    // The fillet belongs to the thinner side of the step it stands in.
    const leftFillet = leftStep > 0 ? Math.min(previous?.rightFilletMm ?? 0, leftStep, room) : 0
    const rightFillet = rightStep > 0 ? Math.min(section.rightFilletMm ?? 0, rightStep, room) : 0
    points.push(
      ...(leftFillet > 0
        ? arc({ x: startMm + leftFillet, y: radius + leftFillet }, leftFillet, Math.PI, 1.5 * Math.PI)
        : [{ x: startMm, y: radius }]),
      ...(rightFillet > 0
        ? arc({ x: endMm - rightFillet, y: radius + rightFillet }, rightFillet, 1.5 * Math.PI, 2 * Math.PI)
        : [{ x: endMm, y: radius }]),
    )
    if (!next) points.push({ x: endMm, y: 0 })
  })
  return points
}

function arc(centre: Point, radius: number, from: number, to: number): Point[] {
  return Array.from({ length: FILLET_STEPS + 1 }, (_, step) => {
    const angle = from + ((to - from) * step) / FILLET_STEPS
    return { x: centre.x + radius * Math.cos(angle), y: centre.y + radius * Math.sin(angle) }
  })
}
