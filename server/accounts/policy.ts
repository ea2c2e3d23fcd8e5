/**
 * Who may do what: the one place. Routes and socket events ask here; the workspace id always comes
 * from the stored row, never from the request.
 */
import type { LayoutStatus } from '@shared/protocol/layouts'
import { ROLES, type Role } from '@shared/protocol/roles'
import { forbidden, HttpError, notFound } from '../http/http-error'
import { type Principal, roleIn } from './principal'

/** The least role for each action; the roles above it may do it too. */
const LEAST_ROLE = {
  'layout:read': 'viewer',
  'layout:comment': 'viewer',
  'layout:export': 'designer',
  'layout:create': 'designer',
  'layout:edit': 'designer',
  /** Name, project and archive: they are on the list, not on the drawing. */
  'layout:organise': 'designer',
  'layout:askReview': 'designer',
  'layout:freeze': 'manager',
  'layout:nextRevision': 'manager',
  'release:read': 'viewer',
  'release:withdraw': 'manager',
  'inspection:record': 'shop',
  'library:read': 'viewer',
  'library:edit': 'manager',
  'people:read': 'viewer',
  'people:invite': 'admin',
  'people:changeRole': 'admin',
  'people:remove': 'admin',
  'workspace:rename': 'admin',
} as const satisfies Record<string, Role>

export type Action = keyof typeof LEAST_ROLE
export const ACTIONS = Object.keys(LEAST_ROLE) as Action[]

export interface Resource {
  workspaceId: string
  /** Of the layout, where the action concerns one. */
  status?: LayoutStatus
}

/** Frozen documents change for nobody; the next revision is a new draft. */
const NEEDS_OPEN_LAYOUT: ReadonlySet<Action> = new Set(['layout:edit', 'layout:askReview', 'layout:freeze'])
const isOpen = (status: LayoutStatus) => status === 'draft' || status === 'inReview'

export type Decision = 'allowed' | 'not-found' | 'forbidden' | 'frozen'

export function decide(principal: Principal, action: Action, resource: Resource): Decision {
  const role = roleIn(principal, resource.workspaceId)
  if (!role) return 'not-found'
  if (ROLES.indexOf(role) < ROLES.indexOf(LEAST_ROLE[action])) return 'forbidden'
  if (resource.status && !isOpen(resource.status) && NEEDS_OPEN_LAYOUT.has(action)) return 'frozen'
  return 'allowed'
}

export function can(principal: Principal, action: Action, resource: Resource): boolean {
  return decide(principal, action, resource) === 'allowed'
}

/** Throws what the person gets: nothing of another workspace exists for them. */
export function assertCan(principal: Principal, action: Action, resource: Resource): void {
  const decision = decide(principal, action, resource)
  switch (decision) {
    case 'allowed':
      return
    case 'not-found':
      throw notFound()
    case 'forbidden':
      throw forbidden()
    case 'frozen':
      throw new HttpError('frozen', 'This revision is released and no longer changes.')
  }
}
