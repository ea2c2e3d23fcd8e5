/** A new data folder holds the whole demo or is done again. */
import { existsSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { afterEach, expect, it } from 'vitest'
import { DEMO_PEOPLE } from '@server/demo/seed-demo'
import { makeDemoDatabase } from '@server/demo/new-demo-database'
import { loadMigrations } from '@server/database/run-migrations'
import { openDatabase } from '@server/database/open-database'
import { peopleSchema } from '@shared/protocol/accounts'
import { startTestApp, type TestApp } from '../support/test-app'

let app: TestApp | null = null
afterEach(() => app?.close())

it('has one person of each role and a second designer, and three layouts by the designer', async () => {
  app = await startTestApp()
  const admin = await app.signInAs('admin')
  const people = peopleSchema.parse((await admin.get(`/api/workspaces/${app.workspaceId}/members`)).body)
  expect(people.members.map(({ email, role }) => `${email} ${role}`).sort()).toEqual(
    DEMO_PEOPLE.map(({ email, role }) => `${email} ${role}`).sort(),
  )
  expect(app.layoutIds.filter(Boolean)).toHaveLength(3)
})

it('is not made twice, and is made again after a start that broke off', async () => {
  app = await startTestApp({ environment: { SEED_DEMO: '0' } })
  const { config, logger } = app.server.parts
  const databaseFile = path.join(app.dataDir, 'demo.sqlite')
  writeFileSync(`${databaseFile}.new`, 'half a database')
  const migrations = await loadMigrations()
  expect(await makeDemoDatabase({ ...config, databaseFile }, migrations, logger)).toBe(true)
  expect(await makeDemoDatabase({ ...config, databaseFile }, migrations, logger)).toBe(false)
  expect(existsSync(`${databaseFile}.new`)).toBe(false)
  const database = openDatabase(databaseFile)
  expect(database.all(database.kysely.selectFrom('layout').select('id'))).toHaveLength(3)
  database.close()
})

it('is absent where it is switched off', async () => {
  app = await startTestApp({ environment: { SEED_DEMO: '0' } })
  const answer = await app.signedOut().post('/api/auth/sign-in/email', {
    email: 'ada@cedar-line.example',
    password: 'between-two-centres',
  })
  expect(answer.status).toBe(401)
})
