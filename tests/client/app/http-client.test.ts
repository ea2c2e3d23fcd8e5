import { afterEach, describe, expect, it, vi } from 'vitest'
import { z } from 'zod'
import { formErrors } from '@/lib/form-errors'
import { formatAgo } from '@/lib/format-time'
import { HttpError, request } from '@/lib/http-client'

const answer = (status: number, text: string) =>
  vi.stubGlobal('fetch', async () => new Response(text, { status }))
const failure = async () =>
  request('/api/x', { schema: z.object({ a: z.number() }) }).catch((error: unknown) => error)

afterEach(() => {
  vi.unstubAllGlobals()
})

describe('requests', () => {
  it('give the parsed answer', async () => {
    answer(200, '{"a":1}')
    expect(await request('/api/x', { schema: z.object({ a: z.number() }) })).toEqual({ a: 1 })
  })

  it('carry the code, the message and the fields of a refusal', async () => {
    answer(409, '{"error":{"code":"frozen","message":"It is released.","fields":{"name":"Taken"}}}')
    expect(await failure()).toMatchObject({
      status: 409,
      code: 'frozen',
      message: 'It is released.',
      fields: { name: 'Taken' },
    })
  })

  it.each([
    [502, '<html>bad gateway</html>', 'unavailable'],
    [200, '{"a":"not a number"}', 'internal'],
    [429, '', 'too-many-requests'],
  ])('never show what is not ours: status %i with %j', async (status, text, code) => {
    answer(status, text)
    const error = await failure()
    expect(error).toMatchObject({ code })
    expect((error as HttpError).message).not.toMatch(/html|number|JSON/i)
  })
})

describe('sorting a refusal to a form', () => {
  it('puts messages at their fields and loses none about others', () => {
    const error = new HttpError(400, 'bad-request', 'Some of this is not usable.', {
      name: 'Too long',
      role: 'Unknown role',
    })
    expect(formErrors(error, ['name'])).toEqual({ fields: { name: 'Too long' }, form: 'Unknown role' })
    expect(formErrors(error, ['name', 'role']).form).toBeNull()
  })

  it('shows a fault of the page in general words', () => {
    expect(formErrors(new Error('x is undefined'), ['name']).form).not.toMatch(/undefined/)
  })
})

describe('times', () => {
  const now = Date.parse('2026-12-01T12:00:00Z')
  it.each([
    ['2026-12-01T11:59:31Z', 'just now'],
    ['2026-12-01T11:55:00Z', '5 minutes ago'],
    ['2026-12-01T09:00:00Z', '3 hours ago'],
    ['2026-11-30T11:00:00Z', 'yesterday'],
    ['2026-11-28T11:00:00Z', '3 days ago'],
    ['2026-10-01T12:00:00Z', '1 Oct 2026'],
  ])('%s reads %s', (iso, words) => {
    expect(formatAgo(iso, now)).toBe(words)
  })
})
