import { Router } from 'express'
import { freezeBodySchema, reviewBodySchema, withdrawBodySchema } from '@shared/protocol/releases'
import { signedIn } from '../http/authenticate'
import { parseBody, pathId } from '../http/validate'
import type { ReleasesService } from './releases.service'

export function releasesRouter(releases: ReleasesService): Router {
  const router = Router()

  router.get('/api/workspaces/:workspaceId/releases', (request, response) => {
    response.json(releases.desk(signedIn(request), pathId(request, 'workspaceId')))
  })
  router.get('/api/layouts/:layoutId/releases', (request, response) => {
    response.json({ releases: releases.ofLayout(signedIn(request), pathId(request, 'layoutId')) })
  })
  router.post('/api/layouts/:layoutId/review', async (request, response) => {
    const principal = signedIn(request)
    const { note = '' } = parseBody(reviewBodySchema, request)
    response.json(await releases.askReview(principal, pathId(request, 'layoutId'), note))
  })
  router.delete('/api/layouts/:layoutId/review', async (request, response) => {
    response.json(await releases.takeBackReview(signedIn(request), pathId(request, 'layoutId')))
  })
  router.post('/api/layouts/:layoutId/freeze', async (request, response) => {
    const principal = signedIn(request)
    const body = parseBody(freezeBodySchema, request)
    response.status(201).json(await releases.freeze(principal, pathId(request, 'layoutId'), body))
  })
  router.post('/api/layouts/:layoutId/next-revision', async (request, response) => {
    response.json(await releases.nextRevision(signedIn(request), pathId(request, 'layoutId')))
  })

  router.get('/api/releases/:releaseId', (request, response) => {
    response.json(releases.view(signedIn(request), pathId(request, 'releaseId')))
  })
  router.get('/api/releases/:releaseId/sheet.pdf', async (request, response) => {
    const { fileName, content } = await releases.sheet(signedIn(request), pathId(request, 'releaseId'))
    response.attachment(fileName).type('application/pdf').send(content)
  })
  router.get('/api/releases/:releaseId/document.json', (request, response) => {
    const { fileName, content } = releases.documentFile(signedIn(request), pathId(request, 'releaseId'))
    response.attachment(fileName).type('application/json').send(content)
  })
  router.post('/api/releases/:releaseId/withdraw', async (request, response) => {
    const principal = signedIn(request)
    const { reason } = parseBody(withdrawBodySchema, request)
    response.json(await releases.withdraw(principal, pathId(request, 'releaseId'), reason))
  })

  return router
}
