import type { z } from 'zod'
import { dropOperation, type ApplyResult } from './apply-result'
import { findLoadCase, hasHub, hasPart } from './find-target'
import {
  bearingSchema,
  hubSchema,
  LIST_LIMITS,
  loadCaseSchema,
  loadSchema,
  shaftSectionSchema,
  timingEntrySchema,
  type LayoutDocument,
  type LoadCase,
} from './layout-document'
import { withoutEmptyParts, withoutNulls } from './normalise-values'
import type { AddOperation } from './operations'
import { insertedAt, withLoads, withSections } from './replace-target'

export function applyAdd(document: LayoutDocument, operation: AddOperation): ApplyResult {
  switch (operation.collection) {
    case 'sections': {
      const item = parseItem(shaftSectionSchema, operation.item)
      const { sections } = document.shaft
      if (!item || isFull(sections, 'sections')) break
      if (hasPart(document, item.id)) return dropOperation(document, operation, 'duplicateId')
      const index = clamped(operation.index, sections)
      return added(withSections(document, insertedAt(sections, index, item)), { ...operation, index, item })
    }
    case 'hubs': {
      const item = parseItem(hubSchema, operation.item)
      if (!item || isFull(document.hubs, 'hubs')) break
      if (hasPart(document, item.id)) return dropOperation(document, operation, 'duplicateId')
      const index = clamped(operation.index, document.hubs)
      const hubs = insertedAt(document.hubs, index, item)
      return added({ ...document, hubs }, { ...operation, index, item })
    }
    case 'bearings': {
      const item = parseItem(bearingSchema, operation.item)
      if (!item || isFull(document.bearings, 'bearings')) break
      if (hasPart(document, item.id)) return dropOperation(document, operation, 'duplicateId')
      const index = clamped(operation.index, document.bearings)
      const bearings = insertedAt(document.bearings, index, item)
      return added({ ...document, bearings }, { ...operation, index, item })
    }
    case 'loadCases': {
      const parsed = parseItem(loadCaseSchema, operation.item)
      if (!parsed || isFull(document.loadCases, 'loadCases')) break
      if (new Set(parsed.loads.map((load) => load.id)).size < parsed.loads.length) break
      if (findLoadCase(document, parsed.id)) return dropOperation(document, operation, 'duplicateId')
      const item = withoutMissingHubs(document, parsed)
      const index = clamped(operation.index, document.loadCases)
      const loadCases = insertedAt(document.loadCases, index, item)
      return added({ ...document, loadCases }, { ...operation, index, item })
    }
    case 'loads': {
      const item = parseItem(loadSchema, operation.item)
      const loadCase = findLoadCase(document, operation.loadCaseId)
      if (!item || (loadCase && isFull(loadCase.loads, 'loads'))) break
      if (!loadCase || !hasHub(document, item.hub)) return dropOperation(document, operation, 'targetMissing')
      if (loadCase.loads.some((load) => load.id === item.id)) {
        return dropOperation(document, operation, 'duplicateId')
      }
      const index = clamped(operation.index, loadCase.loads)
      const next = withLoads(document, loadCase.id, (loads) => insertedAt(loads, index, item))
      return added(next, { ...operation, index, item })
    }
    case 'timing': {
      const item = parseItem(timingEntrySchema, operation.item)
      if (!item || isFull(document.timing, 'timing')) break
      if (!hasHub(document, item.hub)) return dropOperation(document, operation, 'targetMissing')
      if (document.timing.some((entry) => entry.hub === item.hub)) {
        return dropOperation(document, operation, 'duplicateId')
      }
      const index = clamped(operation.index, document.timing)
      const timing = insertedAt(document.timing, index, item)
      return added({ ...document, timing }, { ...operation, index, item })
    }
  }
  return dropOperation(document, operation, 'invalidValue')
}

function added(document: LayoutDocument, applied: AddOperation): ApplyResult {
  return { document, applied: [applied], dropped: [] }
}

function parseItem<Schema extends z.ZodType>(schema: Schema, item: unknown): z.infer<Schema> | null {
  const parsed = schema.safeParse(withoutNulls(item))
  return parsed.success ? parsed.data : null
}

function isFull(items: readonly unknown[], list: keyof typeof LIST_LIMITS): boolean {
  return items.length >= LIST_LIMITS[list]
}

function clamped(index: number, items: readonly unknown[]): number {
  return Math.min(index, items.length)
}

/** A load case that comes back (undo, paste) after a hub has gone comes back without that hub's entries. */
function withoutMissingHubs(document: LayoutDocument, loadCase: LoadCase): LoadCase {
  const temperatures = Object.entries(loadCase.hubTemperaturesC ?? {}).filter(([id]) => hasHub(document, id))
  return withoutEmptyParts({
    ...loadCase,
    loads: loadCase.loads.filter((load) => hasHub(document, load.hub)),
    hubTemperaturesC: Object.fromEntries(temperatures),
  })
}
