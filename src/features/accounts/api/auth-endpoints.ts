/**
 * Signing in and what goes with it. All answer without a body, so no schemas: the pages before sign-in
 * stay small.
 */
import { request } from '@/lib/http-client'

const post = (path: string, body?: Record<string, unknown>) =>
  request(`/api/auth/${path}`, { method: 'POST', body })

export const signIn = (email: string, password: string) => post('sign-in/email', { email, password })

/** `next` is where the link in the confirmation mail leads in the end. */
export const signUp = (person: { name: string; email: string; password: string }, next: string | null) =>
  post('sign-up/email', { ...person, next: next ?? undefined })

export const sendConfirmation = (email: string, next: string | null) =>
  post('send-verification-email', { email, next: next ?? undefined })

export const confirmEmail = (token: string) => post('verify-email', { token })

export const requestPasswordReset = (email: string) => post('request-password-reset', { email })

export const resetPassword = (token: string, newPassword: string) =>
  post('reset-password', { token, newPassword })

export const changePassword = (currentPassword: string, newPassword: string) =>
  post('change-password', { currentPassword, newPassword })

export const signOut = () => post('sign-out')
