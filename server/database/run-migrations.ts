/**
 * Brings a database file up to date before the server listens. Kysely's own migrator does not wrap
 * SQLite migrations: a failing one would leave half its tables behind. Here each migration and its
 * record commit together or not at all.
 */
import { chmodSync, mkdirSync, readdirSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath, pathToFileURL } from 'node:url'
import type SqliteHandle from 'better-sqlite3'
import { Kysely, SqliteDialect } from 'kysely'
import { openHandle } from './open-database'

export interface MigrationFile {
  name: string
  up(db: Kysely<unknown>): Promise<void>
}

export interface MigrationReport {
  applied: string[]
  /** Copy of the file as it was before, when there was something to copy and something to do. */
  backupFile: string | null
}

export class MigrationError extends Error {
  override readonly name = 'MigrationError'
  constructor(
    readonly migration: string,
    message: string,
    options?: ErrorOptions,
  ) {
    super(`Migration ${migration}: ${message}`, options)
  }
}

const MIGRATIONS_FOLDER = fileURLToPath(new URL('../../migrations', import.meta.url))

export async function loadMigrations(folder = MIGRATIONS_FOLDER): Promise<MigrationFile[]> {
  const names = readdirSync(folder)
    .filter((file) => /^\d{8}T\d{4}_\w+\.ts$/.test(file))
    .sort()
  return Promise.all(
    names.map(async (file) => {
      const module = (await import(pathToFileURL(path.join(folder, file)).href)) as Partial<MigrationFile>
      if (!module.up) throw new MigrationError(file, 'has no function `up`')
      return { name: file.replace(/\.ts$/, ''), up: module.up }
    }),
  )
}

export async function runMigrations(
  file: string,
  migrations: readonly MigrationFile[],
): Promise<MigrationReport> {
  const handle = openHandle(file)
  // The handle closes here, not through Kysely's destroy, which would hide an error of the migration.
  try {
    handle.exec(
      'create table if not exists schema_migration (name text not null primary key, applied_at text not null)',
    )
    const pending = pendingMigrations(handle, migrations)
    const isNew = appliedNames(handle).length === 0
    const backupFile = pending.length > 0 && !isNew ? await backUp(handle, file) : null
    for (const migration of pending) await applyMigration(handle, migration)
    return { applied: pending.map((migration) => migration.name), backupFile }
  } finally {
    handle.close()
  }
}

/** True when the file holds exactly the migrations this version of the program knows. */
export function isUpToDate(handle: SqliteHandle.Database, migrations: readonly MigrationFile[]): boolean {
  return (
    appliedNames(handle).length === migrations.length && pendingMigrations(handle, migrations).length === 0
  )
}

function appliedNames(handle: SqliteHandle.Database): string[] {
  return handle.prepare('select name from schema_migration order by name').pluck().all() as string[]
}

function pendingMigrations(
  handle: SqliteHandle.Database,
  migrations: readonly MigrationFile[],
): MigrationFile[] {
  const applied = appliedNames(handle)
  const known = new Set(migrations.map((migration) => migration.name))
  const unknown = applied.find((name) => !known.has(name))
  if (unknown) {
    throw new MigrationError(unknown, 'was applied by a newer version of the program; start that version')
  }
  const pending = migrations.filter((migration) => !applied.includes(migration.name))
  const last = applied.at(-1)
  const late = pending.find((migration) => last !== undefined && migration.name < last)
  if (late) throw new MigrationError(late.name, `sorts before ${last}, which is applied already`)
  return pending
}

async function applyMigration(handle: SqliteHandle.Database, migration: MigrationFile): Promise<void> {
  const db = new Kysely<unknown>({ dialect: new SqliteDialect({ database: handle }) })
  // The pragma does nothing inside a transaction, and rebuilding a table needs the checks off.
  handle.pragma('foreign_keys = OFF')
  handle.exec('begin immediate')
  try {
    await migration.up(db)
    const violations = handle.pragma('foreign_key_check') as unknown[]
    if (violations.length > 0) {
      throw new MigrationError(migration.name, `breaks ${violations.length} references`)
    }
    handle
      .prepare('insert into schema_migration (name, applied_at) values (?, ?)')
      .run(migration.name, new Date().toISOString())
    handle.exec('commit')
  } catch (error) {
    if (handle.inTransaction) handle.exec('rollback')
    if (error instanceof MigrationError) throw error
    const reason = error instanceof Error ? error.message : String(error)
    throw new MigrationError(migration.name, reason, { cause: error })
  } finally {
    handle.pragma('foreign_keys = ON')
  }
}

async function backUp(handle: SqliteHandle.Database, file: string): Promise<string> {
  const folder = path.join(path.dirname(file), 'backups')
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  const stamp = new Date().toISOString().replace(/[:.]/g, '-')
  const copy = path.join(folder, `before-migration-${stamp}.sqlite`)
  await handle.backup(copy)
  // It holds sessions and password hashes like the original.
  chmodSync(copy, 0o600)
  return copy
}
