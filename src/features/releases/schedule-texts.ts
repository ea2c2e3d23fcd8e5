/** Texts of one row of the stored schedule, for the table and the phone list alike. */
import { formatGiven, formatResult, formatResultPair, formatSafety } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'
import type { HubResult } from '@shared/recalculation/layout-results'
import { fitWords, loadCaseName } from './place-words'

export interface ScheduleTexts {
  seat: string
  interference: string
  /** Held and required in the governing case. */
  torque: string
  slip: { value: number | null; limit: number | null; text: string; note: string }
  hubYield: string
  joining: string
  order: string
}

export function scheduleTexts(
  document: LayoutDocument,
  hub: Hub,
  result: HubResult,
  units: UnitSystem,
): ScheduleTexts {
  const governing = result.loadCases.find((each) => each.loadCase === result.governingLoadCase)
  const { minUm, maxUm } = result.interference
  const yieldSafeties = [
    result.atRest.hubYieldSafety,
    ...result.loadCases.map((each) => each.hubYieldSafety),
  ].filter((value) => value !== null)
  const value = governing?.slipSafety ?? null
  const limit = governing?.slipSafetyLimit ?? null
  return {
    seat: `⌀${formatGiven(result.seat.diameterMm, 'length', units).text} ${fitWords(hub.fit)}`,
    interference: formatResultPair(minUm, maxUm, 'interference', units, ' to ').text,
    torque: governing
      ? formatResultPair(governing.torqueCapacityNm, governing.requiredTorqueNm, 'torque', units).text
      : 'no demand',
    slip: {
      value,
      limit,
      text: formatSafety(value, limit),
      note: governing
        ? [
            limit === null ? '' : `at least ${formatSafety(limit)}`,
            loadCaseName(document, governing.loadCase),
          ]
            .filter((part) => part !== '')
            .join(', ')
        : '',
    },
    hubYield: formatSafety(yieldSafeties.length === 0 ? null : Math.min(...yieldSafeties)),
    joining:
      hub.joining.method === 'press'
        ? `press, ${formatResult(result.assembly.pressForceMaxN, 'force', units).text}`
        : `oven ${formatResult(result.assembly.ovenC, 'temperature', units).text}`,
    order:
      result.assembly.order === null
        ? 'cannot be mounted'
        : `${result.assembly.order}, ${result.assembly.side}`,
  }
}
