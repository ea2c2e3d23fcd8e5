import type { LayoutDocument } from '@shared/layout/layout-document'
import type { LayoutStatus } from '@shared/protocol/layouts'
import { booleanFromColumn, booleanToColumn, jsonFromColumn, jsonToColumn } from '../database/codecs'
import type { Queries, WriteTransaction } from '../database/open-database'

export interface StoredLayoutListing {
  id: string
  workspaceId: string
  workspaceName: string
  project: string | null
  status: LayoutStatus
  revisionLetter: string
  revision: number
  epoch: string
  isArchived: boolean
  editedAt: string
  editedByName: string
  document: LayoutDocument
}

export interface NewLayout {
  id: string
  workspaceId: string
  project: string | null
  epoch: string
  document: LayoutDocument
  createdAt: string
  createdBy: string
}

function selectListings(queries: Queries) {
  return queries.kysely
    .selectFrom('layout')
    .innerJoin('organization', 'organization.id', 'layout.workspace_id')
    .innerJoin('user', 'user.id', 'layout.edited_by')
    .select([
      'layout.id',
      'layout.workspace_id as workspaceId',
      'organization.name as workspaceName',
      'layout.project',
      'layout.status',
      'layout.revision_letter as revisionLetter',
      'layout.revision',
      'layout.epoch',
      'layout.is_archived as isArchived',
      'layout.edited_at as editedAt',
      'user.name as editedByName',
      'layout.document',
    ])
}

type ListingRow = Omit<StoredLayoutListing, 'isArchived' | 'document'> & {
  isArchived: 0 | 1
  document: string
}

function listingFromRow({ isArchived, document, ...row }: ListingRow): StoredLayoutListing {
  return {
    ...row,
    isArchived: booleanFromColumn(isArchived),
    // Checked against the schema on its way in; parsing each again would slow every list.
    document: jsonFromColumn(document) as LayoutDocument,
  }
}

export function listLayouts(
  queries: Queries,
  workspaceId: string,
  isArchived: boolean,
): StoredLayoutListing[] {
  return queries
    .all(
      selectListings(queries)
        .where('layout.workspace_id', '=', workspaceId)
        .where('layout.is_archived', '=', booleanToColumn(isArchived))
        .orderBy('layout.edited_at', 'desc'),
    )
    .map(listingFromRow)
}

export function findLayout(queries: Queries, layoutId: string): StoredLayoutListing | undefined {
  const row = queries.first(selectListings(queries).where('layout.id', '=', layoutId))
  return row && listingFromRow(row)
}

export function insertLayout(transaction: WriteTransaction, layout: NewLayout): void {
  transaction.run(
    transaction.kysely.insertInto('layout').values({
      id: layout.id,
      workspace_id: layout.workspaceId,
      name: layout.document.name,
      project: layout.project,
      status: 'draft',
      revision_letter: 'A',
      revision: 0,
      epoch: layout.epoch,
      document: jsonToColumn(layout.document),
      is_archived: 0,
      created_at: layout.createdAt,
      created_by: layout.createdBy,
      edited_at: layout.createdAt,
      edited_by: layout.createdBy,
      review_asked_by: null,
      review_asked_at: null,
      review_note: null,
    }),
  )
}

export function updateListing(
  transaction: WriteTransaction,
  layoutId: string,
  change: { project?: string | null; isArchived?: boolean },
): void {
  const { project, isArchived } = change
  if (project === undefined && isArchived === undefined) return
  transaction.run(
    transaction.kysely
      .updateTable('layout')
      .set({
        ...(project === undefined ? {} : { project }),
        ...(isArchived === undefined ? {} : { is_archived: booleanToColumn(isArchived) }),
      })
      .where('id', '=', layoutId),
  )
}
