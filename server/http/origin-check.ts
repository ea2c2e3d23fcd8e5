import type { IncomingHttpHeaders } from 'node:http'
import type { RequestHandler } from 'express'
import { HttpError } from './http-error'

const SAFE_METHODS = new Set(['GET', 'HEAD', 'OPTIONS'])

export interface Site {
  /** Where links in mails lead. */
  publicUrl: string
  /** Every origin under which the pages of this server are opened. */
  allowedOrigins: ReadonlySet<string>
  /** Cookies are `Secure` and carry the `__Host-` prefix. */
  isSecure: boolean
}

/** On loopback the same server answers under several names. */
export function siteFor(publicUrl: string | null, port: number): Site {
  if (publicUrl) {
    return {
      publicUrl,
      allowedOrigins: new Set([publicUrl]),
      isSecure: publicUrl.startsWith('https://'),
    }
  }
  const names = ['localhost', '127.0.0.1', '[::1]']
  return {
    publicUrl: `http://localhost:${port}`,
    allowedOrigins: new Set(names.map((name) => `http://${name}:${port}`)),
    isSecure: false,
  }
}

/** Used by requests and by socket handshakes alike: browsers send Origin with both. */
export function isSameSite(headers: IncomingHttpHeaders, site: Site): boolean {
  const fetchSite = headers['sec-fetch-site']
  if (fetchSite !== undefined && fetchSite !== 'same-origin') return false
  return headers.origin !== undefined && site.allowedOrigins.has(headers.origin)
}

/** The cookie alone never changes anything: the page that asks must be ours. */
export function originCheck(site: Site): RequestHandler {
  return (request, _response, next) => {
    if (SAFE_METHODS.has(request.method) || isSameSite(request.headers, site)) {
      next()
      return
    }
    throw new HttpError('forbidden', 'This request does not come from a page of this site.')
  }
}
