/** Where things are along the shaft. Stations in mm from the left datum face, x to the right. */
import type { Hub, LayoutDocument, ShaftSection } from './layout-document'

export interface SectionSpan {
  section: ShaftSection
  startMm: number
  endMm: number
}

/** A face where the outer diameter changes; a hub can be pushed against the larger side. */
export interface Shoulder {
  stationMm: number
  leftDiameterMm: number
  rightDiameterMm: number
}

/** Sums of section lengths carry rounding errors; nobody makes a face to a nanometre. */
const FACE_TOLERANCE_MM = 1e-6

/** Sections in order with their start and end stations. */
export function sectionSpans(document: LayoutDocument): SectionSpan[] {
  let startMm = 0
  return document.shaft.sections.map((section) => {
    const span = { section, startMm, endMm: startMm + section.lengthMm }
    startMm = span.endMm
    return span
  })
}

export function totalLengthMm(document: LayoutDocument): number {
  return document.shaft.sections.reduce((sum, section) => sum + section.lengthMm, 0)
}

/**
 * The section at a station. At a step the section to the right answers, except at the right end
 * of the shaft; null beyond the ends.
 */
export function sectionAt(document: LayoutDocument, stationMm: number): SectionSpan | null {
  const spans = sectionSpans(document)
  const found = spans.find((span) => stationMm >= span.startMm && stationMm < span.endMm)
  if (found) return found
  const last = spans.at(-1)
  return last && stationMm >= last.endMm && stationMm - last.endMm < FACE_TOLERANCE_MM ? last : null
}

export interface Seat {
  span: SectionSpan
  /** Stretch of shaft that is really under the hub. */
  startMm: number
  endMm: number
  /** False when the hub reaches over a step or an end. */
  isWholeHub: boolean
}

/** The section that carries the hub: the one under most of it, the left one when two share evenly. */
export function seatUnder(document: LayoutDocument, hub: Pick<Hub, 'stationMm' | 'lengthMm'>): Seat | null {
  const hubEndMm = hub.stationMm + hub.lengthMm
  let best: Seat | null = null
  for (const span of sectionSpans(document)) {
    const startMm = Math.max(span.startMm, hub.stationMm)
    const endMm = Math.min(span.endMm, hubEndMm)
    if (endMm - startMm < FACE_TOLERANCE_MM) continue
    if (best && endMm - startMm <= best.endMm - best.startMm + FACE_TOLERANCE_MM) continue
    const isWholeHub = hub.lengthMm - (endMm - startMm) < FACE_TOLERANCE_MM
    best = { span, startMm, endMm, isWholeHub }
  }
  return best
}

/** Faces between sections of different outer diameter, left to right, without the two end faces. */
export function shoulders(document: LayoutDocument): Shoulder[] {
  const spans = sectionSpans(document)
  return spans.slice(1).flatMap((span, position) => {
    const left = spans[position]
    if (!left || left.section.outerDiameterMm === span.section.outerDiameterMm) return []
    return [
      {
        stationMm: span.startMm,
        leftDiameterMm: left.section.outerDiameterMm,
        rightDiameterMm: span.section.outerDiameterMm,
      },
    ]
  })
}

export function shoulderStations(document: LayoutDocument): number[] {
  return shoulders(document).map((shoulder) => shoulder.stationMm)
}

/** Faces a part may snap to: both ends of the shaft, every shoulder, both faces of hubs and bearings. */
export function faceStations(document: LayoutDocument, exceptPartId: string | null = null): number[] {
  const stations = new Set<number>([0, totalLengthMm(document), ...shoulderStations(document)])
  for (const hub of document.hubs) {
    if (hub.id === exceptPartId) continue
    stations.add(hub.stationMm)
    stations.add(hub.stationMm + hub.lengthMm)
  }
  for (const bearing of document.bearings) {
    if (bearing.id === exceptPartId) continue
    stations.add(bearing.stationMm - bearing.widthMm / 2)
    stations.add(bearing.stationMm + bearing.widthMm / 2)
  }
  return [...stations].sort((left, right) => left - right)
}
