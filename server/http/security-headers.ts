import type { RequestHandler } from 'express'
import helmet from 'helmet'
import type { Site } from './origin-check'

const YEAR_S = 365 * 24 * 3600

/** Everything comes from this server; nothing is inline, framed or loaded from elsewhere. */
export function securityHeaders(site: Site): RequestHandler {
  // 'self' covers wss of the same origin in current browsers; older ones want it spelled out.
  // An IPv6 literal is no valid source of a policy.
  const sockets = [...site.allowedOrigins]
    .filter((origin) => !origin.includes('['))
    .map((origin) => origin.replace(/^http/, 'ws'))
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'", ...sockets],
        workerSrc: ["'self'"],
        manifestSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    strictTransportSecurity: site.isSecure ? { maxAge: YEAR_S, includeSubDomains: true } : false,
    crossOriginOpenerPolicy: { policy: 'same-origin' },
    crossOriginResourcePolicy: { policy: 'same-origin' },
    referrerPolicy: { policy: 'same-origin' },
    xFrameOptions: { action: 'deny' },
  })
}
