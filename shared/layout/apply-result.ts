import type { LayoutDocument } from './layout-document'
import type { Operation } from './operations'

export type DropReason = 'targetMissing' | 'duplicateId' | 'invalidValue' | 'noChange'

export interface DroppedOperation {
  operation: Operation
  reason: DropReason
}

export interface ApplyResult {
  document: LayoutDocument
  /**
   * What really happened, in order: values as validated, `before` as found, indexes as used, and
   * the removals that a removed hub brought with it. Applying these to the same document again
   * gives the same result, so this is what the log keeps.
   */
  applied: Operation[]
  dropped: DroppedOperation[]
}

export function dropOperation(
  document: LayoutDocument,
  operation: Operation,
  reason: DropReason,
): ApplyResult {
  return { document, applied: [], dropped: [{ operation, reason }] }
}
