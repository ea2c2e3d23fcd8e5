/**
 * Which fields a `set` operation may point at, read off the document schemas so that a new field
 * of the document is settable without a second list to keep. Ids, references that make up an
 * identity, and nested collections are not settable: they change by add, remove and reorder.
 */
import { z } from 'zod'
import {
  bearingSchema,
  criteriaSchema,
  hubSchema,
  layoutDocumentSchema,
  loadCaseSchema,
  loadSchema,
  shaftSectionSchema,
  timingEntrySchema,
} from './layout-document'
import type { Target } from './operations'

type Shape = Readonly<Record<string, z.ZodType>>

interface TargetFields {
  shape: Shape
  /** Fields that identify the target or that other operations own. */
  fixed: ReadonlySet<string>
}

const TARGET_FIELDS: Record<Target['kind'], TargetFields> = {
  layout: {
    shape: layoutDocumentSchema.shape,
    fixed: new Set(['format', 'version', 'shaft', 'hubs', 'bearings', 'loadCases', 'timing', 'criteria']),
  },
  shaft: { shape: layoutDocumentSchema.shape.shaft.shape, fixed: new Set(['sections']) },
  criteria: { shape: criteriaSchema.shape, fixed: new Set() },
  section: { shape: shaftSectionSchema.shape, fixed: new Set(['id']) },
  hub: { shape: hubSchema.shape, fixed: new Set(['id']) },
  bearing: { shape: bearingSchema.shape, fixed: new Set(['id']) },
  loadCase: { shape: loadCaseSchema.shape, fixed: new Set(['id', 'loads']) },
  load: { shape: loadSchema.shape, fixed: new Set(['id']) },
  timing: { shape: timingEntrySchema.shape, fixed: new Set(['hub']) },
}

/** Objects whose parts only make sense together are set whole: no dot path leads into them. */
const SET_WHOLE: ReadonlySet<string> = new Set(['fit', 'material'])

export interface SettableField {
  /** Names from the target to the field: one or two of them. */
  path: [string] | [string, string]
  /** Validates a new value. `undefined` stands for "cleared". */
  schema: z.ZodType
  /** Schema of the object the leaf lives in, when the path has two names and that object may be absent. */
  isParentOptional: boolean
}

/** The settable field, or null when this target has no such field. */
export function settableField(kind: Target['kind'], field: string): SettableField | null {
  const { shape, fixed } = TARGET_FIELDS[kind]
  const dot = field.indexOf('.')
  const head = dot < 0 ? field : field.slice(0, dot)
  if (fixed.has(head) || !Object.hasOwn(shape, head)) return null
  const headSchema = shape[head]
  if (headSchema === undefined) return null
  if (dot < 0) return { path: [head], schema: headSchema, isParentOptional: false }

  const leaf = field.slice(dot + 1)
  if (SET_WHOLE.has(head)) return null
  const isParentOptional = headSchema.safeParse(undefined).success
  const inner = withoutWrappers(headSchema)
  if (inner instanceof z.ZodObject) {
    const innerShape = inner.shape as Shape
    const leafSchema = Object.hasOwn(innerShape, leaf) ? innerShape[leaf] : undefined
    return leafSchema ? { path: [head, leaf], schema: leafSchema, isParentOptional } : null
  }
  if (inner instanceof z.ZodRecord) {
    const isKey = (inner.keyType as z.ZodType).safeParse(leaf).success
    const valueSchema = (inner.valueType as z.ZodType).optional()
    return isKey ? { path: [head, leaf], schema: valueSchema, isParentOptional } : null
  }
  return null
}

/** Every settable field name of a target kind; records appear as `name.*`. For tests and documentation. */
export function settableFieldNames(kind: Target['kind']): string[] {
  const { shape, fixed } = TARGET_FIELDS[kind]
  return Object.keys(shape)
    .filter((name) => !fixed.has(name))
    .flatMap((name) => {
      const inner = withoutWrappers(shape[name] as z.ZodType)
      if (SET_WHOLE.has(name)) return [name]
      if (inner instanceof z.ZodObject) {
        return [name, ...Object.keys(inner.shape as Shape).map((leaf) => `${name}.${leaf}`)]
      }
      return inner instanceof z.ZodRecord ? [name, `${name}.*`] : [name]
    })
}

function withoutWrappers(schema: z.ZodType): z.ZodType {
  let inner: z.ZodType = schema
  while (inner instanceof z.ZodOptional || inner instanceof z.ZodNullable || inner instanceof z.ZodDefault) {
    inner = inner.unwrap() as z.ZodType
  }
  return inner
}
