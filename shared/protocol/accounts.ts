/** REST shapes for signing in, people, workspaces, invitations and sessions. */
import { z } from 'zod'
import { roleSchema } from './roles'

export const PASSWORD_MIN_LENGTH = 12
export const PASSWORD_MAX_LENGTH = 128

/** The server also refuses common passwords and ones that hold the person's or the product's name. */
export const passwordSchema = z
  .string()
  .min(PASSWORD_MIN_LENGTH, `At least ${PASSWORD_MIN_LENGTH} characters`)
  .max(PASSWORD_MAX_LENGTH, `At most ${PASSWORD_MAX_LENGTH} characters`)
export const personNameSchema = z
  .string()
  .trim()
  .min(1, 'Give a name')
  .max(80, 'At most 80 characters')
  // Names stand in mail headers and on release sheets.
  .regex(/^[^\p{Cc}\p{Cf}<>]*$/u, 'Use letters, digits, spaces and ordinary punctuation')
export const emailSchema = z.email('Give an e-mail address').max(254).toLowerCase()
/** A path of this site to return to after confirming, such as an invitation. */
const returnPathSchema = z
  .string()
  .max(200)
  .regex(/^\/(?![\/\\])[^\s\\]*$/, 'Must be a path of this site')

// All of these answer 204; errors use the one error shape. Nothing tells whether an address has an account.
/** POST /api/auth/sign-up/email: always 204; a mail with a confirmation link follows. */
export const signUpBodySchema = z.strictObject({
  name: personNameSchema,
  email: emailSchema,
  password: passwordSchema,
  next: returnPathSchema.optional(),
})
/**
 * POST /api/auth/sign-in/email: sets the session cookie. 401 wrong address or password, 403 the address
 * is not confirmed yet, 429 with Retry-After too many tries. Then GET /api/me.
 */
export const signInBodySchema = z.strictObject({
  email: z.string().trim().max(254),
  password: z.string().max(1_024),
})
// POST /api/auth/sign-out, no body.
/** POST /api/auth/verify-email with the token of the mail's link /confirm-email?token=…&next=… */
export const verifyEmailBodySchema = z.strictObject({ token: z.string().min(1).max(2_000) })
/** POST /api/auth/send-verification-email */
export const resendConfirmationBodySchema = z.strictObject({
  email: emailSchema,
  next: returnPathSchema.optional(),
})
/** POST /api/auth/request-password-reset: mails a link /reset-password?token=… */
export const forgotPasswordBodySchema = z.strictObject({ email: emailSchema })
/** POST /api/auth/reset-password: the token works once; every session of the account ends. */
export const resetPasswordBodySchema = z.strictObject({
  token: z.string().min(1).max(200),
  newPassword: passwordSchema,
})
/** POST /api/auth/change-password, signed in; the other sessions end. */
export const changePasswordBodySchema = z.strictObject({
  currentPassword: z.string().max(1_024),
  newPassword: passwordSchema,
})
/** PATCH /api/me -> me */
export const updateMeBodySchema = z.strictObject({ name: personNameSchema })

/** GET /api/me, 401 when signed out. */
export const meSchema = z.strictObject({
  user: z.strictObject({
    id: z.string(),
    name: z.string(),
    email: z.string(),
    emailVerified: z.boolean(),
  }),
  workspaces: z.array(
    z.strictObject({ id: z.string(), name: z.string(), slug: z.string(), role: roleSchema }),
  ),
})

/** GET /api/workspaces/:workspaceId/members */
export const memberSchema = z.strictObject({
  id: z.string(),
  userId: z.string(),
  name: z.string(),
  email: z.string(),
  role: roleSchema,
  joinedAt: z.string(),
})
export const invitationSchema = z.strictObject({
  id: z.string(),
  email: z.string(),
  role: roleSchema,
  status: z.enum(['pending', 'accepted', 'cancelled', 'rejected', 'expired']),
  expiresAt: z.string(),
  invitedByName: z.string(),
})
export const peopleSchema = z.strictObject({
  members: z.array(memberSchema),
  invitations: z.array(invitationSchema),
})

/** POST /api/workspaces/:workspaceId/invitations -> 201 invitation */
export const inviteBodySchema = z.strictObject({ email: emailSchema, role: roleSchema })
/** PATCH /api/workspaces/:workspaceId/members/:memberId */
export const changeRoleBodySchema = z.strictObject({ role: roleSchema })
// DELETE /api/workspaces/:workspaceId/members/:memberId -> 204
// DELETE /api/workspaces/:workspaceId/invitations/:invitationId -> 204

/** GET /api/invitations/:invitationId, signed in as the invited address. */
export const invitationViewSchema = invitationSchema.extend({ workspaceName: z.string() })
// POST /api/invitations/:invitationId/accept -> 200 { workspaceId }

/** POST /api/workspaces -> 201; the creator becomes admin. PATCH /api/workspaces/:id renames. */
export const createWorkspaceBodySchema = z.strictObject({ name: z.string().trim().min(1).max(80) })

/** One of GET /api/me/sessions; DELETE /api/me/sessions/:id -> 204; DELETE /api/me/sessions revokes the others. */
export const sessionViewSchema = z.strictObject({
  id: z.string(),
  createdAt: z.string(),
  lastSeenAt: z.string(),
  userAgent: z.string(),
  ipAddress: z.string(),
  isCurrent: z.boolean(),
})

/** GET /api/me/sessions */
export const sessionListSchema = z.strictObject({ sessions: z.array(sessionViewSchema) })

/** One of GET /api/caught-mail; 404 unless the local mail catcher runs. */
export const caughtMailSchema = z.strictObject({
  id: z.string(),
  at: z.string(),
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  links: z.array(z.string()),
})

/** GET /api/caught-mail, newest first. */
export const caughtMailListSchema = z.strictObject({ mails: z.array(caughtMailSchema) })

export type Me = z.infer<typeof meSchema>
export type Member = z.infer<typeof memberSchema>
export type Invitation = z.infer<typeof invitationSchema>
export type InvitationView = z.infer<typeof invitationViewSchema>
export type People = z.infer<typeof peopleSchema>
export type SessionView = z.infer<typeof sessionViewSchema>
export type CaughtMail = z.infer<typeof caughtMailSchema>
