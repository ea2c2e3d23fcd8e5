/**
 * The conditions under which the sign-in package is used: what it does by default and must not do
 * here. Passwords, limits, cookies and lifetimes have tests of their own beside this file.
 */
import { statSync } from 'node:fs'
import path from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { NEW_PERSON_PASSWORD, startTestApp, type TestApp } from '../support/test-app'
import { createTestAuth } from '../support/test-auth'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('beside a busy writer', () => {
  it('every account is opened and every edit of the list is stored', async () => {
    const { database } = app.server.parts
    const layoutId = app.layoutIds[0] ?? ''
    let isBusy = true
    let written = 0
    const writer = (async () => {
      while (isBusy) {
        database.writeTransaction((tx) => {
          const before = tx.first(tx.kysely.selectFrom('layout').select('project').where('id', '=', layoutId))
          const project = `${(before?.project ?? '').length}`
          tx.run(tx.kysely.updateTable('layout').set({ project }).where('id', '=', layoutId))
        })
        written += 1
        await new Promise((resolve) => setImmediate(resolve))
      }
    })()
    const signUps = await Promise.all(
      Array.from({ length: 20 }, (_, index) =>
        app.signedOut().post('/api/auth/sign-up/email', {
          name: 'Same Time',
          email: `same-time-${index}@cedar-line.example`,
          password: NEW_PERSON_PASSWORD,
        }),
      ),
    )
    isBusy = false
    await writer
    expect(signUps.map((answer) => answer.status)).toEqual(Array(20).fill(204))
    expect(written).toBeGreaterThan(20)
    const stored = database.all(
      database.kysely.selectFrom('user').select('id').where('email', 'like', 'same-time-%'),
    )
    expect(stored).toHaveLength(20)
  })
})

describe('its own endpoints', () => {
  it('are not on the network, except those that are routes of ours', async () => {
    const { auth, close } = await createTestAuth()
    const paths = Object.values(auth.api).flatMap((endpoint) => {
      const { path: endpointPath } = endpoint as { path?: string }
      return endpointPath ? [endpointPath] : []
    })
    await close()
    expect(paths.length).toBeGreaterThan(50)
    const ours = [
      '/sign-up/email',
      '/sign-in/email',
      '/sign-out',
      '/verify-email',
      '/send-verification-email',
      '/request-password-reset',
      '/reset-password',
      '/change-password',
    ]
    const admin = await app.signInAs('admin')
    for (const endpoint of paths.filter((each) => !ours.includes(each))) {
      const address = `/api/auth${endpoint.replace(/:\w+/g, 'x')}`
      expect((await admin.get(address)).status, `GET ${address}`).toBe(404)
      expect((await admin.post(address, {})).status, `POST ${address}`).toBe(404)
    }
  })
})

describe('a request', () => {
  it('asks who is there once, and a caller without a cookie costs no question at all', async () => {
    const { accounts } = app.server.parts
    const designer = await app.signInAs('designer')
    const resolve = accounts.resolve
    let asked = 0
    accounts.resolve = (caller) => {
      asked += 1
      return resolve(caller)
    }
    await designer.get(`/api/layouts/${app.layoutIds[0]}`)
    accounts.resolve = resolve
    expect(asked).toBe(1)
  })
})

describe('what it keeps', () => {
  it('is readable by this account of the machine only: its session tokens stand there in clear', () => {
    const file = path.join(app.dataDir, 'hubstead.sqlite')
    for (const suffix of ['', '-wal', '-shm']) expect(statSync(file + suffix).mode & 0o777).toBe(0o600)
  })

  it('is never trusted from a cookie: the session is read from the database each time', async () => {
    const { auth, close } = await createTestAuth()
    expect(auth.options.session.cookieCache.enabled).toBe(false)
    expect(auth.options).not.toHaveProperty('secondaryStorage')
    await close()
    const person = await app.signInAs('shop')
    expect(person.cookie.split(';')).toHaveLength(1)
    const { database } = app.server.parts
    database.run(database.kysely.deleteFrom('session').where('user_id', '=', person.userId))
    expect((await person.get('/api/me')).status).toBe(401)
  })
})
