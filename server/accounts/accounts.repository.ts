import { createHash } from 'node:crypto'
import type { Role } from '@shared/protocol/roles'
import { dateToColumn } from '../database/codecs'
import type { Queries } from '../database/open-database'

export interface WorkspaceOfPerson {
  id: string
  name: string
  slug: string
  role: Role
}

export function workspacesOf(queries: Queries, userId: string): WorkspaceOfPerson[] {
  return queries.all(
    queries.kysely
      .selectFrom('member')
      .innerJoin('organization', 'organization.id', 'member.organization_id')
      .where('member.user_id', '=', userId)
      .select(['organization.id', 'organization.name', 'organization.slug', 'member.role'])
      .orderBy('organization.name'),
  )
}

export function rolesOf(queries: Queries, userId: string): Map<string, Role> {
  const rows = queries.all(
    queries.kysely.selectFrom('member').where('user_id', '=', userId).select(['organization_id', 'role']),
  )
  return new Map(rows.map((row) => [row.organization_id, row.role]))
}

export function membersOf(queries: Queries, workspaceId: string) {
  const rows = queries.all(
    queries.kysely
      .selectFrom('member')
      .innerJoin('user', 'user.id', 'member.user_id')
      .where('member.organization_id', '=', workspaceId)
      .select(['member.id', 'member.user_id', 'user.name', 'user.email', 'member.role', 'member.created_at'])
      .orderBy('user.name'),
  )
  return rows.map((row) => ({
    id: row.id,
    userId: row.user_id,
    name: row.name,
    email: row.email,
    role: row.role,
    joinedAt: row.created_at,
  }))
}

export function findMember(queries: Queries, memberId: string) {
  const row = queries.first(
    queries.kysely
      .selectFrom('member')
      .where('id', '=', memberId)
      .select(['id', 'organization_id', 'user_id', 'role']),
  )
  return row && { id: row.id, workspaceId: row.organization_id, userId: row.user_id, role: row.role }
}

export function countAdmins(queries: Queries, workspaceId: string): number {
  const row = queries.first(
    queries.kysely
      .selectFrom('member')
      .where('organization_id', '=', workspaceId)
      .where('role', '=', 'admin')
      .select((query) => query.fn.countAll<number>().as('count')),
  )
  return row?.count ?? 0
}

export interface InvitationRecord {
  id: string
  workspaceId: string
  workspaceName: string
  email: string
  role: Role
  status: 'pending' | 'accepted' | 'canceled' | 'rejected'
  expiresAt: string
  invitedByName: string
}

function selectInvitations(queries: Queries) {
  return queries.kysely
    .selectFrom('invitation')
    .innerJoin('user', 'user.id', 'invitation.inviter_id')
    .innerJoin('organization', 'organization.id', 'invitation.organization_id')
    .select([
      'invitation.id',
      'invitation.organization_id as workspaceId',
      'organization.name as workspaceName',
      'invitation.email',
      'invitation.role',
      'invitation.status',
      'invitation.expires_at as expiresAt',
      'user.name as invitedByName',
    ])
}

export function pendingInvitationsOf(queries: Queries, workspaceId: string): InvitationRecord[] {
  return queries.all(
    selectInvitations(queries)
      .where('invitation.organization_id', '=', workspaceId)
      .where('invitation.status', '=', 'pending')
      .orderBy('invitation.created_at', 'desc'),
  )
}

export function findInvitation(queries: Queries, invitationId: string): InvitationRecord | undefined {
  return queries.first(selectInvitations(queries).where('invitation.id', '=', invitationId))
}

export function sessionsOf(queries: Queries, userId: string, now: Date) {
  return queries.all(
    queries.kysely
      .selectFrom('session')
      .where('user_id', '=', userId)
      .where('expires_at', '>', dateToColumn(now))
      .select([
        'id',
        'created_at as createdAt',
        'updated_at as lastSeenAt',
        'user_agent as userAgent',
        'ip_address as ipAddress',
      ])
      .orderBy('updated_at', 'desc'),
  )
}

/** The secret of a session, needed to end it; it never leaves the accounts folder. */
export function sessionToken(queries: Queries, userId: string, sessionId: string): string | undefined {
  return queries.first(
    queries.kysely
      .selectFrom('session')
      .where('id', '=', sessionId)
      .where('user_id', '=', userId)
      .select('token'),
  )?.token
}

export function findSession(queries: Queries, sessionId: string) {
  return queries.first(
    queries.kysely
      .selectFrom('session')
      .innerJoin('user', 'user.id', 'session.user_id')
      .where('session.id', '=', sessionId)
      .select([
        'session.user_id as userId',
        'user.name',
        'user.email',
        'session.created_at as createdAt',
        'session.expires_at as expiresAt',
      ]),
  )
}

export function findWorkspace(queries: Queries, workspaceId: string) {
  return queries.first(
    queries.kysely.selectFrom('organization').where('id', '=', workspaceId).select(['id', 'name', 'slug']),
  )
}

export function userNames(queries: Queries, userIds: readonly string[]): Map<string, string> {
  const rows = queries.all(
    queries.kysely
      .selectFrom('user')
      .where('id', 'in', [...userIds])
      .select(['id', 'name']),
  )
  return new Map(rows.map((row) => [row.id, row.name]))
}

export function findUser(queries: Queries, userId: string) {
  return queries.first(queries.kysely.selectFrom('user').where('id', '=', userId).select(['name', 'email']))
}

/** Whom a link for a new password was sent to, while it is good. */
export function findPersonOfResetToken(queries: Queries, token: string) {
  const identifier = createHash('sha256').update(`reset-password:${token}`).digest('base64url')
  return queries.first(
    queries.kysely
      .selectFrom('verification')
      .innerJoin('user', 'user.id', 'verification.value')
      .where('verification.identifier', '=', identifier)
      .select(['user.name', 'user.email']),
  )
}
