/** Which way each part can come, one order of assembly, and what is in the way. */
import { assemblyOrder, type AssemblyOrder } from '../engineering/assembly/assembly-order'
import { passage, type Passage, type ShaftEnd } from '../engineering/assembly/passage'
import type { LayoutDocument } from '../layout/layout-document'
import type { SectionSpan } from '../layout/shaft-geometry'
import { attempt } from './attempt'
import { assemblyParts, shaftFeatures, type AssemblyPart, type ShaftFeature } from './assembly-parts'
import type { HubCalculation } from './hub-result'
import { capitalised, inSentence, millimetreText } from './wording'

export interface PartWays {
  part: AssemblyPart
  ways: Record<ShaftEnd, Passage>
}

export interface AssemblyCalculation {
  parts: PartWays[]
  features: ShaftFeature[]
  order: AssemblyOrder
  blocked: { part: string; reason: string }[]
  isFeasible: boolean
}

export function calculateAssembly(
  document: LayoutDocument,
  spans: readonly SectionSpan[],
  hubs: readonly HubCalculation[],
): AssemblyCalculation {
  const features = shaftFeatures(document, spans, hubs)
  const parts = assemblyParts(document, hubs).flatMap((part) => {
    const ways = attempt(() => ({
      left: passage(part.travelling, features, 'left'),
      right: passage(part.travelling, features, 'right'),
    }))
    // a bore that is no size at all is reported with the hub's missing numbers
    return ways.value ? [{ part, ways: ways.value }] : []
  })
  const passing = parts.filter(({ ways }) => ways.left.isFree || ways.right.isFree)
  const order = assemblyOrder(
    passing.map(({ part, ways }) => ({
      id: part.id,
      station: part.startMm + part.endMm,
      planned: part.planned ?? (ways.left.isFree ? 'left' : 'right'),
      canComeFrom: { left: ways.left.isFree, right: ways.right.isFree },
    })),
  )
  const namer = featureNamer(document, spans)
  const blocked = parts
    .filter(({ ways }) => !ways.left.isFree && !ways.right.isFree)
    .map((ways) => ({ part: ways.part.id, reason: blockedSentence(ways, namer) }))
  return { parts, features, order, blocked, isFeasible: blocked.length === 0 && order.conflict === null }
}

export type FeatureNamer = (feature: ShaftFeature) => string

/** "the seat of input gear (70 mm)", "the collar (84 mm)", "the 70 mm section". */
export function featureNamer(document: LayoutDocument, spans: readonly SectionSpan[]): FeatureNamer {
  const hubNames = new Map(document.hubs.map((hub) => [hub.id, hub.name]))
  return (feature) => {
    const size = millimetreText(feature.diameterMm)
    const hubName = feature.hubId === null ? undefined : hubNames.get(feature.hubId)
    if (hubName !== undefined) return `the seat of ${inSentence(hubName)} (${size})`
    const index = spans.findIndex((span) => span.section.id === feature.sectionId)
    const left = spans[index - 1]?.section.outerDiameterMm ?? 0
    const right = spans[index + 1]?.section.outerDiameterMm ?? 0
    return feature.diameterMm > left && feature.diameterMm > right
      ? `the collar (${size})`
      : `the ${size} section`
  }
}

/** The largest feature in the way; between equals the seat of a hub says more than plain shaft. */
export function worstBlocker(way: Passage): ShaftFeature | null {
  const blockers = way.blockers as ShaftFeature[]
  const largest = blockers[0]
  if (!largest) return null
  return (
    blockers.find((blocker) => blocker.hubId !== null && blocker.diameterMm === largest.diameterMm) ?? largest
  )
}

const opposite = (side: ShaftEnd): ShaftEnd => (side === 'left' ? 'right' : 'left')

function blockedSentence({ part, ways }: PartWays, namer: FeatureNamer): string {
  const planned = part.planned ?? 'left'
  const other = opposite(planned)
  const first = worstBlocker(ways[planned])
  const second = worstBlocker(ways[other])
  const start = `${capitalised(part.name)} (bore ${millimetreText(part.boreMm)}) cannot pass ${first ? namer(first) : 'the shaft'} from the ${planned}`
  return `${start} and is stopped by ${second ? namer(second) : 'the shaft'} from the ${other}.`
}
