import { describe, expect, it } from 'vitest'
import { serialiseLayoutFile } from '@shared/layout/layout-file'
import { rebase } from '@shared/layout/rebase'
import { MAX_OPERATIONS_PER_EDIT, type SubmitOutcome, type SubmitRequest } from '@shared/protocol/realtime'
import { LAYOUT, memoryWorld, principalOf, changeStatus, type SyncWorld } from './support/sync-world'

/** Speaks to the room as a client does, without a client. */
async function someoneIn(
  world: SyncWorld,
  name = 'Dina',
  role: Parameters<typeof principalOf>[1] = 'designer',
  connectionId = `raw-${name}`,
) {
  const principal = principalOf(name, role)
  const joined = world.rooms.join(connectionId, principal, {
    layoutId: LAYOUT,
    clientId: `client-${name}`,
    protocolVersion: 1,
    lastRevision: null,
    epoch: null,
  })
  let seq = 0
  const submit = (edit: Partial<SubmitRequest>): Promise<SubmitOutcome> => {
    seq += 1
    const answer = new Promise<SubmitOutcome>((resolve) => {
      world.rooms.submit(
        connectionId,
        LAYOUT,
        {
          clientId: `client-${name}`,
          clientSeq: seq,
          editId: `edit-${name}-${seq}`,
          baseRevision: world.layout.revision,
          label: 'Edit',
          operations: [],
          ...edit,
        },
        resolve,
      )
    })
    void Promise.resolve().then(() => world.clock.runDeferred())
    return answer
  }
  const move = (value: number, edit: Partial<SubmitRequest> = {}) =>
    submit({
      operations: [{ type: 'set', target: { kind: 'hub', id: 'A' }, field: 'stationMm', value }],
      ...edit,
    })
  return { joined, submit, move, connectionId }
}

describe('outcomes', () => {
  it('E1 an edit that applies whole is accepted with the next revision', async () => {
    const world = memoryWorld()
    const dina = await someoneIn(world)
    expect(await dina.move(12)).toMatchObject({
      outcome: 'accepted',
      edit: { revision: 1, userName: 'Dina', kind: 'edit', operations: [{ before: 10, value: 12 }] },
    })
    expect(await dina.move(13)).toMatchObject({ outcome: 'accepted', edit: { revision: 2 } })
    expect(world.layout.document.hubs[0]?.stationMm).toBe(13)
  })

  it('E2 an edit that applies in part is adjusted, and the answer says what was applied', async () => {
    const world = memoryWorld()
    const dina = await someoneIn(world)
    const half = await dina.submit({
      operations: [
        { type: 'set', target: { kind: 'hub', id: 'gone' }, field: 'lengthMm', value: 3 },
        { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'lengthMm', value: 44 },
      ],
    })
    expect(half).toMatchObject({
      outcome: 'adjusted',
      edit: { operations: [{ field: 'lengthMm', value: 44 }] },
    })
    const more = await dina.submit({ operations: [{ type: 'remove', target: { kind: 'hub', id: 'B' } }] })
    expect(more).toMatchObject({ outcome: 'adjusted', edit: { revision: 2 } })
    if (more.outcome === 'adjusted') expect(more.edit.operations).toHaveLength(3)
  })

  it('E3 an edit that changes nothing gets no revision', async () => {
    const world = memoryWorld()
    const dina = await someoneIn(world)
    expect(await dina.move(10)).toEqual({ outcome: 'noEffect', revision: 0, notices: [] })
    expect(world.storage.readEntries(LAYOUT, 0)).toEqual([])
  })

  it('E4 a value that cannot be stored makes the edit invalid as a whole', async () => {
    const world = memoryWorld()
    const dina = await someoneIn(world)
    const outcome = await dina.submit({
      operations: [
        { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'stationMm', value: 20 },
        { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'lengthMm', value: -1 },
      ],
    })
    expect(outcome).toMatchObject({ outcome: 'rejected', reason: 'invalid' })
    expect(world.layout.document.hubs[0]?.stationMm).toBe(10)
  })

  it('E5 an edit sent again gets the same answer and has no second effect', async () => {
    const world = memoryWorld()
    const dina = await someoneIn(world)
    const first = await dina.move(12, { clientSeq: 1, editId: 'edit-1' })
    const nothing = await dina.move(12, { clientSeq: 2, editId: 'edit-2' })
    await dina.move(30, { clientSeq: 3, editId: 'edit-3' })
    expect(await dina.move(12, { clientSeq: 1, editId: 'edit-1' })).toEqual(first)
    expect(await dina.move(12, { clientSeq: 2, editId: 'edit-2' })).toEqual(nothing)
    expect(world.layout).toMatchObject({ revision: 2 })
    expect(world.layout.document.hubs[0]?.stationMm).toBe(30)

    await changeStatus(world, 'freeze')
    expect(await dina.move(12, { clientSeq: 1, editId: 'edit-1' })).toEqual(first)
    const late = await dina.move(40, { clientSeq: 4, editId: 'edit-4' })
    expect(late).toMatchObject({ reason: 'frozen' })
    // Refused once, refused for good: the next revision must not pick it up unseen.
    await changeStatus(world, 'nextRevision')
    expect(await dina.move(40, { clientSeq: 4, editId: 'edit-4' })).toEqual(late)
  })

  it('E6 a number or id that is used already is refused', async () => {
    const world = memoryWorld()
    const dina = await someoneIn(world)
    const tomas = await someoneIn(world, 'Tomas')
    await dina.move(12, { clientSeq: 1, editId: 'edit-1' })
    const stolen = { outcome: 'rejected', reason: 'invalid' }
    expect(await tomas.move(13, { clientId: 'client-Tomas', clientSeq: 9, editId: 'edit-1' })).toMatchObject(
      stolen,
    )
    // Nobody can use up somebody else's numbers.
    const borrowed = { clientId: 'client-Dina', clientSeq: 2, editId: 'edit-9' }
    expect(await tomas.move(13, borrowed)).toMatchObject({ outcome: 'accepted' })
    expect(await dina.move(14, { clientSeq: 2, editId: 'edit-2' })).toMatchObject({ outcome: 'accepted' })
    expect(await dina.move(13, { clientSeq: 1, editId: 'edit-8' })).toMatchObject(stolen)
    expect(world.layout.revision).toBe(3)
  })

  it('E9 an edit without the right to edit is forbidden, and stays so when the right comes later', async () => {
    const world = memoryWorld()
    for (const role of ['viewer', 'shop'] as const) {
      const reader = await someoneIn(world, role, role)
      expect(await reader.move(12)).toMatchObject({ outcome: 'rejected', reason: 'forbidden' })
    }
    expect(world.layout.revision).toBe(0)
    const vera = await someoneIn(world, 'Vera', 'viewer')
    const refused = await vera.move(12, { editId: 'edit-v', clientSeq: 1 })
    world.rooms.changePrincipal(vera.connectionId, principalOf('Vera', 'designer'))
    expect(await vera.move(12, { editId: 'edit-v', clientSeq: 1 })).toEqual(refused)
    for (const role of ['designer', 'manager', 'admin'] as const) {
      const editor = await someoneIn(world, role, role)
      expect(await editor.move(20 + role.length)).toMatchObject({ outcome: 'accepted' })
    }
  })

  it('E10 an edit that is too large is refused, and so is one that makes the layout too large', async () => {
    const world = memoryWorld()
    const dina = await someoneIn(world)
    const name = 'x'.repeat(110)
    const big = Array.from({ length: MAX_OPERATIONS_PER_EDIT }, (_, at) => ({
      type: 'add' as const,
      collection: 'loads' as const,
      loadCaseId: 'run',
      index: 0,
      item: { ...world.layout.document.loadCases[0]!.loads[0]!, id: `load-${at}-${name.slice(0, 50)}` },
    }))
    expect(await dina.submit({ operations: big })).toMatchObject({ reason: 'tooLarge' })
    expect(world.layout.revision).toBe(0)
  })

  it('E12 an edit made by a route stands in the same sequence and reaches everyone', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    const renaming = world.rooms.submitServerEdit({
      layoutId: LAYOUT,
      actor: principalOf('Tomas', 'designer'),
      label: 'Rename',
      operations: [{ type: 'set', target: { kind: 'layout' }, field: 'name', value: 'Line shaft' }],
    })
    dina.set('A', 'stationMm', 14)
    await world.flush()
    expect(await renaming).toMatchObject({ outcome: 'accepted' })
    expect(dina.visible.name).toBe('Line shaft')
    expect(world.layout.revision).toBe(2)
    const refused = await (async () => {
      const answer = world.rooms.submitServerEdit({
        layoutId: LAYOUT,
        actor: principalOf('Vera', 'viewer'),
        label: 'Rename',
        operations: [{ type: 'set', target: { kind: 'layout' }, field: 'name', value: 'Mine' }],
      })
      world.clock.runDeferred()
      return answer
    })()
    expect(refused).toMatchObject({ outcome: 'rejected', reason: 'forbidden' })
  })
})

describe('two people', () => {
  it('E7 the later edit of a field wins, and both are told', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    dina.set('A', 'stationMm', 12)
    tomas.set('A', 'stationMm', 15)
    await world.flush()
    expect([dina.hub('A').stationMm, tomas.hub('A').stationMm]).toEqual([15, 15])
    expect(tomas.state.notices).toMatchObject([
      { kind: 'overwrote', message: 'You replaced Dina’s value: station of Pinion.' },
    ])
    expect(dina.state.notices).toMatchObject([
      { kind: 'overwrote', message: 'Tomas replaced your value: station of Pinion.' },
    ])
    dina.session.dismissNotice(dina.state.notices[0]!.id)
    expect(dina.state.notices).toEqual([])
    // Having seen the value, changing it is no surprise.
    dina.set('A', 'stationMm', 20)
    await world.flush()
    expect(dina.state.notices).toEqual([])
    expect(tomas.state.notices).toHaveLength(1)
  })

  it('E7 different fields of one part do not disturb each other', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    dina.set('A', 'friction.axial', 0.2)
    tomas.set('A', 'friction.pressing', 0.1)
    await world.flush()
    expect(dina.hub('A').friction).toEqual({ circumferential: 0.14, axial: 0.2, pressing: 0.1 })
    expect(dina.visible).toEqual(tomas.visible)
    expect([...dina.state.notices, ...tomas.state.notices]).toEqual([])
  })

  it('E8 a change of something that was removed is dropped, and both are told', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    dina.commit({ type: 'remove', target: { kind: 'hub', id: 'A' } })
    tomas.set('A', 'lengthMm', 50, 'Lengthen Pinion')
    await world.flush()
    expect(tomas.visible.hubs.map(({ id }) => id)).toEqual(['B'])
    expect(tomas.state.notices).toMatchObject([
      { kind: 'dropped', message: 'Part of “Lengthen Pinion” had no effect: Dina has removed Pinion.' },
    ])
    expect(dina.state.notices).toMatchObject([
      {
        kind: 'dropped',
        message: 'Tomas’s “Lengthen Pinion” had no effect on Pinion, which you had removed.',
      },
    ])
    expect(world.layout.revision).toBe(1)
  })

  it('E8 a load added to a hub that is being removed goes with it', async () => {
    const world = memoryWorld()
    const [dina, tomas] = [await world.open('Dina'), await world.open('Tomas')]
    const load = { ...tomas.visible.loadCases[0]!.loads[0]!, id: 'load-new' }
    tomas.commit({ type: 'add', collection: 'loads', loadCaseId: 'run', index: 0, item: load })
    dina.commit({ type: 'remove', target: { kind: 'hub', id: 'A' } })
    await world.flush()
    expect(world.layout.document.loadCases.flatMap(({ loads }) => loads.map(({ hub }) => hub))).toEqual(['B'])
    expect(dina.visible).toEqual(tomas.visible)
  })
})

describe('the order of one connection', () => {
  it('E11 edits after one that could not be stored wait for it', async () => {
    const world = memoryWorld()
    const dina = await someoneIn(world)
    // The turn fails as a whole, then the first edit fails alone; the second could have been stored.
    world.storage.failures.push('append', 'append')
    const turn = [
      dina.move(11, { clientSeq: 1, editId: 'e1' }),
      dina.move(12, { clientSeq: 2, editId: 'e2' }),
    ]
    expect(await Promise.all(turn)).toMatchObject([{ reason: 'unavailable' }, { reason: 'unavailable' }])
    expect(await dina.move(12, { clientSeq: 2, editId: 'e2' })).toMatchObject({ reason: 'unavailable' })
    expect(await dina.move(11, { clientSeq: 1, editId: 'e1' })).toMatchObject({ outcome: 'accepted' })
    expect(await dina.move(12, { clientSeq: 2, editId: 'e2' })).toMatchObject({ outcome: 'accepted' })
    expect(world.storage.readEntries(LAYOUT, 0).map(({ editId }) => editId)).toEqual(['e1', 'e2'])
  })

  it('E11 waiting ends when another tab has brought the edit that was waited for', async () => {
    const world = memoryWorld()
    const [dina, sameDina] = [
      await someoneIn(world),
      await someoneIn(world, 'Dina', 'designer', 'second-tab'),
    ]
    world.storage.failures.push('append')
    expect(await dina.move(11, { clientSeq: 1, editId: 'e1' })).toMatchObject({ reason: 'unavailable' })
    expect(await sameDina.move(11, { clientSeq: 1, editId: 'e1' })).toMatchObject({ outcome: 'accepted' })
    expect(await dina.move(12, { clientSeq: 2, editId: 'e2' })).toMatchObject({ outcome: 'accepted' })
  })

  it('R10 an edit that came too fast holds up those after it, not those before it', async () => {
    const world = memoryWorld()
    const dina = await someoneIn(world)
    const answers: SubmitOutcome[] = []
    const send = (clientSeq: number, isTooFast: boolean) =>
      world.rooms.submit(
        dina.connectionId,
        LAYOUT,
        {
          clientId: 'client-Dina',
          clientSeq,
          editId: `e${clientSeq}`,
          baseRevision: 0,
          label: 'Move',
          operations: [
            { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'stationMm', value: 20 + clientSeq },
          ],
        },
        (outcome) => answers.push(outcome),
        isTooFast,
      )
    // One turn: the third is too fast, the fourth would be in time again.
    for (const [seq, isTooFast] of [
      [1, false],
      [2, false],
      [3, true],
      [4, false],
    ] as const)
      send(seq, isTooFast)
    world.clock.runDeferred()
    expect(answers.map((answer) => ('reason' in answer ? answer.reason : answer.outcome))).toEqual([
      'accepted',
      'accepted',
      'rateLimited',
      'unavailable',
    ])
    for (const seq of [3, 4]) send(seq, false)
    world.clock.runDeferred()
    expect(world.storage.readEntries(LAYOUT, 0).map(({ editId }) => editId)).toEqual(['e1', 'e2', 'e3', 'e4'])
  })

  it('C14 a client that is put off waits, and sends again in order', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    world.storage.failures.push('append')
    dina.set('A', 'stationMm', 11)
    await world.flush()
    dina.set('A', 'stationMm', 12)
    await world.flush()
    expect(world.layout.revision).toBe(0)
    expect(dina.state.pending).toHaveLength(2)
    world.clock.advance(1_000)
    await world.flush()
    expect(world.storage.readEntries(LAYOUT, 0).map(({ clientSeq }) => clientSeq)).toEqual([1, 2])
    expect(dina.hub('A').stationMm).toBe(12)
    expect(dina.state.pending).toEqual([])
  })
})

describe('the log', () => {
  it('S3 the base and the log give every later document', async () => {
    const world = memoryWorld()
    const dina = await world.open('Dina')
    const seen = [serialiseLayoutFile(world.layout.document)]
    for (const value of [11, 12, 13]) {
      dina.set('A', 'stationMm', value)
      await world.flush()
      seen.push(serialiseLayoutFile(world.layout.document))
    }
    const base = world.storage.readBase(LAYOUT)
    if (!base) throw new Error('No base')
    const entries = world.storage.readEntries(LAYOUT, base.revision)
    const replayed = [0, 1, 2, 3].map((count) =>
      serialiseLayoutFile(rebase(base.document, entries.slice(0, count))),
    )
    expect(replayed).toEqual(seen)
  })
})
