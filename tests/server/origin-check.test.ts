/** No page of another site, and no page of an unknown one, may change anything with a person's cookie. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { isSameSite, siteFor } from '@server/http/origin-check'
import { routesOf } from '../support/routes-of'
import { startTestApp, type TestApp, type TestPerson } from '../support/test-app'

let app: TestApp
let admin: TestPerson
beforeAll(async () => {
  app = await startTestApp()
  admin = await app.signInAs('admin')
})
afterAll(() => app.close())

const hostile = (url: string): Record<string, Record<string, string>> => ({
  'another site': { origin: 'https://evil.example' },
  'an opaque page': { origin: 'null' },
  'another port of this host': { origin: 'http://localhost:1' },
  'our name as a prefix': { origin: `${url}.evil.example` },
  'https for http': { origin: url.replace('http:', 'https:') },
  'our origin, fetched across sites': { origin: url, 'sec-fetch-site': 'cross-site' },
  'our origin, from a sibling host': { origin: url, 'sec-fetch-site': 'same-site' },
})

describe('requests that change something', () => {
  it('are refused on every such route unless they come from our own pages', async () => {
    const unsafe = routesOf(app.server.app).filter((route) => !route.startsWith('GET '))
    expect(unsafe.length).toBeGreaterThan(20)
    for (const route of unsafe) {
      const [method = '', template = ''] = route.split(' ')
      const target = template.replace(/:\w+/g, 'some-id')
      for (const [who, headers] of Object.entries(hostile(app.url))) {
        const answer = await admin.request(target, { method, headers, body: {} })
        expect(answer.status, `${route} from ${who}`).toBe(403)
        expect(answer.body.error.code).toBe('forbidden')
      }
    }
  })

  it('are refused without an Origin header', async () => {
    const response = await fetch(`http://127.0.0.1:${app.server.port}/api/me`, {
      method: 'PATCH',
      headers: { cookie: admin.cookie, 'content-type': 'application/json' },
      body: JSON.stringify({ name: 'Somebody Else' }),
    })
    expect(response.status).toBe(403)
    expect((await admin.get('/api/me')).body.user.name).toBe('Ada Winter')
  })

  it('pass from each loopback name of this port', async () => {
    for (const name of ['localhost', '127.0.0.1', '[::1]']) {
      const headers = { origin: `http://${name}:${app.server.port}`, 'sec-fetch-site': 'same-origin' }
      const answer = await admin.request('/api/me', {
        method: 'PATCH',
        headers,
        body: { name: 'Ada Winter' },
      })
      expect(answer.status, name).toBe(200)
    }
  })
})

describe('the site', () => {
  it('is one origin when a public address is set', () => {
    const site = siteFor('https://fits.example', 4310)
    expect(isSameSite({ origin: 'https://fits.example' }, site)).toBe(true)
    expect(isSameSite({ origin: 'http://localhost:4310' }, site)).toBe(false)
    expect(site.isSecure).toBe(true)
  })
})
