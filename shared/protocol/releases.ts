/** REST shapes for review, freezing, releases and next revisions. */
import { z } from 'zod'
import { layoutDocumentSchema } from '../layout/layout-document'
import { layoutStatusSchema } from './layouts'

/** A deviation accepted at freezing: the finding by code, part and load case, and why it is accepted. */
export const acceptanceSchema = z.strictObject({
  code: z.string(),
  part: z.string(),
  loadCase: z.string().nullable(),
  reason: z.string().trim().min(10, 'Say in at least ten characters why this is acceptable').max(1_000),
})

/** POST /api/layouts/:layoutId/review { revision } -> status inReview. DELETE takes it back to draft. */
export const reviewBodySchema = z.strictObject({ note: z.string().trim().max(1_000).optional() })

/**
 * POST /api/layouts/:layoutId/freeze -> 201 releaseSummary. `revision` is what the manager saw:
 * an edit accepted since is a `conflict`. Failing findings without acceptance are `fails`.
 */
export const freezeBodySchema = z.strictObject({
  revision: z.number().int().nonnegative(),
  acceptances: z.array(acceptanceSchema).max(200),
  note: z.string().trim().max(1_000).optional(),
})

export const releaseSummarySchema = z.strictObject({
  id: z.string(),
  layoutId: z.string(),
  layoutName: z.string(),
  revisionLetter: z.string(),
  revision: z.number().int(),
  status: z.enum(['released', 'withdrawn']),
  frozenAt: z.string(),
  frozenByName: z.string(),
  engineVersion: z.string(),
  /** SHA-256 of the canonical document. */
  documentHash: z.string(),
  verdict: z.enum(['passes', 'fails']),
  acceptanceCount: z.number().int(),
  note: z.string(),
  withdrawnAt: z.string().nullable(),
  withdrawnByName: z.string().nullable(),
  withdrawalReason: z.string().nullable(),
})
/** GET /api/releases/:releaseId; `results` is LayoutResults exactly as stored at freezing. */
export const releaseViewSchema = releaseSummarySchema.extend({
  document: layoutDocumentSchema,
  results: z.unknown(),
  acceptances: z.array(acceptanceSchema),
})
/** GET /api/workspaces/:workspaceId/releases */
export const releaseDeskSchema = z.strictObject({
  waiting: z.array(
    z.strictObject({
      layoutId: z.string(),
      name: z.string(),
      status: layoutStatusSchema,
      revisionLetter: z.string(),
      revision: z.number().int(),
      verdict: z.enum(['passes', 'fails']),
      failingCount: z.number().int(),
      askedByName: z.string(),
      askedAt: z.string(),
      note: z.string(),
    }),
  ),
  releases: z.array(releaseSummarySchema),
})
// GET /api/layouts/:layoutId/releases -> { releases: releaseSummary[] }
// GET /api/releases/:releaseId/sheet.pdf -> the release sheet
/** POST /api/releases/:releaseId/withdraw */
export const withdrawBodySchema = z.strictObject({ reason: z.string().trim().min(10).max(1_000) })
// POST /api/layouts/:layoutId/next-revision -> layoutSummary, status draft, next letter

export type Acceptance = z.infer<typeof acceptanceSchema>
export type FreezeBody = z.infer<typeof freezeBodySchema>
export type ReleaseSummary = z.infer<typeof releaseSummarySchema>
export type ReleaseView = z.infer<typeof releaseViewSchema>
export type ReleaseDesk = z.infer<typeof releaseDeskSchema>
