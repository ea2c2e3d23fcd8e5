import { describe, expect, it } from 'vitest'
import { arrangeLayouts, type LayoutFilter, projectsOf } from '@/features/layouts/arrange-layouts'
import { layoutSummary } from '../../support/layout-summary'

const all: LayoutFilter = { search: '', status: 'all', project: null, sorting: 'edited' }
const layouts = [
  layoutSummary({ id: 'a', name: 'Shaft 10', editedAt: '2026-11-01T00:00:00.000Z', failingCount: 1 }),
  layoutSummary({ id: 'b', name: 'Shaft 2', project: 'Mill', editedAt: '2026-11-03T00:00:00.000Z' }),
  layoutSummary({
    id: 'c',
    name: 'Shaft 1',
    project: 'Press',
    editedAt: '2026-11-04T00:00:00.000Z',
    failingCount: 4,
  }),
  layoutSummary({ id: 'd', name: 'Shaft 3', project: 'Mill', editedAt: '2026-11-02T00:00:00.000Z' }),
]
const ids = (filter: Partial<LayoutFilter>) =>
  arrangeLayouts(layouts, { ...all, ...filter }).map(({ project, layouts: members }) => [
    project,
    members.map((layout) => layout.id).join(''),
  ])

describe('arranging layouts', () => {
  it('puts the project with the latest edit first and layouts without project last', () => {
    expect(ids({})).toEqual([
      ['Press', 'c'],
      ['Mill', 'bd'],
      [null, 'a'],
    ])
  })

  it('orders names with numbers as people read them, and by failing findings', () => {
    expect(ids({ sorting: 'name', project: 'Mill' })).toEqual([['Mill', 'bd']])
    const flat = [...layouts].map((layout) => ({ ...layout, project: null }))
    const order = (sorting: LayoutFilter['sorting']) =>
      arrangeLayouts(flat, { ...all, sorting }).flatMap((group) => group.layouts.map((layout) => layout.id))
    expect(order('name')).toEqual(['c', 'b', 'd', 'a'])
    expect(order('verdict')).toEqual(['c', 'a', 'b', 'd'])
  })

  it('tells "without project" from "all projects"', () => {
    expect(ids({ project: '' })).toEqual([[null, 'a']])
    expect(projectsOf(layouts)).toEqual(['Mill', 'Press'])
  })
})
