import type { RequestHandler } from 'express'
import { HttpError } from './http-error'

/** A form of another site can send text or form fields without asking; JSON it cannot. */
export const jsonOnly: RequestHandler = (request, _response, next) => {
  const hasBody =
    request.headers['transfer-encoding'] !== undefined || Number(request.headers['content-length'] ?? 0) > 0
  if (hasBody && request.is('application/json') === false)
    throw new HttpError('unsupported-media-type', 'Send JSON.')
  next()
}
