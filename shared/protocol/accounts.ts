/** REST shapes for people, workspaces, invitations and sessions. Sign-in itself goes through /api/auth. */
import { z } from 'zod'
import { roleSchema } from './roles'

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
export const inviteBodySchema = z.strictObject({ email: z.email().max(254), role: roleSchema })
/** PATCH /api/workspaces/:workspaceId/members/:memberId */
export const changeRoleBodySchema = z.strictObject({ role: roleSchema })
// DELETE /api/workspaces/:workspaceId/members/:memberId -> 204
// DELETE /api/workspaces/:workspaceId/invitations/:invitationId -> 204

/** GET /api/invitations/:invitationId, signed in as the invited address. */
export const invitationViewSchema = invitationSchema.extend({ workspaceName: z.string() })
// POST /api/invitations/:invitationId/accept -> 200 { workspaceId }

/** POST /api/workspaces -> 201; the creator becomes admin. PATCH /api/workspaces/:id renames. */
export const createWorkspaceBodySchema = z.strictObject({ name: z.string().trim().min(1).max(80) })

/** GET /api/me/sessions; DELETE /api/me/sessions/:id -> 204; DELETE /api/me/sessions revokes the others. */
export const sessionViewSchema = z.strictObject({
  id: z.string(),
  createdAt: z.string(),
  lastSeenAt: z.string(),
  userAgent: z.string(),
  ipAddress: z.string(),
  isCurrent: z.boolean(),
})

/** GET /api/caught-mail: only while the local mail catcher runs. */
export const caughtMailSchema = z.strictObject({
  id: z.string(),
  at: z.string(),
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  links: z.array(z.string()),
})

export type Me = z.infer<typeof meSchema>
export type Member = z.infer<typeof memberSchema>
export type Invitation = z.infer<typeof invitationSchema>
export type InvitationView = z.infer<typeof invitationViewSchema>
export type People = z.infer<typeof peopleSchema>
export type SessionView = z.infer<typeof sessionViewSchema>
export type CaughtMail = z.infer<typeof caughtMailSchema>
