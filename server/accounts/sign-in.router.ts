import { type Request, type Response, Router } from 'express'
import {
  changePasswordBodySchema,
  forgotPasswordBodySchema,
  resendConfirmationBodySchema,
  resetPasswordBodySchema,
  signInBodySchema,
  signUpBodySchema,
  verifyEmailBodySchema,
} from '@shared/protocol/accounts'
import { caller, signedIn } from '../http/authenticate'
import { HttpError } from '../http/http-error'
import { byAddress, limitRequests } from '../http/rate-limit'
import { parseBody } from '../http/validate'
import type { Cookies, SignInService } from './sign-in.service'
import { createSignInLimits } from './sign-in-limits'

const QUARTER_HOUR_MS = 15 * 60 * 1000
/** Opening accounts and guessing tokens, by address of the client. */
const ACCOUNT_REQUESTS = { max: 60, windowMs: QUARTER_HOUR_MS }
/** Mails to one mailbox, whoever asks: nobody's mailbox is flooded through us. */
const MAILS_PER_MAILBOX = { max: 5, windowMs: QUARTER_HOUR_MS, countsOnlySuccess: true }

export function signInRouter(service: SignInService): Router {
  const router = Router()
  const limits = createSignInLimits()
  const limited = limitRequests(ACCOUNT_REQUESTS)
  const mailLimited = limitRequests(MAILS_PER_MAILBOX, mailboxOf)

  const finish = (response: Response, cookies: Cookies = []) => {
    for (const cookie of cookies) response.append('Set-Cookie', cookie)
    response.set('Cache-Control', 'no-store').status(204).end()
  }

  router.post('/api/auth/sign-up/email', limited, mailLimited, async (request, response) => {
    await service.signUp(parseBody(signUpBodySchema, request))
    finish(response)
  })

  router.post('/api/auth/sign-in/email', async (request, response) => {
    const { email, password } = parseBody(signInBodySchema, request)
    const address = request.ip ?? ''
    await limits.beforeTry(address, email)
    try {
      finish(response, await service.signIn(caller(request), email, password))
      await limits.afterSuccess(address, email)
    } catch (error) {
      if (error instanceof HttpError && error.code === 'unauthenticated') {
        await limits.afterFailure(address, email)
        request.log.warn('sign-in failed')
      }
      throw error
    }
  })

  router.post('/api/auth/sign-out', async (request, response) => {
    finish(response, await service.signOut(caller(request)))
  })

  router.post('/api/auth/verify-email', limited, async (request, response) => {
    await service.verifyEmail(parseBody(verifyEmailBodySchema, request).token)
    finish(response)
  })

  router.post('/api/auth/send-verification-email', limited, mailLimited, async (request, response) => {
    const { email, next } = parseBody(resendConfirmationBodySchema, request)
    await service.resendConfirmation(email, next)
    finish(response)
  })

  router.post('/api/auth/request-password-reset', limited, mailLimited, async (request, response) => {
    await service.requestPasswordReset(parseBody(forgotPasswordBodySchema, request).email)
    finish(response)
  })

  router.post('/api/auth/reset-password', limited, async (request, response) => {
    const { token, newPassword } = parseBody(resetPasswordBodySchema, request)
    await service.resetPassword(token, newPassword)
    finish(response)
  })

  router.post('/api/auth/change-password', limited, async (request, response) => {
    const principal = signedIn(request)
    const { currentPassword, newPassword } = parseBody(changePasswordBodySchema, request)
    finish(response, await service.changePassword(caller(request), principal, currentPassword, newPassword))
  })

  return router
}

/** Before validation: a body without a usable address shares the key of its client. */
function mailboxOf(request: Request): string {
  const email = (request.body as { email?: unknown } | undefined)?.email
  return typeof email === 'string'
    ? `mailbox ${email.trim().toLowerCase().slice(0, 254)}`
    : byAddress(request)
}
