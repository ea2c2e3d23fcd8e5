/**
 * Sends the client's scripts and styles compressed. Each file is compressed once, when it is first asked
 * for: their names carry a hash of their content, so they never change.
 */
import { readFile } from 'node:fs/promises'
import path from 'node:path'
import { promisify } from 'node:util'
import { constants, gzip } from 'node:zlib'
import type { RequestHandler } from 'express'

const gzipAsync = promisify(gzip)
const YEAR_S = 365 * 24 * 3600
const COMPRESSIBLE = /^[\w.-]+\.(?:js|css)$/

export function compressedAssets(assetsDir: string): RequestHandler {
  const compressed = new Map<string, Promise<Buffer>>()

  const compress = (name: string): Promise<Buffer> => {
    const known = compressed.get(name)
    if (known) return known
    const made = readFile(path.join(assetsDir, name)).then((content) =>
      gzipAsync(content, { level: constants.Z_BEST_COMPRESSION }),
    )
    compressed.set(name, made)
    // A name that does not exist must not be remembered, or anybody could fill the memory with them.
    made.catch(() => compressed.delete(name))
    return made
  }

  return async (request, response, next) => {
    const name = request.path.slice(1)
    const isWanted = (request.method === 'GET' || request.method === 'HEAD') && COMPRESSIBLE.test(name)
    if (!isWanted) {
      next()
      return
    }
    response.vary('Accept-Encoding')
    const content = request.acceptsEncodings('gzip') ? await compress(name).catch(() => null) : null
    if (!content) {
      next()
      return
    }
    response
      .set('Content-Encoding', 'gzip')
      .set('Cache-Control', `public, max-age=${YEAR_S}, immutable`)
      .type(path.extname(name))
      .send(content)
  }
}
