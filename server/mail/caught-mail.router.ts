import { Router } from 'express'
import { notFound } from '../http/http-error'
import type { MailCatcher } from './mail-catcher'

/** Open to everybody on purpose: it exists only where the catcher stands in for a mail server. */
export function caughtMailRouter(catcher: MailCatcher | null): Router {
  const router = Router()
  router.get('/api/caught-mail', (_request, response) => {
    if (!catcher) throw notFound()
    response.json({ mails: catcher.list() })
  })
  return router
}
