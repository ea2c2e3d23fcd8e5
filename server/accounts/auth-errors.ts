/** The refusals of the sign-in package in our words. What is not listed is a fault of ours. */
import { APIError } from 'better-auth/api'
import { conflict, forbidden, HttpError, notFound, unauthenticated } from '../http/http-error'

const used = () => new HttpError('bad-request', 'This link is used up or too old. Ask for a new one.')

const REFUSALS: Record<string, () => HttpError> = {
  INVALID_EMAIL_OR_PASSWORD: () => unauthenticated('The e-mail address or the password is not right.'),
  INVALID_EMAIL: () => unauthenticated('The e-mail address or the password is not right.'),
  PASSWORD_TOO_LONG: () => unauthenticated('The e-mail address or the password is not right.'),
  EMAIL_NOT_VERIFIED: () =>
    forbidden('Confirm your e-mail address first: open the link in the mail we sent.'),
  INVALID_TOKEN: used,
  TOKEN_EXPIRED: used,
  USER_NOT_FOUND: used,
  INVALID_PASSWORD: () =>
    new HttpError('bad-request', 'Some of this is not usable.', {
      currentPassword: 'This is not your present password.',
    }),
  UNAUTHORIZED: () => unauthenticated(),
  INVITATION_NOT_FOUND: () => notFound('This invitation is used, withdrawn or too old.'),
  YOU_ARE_NOT_THE_RECIPIENT_OF_THE_INVITATION: () => notFound(),
  EMAIL_VERIFICATION_REQUIRED_BEFORE_ACCEPTING_OR_REJECTING_INVITATION: () =>
    forbidden('Confirm your e-mail address first.'),
  USER_IS_ALREADY_A_MEMBER_OF_THIS_ORGANIZATION: () => conflict('This person is in the workspace already.'),
  INVITATION_LIMIT_REACHED: () => conflict('Too many invitations are open. Withdraw some first.'),
  ORGANIZATION_MEMBERSHIP_LIMIT_REACHED: () => conflict('The workspace is full.'),
  YOU_HAVE_REACHED_THE_MAXIMUM_NUMBER_OF_ORGANIZATIONS: () =>
    conflict('You belong to as many workspaces as one person can.'),
  MEMBER_NOT_FOUND: () => notFound(),
  YOU_CANNOT_LEAVE_THE_ORGANIZATION_AS_THE_ONLY_OWNER: lastAdmin,
  YOU_CANNOT_LEAVE_THE_ORGANIZATION_WITHOUT_AN_OWNER: lastAdmin,
}

export function lastAdmin(): HttpError {
  return conflict('A workspace needs an administrator. Make somebody else one first.')
}

export async function translateRefusals<Result>(work: Promise<Result>): Promise<Result> {
  try {
    return await work
  } catch (error) {
    // Raised by the trigger that stands behind our own check.
    if (error instanceof Error && error.message.includes('last-admin')) throw lastAdmin()
    if (error instanceof APIError) {
      const refusal = REFUSALS[String(error.body?.code)]
      if (refusal) throw refusal()
    }
    throw error
  }
}
