import 'fake-indexeddb/auto'
import { describe, expect, it } from 'vitest'
import { savingState } from '@/stores/saving-state'
import { createIndexedDbOutbox } from '@/sync/indexed-db-outbox'
import { createMemoryOutbox } from '@/sync/memory-outbox'
import type { Outbox } from '@/sync/outbox'
import type { LayoutState } from '@/stores/layout-state'
import { changeStatus, LAYOUT, memoryWorld, principalOf, settle } from './support/sync-world'

describe('a committed edit', () => {
  it('C1 is visible at once', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    expect(dina.set('A', 'stationMm', 12)).toMatchObject({ kind: 'pending' })
    expect(dina.hub('A').stationMm).toBe(12)
    expect(dina.state.confirmed?.hubs[0]?.stationMm).toBe(10)
    expect(dina.set('A', 'stationMm', 12)).toMatchObject({ kind: 'noEffect' })
  })

  it('C2 is kept in the browser before it is sent', async () => {
    const world = memoryWorld()
    const memory = createMemoryOutbox()
    let keep: () => void = () => undefined
    const slow: Outbox = {
      ...memory,
      put: (record) =>
        new Promise((resolve) => {
          keep = () => resolve(memory.put(record))
        }),
    }
    const dina = await world.open('Dina', 'designer', { outbox: slow })
    dina.set('A', 'stationMm', 12)
    await world.flush()
    expect(dina.line.submitted).toEqual([])
    keep()
    await world.flush()
    expect(dina.line.submitted).toHaveLength(1)
    expect(world.layout.revision).toBe(1)
    // Answered: nothing is left to send.
    expect(await memory.load(LAYOUT)).toEqual([])
  })

  it('C2 is not overtaken by a later one that was kept sooner', async () => {
    const world = memoryWorld()
    const memory = createMemoryOutbox()
    const kept: (() => void)[] = []
    const uneven: Outbox = {
      ...memory,
      put: (record) =>
        new Promise((resolve) => {
          kept.push(() => resolve(memory.put(record)))
        }),
    }
    const dina = await world.open('Dina', 'designer', { outbox: uneven })
    dina.set('A', 'stationMm', 12)
    dina.set('A', 'stationMm', 13)
    kept[1]?.()
    await world.flush()
    expect(dina.line.submitted).toEqual([])
    kept[0]?.()
    await world.flush()
    expect(dina.line.submitted.map(({ clientSeq }) => clientSeq)).toEqual([1, 2])
    expect(world.layout.document.hubs[0]?.stationMm).toBe(13)
  })

  it('C3 is sent again after a break, in order and under the same number', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    for (const value of [11, 12, 13]) dina.set('A', 'stationMm', value)
    await settle()
    // The server stores the first two, but no answer gets back.
    dina.line.flushToServer(2)
    world.clock.runDeferred()
    dina.line.disconnect()
    dina.line.serverNotices()
    expect(dina.state.connection).toBe('reconnecting')
    dina.set('B', 'stationMm', 90)
    await world.flush()
    dina.line.reconnect()
    await world.flush()
    expect(dina.line.submitted.map(({ clientSeq }) => clientSeq)).toEqual([1, 2, 3, 3, 4])
    expect(world.storage.readEntries(LAYOUT, 0).map(({ clientSeq }) => clientSeq)).toEqual([1, 2, 3, 4])
    expect(dina.state.pending).toEqual([])
    expect(dina.visible).toEqual(world.layout.document)
  })

  it('C3 is not applied twice when the network delivers it twice', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    dina.commit({ type: 'reorder', target: { kind: 'hub', id: 'A' }, index: 1 })
    await settle()
    dina.line.repeatLastSubmit()
    await world.flush()
    expect(world.layout.revision).toBe(1)
    expect(dina.visible.hubs.map(({ id }) => id)).toEqual(['B', 'A'])
  })

  it('C5 changes nothing that is seen when it is acknowledged', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    for (const value of [11, 12, 13]) dina.set('A', 'stationMm', value)
    const seen = dina.visible
    const shown: unknown[] = []
    dina.store.subscribe((state) => shown.push(state.visible))
    await settle()
    // Staggered: one answer at a time.
    dina.line.flushToServer()
    world.clock.runDeferred()
    while (dina.line.queued.toClient > 0) dina.line.flushToClient(1)
    expect(dina.state.pending).toEqual([])
    expect(shown.length).toBeGreaterThan(0)
    expect(shown.every((document) => document === seen)).toBe(true)
  })
})

describe('messages of the server', () => {
  it('C4 rewind what waits, apply, and re-apply the rest in one update', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    tomas.set('A', 'lengthMm', 50)
    await settle()
    tomas.line.flushToServer()
    world.clock.runDeferred()
    dina.set('A', 'stationMm', 12)
    const seen: [number | undefined, number | undefined][] = []
    dina.store.subscribe(({ visible, confirmed }) => {
      if (confirmed?.hubs[0]?.lengthMm === 50) {
        seen.push([visible?.hubs[0]?.lengthMm, visible?.hubs[0]?.stationMm])
      }
    })
    dina.line.flushToClient()
    // Never the remote change without the own one that waits.
    expect(seen).toEqual([[50, 12]])
    expect(dina.state.pending).toHaveLength(1)
  })

  it('C6 a revision seen already is ignored, a missing one is fetched', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    tomas.set('A', 'stationMm', 11)
    await world.flush()
    const [entry] = world.storage.readEntries(LAYOUT, 0)
    if (!entry) throw new Error('No entry')
    const deliver = (revision: number) => {
      const { connectionId } = dina.line
      world.lines.deliverTo(connectionId, 'edit:accepted', { layoutId: LAYOUT, edit: { ...entry, revision } })
    }
    deliver(1)
    await world.flush()
    expect(dina.state.revision).toBe(1)

    tomas.set('A', 'stationMm', 12)
    await settle()
    tomas.line.flushToServer()
    world.clock.runDeferred()
    dina.line.loseToClient()
    tomas.set('A', 'lengthMm', 40)
    await world.flush()
    expect(dina.state.revision).toBe(3)
    expect(dina.visible).toEqual(world.layout.document)
  })

  it('C15 what an old connection says late is ignored', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    dina.line.disconnect({ isCloseLate: true })
    dina.line.reconnect()
    await world.flush()
    dina.line.deliverLateCloses()
    await world.flush()
    expect(dina.state.connection).toBe('connected')
    dina.set('A', 'stationMm', 12)
    await world.flush()
    expect(savingState(dina.state)).toBe('saved')
    expect(world.layout.revision).toBe(1)
  })

  it('C8 leave a preview alone, and a preview leaves the document alone', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    dina.session.setPreview('Move Pinion', [
      { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'stationMm', value: 33 },
    ])
    tomas.set('A', 'lengthMm', 50)
    await world.flush()
    expect([dina.hub('A').stationMm, dina.hub('A').lengthMm]).toEqual([33, 50])
    expect(world.layout.document.hubs[0]?.stationMm).toBe(10)
    dina.session.clearPreview()
    expect(dina.hub('A').stationMm).toBe(10)
    expect(dina.visible).toBe(dina.state.confirmed)
  })
})

describe('what is not saved yet', () => {
  it('C7 is sent by the next tab of the same person, under its old number', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    dina.set('A', 'stationMm', 12)
    await settle()
    dina.line.flushToServer()
    world.clock.runDeferred()
    dina.set('A', 'lengthMm', 50)
    await settle()
    await dina.reopenTab()
    await world.flush()
    const numbers = dina.line.submitted.map(({ clientId, clientSeq }) => `${clientId} ${clientSeq}`)
    expect(numbers.slice(2)).toEqual(numbers.slice(0, 2))
    expect(world.layout.revision).toBe(2)
    expect(dina.hub('A')).toMatchObject({ stationMm: 12, lengthMm: 50 })
    expect(await dina.outbox.load(LAYOUT)).toEqual([])
    // And the new tab counts for itself.
    dina.set('A', 'stationMm', 13)
    await world.flush()
    expect(world.layout.revision).toBe(3)
  })

  it('C7 is neither shown to nor sent for another person at the same browser', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    dina.line.disconnect()
    dina.set('A', 'stationMm', 12)
    await settle()
    dina.principal = principalOf('Tomas', 'designer')
    await dina.reopenTab()
    await world.flush()
    expect(dina.state.you?.name).toBe('Tomas')
    expect(dina.hub('A').stationMm).toBe(10)
    expect(dina.state.pending).toEqual([])

    dina.principal = principalOf('Dina', 'designer')
    await dina.reopenTab()
    await world.flush()
    expect(world.layout.document.hubs[0]?.stationMm).toBe(12)
  })

  it('C9 is kept when the server refuses it, over a reload too, until it is dismissed', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    dina.set('A', 'stationMm', 12, 'Move Pinion')
    await changeStatus(world, 'freeze')
    await world.flush()
    expect(dina.state.refusedEdits).toMatchObject([{ label: 'Move Pinion', reason: 'frozen' }])
    expect(dina.hub('A').stationMm).toBe(10)
    await dina.reopenTab()
    await world.flush()
    expect(dina.state.refusedEdits).toMatchObject([{ label: 'Move Pinion', reason: 'frozen' }])
    dina.session.dismissRefused(dina.state.refusedEdits[0]!.editId)
    await dina.reopenTab()
    await world.flush()
    expect(dina.state.refusedEdits).toEqual([])
  })

  it('C11 goes on being sent after the page of the layout was left', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    dina.line.disconnect()
    dina.set('A', 'stationMm', 12)
    dina.session.close()
    expect(dina.state.layoutId).toBeNull()
    await world.flush()
    expect([dina.session.pendingCount, dina.hasEnded]).toEqual([1, false])
    dina.line.reconnect()
    await world.flush()
    expect(world.layout.document.hubs[0]?.stationMm).toBe(12)
    expect([dina.session.pendingCount, dina.hasEnded]).toEqual([0, true])
    expect(dina.state.layoutId).toBeNull()
  })

  it('C12 is said to be at risk when the browser cannot keep it, and is sent all the same', async () => {
    const world = memoryWorld()
    const broken: Outbox = {
      load: () => Promise.reject(new Error('no storage')),
      put: () => Promise.reject(new Error('no storage')),
      remove: () => Promise.reject(new Error('no storage')),
    }
    const dina = await world.open('Dina', 'designer', { outbox: broken })
    expect(dina.state.storageFailure).toMatch(/cannot keep/)
    dina.set('A', 'stationMm', 12)
    await world.flush()
    expect(world.layout.document.hubs[0]?.stationMm).toBe(12)
  })

  it('C13 breaks a line that looks open and stays silent', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    dina.set('A', 'stationMm', 12)
    await settle()
    dina.line.loseToServer()
    world.clock.advance(16_000)
    await world.flush()
    expect(dina.line.reopenCount).toBe(1)
    expect(world.layout.document.hubs[0]?.stationMm).toBe(12)
  })

  it('C7 survives in IndexedDB', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina', 'designer', { outbox: createIndexedDbOutbox() })
    dina.line.disconnect()
    dina.set('A', 'stationMm', 12)
    dina.set('A', 'stationMm', 13)
    await new Promise((resolve) => setTimeout(resolve, 50))
    const records = await createIndexedDbOutbox().load(LAYOUT)
    expect(records.map(({ edit }) => edit.clientSeq)).toEqual([1, 2])
    await dina.reopenTab()
    await world.flush()
    await new Promise((resolve) => setTimeout(resolve, 50))
    expect(world.layout.document.hubs[0]?.stationMm).toBe(13)
    expect(await createIndexedDbOutbox().load(LAYOUT)).toEqual([])
  })
})

describe('the chip', () => {
  const access = { role: 'designer', canEdit: true, status: 'draft', revisionLetter: 'A' } as const
  const readOnly = { ...access, canEdit: false }
  const one = [{}] as LayoutState['pending']
  const refused = [{}] as LayoutState['refusedEdits']
  const document = {} as LayoutState['confirmed']

  it.each([
    ['saved', 'connected', [], [], access],
    ['saving', 'connected', one, [], access],
    ['saving', 'connected', one, refused, access],
    ['notSaved', 'connected', [], refused, access],
    ['reconnecting', 'reconnecting', [], [], access],
    ['notSaved', 'reconnecting', one, [], access],
    ['notSaved', 'connecting', one, [], access],
    ['notSaved', 'refused', one, [], readOnly],
    ['readOnly', 'refused', [], [], readOnly],
    ['readOnly', 'connected', [], [], readOnly],
    ['readOnly', 'connected', [], [], null],
  ] as const)(
    'C10 says %s when %s with this much waiting',
    (expected, connection, pending, refusedEdits, mine) => {
      const state = { connection, pending: [...pending], refusedEdits: [...refusedEdits], access: mine }
      expect(savingState({ ...state, confirmed: document })).toBe(expected)
    },
  )

  it('C10 never says saved before the answer, however the answer comes', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    const said: [string, number][] = []
    dina.store.subscribe((state) => said.push([savingState(state), state.pending.length]))
    dina.set('A', 'stationMm', 11)
    await world.flush()
    dina.line.disconnect()
    dina.set('A', 'stationMm', 12)
    await world.flush()
    dina.line.reconnect()
    await world.flush()
    expect(said.filter(([state, pending]) => state === 'saved' && pending > 0)).toEqual([])
    expect(savingState(dina.state)).toBe('saved')
  })
})
