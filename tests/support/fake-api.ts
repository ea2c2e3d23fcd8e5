/** Answers fetch in client tests from a table of routes, and keeps what was asked. */
import { vi } from 'vitest'

export interface FakeAnswer {
  status?: number
  body?: unknown
}
export interface FakeRequest {
  method: string
  path: string
  body: unknown
}
type Handler = (request: FakeRequest) => FakeAnswer

export const refusal = (
  status: number,
  code: string,
  message: string,
  fields?: Record<string, string>,
): FakeAnswer => ({
  status,
  body: { error: { code, message, ...(fields && { fields }) } },
})

/** Keys are "METHOD /path"; what has no key is answered 404 like the real server does. */
export function fakeApi(routes: Record<string, Handler | FakeAnswer>) {
  const requests: FakeRequest[] = []
  vi.stubGlobal('fetch', async (path: string, init: RequestInit = {}) => {
    const body: unknown = typeof init.body === 'string' ? JSON.parse(init.body) : undefined
    const request = { method: init.method ?? 'GET', path, body }
    requests.push(request)
    const route = routes[`${request.method} ${path}`] ?? refusal(404, 'not-found', 'There is nothing here.')
    const { status = 200, body: answer } = typeof route === 'function' ? route(request) : route
    return new Response(answer === undefined ? null : JSON.stringify(answer), {
      status,
      headers: { 'content-type': 'application/json' },
    })
  })
  return {
    requests,
    sent: (method: string, path: string) =>
      requests.filter((each) => each.method === method && each.path === path),
  }
}
