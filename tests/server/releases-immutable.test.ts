/** Releases against raw SQL: every way of changing or removing a row, with the pragmas on and off. */
import { copyFileSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import type SqliteHandle from 'better-sqlite3'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { openHandle } from '@server/database/open-database'
import { loadMigrations, runMigrations } from '@server/database/run-migrations'

const RELEASE = {
  id: 'release-1',
  workspace_id: 'workspace-1',
  workspace_name: 'Cedar Line drives',
  layout_id: 'layout-1',
  layout_name: 'Shaft',
  sequence: 1,
  revision_letter: 'A',
  revision: 7,
  document: '{}',
  document_hash: 'sha256:1',
  results: '{}',
  engine_version: '1.0.0',
  method: '{}',
  verdict: 'passes',
  acceptances: '[]',
  note: '',
  review_asked_by_name: null as string | null,
  review_asked_at: null as string | null,
  frozen_by: 'user-1',
  frozen_by_name: 'Mira Kast',
  frozen_at: '2026-12-01T09:30:00.000Z',
  previous_hash: null as string | null,
  release_hash: 'sha256:r1',
}
type Release = typeof RELEASE
const WITHDRAWAL = {
  release_id: 'release-1',
  reason: 'The wheel drawing was wrong.',
  withdrawn_by: 'user-1',
  withdrawn_by_name: 'Mira Kast',
  withdrawn_at: '2026-12-02T09:30:00.000Z',
}
const COLUMNS = Object.keys(RELEASE) as (keyof Release)[]

let folder: string
let handle: SqliteHandle.Database

const insertInto = (table: string, row: object, verb = 'insert') => {
  const columns = Object.keys(row)
  return handle
    .prepare(
      `${verb} into ${table} (${columns.join(', ')}) values (${columns.map((column) => `@${column}`).join(', ')})`,
    )
    .run(row)
}
const forge = (change: Partial<Release>): Release => ({ ...RELEASE, layout_name: 'Forged', ...change })
const stored = () => ({
  releases: handle.prepare('select * from layout_release order by id').all(),
  withdrawals: handle.prepare('select * from layout_release_withdrawal').all(),
  layouts: handle.prepare('select id, workspace_id from layout order by id').all(),
})

beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), 'hubstead-release-'))
  await runMigrations(path.join(folder, 'migrated.sqlite'), await loadMigrations())
})
afterAll(() => {
  rmSync(folder, { recursive: true, force: true })
})

beforeEach(() => {
  const file = path.join(folder, 'test.sqlite')
  copyFileSync(path.join(folder, 'migrated.sqlite'), file)
  handle = openHandle(file)
  // Users and workspaces only have to exist; their own columns do not matter here.
  handle.pragma('foreign_keys = OFF')
  for (const id of ['layout-1', 'layout-2'])
    insertInto('layout', {
      id,
      workspace_id: 'workspace-1',
      name: 'Shaft',
      status: 'released',
      revision_letter: 'A',
      revision: 7,
      epoch: 'epoch-1',
      document: '{}',
      is_archived: 0,
      created_at: '2026-12-01T09:00:00.000Z',
      created_by: 'user-1',
      edited_at: '2026-12-01T09:00:00.000Z',
      edited_by: 'user-1',
    })
  insertInto('layout_release', RELEASE)
  insertInto('layout_release_withdrawal', WITHDRAWAL)
})
afterEach(() => {
  handle.close()
})

const UPSERT_ALL = COLUMNS.map((column) => `${column} = excluded.${column}`).join(', ')
const upsert = (target: string, row: Release) =>
  handle
    .prepare(
      `insert into layout_release (${COLUMNS.join(', ')}) values (${COLUMNS.map((column) => `@${column}`).join(', ')})
       on conflict (${target}) do update set ${UPSERT_ALL}`,
    )
    .run(row)

const ATTACKS: [name: string, attack: () => unknown][] = [
  ...COLUMNS.map((column): [string, () => unknown] => [
    `UPDATE of ${column}`,
    () => handle.prepare(`update layout_release set ${column} = ${column}`).run(),
  ]),
  ['UPDATE OR REPLACE', () => handle.exec("update or replace layout_release set note = 'forged'")],
  ['UPDATE OR IGNORE', () => handle.exec("update or ignore layout_release set note = 'forged'")],
  ['DELETE', () => handle.exec('delete from layout_release')],
  ['DELETE with a limit to one row', () => handle.exec("delete from layout_release where id = 'release-1'")],
  ['INSERT OR REPLACE by id', () => insertInto('layout_release', forge({}), 'insert or replace')],
  ['REPLACE INTO by id', () => insertInto('layout_release', forge({ release_hash: 'sha256:x' }), 'replace')],
  [
    'INSERT OR REPLACE by layout and letter',
    () =>
      insertInto(
        'layout_release',
        forge({ id: 'release-x', sequence: 2, release_hash: 'sha256:x', previous_hash: 'sha256:r1' }),
        'insert or replace',
      ),
  ],
  [
    'INSERT OR REPLACE by layout and sequence',
    () =>
      insertInto(
        'layout_release',
        forge({
          id: 'release-x',
          revision_letter: 'B',
          release_hash: 'sha256:x',
          previous_hash: 'sha256:r1',
        }),
        'insert or replace',
      ),
  ],
  [
    'INSERT OR REPLACE by release hash, from another layout',
    () =>
      insertInto('layout_release', forge({ id: 'release-x', layout_id: 'layout-2' }), 'insert or replace'),
  ],
  ['UPSERT on the id', () => upsert('id', forge({}))],
  ['UPSERT on layout and letter', () => upsert('layout_id, revision_letter', forge({ id: 'release-x' }))],
  ['UPSERT on layout and sequence', () => upsert('layout_id, sequence', forge({ id: 'release-x' }))],
  ['UPSERT on the release hash', () => upsert('release_hash', forge({ id: 'release-x' }))],
  [
    'a release that leaves the chain',
    () =>
      insertInto(
        'layout_release',
        forge({ id: 'release-x', sequence: 2, revision_letter: 'B', release_hash: 'sha256:x' }),
      ),
  ],
  ['DELETE of its layout', () => handle.exec("delete from layout where id = 'layout-1'")],
  [
    'REPLACE of its layout',
    () => handle.exec(`replace into layout select * from layout where id = 'layout-1'`),
  ],
  ['a new id for its layout', () => handle.exec("update layout set id = 'x' where id = 'layout-1'")],
  [
    'a move of its layout to another workspace',
    () => handle.exec("update layout set workspace_id = 'x' where id = 'layout-1'"),
  ],
  ['UPDATE of a withdrawal', () => handle.exec("update layout_release_withdrawal set reason = 'other'")],
  ['DELETE of a withdrawal', () => handle.exec('delete from layout_release_withdrawal')],
  [
    'INSERT OR REPLACE of a withdrawal',
    () => insertInto('layout_release_withdrawal', { ...WITHDRAWAL, reason: 'other' }, 'insert or replace'),
  ],
  [
    'UPSERT of a withdrawal',
    () =>
      handle.exec(
        `insert into layout_release_withdrawal select release_id, 'other', withdrawn_by, withdrawn_by_name, withdrawn_at
         from layout_release_withdrawal where true on conflict (release_id) do update set reason = excluded.reason`,
      ),
  ],
]

const HANDLES = [
  { recursive: 'ON', foreign: 'ON' },
  { recursive: 'ON', foreign: 'OFF' },
  // As a handle of some other program would be: SQLite's own defaults.
  { recursive: 'OFF', foreign: 'OFF' },
]

describe.each(HANDLES)('with recursive_triggers $recursive and foreign_keys $foreign', (pragmas) => {
  beforeEach(() => {
    handle.pragma(`recursive_triggers = ${pragmas.recursive}`)
    handle.pragma(`foreign_keys = ${pragmas.foreign}`)
  })

  it.each(ATTACKS)('refuses %s', (_name, attack) => {
    const before = stored()
    expect(attack).toThrow()
    expect(stored()).toEqual(before)
  })
})

describe('a cascade from above', () => {
  it('ends at the release', () => {
    const before = stored()
    // A workspace whose layouts and releases would go with it, were the references not restricting.
    const columns = handle.pragma('table_info(organization)') as {
      name: string
      notnull: number
      type: string
    }[]
    const row = Object.fromEntries(
      columns.filter((column) => column.notnull === 1).map((column) => [column.name, column.name]),
    )
    insertInto('organization', { ...row, id: 'workspace-1' })
    handle.pragma('foreign_keys = ON')
    expect(() => handle.exec("delete from organization where id = 'workspace-1'")).toThrow()
    expect(stored()).toEqual(before)
  })
})

describe('the pragmas every handle of the server gets', () => {
  it('include recursive triggers and foreign keys', () => {
    const fresh = openHandle(path.join(folder, 'other.sqlite'))
    expect(fresh.pragma('recursive_triggers', { simple: true })).toBe(1)
    expect(fresh.pragma('foreign_keys', { simple: true })).toBe(1)
    fresh.close()
  })
})

describe('what is allowed', () => {
  it('is the next release of the chain, and the first of another layout', () => {
    insertInto('layout_release', {
      ...RELEASE,
      id: 'release-2',
      sequence: 2,
      revision_letter: 'B',
      previous_hash: 'sha256:r1',
      release_hash: 'sha256:r2',
    })
    insertInto('layout_release', {
      ...RELEASE,
      id: 'release-3',
      layout_id: 'layout-2',
      release_hash: 'sha256:r3',
    })
    expect(stored().releases).toHaveLength(3)
  })

  it('is deleting a layout that was never released', () => {
    handle.pragma('foreign_keys = OFF')
    handle.exec("delete from layout where id = 'layout-2'")
    expect(stored().layouts).toHaveLength(1)
  })
})
