/** Freezing while people have the layout open: real sockets against the real server. */
import { io, type Socket } from 'socket.io-client'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import { newClientId, newEditId } from '@shared/layout/new-ids'
import {
  type ClientToServerEvents,
  type JoinReply,
  PROTOCOL_VERSION,
  type ServerToClientEvents,
  type SubmitOutcome,
} from '@shared/protocol/realtime'
import { startTestApp, type TestApp, type TestPerson } from '../support/test-app'

let app: TestApp
let designer: TestPerson
let colleague: TestPerson
let manager: TestPerson
const sockets: Socket[] = []

beforeAll(async () => {
  app = await startTestApp()
  designer = await app.signInAs('designer')
  colleague = await app.signInAs('tomas')
  manager = await app.signInAs('manager')
})
afterEach(() => {
  for (const socket of sockets.splice(0)) socket.disconnect()
})
afterAll(async () => {
  await app.close()
})

interface OpenLayout {
  revision: () => number
  /** Every access:changed so far. */
  access: { canEdit: boolean; status: string; revisionLetter: string; byName: string | null }[]
  /** Kinds of the log entries that arrived. */
  kinds: string[]
  rename: (name: string) => Promise<SubmitOutcome>
}

async function open(person: TestPerson, layoutId: string): Promise<OpenLayout> {
  const socket: Socket<ServerToClientEvents, ClientToServerEvents> = io(app.url, {
    transports: ['websocket'],
    extraHeaders: { origin: app.url, cookie: person.cookie },
    forceNew: true,
  })
  sockets.push(socket)
  const clientId = newClientId()
  let revision = 0
  let clientSeq = 0
  const opened: OpenLayout = {
    revision: () => revision,
    access: [],
    kinds: [],
    rename: (name) => {
      clientSeq += 1
      return socket.timeout(5_000).emitWithAck('edit:submit', {
        layoutId,
        clientId,
        clientSeq,
        editId: newEditId(),
        baseRevision: revision,
        label: 'Rename',
        operations: [{ type: 'set', target: { kind: 'layout' }, field: 'name', before: '', value: name }],
      })
    },
  }
  socket.on('access:changed', ({ access, byName }) => opened.access.push({ ...access, byName }))
  socket.on('edit:accepted', ({ edit }) => {
    revision = edit.revision
    opened.kinds.push(edit.kind)
  })
  await new Promise<void>((resolve, reject) => {
    socket.on('connect', resolve)
    socket.on('connect_error', reject)
  })
  const joined: JoinReply = await socket.timeout(5_000).emitWithAck('layout:join', {
    layoutId,
    clientId,
    protocolVersion: PROTOCOL_VERSION,
    lastRevision: null,
    epoch: null,
  })
  if (!joined.ok) throw new Error(joined.message)
  revision = joined.revision
  return opened
}

async function newLayout(): Promise<string> {
  const created = await designer.post(`/api/workspaces/${app.workspaceId}/layouts`, {
    from: { kind: 'example', exampleId: 'gear-and-pulley' },
  })
  return created.body.id as string
}

const freeze = (layoutId: string, revision: number) =>
  manager.post(`/api/layouts/${layoutId}/freeze`, { revision, acceptances: [] })

describe('freezing an open layout', () => {
  it('makes it read-only at once for everyone who has it open', async () => {
    const layoutId = await newLayout()
    const first = await open(designer, layoutId)
    const second = await open(colleague, layoutId)
    const released = await freeze(layoutId, first.revision())
    expect(released.status).toBe(201)
    for (const opened of [first, second]) {
      await expect
        .poll(() => opened.access.at(-1))
        .toMatchObject({
          canEdit: false,
          status: 'released',
          revisionLetter: 'A',
          byName: 'Mira Kast',
        })
      expect(opened.kinds).toEqual(['freeze'])
    }
  })

  it('refuses a later edit with the reason, and stores nothing of it', async () => {
    const layoutId = await newLayout()
    const opened = await open(designer, layoutId)
    const released = await freeze(layoutId, opened.revision())
    const late = await opened.rename('Too late')
    expect(late).toMatchObject({ outcome: 'rejected', reason: 'frozen' })
    expect('message' in late && late.message).toContain('Revision A')
    const view = await manager.get(`/api/layouts/${layoutId}`)
    expect(view.body.name).not.toBe('Too late')
    expect((await manager.get(`/api/releases/${released.body.id}`)).body.document).toEqual(view.body.document)
  })

  it('holds every edit accepted before it', async () => {
    const layoutId = await newLayout()
    const opened = await open(designer, layoutId)
    const accepted = await opened.rename('Named just in time')
    if (accepted.outcome !== 'accepted') throw new Error(accepted.outcome)
    const released = await freeze(layoutId, accepted.edit.revision)
    expect(released.body).toMatchObject({
      layoutName: 'Named just in time',
      revision: accepted.edit.revision,
    })
  })

  it('and an edit at the same moment are settled one way or the other, never both', async () => {
    for (let round = 0; round < 6; round += 1) {
      const layoutId = await newLayout()
      const opened = await open(designer, layoutId)
      const revision = opened.revision()
      const [released, edited] =
        round % 2 === 0
          ? await Promise.all([freeze(layoutId, revision), opened.rename('At the same moment')])
          : ((
              await Promise.all([opened.rename('At the same moment'), freeze(layoutId, revision)])
            ).reverse() as [Awaited<ReturnType<typeof freeze>>, SubmitOutcome])
      if (released.status === 201) {
        expect(edited).toMatchObject({ outcome: 'rejected', reason: 'frozen' })
        expect(released.body.layoutName).not.toBe('At the same moment')
      } else {
        expect(released.status).toBe(409)
        expect(edited).toMatchObject({ outcome: 'accepted' })
      }
    }
  })

  it('lets people edit again from the next revision on', async () => {
    const layoutId = await newLayout()
    const opened = await open(designer, layoutId)
    await freeze(layoutId, opened.revision())
    await manager.post(`/api/layouts/${layoutId}/next-revision`)
    await expect
      .poll(() => opened.access.at(-1))
      .toMatchObject({
        canEdit: true,
        status: 'draft',
        revisionLetter: 'B',
      })
    expect(opened.kinds).toEqual(['freeze', 'nextRevision'])
    expect(await opened.rename('Of revision B')).toMatchObject({ outcome: 'accepted' })
  })
})

describe('review and withdrawal', () => {
  it('reach everyone who has the layout open', async () => {
    const layoutId = await newLayout()
    const opened = await open(colleague, layoutId)
    await designer.post(`/api/layouts/${layoutId}/review`, {})
    await expect
      .poll(() => opened.access.at(-1))
      .toMatchObject({
        canEdit: true,
        status: 'inReview',
        byName: 'Dina Reyes',
      })
    const released = await freeze(layoutId, opened.revision())
    await manager.post(`/api/releases/${released.body.id}/withdraw`, { reason: 'Drawn for the wrong motor.' })
    await expect.poll(() => opened.access.at(-1)).toMatchObject({ canEdit: false, status: 'withdrawn' })
    expect(opened.kinds).toEqual(['review', 'freeze', 'withdraw'])
  })
})
