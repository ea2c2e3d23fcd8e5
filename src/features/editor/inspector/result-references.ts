import type { HubCaseQuantity, HubQuantity, QuantityReference } from '@shared/recalculation/derivation'
import type { HubLoadCaseResult } from '@shared/recalculation/layout-results'

export const ofHub = (hub: string, quantity: HubQuantity): QuantityReference => ({
  kind: 'hub',
  hub,
  quantity,
})

export const inCase = (
  hub: string,
  { loadCase }: Pick<HubLoadCaseResult, 'loadCase'>,
  quantity: HubCaseQuantity,
): QuantityReference => ({ kind: 'hubCase', hub, loadCase, quantity })
