/**
 * Which numbers belong on screen for the chosen load case. With "worst" each number comes from the
 * case that is nearest to its own limit, and says which case that is.
 */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type {
  HubLoadCaseResult,
  HubResult,
  LayoutResults,
  ShaftLoadCaseResult,
} from '@shared/recalculation/layout-results'
import { WORST_CASE } from './results-store'

export const isWorst = (selected: string | null) => selected === null || selected === WORST_CASE

/** The hub's numbers in the chosen case, or in the case that governs its grip. */
export function shownHubCase(hub: HubResult, selected: string | null): HubLoadCaseResult | null {
  const wanted = isWorst(selected) ? (hub.governingLoadCase ?? hub.loadCases[0]?.loadCase) : selected
  return hub.loadCases.find(({ loadCase }) => loadCase === wanted) ?? null
}

/** The cases a number of the shaft is looked for in. */
export function shownShaftCases(results: LayoutResults, selected: string | null): ShaftLoadCaseResult[] {
  const { loadCases } = results.shaft
  return isWorst(selected) ? loadCases : loadCases.filter(({ loadCase }) => loadCase === selected)
}

/** One case for drawings that can show only one: the chosen one, else the one with least fatigue safety. */
export function shownShaftCase(results: LayoutResults, selected: string | null): ShaftLoadCaseResult | null {
  const cases = shownShaftCases(results, selected)
  return (
    extreme(cases, (item) => item.fatigueSafety?.value ?? null, 'least') ??
    extreme(cases, (item) => item.equivalentMaxMPa?.value ?? null, 'most') ??
    cases[0] ??
    null
  )
}

/** The item whose number is least or most; items without a number do not take part. */
export function extreme<T>(
  items: readonly T[],
  numberOf: (item: T) => number | null,
  which: 'least' | 'most',
): T | null {
  let found: T | null = null
  let best = which === 'least' ? Infinity : -Infinity
  for (const item of items) {
    const value = numberOf(item)
    if (value === null) continue
    if (which === 'least' ? value < best : value > best) {
      found = item
      best = value
    }
  }
  return found
}

/** The slope at a bearing that comes nearest to what that bearing allows. */
export function worstBearingSlope(document: LayoutDocument, cases: readonly ShaftLoadCaseResult[]) {
  const slopes = cases.flatMap(({ loadCase, slopes: list }) => {
    const criteria = document.loadCases.find(({ id }) => id === loadCase)?.criteria
    return list.flatMap(({ part, stationMm, mrad }) => {
      const bearing = document.bearings.find(({ id }) => id === part)
      if (bearing === undefined) return []
      const limitMrad =
        bearing.slopeLimitMrad ?? criteria?.bearingSlopeMrad ?? document.criteria.bearingSlopeMrad
      return [{ bearing, loadCase, stationMm, mrad: Math.abs(mrad), limitMrad }]
    })
  })
  return extreme(slopes, ({ mrad, limitMrad }) => mrad / limitMrad, 'most')
}
