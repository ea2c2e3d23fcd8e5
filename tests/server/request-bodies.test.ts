/** What is refused before any handler sees it, always in the one error shape. */
import { brotliCompressSync, gzipSync } from 'node:zlib'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { errorBodySchema } from '@shared/protocol/errors'
import { startTestApp, type TestApp, type TestPerson } from '../support/test-app'

let app: TestApp
let designer: TestPerson
beforeAll(async () => {
  app = await startTestApp()
  designer = await app.signInAs('designer')
})
afterAll(() => app.close())

async function send(body: BodyInit, headers: Record<string, string>, path = '/api/calculate') {
  const response = await fetch(`http://127.0.0.1:${app.server.port}${path}`, {
    method: 'POST',
    headers: { origin: app.url, cookie: designer.cookie, 'content-type': 'application/json', ...headers },
    body,
  })
  const text = await response.text()
  return { status: response.status, error: errorBodySchema.parse(JSON.parse(text)).error, text }
}

describe('a body', () => {
  it.each([
    ['br', brotliCompressSync('{}')],
    ['gzip', gzipSync('{}')],
  ])('that is compressed (%s) is never decoded', async (encoding, body) => {
    const answer = await send(new Uint8Array(body), { 'content-encoding': encoding })
    expect(answer.status).toBe(415)
    expect(answer.error.code).toBe('unsupported-media-type')
  })

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data; boundary=x'])(
    'of type %s is refused: other sites can send it without asking',
    async (type) => {
      expect((await send('{}', { 'content-type': type })).status).toBe(415)
    },
  )

  it('beyond the limit is refused by its length', async () => {
    const answer = await send(JSON.stringify({ name: 'x'.repeat(2 * 1024 * 1024) }), {})
    expect(answer.status).toBe(413)
    expect(answer.error.code).toBe('payload-too-large')
  })

  it('that is not JSON gets a plain word about it', async () => {
    const answer = await send('{"name": ', {})
    expect(answer.status).toBe(400)
    expect(answer.error.message).toBe('That is not valid JSON.')
  })

  it('may not carry fields that nobody asked for', async () => {
    const signUp = { name: 'Eve', email: 'eve@elsewhere.example', password: 'quiet lathe, loud press' }
    const answer = await designer.post('/api/auth/sign-up/email', {
      ...signUp,
      emailVerified: true,
      role: 'admin',
    })
    expect(answer.status).toBe(400)
  })

  it('with __proto__ changes no prototype', async () => {
    const answer = await send(
      '{"__proto__":{"isAdmin":true},"constructor":{"prototype":{"isAdmin":true}}}',
      {},
    )
    expect(answer.status).toBe(400)
    expect(({} as { isAdmin?: boolean }).isAdmin).toBeUndefined()
  })
})

describe('errors', () => {
  it('name each field that is not usable', async () => {
    const answer = await designer.post(`/api/workspaces/${app.workspaceId}/layouts`, {
      name: '',
      from: { kind: 'blank' },
    })
    expect(answer.status).toBe(400)
    expect(answer.body.error.fields).toEqual({ name: 'Give it a name' })
  })

  it('say nothing of the inside when something unexpected happens', async () => {
    const { layouts } = app.server
    const list = layouts.list
    layouts.list = () => {
      throw new Error('secret detail of /srv/hubstead')
    }
    try {
      const answer = await designer.get(`/api/workspaces/${app.workspaceId}/layouts`)
      expect(answer.status).toBe(500)
      expect(answer.body).toEqual({
        error: { code: 'internal', message: 'Something went wrong on our side. Try again in a moment.' },
      })
      expect(answer.text).not.toContain('secret')
    } finally {
      layouts.list = list
    }
  })

  it('answer an unknown address of the API in JSON', async () => {
    const answer = await designer.get('/api/nothing-here')
    expect(answer.status).toBe(404)
    expect(errorBodySchema.parse(answer.body).error.code).toBe('not-found')
  })

  it.each([
    '/api/layouts/..%2f..%2fetc',
    '/api/layouts/%00',
    '/api/layouts/%E0%A4%A',
    "/api/layouts/'or 1=1",
  ])('treat %s as something that is not there or not well formed', async (path) => {
    const answer = await designer.get(path)
    expect([400, 404]).toContain(answer.status)
    errorBodySchema.parse(answer.body)
  })
})
