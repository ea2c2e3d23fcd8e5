/** Every migration all or nothing, in order, once, with a copy of the file from before. */
import { mkdtempSync, rmSync, statSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import SqliteHandle from 'better-sqlite3'
import { sql } from 'kysely'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { DataFolderInUse, lockDataFolder } from '@server/database/instance-lock'
import { openHandle } from '@server/database/open-database'
import {
  isUpToDate,
  loadMigrations,
  type MigrationFile,
  runMigrations,
} from '@server/database/run-migrations'

let folder: string
let file: string
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'hubstead-migrations-'))
  file = path.join(folder, 'test.sqlite')
})
afterEach(() => {
  rmSync(folder, { recursive: true, force: true })
})

const table = (name: string): MigrationFile => ({
  name: `20300101T0000_${name}`,
  up: async (db) => {
    await db.schema.createTable(name).addColumn('id', 'text').execute()
  },
})
function read<Result>(work: (handle: SqliteHandle.Database) => Result): Result {
  const handle = openHandle(file)
  try {
    return work(handle)
  } finally {
    handle.close()
  }
}
const tables = (from = file) => {
  const handle = new SqliteHandle(from, { readonly: true })
  const names = handle
    .prepare("select name from sqlite_master where type = 'table' and name not like 'sqlite_%' order by name")
    .pluck()
    .all()
  handle.close()
  return names
}

describe('the migrations of this program', () => {
  it('build a sound database from nothing and are done after that', async () => {
    const migrations = await loadMigrations()
    const first = await runMigrations(file, migrations)
    expect(first).toEqual({ applied: migrations.map(({ name }) => name), backupFile: null })
    expect(tables()).toEqual(
      expect.arrayContaining(['invitation', 'layout', 'layout_edit', 'layout_release', 'member', 'user']),
    )
    read((handle) => {
      expect(isUpToDate(handle, migrations)).toBe(true)
      expect(handle.pragma('integrity_check', { simple: true })).toBe('ok')
      expect(handle.pragma('foreign_key_check')).toEqual([])
    })
    expect(await runMigrations(file, migrations)).toEqual({ applied: [], backupFile: null })
  })
})

describe('a migration that fails', () => {
  const failing: MigrationFile = {
    name: '20300102T0000_failing',
    up: async (db) => {
      await db.schema.createTable('half_done').addColumn('id', 'text').execute()
      await sql`insert into no_such_table values (1)`.execute(db)
    },
  }

  it('says which and why, leaves nothing behind, and may be mended and run again', async () => {
    await expect(runMigrations(file, [table('first'), failing])).rejects.toThrow(
      /Migration 20300102T0000_failing: no such table: no_such_table/,
    )
    expect(tables()).toEqual(['first', 'schema_migration'])
    const mended = { ...failing, up: table('half_done').up }
    expect((await runMigrations(file, [table('first'), mended])).applied).toEqual([failing.name])
    expect(tables()).toEqual(['first', 'half_done', 'schema_migration'])
  })

  it('is refused when it leaves a reference to nothing', async () => {
    const orphaning: MigrationFile = {
      name: '20300103T0000_orphans',
      up: async (db) => {
        await sql`create table parent (id text primary key)`.execute(db)
        await sql`create table child (parent text references parent (id))`.execute(db)
        await sql`insert into child values ('nobody')`.execute(db)
      },
    }
    await expect(runMigrations(file, [orphaning])).rejects.toThrow('breaks 1 references')
    expect(tables()).toEqual(['schema_migration'])
  })

  it('runs with references unchecked, so that a table can be rebuilt, and checks are on afterwards', async () => {
    const parents: MigrationFile = {
      name: '20300101T0000_parents',
      up: async (db) => {
        await sql`create table parent (id text primary key)`.execute(db)
        await sql`create table child (parent text references parent (id) on delete cascade)`.execute(db)
        await sql`insert into parent values ('a')`.execute(db)
        await sql`insert into child values ('a')`.execute(db)
      },
    }
    const rebuild: MigrationFile = {
      name: '20300102T0000_rebuild',
      up: async (db) => {
        await sql`create table parent_new (id text primary key, name text)`.execute(db)
        await sql`insert into parent_new select id, 'x' from parent`.execute(db)
        await sql`drop table parent`.execute(db)
        await sql`alter table parent_new rename to parent`.execute(db)
      },
    }
    await runMigrations(file, [parents, rebuild])
    read((handle) => {
      expect(handle.prepare('select count(*) from child').pluck().get()).toBe(1)
      expect(() => handle.exec("insert into child values ('nobody')")).toThrow(/FOREIGN KEY/)
    })
  })
})

describe('the order', () => {
  it('is that of the names: one that comes late is an error', async () => {
    await runMigrations(file, [table('b')])
    await expect(runMigrations(file, [table('a'), table('b')])).rejects.toThrow(
      /20300101T0000_a: sorts before/,
    )
    expect(tables()).toEqual(['b', 'schema_migration'])
  })

  it('knows a database of a newer program and leaves it alone', async () => {
    await runMigrations(file, [table('a'), table('b')])
    await expect(runMigrations(file, [table('a')])).rejects.toThrow(/newer version of the program/)
  })
})

describe('the copy from before', () => {
  it('is made of a file that holds something, and opens to what was in it', async () => {
    await runMigrations(file, [table('a')])
    read((handle) => handle.exec("insert into a values ('kept')"))
    const { backupFile } = await runMigrations(file, [table('a'), table('b')])
    expect(backupFile).toMatch(/backups\/before-migration-/)
    expect(statSync(backupFile ?? '').mode & 0o777).toBe(0o600)
    expect(tables(backupFile ?? '')).toEqual(['a', 'schema_migration'])
    const copy = new SqliteHandle(backupFile ?? '', { readonly: true })
    expect(copy.prepare('select id from a').pluck().all()).toEqual(['kept'])
    expect(copy.pragma('integrity_check', { simple: true })).toBe('ok')
    copy.close()
  })
})

describe('a data folder', () => {
  it('belongs to one server at a time', () => {
    const unlock = lockDataFolder(folder)
    expect(() => lockDataFolder(folder)).toThrow(DataFolderInUse)
    unlock()
    lockDataFolder(folder)()
  })
})
