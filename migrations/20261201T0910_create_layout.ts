import { type Kysely, sql } from 'kysely'

/** A layout and its present document. The document is the fold of its edits, kept for quick reading. */
export async function up(db: Kysely<unknown>): Promise<void> {
  await db.schema
    .createTable('layout')
    .addColumn('id', 'text', (column) => column.notNull().primaryKey())
    .addColumn('workspace_id', 'text', (column) =>
      column.notNull().references('organization.id').onDelete('restrict'),
    )
    .addColumn('name', 'text', (column) => column.notNull())
    .addColumn('project', 'text')
    .addColumn('status', 'text', (column) =>
      column.notNull().check(sql`status in ('draft', 'inReview', 'released', 'withdrawn')`),
    )
    .addColumn('revision_letter', 'text', (column) => column.notNull())
    .addColumn('revision', 'integer', (column) => column.notNull().check(sql`revision >= 0`))
    .addColumn('epoch', 'text', (column) => column.notNull())
    .addColumn('document', 'text', (column) => column.notNull().check(sql`json_valid(document)`))
    .addColumn('is_archived', 'integer', (column) => column.notNull().check(sql`is_archived in (0, 1)`))
    .addColumn('created_at', 'text', (column) => column.notNull())
    .addColumn('created_by', 'text', (column) => column.notNull().references('user.id').onDelete('restrict'))
    .addColumn('edited_at', 'text', (column) => column.notNull())
    .addColumn('edited_by', 'text', (column) => column.notNull().references('user.id').onDelete('restrict'))
    .addColumn('review_asked_by', 'text', (column) => column.references('user.id').onDelete('restrict'))
    .addColumn('review_asked_at', 'text')
    .addColumn('review_note', 'text')
    .execute()
  await db.schema
    .createIndex('layout_workspace_id_idx')
    .on('layout')
    .columns(['workspace_id', 'is_archived'])
    .execute()
}
