/** The built browser client. Unknown paths get its page: the router of the client decides there. */
import { existsSync } from 'node:fs'
import path from 'node:path'
import express, { type RequestHandler, Router } from 'express'
import { compressedAssets } from './compressed-assets'
import { HttpError } from './http-error'

const YEAR_MS = 365 * 24 * 3600 * 1000

export function staticClient(clientDir: string): Router {
  const router = Router()
  // Vite puts a hash of the content into these names.
  const assets = express.static(path.join(clientDir, 'assets'), {
    immutable: true,
    maxAge: YEAR_MS,
    index: false,
  })
  router.use('/assets', compressedAssets(path.join(clientDir, 'assets')))
  router.use('/assets', assets)
  router.use(express.static(clientDir, { index: false, maxAge: 0 }))
  router.get('/{*path}', sendPage(path.join(clientDir, 'index.html')))
  return router
}

function sendPage(page: string): RequestHandler {
  return (request, response, next) => {
    // Only navigation gets the page; a missing file must not look like one.
    if (
      request.path.startsWith('/api/') ||
      path.basename(request.path).includes('.') ||
      !request.accepts('html')
    ) {
      next()
      return
    }
    if (!existsSync(page)) throw new HttpError('unavailable', 'The client is not built. Run: npm run build')
    response.set('Cache-Control', 'no-cache').sendFile(page)
  }
}
