/** A part as tools and drawing see it: which one, where it lies along the shaft, how far it reaches out. */
import type { Bearing, Hub, LayoutDocument } from '@shared/layout/layout-document'
import { seatUnder, sectionAt, type SectionSpan, sectionSpans } from '@shared/layout/shaft-geometry'

export type PartKind = 'section' | 'hub' | 'bearing'

export interface PartRef {
  kind: PartKind
  id: string
}

export interface PartExtent {
  kind: PartKind
  id: string
  leftMm: number
  rightMm: number
  innerRadiusMm: number
  outerRadiusMm: number
}

/** Millimetres are stored to a tenth of a micrometre; sums of decimals must not show their dust. */
export const roundMm = (valueMm: number) => Math.round(valueMm * 1e4) / 1e4

/** The diameter a part bores over when it states none: the shaft under its middle, or the nearest end. */
function shaftRadiusMm(document: LayoutDocument, stationMm: number): number {
  const sections = document.shaft.sections
  const under = sectionAt(document, stationMm)?.section ?? sections[stationMm < 0 ? 0 : sections.length - 1]
  return under ? under.outerDiameterMm / 2 : 10
}

export function hubExtent(document: LayoutDocument, hub: Hub): PartExtent {
  const middleMm = hub.stationMm + hub.lengthMm / 2
  const seat = hub.boreDiameterMm == null ? seatUnder(document, hub) : null
  const bore =
    (hub.boreDiameterMm ?? seat?.span.section.outerDiameterMm ?? 2 * shaftRadiusMm(document, middleMm)) / 2
  return {
    kind: 'hub',
    id: hub.id,
    leftMm: hub.stationMm,
    rightMm: roundMm(hub.stationMm + hub.lengthMm),
    innerRadiusMm: bore,
    outerRadiusMm: Math.max(hub.outerDiameterMm / 2, bore),
  }
}

/** A rolling bearing's section is near to a square on the shaft; its real outside is not in the document. */
export function bearingExtent(document: LayoutDocument, bearing: Bearing): PartExtent {
  const bore =
    bearing.boreDiameterMm == null ? shaftRadiusMm(document, bearing.stationMm) : bearing.boreDiameterMm / 2
  return {
    kind: 'bearing',
    id: bearing.id,
    leftMm: roundMm(bearing.stationMm - bearing.widthMm / 2),
    rightMm: roundMm(bearing.stationMm + bearing.widthMm / 2),
    innerRadiusMm: bore,
    outerRadiusMm: bore + Math.min(bearing.widthMm, bore * 0.9),
  }
}

const sectionExtent = ({ section, startMm, endMm }: SectionSpan): PartExtent => ({
  kind: 'section',
  id: section.id,
  leftMm: roundMm(startMm),
  rightMm: roundMm(endMm),
  innerRadiusMm: section.boreDiameterMm / 2,
  outerRadiusMm: section.outerDiameterMm / 2,
})

/** Every part, in drawing order: what is drawn later lies on top. */
export function partExtents(document: LayoutDocument): PartExtent[] {
  return [
    ...sectionSpans(document).map(sectionExtent),
    ...document.bearings.map((bearing) => bearingExtent(document, bearing)),
    ...document.hubs.map((hub) => hubExtent(document, hub)),
  ]
}

export function partExtent(document: LayoutDocument, id: string): PartExtent | null {
  const hub = document.hubs.find((candidate) => candidate.id === id)
  if (hub) return hubExtent(document, hub)
  const bearing = document.bearings.find((candidate) => candidate.id === id)
  if (bearing) return bearingExtent(document, bearing)
  const span = sectionSpans(document).find(({ section }) => section.id === id)
  return span ? sectionExtent(span) : null
}

export function partKind(document: LayoutDocument, id: string): PartKind | null {
  if (document.hubs.some((hub) => hub.id === id)) return 'hub'
  if (document.bearings.some((bearing) => bearing.id === id)) return 'bearing'
  return document.shaft.sections.some((section) => section.id === id) ? 'section' : null
}

/** What a person calls the part. Sections have no name, so they are counted from the left. */
export function partName(document: LayoutDocument, id: string): string {
  const hub = document.hubs.find((candidate) => candidate.id === id)
  if (hub) return hub.name
  const bearing = document.bearings.find((candidate) => candidate.id === id)
  if (bearing) return `Bearing ${bearing.name}`
  const index = document.shaft.sections.findIndex((section) => section.id === id)
  return index < 0 ? id : `Section ${index + 1}`
}
