/**
 * What the drawing, the outline and the labels say about a part: holds, fails, cannot be computed,
 * with the shortest words for why. Made once per results, so that every place says the same.
 */
import { useMemo } from 'react'
import type { Finding, FindingCode, LayoutResults } from '@shared/recalculation/layout-results'
import { formatSafety } from '@/lib/format-quantity'
import { useResultsStore } from '@/stores/results-store'
import { isWorst } from '@/stores/shown-load-case'

export type PartVerdict = 'holds' | 'warns' | 'fails' | 'unknown'

export interface PartState {
  verdict: PartVerdict
  /** Two or three words, empty when all is well: "slips 0.94". */
  words: string
  /** True where the part lies wrong: it overlaps, hangs over a step, has no seat. */
  isMisplaced: boolean
}

const UNKNOWN: PartState = { verdict: 'unknown', words: '', isMisplaced: false }

const SHORT_WORDS: Partial<Record<FindingCode, string>> = {
  slip: 'slips',
  'no-interference': 'no grip left',
  'window-empty': 'no fit possible',
  'hub-yield': 'hub yields',
  'hub-brittle': 'hub may crack',
  'shaft-yield': 'shaft yields',
  'heat-limit': 'too hot to join',
  'passage-blocked': 'cannot reach seat',
  'passage-side': 'wrong side',
  'passage-tight': 'tight passage',
  'assembly-order': 'no order',
  'abutment-missing': 'no shoulder',
  'no-seat': 'no seat',
  'seat-step': 'over a step',
  'bore-mismatch': 'bore is not the seat',
  overlap: 'overlaps',
  'gap-small': 'gap is small',
  phase: 'wrong angle',
  'mesh-slope': 'mesh tilts',
  'mesh-deflection': 'mesh deflects',
  'bearing-slope': 'bearing tilts',
  fatigue: 'fatigue',
  'not-computable': 'value missing',
  'unknown-tolerance': 'unknown class',
  'unknown-material': 'unknown material',
}

/** Codes whose value is a safety against a limit, worth its number on the drawing. */
const WITH_VALUE: ReadonlySet<FindingCode> = new Set([
  'slip',
  'hub-yield',
  'hub-brittle',
  'shaft-yield',
  'fatigue',
])
const MISPLACED: ReadonlySet<FindingCode> = new Set(['no-seat', 'seat-step', 'bore-mismatch', 'overlap'])

const RANK = { fails: 2, warns: 1, notes: 0 } as const

/** How near a finding is to, or how far beyond, its limit: less is worse. Findings without numbers lead. */
const margin = ({ value, limit }: Finding) =>
  value === null || limit === null || limit === 0 ? 0 : value / limit

/** The finding to show for a part: of the case on screen before others, fails before warns, worst first. */
function isWorse(a: Finding, b: Finding, loadCaseId: string | null): boolean {
  if (RANK[a.severity] !== RANK[b.severity]) return RANK[a.severity] > RANK[b.severity]
  const isElsewhere = (finding: Finding) =>
    loadCaseId !== null && finding.loadCase !== null && finding.loadCase !== loadCaseId
  if (isElsewhere(a) !== isElsewhere(b)) return isElsewhere(b)
  // Only safeties count downwards; other values are not compared.
  return WITH_VALUE.has(a.code) && WITH_VALUE.has(b.code) && margin(a) < margin(b)
}

function wordsOf(finding: Finding): string {
  const words = SHORT_WORDS[finding.code] ?? finding.code.replaceAll('-', ' ')
  return WITH_VALUE.has(finding.code) && finding.value !== null
    ? `${words} ${formatSafety(finding.value, finding.limit)}`
    : words
}

/** @param loadCaseId the case on screen; null while the worst of all is */
export function partStates(results: LayoutResults, loadCaseId: string | null): Map<string, PartState> {
  const worst = new Map<string, Finding>()
  const misplaced = new Set<string>()
  for (const finding of results.findings) {
    if (finding.severity === 'notes' || finding.part === '') continue
    if (finding.severity === 'fails' && MISPLACED.has(finding.code)) misplaced.add(finding.part)
    const known = worst.get(finding.part)
    if (!known || isWorse(finding, known, loadCaseId)) worst.set(finding.part, finding)
  }
  const states = new Map<string, PartState>()
  for (const [part, finding] of worst) {
    states.set(part, {
      verdict: finding.severity === 'fails' ? 'fails' : 'warns',
      words: wordsOf(finding),
      isMisplaced: misplaced.has(part),
    })
  }
  for (const hub of results.hubs) {
    const known = states.get(hub.id)
    if (known?.verdict === 'fails') continue
    if (hub.verdict === 'notComputable') {
      states.set(hub.id, { verdict: 'unknown', words: 'value missing', isMisplaced: misplaced.has(hub.id) })
    } else if (hub.verdict === 'fails') {
      states.set(hub.id, { verdict: 'fails', words: known?.words ?? 'fails', isMisplaced: false })
    } else if (!known) {
      states.set(hub.id, { verdict: 'holds', words: '', isMisplaced: false })
    }
  }
  return states
}

const NO_STATES: ReadonlyMap<string, PartState> = new Map()

export function usePartStates(): ReadonlyMap<string, PartState> {
  const results = useResultsStore((state) => state.results)
  const loadCaseId = useResultsStore((state) =>
    isWorst(state.selectedLoadCaseId) ? null : state.selectedLoadCaseId,
  )
  return useMemo(() => (results ? partStates(results, loadCaseId) : NO_STATES), [results, loadCaseId])
}

export const stateOf = (states: ReadonlyMap<string, PartState>, id: string): PartState =>
  states.get(id) ?? UNKNOWN
