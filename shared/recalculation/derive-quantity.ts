/** Opens any number of the results: formula, inputs with units, result, model, validity and sources. */
import type { LayoutDocument } from '../layout/layout-document'
import type { Derivation, QuantityReference } from './derivation'
import { missing } from './derivations/derivation-parts'
import { deriveHubCaseQuantity } from './derivations/hub-case-derivations'
import { deriveHubQuantity } from './derivations/hub-derivations'
import { deriveCriticalSpeed, deriveShaftCaseQuantity } from './derivations/shaft-derivations'
import { calculateLayout, type LayoutCalculation } from './recalculate-layout'

/**
 * The derivation of one number. Its result is read from the same calculation as the results, so the
 * two can never disagree. A reference to something that is gone is answered in plain words.
 */
export function deriveQuantity(document: LayoutDocument, reference: QuantityReference): Derivation {
  const calculation = calculationOf(document)
  switch (reference.kind) {
    case 'hub': {
      const hub = hubOf(calculation, reference.hub)
      return hub ? deriveHubQuantity(hub, reference.quantity) : gone(reference.hub)
    }
    case 'hubCase': {
      const hub = hubOf(calculation, reference.hub)
      return hub ? deriveHubCaseQuantity(hub, reference.loadCase, reference.quantity) : gone(reference.hub)
    }
    case 'shaftCase':
      return deriveShaftCaseQuantity(document, calculation, reference)
    case 'shaft':
      return deriveCriticalSpeed(document, calculation)
  }
}

/** Documents are never changed in place, so a calculation holds as long as its document lives. */
const calculations = new WeakMap<LayoutDocument, LayoutCalculation>()

function calculationOf(document: LayoutDocument): LayoutCalculation {
  let calculation = calculations.get(document)
  if (!calculation) {
    calculation = calculateLayout(document)
    calculations.set(document, calculation)
  }
  return calculation
}

const hubOf = (calculation: LayoutCalculation, id: string) =>
  calculation.hubs.find((hub) => hub.result.id === id)

const gone = (id: string) => missing('No result', '', `The hub ${id} is not in the layout any more.`)
