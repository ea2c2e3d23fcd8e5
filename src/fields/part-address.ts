/** Shorthand for the address of a field of one part or of several of a kind. */
import { fieldWords } from '@shared/layout/field-words'
import type { Bearing, Criteria, Hub, Load, LoadCase, ShaftSection } from '@shared/layout/layout-document'
import type { FieldAddress } from './layout-field'

const labelOf = (field: string, inside: string | undefined, names: readonly string[]) => {
  const words = fieldWords(inside === undefined ? field : `${field}.${inside}`)
  return `Change ${words} of ${names.length === 1 ? names[0] : `${names.length} parts`}`.slice(0, 120)
}

/** Reads `friction.axial` and the like from a part. */
function valueAt(part: object, field: string): unknown {
  let value: unknown = part
  for (const key of field.split('.')) {
    if (typeof value !== 'object' || value === null) return undefined
    value = (value as Record<string, unknown>)[key]
  }
  return value
}

export function hubAddress(hubs: readonly Hub[], field: string, inside?: string): FieldAddress {
  return {
    label: labelOf(
      field,
      inside,
      hubs.map(({ name }) => name),
    ),
    field,
    inside,
    targets: hubs.map((hub) => ({ target: { kind: 'hub', id: hub.id }, value: valueAt(hub, field) })),
  }
}

export function bearingAddress(bearings: readonly Bearing[], field: string): FieldAddress {
  return {
    label: labelOf(
      field,
      undefined,
      bearings.map(({ name }) => `bearing ${name}`),
    ),
    field,
    targets: bearings.map((bearing) => ({
      target: { kind: 'bearing', id: bearing.id },
      value: valueAt(bearing, field),
    })),
  }
}

/** `numberOf` gives the place of a section, which is its only name. */
export function sectionAddress(
  sections: readonly ShaftSection[],
  field: string,
  numberOf: (section: ShaftSection) => number,
): FieldAddress {
  return {
    label: labelOf(
      field,
      undefined,
      sections.map((section) => `section ${numberOf(section)}`),
    ),
    field,
    targets: sections.map((section) => ({
      target: { kind: 'section', id: section.id },
      value: valueAt(section, field),
    })),
  }
}

export function loadCaseAddress(loadCase: LoadCase, field: string, inside?: string): FieldAddress {
  return {
    label: labelOf(field, inside, [loadCase.name]),
    field,
    inside,
    targets: [{ target: { kind: 'loadCase', id: loadCase.id }, value: valueAt(loadCase, field) }],
  }
}

export function loadAddress(loadCase: LoadCase, load: Load, field: string, hubName: string): FieldAddress {
  return {
    label: labelOf(field, undefined, [`load on ${hubName}, ${loadCase.name}`]),
    field,
    targets: [
      { target: { kind: 'load', loadCaseId: loadCase.id, id: load.id }, value: valueAt(load, field) },
    ],
  }
}

export function criteriaAddress(criteria: Criteria, field: keyof Criteria): FieldAddress {
  return {
    label: `Change ${fieldWords(field)} of the acceptance criteria`,
    field,
    targets: [{ target: { kind: 'criteria' }, value: criteria[field] }],
  }
}
