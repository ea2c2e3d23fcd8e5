/**
 * Every HTTP route × nobody and each of the five roles × own and other workspace. The table below is
 * the expectation, written by hand from the roles' description; a route of the app that is not in it
 * fails the run.
 */
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ROLES, type Role } from '@shared/protocol/roles'
import { routesOf } from '../support/routes-of'
import { startTestApp, type TestApp, type TestPerson } from '../support/test-app'
import { createFixtures, type Fixtures } from './authorization-fixtures'

type Params = Record<string, string>

interface RouteRule {
  /** Least role that may; the roles above may too. */
  least: Role
  /** Status for somebody who may. */
  ok: number
  /** Status on a released layout, where it differs from `ok`. */
  frozen?: number
  body?: unknown
  /** What the path's parameters stand for; made anew for each request, since many routes use it up. */
  params?: (fixtures: Fixtures) => Params | Promise<Params>
}

const inWorkspace = ({ workspaceId }: Fixtures) => ({ workspaceId })
const freshLayout = async (fixtures: Fixtures) => ({ layoutId: await fixtures.newLayout() })
const inReview = async (fixtures: Fixtures) => ({ layoutId: await fixtures.newLayoutInReview() })
const blank = { from: { kind: 'blank' } }
const reason = { reason: 'Superseded by a heavier design' }

/** Routes on things of a workspace. */
const WORKSPACE_ROUTES: Record<string, RouteRule> = {
  'PATCH /api/workspaces/:workspaceId': {
    least: 'admin',
    ok: 204,
    body: { name: 'Cedar Line drives' },
    params: inWorkspace,
  },
  'GET /api/workspaces/:workspaceId/members': { least: 'viewer', ok: 200, params: inWorkspace },
  'PATCH /api/workspaces/:workspaceId/members/:memberId': {
    least: 'admin',
    ok: 204,
    body: { role: 'shop' },
    params: (fixtures) => fixtures.newMember(),
  },
  'DELETE /api/workspaces/:workspaceId/members/:memberId': {
    least: 'admin',
    ok: 204,
    params: (fixtures) => fixtures.newMember(),
  },
  'POST /api/workspaces/:workspaceId/invitations': {
    least: 'admin',
    ok: 201,
    body: { email: 'guest@cedar-line.example', role: 'viewer' },
    params: inWorkspace,
  },
  'DELETE /api/workspaces/:workspaceId/invitations/:invitationId': {
    least: 'admin',
    ok: 204,
    params: (fixtures) => fixtures.newInvitation(),
  },
  'GET /api/workspaces/:workspaceId/layouts': { least: 'viewer', ok: 200, params: inWorkspace },
  'POST /api/workspaces/:workspaceId/layouts': {
    least: 'designer',
    ok: 201,
    body: blank,
    params: inWorkspace,
  },
  'GET /api/layouts/:layoutId': { least: 'viewer', ok: 200, params: freshLayout },
  'GET /api/layouts/:layoutId/people': { least: 'viewer', ok: 200, params: freshLayout },
  'GET /api/layouts/:layoutId/export': { least: 'designer', ok: 200, params: freshLayout },
  'PATCH /api/layouts/:layoutId': {
    least: 'designer',
    ok: 200,
    frozen: 409,
    body: { name: 'Renamed' },
    params: freshLayout,
  },
  'GET /api/layouts/:layoutId/releases': { least: 'viewer', ok: 200, params: freshLayout },
  'POST /api/layouts/:layoutId/review': {
    least: 'designer',
    ok: 200,
    frozen: 409,
    body: { note: 'Please look' },
    params: freshLayout,
  },
  'DELETE /api/layouts/:layoutId/review': { least: 'designer', ok: 200, frozen: 409, params: inReview },
  'POST /api/layouts/:layoutId/freeze': {
    least: 'manager',
    ok: 201,
    frozen: 409,
    body: { revision: 0, acceptances: [] },
    params: freshLayout,
  },
  'POST /api/layouts/:layoutId/next-revision': {
    least: 'manager',
    ok: 200,
    params: async (fixtures) => ({ layoutId: (await fixtures.newRelease()).layoutId }),
  },
  'GET /api/workspaces/:workspaceId/releases': { least: 'viewer', ok: 200, params: inWorkspace },
  'GET /api/releases/:releaseId': { least: 'viewer', ok: 200, params: (fixtures) => fixtures.newRelease() },
  'GET /api/releases/:releaseId/sheet.pdf': {
    least: 'viewer',
    ok: 200,
    params: (fixtures) => fixtures.newRelease(),
  },
  'GET /api/releases/:releaseId/document.json': {
    least: 'viewer',
    ok: 200,
    params: (fixtures) => fixtures.newRelease(),
  },
  'POST /api/releases/:releaseId/withdraw': {
    least: 'manager',
    ok: 200,
    body: reason,
    params: (fixtures) => fixtures.newRelease(),
  },
}

/** Routes that concern only the person who asks: any role may, nobody signed out. */
const OWN_ROUTES: Record<string, Pick<RouteRule, 'ok' | 'body'>> = {
  'GET /api/me': { ok: 200 },
  'PATCH /api/me': { ok: 200, body: { name: 'Same Person' } },
  'GET /api/me/sessions': { ok: 200 },
  'DELETE /api/me/sessions': { ok: 204 },
  'DELETE /api/me/sessions/:sessionId': { ok: 404 },
  'POST /api/workspaces': { ok: 201, body: { name: 'Another workspace' } },
  'GET /api/invitations/:invitationId': { ok: 404 },
  'POST /api/invitations/:invitationId/accept': { ok: 404 },
  'GET /api/examples': { ok: 200 },
  'POST /api/calculate': { ok: 400, body: {} },
  'POST /api/auth/change-password': { ok: 400, body: {} },
}

/** Routes for everybody, with the status a signed-out person gets. */
const OPEN_ROUTES: Record<string, Pick<RouteRule, 'ok' | 'body'>> = {
  'GET /api/health': { ok: 200 },
  'GET /api/caught-mail': { ok: 200 },
  'GET /{*path}': { ok: 404 },
  'POST /api/auth/sign-up/email': { ok: 400, body: {} },
  'POST /api/auth/sign-in/email': { ok: 400, body: {} },
  'POST /api/auth/sign-out': { ok: 204 },
  'POST /api/auth/verify-email': { ok: 400, body: {} },
  'POST /api/auth/send-verification-email': { ok: 400, body: {} },
  'POST /api/auth/request-password-reset': { ok: 400, body: {} },
  'POST /api/auth/reset-password': { ok: 400, body: {} },
}

let app: TestApp
let fixtures: Fixtures
const people = new Map<Role, TestPerson>()
let outsider: TestPerson
beforeAll(async () => {
  app = await startTestApp()
  for (const role of ROLES) people.set(role, await app.signInAs(role))
  outsider = await app.newPerson('Olga Other', 'olga@elsewhere.example')
  await outsider.post('/api/workspaces', { name: 'Elsewhere' })
  fixtures = createFixtures(app, people)
})
afterAll(() => app.close())

async function ask(person: TestPerson, route: string, body: unknown, params: Params = {}) {
  const [method = '', template = ''] = route.split(' ')
  const path = template
    .replace(/:(\w+)/g, (_match, name: string) => params[name] ?? 'no-such-thing')
    .replace('{*path}', 'no-such-file.js')
  return person.request(path, { method, body })
}
const may = (role: Role, least: Role) => ROLES.indexOf(role) >= ROLES.indexOf(least)

it('knows every route of the app', () => {
  const known = [...Object.keys(WORKSPACE_ROUTES), ...Object.keys(OWN_ROUTES), ...Object.keys(OPEN_ROUTES)]
  expect(routesOf(app.server.app)).toEqual(known.sort())
})

describe.each(Object.entries(WORKSPACE_ROUTES))('%s', (route, rule) => {
  const paramsFor = async () => rule.params?.(fixtures)

  it('is closed to somebody who is not signed in', async () => {
    const answer = await ask(app.signedOut(), route, rule.body, await paramsFor())
    expect(answer.status).toBe(401)
    expect(answer.body.error.code).toBe('unauthenticated')
  })

  it('does not exist for the admin of another workspace', async () => {
    const answer = await ask(outsider, route, rule.body, await paramsFor())
    expect(answer.status).toBe(404)
    expect(answer.body.error.code).toBe('not-found')
  })

  it.each(ROLES)(`follows the role: %s`, async (role) => {
    const answer = await ask(people.get(role)!, route, rule.body, await paramsFor())
    expect(answer.status, answer.text).toBe(may(role, rule.least) ? rule.ok : 403)
  })

  if (rule.frozen !== undefined) {
    it('is refused on a released layout, with a reason', async () => {
      const { layoutId } = await fixtures.newRelease()
      const answer = await ask(people.get('admin')!, route, rule.body, { layoutId })
      expect(answer.status, answer.text).toBe(rule.frozen)
      expect(['frozen', 'conflict']).toContain(answer.body.error.code)
    })
  }
})

describe.each(Object.entries(OWN_ROUTES))('%s', (route, { ok, body }) => {
  it('is closed to somebody who is not signed in', async () => {
    expect((await ask(app.signedOut(), route, body)).status).toBe(401)
  })
  it.each(ROLES)('is open to any signed-in person: %s', async (role) => {
    expect((await ask(people.get(role)!, route, body)).status).toBe(ok)
  })
})

describe.each(Object.entries(OPEN_ROUTES))('%s', (route, { ok, body }) => {
  it('answers everybody', async () => {
    expect((await ask(app.signedOut(), route, body)).status).toBe(ok)
  })
})
