import { describe, expect, it } from 'vitest'
import { canonicalJson } from '@shared/layout/canonical-json'
import { removeHubOperations } from '@shared/layout/remove-hub-operations'
import { seededRandom } from './support/random'
import { randomOperations } from './support/random-operations'
import { changeStatus, memoryWorld, settle, type Browser, type SyncWorld } from './support/sync-world'

async function pair(): Promise<{ world: SyncWorld; dina: Browser; tomas: Browser }> {
  const world = memoryWorld()
  return { world, dina: await world.open('Dina'), tomas: await world.open('Tomas') }
}

describe('undo among several people', () => {
  it('U1 takes back one’s own last edit, never somebody else’s', async () => {
    const { world, dina, tomas } = await pair()
    dina.set('A', 'stationMm', 12, 'Move Pinion')
    await world.flush()
    tomas.set('B', 'stationMm', 90, 'Move Cam')
    await world.flush()
    expect(dina.state).toMatchObject({ canUndo: true, undoLabel: 'Move Pinion' })
    expect(dina.session.undo()).toMatchObject({ kind: 'done', label: 'Move Pinion' })
    await world.flush()
    expect([tomas.hub('A').stationMm, tomas.hub('B').stationMm]).toEqual([10, 90])
    expect(dina.session.undo()).toEqual({ kind: 'nothing' })
    expect(dina.state).toMatchObject({ canUndo: false, canRedo: true, redoLabel: 'Move Pinion' })
    expect(dina.session.redo()).toMatchObject({ kind: 'done' })
    await world.flush()
    expect([tomas.hub('A').stationMm, tomas.hub('B').stationMm]).toEqual([12, 90])
  })

  // Dina sets 12, Tomas sets 15 over it. Who undoes, in which order, and what stands in the end.
  it.each([
    ['U2 Dina alone: Tomas’s value stays', ['dina'], 15],
    ['U2 Tomas alone: Dina’s value comes back', ['tomas'], 12],
    ['U2 Dina, then Tomas', ['dina', 'tomas'], 12],
    ['U2 Tomas, then Dina: back to the start', ['tomas', 'dina'], 10],
  ] as const)('%s', async (_title, order, expected) => {
    const { world, dina, tomas } = await pair()
    dina.set('A', 'stationMm', 12)
    await world.flush()
    tomas.set('A', 'stationMm', 15)
    await world.flush()
    for (const who of order) {
      ;(who === 'dina' ? dina : tomas).session.undo()
      await world.flush()
    }
    expect([dina.hub('A').stationMm, tomas.hub('A').stationMm]).toEqual([expected, expected])
  })

  it('U2 keeps a field that somebody else changed since, and says who', async () => {
    const { world, dina, tomas } = await pair()
    dina.commit(
      { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'stationMm', value: 12 },
      { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'lengthMm', value: 50 },
    )
    await world.flush()
    tomas.set('A', 'lengthMm', 55)
    await world.flush()
    const result = dina.session.undo()
    expect(result).toMatchObject({
      kind: 'done',
      skipped: ['length of Pinion has been changed since by Tomas'],
    })
    await world.flush()
    expect(dina.hub('A')).toMatchObject({ stationMm: 10, lengthMm: 55 })
    expect(dina.state.notices.at(-1)).toMatchObject({ kind: 'undoSkipped' })
    expect(dina.state.notices.at(-1)?.message).toContain('changed since by Tomas')
  })

  it('U3 takes a whole gesture back in one step', async () => {
    const { world, dina, tomas } = await pair()
    for (let at = 11; at <= 30; at += 1) {
      dina.session.setPreview('Move Pinion', [
        { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'stationMm', value: at },
      ])
    }
    dina.session.commit('Move Pinion', [
      { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'stationMm', value: 30 },
      {
        type: 'set',
        target: { kind: 'load', loadCaseId: 'run', id: 'load-1' },
        field: 'stationMm',
        value: 52,
      },
    ])
    await world.flush()
    expect([world.layout.revision, dina.state.preview]).toEqual([1, null])
    dina.session.undo()
    await world.flush()
    expect(world.layout.revision).toBe(2)
    expect(tomas.hub('A').stationMm).toBe(10)
    expect(dina.state.canUndo).toBe(false)
  })

  it('U4 is refused for an addition that somebody worked on since', async () => {
    const { world, dina, tomas } = await pair()
    dina.session.commit('Add Wheel', [
      { type: 'add', collection: 'hubs', index: 2, item: { ...dina.hub('A'), id: 'W', name: 'Wheel' } },
    ])
    await world.flush()
    tomas.set('W', 'lengthMm', 60)
    await world.flush()
    expect(dina.session.undo()).toMatchObject({
      kind: 'refused',
      message: '“Add Wheel” was not undone: Wheel has been worked on since and would be lost.',
    })
    await world.flush()
    expect(tomas.hub('W').lengthMm).toBe(60)
    expect(dina.state.notices.at(-1)).toMatchObject({ kind: 'undoRefused' })
    // It is out of the way: what was done before it can be undone.
    expect(dina.state.canUndo).toBe(false)
  })

  it('U4 is refused for a hub that others have put loads on, done for one they left alone', async () => {
    const { world, dina, tomas } = await pair()
    for (const id of ['W', 'V']) {
      dina.commit({ type: 'add', collection: 'hubs', index: 2, item: { ...dina.hub('A'), id, name: id } })
    }
    await world.flush()
    const load = { ...tomas.visible.loadCases[0]!.loads[0]!, id: 'load-w', hub: 'W' }
    tomas.commit({ type: 'add', collection: 'loads', loadCaseId: 'run', index: 0, item: load })
    await world.flush()
    expect(dina.session.undo().kind).toBe('done')
    expect(dina.session.undo().kind).toBe('refused')
    await world.flush()
    expect(tomas.visible.hubs.map(({ id }) => id)).toEqual(['A', 'B', 'W'])
  })

  it('U5 brings back a hub with its loads, temperature and timing, in its place', async () => {
    const { world, dina, tomas } = await pair()
    const before = canonicalJson(world.layout.document)
    dina.session.commit('Remove Pinion', removeHubOperations(dina.visible, 'A'))
    await world.flush()
    dina.session.commit('Remove Cam', [{ type: 'remove', target: { kind: 'hub', id: 'B' } }])
    await world.flush()
    tomas.commit({ type: 'reorder', target: { kind: 'section', id: 's3' }, index: 0 })
    await world.flush()
    dina.session.undo()
    dina.session.undo()
    tomas.session.undo()
    await world.flush()
    expect(canonicalJson(world.layout.document)).toBe(before)
  })

  it('U5 is refused when the place is gone', async () => {
    const { world, dina, tomas } = await pair()
    dina.session.commit('Remove Pinion', removeHubOperations(dina.visible, 'A'))
    dina.session.commit('Remove load', [
      { type: 'remove', target: { kind: 'load', loadCaseId: 'run', id: 'load-2' } },
    ])
    await world.flush()
    tomas.commit(...removeHubOperations(tomas.visible, 'B'))
    tomas.commit(
      { type: 'remove', target: { kind: 'section', id: 's1' } },
      { type: 'set', target: { kind: 'section', id: 's2' }, field: 'lengthMm', value: 5 },
      { type: 'set', target: { kind: 'section', id: 's3' }, field: 'lengthMm', value: 5 },
    )
    await world.flush()
    const before = canonicalJson(world.layout.document)
    expect(dina.session.undo()).toMatchObject({
      kind: 'refused',
      message: '“Remove load” was not undone: the hub of its load is gone.',
    })
    expect(dina.session.undo()).toMatchObject({
      kind: 'refused',
      message: '“Remove Pinion” was not undone: there is no shaft under Pinion any more.',
    })
    await world.flush()
    expect(canonicalJson(world.layout.document)).toBe(before)
  })

  it('U5 restores a load case without the loads of a hub that has gone', async () => {
    const { world, dina, tomas } = await pair()
    dina.commit({ type: 'remove', target: { kind: 'loadCase', id: 'run' } })
    await world.flush()
    tomas.commit(...removeHubOperations(tomas.visible, 'A'))
    await world.flush()
    expect(dina.session.undo().kind).toBe('done')
    await world.flush()
    const run = world.layout.document.loadCases.find(({ id }) => id === 'run')
    expect(run?.loads.map(({ hub }) => hub)).toEqual(['B'])
    expect(run?.hubTemperaturesC).toBeUndefined()
  })

  it('U6 has nothing left after a freeze, also in the next revision', async () => {
    const { world, dina } = await pair()
    dina.set('A', 'stationMm', 12)
    await world.flush()
    await changeStatus(world, 'freeze')
    await world.flush()
    expect(dina.state).toMatchObject({ canUndo: false, canRedo: false })
    expect(dina.session.undo()).toEqual({ kind: 'nothing' })
    await changeStatus(world, 'nextRevision')
    await world.flush()
    expect(dina.session.undo()).toEqual({ kind: 'nothing' })
  })

  it('U6 has nothing left when the right to edit is gone', async () => {
    const { world, dina } = await pair()
    dina.set('A', 'stationMm', 12)
    await world.flush()
    world.changeRole(dina, 'viewer')
    await world.flush()
    expect(dina.state.canUndo).toBe(false)
  })

  it.each([1, 2, 3, 4, 5, 6, 7, 8])(
    'U7 all the way back and forth again changes nothing (seed %i)',
    async (seed) => {
      const world = memoryWorld()
      const dina = await world.open('Dina')
      const random = seededRandom(seed)
      const before = canonicalJson(world.layout.document)
      for (let step = 0; step < 25; step += 1) dina.commit(...randomOperations(dina.visible, random))
      await world.flush()
      const after = canonicalJson(world.layout.document)
      while (dina.state.canUndo) dina.session.undo()
      await world.flush()
      expect(canonicalJson(world.layout.document)).toBe(before)
      while (dina.state.canRedo) dina.session.redo()
      await world.flush()
      expect(canonicalJson(world.layout.document)).toBe(after)
      expect(dina.state.notices).toEqual([])
    },
  )

  it('U7 goes on over a reconnection', async () => {
    const { world, dina, tomas } = await pair()
    dina.set('A', 'stationMm', 12)
    dina.line.disconnect()
    dina.line.serverNotices()
    tomas.set('B', 'stationMm', 90)
    await world.flush()
    expect(dina.session.undo().kind).toBe('done')
    dina.line.reconnect()
    await world.flush()
    expect([tomas.hub('A').stationMm, dina.hub('B').stationMm]).toEqual([10, 90])
  })

  it('U8 gives back what stood there in the server’s order, not what one saw', async () => {
    const { world, dina, tomas } = await pair()
    tomas.set('A', 'stationMm', 15)
    await settle()
    tomas.line.flushToServer()
    world.clock.runDeferred()
    // Dina has not seen 15 yet.
    dina.set('A', 'stationMm', 12)
    await world.flush()
    dina.session.undo()
    await world.flush()
    expect([dina.hub('A').stationMm, tomas.hub('A').stationMm]).toEqual([15, 15])
  })

  it('U9 does not know an edit that was refused or came to nothing', async () => {
    const { world, dina, tomas } = await pair()
    tomas.commit({ type: 'remove', target: { kind: 'hub', id: 'A' } })
    await settle()
    tomas.line.flushToServer()
    dina.set('A', 'stationMm', 12)
    await world.flush()
    expect(dina.state.pending).toEqual([])
    expect(dina.state.canUndo).toBe(false)
  })
})
