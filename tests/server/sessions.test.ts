/** How long a session lives, who can end it, and that its end is announced. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ABSOLUTE_LIFETIME_MS } from '@server/accounts/auth'
import type { Revocation } from '@server/accounts/revocation'
import { sessionListSchema } from '@shared/protocol/accounts'
import { startTestApp, type TestApp, type TestPerson } from '../support/test-app'

let app: TestApp
const revocations: Revocation[] = []
beforeAll(async () => {
  app = await startTestApp()
  app.server.parts.accounts.onRevoked((revocation) => revocations.push(revocation))
})
afterAll(() => app.close())

async function sessionsOf(person: TestPerson) {
  return sessionListSchema.parse((await person.get('/api/me/sessions')).body).sessions
}
async function currentId(person: TestPerson): Promise<string> {
  return (await sessionsOf(person)).find((session) => session.isCurrent)?.id ?? ''
}
function setSession(id: string, change: { created_at?: string; expires_at?: string; updated_at?: string }) {
  const { database } = app.server.parts
  database.run(database.kysely.updateTable('session').set(change).where('id', '=', id))
}
const inMs = (ms: number) => new Date(Date.now() + ms).toISOString()
const alive = async (person: TestPerson) => (await person.get('/api/me')).status === 200
const DAY_MS = 24 * 3600 * 1000

describe('one’s own sessions', () => {
  it('are listed with place and device, and end one by one', async () => {
    const [first, second] = [await app.signInAs('shop'), await app.signInAs('shop')]
    const sessions = await sessionsOf(first)
    expect(sessions).toHaveLength(2)
    expect(sessions[0]?.ipAddress).toBe('127.0.0.1')
    const other = await currentId(second)
    expect((await first.delete(`/api/me/sessions/${other}`)).status).toBe(204)
    expect([await alive(first), await alive(second)]).toEqual([true, false])
    expect(revocations).toContainEqual({ kind: 'session', userId: first.userId, sessionId: other })
  })

  it('are nobody else’s to end', async () => {
    const [victim, other] = [await app.signInAs('viewer'), await app.signInAs('admin')]
    expect((await other.delete(`/api/me/sessions/${await currentId(victim)}`)).status).toBe(404)
    expect(await alive(victim)).toBe(true)
  })

  it('end all but the present one at once', async () => {
    const [here, there] = [await app.signInAs('manager'), await app.signInAs('manager')]
    expect((await here.delete('/api/me/sessions')).status).toBe(204)
    expect([await alive(here), await alive(there)]).toEqual([true, false])
  })

  it('end by signing out, and the cookie goes', async () => {
    const person = await app.signInAs('tomas')
    const sessionId = await currentId(person)
    const answer = await person.post('/api/auth/sign-out')
    expect(answer.headers.getSetCookie().join()).toMatch(/hubstead_session=; Max-Age=0/)
    expect(await alive(person)).toBe(false)
    expect(revocations).toContainEqual({ kind: 'session', userId: person.userId, sessionId })
  })

  it('end with a change of password, except the one that changed it', async () => {
    const person = await app.newPerson('Chan Ging', 'chan@cedar-line.example')
    const other = await app.signIn(person.email, 'quiet lathe, loud press')
    const change = { currentPassword: 'quiet lathe, loud press', newPassword: 'another quiet lathe' }
    const wrong = await person.post('/api/auth/change-password', { ...change, currentPassword: 'a guess' })
    expect(wrong.body.error.fields).toEqual({ currentPassword: 'This is not your present password.' })
    const answer = await person.post('/api/auth/change-password', change)
    expect(answer.status).toBe(204)
    const cookie = answer.headers.getSetCookie()[0]?.split(';')[0] ?? ''
    expect((await app.signedOut().request('/api/me', { headers: { cookie } })).status).toBe(200)
    expect([await alive(person), await alive(other)]).toEqual([false, false])
  })
})

describe('the lifetime', () => {
  it('ends after a week without use', async () => {
    const person = await app.signInAs('viewer')
    setSession(await currentId(person), { expires_at: inMs(-1_000) })
    expect(await alive(person)).toBe(false)
  })

  it('is prolonged by use, and the cookie with it', async () => {
    const person = await app.signInAs('viewer')
    const id = await currentId(person)
    setSession(id, { expires_at: inMs(6 * DAY_MS), updated_at: inMs(-DAY_MS) })
    const answer = await person.get('/api/me')
    expect(answer.headers.getSetCookie()[0]).toMatch(/^hubstead_session=[^;]{40,}; Max-Age=604800/)
    const prolonged = (await sessionsOf(person)).find((session) => session.id === id)
    expect(Date.now() - new Date(prolonged?.lastSeenAt ?? 0).getTime()).toBeLessThan(60_000)
  })

  it('ends after thirty days however busy it was', async () => {
    const person = await app.signInAs('viewer')
    const id = await currentId(person)
    setSession(id, { created_at: inMs(-ABSOLUTE_LIFETIME_MS + 60_000) })
    expect(await alive(person)).toBe(true)
    setSession(id, { created_at: inMs(-ABSOLUTE_LIFETIME_MS - 1_000) })
    expect(await alive(person)).toBe(false)
    expect(revocations).toContainEqual({ kind: 'session', userId: person.userId, sessionId: id })
  })

  it('is checked again for what stays open', async () => {
    const person = await app.signInAs('designer')
    const { accounts } = app.server.parts
    const principal = await accounts.getPrincipal({ cookie: person.cookie })
    if (!principal) throw new Error('Not signed in')
    expect(accounts.recheck(principal)?.roles.get(app.workspaceId)).toBe('designer')
    setSession(principal.sessionId, { expires_at: inMs(-1_000) })
    expect(accounts.recheck(principal)).toBeNull()
  })
})
