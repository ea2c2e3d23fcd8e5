import { expect } from '@playwright/test'
import type {
  ClientToServerEvents,
  JoinReply,
  ServerToClientEvents,
  SubmitOutcome,
} from '@shared/protocol/realtime'
import { PROTOCOL_VERSION } from '@shared/protocol/realtime'
import { io, type Socket } from 'socket.io-client'
import { createLayout, openLayout, scheduleField } from '../support/bench-page'
import { test } from '../support/journey'

const NAME = 'Reducer for the viewer journey'
const HUB = 'wheel, first stage'

test('a viewer reads everything and changes nothing: not by page, route or socket', async ({
  openAs,
  problems,
}) => {
  const dina = await openAs('dina')
  await dina.goto('/')
  const { id: layoutId } = await createLayout(dina, 'reducer-intermediate-shaft', NAME)
  const vera = await openAs('vera')

  await test.step('by page', async () => {
    await openLayout(vera, NAME)
    await expect(scheduleField(vera, 'Length', HUB)).not.toBeEditable()
    await expect(vera.getByRole('button', { name: 'Freeze layout' })).toBeHidden()
    await expect(vera.getByRole('button', { name: 'Ask for review' })).toBeHidden()
    await expect(vera.getByRole('radio', { name: 'Hub' })).toBeHidden()
  })

  await test.step('by route', async () => {
    const headers = { origin: new URL(vera.url()).origin }
    const send = (method: string, address: string, data?: object) =>
      vera.request.fetch(address, { method, headers, data })
    expect((await send('GET', `/api/layouts/${layoutId}`)).status()).toBe(200)
    const refused = [
      await send('PATCH', `/api/layouts/${layoutId}`, { name: 'Taken over' }),
      await send('POST', `/api/layouts/${layoutId}/review`, {}),
      await send('POST', `/api/layouts/${layoutId}/freeze`, { revision: 0, acceptances: [] }),
    ]
    expect(refused.map((answer) => answer.status())).toEqual([403, 403, 403])
  })

  await test.step('by socket', async () => {
    const { origin } = new URL(vera.url())
    const cookies = await vera.context().cookies()
    const socket: Socket<ServerToClientEvents, ClientToServerEvents> = io(origin, {
      transports: ['websocket'],
      extraHeaders: { origin, cookie: cookies.map(({ name, value }) => `${name}=${value}`).join('; ') },
    })
    try {
      const clientId = `viewer-${Date.now()}`
      const joined: JoinReply = await socket.emitWithAck('layout:join', {
        layoutId,
        clientId,
        protocolVersion: PROTOCOL_VERSION,
        lastRevision: null,
        epoch: null,
      })
      expect(joined.ok && joined.access.canEdit).toBe(false)
      expect(joined.ok).toBe(true)
      const outcome: SubmitOutcome = await socket.emitWithAck('edit:submit', {
        layoutId,
        clientId,
        clientSeq: 1,
        editId: `edit-${Date.now()}`,
        baseRevision: joined.ok ? joined.revision : 0,
        label: 'Rename the layout',
        operations: [
          { type: 'set', target: { kind: 'layout' }, field: 'name', before: NAME, value: 'Taken over' },
        ],
      })
      expect(outcome).toMatchObject({ outcome: 'rejected', reason: 'forbidden' })
    } finally {
      socket.disconnect()
    }
  })

  await dina.reload()
  await openLayout(dina, NAME)
  expect(problems).toEqual([])
})
