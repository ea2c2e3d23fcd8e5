/** The one way to the server over HTTP. Throws HttpError for everything that is not an answer of the asked shape. */
import type { ErrorCode } from '@shared/protocol/errors'

interface Parser<T> {
  parse: (value: unknown) => T
}
interface RequestOptions<T> {
  method?: 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE'
  body?: unknown
  /** A zod schema; without one the answer's body is not read. */
  schema?: Parser<T>
  signal?: AbortSignal
}

export class HttpError extends Error {
  override name = 'HttpError'
  constructor(
    /** 0 when no answer came. */
    readonly status: number,
    readonly code: ErrorCode,
    message: string,
    /** Field path to message. */
    readonly fields: Record<string, string> = {},
    /** The code of the sign-in package where the answer came from it, such as EMAIL_NOT_VERIFIED. */
    readonly authCode: string | null = null,
  ) {
    super(message)
  }
}

const CODE_OF_STATUS: Partial<Record<number, ErrorCode>> = {
  400: 'bad-request',
  401: 'unauthenticated',
  403: 'forbidden',
  404: 'not-found',
  409: 'conflict',
  413: 'payload-too-large',
  415: 'unsupported-media-type',
  422: 'bad-request',
  429: 'too-many-requests',
  502: 'unavailable',
  503: 'unavailable',
  504: 'unavailable',
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/**
 * Reads `{ error: { code, message, fields } }` and the flat `{ code, message }` of the sign-in endpoints.
 * By hand rather than by zod: the sign-in page must not carry a schema library for one object.
 */
export function errorFromBody(status: number, body: unknown): HttpError {
  const code = CODE_OF_STATUS[status] ?? 'internal'
  const fallback =
    status === 429
      ? 'Too many attempts. Wait a minute and try again.'
      : status >= 500
        ? 'The server could not do this. Nothing was changed; try again.'
        : 'The server refused this.'
  if (!isRecord(body)) return new HttpError(status, code, fallback)
  if (isRecord(body.error)) {
    const { code: sentCode, message, fields } = body.error
    return new HttpError(
      status,
      typeof sentCode === 'string' ? (sentCode as ErrorCode) : code,
      typeof message === 'string' ? message : fallback,
      isRecord(fields) ? (fields as Record<string, string>) : {},
    )
  }
  return new HttpError(
    status,
    code,
    typeof body.message === 'string' && status < 500 ? body.message : fallback,
    {},
    typeof body.code === 'string' ? body.code : null,
  )
}

async function readJson(response: Response): Promise<unknown> {
  try {
    return (await response.json()) as unknown
  } catch {
    return null
  }
}

export async function request<T = void>(path: string, options: RequestOptions<T> = {}): Promise<T> {
  const { method = 'GET', body, schema, signal } = options
  let response: Response
  try {
    response = await fetch(path, {
      method,
      signal,
      headers: {
        accept: 'application/json',
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
      },
      body: body === undefined ? undefined : JSON.stringify(body),
    })
  } catch (error) {
    if (signal?.aborted) throw error
    throw new HttpError(0, 'unavailable', 'No connection to the server. Nothing was changed; try again.')
  }
  if (!response.ok) throw errorFromBody(response.status, await readJson(response))
  if (!schema) return undefined as T
  try {
    return schema.parse(await readJson(response))
  } catch {
    throw new HttpError(
      response.status,
      'internal',
      'The server’s answer could not be read. Reload the page to get the current version.',
    )
  }
}

/** Words for any thrown value, safe to show. */
export function messageOf(error: unknown): string {
  return error instanceof HttpError ? error.message : 'Something went wrong on this page. Try again.'
}
