import { Router } from 'express'
import { z } from 'zod'
import { createLayoutBodySchema, updateLayoutBodySchema } from '@shared/protocol/layouts'
import { signedIn } from '../http/authenticate'
import { parseBody, pathId, validate } from '../http/validate'
import type { LayoutsService } from './layouts.service'

const listQuerySchema = z.strictObject({ archived: z.enum(['true', 'false']).default('false') })

export function layoutsRouter(layouts: LayoutsService): Router {
  const router = Router()

  router.get('/api/workspaces/:workspaceId/layouts', (request, response) => {
    const principal = signedIn(request)
    const { archived } = validate(listQuerySchema, request.query)
    response.json({
      layouts: layouts.list(principal, pathId(request, 'workspaceId'), archived === 'true'),
    })
  })
  router.post('/api/workspaces/:workspaceId/layouts', (request, response) => {
    const principal = signedIn(request)
    const workspaceId = pathId(request, 'workspaceId')
    const body = parseBody(createLayoutBodySchema, request)
    response.status(201).json(layouts.create(principal, workspaceId, body))
  })

  router.get('/api/layouts/:layoutId', (request, response) => {
    response.json(layouts.view(signedIn(request), pathId(request, 'layoutId')))
  })
  router.patch('/api/layouts/:layoutId', async (request, response) => {
    const principal = signedIn(request)
    const body = parseBody(updateLayoutBodySchema, request)
    response.json(await layouts.update(principal, pathId(request, 'layoutId'), body))
  })
  router.get('/api/layouts/:layoutId/people', (request, response) => {
    response.json({ people: layouts.people(signedIn(request), pathId(request, 'layoutId')) })
  })
  router.get('/api/layouts/:layoutId/export', (request, response) => {
    const { fileName, content } = layouts.exportFile(signedIn(request), pathId(request, 'layoutId'))
    response.attachment(fileName).type('application/json').send(content)
  })

  router.get('/api/examples', (request, response) => {
    signedIn(request)
    response.json({ examples: layouts.examples() })
  })

  return router
}
