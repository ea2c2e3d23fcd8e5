/**
 * The operations that undo others. Built from the document they were applied to, so that what a
 * removal took (a hub and its loads, a load case and its loads) comes back whole and in its place.
 */
import { applyOperation } from './apply-operations'
import { findLoadCase } from './find-target'
import type { LayoutDocument } from './layout-document'
import type { AddOperation, Operation, RemoveOperation, ReorderOperation } from './operations'
import { targetOfAdded } from './target-of-added'

export function invertOperations(
  documentBefore: LayoutDocument,
  operations: readonly Operation[],
): Operation[] {
  let document = documentBefore
  const inverses: Operation[] = []
  for (const operation of operations) {
    // One operation may have meant several: each is inverted against the document it met.
    for (const applied of applyOperation(document, operation).applied) {
      const inverse = invertOperation(document, applied)
      if (inverse) inverses.push(inverse)
      document = applyOperation(document, applied).document
    }
  }
  return inverses.reverse()
}

function invertOperation(document: LayoutDocument, applied: Operation): Operation | null {
  switch (applied.type) {
    case 'set':
      return { ...applied, before: applied.value, value: applied.before ?? null }
    case 'add':
      return { type: 'remove', target: targetOfAdded(applied) }
    case 'remove':
      return restoring(document, applied)
    case 'reorder':
      return reorderingBack(document, applied)
  }
}

function restoring(document: LayoutDocument, { target }: RemoveOperation): AddOperation | null {
  switch (target.kind) {
    case 'section': {
      const place = placeOf(document.shaft.sections, (section) => section.id === target.id)
      return place && { type: 'add', collection: 'sections', ...place }
    }
    case 'hub': {
      const place = placeOf(document.hubs, (hub) => hub.id === target.id)
      return place && { type: 'add', collection: 'hubs', ...place }
    }
    case 'bearing': {
      const place = placeOf(document.bearings, (bearing) => bearing.id === target.id)
      return place && { type: 'add', collection: 'bearings', ...place }
    }
    case 'loadCase': {
      const place = placeOf(document.loadCases, (loadCase) => loadCase.id === target.id)
      return place && { type: 'add', collection: 'loadCases', ...place }
    }
    case 'load': {
      const loads = findLoadCase(document, target.loadCaseId)?.loads ?? []
      const place = placeOf(loads, (load) => load.id === target.id)
      return place && { type: 'add', collection: 'loads', loadCaseId: target.loadCaseId, ...place }
    }
    case 'timing': {
      const place = placeOf(document.timing, (entry) => entry.hub === target.hub)
      return place && { type: 'add', collection: 'timing', ...place }
    }
  }
}

function reorderingBack(document: LayoutDocument, operation: ReorderOperation): ReorderOperation | null {
  const { target } = operation
  const items =
    target.kind === 'section'
      ? document.shaft.sections
      : target.kind === 'hub'
        ? document.hubs
        : document.loadCases
  const place = placeOf<{ id: string }>(items, (item) => item.id === target.id)
  return place && { ...operation, index: place.index }
}

function placeOf<Item>(
  items: readonly Item[],
  isIt: (item: Item) => boolean,
): { index: number; item: Item } | null {
  const index = items.findIndex(isIt)
  const item = items[index]
  return item === undefined ? null : { index, item }
}
