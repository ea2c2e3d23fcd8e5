import { type Kysely, sql } from 'kysely'

/**
 * Releases are evidence: once written they never change and never go away, whoever asks. The
 * triggers refuse UPDATE and DELETE; the insert guards refuse INSERT OR REPLACE and UPSERT, which
 * reach the row without firing a delete trigger when `recursive_triggers` is off. The tables have
 * no rowid, so a replace cannot aim at a row by a number that no guard compares. What happens to
 * a release later (its withdrawal) is a row of its own.
 */
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql`
    CREATE TABLE layout_release (
      id TEXT NOT NULL PRIMARY KEY,
      workspace_id TEXT NOT NULL REFERENCES organization (id) ON DELETE RESTRICT,
      workspace_name TEXT NOT NULL,
      layout_id TEXT NOT NULL REFERENCES layout (id) ON DELETE RESTRICT,
      layout_name TEXT NOT NULL,
      sequence INTEGER NOT NULL CHECK (sequence >= 1),
      revision_letter TEXT NOT NULL,
      revision INTEGER NOT NULL CHECK (revision >= 0),
      document TEXT NOT NULL CHECK (json_valid(document)),
      document_hash TEXT NOT NULL,
      results TEXT NOT NULL CHECK (json_valid(results)),
      engine_version TEXT NOT NULL,
      method TEXT NOT NULL CHECK (json_valid(method)),
      verdict TEXT NOT NULL CHECK (verdict IN ('passes', 'fails')),
      acceptances TEXT NOT NULL CHECK (json_valid(acceptances)),
      note TEXT NOT NULL,
      review_asked_by_name TEXT,
      review_asked_at TEXT,
      frozen_by TEXT NOT NULL,
      frozen_by_name TEXT NOT NULL,
      frozen_at TEXT NOT NULL,
      previous_hash TEXT,
      release_hash TEXT NOT NULL UNIQUE,
      UNIQUE (layout_id, sequence),
      UNIQUE (layout_id, revision_letter)
    ) WITHOUT ROWID`.execute(db)
  await sql`CREATE INDEX layout_release_by_workspace ON layout_release (workspace_id, frozen_at)`.execute(db)

  await sql`
    CREATE TABLE layout_release_withdrawal (
      release_id TEXT NOT NULL PRIMARY KEY REFERENCES layout_release (id) ON DELETE RESTRICT,
      reason TEXT NOT NULL,
      withdrawn_by TEXT NOT NULL,
      withdrawn_by_name TEXT NOT NULL,
      withdrawn_at TEXT NOT NULL
    ) WITHOUT ROWID`.execute(db)

  await sql`
    CREATE TRIGGER layout_release_refuses_update BEFORE UPDATE ON layout_release
    BEGIN SELECT RAISE(ABORT, 'a release never changes'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_release_refuses_delete BEFORE DELETE ON layout_release
    BEGIN SELECT RAISE(ABORT, 'a release is never deleted'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_release_refuses_replace BEFORE INSERT ON layout_release
    WHEN EXISTS (
      SELECT 1 FROM layout_release
      WHERE id = NEW.id
        OR release_hash = NEW.release_hash
        OR (layout_id = NEW.layout_id AND (sequence = NEW.sequence OR revision_letter = NEW.revision_letter))
    )
    BEGIN SELECT RAISE(ABORT, 'a release never changes'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_release_continues_chain BEFORE INSERT ON layout_release
    WHEN NEW.previous_hash IS NOT (
      SELECT release_hash FROM layout_release
      WHERE layout_id = NEW.layout_id ORDER BY sequence DESC LIMIT 1
    )
    BEGIN SELECT RAISE(ABORT, 'a release names the hash of the one before it'); END`.execute(db)

  await sql`
    CREATE TRIGGER layout_release_withdrawal_refuses_update BEFORE UPDATE ON layout_release_withdrawal
    BEGIN SELECT RAISE(ABORT, 'a withdrawal never changes'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_release_withdrawal_refuses_delete BEFORE DELETE ON layout_release_withdrawal
    BEGIN SELECT RAISE(ABORT, 'a withdrawal is never deleted'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_release_withdrawal_refuses_replace BEFORE INSERT ON layout_release_withdrawal
    WHEN EXISTS (SELECT 1 FROM layout_release_withdrawal WHERE release_id = NEW.release_id)
    BEGIN SELECT RAISE(ABORT, 'a withdrawal never changes'); END`.execute(db)

  // A cascade from above must stop here even on a handle that forgot `foreign_keys`.
  await sql`
    CREATE TRIGGER layout_with_release_refuses_delete BEFORE DELETE ON layout
    WHEN EXISTS (SELECT 1 FROM layout_release WHERE layout_id = OLD.id)
    BEGIN SELECT RAISE(ABORT, 'a layout with releases is never deleted'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_with_release_refuses_replace BEFORE INSERT ON layout
    WHEN EXISTS (SELECT 1 FROM layout_release WHERE layout_id = NEW.id)
    BEGIN SELECT RAISE(ABORT, 'a layout with releases is never replaced'); END`.execute(db)
  await sql`
    CREATE TRIGGER layout_with_release_refuses_move BEFORE UPDATE OF id, workspace_id ON layout
    WHEN EXISTS (SELECT 1 FROM layout_release WHERE layout_id = OLD.id)
      AND (NEW.id IS NOT OLD.id OR NEW.workspace_id IS NOT OLD.workspace_id)
    BEGIN SELECT RAISE(ABORT, 'a layout with releases stays in its workspace'); END`.execute(db)
}
