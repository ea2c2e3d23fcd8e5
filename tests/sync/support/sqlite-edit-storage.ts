import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { openDatabase, type AppDatabase } from '@server/database/open-database'
import { loadMigrations, runMigrations } from '@server/database/run-migrations'
import { createEditStorage, type SqliteEditTransaction } from '@server/edits/edits.repository'
import type { EditStorage, StoredLayout } from '@server/edits/edit-storage'

export interface SqliteFixture {
  storage: EditStorage<SqliteEditTransaction>
  database: AppDatabase
  close(): void
}

/** A migrated database in a fresh folder with one layout and the people who may edit it. */
export async function sqliteFixture(
  layout: StoredLayout,
  userNames: readonly string[],
): Promise<SqliteFixture> {
  const folder = mkdtempSync(path.join(tmpdir(), 'hubstead-edits-'))
  const file = path.join(folder, 'test.sqlite')
  await runMigrations(file, await loadMigrations())
  const database = openDatabase(file)
  const at = '2027-01-04T08:00:00.000Z'
  database.writeTransaction((tx) => {
    for (const name of userNames) {
      const id = `user-${name.toLowerCase()}`
      const email = `${name.toLowerCase()}@cedar-line.example`
      const user = {
        id,
        name,
        email,
        email_verified: 1 as const,
        image: null,
        created_at: at,
        updated_at: at,
      }
      tx.run(tx.kysely.insertInto('user').values(user))
    }
    tx.run(
      tx.kysely.insertInto('organization').values({
        id: layout.workspaceId,
        name: 'Test',
        slug: 'test',
        logo: null,
        created_at: at,
        metadata: null,
      }),
    )
    const author = `user-${userNames[0]?.toLowerCase() ?? ''}`
    tx.run(
      tx.kysely.insertInto('layout').values({
        id: layout.layoutId,
        workspace_id: layout.workspaceId,
        name: layout.document.name,
        project: null,
        status: layout.status,
        revision_letter: layout.revisionLetter,
        revision: layout.revision,
        epoch: layout.epoch,
        document: JSON.stringify(layout.document),
        is_archived: 0,
        created_at: at,
        created_by: author,
        edited_at: at,
        edited_by: author,
        review_asked_by: null,
        review_asked_at: null,
        review_note: null,
      }),
    )
  })
  return {
    storage: createEditStorage(database),
    database,
    close() {
      database.close()
      rmSync(folder, { recursive: true, force: true })
    },
  }
}

/** What a service of another domain would write in the same transaction. */
export function setStatusInSqlite(
  { sql }: SqliteEditTransaction,
  layoutId: string,
  change: { status: StoredLayout['status']; revisionLetter: string },
): void {
  sql.run(
    sql.kysely
      .updateTable('layout')
      .set({ status: change.status, revision_letter: change.revisionLetter })
      .where('id', '=', layoutId),
  )
}
