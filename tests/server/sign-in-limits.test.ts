/** Guessing is slowed by address and by account; nobody else is kept out by it. */
import { afterEach, describe, expect, it } from 'vitest'
import { DEMO_PASSWORD } from '@server/demo/seed-demo'
import { startTestApp, type TestApp } from '../support/test-app'

let app: TestApp
afterEach(() => app.close())

async function guess(email: string, headers: Record<string, string> = {}, password = 'a wrong password') {
  return app
    .signedOut()
    .request('/api/auth/sign-in/email', { method: 'POST', body: { email, password }, headers })
}

describe('wrong passwords', () => {
  it('make the sixth try wait, the right password included, and leave other accounts alone', async () => {
    app = await startTestApp()
    for (let tries = 0; tries < 5; tries += 1)
      expect((await guess('vera@cedar-line.example')).status).toBe(401)
    const sixth = await guess('vera@cedar-line.example')
    expect(sixth.status).toBe(429)
    expect(sixth.body.error.code).toBe('too-many-requests')
    expect(Number(sixth.headers.get('retry-after'))).toBeGreaterThan(0)
    expect((await guess('Vera@Cedar-Line.example', {}, DEMO_PASSWORD)).status).toBe(429)
    expect((await guess('sam@cedar-line.example', {}, DEMO_PASSWORD)).status).toBe(204)
  })

  it('cannot be spread over invented forwarding headers', async () => {
    app = await startTestApp()
    const statuses: number[] = []
    for (let tries = 0; tries < 12; tries += 1) {
      const spoofed = {
        'x-forwarded-for': `203.0.113.${tries}`,
        'x-real-client': `203.0.113.${tries}`,
        forwarded: `for=203.0.113.${tries}`,
      }
      statuses.push((await guess('vera@cedar-line.example', spoofed)).status)
    }
    expect(statuses).toEqual([...Array(5).fill(401), ...Array(7).fill(429)])
  })

  it('count by the address that the last known proxy saw', async () => {
    app = await startTestApp({ environment: { TRUST_PROXY_HOPS: '1' } })
    // A client may write what it likes in front; the proxy appends what it saw.
    const via = (seen: string, claimed: string) => ({ 'x-forwarded-for': `${claimed}, ${seen}` })
    for (let tries = 0; tries < 5; tries += 1) {
      await guess('vera@cedar-line.example', via('198.51.100.7', `203.0.113.${tries}`))
    }
    const statusFrom = async (seen: string) =>
      (await guess('vera@cedar-line.example', via(seen, '203.0.113.99'), DEMO_PASSWORD)).status
    expect(await statusFrom('198.51.100.7')).toBe(429)
    expect(await statusFrom('198.51.100.8')).toBe(204)
  })

  it('count by address for many accounts together', async () => {
    app = await startTestApp()
    for (let tries = 0; tries < 50; tries += 1) await guess(`guess-${tries}@cedar-line.example`)
    expect((await guess('guess-51@cedar-line.example')).status).toBe(429)
  }, 60_000)
})

describe('mails', () => {
  it('stop after five to one mailbox, whoever asks', async () => {
    app = await startTestApp()
    const ask = () =>
      app.signedOut().post('/api/auth/request-password-reset', { email: 'dina@cedar-line.example' })
    for (let asked = 0; asked < 5; asked += 1) expect((await ask()).status).toBe(204)
    expect((await ask()).status).toBe(429)
    const other = { email: 'sam@cedar-line.example' }
    expect((await app.signedOut().post('/api/auth/request-password-reset', other)).status).toBe(204)
  })
})
