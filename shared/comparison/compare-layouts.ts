/**
 * What changed between two layouts, in words a reviewer reads: parts added, removed and changed,
 * each changed field with its value before and after and its unit. Parts are matched by id.
 */
import { equalValues } from '../layout/equal-values'
import type { LayoutDocument } from '../layout/layout-document'
import { describeField, type FieldValue, flattenFields } from './describe-fields'

export type ComparedKind =
  'layout' | 'shaft' | 'section' | 'hub' | 'bearing' | 'loadCase' | 'load' | 'timing' | 'criteria'

export interface FieldChange {
  /** Dot path inside the part, such as `friction.axial`. */
  field: string
  label: string
  /** Null where the value is absent. */
  before: FieldValue
  after: FieldValue
  unit: string
}

export interface LayoutDifference {
  change: 'added' | 'removed' | 'changed'
  kind: ComparedKind
  id: string
  /** As people call it: "wheel, first stage", "section 3". */
  name: string
  /** Empty for what was added or removed. */
  fields: FieldChange[]
}

interface ComparedPart {
  kind: ComparedKind
  id: string
  name: string
  fields: Map<string, FieldValue>
}

const KIND_ORDER: ComparedKind[] = [
  'layout',
  'shaft',
  'section',
  'hub',
  'bearing',
  'loadCase',
  'load',
  'timing',
  'criteria',
]

export function compareLayouts(before: LayoutDocument, after: LayoutDocument): LayoutDifference[] {
  const old = partsOf(before)
  const present = partsOf(after)
  const differences: LayoutDifference[] = []
  for (const [key, part] of present) {
    const earlier = old.get(key)
    if (!earlier)
      differences.push({ change: 'added', kind: part.kind, id: part.id, name: part.name, fields: [] })
    else {
      const fields = changedFields(earlier, part)
      if (fields.length > 0)
        differences.push({ change: 'changed', kind: part.kind, id: part.id, name: part.name, fields })
    }
  }
  for (const [key, part] of old)
    if (!present.has(key))
      differences.push({ change: 'removed', kind: part.kind, id: part.id, name: part.name, fields: [] })
  differences.push(...reordered(before, after))
  return differences.sort((a, b) => KIND_ORDER.indexOf(a.kind) - KIND_ORDER.indexOf(b.kind))
}

function changedFields(before: ComparedPart, after: ComparedPart): FieldChange[] {
  const paths = [...new Set([...before.fields.keys(), ...after.fields.keys()])]
  return paths.flatMap((field) => {
    const old = before.fields.get(field) ?? null
    const present = after.fields.get(field) ?? null
    if (equalValues(old, present)) return []
    return [{ field, ...describeField(field), before: old, after: present }]
  })
}

/** Sections and load cases whose order among those that stayed has changed; one entry for each kind. */
function reordered(before: LayoutDocument, after: LayoutDocument): LayoutDifference[] {
  const lists = [
    { kind: 'section', name: 'shaft sections', old: before.shaft.sections, present: after.shaft.sections },
    { kind: 'loadCase', name: 'load cases', old: before.loadCases, present: after.loadCases },
  ] as const
  return lists.flatMap(({ kind, name, old, present }): LayoutDifference[] => {
    const kept = new Set(present.map((item) => item.id))
    const known = new Set(old.map((item) => item.id))
    const oldOrder = old.map((item) => item.id).filter((id) => kept.has(id))
    const newOrder = present.map((item) => item.id).filter((id) => known.has(id))
    if (equalValues(oldOrder, newOrder)) return []
    const order = {
      field: 'order',
      label: 'Order',
      before: oldOrder.join(', '),
      after: newOrder.join(', '),
      unit: '',
    }
    return [{ change: 'changed', kind, id: '', name, fields: [order] }]
  })
}

function partsOf(document: LayoutDocument): Map<string, ComparedPart> {
  const parts = new Map<string, ComparedPart>()
  const put = (kind: ComparedKind, id: string, name: string, values: object, leaveOut: string[] = []) => {
    parts.set(`${kind} ${id}`, { kind, id, name, fields: flattenFields(values, leaveOut) })
  }
  const hubName = (id: string) => document.hubs.find((hub) => hub.id === id)?.name ?? id
  put('layout', '', 'layout', { name: document.name })
  put('shaft', '', 'shaft', { material: document.shaft.material })
  document.shaft.sections.forEach((section, index) => {
    put('section', section.id, `section ${index + 1}`, section, ['id'])
  })
  for (const hub of document.hubs) put('hub', hub.id, hub.name, hub, ['id'])
  for (const bearing of document.bearings)
    put('bearing', bearing.id, `bearing ${bearing.name}`, bearing, ['id'])
  for (const loadCase of document.loadCases) {
    put('loadCase', loadCase.id, loadCase.name, loadCase, ['id', 'loads'])
    for (const load of loadCase.loads)
      put('load', `${loadCase.id}/${load.id}`, `load on ${hubName(load.hub)} in ${loadCase.name}`, load, [
        'id',
      ])
  }
  for (const entry of document.timing)
    put('timing', entry.hub, `timing of ${hubName(entry.hub)}`, entry, ['hub'])
  put('criteria', '', 'criteria', document.criteria)
  return parts
}
