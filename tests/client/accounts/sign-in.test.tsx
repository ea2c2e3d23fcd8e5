// @vitest-environment jsdom
import { screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import { fakeApi, refusal } from '../../support/fake-api'
import { renderPage } from '../../support/render-page'

const SIGN_IN = 'POST /api/auth/sign-in/email'

async function fillAndSend(email: string, password: string) {
  const user = userEvent.setup()
  if (email) await user.type(screen.getByLabelText('E-mail address'), email)
  if (password) await user.type(screen.getByLabelText('Password'), password)
  await user.click(screen.getByRole('button', { name: 'Sign in' }))
}

describe('sign-in', () => {
  it('names what is missing at each field and sends nothing', async () => {
    const api = fakeApi({})
    renderPage('/sign-in')
    await fillAndSend('dina@', '')

    expect(screen.getByLabelText('E-mail address')).toHaveProperty('ariaInvalid', 'true')
    expect(screen.getByText(/not a complete e-mail address/)).toBeTruthy()
    expect(screen.getByText('Enter your password')).toBeTruthy()
    expect(api.requests).toEqual([])
  })

  it('answers a wrong password without saying which part is wrong, and keeps what was typed', async () => {
    fakeApi({
      [SIGN_IN]: refusal(401, 'unauthenticated', 'The e-mail address or the password is not right.'),
    })
    renderPage('/sign-in')
    await fillAndSend('dina@cedar-line.example', 'not the one')

    const alert = await screen.findByRole('alert')
    expect(alert.textContent).toBe('The e-mail address or the password is not right.')
    expect(screen.getByLabelText('E-mail address')).toHaveProperty('value', 'dina@cedar-line.example')
    expect(screen.getByLabelText('Password')).toHaveProperty('value', 'not the one')
  })

  it('offers to send the confirmation again where the address is not confirmed', async () => {
    const api = fakeApi({
      [SIGN_IN]: refusal(403, 'forbidden', 'Confirm your e-mail address first.'),
      'POST /api/auth/send-verification-email': { status: 204 },
    })
    renderPage('/sign-in?next=/invitation/i1')
    await fillAndSend('nora@cedar-line.example', 'a long walk home')
    await userEvent.click(await screen.findByRole('button', { name: 'Send the mail again' }))

    expect(await screen.findByText(/^Sent/)).toBeTruthy()
    expect(api.sent('POST', '/api/auth/send-verification-email')[0]?.body).toEqual({
      email: 'nora@cedar-line.example',
      next: '/invitation/i1',
    })
  })

  it('says in plain words that the server does not answer', async () => {
    fakeApi({
      [SIGN_IN]: () => {
        throw new TypeError('fetch failed')
      },
    })
    renderPage('/sign-in')
    await fillAndSend('dina@cedar-line.example', 'between-two-centres')
    expect((await screen.findByRole('alert')).textContent).toMatch(/No connection to the server/)
  })

  it('leads a signed-out person to sign-in and back to where they wanted to go', async () => {
    let isSignedIn = false
    const me = {
      user: { id: 'u1', name: 'Dina Reyes', email: 'dina@cedar-line.example', emailVerified: true },
      workspaces: [],
    }
    fakeApi({
      'GET /api/me': () => (isSignedIn ? { body: me } : refusal(401, 'unauthenticated', 'Sign in first.')),
      'GET /api/me/sessions': { body: { sessions: [] } },
      [SIGN_IN]: () => {
        isSignedIn = true
        return { status: 204 }
      },
    })
    renderPage('/account')
    expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeTruthy()
    await fillAndSend('dina@cedar-line.example', 'between-two-centres')
    expect(await screen.findByRole('heading', { name: 'My account' })).toBeTruthy()
    expect(screen.getByLabelText('Name')).toHaveProperty('value', 'Dina Reyes')
  })
})
