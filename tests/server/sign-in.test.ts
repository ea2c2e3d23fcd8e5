/** Accounts from the outside: over HTTP, with mails that really travel by SMTP. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DEMO_PASSWORD } from '@server/demo/seed-demo'
import type { CaughtMail } from '@shared/protocol/accounts'
import { NEW_PERSON_PASSWORD, startTestApp, type TestApp } from '../support/test-app'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const tokenIn = (mail: CaughtMail) => new URL(mail.links[0] ?? '').searchParams.get('token') ?? ''
const mailsTo = (email: string) => app.server.parts.catcher?.list().filter((mail) => mail.to === email) ?? []

describe('opening an account', () => {
  it('goes through a mail that arrives over SMTP', async () => {
    const person = await app.newPerson('Nils Brandt', 'nils@cedar-line.example')
    const me = await person.get('/api/me')
    expect(me.body).toEqual({
      user: { id: person.userId, name: 'Nils Brandt', email: 'nils@cedar-line.example', emailVerified: true },
      workspaces: [],
    })
  })

  it('allows no sign-in before the address is confirmed', async () => {
    const nobody = app.signedOut()
    const account = { email: 'early@cedar-line.example', password: NEW_PERSON_PASSWORD }
    await nobody.post('/api/auth/sign-up/email', { name: 'Early Bird', ...account })
    const refused = await nobody.post('/api/auth/sign-in/email', account)
    expect(refused.status).toBe(403)
    expect(refused.headers.getSetCookie()).toEqual([])

    const first = tokenIn(await app.mailTo(account.email))
    const resent = await nobody.post('/api/auth/send-verification-email', {
      email: account.email,
      next: '/invitation/abc',
    })
    expect(resent.status).toBe(204)
    await app.server.parts.mailer.idle()
    const [mail] = mailsTo(account.email)
    expect(new URL(mail?.links[0] ?? '').searchParams.get('next')).toBe('/invitation/abc')
    expect((await nobody.post('/api/auth/verify-email', { token: `${first}x` })).status).toBe(400)
    expect((await nobody.post('/api/auth/verify-email', { token: first })).status).toBe(204)
    expect((await nobody.post('/api/auth/sign-in/email', account)).status).toBe(204)
  })

  it('answers alike for a known address and mails its owner instead', async () => {
    const taken = { name: 'Some One', email: 'dina@cedar-line.example', password: NEW_PERSON_PASSWORD }
    const answer = await app.signedOut().post('/api/auth/sign-up/email', taken)
    expect([answer.status, answer.body]).toEqual([204, null])
    expect((await app.mailTo(taken.email, /already have/)).text).toContain('sign in')
    expect((await app.signIn(taken.email, DEMO_PASSWORD)).userId).not.toBe('')
  })

  it.each(['//evil.example', 'https://evil.example', '/\\evil.example', 'javascript:alert(1)'])(
    'never mails a link that leads on to %s',
    async (next) => {
      const body = { name: 'Eve', email: 'eve@elsewhere.example', password: NEW_PERSON_PASSWORD, next }
      expect((await app.signedOut().post('/api/auth/sign-up/email', body)).status).toBe(400)
    },
  )
})

describe('passwords', () => {
  it.each([
    ['short', 'elevenchars', /At least 12/],
    ['long', 'ab cd'.repeat(26), /At most 128/],
    ['common', 'passwordpassword', /common/],
    ['common in disguise', 'P@ssw0rd2026!', /common/],
    ['a pattern', 'abababababab', /pattern/],
    ['a staircase', 'abcdefghijklm', /pattern/],
    ['the product', 'my hubstead fits', /name/],
    ['the person', 'ottilie-2026-go', /name/],
  ])('are refused when %s', async (_why, password, message) => {
    const body = { name: 'Ottilie Brand', email: 'otti@cedar-line.example', password }
    const answer = await app.signedOut().post('/api/auth/sign-up/email', body)
    expect(answer.status).toBe(400)
    expect(answer.body.error.fields.password).toMatch(message)
  })

  it.each([
    'between-two-centres',
    'пять больших шестерён',
    '            a b c d',
    'correct horse battery staple',
  ])('may hold any characters: %s', async (password) => {
    const email = `any-${Buffer.from(password).toString('hex').slice(0, 8)}@elsewhere.example`
    const answer = await app
      .signedOut()
      .post('/api/auth/sign-up/email', { name: 'Any Body', email, password })
    expect(answer.status, answer.text).toBe(204)
  })

  it('are stored with argon2id of at least 19 MiB and two passes', () => {
    const { database } = app.server.parts
    const rows = database.all(database.kysely.selectFrom('account').select('password'))
    expect(rows.length).toBeGreaterThan(5)
    for (const { password } of rows) expect(password).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
  })
})

describe('signing in', () => {
  it('answers alike for an unknown address and a wrong password', async () => {
    const nobody = app.signedOut()
    const wrong = { email: 'vera@cedar-line.example', password: 'not the password' }
    const unknown = { email: 'nobody@cedar-line.example', password: 'not the password' }
    const [first, second] = [
      await nobody.post('/api/auth/sign-in/email', wrong),
      await nobody.post('/api/auth/sign-in/email', unknown),
    ]
    expect([first.status, first.text]).toEqual([401, second.text])
    expect(second.status).toBe(401)
  })

  it('gives a new cookie each time, kept from scripts and other sites', async () => {
    const credentials = { email: 'mira@cedar-line.example', password: DEMO_PASSWORD }
    const nobody = app.signedOut()
    const [first, second] = [
      await nobody.post('/api/auth/sign-in/email', credentials),
      await nobody.post('/api/auth/sign-in/email', credentials),
    ]
    const [cookie] = first.headers.getSetCookie()
    expect(cookie).toMatch(/^hubstead_session=[^;]{40,}; Max-Age=604800; Path=\/; HttpOnly; SameSite=Lax$/)
    expect(second.headers.getSetCookie()[0]).not.toBe(cookie)
  })

  it('puts the session token in no body', async () => {
    const person = await app.signInAs('manager')
    const token = decodeURIComponent(person.cookie.split('=')[1] ?? '').split('.')[0] ?? ''
    expect(token.length).toBeGreaterThanOrEqual(32)
    for (const path of ['/api/me', '/api/me/sessions', `/api/workspaces/${app.workspaceId}/members`]) {
      expect((await person.get(path)).text).not.toContain(token)
    }
    const change = { currentPassword: DEMO_PASSWORD, newPassword: 'between-three-centres' }
    const changed = await person.post('/api/auth/change-password', change)
    expect([changed.status, changed.text]).toEqual([204, ''])
    const again = await app.signIn(person.email, change.newPassword)
    const back = { currentPassword: change.newPassword, newPassword: DEMO_PASSWORD }
    expect((await again.post('/api/auth/change-password', back)).status).toBe(204)
  })

  it('does not know a cookie that was tampered with', async () => {
    const person = await app.signInAs('viewer')
    const broken = person.cookie.slice(0, -6) + 'AAAAAA'
    expect((await app.signedOut().request('/api/me', { headers: { cookie: broken } })).status).toBe(401)
  })
})

describe('a forgotten password', () => {
  it('is replaced once by the link of the mail, and every session ends', async () => {
    const person = await app.newPerson('Forgetful Fin', 'fin@cedar-line.example')
    const nobody = app.signedOut()
    await nobody.post('/api/auth/request-password-reset', { email: person.email })
    const token = tokenIn(await app.mailTo(person.email, /new Hubstead password/))

    const named = await nobody.post('/api/auth/reset-password', { token, newPassword: 'forgetful as ever' })
    expect(named.body.error.fields.newPassword).toMatch(/name/)
    const body = { token, newPassword: 'a wholly other phrase' }
    expect((await nobody.post('/api/auth/reset-password', body)).status).toBe(204)
    expect((await nobody.post('/api/auth/reset-password', body)).status).toBe(400)
    expect((await person.get('/api/me')).status).toBe(401)
    await expect(app.signIn(person.email, NEW_PERSON_PASSWORD)).rejects.toThrow('401')
    expect((await app.signIn(person.email, body.newPassword)).userId).toBe(person.userId)
    expect(await app.mailTo(person.email, /was changed/)).toBeDefined()
  })

  it('is not told to whoever asks for an unknown address', async () => {
    const email = 'nobody-at-all@cedar-line.example'
    expect((await app.signedOut().post('/api/auth/request-password-reset', { email })).status).toBe(204)
    await app.server.parts.mailer.idle()
    expect(mailsTo(email)).toEqual([])
  })

  it('leaves no usable token in the database', async () => {
    await app.signedOut().post('/api/auth/request-password-reset', { email: 'sam@cedar-line.example' })
    const token = tokenIn(await app.mailTo('sam@cedar-line.example', /new Hubstead password/))
    const { database } = app.server.parts
    const rows = database.all(database.kysely.selectFrom('verification').selectAll())
    expect(JSON.stringify(rows)).not.toContain(token)
  })
})
