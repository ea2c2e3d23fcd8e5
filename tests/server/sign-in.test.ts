import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestApp, type TestApp } from '../support/test-app'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('opening an account', () => {
  it('goes through a mail that arrives over SMTP', async () => {
    const person = await app.newPerson('Nils Brandt', 'nils@cedar-line.example')
    const me = await person.get('/api/me')
    expect(me.body).toEqual({
      user: { id: person.userId, name: 'Nils Brandt', email: 'nils@cedar-line.example', emailVerified: true },
      workspaces: [],
    })
  })
})
