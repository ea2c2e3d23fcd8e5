import { applyOperations } from './apply-operations'
import type { LayoutDocument } from './layout-document'
import type { Operation } from './operations'

/** What a person sees: the confirmed document with his waiting edits on top, in their order. */
export function rebase(
  confirmed: LayoutDocument,
  waiting: readonly { operations: readonly Operation[] }[],
): LayoutDocument {
  return waiting.reduce((document, edit) => applyOperations(document, edit.operations).document, confirmed)
}
