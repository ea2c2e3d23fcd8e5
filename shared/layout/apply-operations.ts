/**
 * What operations do to a document. Pure and total: the same document and operations give the
 * same result in every browser and on the server, and an operation that no longer fits is dropped
 * with a reason instead of stopping the ones after it.
 */
import { applyAdd } from './apply-add'
import { applyRemove } from './apply-remove'
import { applyReorder } from './apply-reorder'
import type { ApplyResult } from './apply-result'
import { applySet } from './apply-set'
import type { LayoutDocument } from './layout-document'
import type { Operation } from './operations'

export function applyOperations(document: LayoutDocument, operations: readonly Operation[]): ApplyResult {
  const result: ApplyResult = { document, applied: [], dropped: [] }
  for (const operation of operations) {
    const step = applyOperation(result.document, operation)
    result.document = step.document
    // Not push(...): the number of arguments of a call is limited.
    for (const applied of step.applied) result.applied.push(applied)
    for (const dropped of step.dropped) result.dropped.push(dropped)
  }
  return result
}

export function applyOperation(document: LayoutDocument, operation: Operation): ApplyResult {
  switch (operation.type) {
    case 'set':
      return applySet(document, operation)
    case 'add':
      return applyAdd(document, operation)
    case 'remove':
      return applyRemove(document, operation)
    case 'reorder':
      return applyReorder(document, operation)
  }
}
