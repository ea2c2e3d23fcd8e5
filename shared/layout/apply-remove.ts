import { dropOperation, type ApplyResult } from './apply-result'
import { applySet } from './apply-set'
import { targetWords } from './field-words'
import { findTarget } from './find-target'
import type { LayoutDocument } from './layout-document'
import type { Operation, RemoveOperation, SetOperation } from './operations'
import { withLoads, withSections } from './replace-target'

export function applyRemove(document: LayoutDocument, request: RemoveOperation): ApplyResult {
  const { target } = request
  if (!findTarget(document, target)) return dropOperation(document, request, 'targetMissing')
  const operation = { ...request, name: targetWords(document, target) }
  switch (target.kind) {
    case 'section':
      return removed(withSections(document, without(document.shaft.sections, target.id)), operation)
    case 'bearing':
      return removed({ ...document, bearings: without(document.bearings, target.id) }, operation)
    case 'loadCase':
      return removed({ ...document, loadCases: without(document.loadCases, target.id) }, operation)
    case 'load':
      return removed(
        withLoads(document, target.loadCaseId, (loads) => without(loads, target.id)),
        operation,
      )
    case 'timing':
      return removed(
        { ...document, timing: document.timing.filter((entry) => entry.hub !== target.hub) },
        operation,
      )
    case 'hub':
      return removeHub(document, operation, target.id)
  }
}

/**
 * Everything that names a hub: its loads, its timing entry, its own temperatures. In the order in
 * which it has to go before the hub goes.
 */
export function hubDependents(document: LayoutDocument, hubId: string): (RemoveOperation | SetOperation)[] {
  const loads = document.loadCases.flatMap((loadCase) =>
    loadCase.loads
      .filter((load) => load.hub === hubId)
      .map((load) => removal({ kind: 'load', loadCaseId: loadCase.id, id: load.id })),
  )
  const temperatures = document.loadCases
    .filter((loadCase) => Object.hasOwn(loadCase.hubTemperaturesC ?? {}, hubId))
    .map((loadCase): SetOperation => ({
      type: 'set',
      target: { kind: 'loadCase', id: loadCase.id },
      field: `hubTemperaturesC.${hubId}`,
      before: loadCase.hubTemperaturesC?.[hubId],
      value: null,
    }))
  const timing = document.timing
    .filter((entry) => entry.hub === hubId)
    .map((entry) => removal({ kind: 'timing', hub: entry.hub }))
  return [...loads, ...temperatures, ...timing]
}

/** A hub never leaves loads behind that name nothing, whoever added them and whenever. */
function removeHub(document: LayoutDocument, operation: RemoveOperation, hubId: string): ApplyResult {
  let current = document
  const applied: Operation[] = []
  for (const dependent of hubDependents(document, hubId)) {
    const step = dependent.type === 'set' ? applySet(current, dependent) : applyRemove(current, dependent)
    current = step.document
    applied.push(...step.applied)
  }
  return {
    document: { ...current, hubs: without(current.hubs, hubId) },
    applied: [...applied, operation],
    dropped: [],
  }
}

function removal(target: RemoveOperation['target']): RemoveOperation {
  return { type: 'remove', target }
}

function removed(document: LayoutDocument, operation: RemoveOperation): ApplyResult {
  return { document, applied: [operation], dropped: [] }
}

function without<Item extends { id: string }>(items: readonly Item[], id: string): Item[] {
  return items.filter((item) => item.id !== id)
}
