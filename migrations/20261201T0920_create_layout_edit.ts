import { type Kysely, sql } from 'kysely'

/**
 * The log of a layout, what it starts from, and the answers that were given. The log is append
 * only and without gaps: the database itself refuses a revision that is not the next one, so no
 * mistake of a program can overwrite, skip or remove an entry.
 */
export async function up(db: Kysely<unknown>): Promise<void> {
  // The document before the first entry: this and the log give every later document.
  await sql`
    CREATE TABLE layout_edit_base (
      layout_id TEXT NOT NULL PRIMARY KEY REFERENCES layout (id) ON DELETE RESTRICT,
      revision INTEGER NOT NULL CHECK (revision >= 0),
      document TEXT NOT NULL CHECK (json_valid(document))
    ) WITHOUT ROWID`.execute(db)

  await sql`
    CREATE TABLE layout_edit (
      layout_id TEXT NOT NULL REFERENCES layout_edit_base (layout_id) ON DELETE RESTRICT,
      revision INTEGER NOT NULL CHECK (revision >= 1),
      kind TEXT NOT NULL
        CHECK (kind IN ('edit', 'review', 'reviewTakenBack', 'freeze', 'withdraw', 'nextRevision')),
      edit_id TEXT NOT NULL,
      client_id TEXT NOT NULL,
      client_seq INTEGER NOT NULL CHECK (client_seq >= 1),
      user_id TEXT NOT NULL,
      user_name TEXT NOT NULL,
      label TEXT NOT NULL,
      operations TEXT NOT NULL CHECK (json_valid(operations)),
      notices TEXT NOT NULL CHECK (json_valid(notices)),
      accepted_at TEXT NOT NULL,
      PRIMARY KEY (layout_id, revision),
      UNIQUE (layout_id, edit_id),
      UNIQUE (layout_id, user_id, client_id, client_seq)
    ) WITHOUT ROWID`.execute(db)

  // For a re-sent edit: the same answer as the first time. Accepted edits find theirs in the log.
  await sql`
    CREATE TABLE layout_edit_receipt (
      layout_id TEXT NOT NULL REFERENCES layout (id) ON DELETE RESTRICT,
      client_id TEXT NOT NULL,
      client_seq INTEGER NOT NULL,
      edit_id TEXT NOT NULL,
      user_id TEXT NOT NULL,
      outcome TEXT NOT NULL CHECK (outcome IN ('accepted', 'adjusted', 'noEffect', 'rejected')),
      revision INTEGER,
      answer TEXT CHECK (answer IS NULL OR json_valid(answer)),
      answered_at TEXT NOT NULL,
      PRIMARY KEY (layout_id, user_id, client_id, client_seq),
      UNIQUE (layout_id, edit_id),
      CHECK ((outcome IN ('accepted', 'adjusted')) = (revision IS NOT NULL)),
      CHECK ((revision IS NULL) = (answer IS NOT NULL))
    ) WITHOUT ROWID`.execute(db)

  await sql`
    CREATE TRIGGER layout_edit_follows_head BEFORE INSERT ON layout_edit
    WHEN NEW.revision IS NOT 1 + coalesce(
      (SELECT max(revision) FROM layout_edit WHERE layout_id = NEW.layout_id),
      (SELECT revision FROM layout_edit_base WHERE layout_id = NEW.layout_id)
    )
    BEGIN SELECT RAISE(ABORT, 'a log entry has the next revision'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_edit_refuses_update BEFORE UPDATE ON layout_edit
    BEGIN SELECT RAISE(ABORT, 'a log entry never changes'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_edit_refuses_delete BEFORE DELETE ON layout_edit
    BEGIN SELECT RAISE(ABORT, 'a log entry is never deleted'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_edit_base_refuses_update BEFORE UPDATE ON layout_edit_base
    BEGIN SELECT RAISE(ABORT, 'what a log starts from never changes'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_edit_base_refuses_delete BEFORE DELETE ON layout_edit_base
    BEGIN SELECT RAISE(ABORT, 'what a log starts from is never deleted'); END`.execute(db)
}
