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

/** Names one finding in `fields` of a refusal and in forms: code, part and load case. */
export const findingKey = (finding: { code: string; part: string; loadCase: string | null }): string =>
  `${finding.code}|${finding.part}|${finding.loadCase ?? ''}`

export const releaseSummarySchema = z.strictObject({
  id: z.string(),
  layoutId: z.string(),
  layoutName: z.string(),
  revisionLetter: z.string(),
  /** Revision of the document that was frozen. */
  revision: z.number().int(),
  status: z.enum(['released', 'withdrawn']),
  frozenAt: z.string(),
  frozenByName: z.string(),
  engineVersion: z.string(),
  /** `sha256:` and the SHA-256 of the canonical document. */
  documentHash: z.string(),
  verdict: z.enum(['passes', 'fails']),
  acceptanceCount: z.number().int(),
  note: z.string(),
  withdrawnAt: z.string().nullable(),
  withdrawnByName: z.string().nullable(),
  withdrawalReason: z.string().nullable(),
})

/** What stood behind the numbers at freezing, in words; stored, so that a later engine never explains older numbers. */
export const methodNotesSchema = z.strictObject({
  method: z.array(z.strictObject({ title: z.string(), text: z.string() })),
  notCovered: z.array(z.string()),
})

/** GET /api/releases/:releaseId; `results` is LayoutResults exactly as stored at freezing. */
export const releaseViewSchema = releaseSummarySchema.extend({
  workspaceName: z.string(),
  document: layoutDocumentSchema,
  results: z.unknown(),
  acceptances: z.array(acceptanceSchema),
  reviewAskedByName: z.string().nullable(),
  reviewAskedAt: z.string().nullable(),
  /** Over everything stored, the hash of the release before it included. */
  releaseHash: z.string(),
  previousHash: z.string().nullable(),
  /** Whether the hashes still fit what is stored. */
  integrity: z.enum(['intact', 'broken']),
  method: methodNotesSchema,
  /** Of the layout now: it may have moved on to the next revision. */
  layoutStatus: layoutStatusSchema,
  layoutRevisionLetter: z.string(),
})

/** A finding in the words of its own document. */
const deskFindingSchema = z.strictObject({
  code: z.string(),
  severity: z.enum(['fails', 'warns']),
  part: z.string(),
  partName: z.string(),
  loadCase: z.string().nullable(),
  loadCaseName: z.string().nullable(),
  message: z.string(),
})

const deskLayoutSchema = z.strictObject({
  layoutId: z.string(),
  name: z.string(),
  status: layoutStatusSchema,
  revisionLetter: z.string(),
  revision: z.number().int(),
  verdict: z.enum(['passes', 'fails']),
  failingCount: z.number().int(),
  findings: z.array(deskFindingSchema),
  /** The release it is compared with; null before the first. */
  lastReleaseId: z.string().nullable(),
  lastReleaseLetter: z.string().nullable(),
  /** Parts added, removed or changed since; null before the first. */
  changeCount: z.number().int().nullable(),
})

/** GET /api/workspaces/:workspaceId/releases */
export const releaseDeskSchema = z.strictObject({
  waiting: z.array(
    deskLayoutSchema.extend({ askedByName: z.string(), askedAt: z.string(), note: z.string() }),
  ),
  /** Next revisions in work: drafts of layouts that were released before. */
  drafts: z.array(deskLayoutSchema),
  releases: z.array(releaseSummarySchema),
  deviations: z.array(
    z.strictObject({
      releaseId: z.string(),
      layoutName: z.string(),
      revisionLetter: z.string(),
      code: z.string(),
      part: z.string(),
      partName: z.string(),
      loadCase: z.string().nullable(),
      loadCaseName: z.string().nullable(),
      reason: z.string(),
      acceptedByName: z.string(),
      acceptedAt: z.string(),
    }),
  ),
})
/** GET /api/layouts/:layoutId/releases, newest first */
export const layoutReleasesSchema = z.strictObject({ releases: z.array(releaseSummarySchema) })
// GET /api/releases/:releaseId/sheet.pdf -> the release sheet
// GET /api/releases/:releaseId/document.json -> the canonical document, whose SHA-256 is the document hash
/** POST /api/releases/:releaseId/withdraw */
export const withdrawBodySchema = z.strictObject({
  reason: z.string().trim().min(10, 'Say in at least ten characters why it is withdrawn').max(1_000),
})
// POST /api/layouts/:layoutId/next-revision -> layoutSummary, status draft, next letter

export type Acceptance = z.infer<typeof acceptanceSchema>
export type FreezeBody = z.infer<typeof freezeBodySchema>
export type ReleaseSummary = z.infer<typeof releaseSummarySchema>
export type ReleaseView = z.infer<typeof releaseViewSchema>
export type ReleaseDesk = z.infer<typeof releaseDeskSchema>
export type MethodNotes = z.infer<typeof methodNotesSchema>
export type DeskLayout = z.infer<typeof deskLayoutSchema>
export type DeskFinding = z.infer<typeof deskFindingSchema>
