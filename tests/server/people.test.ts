/** Invitations, roles and removal: who may, what it does at once, and what can never happen. */
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import type { Revocation } from '@server/accounts/revocation'
import { peopleSchema } from '@shared/protocol/accounts'
import { startTestApp, type TestApp, type TestPerson } from '../support/test-app'

let app: TestApp
let admin: TestPerson
let revocations: Revocation[]
beforeAll(async () => {
  app = await startTestApp()
  admin = await app.signInAs('admin')
  app.server.parts.accounts.onRevoked((revocation) => revocations.push(revocation))
})
beforeEach(() => {
  revocations = []
})
afterAll(() => app.close())

const membersPath = () => `/api/workspaces/${app.workspaceId}/members`
const invitationsPath = () => `/api/workspaces/${app.workspaceId}/invitations`
async function memberOf(person: TestPerson) {
  const people = peopleSchema.parse((await admin.get(membersPath())).body)
  return people.members.find((member) => member.userId === person.userId)
}
async function invite(email: string, role: string) {
  const answer = await admin.post(invitationsPath(), { email, role })
  expect(answer.status, answer.text).toBe(201)
  return answer.body.id as string
}
async function joined(name: string, email: string, role: string): Promise<TestPerson> {
  const person = await app.newPerson(name, email)
  const invitationId = await invite(email, role)
  expect((await person.post(`/api/invitations/${invitationId}/accept`)).status).toBe(200)
  return person
}

describe('an invitation', () => {
  it('travels by mail and gives its role to the invited address only', async () => {
    const invitationId = await invite('ines@cedar-line.example', 'designer')
    const mail = await app.mailTo('ines@cedar-line.example', /Cedar Line drives/)
    expect(mail.links[0]).toBe(`${app.url}/invitation/${invitationId}`)

    const stranger = await app.newPerson('Stray Stranger', 'stray@elsewhere.example')
    expect((await stranger.get(`/api/invitations/${invitationId}`)).status).toBe(404)
    expect((await stranger.post(`/api/invitations/${invitationId}/accept`)).status).toBe(404)
    expect((await app.signedOut().post(`/api/invitations/${invitationId}/accept`)).status).toBe(401)

    const ines = await app.newPerson('Ines Roth', 'ines@cedar-line.example')
    const view = await ines.get(`/api/invitations/${invitationId}`)
    expect(view.body).toMatchObject({
      role: 'designer',
      status: 'pending',
      workspaceName: 'Cedar Line drives',
      invitedByName: 'Ada Winter',
    })
    const accepted = await ines.post(`/api/invitations/${invitationId}/accept`)
    expect(accepted.body).toEqual({ workspaceId: app.workspaceId })
    expect((await ines.post(`/api/invitations/${invitationId}/accept`)).status).toBe(404)
    expect((await memberOf(ines))?.role).toBe('designer')
    expect(revocations).toContainEqual({
      kind: 'joined',
      userId: ines.userId,
      workspaceId: app.workspaceId,
      role: 'designer',
    })
  })

  it('asked for twice replaces the first', async () => {
    const first = await invite('twice@cedar-line.example', 'viewer')
    const second = await invite('twice@cedar-line.example', 'shop')
    const people = peopleSchema.parse((await admin.get(membersPath())).body)
    const open = people.invitations.filter((each) => each.email === 'twice@cedar-line.example')
    expect(open.map((each) => [each.id, each.role])).toEqual([[second, 'shop']])
    const person = await app.newPerson('Twice Asked', 'twice@cedar-line.example')
    expect((await person.post(`/api/invitations/${first}/accept`)).status).toBe(404)
  })

  it('withdrawn or too old opens nothing', async () => {
    const person = await app.newPerson('Late Lena', 'lena@cedar-line.example')
    const withdrawn = await invite(person.email, 'viewer')
    expect((await admin.delete(`${invitationsPath()}/${withdrawn}`)).status).toBe(204)
    expect((await person.post(`/api/invitations/${withdrawn}/accept`)).status).toBe(404)

    const old = await invite(person.email, 'viewer')
    const { database } = app.server.parts
    database.run(
      database.kysely
        .updateTable('invitation')
        .set({ expires_at: '2020-01-01T00:00:00.000Z' })
        .where('id', '=', old),
    )
    expect((await person.get(`/api/invitations/${old}`)).body.status).toBe('expired')
    expect((await person.post(`/api/invitations/${old}/accept`)).status).toBe(404)
    expect(await memberOf(person)).toBeUndefined()
  })

  it.each([
    ' admin',
    'admin ',
    'owner',
    'member',
    'Admin',
    ['admin'],
    ['viewer', 'admin'],
    'admin,viewer',
    '',
    null,
  ])('takes no role that is not one of the five: %j', async (role) => {
    const answer = await admin.post(invitationsPath(), { email: 'x@cedar-line.example', role })
    expect(answer.status).toBe(400)
  })

  it.each(['a@b.example\r\nBcc: c@d.example', 'a@b.example, c@d.example', 'no address', '"x"<a@b.example>'])(
    'goes to one plain address: %j',
    async (email) => {
      expect((await admin.post(invitationsPath(), { email, role: 'viewer' })).status).toBe(400)
    },
  )

  it('to a member is a conflict', async () => {
    const answer = await admin.post(invitationsPath(), { email: 'sam@cedar-line.example', role: 'admin' })
    expect(answer.status).toBe(409)
  })
})

describe('a role', () => {
  it('changes at once and says so to open sockets', async () => {
    const person = await joined('Rolf Change', 'rolf@cedar-line.example', 'designer')
    const member = await memberOf(person)
    const blank = { from: { kind: 'blank' } }
    const layouts = `/api/workspaces/${app.workspaceId}/layouts`
    expect((await person.post(layouts, blank)).status).toBe(201)
    expect((await admin.patch(`${membersPath()}/${member?.id}`, { role: 'viewer' })).status).toBe(204)
    expect(revocations).toContainEqual({
      kind: 'role',
      userId: person.userId,
      workspaceId: app.workspaceId,
      role: 'viewer',
    })
    expect((await person.post(layouts, blank)).status).toBe(403)
  })

  it('cannot be given to oneself', async () => {
    const person = await joined('Self Made', 'self@cedar-line.example', 'manager')
    const member = await memberOf(person)
    expect((await person.patch(`${membersPath()}/${member?.id}`, { role: 'admin' })).status).toBe(403)
    expect((await memberOf(person))?.role).toBe('manager')
  })

  it('of the last admin stays, and that admin too', async () => {
    const member = await memberOf(admin)
    const demoted = await admin.patch(`${membersPath()}/${member?.id}`, { role: 'viewer' })
    expect([demoted.status, demoted.body.error.code]).toEqual([409, 'conflict'])
    const removed = await admin.delete(`${membersPath()}/${member?.id}`)
    expect(removed.status).toBe(409)
    expect((await memberOf(admin))?.role).toBe('admin')
  })

  it('of the last admin stays even when two admins demote each other in one instant', async () => {
    const other = await joined('Second Admin', 'second@cedar-line.example', 'admin')
    const [mine, theirs] = [await memberOf(admin), await memberOf(other)]
    const answers = await Promise.all([
      admin.patch(`${membersPath()}/${theirs?.id}`, { role: 'viewer' }),
      other.patch(`${membersPath()}/${mine?.id}`, { role: 'viewer' }),
    ])
    const { database } = app.server.parts
    const admins = database.all(
      database.kysely
        .selectFrom('member')
        .select('user_id')
        .where('organization_id', '=', app.workspaceId)
        .where('role', '=', 'admin'),
    )
    expect(admins, JSON.stringify(answers.map((answer) => answer.text))).toHaveLength(1)
    // Leave the workspace to Ada again, whoever won.
    database.run(
      database.kysely
        .updateTable('member')
        .set({ role: 'admin' })
        .where('id', '=', mine?.id ?? ''),
    )
    database.run(
      database.kysely
        .updateTable('member')
        .set({ role: 'viewer' })
        .where('id', '=', theirs?.id ?? ''),
    )
  })
})

describe('removal', () => {
  it('closes the workspace at once, keeps the account, and says so to open sockets', async () => {
    const person = await joined('Gone Gunnar', 'gunnar@cedar-line.example', 'designer')
    const member = await memberOf(person)
    expect((await person.get(`/api/layouts/${app.layoutIds[0]}`)).status).toBe(200)
    expect((await admin.delete(`${membersPath()}/${member?.id}`)).status).toBe(204)
    expect(revocations).toContainEqual({
      kind: 'membership',
      userId: person.userId,
      workspaceId: app.workspaceId,
    })
    expect((await person.get(`/api/layouts/${app.layoutIds[0]}`)).status).toBe(404)
    expect((await person.get('/api/me')).body.workspaces).toEqual([])
  })
})

describe('a workspace', () => {
  it('of one’s own makes one its admin, and its members are nobody else’s business', async () => {
    const founder = await app.newPerson('Fay Founder', 'fay@elsewhere.example')
    const created = await founder.post('/api/workspaces', { name: '  Fay & daughters  ' })
    expect(created.status).toBe(201)
    const me = await founder.get('/api/me')
    expect(me.body.workspaces).toEqual([
      {
        id: created.body.id,
        name: 'Fay & daughters',
        slug: expect.stringMatching(/^fay-daughters-/),
        role: 'admin',
      },
    ])
    expect((await admin.get(`/api/workspaces/${created.body.id}/members`)).status).toBe(404)

    // A member of one workspace cannot be reached through another.
    const member = await memberOf(await app.signInAs('viewer'))
    const path = `/api/workspaces/${created.body.id}/members/${member?.id}`
    expect((await founder.patch(path, { role: 'admin' })).status).toBe(404)
    expect((await founder.delete(path)).status).toBe(404)
  })
})
