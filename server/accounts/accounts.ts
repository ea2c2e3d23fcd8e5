/**
 * Everything the rest of the server knows about people. Another sign-in package, or none, can stand
 * behind this interface.
 */
import type { Role } from '@shared/protocol/roles'
import type { AppDatabase } from '../database/open-database'
import { type AccountsService, createAccountsService } from './accounts.service'
import { type AuthParts, createAuth } from './auth'
import type { Principal } from './principal'
import { findUser, rolesOf } from './accounts.repository'
import { createPrincipalResolver, type PrincipalResolver } from './resolve-principal'
import type { RevocationHub } from './revocation'
import { createSignInService, type SignInService } from './sign-in.service'

export interface Accounts extends PrincipalResolver, Pick<RevocationHub, 'onRevoked'> {
  service: AccountsService
  signIn: SignInService
  /** For the demo data: an account whose address needs no confirming. */
  createConfirmedPerson(person: { name: string; email: string; password: string }): Promise<string>
  createWorkspaceFor(adminUserId: string, name: string, slug: string): Promise<string>
  addMember(workspaceId: string, userId: string, role: Role): Promise<void>
  /** For work done in somebody's name without a request, such as the demo data. */
  principalOf(userId: string): Principal | null
  close(): void
}

export interface AccountsParts extends AuthParts {
  database: AppDatabase
}

export function createAccounts(parts: AccountsParts): Accounts {
  const { database, revocations, logger } = parts
  const auth = createAuth(parts)
  return {
    ...createPrincipalResolver(auth, database),
    onRevoked: (listener) => revocations.onRevoked(listener),
    service: createAccountsService(auth, database, revocations, logger),
    signIn: createSignInService(auth, database, logger),
    async createConfirmedPerson({ name, email, password }) {
      const context = await auth.$context
      const user = await context.internalAdapter.createUser(
        { name, email, emailVerified: true },
        { method: 'email-password' },
      )
      await context.internalAdapter.linkAccount({
        userId: user.id,
        providerId: 'credential',
        accountId: user.id,
        password: await context.password.hash(password),
      })
      return user.id
    },
    async createWorkspaceFor(adminUserId, name, slug) {
      const created = await auth.api.createOrganization({ body: { name, slug, userId: adminUserId } })
      return created.id
    },
    async addMember(workspaceId, userId, role) {
      await auth.api.addMember({ body: { organizationId: workspaceId, userId, role } })
      revocations.announce({ kind: 'joined', userId, workspaceId, role })
    },
    principalOf(userId) {
      const user = findUser(database, userId)
      return user ? { ...user, userId, sessionId: '', roles: rolesOf(database, userId) } : null
    },
    close: () => auth.handle.close(),
  }
}
