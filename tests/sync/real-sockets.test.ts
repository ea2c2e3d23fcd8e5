import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import { MAX_OPERATIONS_PER_EDIT, PROTOCOL_VERSION } from '@shared/protocol/realtime'
import { savingState } from '@/stores/saving-state'
import { startTestApp, type TestApp, type TestPerson } from '../support/test-app'
import { openClient, RawSocket, socketFor, until, type RealClient } from './support/real-client'

let app: TestApp
let layoutId: string
let dina: TestPerson
let tomas: TestPerson
const open: (RealClient | RawSocket)[] = []

beforeAll(async () => {
  app = await startTestApp()
  layoutId = app.layoutIds[0] ?? ''
  dina = await app.signInAs('designer')
  tomas = await app.signInAs('tomas')
})
afterEach(() => {
  for (const each of open.splice(0)) {
    if (each instanceof RawSocket) each.close()
    else each.session.close()
  }
})
afterAll(() => app.close())

async function client(person: TestPerson): Promise<RealClient> {
  const opened = await openClient(app, person, layoutId)
  open.push(opened)
  return opened
}

async function raw(person: TestPerson): Promise<RawSocket> {
  const socket = await RawSocket.connect(app, person.cookie)
  open.push(socket)
  return socket
}

function refusalOf(cookie: string, origin?: string): Promise<{ message: string; data?: unknown }> {
  const socket = socketFor(app, cookie, origin)
  return new Promise((resolve, reject) => {
    socket.once('connect', () => {
      socket.disconnect()
      reject(new Error('It was let in'))
    })
    socket.once('connect_error', (error) => {
      socket.disconnect()
      resolve(error)
    })
  })
}

const hubOf = (state: RealClient['state']) => state.visible?.hubs[0]
const move = (
  value: number,
  id = hubOf(open[0] instanceof RawSocket ? ({} as never) : open[0]!.state)?.id ?? '',
) => [{ type: 'set' as const, target: { kind: 'hub' as const, id }, field: 'stationMm', value }]

describe('two people over real sockets', () => {
  it('E1 see each other’s edits, and the chip says saved only after the answer', async () => {
    const [one, two] = [await client(dina), await client(tomas)]
    one.session.commit('Move', move(70))
    expect(savingState(one.state)).toBe('saving')
    await until(() => hubOf(two.state)?.stationMm === 70)
    await until(() => savingState(one.state) === 'saved')
    expect(two.state.revision).toBe(one.state.revision)
    two.session.updatePresence({ cursor: { xMm: 5, yMm: 6 }, selection: [hubOf(two.state)!.id] })
    await until(() => one.state.people.some(({ cursor }) => cursor?.xMm === 5))
    expect(one.state.people.map(({ name }) => name)).toEqual(['Dina Reyes', 'Tomas Berg'])
  })

  it('E5 S4 lose and repeat nothing when the server restarts under them', async () => {
    const [one, two] = [await client(dina), await client(tomas)]
    const before = one.state.revision
    for (let at = 0; at < 10; at += 1) one.session.commit('Move', move(71 + at))
    const restarting = app.restart()
    for (let at = 0; at < 10; at += 1) one.session.commit('Move', move(91 + at))
    await restarting
    await until(() => one.state.pending.length === 0 && two.state.revision === one.state.revision, 15_000)
    expect(one.state.revision).toBe(before + 20)
    expect(two.state.visible).toEqual(one.state.visible)
    expect(hubOf(one.state)?.stationMm).toBe(100)
  })

  it('E9 a viewer reads along and is refused on the socket too', async () => {
    const vera = await app.signInAs('viewer')
    const [one, two] = [await client(dina), await client(vera)]
    expect(two.state.access).toMatchObject({ role: 'viewer', canEdit: false })
    const pushy = await raw(vera)
    await pushy.join(layoutId)
    const edit = { clientSeq: 1, editId: 'edit-vera', operations: move(1) }
    expect(await pushy.submit(layoutId, edit)).toMatchObject({ outcome: 'rejected', reason: 'forbidden' })
    one.session.commit('Move', move(60))
    await until(() => hubOf(two.state)?.stationMm === 60)
  })
})

describe('who may connect', () => {
  it('R7 nobody without a cookie, with a made-up one, or from a page elsewhere', async () => {
    expect(await refusalOf('')).toMatchObject({ data: { reason: 'signedOut' } })
    expect(await refusalOf('hubstead.session_token=made-up')).toMatchObject({ data: { reason: 'signedOut' } })
    for (const origin of ['https://evil.example', 'null', `${app.url}.evil.example`]) {
      expect(await refusalOf(dina.cookie, origin)).toMatchObject({ message: 'websocket error' })
    }
  })

  it('R4 nobody of another workspace finds the layout', async () => {
    const stranger = await app.newPerson('Rolf Fremd', 'rolf@elsewhere.example')
    const socket = await raw(stranger)
    expect(await socket.join(layoutId)).toMatchObject({ ok: false, reason: 'notFound' })
    const edit = { clientSeq: 1, editId: 'edit-rolf', operations: move(1, 'A') }
    expect(await socket.submit(layoutId, edit)).toMatchObject({ reason: 'notJoined' })
  })

  it('R3 no page of another version', async () => {
    const socket = await raw(dina)
    const request = {
      layoutId,
      clientId: 'c',
      protocolVersion: PROTOCOL_VERSION + 1,
      lastRevision: null,
      epoch: null,
    }
    expect(await socket.ask('layout:join', request)).toMatchObject({ ok: false, reason: 'protocolVersion' })
  })
})

describe('R8 within a second', () => {
  const cut = (one: RealClient) =>
    until(() => one.state.connection === 'refused', 1_000, 'Not cut within a second')

  async function newColleague(
    name: string,
    email: string,
  ): Promise<{ person: TestPerson; memberId: string }> {
    const person = await app.newPerson(name, email)
    await app.server.parts.accounts.addMember(app.workspaceId, person.userId, 'designer')
    const admin = await app.signInAs('admin')
    const people = await admin.get(`/api/workspaces/${app.workspaceId}/members`)
    const member = people.body.members.find((each: { userId: string }) => each.userId === person.userId)
    return { person, memberId: member.id as string }
  }

  it('R8 signing out cuts the open line', async () => {
    const person = await app.signInAs('designer')
    const one = await client(person)
    expect((await person.post('/api/auth/sign-out')).status).toBeLessThan(300)
    await cut(one)
    expect(one.state.refusedReason).toMatchObject({ reason: 'signedOut' })
    expect(one.session.commit('Move', move(5))).toMatchObject({ kind: 'readOnly' })
    expect(await refusalOf(person.cookie)).toMatchObject({ data: { reason: 'signedOut' } })
  })

  it('R8 removal from the workspace cuts, and another session of the same person too', async () => {
    const { person, memberId } = await newColleague('Otto Leaving', 'otto@cedar-line.example')
    const [one, two] = [await client(person), await client(person)]
    expect(one.state.access?.canEdit).toBe(true)
    const admin = await app.signInAs('admin')
    const removed = await admin.delete(`/api/workspaces/${app.workspaceId}/members/${memberId}`)
    expect(removed.status).toBe(204)
    await Promise.all([cut(one), cut(two)])
    expect(one.state.refusedReason).toMatchObject({ reason: 'notFound' })
  })

  it('R8 a change of role takes the pen away and gives it back, without a reload', async () => {
    const { person, memberId } = await newColleague('Pia Changing', 'pia@cedar-line.example')
    const one = await client(person)
    const admin = await app.signInAs('admin')
    const setRole = (role: string) =>
      admin.patch(`/api/workspaces/${app.workspaceId}/members/${memberId}`, { role })
    expect((await setRole('viewer')).status).toBeLessThan(300)
    await until(() => one.state.access?.canEdit === false, 1_000, 'Still editing after a second')
    const pushy = await raw(person)
    await pushy.join(layoutId)
    const edit = { clientSeq: 1, editId: 'edit-pia', operations: move(1) }
    expect(await pushy.submit(layoutId, edit)).toMatchObject({ reason: 'forbidden' })
    await setRole('designer')
    await until(() => one.state.access?.canEdit === true, 1_000, 'Not editing again after a second')
    one.session.commit('Move', move(61))
    await until(() => one.state.pending.length === 0)
    expect(one.state.refusedEdits).toEqual([])
  })

  it('R8 a reset password cuts every session', async () => {
    const { person } = await newColleague('Ria Reset', 'ria@cedar-line.example')
    const one = await client(person)
    await app.signedOut().post('/api/auth/request-password-reset', { email: person.email })
    const mail = await app.mailTo(person.email, /password/i)
    const token = new URL(mail.links[0] ?? '').searchParams.get('token')
    const reset = await app
      .signedOut()
      .post('/api/auth/reset-password', { token, newPassword: 'another quiet lathe' })
    expect(reset.status).toBeLessThan(300)
    await cut(one)
  })
})

describe('R9 what a hostile client sends', () => {
  const deep = `${'['.repeat(30_000)}1${']'.repeat(30_000)}`

  it('R9 gets an answer or none, and never ends the process', async () => {
    const [one, hostile] = [await client(dina), await raw(tomas)]
    const id = hubOf(one.state)!.id
    await hostile.join(layoutId)
    const set = { type: 'set', target: { kind: 'hub', id }, field: 'stationMm', value: 5 }
    const edit = {
      layoutId,
      clientId: 'client-x',
      clientSeq: 1,
      editId: 'edit-x',
      baseRevision: 0,
      label: 'x',
    }
    const payloads: [string, unknown][] = [
      ['nothing', undefined],
      ['null', null],
      ['a text', 'x'],
      ['a list', [1, 2]],
      ['unknown keys', { ...edit, operations: [set], isAdmin: true }],
      ['an unknown key inside', { ...edit, operations: [{ ...set, extra: 1 }] }],
      ['a hostile key', JSON.parse(`{"__proto__":{"x":1},"layoutId":"${layoutId}"}`)],
      ['a hostile field', { ...edit, operations: [{ ...set, field: '__proto__' }] }],
      ['NaN', { ...edit, operations: [{ ...set, value: Number.NaN }] }],
      ['Infinity as a number of its own', { ...edit, clientSeq: Infinity, operations: [set] }],
      ['a negative number', { ...edit, clientSeq: -1, operations: [set] }],
      ['a fraction', { ...edit, baseRevision: 0.5, operations: [set] }],
      ['no operations', { ...edit, operations: [] }],
      ['the server’s name', { ...edit, clientId: 'server', operations: [set] }],
      ['a number as text', { ...edit, operations: [{ ...set, value: '5' }] }],
      ['bytes', { ...edit, operations: Buffer.from('abc') }],
    ]
    for (const [what, payload] of payloads) {
      const answer = await hostile.ask('edit:submit', payload)
      expect([what, answer]).toMatchObject([what, { outcome: 'rejected', reason: 'invalid' }])
      for (const event of ['layout:join', 'layout:leave', 'presence:update'] as const) {
        hostile.socket.emit(event, ...([payload] as never))
      }
      await hostile.join(layoutId)
    }
    for (const value of [deep, `{"a":${deep}}`]) {
      const operations = `[{"type":"set","target":{"kind":"hub","id":"${id}"},"field":"fit","value":${value}}]`
      const text = `${JSON.stringify({ ...edit, editId: 'deep' }).slice(0, -1)},"operations":${operations}}`
      hostile.writeText(`277["edit:submit",${text}]`)
      hostile.writeText(`2["presence:update",${text}]`)
    }
    expect(({} as { x?: number }).x).toBeUndefined()
    one.session.commit('Move', move(62))
    await until(() => one.state.pending.length === 0)
    expect(hubOf(one.state)?.stationMm).toBe(62)
  })

  it('E10 a hundred thousand operations are too many, and answered fast', async () => {
    const hostile = await raw(tomas)
    await hostile.join(layoutId)
    const many = Array.from({ length: 40_000 }, () => 0)
    const begun = performance.now()
    const edit = { clientSeq: 1, editId: 'edit-many', operations: many }
    expect(await hostile.submit(layoutId, edit)).toMatchObject({ outcome: 'rejected', reason: 'tooLarge' })
    expect(performance.now() - begun).toBeLessThan(1_000)
    const oneTooMany = Array.from({ length: MAX_OPERATIONS_PER_EDIT + 1 }, () => ({}))
    expect(await hostile.submit(layoutId, { ...edit, operations: oneTooMany })).toMatchObject({
      reason: 'tooLarge',
    })
  })

  it('R9 a message beyond the limit ends its own line only', async () => {
    const [one, hostile] = [await client(dina), await raw(tomas)]
    const closed = new Promise((resolve) => hostile.socket.once('disconnect', resolve))
    void hostile.ask('edit:submit', { operations: 'x'.repeat(1_000_000) })
    expect(await closed).toBeTruthy()
    one.session.commit('Move', move(63))
    await until(() => one.state.pending.length === 0)
  })

  it('R10 too many edits at once are put off and arrive all the same', async () => {
    const one = await client(dina)
    const before = one.state.revision
    for (let at = 0; at < 600; at += 1) one.session.commit('Move', move(at % 2 === 0 ? 64 : 65))
    await until(() => one.state.pending.length === 0, 20_000)
    expect(one.state.revision).toBe(before + 600)
    expect(one.state.refusedEdits).toEqual([])

    const flooding = await raw(tomas)
    await flooding.join(layoutId)
    const answers = await Promise.all(
      Array.from({ length: 500 }, (_, at) =>
        flooding.submit(layoutId, { clientSeq: at + 1, editId: `flood-${at}`, operations: move(at) }),
      ),
    )
    expect(answers.some((answer) => answer.outcome === 'rejected' && answer.reason === 'rateLimited')).toBe(
      true,
    )
  })
})

describe('lists', () => {
  it('E12 hear of renames, people and edits', async () => {
    const watching = await raw(tomas)
    const heard: string[] = []
    watching.socket.on('workspace:changed', ({ what }) => heard.push(what))
    const one = await client(dina)
    await until(() => heard.includes('layouts'), 3_000)
    const list = await tomas.get(`/api/workspaces/${app.workspaceId}/layouts`)
    const listed = list.body.layouts.find((each: { id: string }) => each.id === layoutId)
    expect(listed.peopleInIt.map(({ name }: { name: string }) => name)).toEqual(['Dina Reyes'])
    const renamed = await tomas.patch(`/api/layouts/${layoutId}`, { name: 'Renamed by a route' })
    expect(renamed.status).toBe(200)
    await until(() => one.state.visible?.name === 'Renamed by a route')
    expect(one.session.undo()).toEqual({ kind: 'nothing' })
  })
})
