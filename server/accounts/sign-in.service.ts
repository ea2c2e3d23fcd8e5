/** Opening, confirming and using an account. Answers carry cookies, never tokens. */
import type { Logger } from 'pino'
import type { Queries } from '../database/open-database'
import { HttpError } from '../http/http-error'
import { findPersonOfResetToken } from './accounts.repository'
import type { Auth } from './auth'
import { translateRefusals } from './auth-errors'
import type { Caller } from './caller'
import { passwordProblem } from './password-rules'
import type { Principal } from './principal'

/** Values for Set-Cookie. */
export type Cookies = string[]

export interface SignInService {
  signUp(person: { name: string; email: string; password: string; next?: string }): Promise<void>
  signIn(caller: Caller, email: string, password: string): Promise<Cookies>
  signOut(caller: Caller): Promise<Cookies>
  verifyEmail(token: string): Promise<void>
  resendConfirmation(email: string, next: string | undefined): Promise<void>
  requestPasswordReset(email: string): Promise<void>
  resetPassword(token: string, newPassword: string): Promise<void>
  changePassword(caller: Caller, principal: Principal, current: string, next: string): Promise<Cookies>
  changeName(caller: Caller, name: string): Promise<void>
}

export function createSignInService(auth: Auth, queries: Queries, logger: Logger): SignInService {
  async function refuseWeak(password: string, field: string, person: { name: string; email: string }) {
    const problem = await passwordProblem(password, person)
    if (problem) throw new HttpError('bad-request', 'Some of this is not usable.', { [field]: problem })
  }

  return {
    async signUp({ name, email, password, next }) {
      await refuseWeak(password, 'password', { name, email })
      // The package answers alike whether the address is known or not, and mails accordingly.
      await translateRefusals(auth.api.signUpEmail({ body: { name, email, password, callbackURL: next } }))
    },

    async signIn(caller, email, password) {
      const { headers, response } = await translateRefusals(
        auth.api.signInEmail({ headers: caller, body: { email, password }, returnHeaders: true }),
      )
      logger.info({ userId: response.user.id }, 'signed in')
      return headers.getSetCookie()
    },

    async signOut(caller) {
      const { headers } = await translateRefusals(auth.api.signOut({ headers: caller, returnHeaders: true }))
      return headers.getSetCookie()
    },

    async verifyEmail(token) {
      await translateRefusals(auth.api.verifyEmail({ query: { token } }))
    },

    async resendConfirmation(email, next) {
      await translateRefusals(auth.api.sendVerificationEmail({ body: { email, callbackURL: next } }))
    },

    async requestPasswordReset(email) {
      await translateRefusals(auth.api.requestPasswordReset({ body: { email } }))
    },

    async resetPassword(token, newPassword) {
      const person = findPersonOfResetToken(queries, token)
      // An unknown token is refused below; the rules need somebody whose name must not be in it.
      if (person) await refuseWeak(newPassword, 'newPassword', person)
      await translateRefusals(auth.api.resetPassword({ body: { token, newPassword } }))
    },

    async changePassword(caller, principal, current, next) {
      await refuseWeak(next, 'newPassword', principal)
      const { headers } = await translateRefusals(
        auth.api.changePassword({
          headers: caller,
          body: { currentPassword: current, newPassword: next, revokeOtherSessions: true },
          returnHeaders: true,
        }),
      )
      logger.info({ userId: principal.userId }, 'password changed')
      return headers.getSetCookie()
    },

    async changeName(caller, name) {
      await translateRefusals(auth.api.updateUser({ headers: caller, body: { name } }))
    },
  }
}
