/** The list of layouts and what is done to a layout from outside its document. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import {
  exampleListSchema,
  layoutListSchema,
  layoutSummarySchema,
  layoutViewSchema,
} from '@shared/protocol/layouts'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { startTestApp, type TestApp, type TestPerson } from '../support/test-app'

let app: TestApp
let designer: TestPerson
beforeAll(async () => {
  app = await startTestApp()
  designer = await app.signInAs('designer')
})
afterAll(() => app.close())

const listPath = () => `/api/workspaces/${app.workspaceId}/layouts`
async function create(body: unknown) {
  const answer = await designer.post(listPath(), body)
  expect(answer.status, answer.text).toBe(201)
  return layoutSummarySchema.parse(answer.body)
}
const viewOf = async (layoutId: string) =>
  layoutViewSchema.parse((await designer.get(`/api/layouts/${layoutId}`)).body)

describe('the list', () => {
  it('shows the three demo layouts with their verdict, first failure and drawing', async () => {
    const { layouts } = layoutListSchema.parse((await designer.get(listPath())).body)
    const found = Object.fromEntries(layouts.map((layout) => [layout.id, layout]))
    const [reducer, camshaft, lineShaft] = app.layoutIds.map((id) => found[id])
    // The mistakes are those of the scenarios' description.
    expect(reducer).toMatchObject({ verdict: 'fails', failingCount: 2, status: 'draft', revisionLetter: 'A' })
    expect(reducer?.worstFinding).toMatch(/^wheel, first stage slips in /)
    expect(camshaft).toMatchObject({ verdict: 'fails', failingCount: 1 })
    expect(camshaft?.worstFinding).toMatch(/has the wrong angle/)
    expect(lineShaft).toMatchObject({ verdict: 'fails', failingCount: 2 })
    expect(reducer?.thumbnail.hubs.map((hub) => hub.verdict)).toEqual(['fails', 'passes', 'passes'])
    expect(reducer?.thumbnail.sections.length).toBeGreaterThan(4)
    expect(reducer?.editedByName).toBe('Dina Reyes')
    expect(reducer?.peopleInIt).toEqual([])
  })

  it('keeps archived layouts apart', async () => {
    const layout = await create({ name: 'To be put away', from: { kind: 'blank' } })
    const archived = await designer.patch(`/api/layouts/${layout.id}`, { isArchived: true })
    expect(archived.body.isArchived).toBe(true)
    const ids = async (query: string) =>
      layoutListSchema
        .parse((await designer.get(`${listPath()}${query}`)).body)
        .layouts.map((each) => each.id)
    expect(await ids('')).not.toContain(layout.id)
    expect(await ids('?archived=true')).toEqual([layout.id])
    expect((await designer.get(`${listPath()}?archived=perhaps`)).status).toBe(400)
  })

  it('shows a new verdict after the document has changed', async () => {
    const layout = await create({ name: 'Changing', from: { kind: 'example', exampleId: 'gear-and-pulley' } })
    expect(layout.verdict).toBe('passes')
    const principal = await app.server.parts.accounts.getPrincipal({ cookie: designer.cookie })
    const outcome = await app.server.rooms.submitServerEdit({
      layoutId: layout.id,
      actor: principal!,
      label: 'Loosen the gear',
      operations: [
        {
          type: 'set',
          target: { kind: 'hub', id: 'G' },
          field: 'fit',
          before: null,
          value: { kind: 'limits', minInterferenceUm: 1, maxInterferenceUm: 4 },
        },
      ],
    })
    expect(['accepted', 'adjusted']).toContain(outcome.outcome)
    const { layouts } = layoutListSchema.parse((await designer.get(listPath())).body)
    const changed = layouts.find((each) => each.id === layout.id)
    expect(changed?.verdict).toBe('fails')
    expect(changed?.worstFinding).toMatch(/^Gear /)
  })
})

describe('a new layout', () => {
  it('starts blank', async () => {
    const layout = await create({ name: 'Pump shaft', project: ' Pumps ', from: { kind: 'blank' } })
    expect(layout).toMatchObject({ name: 'Pump shaft', project: 'Pumps', status: 'draft', revision: 0 })
    const view = await viewOf(layout.id)
    expect(view.document.name).toBe('Pump shaft')
    expect(view).toMatchObject({ role: 'designer', workspaceName: 'Cedar Line drives' })
  })

  it('starts from each example, and each example passes', async () => {
    const { examples } = exampleListSchema.parse((await designer.get('/api/examples')).body)
    expect(examples.map((example) => example.id)).toHaveLength(4)
    for (const example of examples) {
      const layout = await create({ from: { kind: 'example', exampleId: example.id } })
      expect([layout.name, layout.verdict, layout.worstFinding]).toEqual([example.name, 'passes', ''])
    }
    const unknown = await designer.post(listPath(), { from: { kind: 'example', exampleId: 'none' } })
    expect(unknown.status).toBe(404)
  })

  it('copies another, with its own name and an empty history', async () => {
    const copy = await create({ from: { kind: 'layout', layoutId: app.layoutIds[0] } })
    expect(copy.name).toMatch(/^Copy of Conveyor drive/)
    expect(copy.revision).toBe(0)
    const [from, to] = [await viewOf(app.layoutIds[0]!), await viewOf(copy.id)]
    expect({ ...to.document, name: from.document.name }).toEqual(from.document)
  })

  it('comes from a file, and exporting gives the same file back', async () => {
    const exported = await designer.get(`/api/layouts/${app.layoutIds[2]}/export`)
    expect(exported.headers.get('content-disposition')).toBe(
      'attachment; filename=Cartoning-machine-line-shaft.layout.json',
    )
    expect(exported.headers.get('x-content-type-options')).toBe('nosniff')
    const imported = await create({ from: { kind: 'file', content: JSON.parse(exported.text) } })
    const again = await designer.get(`/api/layouts/${imported.id}/export`)
    expect(again.text).toBe(exported.text)
  })

  it('is refused from a broken file, with each place that is wrong', async () => {
    const content = JSON.parse((await designer.get(`/api/layouts/${app.layoutIds[0]}/export`)).text)
    content.hubs[1].lengthMm = -4
    content.hubs[0].fit = { kind: 'iso286', hole: 'h7', shaft: 'u6' }
    const answer = await designer.post(listPath(), { from: { kind: 'file', content } })
    expect(answer.status).toBe(400)
    expect(Object.keys(answer.body.error.fields).sort()).toEqual(['hubs[0].fit.hole', 'hubs[1].lengthMm'])
  })

  it('cannot copy what its maker may not see', async () => {
    const outsider = await app.newPerson('Otto Outside', 'otto@elsewhere.example')
    const { id } = (await outsider.post('/api/workspaces', { name: 'Outside' })).body
    const answer = await outsider.post(`/api/workspaces/${id}/layouts`, {
      from: { kind: 'layout', layoutId: app.layoutIds[0] },
    })
    expect(answer.status).toBe(404)
  })
})

describe('the name', () => {
  it('changes by an edit with a revision of its own', async () => {
    const layout = await create({ name: 'Before', from: { kind: 'blank' } })
    const renamed = await designer.patch(`/api/layouts/${layout.id}`, { name: 'After', project: 'Fans' })
    expect(renamed.body).toMatchObject({ name: 'After', project: 'Fans', revision: 1 })
    expect((await viewOf(layout.id)).document.name).toBe('After')
    const again = await designer.patch(`/api/layouts/${layout.id}`, { name: 'After', project: '' })
    expect(again.body).toMatchObject({ revision: 1, project: null })
  })

  it.each([
    ['../../etc/passwd', 'etc-passwd'],
    ['a"; filename="b.exe', 'a-filename-b-exe'],
    ['Welle für Lüfter №1', 'Welle-fur-Lufter-No1'],
    ['轴', 'layout'],
  ])('%s makes a harmless file name', async (name, file) => {
    const layout = await create({ name, from: { kind: 'blank' } })
    const exported = await designer.get(`/api/layouts/${layout.id}/export`)
    expect(exported.headers.get('content-disposition')).toBe(`attachment; filename=${file}.layout.json`)
  })
})

describe('calculation over HTTP', () => {
  it('gives what the engine gives', async () => {
    const exported = await designer.get(`/api/layouts/${app.layoutIds[1]}/export`)
    const viewer = await app.signInAs('viewer')
    const answer = await viewer.post('/api/calculate', JSON.parse(exported.text))
    expect(answer.status).toBe(200)
    const { document } = await viewOf(app.layoutIds[1]!)
    expect(answer.body).toEqual(JSON.parse(JSON.stringify(recalculateLayout(document))))
  })

  it('refuses a file with the path of each problem', async () => {
    const answer = await designer.post('/api/calculate', { format: 'hubstead-layout', version: 2 })
    expect(answer.status).toBe(400)
    expect(answer.body.error.fields).toHaveProperty('version')
    expect(answer.body.error.fields).toHaveProperty('shaft')
  })
})
