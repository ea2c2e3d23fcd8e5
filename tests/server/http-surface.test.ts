/** Headers, pages, health and the end of the server. */
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'
import SqliteHandle from 'better-sqlite3'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import { startTestApp, type TestApp } from '../support/test-app'

let clientDir: string
let app: TestApp | null = null
beforeAll(() => {
  clientDir = mkdtempSync(path.join(tmpdir(), 'hubstead-client-'))
  mkdirSync(path.join(clientDir, 'assets'))
  writeFileSync(path.join(clientDir, 'index.html'), '<!doctype html><title>Hubstead</title>')
  writeFileSync(path.join(clientDir, 'assets', 'app-abc123.js'), 'export {}')
})
afterEach(async () => {
  await app?.close()
  app = null
})
afterAll(() => {
  rmSync(clientDir, { recursive: true, force: true })
})

const start = async (environment: Record<string, string> = {}) => {
  app = await startTestApp({ clientDir, environment: { SEED_DEMO: '0', ...environment } })
  return app
}

describe('pages', () => {
  it('are the client for every address of its router, never cached; assets are kept for a year', async () => {
    const { signedOut } = await start()
    const nobody = signedOut()
    for (const address of ['/', '/sign-in', '/w/abc/layouts/def']) {
      const page = await nobody.request(address, { headers: { accept: 'text/html' } })
      expect([page.status, page.headers.get('cache-control')]).toEqual([200, 'no-cache'])
      expect(page.text).toContain('<title>Hubstead</title>')
    }
    const asset = await nobody.get('/assets/app-abc123.js')
    expect(asset.headers.get('cache-control')).toBe('public, max-age=31536000, immutable')
    expect(asset.headers.get('content-type')).toContain('javascript')
    // fetch undoes the compression, so the content is what a browser would run.
    expect(asset.headers.get('content-encoding')).toBe('gzip')
    expect(asset.text).toBe('export {}')
    const plain = await nobody.request('/assets/app-abc123.js', {
      headers: { 'accept-encoding': 'identity' },
    })
    expect([plain.headers.get('content-encoding'), plain.text]).toEqual([null, 'export {}'])
  })

  it.each(['/assets/gone-000.js', '/favicon.ico', '/assets/..%2f..%2fpackage.json', '/.env'])(
    'are not there for %s',
    async (address) => {
      const answer = await (await start()).signedOut().get(address)
      expect([400, 403, 404]).toContain(answer.status)
      expect(answer.text).not.toContain('dependencies')
    },
  )
})

describe('headers', () => {
  it('allow nothing from elsewhere and nothing inline', async () => {
    const answer = await (await start()).signedOut().request('/', { headers: { accept: 'text/html' } })
    const policy = answer.headers.get('content-security-policy') ?? ''
    for (const rule of [
      "default-src 'self'",
      "script-src 'self'",
      "style-src 'self'",
      "img-src 'self' data: blob:",
      "object-src 'none'",
      "base-uri 'none'",
      "frame-ancestors 'none'",
    ])
      expect(policy.split(';')).toContain(rule)
    expect(policy).not.toMatch(/unsafe|\*/)
    expect(answer.headers.get('x-content-type-options')).toBe('nosniff')
    expect(answer.headers.get('x-powered-by')).toBeNull()
    expect(answer.headers.get('strict-transport-security')).toBeNull()
  })

  it('bind cookies to the host and browsers to https where the address is https', async () => {
    const secure = await start({ PUBLIC_URL: 'https://fits.example', SEED_DEMO: '1' })
    const answer = await secure.signedOut().request('/api/auth/sign-in/email', {
      method: 'POST',
      body: { email: 'vera@cedar-line.example', password: 'between-two-centres' },
    })
    expect(answer.status).toBe(204)
    expect(answer.headers.getSetCookie()[0]).toMatch(
      /^__Host-hubstead=[^;]{40,}; Max-Age=604800; Path=\/; HttpOnly; Secure; SameSite=Lax$/,
    )
    expect(answer.headers.get('strict-transport-security')).toBe('max-age=31536000; includeSubDomains')
    const person = await secure.signInAs('viewer')
    expect((await person.get('/api/me')).status).toBe(200)
  })

  it('keep answers of the API out of caches', async () => {
    const answer = await (await start()).signedOut().get('/api/me')
    expect(answer.headers.get('cache-control')).toBe('no-store')
  })
})

describe('health', () => {
  it('tells that the database answers, is up to date, and which version runs', async () => {
    const answer = await (await start()).signedOut().get('/api/health')
    expect([answer.status, answer.body]).toEqual([
      200,
      {
        status: 'ok',
        database: 'reachable',
        migrations: 'applied',
        version: expect.stringMatching(/^\d+\.\d+/),
      },
    ])
  })

  it('fails when the database does not answer or is behind', async () => {
    const { server, signedOut } = await start()
    const { handle } = server.parts.database
    handle.exec("insert into schema_migration values ('99990101T0000_from_the_future', '')")
    expect((await signedOut().get('/api/health')).status).toBe(503)
    handle.exec("delete from schema_migration where name like '9999%'")
    expect((await signedOut().get('/api/health')).status).toBe(200)
    handle.close()
    const broken = await signedOut().get('/api/health')
    expect([broken.status, broken.body.error.code]).toEqual([503, 'unavailable'])
    // So that the server can still end: it closes the handle itself.
    server.parts.database.close = () => undefined
  })
})

describe('the end', () => {
  it('frees port and folder and leaves one file with everything in it', async () => {
    const running = await start()
    const { port } = running.server
    await running.server.close()
    const probe = createServer()
    await new Promise<void>((resolve, reject) => {
      probe.once('error', reject)
      probe.listen(port, '127.0.0.1', resolve)
    })
    await new Promise((resolve) => probe.close(resolve))
    const handle = new SqliteHandle(path.join(running.dataDir, 'hubstead.sqlite'), { readonly: true })
    expect(handle.pragma('integrity_check', { simple: true })).toBe('ok')
    handle.close()
    await running.restart()
    expect((await running.signedOut().get('/api/health')).status).toBe(200)
  })

  it('is not held up by a connection that says nothing', async () => {
    const running = await start()
    await fetch(`http://127.0.0.1:${running.server.port}/api/health`)
    const startedAt = performance.now()
    await running.server.close()
    expect(performance.now() - startedAt).toBeLessThan(3_000)
    await running.restart()
  })
})

describe('a second server', () => {
  it('on the same folder does not start', async () => {
    const running = await start()
    const { startServer } = await import('@server/index')
    await expect(startServer({ ...running.server.parts.config, port: 0 })).rejects.toThrow(
      /Another Hubstead server/,
    )
  })
})
