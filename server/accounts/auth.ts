/**
 * The sign-in package, configured. Only files of this folder see it, and its HTTP handler is not
 * mounted: our routes call the few functions we use, so nothing else of it can be reached, one
 * origin check and one error shape hold everywhere, and no session token gets into a body.
 */
import { hash, verify } from '@node-rs/argon2'
import { type BetterAuthOptions, betterAuth } from 'better-auth'
import { createAccessControl } from 'better-auth/plugins/access'
import { organization } from 'better-auth/plugins/organization'
import { defaultStatements } from 'better-auth/plugins/organization/access'
import { Kysely, SqliteDialect } from 'kysely'
import type { Logger } from 'pino'
import { PASSWORD_MAX_LENGTH, PASSWORD_MIN_LENGTH } from '@shared/protocol/accounts'
import type { Role } from '@shared/protocol/roles'
import { openHandle } from '../database/open-database'
import type { Site } from '../http/origin-check'
import type { Mailer } from '../mail/mailer'
import {
  alreadyRegisteredMail,
  confirmationMail,
  invitationMail,
  passwordChangedMail,
  resetPasswordMail,
} from '../mail/templates'
import type { RevocationHub } from './revocation'

export const IDLE_LIFETIME_S = 7 * 24 * 3600
/** However busy, a session ends after this; see resolve-principal.ts. */
export const ABSOLUTE_LIFETIME_MS = 30 * 24 * 3600 * 1000
const SESSION_REFRESH_S = 10 * 60
const INVITATION_LIFETIME_S = 7 * 24 * 3600
const CONFIRMATION_LIFETIME_S = 24 * 3600
const RESET_LIFETIME_S = 3600
const MAX_MEMBERS = 500
const MAX_WORKSPACES_PER_PERSON = 20

/** We write it ourselves from the socket; what a client sends under this name never arrives here. */
export const CLIENT_ADDRESS_HEADER = 'x-real-client'

/** OWASP's least for argon2id: 19 MiB, two passes, one lane. */
const ARGON2 = { memoryCost: 19 * 1024, timeCost: 2, parallelism: 1 }

export interface AuthParts {
  databaseFile: string
  site: Site
  sessionSecret: string
  mailer: Mailer
  revocations: RevocationHub
  logger: Logger
}

const access = createAccessControl(defaultStatements)
const nothing = access.newRole({ organization: [], member: [], invitation: [], team: [], ac: [] })
const everything = access.newRole({
  organization: ['update'],
  member: ['create', 'update', 'delete'],
  invitation: ['create', 'cancel'],
  team: [],
  ac: [],
})
/** What the package itself lets them do to people; layouts are the policy's matter. */
const roles = {
  viewer: nothing,
  shop: nothing,
  designer: nothing,
  manager: nothing,
  admin: everything,
} satisfies Record<Role, unknown>

/** The names of our tables' columns. */
const timestamps = { createdAt: 'created_at', updatedAt: 'updated_at' }
const accountColumns = {
  accountId: 'account_id',
  providerId: 'provider_id',
  userId: 'user_id',
  accessToken: 'access_token',
  refreshToken: 'refresh_token',
  idToken: 'id_token',
  accessTokenExpiresAt: 'access_token_expires_at',
  refreshTokenExpiresAt: 'refresh_token_expires_at',
  ...timestamps,
}
const sessionColumns = {
  expiresAt: 'expires_at',
  ipAddress: 'ip_address',
  userAgent: 'user_agent',
  userId: 'user_id',
  ...timestamps,
}

/** `__Host-` binds the cookie to this host and to https; plain http on loopback has neither. */
export const sessionCookieName = (site: Site) => (site.isSecure ? '__Host-hubstead' : 'hubstead_session')

export function createAuth(parts: AuthParts) {
  const { site, mailer, revocations, logger } = parts
  // A handle of its own: the package awaits between its statements, our transactions never do.
  const handle = openHandle(parts.databaseFile)
  const address = (path: string, query: Record<string, string | undefined>) => {
    const url = new URL(path, site.publicUrl)
    for (const [name, value] of Object.entries(query)) if (value) url.searchParams.set(name, value)
    return url.href
  }
  const confirmAddress = (token: string, packageUrl: string) => {
    const next = new URL(packageUrl).searchParams.get('callbackURL')
    return address('/confirm-email', { token, next: next && next !== '/' ? next : undefined })
  }

  const options = {
    baseURL: site.publicUrl,
    basePath: '/api/auth',
    secret: parts.sessionSecret,
    trustedOrigins: [...site.allowedOrigins],
    telemetry: { enabled: false },
    logger: {
      level: 'error',
      log: (_level, message) => {
        logger.error({ part: 'accounts' }, message)
      },
    },
    database: {
      db: new Kysely<unknown>({ dialect: new SqliteDialect({ database: handle }) }),
      type: 'sqlite',
      // Its transactions would stay open across password hashing and starve every other writer.
      transaction: false,
    },
    user: { fields: { emailVerified: 'email_verified', ...timestamps } },
    account: { fields: accountColumns },
    // Whoever reads the database must not be able to set a password with what stands there.
    verification: { fields: { expiresAt: 'expires_at', ...timestamps }, storeIdentifier: 'hashed' },
    session: {
      fields: sessionColumns,
      expiresIn: IDLE_LIFETIME_S,
      updateAge: SESSION_REFRESH_S,
      cookieCache: { enabled: false },
    },
    // Our own limits stand before every call: see sign-in-limits.ts.
    rateLimit: { enabled: false },
    emailAndPassword: {
      enabled: true,
      autoSignIn: false,
      requireEmailVerification: true,
      minPasswordLength: PASSWORD_MIN_LENGTH,
      maxPasswordLength: PASSWORD_MAX_LENGTH,
      resetPasswordTokenExpiresIn: RESET_LIFETIME_S,
      revokeSessionsOnPasswordReset: true,
      password: {
        hash: (password) => hash(password, ARGON2),
        verify: ({ hash: stored, password }) => verify(stored, password),
      },
      sendResetPassword: async ({ user, token }) => {
        mailer.sendMail({
          to: user.email,
          ...resetPasswordMail(user.name, address('/reset-password', { token })),
        })
      },
      onPasswordReset: async ({ user }) => {
        mailer.sendMail({
          to: user.email,
          ...passwordChangedMail(user.name, address('/forgotten-password', {})),
        })
      },
      onExistingUserSignUp: async ({ user }) => {
        mailer.sendMail({ to: user.email, ...alreadyRegisteredMail(user.name, address('/sign-in', {})) })
      },
    },
    emailVerification: {
      sendOnSignUp: true,
      autoSignInAfterVerification: false,
      expiresIn: CONFIRMATION_LIFETIME_S,
      sendVerificationEmail: async ({ user, token, url }) => {
        mailer.sendMail({ to: user.email, ...confirmationMail(user.name, confirmAddress(token, url)) })
      },
    },
    databaseHooks: {
      session: {
        delete: {
          after: async (session) => {
            revocations.announce({ kind: 'session', userId: session.userId, sessionId: session.id })
          },
        },
      },
    },
    advanced: {
      cookiePrefix: 'hubstead',
      // It would prefix our `__Host-` name with `__Secure-`.
      useSecureCookies: false,
      defaultCookieAttributes: { httpOnly: true, sameSite: 'lax', secure: site.isSecure, path: '/' },
      cookies: { session_token: { name: sessionCookieName(site) } },
      ipAddress: { ipAddressHeaders: [CLIENT_ADDRESS_HEADER] },
      disableOriginCheck: false,
    },
    plugins: [
      organization({
        ac: access,
        roles,
        creatorRole: 'admin',
        requireEmailVerificationOnInvitation: true,
        cancelPendingInvitationsOnReInvite: true,
        invitationExpiresIn: INVITATION_LIFETIME_S,
        membershipLimit: MAX_MEMBERS,
        organizationLimit: MAX_WORKSPACES_PER_PERSON,
        disableOrganizationDeletion: true,
        schema: {
          session: { fields: { activeOrganizationId: 'active_organization_id' } },
          organization: { fields: { createdAt: 'created_at' } },
          member: {
            fields: { organizationId: 'organization_id', userId: 'user_id', createdAt: 'created_at' },
          },
          invitation: {
            fields: {
              organizationId: 'organization_id',
              inviterId: 'inviter_id',
              expiresAt: 'expires_at',
              createdAt: 'created_at',
            },
          },
        },
        sendInvitationEmail: async ({ id, email, role, inviter, organization: workspace }) => {
          const url = address(`/invitation/${id}`, {})
          mailer.sendMail({
            to: email,
            ...invitationMail(inviter.user.name, workspace.name, role as Role, url),
          })
        },
        organizationHooks: {
          afterRemoveMember: async ({ member }) => {
            revocations.announce({
              kind: 'membership',
              userId: member.userId,
              workspaceId: member.organizationId,
            })
          },
          afterUpdateMemberRole: async ({ member }) => {
            revocations.announce({
              kind: 'role',
              userId: member.userId,
              workspaceId: member.organizationId,
              role: member.role as Role,
            })
          },
        },
      }),
    ],
  } satisfies BetterAuthOptions

  return { ...betterAuth(options), handle }
}

export type Auth = ReturnType<typeof createAuth>
