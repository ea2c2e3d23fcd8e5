// @vitest-environment jsdom
import { screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import type { Role } from '@shared/protocol/roles'
import { fakeApi, refusal } from '../../support/fake-api'
import { layoutSummary } from '../../support/layout-summary'
import { renderPage } from '../../support/render-page'

const layouts = [
  layoutSummary({
    id: 'l1',
    name: 'Intermediate shaft',
    project: 'Reducer R40',
    status: 'draft',
    failingCount: 2,
  }),
  layoutSummary({ id: 'l2', name: 'Camshaft', status: 'inReview', editedByName: 'Tomas Berg' }),
  layoutSummary({ id: 'l3', name: 'Line shaft', status: 'released', editedAt: '2026-11-30T08:00:00.000Z' }),
]

function openLayouts(role: Role, address = '/w/w1/layouts') {
  const api = fakeApi({
    'GET /api/me': {
      body: {
        user: { id: 'u1', name: 'Dina Reyes', email: 'dina@cedar-line.example', emailVerified: true },
        workspaces: [{ id: 'w1', name: 'Cedar Line drives', slug: 'cedar-line', role }],
      },
    },
    'GET /api/workspaces/w1/layouts': { body: { layouts } },
    'GET /api/workspaces/w1/layouts?archived=true': { body: { layouts: [] } },
    'POST /api/workspaces/w1/layouts': {
      status: 201,
      body: layoutSummary({ id: 'l9', name: 'Camshaft (copy)' }),
    },
    'PATCH /api/layouts/l2': refusal(403, 'forbidden', 'Your role does not allow this.'),
  })
  renderPage(address)
  return api
}

const shownNames = () => screen.queryAllByRole('article').map((card) => card.getAttribute('aria-label'))

describe('layouts page', () => {
  it('filters by status and by every word of the search', async () => {
    openLayouts('designer')
    await screen.findByRole('article', { name: 'Camshaft' })

    await userEvent.selectOptions(screen.getByLabelText('Status'), 'inReview')
    expect(shownNames()).toEqual(['Camshaft'])

    await userEvent.selectOptions(screen.getByLabelText('Status'), 'all')
    await userEvent.type(screen.getByLabelText('Search layouts'), 'r40 shaft')
    expect(shownNames()).toEqual(['Intermediate shaft'])

    await userEvent.type(screen.getByLabelText('Search layouts'), ' nothing')
    expect(screen.getByText('Nothing matches')).toBeTruthy()
    await userEvent.click(screen.getByRole('button', { name: 'Clear search and filters' }))
    expect(shownNames()).toHaveLength(3)
  })

  it('takes the filter from the address', async () => {
    openLayouts('viewer', '/w/w1/layouts?status=released')
    await screen.findByRole('article', { name: 'Line shaft' })
    expect(shownNames()).toEqual(['Line shaft'])
  })

  it('says the verdict in words', async () => {
    openLayouts('viewer')
    const card = await screen.findByRole('article', { name: 'Intermediate shaft' })
    expect(within(card).getByText('Fails')).toBeTruthy()
    expect(within(card).getByText('and 1 more')).toBeTruthy()
    expect(within(screen.getByRole('article', { name: 'Camshaft' })).getByText('Passes')).toBeTruthy()
  })

  it('duplicates by the menu, and shows a refusal instead of swallowing it', async () => {
    const api = openLayouts('designer')
    await screen.findByRole('article', { name: 'Camshaft' })

    await userEvent.click(screen.getByRole('button', { name: 'Actions for Camshaft' }))
    await userEvent.click(screen.getByRole('menuitem', { name: 'Duplicate' }))
    expect(await screen.findByText('“Camshaft (copy)” was made')).toBeTruthy()
    expect(api.sent('POST', '/api/workspaces/w1/layouts')[0]?.body).toEqual({
      from: { kind: 'layout', layoutId: 'l2' },
    })

    await userEvent.click(screen.getByRole('button', { name: 'Actions for Camshaft' }))
    await userEvent.click(screen.getByRole('menuitem', { name: 'Archive' }))
    expect(await screen.findByText('Your role does not allow this.')).toBeTruthy()
  })

  it('shows a viewer no way to change anything', async () => {
    openLayouts('viewer')
    await screen.findByRole('article', { name: 'Camshaft' })
    expect(screen.queryByRole('button', { name: /New layout|Import|Actions for/ })).toBeNull()
  })
})
