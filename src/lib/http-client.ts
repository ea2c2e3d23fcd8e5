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
 * Reads the one error shape by hand rather than by its schema: the sign-in page must not carry a schema
 * library for one object. An answer of another shape (a proxy's page) gets our own words.
 */
export function errorFromBody(status: number, body: unknown): HttpError {
  const error = isRecord(body) && isRecord(body.error) ? body.error : {}
  return new HttpError(
    status,
    typeof error.code === 'string' ? (error.code as ErrorCode) : (CODE_OF_STATUS[status] ?? 'internal'),
    typeof error.message === 'string' ? error.message : fallbackMessage(status),
    isRecord(error.fields) ? (error.fields as Record<string, string>) : {},
  )
}

function fallbackMessage(status: number): string {
  if (status === 429) return 'Too many attempts. Wait a minute and try again.'
  if (status >= 500) return 'The server could not do this. Try again in a moment.'
  return 'The server refused this.'
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
    throw new HttpError(0, 'unavailable', 'No connection to the server. Check the line and try again.')
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
