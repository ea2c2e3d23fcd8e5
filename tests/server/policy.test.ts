/** The roles as the product describes them, against the one policy function. */
import { describe, expect, it } from 'vitest'
import { type Action, ACTIONS, can, decide } from '@server/accounts/policy'
import type { Principal } from '@server/accounts/principal'
import { ROLES, type Role } from '@shared/protocol/roles'

const as = (role: Role): Principal => ({
  userId: 'u',
  name: 'U',
  email: 'u@cedar-line.example',
  sessionId: 's',
  roles: new Map([['w', role]]),
})

/** Each row adds to the one above it. */
const ADDED: Record<Role, Action[]> = {
  viewer: ['layout:read', 'layout:comment', 'release:read', 'library:read', 'people:read'],
  shop: ['inspection:record'],
  designer: ['layout:export', 'layout:create', 'layout:edit', 'layout:organise', 'layout:askReview'],
  manager: ['layout:freeze', 'layout:nextRevision', 'release:withdraw', 'library:edit'],
  admin: ['people:invite', 'people:changeRole', 'people:remove', 'workspace:rename'],
}

describe('the policy', () => {
  it.each(ROLES)('lets a %s do exactly what the description says', (role) => {
    const expected = ROLES.slice(0, ROLES.indexOf(role) + 1).flatMap((each) => ADDED[each])
    const allowed = ACTIONS.filter((action) => can(as(role), action, { workspaceId: 'w' }))
    expect(allowed.sort()).toEqual(expected.sort())
  })

  it('knows no other workspace', () => {
    for (const action of ACTIONS)
      expect(decide(as('admin'), action, { workspaceId: 'other' })).toBe('not-found')
  })

  it('lets nobody change what is frozen', () => {
    for (const status of ['released', 'withdrawn'] as const) {
      for (const action of ['layout:edit', 'layout:askReview', 'layout:freeze'] as const)
        expect(decide(as('admin'), action, { workspaceId: 'w', status })).toBe('frozen')
      expect(decide(as('admin'), 'layout:nextRevision', { workspaceId: 'w', status })).toBe('allowed')
      expect(decide(as('viewer'), 'layout:edit', { workspaceId: 'w', status })).toBe('forbidden')
    }
    expect(decide(as('designer'), 'layout:edit', { workspaceId: 'w', status: 'inReview' })).toBe('allowed')
  })
})
