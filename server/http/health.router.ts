import { Router } from 'express'
import { HttpError } from './http-error'

export interface Health {
  /** Throws or answers false when the database cannot be used. */
  isDatabaseUsable(): boolean
  areMigrationsApplied(): boolean
  version: string
}

export function healthRouter(health: Health): Router {
  const router = Router()
  router.get('/api/health', (_request, response) => {
    if (!health.isDatabaseUsable()) throw new HttpError('unavailable', 'The database does not answer.')
    if (!health.areMigrationsApplied()) throw new HttpError('unavailable', 'The database is not up to date.')
    response.set('Cache-Control', 'no-store').json({
      status: 'ok',
      database: 'reachable',
      migrations: 'applied',
      version: health.version,
    })
  })
  return router
}
