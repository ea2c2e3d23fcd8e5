import { extreme, isWorst } from '@/stores/shown-load-case'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { HubLoadCaseResult, LayoutResults } from '@shared/recalculation/layout-results'

export interface SeatCount {
  holding: number
  total: number
  /** The worst of those that do not hold, in words; else what else there is to say. */
  caption: string
  /** All seats hold, yet something else fails. */
  isOtherwiseFailing: boolean
}

const slips = ({ slipSafety, slipSafetyLimit }: HubLoadCaseResult) =>
  slipSafety !== null && slipSafety < slipSafetyLimit

/** How many seats transmit what the chosen cases ask, at the loosest. */
export function countHoldingSeats(
  results: LayoutResults,
  document: LayoutDocument,
  selected: string | null,
): SeatCount {
  const nameOf = (id: string) => document.hubs.find((hub) => hub.id === id)?.name ?? id
  const caseName = (id: string) => document.loadCases.find((loadCase) => loadCase.id === id)?.name ?? id
  const seats = results.hubs.map((hub) => {
    const cases = isWorst(selected)
      ? hub.loadCases
      : hub.loadCases.filter(({ loadCase }) => loadCase === selected)
    const lost = cases.filter(
      (item) =>
        slips(item) ||
        (item.effectiveMinUm !== null && item.effectiveMinUm <= 0 && item.requiredResultantN > 0),
    )
    return { hub, lost, isKnown: cases.every(({ effectiveMinUm }) => effectiveMinUm !== null) }
  })
  const holding = seats.filter(({ lost, isKnown }) => lost.length === 0 && isKnown).length
  const slipping = seats.flatMap(({ hub, lost }) => lost.map((item) => ({ hub, item })))
  const worst = extreme(slipping, ({ item }) => (item.slipSafety ?? 0) / item.slipSafetyLimit, 'least')
  const unknown = seats.find(({ isKnown }) => !isKnown)
  const failing = results.findings.filter(({ severity }) => severity === 'fails').length
  return {
    holding,
    total: seats.length,
    isOtherwiseFailing: worst === null && unknown === undefined && failing > 0,
    caption:
      worst !== null
        ? `${nameOf(worst.hub.id)} slips in case “${caseName(worst.item.loadCase)}”`
        : unknown !== undefined
          ? `${nameOf(unknown.hub.id)} cannot be computed`
          : failing > 0
            ? `${failing} ${failing === 1 ? 'finding fails' : 'findings fail'}`
            : 'nothing fails',
  }
}
