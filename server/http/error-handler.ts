import type { ErrorRequestHandler, RequestHandler } from 'express'
import type { ErrorBody, ErrorCode } from '@shared/protocol/errors'
import { HttpError, notFound } from './http-error'
import { TooManyRequests } from './too-many-requests'

/** What the body parsers and the router throw, by their `type` or status. */
function fromLibrary(error: unknown): HttpError | null {
  if (!(error instanceof Error)) return null
  const { status, type } = error as Error & { status?: unknown; type?: unknown }
  if (type === 'entity.too.large') return new HttpError('payload-too-large', 'That is too large.')
  if (type === 'encoding.unsupported' || type === 'charset.unsupported')
    return new HttpError('unsupported-media-type', 'Send plain, uncompressed JSON.')
  if (type === 'entity.parse.failed') return new HttpError('bad-request', 'That is not valid JSON.')
  // Anything else the libraries blame on the request: a broken path escape, an aborted body.
  if (typeof status === 'number' && status >= 400 && status < 500)
    return new HttpError('bad-request', 'The request is not well formed.')
  return null
}

export function sendError(
  response: Parameters<RequestHandler>[1],
  error: { code: ErrorCode; status: number; message: string; fields?: Record<string, string> },
): void {
  const body: ErrorBody = {
    error: {
      code: error.code,
      message: error.message,
      ...(error.fields ? { fields: error.fields } : {}),
    },
  }
  response.status(error.status).set('Cache-Control', 'no-store').json(body)
}

export const unknownRoute: RequestHandler = () => {
  throw notFound('There is nothing at this address.')
}

/** Express 5 brings rejected handlers here, so routers need no try and catch. */
export const errorHandler: ErrorRequestHandler = (error: unknown, request, response, next) => {
  if (response.headersSent) {
    // Half an answer cannot be mended: let Express cut the connection.
    next(error)
    return
  }
  const known = error instanceof HttpError ? error : fromLibrary(error)
  if (known) {
    if (known.code === 'forbidden') request.log.warn({ code: known.code }, 'refused')
    if (known instanceof TooManyRequests) response.set('Retry-After', String(known.retryAfterS))
    sendError(response, known)
    return
  }
  request.log.error({ err: error }, 'unexpected error')
  sendError(response, new HttpError('internal', 'Something went wrong on our side. Try again in a moment.'))
}
