/** The log of edits in SQLite: SQL only. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import type { AcceptedEdit, EditNotice, SubmitOutcome } from '@shared/protocol/realtime'
import { jsonFromColumn, jsonToColumn } from '../database/codecs'
import type { AppDatabase, Queries, WriteTransaction } from '../database/open-database'
import type { EditKey, EditReads, EditStorage, EditTransaction, Receipt } from './edit-storage'
import type { LayoutEditReceiptTable, LayoutEditTable } from './edits.table'

/** A transaction of the log that also carries the transaction itself, for what must commit with an entry. */
export interface SqliteEditTransaction extends EditTransaction {
  readonly sql: WriteTransaction
}

export function createEditStorage(database: AppDatabase): EditStorage<SqliteEditTransaction> {
  return {
    ...reads(database),
    transaction: (work) => database.writeTransaction((sql) => work({ ...reads(sql), ...writes(sql), sql })),
  }
}

function reads(queries: Queries): EditReads {
  return {
    readLayout(layoutId) {
      const row = queries.first(
        queries.kysely
          .selectFrom('layout')
          .select(['workspace_id', 'document', 'revision', 'epoch', 'status', 'revision_letter'])
          .where('id', '=', layoutId),
      )
      if (!row) return null
      return {
        layoutId,
        workspaceId: row.workspace_id,
        document: documentFrom(row.document),
        revision: row.revision,
        epoch: row.epoch,
        status: row.status,
        revisionLetter: row.revision_letter,
      }
    },
    readEntries: (layoutId, afterRevision) =>
      queries
        .all(
          queries.kysely
            .selectFrom('layout_edit')
            .selectAll()
            .where('layout_id', '=', layoutId)
            .where('revision', '>', afterRevision)
            .orderBy('revision'),
        )
        .map(entryFrom),
    readBase(layoutId) {
      const row = queries.first(
        queries.kysely
          .selectFrom('layout_edit_base')
          .select(['revision', 'document'])
          .where('layout_id', '=', layoutId),
      )
      return row ? { revision: row.revision, document: documentFrom(row.document) } : null
    },
  }
}

function writes(sql: WriteTransaction): Omit<EditTransaction, keyof EditReads> {
  return {
    findReceipt: (layoutId, key) => findReceipt(sql, layoutId, key),
    append(layoutId, entry, document) {
      keepBase(sql, layoutId)
      sql.run(
        sql.kysely.insertInto('layout_edit').values({
          layout_id: layoutId,
          revision: entry.revision,
          kind: entry.kind,
          edit_id: entry.editId,
          client_id: entry.clientId,
          client_seq: entry.clientSeq,
          user_id: entry.userId,
          user_name: entry.userName,
          label: entry.label,
          operations: jsonToColumn(entry.operations),
          notices: jsonToColumn(entry.notices),
          accepted_at: entry.acceptedAt,
        }),
      )
      storeDocument(sql, layoutId, entry, document)
    },
    storeReceipt(layoutId, { outcome, userId, ...key }) {
      const isInLog = outcome.outcome === 'accepted' || outcome.outcome === 'adjusted'
      sql.run(
        sql.kysely.insertInto('layout_edit_receipt').values({
          layout_id: layoutId,
          client_id: key.clientId,
          client_seq: key.clientSeq,
          edit_id: key.editId,
          user_id: userId,
          outcome: outcome.outcome,
          revision: isInLog ? outcome.edit.revision : null,
          answer: isInLog ? null : jsonToColumn(outcome),
          answered_at: new Date().toISOString(),
        }),
      )
    },
  }
}

/** The first entry needs what it was applied to: without it the log could not be replayed. */
function keepBase(sql: WriteTransaction, layoutId: string): void {
  const query = sql.kysely
    .selectFrom('layout_edit_base')
    .select('layout_id')
    .where('layout_id', '=', layoutId)
  if (sql.first(query)) return
  sql.run(
    sql.kysely
      .insertInto('layout_edit_base')
      .columns(['layout_id', 'revision', 'document'])
      .expression((builder) =>
        builder.selectFrom('layout').select(['id', 'revision', 'document']).where('id', '=', layoutId),
      ),
  )
}

function storeDocument(
  sql: WriteTransaction,
  layoutId: string,
  entry: AcceptedEdit,
  document: LayoutDocument,
): void {
  const change =
    entry.kind === 'edit'
      ? {
          revision: entry.revision,
          document: jsonToColumn(document),
          // Lists read the name from its column.
          name: document.name,
          edited_at: entry.acceptedAt,
          edited_by: entry.userId,
        }
      : { revision: entry.revision }
  const { changes } = sql.run(
    sql.kysely
      .updateTable('layout')
      .set(change)
      .where('id', '=', layoutId)
      .where('revision', '=', entry.revision - 1),
  )
  if (changes !== 1) throw new Error(`Layout ${layoutId} is not at revision ${entry.revision - 1}`)
}

function findReceipt(sql: WriteTransaction, layoutId: string, key: EditKey): Receipt | null {
  const receipts = sql.kysely.selectFrom('layout_edit_receipt').selectAll().where('layout_id', '=', layoutId)
  const row =
    sql.first(receipts.where('edit_id', '=', key.editId)) ??
    sql.first(
      receipts
        .where('user_id', '=', key.userId)
        .where('client_id', '=', key.clientId)
        .where('client_seq', '=', key.clientSeq),
    )
  if (!row) return null
  return {
    editId: row.edit_id,
    clientId: row.client_id,
    clientSeq: row.client_seq,
    userId: row.user_id,
    outcome: outcomeFrom(sql, row),
  }
}

function outcomeFrom(sql: WriteTransaction, row: LayoutEditReceiptTable): SubmitOutcome {
  if (row.answer !== null) return jsonFromColumn(row.answer) as SubmitOutcome
  const entry = sql.first(
    sql.kysely
      .selectFrom('layout_edit')
      .selectAll()
      .where('layout_id', '=', row.layout_id)
      .where('edit_id', '=', row.edit_id),
  )
  if (!entry) throw new Error(`Edit ${row.edit_id} has a receipt but no log entry`)
  return { outcome: row.outcome === 'adjusted' ? 'adjusted' : 'accepted', edit: entryFrom(entry) }
}

/** What this process stored went through the schemas on its way in; parsing it again would cost each opening. */
function documentFrom(column: string): LayoutDocument {
  return jsonFromColumn(column) as LayoutDocument
}

function entryFrom(row: LayoutEditTable): AcceptedEdit {
  return {
    kind: row.kind,
    revision: row.revision,
    editId: row.edit_id,
    clientId: row.client_id,
    clientSeq: row.client_seq,
    userId: row.user_id,
    userName: row.user_name,
    label: row.label,
    operations: jsonFromColumn(row.operations) as Operation[],
    notices: jsonFromColumn(row.notices) as EditNotice[],
    acceptedAt: row.accepted_at,
  }
}
