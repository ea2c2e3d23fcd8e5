import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import type { EditStorage, Receipt } from '@server/edits/edit-storage'
import type { AcceptedEdit } from '@shared/protocol/realtime'
import { MemoryEditStorage } from './support/memory-edit-storage'
import { sqliteFixture, type SqliteFixture } from './support/sqlite-edit-storage'
import { LAYOUT, storedSample } from './support/sync-world'

const sample = storedSample()

function entry(revision: number, change: Partial<AcceptedEdit> = {}): AcceptedEdit {
  return {
    kind: 'edit',
    revision,
    editId: `edit-${revision}`,
    clientId: 'client-1',
    clientSeq: revision,
    userId: 'user-dina',
    userName: 'Dina',
    label: 'Move “Pinion” ',
    operations: [
      { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'stationMm', before: 1, value: 2.5 },
    ],
    notices: [{ kind: 'overwrote', what: 'station of Pinion', byName: 'Tomas', byUserId: 'user-tomas' }],
    acceptedAt: '2027-01-04T09:00:00.000Z',
    ...change,
  }
}

function receipt(edit: AcceptedEdit, change: Partial<Receipt> = {}): Receipt {
  const { editId, clientId, clientSeq, userId } = edit
  return { editId, clientId, clientSeq, userId, outcome: { outcome: 'accepted', edit }, ...change }
}

let sqlite: SqliteFixture | null = null

const storages: [string, () => Promise<EditStorage>][] = [
  [
    'memory',
    async () => {
      const storage = new MemoryEditStorage()
      storage.addLayout(sample)
      return storage
    },
  ],
  [
    'SQLite',
    async () => {
      sqlite = await sqliteFixture(sample, ['Dina', 'Tomas'])
      return sqlite.storage
    },
  ],
]

describe.each(storages)('the storage in %s', (_name, make) => {
  let storage: EditStorage
  beforeEach(async () => {
    storage = await make()
  })
  afterEach(() => {
    sqlite?.close()
    sqlite = null
  })

  it('S5 gives what was stored', () => {
    expect(storage.readLayout(LAYOUT)).toEqual(sample)
    expect(storage.readLayout('none')).toBeNull()
    expect(storage.readBase(LAYOUT)).toBeNull()
    const document = { ...sample.document, name: 'Renamed' }
    storage.transaction((tx) => {
      tx.append(LAYOUT, entry(1), document)
      expect(tx.readLayout(LAYOUT)).toMatchObject({ revision: 1 })
    })
    expect(storage.readLayout(LAYOUT)).toEqual({ ...sample, document, revision: 1 })
    expect(storage.readBase(LAYOUT)).toEqual({ revision: 0, document: sample.document })
    storage.transaction((tx) => tx.append(LAYOUT, entry(2), sample.document))
    expect(storage.readEntries(LAYOUT, 0)).toEqual([entry(1), entry(2)])
    expect(storage.readEntries(LAYOUT, 1)).toEqual([entry(2)])
    // The base is what the log starts from, whatever came later.
    expect(storage.readBase(LAYOUT)).toEqual({ revision: 0, document: sample.document })
  })

  it('S5 finds the answer of an edit by its id and by its number', () => {
    const refused: Receipt = {
      editId: 'edit-r',
      clientId: 'client-1',
      clientSeq: 7,
      userId: 'user-dina',
      outcome: { outcome: 'rejected', reason: 'frozen', message: 'Too late.' },
    }
    const nothing: Receipt = {
      ...refused,
      editId: 'edit-n',
      clientSeq: 8,
      outcome: { outcome: 'noEffect', revision: 1, notices: [] },
    }
    const adjusted = receipt(entry(1), { outcome: { outcome: 'adjusted', edit: entry(1) } })
    storage.transaction((tx) => {
      tx.append(LAYOUT, entry(1), sample.document)
      for (const each of [adjusted, refused, nothing]) tx.storeReceipt(LAYOUT, each)
    })
    storage.transaction((tx) => {
      const unknown = { editId: 'x', userId: 'user-dina', clientId: 'x', clientSeq: 1 }
      expect(tx.findReceipt(LAYOUT, { ...unknown, editId: 'edit-1' })).toEqual(adjusted)
      expect(tx.findReceipt(LAYOUT, { ...unknown, clientId: 'client-1' })).toEqual(adjusted)
      // The same number of somebody else is another edit.
      expect(tx.findReceipt(LAYOUT, { ...unknown, clientId: 'client-1', userId: 'user-tomas' })).toBeNull()
      expect(tx.findReceipt(LAYOUT, refused)).toEqual(refused)
      expect(tx.findReceipt(LAYOUT, nothing)).toEqual(nothing)
      expect(tx.findReceipt(LAYOUT, unknown)).toBeNull()
    })
  })

  it('S1 takes only the next revision, and each edit once', () => {
    const append = (each: AcceptedEdit) => () =>
      storage.transaction((tx) => tx.append(LAYOUT, each, sample.document))
    append(entry(1))()
    expect(append(entry(1, { editId: 'other', clientSeq: 9 }))).toThrow()
    expect(append(entry(3))).toThrow()
    append(entry(2))()
    expect(storage.readEntries(LAYOUT, 0).map(({ revision }) => revision)).toEqual([1, 2])
  })

  it('S2 rolls everything back when the work throws', () => {
    const work = () =>
      storage.transaction((tx) => {
        tx.append(LAYOUT, entry(1), { ...sample.document, name: 'Half done' })
        tx.storeReceipt(LAYOUT, receipt(entry(1)))
        throw new Error('stopped in the middle')
      })
    expect(work).toThrow('stopped in the middle')
    expect(storage.readLayout(LAYOUT)).toEqual(sample)
    expect(storage.readEntries(LAYOUT, 0)).toEqual([])
    expect(storage.readBase(LAYOUT)).toBeNull()
    storage.transaction((tx) => expect(tx.findReceipt(LAYOUT, entry(1))).toBeNull())
  })

  it('S2 refuses a second receipt for one edit', () => {
    storage.transaction((tx) => {
      tx.append(LAYOUT, entry(1), sample.document)
      tx.storeReceipt(LAYOUT, receipt(entry(1)))
    })
    expect(() => storage.transaction((tx) => tx.storeReceipt(LAYOUT, receipt(entry(1))))).toThrow()
  })

  it('F1 an entry of status leaves the document and its last edit alone', () => {
    storage.transaction((tx) =>
      tx.append(LAYOUT, entry(1, { kind: 'freeze', operations: [] }), sample.document),
    )
    expect(storage.readLayout(LAYOUT)).toEqual({ ...sample, revision: 1 })
  })
})

describe('the log in SQLite', () => {
  let fixture: SqliteFixture
  beforeEach(async () => {
    fixture = await sqliteFixture(sample, ['Dina', 'Tomas'])
    for (const revision of [1, 2, 3]) {
      fixture.storage.transaction((tx) => tx.append(LAYOUT, entry(revision), sample.document))
    }
  })
  afterEach(() => fixture.close())

  const values = `layout_id, kind, edit_id, client_id, client_seq, user_id, user_name, label, operations, notices, accepted_at`

  it.each([
    ['an update', `UPDATE layout_edit SET label = 'x' WHERE revision = 2`],
    ['a deletion', `DELETE FROM layout_edit WHERE revision = 3`],
    [
      'a replacement',
      `INSERT OR REPLACE INTO layout_edit (revision, ${values}) SELECT revision, ${values} FROM layout_edit WHERE revision = 2`,
    ],
    [
      'an upsert',
      `INSERT INTO layout_edit (revision, ${values}) SELECT revision, ${values} FROM layout_edit WHERE revision = 2 ON CONFLICT DO UPDATE SET label = 'x'`,
    ],
    [
      'a gap',
      `INSERT INTO layout_edit (revision, ${values}) SELECT 5, layout_id, kind, 'e5', client_id, 5, user_id, user_name, label, operations, notices, accepted_at FROM layout_edit WHERE revision = 3`,
    ],
    ['a change of what it starts from', `UPDATE layout_edit_base SET document = '{}'`],
    ['the removal of what it starts from', `DELETE FROM layout_edit_base`],
    ['the removal of its layout', `DELETE FROM layout`],
  ])('S1 stands against %s', (_what, statement) => {
    expect(() => fixture.database.handle.prepare(statement).run()).toThrow()
    expect(fixture.storage.readEntries(LAYOUT, 0)).toEqual([entry(1), entry(2), entry(3)])
  })
})
