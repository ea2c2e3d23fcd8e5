/** Our frozen tables are those the sign-in package expects, and hold what it does not check itself. */
import { getMigrations } from 'better-auth/db/migration'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Auth } from '@server/accounts/auth'
import { createTestAuth } from '../support/test-auth'

let auth: Auth
let close: () => Promise<void>
beforeAll(async () => {
  ;({ auth, close } = await createTestAuth())
})
afterAll(() => close())

describe('the tables of accounts', () => {
  it('leave the package’s own planner of migrations nothing to do', async () => {
    const plan = await getMigrations(auth.options)
    expect(plan.toBeCreated).toEqual([])
    expect(plan.toBeAdded).toEqual([])
    expect(plan.toBeAddedIndexes).toEqual([])
    expect(plan.schemaProblems).toEqual([])
    expect((await plan.compileMigrations()).replace(/[;\s]/g, '')).toBe('')
  })

  it('refuse a role that is not one of ours, a second membership and losing the last admin', () => {
    const { handle } = auth
    const at = '2026-12-01T00:00:00.000Z'
    const user = (id: string) =>
      handle.exec(`insert into user values ('${id}', '${id}', '${id}@x.example', 1, null, '${at}', '${at}')`)
    const member = (id: string, userId: string, role: string) => () =>
      handle.exec(`insert into member values ('${id}', 'w', '${userId}', '${role}', '${at}')`)
    user('a')
    user('b')
    handle.exec(`insert into organization values ('w', 'W', 'w', null, '${at}', null)`)
    for (const role of ['owner', 'member', 'admin,viewer', ' admin', ''])
      expect(member('x', 'a', role)).toThrow(/CHECK/)
    member('ma', 'a', 'admin')()
    expect(member('again', 'a', 'viewer')).toThrow(/UNIQUE/)
    expect(() => handle.exec("update member set role = 'viewer' where id = 'ma'")).toThrow('last-admin')
    expect(() => handle.exec("delete from member where id = 'ma'")).toThrow('last-admin')
    expect(() => handle.exec("delete from user where id = 'a'")).toThrow('last-admin')
    member('mb', 'b', 'admin')()
    handle.exec("update member set role = 'viewer' where id = 'ma'")
    expect(() => handle.exec("delete from member where id = 'mb'")).toThrow('last-admin')
  })
})
