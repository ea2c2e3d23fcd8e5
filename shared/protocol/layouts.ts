/** REST shapes for the list of layouts. The live document itself travels over the socket. */
import { z } from 'zod'
import { layoutDocumentSchema, nameSchema } from '../layout/layout-document'
import { roleSchema } from './roles'

export const layoutStatusSchema = z.enum(['draft', 'inReview', 'released', 'withdrawn'])

/** Geometry enough to draw a thumbnail. */
export const thumbnailSchema = z.strictObject({
  sections: z.array(
    z.strictObject({ lengthMm: z.number(), outerDiameterMm: z.number(), boreDiameterMm: z.number() }),
  ),
  hubs: z.array(
    z.strictObject({
      stationMm: z.number(),
      lengthMm: z.number(),
      outerDiameterMm: z.number(),
      boreDiameterMm: z.number(),
      verdict: z.enum(['passes', 'fails', 'notComputable']),
    }),
  ),
  bearings: z.array(z.strictObject({ stationMm: z.number(), widthMm: z.number(), diameterMm: z.number() })),
})

export const layoutSummarySchema = z.strictObject({
  id: z.string(),
  workspaceId: z.string(),
  name: z.string(),
  project: z.string().nullable(),
  status: layoutStatusSchema,
  revisionLetter: z.string(),
  revision: z.number().int(),
  isArchived: z.boolean(),
  verdict: z.enum(['passes', 'fails']),
  failingCount: z.number().int(),
  /** Shortest words for the card, such as "wheel, first stage slips in run". Empty when it passes. */
  worstFinding: z.string(),
  editedAt: z.string(),
  editedByName: z.string(),
  peopleInIt: z.array(z.strictObject({ userId: z.string(), name: z.string() })),
  thumbnail: thumbnailSchema,
})
/** GET /api/workspaces/:workspaceId/layouts?archived=true */
export const layoutListSchema = z.strictObject({ layouts: z.array(layoutSummarySchema) })

/** POST /api/workspaces/:workspaceId/layouts -> 201 layoutSummary */
export const createLayoutBodySchema = z.strictObject({
  name: nameSchema.optional(),
  project: z.string().trim().max(80).nullish(),
  from: z.discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('blank') }),
    z.strictObject({ kind: z.literal('example'), exampleId: z.string() }),
    z.strictObject({ kind: z.literal('layout'), layoutId: z.string() }),
    z.strictObject({ kind: z.literal('file'), content: z.unknown() }),
  ]),
})

/** PATCH /api/layouts/:layoutId -> layoutSummary. Renaming the document goes through an edit on the server. */
export const updateLayoutBodySchema = z.strictObject({
  name: nameSchema.optional(),
  project: z.string().trim().max(80).nullable().optional(),
  isArchived: z.boolean().optional(),
})

/** GET /api/layouts/:layoutId */
export const layoutViewSchema = layoutSummarySchema.omit({ thumbnail: true, peopleInIt: true }).extend({
  role: roleSchema,
  workspaceName: z.string(),
  document: layoutDocumentSchema,
})
// GET /api/layouts/:layoutId/export -> the layout file as an attachment

/** One of GET /api/examples, for any signed-in person. */
export const exampleSchema = z.strictObject({
  id: z.string(),
  name: z.string(),
  story: z.string(),
  thumbnail: thumbnailSchema,
})
export const exampleListSchema = z.strictObject({ examples: z.array(exampleSchema) })

export type LayoutStatus = z.infer<typeof layoutStatusSchema>
export type Thumbnail = z.infer<typeof thumbnailSchema>
export type LayoutSummary = z.infer<typeof layoutSummarySchema>
export type LayoutView = z.infer<typeof layoutViewSchema>
export type CreateLayoutBody = z.infer<typeof createLayoutBodySchema>
export type UpdateLayoutBody = z.infer<typeof updateLayoutBodySchema>
export type Example = z.infer<typeof exampleSchema>
