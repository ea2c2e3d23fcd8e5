/** SQL of releases. Inserts only: the tables refuse everything else. */
import type { InferResult } from 'kysely'
import { canonicalJson } from '@shared/layout/canonical-json'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { LayoutStatus } from '@shared/protocol/layouts'
import type { Acceptance, MethodNotes } from '@shared/protocol/releases'
import type { LayoutResults } from '@shared/recalculation/layout-results'
import { jsonFromColumn } from '../database/codecs'
import type { Queries, WriteTransaction } from '../database/open-database'
import type { StoredRelease, Withdrawal } from './release-storage'

/** A layout as the release desk needs it. */
export interface ReviewedLayout {
  id: string
  workspaceId: string
  workspaceName: string
  status: LayoutStatus
  revisionLetter: string
  revision: number
  document: LayoutDocument
  reviewAskedByName: string | null
  reviewAskedAt: string | null
  reviewNote: string | null
}

function selectLayouts(queries: Queries) {
  return queries.kysely
    .selectFrom('layout')
    .innerJoin('organization', 'organization.id', 'layout.workspace_id')
    .leftJoin('user as asker', 'asker.id', 'layout.review_asked_by')
    .select([
      'layout.id',
      'layout.workspace_id as workspaceId',
      'organization.name as workspaceName',
      'layout.status',
      'layout.revision_letter as revisionLetter',
      'layout.revision',
      'layout.document',
      'asker.name as reviewAskedByName',
      'layout.review_asked_at as reviewAskedAt',
      'layout.review_note as reviewNote',
    ])
}

type LayoutRow = Omit<ReviewedLayout, 'document'> & { document: string }

/** Checked against the schema on its way in. */
const layoutFromRow = (row: LayoutRow): ReviewedLayout => ({
  ...row,
  document: jsonFromColumn(row.document) as LayoutDocument,
})

export function findReviewedLayout(queries: Queries, layoutId: string): ReviewedLayout | undefined {
  const row = queries.first(selectLayouts(queries).where('layout.id', '=', layoutId))
  return row && layoutFromRow(row)
}

/** What is waiting for review, the oldest question first. */
export function layoutsInReview(queries: Queries, workspaceId: string): ReviewedLayout[] {
  return queries
    .all(
      selectLayouts(queries)
        .where('layout.workspace_id', '=', workspaceId)
        .where('layout.status', '=', 'inReview')
        .where('layout.is_archived', '=', 0)
        .orderBy('layout.review_asked_at'),
    )
    .map(layoutFromRow)
}

/** Drafts of layouts that have a release. */
export function nextRevisionDrafts(queries: Queries, workspaceId: string): ReviewedLayout[] {
  return queries
    .all(
      selectLayouts(queries)
        .where('layout.workspace_id', '=', workspaceId)
        .where('layout.status', '=', 'draft')
        .where('layout.is_archived', '=', 0)
        .where((where) =>
          where.exists(
            where
              .selectFrom('layout_release')
              .select('layout_release.id')
              .whereRef('layout_release.layout_id', '=', 'layout.id'),
          ),
        )
        .orderBy('layout.edited_at', 'desc'),
    )
    .map(layoutFromRow)
}

export function setLayoutStatus(
  transaction: WriteTransaction,
  layoutId: string,
  change: {
    status: LayoutStatus
    revisionLetter?: string
    review?: { askedBy: string; askedAt: string; note: string } | null
  },
): void {
  const { status, revisionLetter, review } = change
  transaction.run(
    transaction.kysely
      .updateTable('layout')
      .set({
        status,
        ...(revisionLetter === undefined ? {} : { revision_letter: revisionLetter }),
        ...(review === undefined
          ? {}
          : {
              review_asked_by: review?.askedBy ?? null,
              review_asked_at: review?.askedAt ?? null,
              review_note: review?.note ?? null,
            }),
      })
      .where('id', '=', layoutId),
  )
}

function selectReleases(queries: Queries) {
  return queries.kysely
    .selectFrom('layout_release as release')
    .leftJoin('layout_release_withdrawal as withdrawal', 'withdrawal.release_id', 'release.id')
    .selectAll('release')
    .select([
      'withdrawal.reason as withdrawal_reason',
      'withdrawal.withdrawn_by',
      'withdrawal.withdrawn_by_name',
      'withdrawal.withdrawn_at',
    ])
}

type ReleaseRow = InferResult<ReturnType<typeof selectReleases>>[number]

function releaseFromRow(row: ReleaseRow): StoredRelease {
  return {
    id: row.id,
    workspaceId: row.workspace_id,
    workspaceName: row.workspace_name,
    layoutId: row.layout_id,
    layoutName: row.layout_name,
    sequence: row.sequence,
    revisionLetter: row.revision_letter,
    revision: row.revision,
    // A release is shown as it was stored, also where the schema has moved on since.
    document: jsonFromColumn(row.document) as LayoutDocument,
    documentHash: row.document_hash,
    results: jsonFromColumn(row.results) as LayoutResults,
    engineVersion: row.engine_version,
    method: jsonFromColumn(row.method) as MethodNotes,
    verdict: row.verdict,
    acceptances: jsonFromColumn(row.acceptances) as Acceptance[],
    note: row.note,
    reviewAskedByName: row.review_asked_by_name,
    reviewAskedAt: row.review_asked_at,
    frozenBy: row.frozen_by,
    frozenByName: row.frozen_by_name,
    frozenAt: row.frozen_at,
    previousHash: row.previous_hash,
    releaseHash: row.release_hash,
    withdrawal: withdrawalFromRow(row),
  }
}

function withdrawalFromRow(row: ReleaseRow): Withdrawal | null {
  if (row.withdrawn_at === null || row.withdrawn_by === null) return null
  return {
    reason: row.withdrawal_reason ?? '',
    withdrawnBy: row.withdrawn_by,
    withdrawnByName: row.withdrawn_by_name ?? '',
    withdrawnAt: row.withdrawn_at,
  }
}

export function findRelease(queries: Queries, releaseId: string): StoredRelease | undefined {
  const row = queries.first(selectReleases(queries).where('release.id', '=', releaseId))
  return row && releaseFromRow(row)
}

/** Newest first. */
export function releasesOfLayout(queries: Queries, layoutId: string): StoredRelease[] {
  return queries
    .all(
      selectReleases(queries).where('release.layout_id', '=', layoutId).orderBy('release.sequence', 'desc'),
    )
    .map(releaseFromRow)
}

/** Newest first. */
export function releasesOfWorkspace(queries: Queries, workspaceId: string): StoredRelease[] {
  return queries
    .all(
      selectReleases(queries)
        .where('release.workspace_id', '=', workspaceId)
        .orderBy('release.frozen_at', 'desc')
        .orderBy('release.sequence', 'desc'),
    )
    .map(releaseFromRow)
}

export function latestRelease(queries: Queries, layoutId: string): StoredRelease | undefined {
  const row = queries.first(
    selectReleases(queries)
      .where('release.layout_id', '=', layoutId)
      .orderBy('release.sequence', 'desc')
      .limit(1),
  )
  return row && releaseFromRow(row)
}

/** Hash of the release before this one in its layout; null before the first. */
export function hashBefore(queries: Queries, release: { layoutId: string; sequence: number }): string | null {
  const row = queries.first(
    queries.kysely
      .selectFrom('layout_release')
      .select('release_hash')
      .where('layout_id', '=', release.layoutId)
      .where('sequence', '=', release.sequence - 1),
  )
  return row?.release_hash ?? null
}

export function insertRelease(
  transaction: WriteTransaction,
  release: Omit<StoredRelease, 'withdrawal'>,
): void {
  transaction.run(
    transaction.kysely.insertInto('layout_release').values({
      id: release.id,
      workspace_id: release.workspaceId,
      workspace_name: release.workspaceName,
      layout_id: release.layoutId,
      layout_name: release.layoutName,
      sequence: release.sequence,
      revision_letter: release.revisionLetter,
      revision: release.revision,
      document: canonicalJson(release.document),
      document_hash: release.documentHash,
      results: canonicalJson(release.results),
      engine_version: release.engineVersion,
      method: canonicalJson(release.method),
      verdict: release.verdict,
      acceptances: canonicalJson(release.acceptances),
      note: release.note,
      review_asked_by_name: release.reviewAskedByName,
      review_asked_at: release.reviewAskedAt,
      frozen_by: release.frozenBy,
      frozen_by_name: release.frozenByName,
      frozen_at: release.frozenAt,
      previous_hash: release.previousHash,
      release_hash: release.releaseHash,
    }),
  )
}

export function insertWithdrawal(
  transaction: WriteTransaction,
  releaseId: string,
  withdrawal: Withdrawal,
): void {
  transaction.run(
    transaction.kysely.insertInto('layout_release_withdrawal').values({
      release_id: releaseId,
      reason: withdrawal.reason,
      withdrawn_by: withdrawal.withdrawnBy,
      withdrawn_by_name: withdrawal.withdrawnByName,
      withdrawn_at: withdrawal.withdrawnAt,
    }),
  )
}
