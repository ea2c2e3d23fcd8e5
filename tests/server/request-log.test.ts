/** The log tells who did what and keeps every secret to itself. */
import { Writable } from 'node:stream'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DEMO_PASSWORD } from '@server/demo/seed-demo'
import { startTestApp, type TestApp } from '../support/test-app'

let app: TestApp
let lines: string[] = []
beforeAll(async () => {
  const logTo = new Writable({
    write(chunk: Buffer, _encoding, done) {
      lines.push(chunk.toString())
      done()
    },
  })
  app = await startTestApp({ logTo, environment: { LOG_LEVEL: 'debug' } })
})
afterAll(() => app.close())

const entries = () => lines.map((line) => JSON.parse(line) as Record<string, unknown>)

describe('the log', () => {
  it('holds no password, cookie or token, whatever happens', async () => {
    lines = []
    const person = await app.newPerson('Lotte Log', 'lotte@cedar-line.example', 'a phrase for the log')
    await app.signedOut().post('/api/auth/sign-in/email', { email: person.email, password: 'a wrong phrase' })
    await app.signedOut().post('/api/auth/request-password-reset', { email: person.email })
    const mail = await app.mailTo(person.email, /new Hubstead password/)
    const token = new URL(mail.links[0] ?? '').searchParams.get('token') ?? 'none'
    await app.signedOut().get(`/reset-password?token=${token}`)
    await app.signedOut().post('/api/auth/reset-password', { token, newPassword: 'the next phrase' })
    const log = lines.join('')
    const cookie = decodeURIComponent(person.cookie.split('=')[1] ?? 'none')
    for (const secret of [
      'a phrase for the log',
      'a wrong phrase',
      'the next phrase',
      token,
      cookie,
      cookie.split('.')[0] ?? '',
    ])
      expect(log).not.toContain(secret)
    expect(log).toContain('"path":"/reset-password"')
  })

  it('tells of sign-ins, failed ones, refusals and changes of role', async () => {
    lines = []
    const viewer = await app.signInAs('viewer')
    await app.signedOut().post('/api/auth/sign-in/email', { email: viewer.email, password: 'wrong' })
    await viewer.post(`/api/workspaces/${app.workspaceId}/layouts`, { from: { kind: 'blank' } })
    const admin = await app.signIn('ada@cedar-line.example', DEMO_PASSWORD)
    const { members } = (await admin.get(`/api/workspaces/${app.workspaceId}/members`)).body
    const sam = members.find((member: { name: string }) => member.name === 'Sam Okoro')
    await admin.patch(`/api/workspaces/${app.workspaceId}/members/${sam.id}`, { role: 'designer' })
    const messages = entries().map((entry) => entry.msg)
    expect(messages).toEqual(
      expect.arrayContaining(['signed in', 'sign-in failed', 'refused', 'role changed']),
    )
    expect(entries()).toContainEqual(
      expect.objectContaining({
        msg: 'role changed',
        userId: admin.userId,
        memberId: sam.id,
        role: 'designer',
      }),
    )
  })

  it('carries what an unexpected error was, which the person is not told', async () => {
    lines = []
    const { layouts } = app.server
    const view = layouts.view
    layouts.view = () => {
      throw new Error('the disk is on fire')
    }
    const answer = await (await app.signInAs('designer')).get(`/api/layouts/${app.layoutIds[0]}`)
    layouts.view = view
    expect([answer.status, answer.text.includes('fire')]).toEqual([500, false])
    expect(lines.join('')).toContain('the disk is on fire')
  })
})
