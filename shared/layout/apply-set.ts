import { dropOperation, type ApplyResult } from './apply-result'
import { equalValues } from './equal-values'
import { findTarget, hasHub, type TargetObject } from './find-target'
import type { LayoutDocument } from './layout-document'
import { isEmpty, withoutNulls } from './normalise-values'
import type { SetOperation } from './operations'
import { replaceTarget } from './replace-target'
import { settableField, type SettableField } from './settable-fields'

export function applySet(document: LayoutDocument, operation: SetOperation): ApplyResult {
  const field = settableField(operation.target.kind, operation.field)
  if (!field) return dropOperation(document, operation, 'invalidValue')
  const target = findTarget(document, operation.target)
  if (!target) return dropOperation(document, operation, 'targetMissing')

  const parsed = field.schema.safeParse(withoutNulls(operation.value ?? undefined))
  if (!parsed.success) return dropOperation(document, operation, 'invalidValue')
  const value = withoutMissingHubs(document, operation, parsed.data)
  if (value === MISSING_HUB) return dropOperation(document, operation, 'targetMissing')

  const before = readField(target, field.path)
  if (equalValues(before, value)) return dropOperation(document, operation, 'noChange')
  const applied: SetOperation = {
    type: 'set',
    target: operation.target,
    field: operation.field,
    before: before ?? null,
    value: value ?? null,
  }
  return {
    document: replaceTarget(document, operation.target, writeField(target, field, value)),
    applied: [applied],
    dropped: [],
  }
}

/** The value at a field, `undefined` when absent. */
export function readField(target: TargetObject, path: SettableField['path']): unknown {
  const [head, leaf] = path
  const value = Object.hasOwn(target, head) ? target[head] : undefined
  if (leaf === undefined) return value
  if (typeof value !== 'object' || value === null || !Object.hasOwn(value, leaf)) return undefined
  return (value as TargetObject)[leaf]
}

function writeField(target: TargetObject, field: SettableField, value: unknown): TargetObject {
  const [head, leaf] = field.path
  if (leaf === undefined) return withMember(target, head, value)
  const parent = withMember((readField(target, [head]) ?? {}) as TargetObject, leaf, value)
  // Clearing the last leaf of an optional object removes the object, as if it had never been given.
  return withMember(target, head, field.isParentOptional && isEmpty(parent) ? undefined : parent)
}

function withMember(record: TargetObject, name: string, value: unknown): TargetObject {
  if (value !== undefined) return { ...record, [name]: value }
  return Object.fromEntries(Object.entries(record).filter(([key]) => key !== name))
}

const MISSING_HUB = Symbol('missing hub')

/** Fields that name hubs: a load's `hub` and the keys of `hubTemperaturesC`. */
function withoutMissingHubs(document: LayoutDocument, operation: SetOperation, value: unknown): unknown {
  if (operation.target.kind === 'load' && operation.field === 'hub') {
    return hasHub(document, value as string) ? value : MISSING_HUB
  }
  if (operation.target.kind !== 'loadCase') return value
  const [head, hubId] = [operation.field.split('.', 1)[0], operation.field.slice('hubTemperaturesC.'.length)]
  if (head === 'hubTemperaturesC') {
    if (operation.field !== head) return value === undefined || hasHub(document, hubId) ? value : MISSING_HUB
    const kept = Object.fromEntries(
      Object.entries((value ?? {}) as Record<string, number>).filter(([id]) => hasHub(document, id)),
    )
    return isEmpty(kept) ? undefined : kept
  }
  return head === operation.field && head === 'criteria' && isEmpty(value as object | undefined)
    ? undefined
    : value
}
