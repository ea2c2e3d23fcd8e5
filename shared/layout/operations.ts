/**
 * The typed vocabulary of change. One edit is one user action: one undo step, one revision.
 * Operations name their target by id, never by array position, so that they still mean the
 * same thing after somebody else's edit.
 */
import { z } from 'zod'
import {
  bearingSchema,
  hubSchema,
  loadCaseSchema,
  loadSchema,
  partIdSchema,
  shaftSectionSchema,
  timingEntrySchema,
} from './layout-document'

/** What a `set` operation may point at. `criteria` inside a load case goes through its load case. */
export const targetSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('layout') }),
  z.strictObject({ kind: z.literal('shaft') }),
  z.strictObject({ kind: z.literal('criteria') }),
  z.strictObject({ kind: z.literal('section'), id: partIdSchema }),
  z.strictObject({ kind: z.literal('hub'), id: partIdSchema }),
  z.strictObject({ kind: z.literal('bearing'), id: partIdSchema }),
  z.strictObject({ kind: z.literal('loadCase'), id: partIdSchema }),
  z.strictObject({ kind: z.literal('load'), loadCaseId: partIdSchema, id: partIdSchema }),
  z.strictObject({ kind: z.literal('timing'), hub: partIdSchema }),
])

/**
 * `field` is a dot path inside the target (`lengthMm`, `friction.axial`, `joining.side`, `fit`).
 * Each field of the document schema is settable except ids and nested collections; `fit` and
 * `material` are set whole because their parts only make sense together. `value: null` clears an
 * optional field. `before` is what the author saw: the server tells both people when it differs.
 */
export const setOperationSchema = z.strictObject({
  type: z.literal('set'),
  target: targetSchema,
  field: z
    .string()
    .min(1)
    .max(96)
    .regex(/^[A-Za-z][A-Za-z0-9]*(\.[A-Za-z0-9][A-Za-z0-9 _.:-]*)?$/),
  /** Left out when the field was absent (JSON has no `undefined`). */
  before: z.unknown().optional(),
  value: z.unknown(),
})

/** `index` is where the author saw it; it is clamped when the list has changed. */
const index = z.number().int().min(0).max(1_000)

export const addOperationSchema = z.discriminatedUnion('collection', [
  z.strictObject({
    type: z.literal('add'),
    collection: z.literal('sections'),
    index,
    item: shaftSectionSchema,
  }),
  z.strictObject({ type: z.literal('add'), collection: z.literal('hubs'), index, item: hubSchema }),
  z.strictObject({ type: z.literal('add'), collection: z.literal('bearings'), index, item: bearingSchema }),
  z.strictObject({ type: z.literal('add'), collection: z.literal('loadCases'), index, item: loadCaseSchema }),
  z.strictObject({
    type: z.literal('add'),
    collection: z.literal('loads'),
    loadCaseId: partIdSchema,
    index,
    item: loadSchema,
  }),
  z.strictObject({ type: z.literal('add'), collection: z.literal('timing'), index, item: timingEntrySchema }),
])

export const removeOperationSchema = z.strictObject({
  type: z.literal('remove'),
  target: targetSchema.refine(
    (target) => target.kind !== 'layout' && target.kind !== 'shaft' && target.kind !== 'criteria',
    'This cannot be removed',
  ),
  /** Words for what was removed, filled in when the operation is applied: afterwards nobody could tell. */
  name: z.string().max(200).optional(),
})

/** Sections and load cases have an order that people may change. */
export const reorderOperationSchema = z.strictObject({
  type: z.literal('reorder'),
  target: targetSchema.refine(
    (target) => target.kind === 'section' || target.kind === 'loadCase' || target.kind === 'hub',
    'Only sections, hubs and load cases have an order',
  ),
  index,
})

export const operationSchema = z.union([
  setOperationSchema,
  addOperationSchema,
  removeOperationSchema,
  reorderOperationSchema,
])

export type Target = z.infer<typeof targetSchema>
export type SetOperation = z.infer<typeof setOperationSchema>
export type AddOperation = z.infer<typeof addOperationSchema>
export type RemoveOperation = z.infer<typeof removeOperationSchema>
export type ReorderOperation = z.infer<typeof reorderOperationSchema>
export type Operation = z.infer<typeof operationSchema>
