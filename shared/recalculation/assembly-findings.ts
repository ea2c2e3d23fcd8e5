/** Findings of passage, order and abutments. */
import type { ShaftEnd } from '../engineering/assembly/passage'
import { toUm } from '../engineering/quantities/units'
import type { LayoutDocument } from '../layout/layout-document'
import type { SectionSpan } from '../layout/shaft-geometry'
import { featureNamer, worstBlocker, type AssemblyCalculation, type PartWays } from './assembly-results'
import type { ShaftFeature } from './assembly-parts'
import { abutmentFindings } from './abutment'
import type { Finding } from './layout-results'
import { reseatRemedy } from './reseat-remedy'
import { capitalised, inSentence, micrometreText } from './wording'

export function assemblyFindings(
  document: LayoutDocument,
  spans: readonly SectionSpan[],
  assembly: AssemblyCalculation,
): Finding[] {
  return [
    ...blockedFindings(document, assembly),
    ...orderFindings(document, spans, assembly),
    ...tightFindings(document, spans, assembly),
    ...document.hubs.flatMap((hub) => abutmentFindings(document, hub)),
  ]
}

function blockedFindings(document: LayoutDocument, assembly: AssemblyCalculation): Finding[] {
  return assembly.blocked.flatMap(({ part: id, reason }) => {
    const found = assembly.parts.find(({ part }) => part.id === id)
    if (!found) return []
    const blocker = worstBlocker(found.ways[found.part.planned ?? 'left'])
    return [
      {
        code: 'passage-blocked' as const,
        severity: 'fails' as const,
        part: id,
        loadCase: null,
        value: found.part.boreMm,
        limit: blocker?.diameterMm ?? null,
        unit: 'mm',
        message: reason,
        remedy:
          (blocker && reseatRemedy(document, found.part, blocker)) ??
          'Step the diameters down towards the end it comes from, or split the part.',
        stationMm: found.part.startMm,
      },
    ]
  })
}

function orderFindings(
  document: LayoutDocument,
  spans: readonly SectionSpan[],
  assembly: AssemblyCalculation,
): Finding[] {
  const namer = featureNamer(document, spans)
  const { conflict, order } = assembly.order
  const nameOf = (id: string) => assembly.parts.find(({ part }) => part.id === id)?.part.name ?? id
  if (conflict) {
    const [left, right] = conflict
    return [
      {
        code: 'assembly-order',
        severity: 'fails',
        part: left,
        loadCase: null,
        value: null,
        limit: null,
        unit: '',
        message: `There is no order of assembly: ${inSentence(nameOf(left))} can only come from the right and ${inSentence(nameOf(right))} only from the left, so they would have to go through each other.`,
        remedy: 'Change a diameter so that one of them can come from its own end, or split one of them.',
      },
    ]
  }
  return assembly.order.changed.flatMap((id) => {
    const found = assembly.parts.find(({ part }) => part.id === id)
    const side = order.find((mounted) => mounted.id === id)?.side
    if (!found?.part.planned || !side) return []
    return [sideFinding(found, found.part.planned, side, namer)]
  })
}

function sideFinding(
  { part, ways }: PartWays,
  planned: ShaftEnd,
  used: ShaftEnd,
  namer: (feature: ShaftFeature) => string,
): Finding {
  const blocker = worstBlocker(ways[planned])
  const why = blocker
    ? `it cannot pass ${namer(blocker)}`
    : 'it would have to go through a part that must come from the other end'
  return {
    code: 'passage-side',
    severity: 'warns',
    part: part.id,
    loadCase: null,
    value: null,
    limit: null,
    unit: '',
    message: `${capitalised(part.name)} cannot come from the ${planned} as planned: ${why}.`,
    remedy: `Plan it from the ${used}.`,
    stationMm: part.startMm,
  }
}

/** Parts that travel hot over another interference seat: possible, but worth a word to the shop. */
function tightFindings(
  document: LayoutDocument,
  spans: readonly SectionSpan[],
  assembly: AssemblyCalculation,
): Finding[] {
  const namer = featureNamer(document, spans)
  return assembly.order.order.flatMap(({ id, side }) => {
    const found = assembly.parts.find(({ part }) => part.id === id)
    if (!found || found.part.kind !== 'hub') return []
    const way = found.ways[side]
    const seats = (way.tight as ShaftFeature[]).filter((feature) => feature.hubId !== null)
    const first = seats[0]
    if (!first || way.leastClearance === null) return []
    const over = seats.length === 1 ? namer(first) : `${seats.length} seats of other hubs`
    return [
      {
        code: 'passage-tight' as const,
        severity: 'notes' as const,
        part: id,
        loadCase: null,
        value: toUm(way.leastClearance),
        limit: null,
        unit: 'µm',
        message: `${capitalised(found.part.name)} travels hot over ${over} with ${micrometreText(toUm(way.leastClearance))} of clearance.`,
        remedy: 'Move it on without stopping, or step the seats down towards that end.',
        stationMm: found.part.startMm,
      },
    ]
  })
}
