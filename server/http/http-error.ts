import type { ErrorCode } from '@shared/protocol/errors'

const STATUS_OF: Record<ErrorCode, number> = {
  'bad-request': 400,
  unauthenticated: 401,
  forbidden: 403,
  'not-found': 404,
  conflict: 409,
  frozen: 409,
  fails: 422,
  'too-many-requests': 429,
  'payload-too-large': 413,
  'unsupported-media-type': 415,
  unavailable: 503,
  internal: 500,
}

/** What a service throws and the error handler sends. The message is meant for the person. */
export class HttpError extends Error {
  override readonly name = 'HttpError'
  readonly status: number

  constructor(
    readonly code: ErrorCode,
    message: string,
    readonly fields?: Record<string, string>,
  ) {
    super(message)
    this.status = STATUS_OF[code]
  }
}

export const notFound = (what = 'This does not exist, or you may not see it.') =>
  new HttpError('not-found', what)
export const forbidden = (message = 'Your role does not allow this.') => new HttpError('forbidden', message)
export const unauthenticated = (message = 'Sign in first.') => new HttpError('unauthenticated', message)
export const conflict = (message: string) => new HttpError('conflict', message)
