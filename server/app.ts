/** The HTTP side, built from injected parts: tests use the same app. */
import express, { type Express, type RequestHandler, type Router } from 'express'
import { accountsRouter } from './accounts/accounts.router'
import { signInRouter } from './accounts/sign-in.router'
import { authenticate } from './http/authenticate'
import { errorHandler, unknownRoute } from './http/error-handler'
import { type Health, healthRouter } from './http/health.router'
import { originCheck } from './http/origin-check'
import { jsonOnly } from './http/json-only'
import { requestLog } from './http/request-log'
import { securityHeaders } from './http/security-headers'
import { caughtMailRouter } from './mail/caught-mail.router'
import type { ServerParts } from './parts'

/** A layout of 200 hubs and 100 load cases is about half of this. */
const MAX_BODY = '2mb'

export interface AppContent {
  health: Health
  /** Those of the domains. Their paths are whole, so that a test can list every route. */
  routers: Router[]
  /** Serves the pages of the browser client. */
  client: RequestHandler
}

export function createApp(parts: ServerParts, { health, routers, client }: AppContent): Express {
  const { config, site, accounts, logger } = parts
  const app = express()
  app.disable('x-powered-by')
  app.disable('etag')
  app.set('trust proxy', config.trustedProxyHops)
  app.set('query parser', 'simple')

  app.use((request, _response, next) => {
    // Forwarding headers mean something only when we know who wrote them.
    if (config.trustedProxyHops === 0) {
      for (const name of Object.keys(request.headers))
        if (name.startsWith('x-forwarded-') || name === 'forwarded') delete request.headers[name]
    }
    next()
  })
  app.use(requestLog(logger))
  app.use(securityHeaders(site))
  app.use('/api', (_request, response, next) => {
    response.set('Cache-Control', 'no-store')
    next()
  })
  app.use('/api', originCheck(site))
  app.use('/api', jsonOnly)
  // No inflating: a decoder fed by strangers has been a way in before.
  app.use('/api', express.json({ inflate: false, limit: MAX_BODY, type: 'application/json' }))
  app.use('/api', authenticate(accounts))

  app.use(healthRouter(health))
  app.use(signInRouter(accounts.signIn))
  app.use(accountsRouter(accounts.service, accounts.signIn))
  app.use(caughtMailRouter(parts.catcher))
  for (const router of routers) app.use(router)

  app.use(client)
  app.use(unknownRoute)
  app.use(errorHandler)
  return app
}
