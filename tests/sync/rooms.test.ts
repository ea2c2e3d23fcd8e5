import { describe, expect, it } from 'vitest'
import { MAX_CATCH_UP_EDITS, PRESENCE_INTERVAL_MS, type JoinReply } from '@shared/protocol/realtime'
import {
  changeStatus,
  LAYOUT,
  memoryWorld,
  principalOf,
  settle,
  WORKSPACE,
  type Browser,
  type SyncWorld,
} from './support/sync-world'

function join(world: SyncWorld, lastRevision: number | null, epoch: string | null = 'epoch-1'): JoinReply {
  const request = { layoutId: LAYOUT, clientId: 'client-raw', protocolVersion: 1, lastRevision, epoch }
  return world.rooms.join('raw', principalOf('Rita', 'viewer'), request)
}

async function moves(world: SyncWorld, browser: Browser, count: number): Promise<void> {
  for (let at = 1; at <= count; at += 1) browser.set('A', 'stationMm', 100 + at)
  await world.flush()
}

describe('the queue', () => {
  it('R1 stores the edits of one turn in one transaction and announces them after it, in order', async () => {
    const world = memoryWorld()
    const people = [await world.open('Dina'), await world.open('Tomas'), await world.open('Mira', 'manager')]
    const watcher = await world.open('Vera', 'viewer')
    const before = world.storage.transactionCount
    const heard: number[] = []
    watcher.store.subscribe(({ revision }) => heard.push(revision))
    for (const [at, person] of people.entries()) person.set('A', 'stationMm', 20 + at)
    await settle()
    for (const { line } of people) line.flushToServer()
    expect(watcher.line.queued.toClient).toBe(0)
    world.clock.runDeferred()
    expect(world.storage.transactionCount).toBe(before + 1)
    expect(world.layout.revision).toBe(3)
    await world.flush()
    expect(heard.filter((revision, at) => revision !== heard[at - 1])).toEqual([1, 2, 3])
  })

  it('S2 stores an edit whole or not at all, and its failure does not touch the others of its turn', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    // The turn as a whole fails, then the first edit alone; the second goes through.
    world.storage.failures.push('storeReceipt', 'storeReceipt')
    dina.set('A', 'stationMm', 12)
    tomas.set('B', 'stationMm', 95)
    await world.flush()
    expect(world.storage.readEntries(LAYOUT, 0).map(({ userName }) => userName)).toEqual(['Tomas'])
    expect(world.storage.receipts(LAYOUT)).toHaveLength(1)
    expect(world.errors).toHaveLength(1)
    expect(dina.state.pending).toHaveLength(1)
    world.clock.advance(1_000)
    await world.flush()
    expect(dina.visible).toEqual(world.layout.document)
    expect(world.layout.document.hubs.map(({ stationMm }) => stationMm)).toEqual([12, 95])
  })

  it('S2 remembers nothing of a transaction whose commit failed', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    world.storage.failures.push('commit')
    dina.set('A', 'stationMm', 12)
    await world.flush()
    expect(world.layout.revision).toBe(0)
    expect(dina.state.revision).toBe(0)
    world.clock.advance(1_000)
    await world.flush()
    expect(world.layout.revision).toBe(1)
    expect(dina.state.pending).toEqual([])
  })
})

describe('joining', () => {
  it('R2 gives every edit after the last seen revision, and the ones that come while joining', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    tomas.line.disconnect()
    tomas.line.serverNotices()
    await moves(world, dina, 3)
    tomas.line.reconnect()
    await settle()
    // Tomas's request and Dina's edit arrive in the same turn.
    dina.set('B', 'stationMm', 88)
    await settle()
    tomas.line.flushToServer()
    dina.line.flushToServer()
    world.clock.runDeferred()
    await world.flush()
    expect(tomas.state.revision).toBe(4)
    expect(tomas.visible).toEqual(world.layout.document)

    const reply = join(world, 1)
    if (!reply.ok || reply.sync.kind !== 'edits') throw new Error('Expected edits')
    expect(reply.sync.edits.map(({ revision }) => revision)).toEqual([2, 3, 4])
  })

  it('R3 gives the whole document when the client’s state cannot be continued', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    await moves(world, dina, 3)
    const kind = (reply: JoinReply) => (reply.ok ? reply.sync.kind : reply.reason)
    expect(kind(join(world, 3))).toBe('edits')
    expect(kind(join(world, null))).toBe('snapshot')
    expect(kind(join(world, 4))).toBe('snapshot')
    expect(kind(join(world, 2, 'epoch-0'))).toBe('snapshot')
    for (let at = 0; at < MAX_CATCH_UP_EDITS; at += 50) await moves(world, dina, 50)
    expect(kind(join(world, 2))).toBe('snapshot')
    expect(kind(join(world, world.layout.revision - MAX_CATCH_UP_EDITS))).toBe('edits')
  })

  it('R3 keeps what waits and sends it again after a restored backup', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    await moves(world, dina, 2)
    dina.line.disconnect()
    dina.line.serverNotices()
    dina.set('A', 'lengthMm', 51)
    // The restored file knows one revision less, and says so by its epoch.
    const restored = memoryWorld()
    const older = await restored.open('Dina')
    await moves(restored, older, 1)
    restored.storage.setEpoch(LAYOUT, 'epoch-2')
    restored.rooms.close()
    dina.line.moveTo(restored.lines)
    restored.browsers.splice(0, 1, dina)
    dina.line.reconnect()
    await restored.flush()
    expect(dina.state).toMatchObject({ epoch: 'epoch-2', revision: 2, pending: [] })
    expect(restored.layout.document.hubs[0]).toMatchObject({ stationMm: 101, lengthMm: 51 })
  })

  it('R4 is needed before editing, and impossible in a layout of another workspace', async () => {
    const world = memoryWorld()
    const outcome = await new Promise((resolve) => {
      const edit = { clientId: 'c', clientSeq: 1, editId: 'e', baseRevision: 0, label: '', operations: [] }
      world.rooms.submit('nobody', LAYOUT, edit, resolve)
    })
    expect(outcome).toMatchObject({ outcome: 'rejected', reason: 'notJoined' })
    const request = { clientId: 'c', protocolVersion: 1, lastRevision: null, epoch: null }
    const stranger = principalOf('Stranger', 'admin', 'workspace-2')
    const foreign = world.rooms.join('s', stranger, { ...request, layoutId: LAYOUT })
    const missing = world.rooms.join('s', stranger, { ...request, layoutId: 'none' })
    expect(foreign).toMatchObject({ ok: false, reason: 'notFound' })
    // Not even that it exists can be told.
    expect(foreign).toEqual(missing)
    expect(world.rooms.openRoomCount()).toBe(0)
  })

  it('R5 survives the late close of the connection before', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    dina.line.disconnect()
    dina.line.reconnect()
    await world.flush()
    dina.line.serverNotices()
    await world.flush()
    expect(tomas.state.people.map(({ name }) => name).sort()).toEqual(['Dina', 'Tomas'])
    tomas.set('A', 'stationMm', 12)
    await world.flush()
    expect(dina.hub('A').stationMm).toBe(12)
  })

  it('R6 leaves nothing behind when everybody has gone', async () => {
    const world = memoryWorld()
    for (let round = 0; round < 300; round += 1) {
      const dina = await world.open('Dina')
      if (round % 50 === 0) dina.set('A', 'stationMm', 20 + round)
      dina.session.updatePresence({ selection: ['A'] })
      await world.flush()
      dina.session.close()
      dina.line.serverNotices()
      world.browsers.pop()
    }
    expect(world.rooms.openRoomCount()).toBe(0)
    world.clock.advance(60_000)
    expect(world.clock.timerCount).toBe(0)
    expect(world.rooms.peopleIn(LAYOUT)).toEqual([])
  })

  it('R8 ends at once for somebody who lost access, with what still waits in the queue', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    dina.set('A', 'stationMm', 12)
    await settle()
    dina.line.flushToServer()
    world.changeRole(dina, null)
    await world.flush()
    expect(world.layout.revision).toBe(0)
    expect(dina.state).toMatchObject({ connection: 'refused', refusedReason: { reason: 'notFound' } })
    expect(tomas.state.people.map(({ name }) => name)).toEqual(['Tomas'])
    // The edit is not lost: it waits in the browser.
    expect(await dina.outbox.load(LAYOUT)).toHaveLength(1)
  })

  it('R8 takes the pen from somebody who became a viewer, and gives it back', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    world.changeRole(dina, 'viewer')
    await world.flush()
    expect(dina.state.access).toMatchObject({ role: 'viewer', canEdit: false })
    expect(dina.set('A', 'stationMm', 12)).toMatchObject({ kind: 'readOnly' })
    world.changeRole(dina, 'designer')
    await world.flush()
    dina.set('A', 'stationMm', 12)
    await world.flush()
    expect(world.layout.revision).toBe(1)
  })
})

describe('presence', () => {
  it('P1 has name, role and colour from the server, one colour a person', async () => {
    const world = memoryWorld()
    await world.open('Dina')
    const second = await world.open('Dina')
    const tomas = await world.open('Tomas', 'manager')
    const colours = tomas.state.people.map(({ name, role, colourIndex }) => [name, role, colourIndex])
    expect(colours).toEqual([
      ['Dina', 'designer', 0],
      ['Dina', 'designer', 0],
      ['Tomas', 'manager', 1],
    ])
    expect(second.state.you?.colourIndex).toBe(0)
    expect(world.rooms.peopleIn(LAYOUT).map(({ name }) => name)).toEqual(['Dina', 'Tomas'])
  })

  it('P2 makes one message of the movements of one interval', async () => {
    const world = memoryWorld()
    const people = [await world.open('Dina'), await world.open('Tomas'), await world.open('Mira')]
    const watcher = await world.open('Vera', 'viewer')
    world.clock.advance(1_000)
    await world.flush()
    let messages = 0
    watcher.store.subscribe((state, previous) => {
      if (state.people !== previous.people) messages += 1
    })
    for (const [at, person] of people.entries()) {
      person.session.updatePresence({ cursor: { xMm: at, yMm: 0 }, selection: ['A'] })
    }
    world.clock.advance(PRESENCE_INTERVAL_MS)
    for (const { line } of people) line.flushToServer()
    world.clock.advance(PRESENCE_INTERVAL_MS)
    await world.flush()
    expect(messages).toBe(1)
    expect(watcher.state.people.slice(0, 3).map(({ cursor, selection }) => [cursor?.xMm, selection])).toEqual(
      [
        [0, ['A']],
        [1, ['A']],
        [2, ['A']],
      ],
    )
  })

  it('P3 is gone at once for whoever leaves or loses the line', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    const names = () => tomas.state.people.map(({ name }) => name)
    expect(names()).toEqual(['Dina', 'Tomas'])
    dina.line.crash()
    dina.line.serverNotices()
    await world.flush()
    expect(names()).toEqual(['Tomas'])
  })

  it('P4 leaves no mark in the log', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    const before = world.storage.transactionCount
    dina.session.updatePresence({
      ghost: { part: 'A', stationMm: 12, lengthMm: 40 },
      editing: 'hub:A:lengthMm',
    })
    world.clock.advance(1_000)
    await world.flush()
    expect([world.layout.revision, world.storage.transactionCount]).toEqual([0, before])
  })

  it('P5 is sent at most once an interval, as it is then', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    await world.flush()
    for (let at = 0; at < 40; at += 1) {
      dina.session.updatePresence({ cursor: { xMm: at, yMm: 1 } })
      world.clock.advance(PRESENCE_INTERVAL_MS / 10)
    }
    expect(dina.line.queued.toServer).toBeLessThanOrEqual(4)
    world.clock.advance(PRESENCE_INTERVAL_MS)
    await world.flush()
    world.clock.advance(PRESENCE_INTERVAL_MS)
    await world.flush()
    expect(dina.state.people[0]?.cursor).toEqual({ xMm: 39, yMm: 1 })
  })
})

describe('a change of status', () => {
  it('F1 stands between the edits before it and those after it', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    dina.set('A', 'stationMm', 12)
    await settle()
    dina.line.flushToServer()
    const frozen = changeStatus(world, 'freeze')
    await frozen
    tomas.set('B', 'stationMm', 95)
    await world.flush()
    const kinds = world.storage.readEntries(LAYOUT, 0).map(({ kind, revision }) => [kind, revision])
    expect(kinds).toEqual([
      ['edit', 1],
      ['freeze', 2],
    ])
    expect(world.layout.document.hubs.map(({ stationMm }) => stationMm)).toEqual([12, 80])
    expect(tomas.state.refusedEdits).toMatchObject([{ reason: 'frozen' }])
    expect([dina.state.revision, tomas.state.revision]).toEqual([2, 2])
  })

  it('F2 gives everyone in the layout the new access at once', async () => {
    const world = memoryWorld()
    const [dina, vera] = [await world.open('Dina'), await world.open('Vera', 'viewer')]
    dina.session.setPreview('Move', [
      { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'stationMm', value: 33 },
    ])
    await changeStatus(world, 'freeze')
    await world.flush()
    for (const { state } of [dina, vera]) {
      expect(state.access).toMatchObject({ status: 'released', canEdit: false, revisionLetter: 'A' })
    }
    expect(dina.state.preview).toBeNull()
    expect(dina.set('A', 'stationMm', 12)).toMatchObject({ kind: 'readOnly' })
    expect(world.lines.workspaceMessages).toContainEqual({ workspaceId: WORKSPACE, what: 'releases' })
  })

  it('F3 stores nothing when it fails, and the queue goes on', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    await expect(changeStatus(world, 'freeze', { fails: true })).rejects.toThrow(
      'refused by the release service',
    )
    expect(world.layout).toMatchObject({ status: 'draft', revision: 0 })
    dina.set('A', 'stationMm', 12)
    await world.flush()
    expect(world.layout.revision).toBe(1)
  })

  it('F4 is a conflict when an edit came in between', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    dina.set('A', 'stationMm', 12)
    await settle()
    dina.line.flushToServer()
    await expect(changeStatus(world, 'freeze', { expectedRevision: 0 })).rejects.toMatchObject({
      code: 'conflict',
    })
    await world.flush()
    await changeStatus(world, 'freeze', { expectedRevision: 1 })
    expect(world.layout).toMatchObject({ status: 'released', revision: 2 })
  })

  it('F5 leaves an edit that came too late with its author', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    dina.line.disconnect()
    dina.line.serverNotices()
    dina.set('A', 'stationMm', 12, 'Move Pinion')
    await changeStatus(world, 'freeze')
    dina.line.reconnect()
    await world.flush()
    expect(dina.state.refusedEdits).toMatchObject([
      { label: 'Move Pinion', reason: 'frozen', operations: [{ value: 12 }] },
    ])
    expect(dina.visible).toEqual(world.layout.document)
    expect(dina.state.refusedEdits[0]?.message).toContain('frozen')
  })

  it('F6 to the next revision opens it for editing again', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    await changeStatus(world, 'freeze')
    await changeStatus(world, 'nextRevision')
    await world.flush()
    expect(dina.state.access).toMatchObject({ status: 'draft', canEdit: true, revisionLetter: 'B' })
    dina.set('A', 'stationMm', 12)
    await world.flush()
    expect(world.layout.document.hubs[0]?.stationMm).toBe(12)
  })
})
