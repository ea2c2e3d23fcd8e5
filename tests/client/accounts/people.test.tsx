// @vitest-environment jsdom
import { screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import type { Member } from '@shared/protocol/accounts'
import type { Role } from '@shared/protocol/roles'
import { type FakeAnswer, fakeApi, refusal } from '../../support/fake-api'
import { renderPage } from '../../support/render-page'

const member = (id: string, name: string, role: Role): Member => ({
  id,
  userId: `user-${id}`,
  name,
  email: `${id}@cedar-line.example`,
  role,
  joinedAt: '2026-09-01T08:00:00.000Z',
})

function openPeople(myRole: Role, changeAnswer: FakeAnswer = { status: 204 }) {
  const members = [member('ada', 'Ada Winter', 'admin'), member('sam', 'Sam Okoro', 'shop')]
  const api = fakeApi({
    'GET /api/me': {
      body: {
        user: { id: 'user-ada', name: 'Ada Winter', email: 'ada@cedar-line.example', emailVerified: true },
        workspaces: [{ id: 'w1', name: 'Cedar Line drives', slug: 'cedar-line', role: myRole }],
      },
    },
    'GET /api/workspaces/w1/members': () => ({ body: { members, invitations: [] } }),
    'PATCH /api/workspaces/w1/members/sam': (request) => {
      if (changeAnswer.status === 204)
        members[1] = member('sam', 'Sam Okoro', (request.body as { role: Role }).role)
      return changeAnswer
    },
  })
  renderPage('/w/w1/people')
  return api
}

const roleOfSam = async () => screen.findByLabelText<HTMLSelectElement>('Role of Sam Okoro')

describe('people', () => {
  it('lets an admin change a role and shows what the server then says', async () => {
    const api = openPeople('admin')
    await userEvent.selectOptions(await roleOfSam(), 'designer')

    expect(await screen.findByText('Sam Okoro is now designer')).toBeTruthy()
    expect(api.sent('PATCH', '/api/workspaces/w1/members/sam')[0]?.body).toEqual({ role: 'designer' })
    await waitFor(async () => expect((await roleOfSam()).value).toBe('designer'))
  })

  it('puts the old role back and says why where the server refuses', async () => {
    openPeople('admin', refusal(409, 'conflict', 'A workspace needs an administrator.'))
    await userEvent.selectOptions(await roleOfSam(), 'viewer')

    expect(await screen.findByText('A workspace needs an administrator.')).toBeTruthy()
    expect((await roleOfSam()).value).toBe('shop')
  })

  it('shows roles without means to change them to everyone else', async () => {
    openPeople('manager')
    const list = await screen.findByRole('list', { name: 'Members' })
    expect(within(list).getByText('Shop')).toBeTruthy()
    expect(screen.queryByLabelText('Role of Sam Okoro')).toBeNull()
    expect(screen.queryByRole('button', { name: /Remove|Invite/ })).toBeNull()
  })
})
