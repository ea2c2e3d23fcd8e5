import { describe, expect, it } from 'vitest'
import { safeNext, withNext } from '@/features/accounts/next-address'
import { MIN_PASSWORD_LENGTH } from '@/features/accounts/field-rules'
import { PASSWORD_MIN_LENGTH, signUpBodySchema } from '@shared/protocol/accounts'

describe('the address after signing in', () => {
  it.each(['/w/w1/layouts?status=draft', '/invitation/abc', '/'])('keeps %s', (next) => {
    expect(safeNext(next)).toBe(next)
  })

  it.each([
    'https://elsewhere.example/',
    '//elsewhere.example',
    '/\\elsewhere.example',
    '/\t/elsewhere.example',
    'javascript:alert(1)',
    'layouts',
    '',
    null,
  ])('refuses %j', (next) => {
    expect(safeNext(next)).toBeNull()
  })

  it('survives being carried in an address and is one the server accepts', () => {
    const address = withNext('/sign-up', '/invitation/a&b=c')
    const next = safeNext(new URL(address, 'https://here.example').searchParams.get('next'))
    expect(next).toBe('/invitation/a&b=c')
    const person = { name: 'Noor Halim', email: 'noor@cedar-line.example', password: 'a long walk home' }
    expect(signUpBodySchema.safeParse({ ...person, next }).success).toBe(true)
  })
})

it('the form asks for passwords as long as the server does', () => {
  expect(MIN_PASSWORD_LENGTH).toBe(PASSWORD_MIN_LENGTH)
})
