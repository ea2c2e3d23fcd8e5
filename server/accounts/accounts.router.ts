import { Router } from 'express'
import {
  changeRoleBodySchema,
  createWorkspaceBodySchema,
  inviteBodySchema,
  updateMeBodySchema,
} from '@shared/protocol/accounts'
import { caller, signedIn } from '../http/authenticate'
import { limitRequests } from '../http/rate-limit'
import { parseBody, pathId } from '../http/validate'
import type { AccountsService } from './accounts.service'
import type { SignInService } from './sign-in.service'

/** Invitations are mails in our name. */
const INVITATIONS = { max: 60, windowMs: 60 * 60 * 1000 }
const WORKSPACES = { max: 20, windowMs: 60 * 60 * 1000 }

export function accountsRouter(accounts: AccountsService, signIn: SignInService): Router {
  const router = Router()

  router.get('/api/me', (request, response) => {
    response.json(accounts.me(signedIn(request)))
  })
  router.patch('/api/me', async (request, response) => {
    const principal = signedIn(request)
    const { name } = parseBody(updateMeBodySchema, request)
    await signIn.changeName(caller(request), name)
    response.json(accounts.me({ ...principal, name }))
  })

  router.get('/api/me/sessions', (request, response) => {
    response.json({ sessions: accounts.sessions(signedIn(request)) })
  })
  router.delete('/api/me/sessions', async (request, response) => {
    signedIn(request)
    await accounts.revokeOtherSessions(caller(request))
    response.status(204).end()
  })
  router.delete('/api/me/sessions/:sessionId', async (request, response) => {
    await accounts.revokeSession(caller(request), signedIn(request), pathId(request, 'sessionId'))
    response.status(204).end()
  })

  router.post('/api/workspaces', limitRequests(WORKSPACES), async (request, response) => {
    const principal = signedIn(request)
    const { name } = parseBody(createWorkspaceBodySchema, request)
    response.status(201).json(await accounts.createWorkspace(caller(request), principal, name))
  })
  router.patch('/api/workspaces/:workspaceId', async (request, response) => {
    const principal = signedIn(request)
    const workspaceId = pathId(request, 'workspaceId')
    const { name } = parseBody(createWorkspaceBodySchema, request)
    await accounts.renameWorkspace(caller(request), principal, workspaceId, name)
    response.status(204).end()
  })

  router.get('/api/workspaces/:workspaceId/members', (request, response) => {
    response.json(accounts.people(signedIn(request), pathId(request, 'workspaceId')))
  })
  router.patch('/api/workspaces/:workspaceId/members/:memberId', async (request, response) => {
    const principal = signedIn(request)
    const { role } = parseBody(changeRoleBodySchema, request)
    await accounts.setRole(
      caller(request),
      principal,
      pathId(request, 'workspaceId'),
      pathId(request, 'memberId'),
      role,
    )
    response.status(204).end()
  })
  router.delete('/api/workspaces/:workspaceId/members/:memberId', async (request, response) => {
    const principal = signedIn(request)
    await accounts.removeMember(
      caller(request),
      principal,
      pathId(request, 'workspaceId'),
      pathId(request, 'memberId'),
    )
    response.status(204).end()
  })

  router.post(
    '/api/workspaces/:workspaceId/invitations',
    limitRequests(INVITATIONS, (request) => signedIn(request).userId),
    async (request, response) => {
      const principal = signedIn(request)
      const invitation = parseBody(inviteBodySchema, request)
      const workspaceId = pathId(request, 'workspaceId')
      response.status(201).json(await accounts.invite(caller(request), principal, workspaceId, invitation))
    },
  )
  router.delete('/api/workspaces/:workspaceId/invitations/:invitationId', async (request, response) => {
    await accounts.withdrawInvitation(
      caller(request),
      signedIn(request),
      pathId(request, 'workspaceId'),
      pathId(request, 'invitationId'),
    )
    response.status(204).end()
  })

  router.get('/api/invitations/:invitationId', (request, response) => {
    response.json(accounts.viewInvitation(signedIn(request), pathId(request, 'invitationId')))
  })
  router.post('/api/invitations/:invitationId/accept', async (request, response) => {
    const principal = signedIn(request)
    const invitationId = pathId(request, 'invitationId')
    response.json(await accounts.acceptInvitation(caller(request), principal, invitationId))
  })

  return router
}
