/** The settings that durability rests on, on every handle there is. */
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { sql } from 'kysely'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type AppDatabase, openDatabase, openHandle } from '@server/database/open-database'
import { loadMigrations, runMigrations } from '@server/database/run-migrations'

let folder: string
let file: string
let database: AppDatabase
beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), 'hubstead-database-'))
  file = path.join(folder, 'test.sqlite')
  await runMigrations(file, await loadMigrations())
  database = openDatabase(file)
})
afterAll(() => {
  database.close()
  rmSync(folder, { recursive: true, force: true })
})

describe('every handle', () => {
  it('writes ahead, syncs each commit, checks references and fires triggers on replace', () => {
    const another = openHandle(file)
    for (const handle of [database.handle, another]) {
      const pragma = (name: string): unknown => handle.pragma(name, { simple: true })
      expect(pragma('journal_mode')).toBe('wal')
      expect(pragma('synchronous')).toBe(2)
      expect(pragma('foreign_keys')).toBe(1)
      expect(pragma('recursive_triggers')).toBe(1)
      expect(pragma('trusted_schema')).toBe(0)
      expect(pragma('busy_timeout')).toBe(250)
      expect(pragma('journal_size_limit')).toBe(64 * 1024 * 1024)
    }
    another.close()
  })

  it('is opened in one place: no other file of the server opens the database', () => {
    const root = path.resolve('server')
    const openers = readdirSync(root, { recursive: true, encoding: 'utf8' })
      .filter((name) => name.endsWith('.ts'))
      .filter((name) =>
        /new (SqliteHandle|Database|BetterSqlite3)\(/.test(readFileSync(path.join(root, name), 'utf8')),
      )
    // The lock file holds no data.
    expect(openers.sort()).toEqual(['database/instance-lock.ts', 'database/open-database.ts'])
  })
})

describe('a write transaction', () => {
  const workspace = (id: string) => ({
    id,
    name: id,
    slug: id,
    logo: null,
    created_at: '2026-12-01T00:00:00.000Z',
    metadata: null,
  })
  const ids = () => database.all(database.kysely.selectFrom('organization').select('id')).map(({ id }) => id)

  it('holds all of its writes or none', () => {
    expect(() =>
      database.writeTransaction((tx) => {
        tx.run(tx.kysely.insertInto('organization').values(workspace('lost')))
        throw new Error('changed my mind')
      }),
    ).toThrow('changed my mind')
    expect(ids()).toEqual([])
    database.writeTransaction((tx) => tx.run(tx.kysely.insertInto('organization').values(workspace('kept'))))
    expect(ids()).toEqual(['kept'])
  })

  it('takes the write lock at its start, so that what it read stays true', () => {
    const other = openHandle(file)
    database.writeTransaction((tx) => {
      tx.all(tx.kysely.selectFrom('organization').select('id'))
      expect(() => other.exec("update organization set name = 'stolen'")).toThrow(/locked/)
    })
    other.close()
  })

  it('cannot be one of Kysely’s own: it would swallow what other code writes meanwhile', async () => {
    await expect(
      database.kysely.transaction().execute(async (trx) => sql`select 1`.execute(trx)),
    ).rejects.toThrow('Use writeTransaction')
  })
})
