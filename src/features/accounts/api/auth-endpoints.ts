/** Requests that answer with a status only; their bodies stand in shared/protocol/accounts.ts. */
import { request } from '@/lib/http-client'

const post = (path: string, body: Record<string, unknown> = {}) =>
  request(`/api/auth/${path}`, { method: 'POST', body })

/** 401 wrong address or password, 403 the address is not confirmed yet. */
export const signIn = (email: string, password: string) => post('sign-in/email', { email, password })

/** `next` is where the link in the confirmation mail leads in the end. */
export const signUp = (name: string, email: string, password: string, next: string | null) =>
  post('sign-up/email', { name, email, password, next: next ?? undefined })

export const sendConfirmation = (email: string, next: string | null) =>
  post('send-verification-email', { email, next: next ?? undefined })

export const confirmEmail = (token: string) => post('verify-email', { token })

export const requestPasswordReset = (email: string) => post('request-password-reset', { email })

export const resetPassword = (token: string, newPassword: string) =>
  post('reset-password', { token, newPassword })

export const signOut = () => post('sign-out')

export const updateName = (name: string) => request('/api/me', { method: 'PATCH', body: { name } })

export const changePassword = (currentPassword: string, newPassword: string) =>
  post('change-password', { currentPassword, newPassword })
