/** Hubs and bearings as rings that must reach their seats, and the shaft as what they travel over. */
import type { PassageFeature, ShaftEnd, TravellingPart } from '../engineering/assembly/passage'
import { metre, mm } from '../engineering/quantities/units'
import type { Bearing, LayoutDocument } from '../layout/layout-document'
import { seatUnder, type SectionSpan } from '../layout/shaft-geometry'
import type { HubCalculation } from './hub-result'

export interface AssemblyPart {
  id: string
  name: string
  kind: 'hub' | 'bearing'
  startMm: number
  endMm: number
  boreMm: number
  /** Null for a bearing whose end is free to choose. */
  planned: ShaftEnd | null
  travelling: TravellingPart
  sectionId: string
}

/** A bearing ring is heated by this much, whatever its fit: customary and safe for its steel. */
const BEARING_RISE_K = 80
const BEARING_EXPANSION_PER_K = 12e-6

/** Parts that slide on. Split bearings are closed around the shaft afterwards; parts off the shaft have no way. */
export function assemblyParts(document: LayoutDocument, hubs: readonly HubCalculation[]): AssemblyPart[] {
  const fromHubs = document.hubs.flatMap((hub, index): AssemblyPart[] => {
    const under = seatUnder(document, hub)
    if (!under) return []
    const boreMm = hub.boreDiameterMm ?? under.span.section.outerDiameterMm
    const seat = hubs[index]?.seat
    const isHotOrCold = hub.joining.method !== 'press'
    const growth =
      seat && isHotOrCold
        ? metre(Math.max(0, seat.interference.max) + seat.joining.joint.clearance)
        : metre(0)
    return [
      {
        id: hub.id,
        name: hub.name,
        kind: 'hub',
        startMm: hub.stationMm,
        endMm: hub.stationMm + hub.lengthMm,
        boreMm,
        planned: hub.joining.side,
        sectionId: under.span.section.id,
        travelling: {
          start: mm(hub.stationMm),
          end: mm(hub.stationMm + hub.lengthMm),
          coldBore: metre(boreMm / 1e3 + (seat ? seat.interference.boreLowerDeviation : 0)),
          growth,
          ownFeatureIds: ownFeatures(hub.id, under.span.section.id),
        },
      },
    ]
  })
  return [...fromHubs, ...document.bearings.flatMap((bearing) => ringBearing(document, bearing))]
}

function ringBearing(document: LayoutDocument, bearing: Bearing): AssemblyPart[] {
  if (bearing.housing !== 'ring') return []
  const startMm = bearing.stationMm - bearing.widthMm / 2
  const under = seatUnder(document, { stationMm: startMm, lengthMm: bearing.widthMm })
  if (!under) return []
  const boreMm = bearing.boreDiameterMm ?? under.span.section.outerDiameterMm
  return [
    {
      id: bearing.id,
      name: bearing.name,
      kind: 'bearing',
      startMm,
      endMm: startMm + bearing.widthMm,
      boreMm,
      planned: bearing.side ?? null,
      sectionId: under.span.section.id,
      travelling: {
        start: mm(startMm),
        end: mm(startMm + bearing.widthMm),
        coldBore: mm(boreMm),
        growth: metre((boreMm / 1e3) * BEARING_RISE_K * BEARING_EXPANSION_PER_K),
        ownFeatureIds: ownFeatures(bearing.id, under.span.section.id),
      },
    },
  ]
}

export const sectionFeatureId = (sectionId: string) => `section:${sectionId}`
export const seatFeatureId = (hubId: string) => `seat:${hubId}`
const ownFeatures = (partId: string, sectionId: string) => [
  sectionFeatureId(sectionId),
  seatFeatureId(partId),
]

export interface ShaftFeature extends PassageFeature {
  /** Hub whose seat it is; null for plain shaft. */
  hubId: string | null
  sectionId: string
  diameterMm: number
}

/** Sections with their nominal diameter, and seats of hubs with their upper limit. */
export function shaftFeatures(
  document: LayoutDocument,
  spans: readonly SectionSpan[],
  hubs: readonly HubCalculation[],
): ShaftFeature[] {
  const sections = spans.map(({ section, startMm, endMm }) => ({
    id: sectionFeatureId(section.id),
    start: mm(startMm),
    end: mm(endMm),
    largestDiameter: mm(section.outerDiameterMm),
    hubId: null,
    sectionId: section.id,
    diameterMm: section.outerDiameterMm,
  }))
  const seats = document.hubs.flatMap((hub, index) => {
    const under = seatUnder(document, hub)
    if (!under) return []
    const { section } = under.span
    const above = hubs[index]?.seat?.interference.seatUpperDeviation ?? 0
    return [
      {
        id: seatFeatureId(hub.id),
        start: mm(under.startMm),
        end: mm(under.endMm),
        largestDiameter: metre(section.outerDiameterMm / 1e3 + Math.max(0, above)),
        hubId: hub.id,
        sectionId: section.id,
        diameterMm: section.outerDiameterMm,
      },
    ]
  })
  return [...sections, ...seats]
}
