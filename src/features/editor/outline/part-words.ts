/** How a part is read out: name, kind, place, fit, result. The outline's items and the live region use the same words. */
import type { LayoutDocument, Load, LoadCase } from '@shared/layout/layout-document'
import type { LayoutResults } from '@shared/recalculation/layout-results'
import { formatGiven, formatResult, formatSafety } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { isWorst, shownHubCase } from '@/stores/shown-load-case'
import type { PartState, PartVerdict } from '../part-states'
import { hubExtent, partExtent, partName, roundMm } from '../tools/part'

export interface WordsContext {
  document: LayoutDocument
  results: LayoutResults | null
  /** A load case id or "worst". */
  selectedLoadCaseId: string | null
  units: UnitSystem
  stateOf: (id: string) => PartState
}

const VERDICT_WORDS: Record<PartVerdict, string> = {
  holds: 'holds',
  warns: 'with a warning',
  fails: 'fails',
  unknown: 'not calculated',
}

const mm = (value: number, units: UnitSystem) => formatGiven(roundMm(value), 'length', units).text

/** "slip safety 1.65, holds", "slips 0.94, fails". */
export function resultWords(context: WordsContext, id: string): string {
  const state = context.stateOf(id)
  const hub = context.results?.hubs.find((candidate) => candidate.id === id)
  const shown = hub && shownHubCase(hub, context.selectedLoadCaseId)
  const parts: string[] = []
  if (shown && shown.slipSafety !== null) {
    parts.push(`slip safety ${formatSafety(shown.slipSafety, shown.slipSafetyLimit)}`)
  }
  if (state.words !== '' && !(parts.length > 0 && state.words.startsWith('slips'))) parts.push(state.words)
  // A bearing or section without findings has no verdict of its own to speak of.
  if (hub || state.verdict !== 'unknown') parts.push(VERDICT_WORDS[state.verdict])
  return parts.join(', ')
}

/** The short form spoken after a change: "Pinion at 74 mm, slip safety 1.65, holds". */
export function spokenResult(context: WordsContext, id: string): string {
  const extent = partExtent(context.document, id)
  if (!extent) return ''
  const place =
    extent.kind === 'section'
      ? `${mm(extent.rightMm - extent.leftMm, context.units)} long`
      : `at ${mm(extent.leftMm, context.units)}`
  const result = resultWords(context, id)
  return `${partName(context.document, id)} ${place}${result === '' ? '' : `, ${result}`}`
}

/** What distinguishes the part, for sighted readers of the outline: "⌀50 H7/u6". */
export function detailWords({ document, units }: WordsContext, id: string): string {
  const hub = document.hubs.find((candidate) => candidate.id === id)
  if (hub) {
    const bore = formatGiven(hubExtent(document, hub).innerRadiusMm * 2, 'length', units).number
    const fit = hub.fit.kind === 'iso286' ? `${hub.fit.hole}/${hub.fit.shaft}` : 'own limits'
    return `⌀${bore} ${fit}`
  }
  const bearing = document.bearings.find((candidate) => candidate.id === id)
  if (bearing) return bearing.kind
  const section = document.shaft.sections.find((candidate) => candidate.id === id)
  return section ? `⌀${formatGiven(section.outerDiameterMm, 'length', units).number}` : ''
}

/** The whole line of an item. */
export function itemWords(context: WordsContext, id: string): string {
  const { document, units } = context
  const extent = partExtent(document, id)
  if (!extent) return ''
  const hub = document.hubs.find((candidate) => candidate.id === id)
  const kind = hub
    ? hub.role === 'other'
      ? 'hub'
      : hub.role
    : extent.kind === 'bearing'
      ? ''
      : 'of the shaft'
  return [
    partName(document, id),
    kind,
    `at ${mm(extent.leftMm, units)}`,
    `${mm(extent.rightMm - extent.leftMm, units)} long`,
    detailWords(context, id).replace('⌀', 'diameter '),
    resultWords(context, id),
  ]
    .filter((word) => word !== '')
    .join(', ')
}

export function loadWords({ document, units }: WordsContext, loadCase: LoadCase, load: Load): string {
  const values = [
    load.torqueNm !== 0 && `torque ${formatResult(load.torqueNm, 'torque', units).text}`,
    load.forceYN !== 0 && `force y ${formatResult(load.forceYN, 'force', units).text}`,
    load.forceZN !== 0 && `force z ${formatResult(load.forceZN, 'force', units).text}`,
    load.axialN !== 0 && `axial ${formatResult(load.axialN, 'force', units).text}`,
  ].filter((word) => word !== false)
  const place = `at ${mm(load.stationMm, units)}`
  return `Load on ${partName(document, load.hub)} in ${loadCase.name}, ${place}, ${values.length > 0 ? values.join(', ') : 'no value yet'}`
}

/** Which load case the outline lists: the chosen one, or the first while "worst" is chosen. */
export function listedLoadCase(document: LayoutDocument, selected: string | null): LoadCase | null {
  const chosen = isWorst(selected) ? undefined : document.loadCases.find(({ id }) => id === selected)
  return chosen ?? document.loadCases[0] ?? null
}
