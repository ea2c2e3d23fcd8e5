/** `npm run dev`: server and client on one port; the client reloads as its files change. */
import { readFileSync } from 'node:fs'
import type { Server } from 'node:http'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { type RequestHandler, Router } from 'express'
import { createServer as createVite, type ViteDevServer } from 'vite'
import { readConfig } from '../config'
import { startServer } from '../index'
import { runUntilStopped } from './run-until-stopped'

const ROOT = fileURLToPath(new URL('../..', import.meta.url))

await runUntilStopped(async () => {
  let vite: ViteDevServer | null = null
  const server = await startServer(readConfig(process.env), {
    client: async (httpServer) => {
      vite = await createDevServer(httpServer)
      return devClient(vite)
    },
  })
  return {
    ...server,
    close: async () => {
      await vite?.close()
      await server.close()
    },
  }
})

function createDevServer(httpServer: Server): Promise<ViteDevServer> {
  return createVite({
    root: ROOT,
    appType: 'custom',
    // Reload messages share the port; ours and Vite's sockets tell each other apart by path.
    server: { middlewareMode: true, hmr: { server: httpServer, path: '/vite-hmr' } },
  })
}

function devClient(vite: ViteDevServer): RequestHandler {
  const router = Router()
  router.use((request, response, next) => {
    if (request.path.startsWith('/api/')) {
      next('router')
      return
    }
    // Only here: Vite puts inline scripts and styles into the page.
    response.removeHeader('Content-Security-Policy')
    next()
  })
  router.use(vite.middlewares)
  router.get('/{*path}', async (request, response) => {
    const page = readFileSync(path.join(ROOT, 'index.html'), 'utf8')
    response.type('html').send(await vite.transformIndexHtml(request.originalUrl, page))
  })
  return router
}
