import { dropOperation, type ApplyResult } from './apply-result'
import type { LayoutDocument } from './layout-document'
import type { ReorderOperation } from './operations'
import { insertedAt, withSections } from './replace-target'

export function applyReorder(document: LayoutDocument, operation: ReorderOperation): ApplyResult {
  const { target } = operation
  switch (target.kind) {
    case 'section':
      return reordered(document, operation, target.id, document.shaft.sections, (sections) =>
        withSections(document, sections),
      )
    case 'hub':
      return reordered(document, operation, target.id, document.hubs, (hubs) => ({ ...document, hubs }))
    case 'loadCase':
      return reordered(document, operation, target.id, document.loadCases, (loadCases) => ({
        ...document,
        loadCases,
      }))
  }
}

function reordered<Item extends { id: string }>(
  document: LayoutDocument,
  operation: ReorderOperation,
  id: string,
  items: readonly Item[],
  withItems: (items: Item[]) => LayoutDocument,
): ApplyResult {
  const from = items.findIndex((item) => item.id === id)
  const item = items[from]
  if (!item) return dropOperation(document, operation, 'targetMissing')
  const index = Math.min(operation.index, items.length - 1)
  if (index === from) return dropOperation(document, operation, 'noChange')
  const rest = items.filter((other) => other.id !== id)
  return {
    document: withItems(insertedAt(rest, index, item)),
    applied: [{ ...operation, index }],
    dropped: [],
  }
}
