/** Review, freeze, withdrawal and next revision over HTTP, against the real server. */
import { createHash } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type Acceptance, findingKey, releaseDeskSchema, releaseViewSchema } from '@shared/protocol/releases'
import type { Finding, LayoutResults } from '@shared/recalculation/layout-results'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { startTestApp, type TestApp, type TestPerson } from '../support/test-app'

let app: TestApp
let viewer: TestPerson
let shop: TestPerson
let designer: TestPerson
let manager: TestPerson

beforeAll(async () => {
  app = await startTestApp()
  viewer = await app.signInAs('viewer')
  shop = await app.signInAs('shop')
  designer = await app.signInAs('designer')
  manager = await app.signInAs('manager')
})
afterAll(async () => {
  await app.close()
})

/** A new layout with the flaw of the reducer shaft: wheel A slips in both load cases. */
async function failingLayout(name = 'Intermediate shaft'): Promise<string> {
  const created = await designer.post(`/api/workspaces/${app.workspaceId}/layouts`, {
    name,
    from: { kind: 'layout', layoutId: app.layoutIds[0] },
  })
  expect(created.status).toBe(201)
  return created.body.id as string
}

/** The same with the fit that holds. */
async function passingLayout(name = 'Intermediate shaft'): Promise<string> {
  const exported = await designer.get(`/api/layouts/${app.layoutIds[0]}/export`)
  const content = JSON.parse(exported.text) as { hubs: { id: string; fit: unknown }[] }
  for (const hub of content.hubs) if (hub.id === 'A') hub.fit = { kind: 'iso286', hole: 'H7', shaft: 'u6' }
  const created = await designer.post(`/api/workspaces/${app.workspaceId}/layouts`, {
    name,
    from: { kind: 'file', content },
  })
  expect(created.status).toBe(201)
  expect(created.body.verdict).toBe('passes')
  return created.body.id as string
}

async function failingFindings(layoutId: string): Promise<Finding[]> {
  const view = await designer.get(`/api/layouts/${layoutId}`)
  return recalculateLayout(view.body.document).findings.filter((finding) => finding.severity === 'fails')
}

const accept = (findings: Finding[]): Acceptance[] =>
  findings.map(({ code, part, loadCase }) => ({
    code,
    part,
    loadCase,
    reason: 'Bench test over 200 h at 1.3 times the torque.',
  }))

async function freeze(layoutId: string, acceptances: Acceptance[] = [], person = manager) {
  const { body } = await manager.get(`/api/layouts/${layoutId}`)
  return person.post(`/api/layouts/${layoutId}/freeze`, { revision: body.revision, acceptances })
}

describe('review', () => {
  it('is asked by a designer, shown on the desk with its findings, and taken back', async () => {
    const layoutId = await failingLayout('Shaft for review')
    const asked = await designer.post(`/api/layouts/${layoutId}/review`, { note: 'Please look at wheel A.' })
    expect(asked.status).toBe(200)
    expect(asked.body.status).toBe('inReview')

    const desk = releaseDeskSchema.parse(
      (await viewer.get(`/api/workspaces/${app.workspaceId}/releases`)).body,
    )
    const waiting = desk.waiting.find((each) => each.layoutId === layoutId)
    expect(waiting).toMatchObject({
      askedByName: 'Dina Reyes',
      note: 'Please look at wheel A.',
      verdict: 'fails',
      lastReleaseId: null,
      changeCount: null,
    })
    expect(waiting?.findings).toEqual(
      expect.arrayContaining([
        expect.objectContaining({
          code: 'slip',
          part: 'A',
          partName: 'wheel, first stage',
          severity: 'fails',
        }),
      ]),
    )
    const mail = await app.mailTo('mira@cedar-line.example', /Review asked: Shaft for review, revision A/)
    expect(mail.text).toContain('Please look at wheel A.')
    expect(mail.links[0]).toContain(`/layouts/${layoutId}`)

    expect((await designer.post(`/api/layouts/${layoutId}/review`, {})).status).toBe(409)
    const back = await designer.delete(`/api/layouts/${layoutId}/review`)
    expect(back.body.status).toBe('draft')
    expect((await designer.delete(`/api/layouts/${layoutId}/review`)).status).toBe(409)
  })

  it('is not for viewers and the shop', async () => {
    const layoutId = await passingLayout()
    for (const person of [viewer, shop]) {
      expect((await person.post(`/api/layouts/${layoutId}/review`, {})).status).toBe(403)
      expect((await person.delete(`/api/layouts/${layoutId}/review`)).status).toBe(403)
    }
  })
})

describe('freeze', () => {
  it('stores layout, results, engine, hash, who and when, and mails the team', async () => {
    const layoutId = await passingLayout('Shaft to release')
    const before = (await manager.get(`/api/layouts/${layoutId}`)).body
    const answer = await manager.post(`/api/layouts/${layoutId}/freeze`, {
      revision: before.revision,
      acceptances: [],
      note: 'First batch of ten.',
    })
    expect(answer.status).toBe(201)
    expect(answer.body).toMatchObject({
      layoutId,
      revisionLetter: 'A',
      revision: before.revision,
      status: 'released',
      frozenByName: 'Mira Kast',
      verdict: 'passes',
      note: 'First batch of ten.',
    })

    const view = releaseViewSchema.parse((await viewer.get(`/api/releases/${answer.body.id}`)).body)
    expect(view.document).toEqual(before.document)
    expect(view.integrity).toBe('intact')
    expect(view.results).toEqual(JSON.parse(JSON.stringify(recalculateLayout(before.document))))
    expect(view.layoutStatus).toBe('released')

    // The hash can be checked by anyone with the file and a SHA-256 tool.
    const file = await viewer.get(`/api/releases/${answer.body.id}/document.json`)
    const sha256 = createHash('sha256').update(file.text).digest('hex')
    expect(view.documentHash).toBe(`sha256:${sha256}`)

    for (const address of ['vera', 'sam', 'dina', 'tomas', 'mira', 'ada']) {
      const mail = await app.mailTo(`${address}@cedar-line.example`, /Released: Shaft to release, revision A/)
      expect(mail.text).toContain(view.documentHash)
      expect(mail.links[0]).toBe(`${app.url}/w/${app.workspaceId}/releases/${view.id}`)
    }
  })

  it('refuses while a finding fails, naming each one', async () => {
    const layoutId = await failingLayout()
    const findings = await failingFindings(layoutId)
    expect(findings.map((finding) => `${finding.code} ${finding.part} ${finding.loadCase}`).sort()).toEqual([
      'slip A run',
      'slip A warm-up',
    ])
    const answer = await freeze(layoutId)
    expect(answer.status).toBe(422)
    expect(answer.body.error.code).toBe('fails')
    expect(Object.keys(answer.body.error.fields).sort()).toEqual(findings.map(findingKey).sort())

    const [first, second] = findings
    const half = await freeze(layoutId, accept([first!]))
    expect(half.status).toBe(422)
    expect(Object.keys(half.body.error.fields)).toEqual([findingKey(second!)])
    expect((await designer.get(`/api/layouts/${layoutId}`)).body.status).toBe('draft')
  })

  it('takes each failing finding with a reason, and shows it as a deviation', async () => {
    const layoutId = await failingLayout('Shaft with deviations')
    const findings = await failingFindings(layoutId)
    const answer = await freeze(layoutId, accept(findings))
    expect(answer.status).toBe(201)
    expect(answer.body).toMatchObject({ verdict: 'fails', acceptanceCount: 2 })
    const desk = releaseDeskSchema.parse(
      (await viewer.get(`/api/workspaces/${app.workspaceId}/releases`)).body,
    )
    const deviations = desk.deviations.filter((each) => each.releaseId === answer.body.id)
    expect(deviations).toHaveLength(2)
    expect(deviations[0]).toMatchObject({
      code: 'slip',
      partName: 'wheel, first stage',
      reason: 'Bench test over 200 h at 1.3 times the torque.',
      acceptedByName: 'Mira Kast',
    })
  })

  it('refuses reasons for what does not fail, twice the same one, and reasons too short', async () => {
    const layoutId = await failingLayout()
    const acceptances = accept(await failingFindings(layoutId))
    const invented = { code: 'hub-yield', part: 'B', loadCase: 'run', reason: 'Nothing of the kind exists.' }
    const unknown = await freeze(layoutId, [...acceptances, invented])
    expect(unknown.status).toBe(400)
    expect(unknown.body.error.fields).toEqual({ [findingKey(invented)]: expect.stringContaining('no such') })
    const twice = await freeze(layoutId, [...acceptances, acceptances[0]!])
    expect(twice.status).toBe(400)
    const short = await freeze(layoutId, [{ ...acceptances[0]!, reason: 'fine' }, acceptances[1]!])
    expect(short.status).toBe(400)
    expect(short.body.error.fields['acceptances.0.reason']).toContain('ten characters')
    expect((await designer.get(`/api/layouts/${layoutId}`)).body.status).toBe('draft')
  })

  it('is a conflict when the layout changed since the manager looked', async () => {
    const layoutId = await passingLayout('Shaft seen too early')
    const { revision } = (await manager.get(`/api/layouts/${layoutId}`)).body
    expect((await designer.patch(`/api/layouts/${layoutId}`, { name: 'Shaft renamed' })).status).toBe(200)
    const answer = await manager.post(`/api/layouts/${layoutId}/freeze`, { revision, acceptances: [] })
    expect(answer.status).toBe(409)
    expect(answer.body.error.code).toBe('conflict')
    expect((await manager.get(`/api/layouts/${layoutId}/releases`)).body.releases).toEqual([])
  })

  it('is for managers and administrators only', async () => {
    const layoutId = await passingLayout()
    for (const person of [viewer, shop, designer]) {
      const answer = await freeze(layoutId, [], person)
      expect(answer.status).toBe(403)
    }
    expect((await freeze(layoutId, [], app.signedOut())).status).toBe(401)
    expect((await freeze(layoutId, [], await app.signInAs('admin'))).status).toBe(201)
  })

  it('closes the layout: no rename, no review, no second freeze', async () => {
    const layoutId = await passingLayout()
    expect((await freeze(layoutId)).status).toBe(201)
    for (const answer of [
      await designer.patch(`/api/layouts/${layoutId}`, { name: 'Too late' }),
      await designer.post(`/api/layouts/${layoutId}/review`, {}),
      await freeze(layoutId),
    ]) {
      expect(answer.status).toBe(409)
      expect(answer.body.error.code).toBe('frozen')
    }
  })
})

describe('next revision', () => {
  it('starts a draft with the next letter from the release, which stays as it was', async () => {
    const layoutId = await passingLayout('Shaft in two revisions')
    const first = await freeze(layoutId)
    expect((await designer.post(`/api/layouts/${layoutId}/next-revision`)).status).toBe(403)
    const next = await manager.post(`/api/layouts/${layoutId}/next-revision`)
    expect(next.status).toBe(200)
    expect(next.body).toMatchObject({ status: 'draft', revisionLetter: 'B' })
    expect((await manager.post(`/api/layouts/${layoutId}/next-revision`)).status).toBe(409)

    await designer.patch(`/api/layouts/${layoutId}`, { name: 'Shaft in two revisions, shortened' })
    const desk = releaseDeskSchema.parse(
      (await viewer.get(`/api/workspaces/${app.workspaceId}/releases`)).body,
    )
    expect(desk.drafts.find((draft) => draft.layoutId === layoutId)).toMatchObject({
      revisionLetter: 'B',
      lastReleaseId: first.body.id,
      lastReleaseLetter: 'A',
      changeCount: 1,
    })
    const second = await freeze(layoutId)
    expect(second.body.revisionLetter).toBe('B')
    const [b, a] = await Promise.all(
      [second, first].map(async (answer) =>
        releaseViewSchema.parse((await viewer.get(`/api/releases/${answer.body.id}`)).body),
      ),
    )
    expect(a?.layoutName).toBe('Shaft in two revisions')
    expect(b?.layoutName).toBe('Shaft in two revisions, shortened')
    expect(b?.previousHash).toBe(a?.releaseHash)
    expect(a?.previousHash).toBeNull()
    expect(b?.integrity).toBe('intact')
  })
})

describe('withdrawal', () => {
  it('needs a reason, happens once, mails the team and leaves the release unchanged', async () => {
    const layoutId = await passingLayout('Shaft withdrawn')
    const released = (await freeze(layoutId)).body
    const path = `/api/releases/${released.id}/withdraw`
    expect((await designer.post(path, { reason: 'The wheel drawing was wrong.' })).status).toBe(403)
    const short = await manager.post(path, { reason: 'wrong' })
    expect(short.status).toBe(400)
    expect(short.body.error.fields.reason).toContain('ten characters')
    const done = await manager.post(path, { reason: 'The wheel drawing was wrong.' })
    expect(done.status).toBe(200)
    expect(done.body).toMatchObject({
      status: 'withdrawn',
      withdrawnByName: 'Mira Kast',
      withdrawalReason: 'The wheel drawing was wrong.',
      documentHash: released.documentHash,
    })
    expect((await manager.post(path, { reason: 'The wheel drawing was wrong.' })).status).toBe(409)
    const mail = await app.mailTo('sam@cedar-line.example', /Withdrawn: Shaft withdrawn, revision A/)
    expect(mail.text).toContain('The wheel drawing was wrong.')
    expect((await viewer.get(`/api/layouts/${layoutId}`)).body.status).toBe('withdrawn')
    expect((await viewer.get(`/api/releases/${released.id}`)).body.integrity).toBe('intact')
    const next = await manager.post(`/api/layouts/${layoutId}/next-revision`)
    expect(next.body).toMatchObject({ status: 'draft', revisionLetter: 'B' })
  })

  it('leaves a draft that has moved on as it is', async () => {
    const layoutId = await passingLayout()
    const released = (await freeze(layoutId)).body
    await manager.post(`/api/layouts/${layoutId}/next-revision`)
    const done = await manager.post(`/api/releases/${released.id}/withdraw`, {
      reason: 'Superseded before it was built.',
    })
    expect(done.status).toBe(200)
    expect((await viewer.get(`/api/layouts/${layoutId}`)).body).toMatchObject({
      status: 'draft',
      revisionLetter: 'B',
    })
  })
})

describe('other workspaces', () => {
  it('get 404 for everything about a release', async () => {
    const layoutId = await passingLayout()
    const released = (await freeze(layoutId)).body
    const stranger = await app.newPerson('Olga Stranger', 'olga@elsewhere.example')
    await stranger.post('/api/workspaces', { name: 'Elsewhere' })
    for (const answer of [
      await stranger.get(`/api/workspaces/${app.workspaceId}/releases`),
      await stranger.get(`/api/layouts/${layoutId}/releases`),
      await stranger.get(`/api/releases/${released.id}`),
      await stranger.get(`/api/releases/${released.id}/sheet.pdf`),
      await stranger.get(`/api/releases/${released.id}/document.json`),
      await stranger.post(`/api/releases/${released.id}/withdraw`, { reason: 'None of my business.' }),
      await stranger.post(`/api/layouts/${layoutId}/review`, {}),
      await stranger.delete(`/api/layouts/${layoutId}/review`),
      await stranger.post(`/api/layouts/${layoutId}/freeze`, { revision: 0, acceptances: [] }),
      await stranger.post(`/api/layouts/${layoutId}/next-revision`),
    ])
      expect(answer.status).toBe(404)
  })
})

describe('the stored results', () => {
  it('are those of the stored document, whatever the client believed', async () => {
    const layoutId = await failingLayout()
    const view = (await manager.get(`/api/layouts/${layoutId}`)).body
    // A body with results of its own is not even accepted.
    const forged = await manager.post(`/api/layouts/${layoutId}/freeze`, {
      revision: view.revision,
      acceptances: [],
      results: { verdict: 'passes' },
    })
    expect(forged.status).toBe(400)
    const released = await freeze(layoutId, accept(await failingFindings(layoutId)))
    const stored = (await viewer.get(`/api/releases/${released.body.id}`)).body.results as LayoutResults
    expect(stored.hubs.find((hub) => hub.id === 'A')?.loadCases[0]?.slipSafety).toBeCloseTo(0.94, 2)
  })
})
