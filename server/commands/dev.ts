/** `npm run dev`: server and client on one port; the client reloads as its files change. */
import { readFileSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { Router } from 'express'
import { createServer as createVite } from 'vite'
import { readConfig } from '../config'
import { startServer } from '../index'
import { runUntilStopped } from './run-until-stopped'

const ROOT = fileURLToPath(new URL('../..', import.meta.url))

await runUntilStopped(async () => {
  const config = readConfig(process.env)
  const client = Router()
  const server = await startServer(config, { client })
  const vite = await createVite({
    root: ROOT,
    appType: 'custom',
    // Reload messages share the port; ours and Vite's sockets tell each other apart by path.
    server: { middlewareMode: true, hmr: { server: server.httpServer, path: '/vite-hmr' } },
  })
  client.use((request, response, next) => {
    // Only here: Vite puts inline scripts and styles into the page.
    response.removeHeader('Content-Security-Policy')
    if (request.path.startsWith('/api/')) next()
    else vite.middlewares(request, response, next)
  })
  client.get('/{*path}', async (request, response, next) => {
    if (request.path.startsWith('/api/')) {
      next()
      return
    }
    const page = readFileSync(path.join(ROOT, 'index.html'), 'utf8')
    response.type('html').send(await vite.transformIndexHtml(request.originalUrl, page))
  })
  const close = server.close
  return {
    ...server,
    close: async () => {
      await vite.close()
      await close()
    },
  }
})
