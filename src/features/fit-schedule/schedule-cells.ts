/** Texts and verdicts of the calculated cells, for the table and the phone list alike. */
import { formatResult, formatResultPair, formatSafety, NOT_COMPUTED } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { HubCaseQuantity } from '@shared/recalculation/derivation'
import type { ScheduleRow } from './schedule-rows'

export interface SafetyCell {
  quantity: HubCaseQuantity
  label: string
  value: number | null
  limit: number | null
  text: string
}

/** Torque, axial, combined slip and hub stress, each against its own limit in the case shown. */
export function safetyCells({ result, shown }: ScheduleRow, layout: LayoutDocument): SafetyCell[] {
  const own = layout.loadCases.find(({ id }) => id === shown?.loadCase)?.criteria
  const criteria = { ...layout.criteria, ...own }
  const slipLimit = shown?.slipSafetyLimit ?? null
  const hubLimit = result?.isBrittle === true ? criteria.brittleSafety : criteria.hubYieldSafety
  const cell = (
    quantity: HubCaseQuantity,
    label: string,
    value: number | null | undefined,
    limit: number | null,
  ) => ({
    quantity,
    label,
    value: value ?? null,
    limit,
    text: formatSafety(value ?? null, limit),
  })
  return [
    cell('torqueSafety', 'torque safety', shown?.torqueSafety, slipLimit),
    cell('axialSafety', 'axial safety', shown?.axialSafety, slipLimit),
    cell('slipSafety', 'combined slip safety', shown?.slipSafety, slipLimit),
    cell('hubYieldSafety', 'hub stress safety', shown?.hubYieldSafety, hubLimit),
  ]
}

export function interferenceText({ result }: ScheduleRow, units: UnitSystem): string {
  return result === null
    ? NOT_COMPUTED
    : formatResultPair(result.interference.minUm, result.interference.maxUm, 'interference', units, ' … ')
        .number
}

export function joiningText({ hub, result }: ScheduleRow, units: UnitSystem): string {
  if (result === null) return NOT_COMPUTED
  return hub.joining.method === 'press'
    ? `press, ${formatResult(result.assembly.pressForceMaxN, 'force', units).text}`
    : formatResult(result.assembly.joiningC, 'temperature', units).text
}

export const isTooHot = ({ hub, result }: ScheduleRow): boolean =>
  hub.joining.method !== 'press' &&
  result?.assembly.ovenC != null &&
  result.assembly.limitC != null &&
  result.assembly.ovenC > result.assembly.limitC

export function orderText({ result }: ScheduleRow): string {
  if (result === null) return NOT_COMPUTED
  const { order, side } = result.assembly
  return order === null ? 'blocked' : `${order}, ${side}`
}
