/** Workspaces, their people, invitations and a person's own sessions. */
import { randomBytes } from 'node:crypto'
import type { Logger } from 'pino'
import type { Invitation, InvitationView, Me, People, SessionView } from '@shared/protocol/accounts'
import type { Role } from '@shared/protocol/roles'
import type { AppDatabase } from '../database/open-database'
import { notFound } from '../http/http-error'
import type { Auth } from './auth'
import { lastAdmin, translateRefusals } from './auth-errors'
import type { Caller } from './caller'
import {
  countAdmins,
  findInvitation,
  findMember,
  type InvitationRecord,
  membersOf,
  pendingInvitationsOf,
  sessionsOf,
  sessionToken,
  workspacesOf,
} from './accounts.repository'
import { assertCan } from './policy'
import type { Principal } from './principal'
import type { RevocationHub } from './revocation'

export interface AccountsService {
  me(principal: Principal): Me
  createWorkspace(caller: Caller, principal: Principal, name: string): Promise<{ id: string; name: string }>
  renameWorkspace(caller: Caller, principal: Principal, workspaceId: string, name: string): Promise<void>
  people(principal: Principal, workspaceId: string): People
  invite(
    caller: Caller,
    principal: Principal,
    workspaceId: string,
    invitation: { email: string; role: Role },
  ): Promise<Invitation>
  withdrawInvitation(
    caller: Caller,
    principal: Principal,
    workspaceId: string,
    invitationId: string,
  ): Promise<void>
  viewInvitation(principal: Principal, invitationId: string): InvitationView
  acceptInvitation(
    caller: Caller,
    principal: Principal,
    invitationId: string,
  ): Promise<{ workspaceId: string }>
  setRole(
    caller: Caller,
    principal: Principal,
    workspaceId: string,
    memberId: string,
    role: Role,
  ): Promise<void>
  removeMember(caller: Caller, principal: Principal, workspaceId: string, memberId: string): Promise<void>
  sessions(principal: Principal): SessionView[]
  revokeSession(caller: Caller, principal: Principal, sessionId: string): Promise<void>
  revokeOtherSessions(caller: Caller): Promise<void>
}

export function createAccountsService(
  auth: Auth,
  database: AppDatabase,
  revocations: RevocationHub,
  logger: Logger,
): AccountsService {
  /** The member belongs to the workspace of the address, or does not exist. */
  function memberIn(workspaceId: string, memberId: string) {
    const member = findMember(database, memberId)
    if (!member || member.workspaceId !== workspaceId) throw notFound()
    return member
  }

  /** Only the invited address, once confirmed, learns that an invitation exists. */
  function invitationFor(principal: Principal, invitationId: string): InvitationRecord {
    const invitation = findInvitation(database, invitationId)
    if (!invitation || invitation.email !== principal.email.toLowerCase()) throw notFound()
    return invitation
  }

  return {
    me(principal) {
      return {
        // A session exists only after confirmation.
        user: { id: principal.userId, name: principal.name, email: principal.email, emailVerified: true },
        workspaces: workspacesOf(database, principal.userId),
      }
    },

    async createWorkspace(caller, principal, name) {
      const created = await translateRefusals(
        auth.api.createOrganization({ headers: caller, body: { name, slug: slugFor(name) } }),
      )
      revocations.announce({
        kind: 'joined',
        userId: principal.userId,
        workspaceId: created.id,
        role: 'admin',
      })
      return { id: created.id, name: created.name }
    },

    async renameWorkspace(caller, principal, workspaceId, name) {
      assertCan(principal, 'workspace:rename', { workspaceId })
      await translateRefusals(
        auth.api.updateOrganization({
          headers: caller,
          body: { organizationId: workspaceId, data: { name } },
        }),
      )
    },

    people(principal, workspaceId) {
      assertCan(principal, 'people:read', { workspaceId })
      return {
        members: membersOf(database, workspaceId),
        invitations: pendingInvitationsOf(database, workspaceId).map(invitationView),
      }
    },

    async invite(caller, principal, workspaceId, { email, role }) {
      assertCan(principal, 'people:invite', { workspaceId })
      const created = await translateRefusals(
        auth.api.createInvitation({
          headers: caller,
          // The package's types list its own default roles as well; ours are a part of them.
          body: { email, role, organizationId: workspaceId },
        }),
      )
      logger.info({ userId: principal.userId, workspaceId, role }, 'invited')
      const invitation = findInvitation(database, created.id)
      if (!invitation) throw notFound()
      return invitationView(invitation)
    },

    async withdrawInvitation(caller, principal, workspaceId, invitationId) {
      assertCan(principal, 'people:invite', { workspaceId })
      const invitation = findInvitation(database, invitationId)
      if (!invitation || invitation.workspaceId !== workspaceId) throw notFound()
      await translateRefusals(auth.api.cancelInvitation({ headers: caller, body: { invitationId } }))
    },

    viewInvitation(principal, invitationId) {
      const invitation = invitationFor(principal, invitationId)
      return { ...invitationView(invitation), workspaceName: invitation.workspaceName }
    },

    async acceptInvitation(caller, principal, invitationId) {
      const { workspaceId, role } = invitationFor(principal, invitationId)
      await translateRefusals(auth.api.acceptInvitation({ headers: caller, body: { invitationId } }))
      logger.info({ userId: principal.userId, workspaceId, role }, 'joined')
      revocations.announce({ kind: 'joined', userId: principal.userId, workspaceId, role })
      return { workspaceId }
    },

    async setRole(caller, principal, workspaceId, memberId, role) {
      assertCan(principal, 'people:changeRole', { workspaceId })
      const member = memberIn(workspaceId, memberId)
      if (member.role === 'admin' && role !== 'admin' && countAdmins(database, workspaceId) === 1)
        throw lastAdmin()
      await translateRefusals(
        auth.api.updateMemberRole({ headers: caller, body: { memberId, role, organizationId: workspaceId } }),
      )
      logger.info({ userId: principal.userId, workspaceId, memberId, role }, 'role changed')
    },

    async removeMember(caller, principal, workspaceId, memberId) {
      assertCan(principal, 'people:remove', { workspaceId })
      const member = memberIn(workspaceId, memberId)
      if (member.role === 'admin' && countAdmins(database, workspaceId) === 1) throw lastAdmin()
      await translateRefusals(
        auth.api.removeMember({
          headers: caller,
          body: { memberIdOrEmail: memberId, organizationId: workspaceId },
        }),
      )
      logger.info({ userId: principal.userId, workspaceId, memberId }, 'member removed')
    },

    sessions(principal) {
      return sessionsOf(database, principal.userId, new Date()).map((session) => ({
        ...session,
        userAgent: session.userAgent ?? '',
        ipAddress: session.ipAddress ?? '',
        isCurrent: session.id === principal.sessionId,
      }))
    },

    async revokeSession(caller, principal, sessionId) {
      const token = sessionToken(database, principal.userId, sessionId)
      if (!token) throw notFound()
      await translateRefusals(auth.api.revokeSession({ headers: caller, body: { token } }))
    },

    async revokeOtherSessions(caller) {
      await translateRefusals(auth.api.revokeOtherSessions({ headers: caller }))
    },
  }
}

function invitationView(record: InvitationRecord): Invitation {
  const isExpired = record.status === 'pending' && new Date(record.expiresAt) <= new Date()
  return {
    id: record.id,
    email: record.email,
    role: record.role,
    status: isExpired ? 'expired' : record.status === 'canceled' ? 'cancelled' : record.status,
    expiresAt: record.expiresAt,
    invitedByName: record.invitedByName,
  }
}

/** Unique without asking: two workspaces may carry one name. */
function slugFor(name: string): string {
  const words = name
    .toLowerCase()
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
  return `${words || 'workspace'}-${randomBytes(4).toString('hex')}`
}
