/** Findings of place: overhangs, steps under a hub, collisions and gaps. */
import { facesTouch, neighbourGaps, type Extent } from '../engineering/assembly/neighbours'
import { mm, toMm } from '../engineering/quantities/units'
import type { LayoutDocument } from '../layout/layout-document'
import { seatUnder, type SectionSpan } from '../layout/shaft-geometry'
import type { Finding } from './layout-results'
import { BORE_TOLERANCE_MM } from './seat'
import { capitalised, inSentence, millimetreText } from './wording'

interface PlacedPart {
  id: string
  name: string
  startMm: number
  endMm: number
  boreMm: number | null
  /** Split bearings do not slide on: a step under them is what the drawing wants. */
  isRing: boolean
}

export function geometryFindings(document: LayoutDocument, spans: readonly SectionSpan[]): Finding[] {
  const parts = placedParts(document)
  const lengthMm = spans.at(-1)?.endMm ?? 0
  return [
    ...parts.flatMap((part) => overhangFindings(part, lengthMm)),
    ...parts.filter((part) => part.isRing).flatMap((part) => stepFindings(part, spans)),
    ...neighbourFindings(document, parts),
  ]
}

function placedParts(document: LayoutDocument): PlacedPart[] {
  const sectionDiameter = (stationMm: number, lengthMm: number) =>
    seatUnder(document, { stationMm, lengthMm })?.span.section.outerDiameterMm ?? null
  const hubs = document.hubs.map((hub) => ({
    id: hub.id,
    name: hub.name,
    startMm: hub.stationMm,
    endMm: hub.stationMm + hub.lengthMm,
    boreMm: hub.boreDiameterMm ?? sectionDiameter(hub.stationMm, hub.lengthMm),
    isRing: true,
  }))
  const bearings = document.bearings.map((bearing) => {
    const startMm = bearing.stationMm - bearing.widthMm / 2
    return {
      id: bearing.id,
      name: `bearing ${bearing.name}`,
      startMm,
      endMm: startMm + bearing.widthMm,
      boreMm: bearing.boreDiameterMm ?? sectionDiameter(startMm, bearing.widthMm),
      isRing: bearing.housing === 'ring',
    }
  })
  return [...hubs, ...bearings]
}

const base = (part: PlacedPart) => ({ part: part.id, loadCase: null, unit: 'mm', stationMm: part.startMm })

/** A hub wholly off the shaft is reported with its missing numbers; a bearing has none and is reported here. */
function overhangFindings(part: PlacedPart, lengthMm: number): Finding[] {
  const overhangMm = Math.max(-part.startMm, part.endMm - lengthMm)
  const isOff = part.endMm <= 0 || part.startMm >= lengthMm
  if (overhangMm <= 1e-6 || (isOff && !part.name.startsWith('bearing '))) return []
  return [
    {
      ...base(part),
      code: 'no-seat',
      severity: isOff ? 'fails' : 'warns',
      value: overhangMm,
      limit: 0,
      message: isOff
        ? `${capitalised(part.name)} stands beside the shaft and carries nothing.`
        : `${capitalised(part.name)} hangs ${millimetreText(overhangMm)} over the end of the shaft; only what lies on it counts.`,
      remedy: 'Move it onto the shaft or make the shaft longer.',
    },
  ]
}

function stepFindings(part: PlacedPart, spans: readonly SectionSpan[]): Finding[] {
  const { boreMm } = part
  if (boreMm === null) return []
  return spans.flatMap(({ section, startMm, endMm }) => {
    const overlapMm = Math.min(endMm, part.endMm) - Math.max(startMm, part.startMm)
    if (overlapMm <= 1e-6) return []
    const differenceMm = section.outerDiameterMm - boreMm
    const isOwnSeat = overlapMm >= (part.endMm - part.startMm) / 2
    if (Math.abs(differenceMm) <= BORE_TOLERANCE_MM || isOwnSeat) return []
    const size = millimetreText(section.outerDiameterMm)
    return [
      differenceMm > 0
        ? {
            ...base(part),
            code: 'overlap' as const,
            severity: 'fails' as const,
            value: overlapMm,
            limit: 0,
            message: `${capitalised(part.name)} runs ${millimetreText(overlapMm)} into the ${size} section beside its seat.`,
            remedy: `Move it by ${millimetreText(overlapMm)} or make it shorter.`,
          }
        : {
            ...base(part),
            code: 'seat-step' as const,
            severity: 'warns' as const,
            value: overlapMm,
            limit: 0,
            message: `${capitalised(part.name)} lies over a step: ${millimetreText(overlapMm)} of it have only the ${size} section below.`,
            remedy: 'Move it onto its seat or make the seat longer; that length is not counted.',
          },
    ]
  })
}

function neighbourFindings(document: LayoutDocument, parts: readonly PlacedPart[]): Finding[] {
  const byId = new Map(parts.map((part) => [part.id, part]))
  const extents: Extent[] = parts.map((part) => ({
    id: part.id,
    start: mm(part.startMm),
    end: mm(part.endMm),
  }))
  return neighbourGaps(extents).flatMap((pair): Finding[] => {
    const left = byId.get(pair.left)
    const right = byId.get(pair.right)
    if (!left || !right) return []
    const gapMm = toMm(pair.gap)
    // parts that touch on purpose support each other
    if (facesTouch(mm(left.endMm), mm(right.startMm))) return []
    if (gapMm < 0)
      return [
        {
          ...base(right),
          code: 'overlap',
          severity: 'fails',
          value: -gapMm,
          limit: 0,
          message: `${capitalised(left.name)} and ${inSentence(right.name)} overlap by ${millimetreText(-gapMm)}.`,
          remedy: `Move one of them by at least ${millimetreText(-gapMm + document.criteria.minGapMm)}.`,
        },
      ]
    // sums of lengths carry rounding; a gap exactly at the limit is met
    if (gapMm >= document.criteria.minGapMm - 1e-6) return []
    return [
      {
        ...base(right),
        code: 'gap-small',
        severity: 'warns',
        value: gapMm,
        limit: document.criteria.minGapMm,
        message: `Between ${inSentence(left.name)} and ${inSentence(right.name)} there are ${millimetreText(gapMm)}; ${millimetreText(document.criteria.minGapMm)} are asked.`,
        remedy: `Move one of them by ${millimetreText(document.criteria.minGapMm - gapMm)}.`,
      },
    ]
  })
}
