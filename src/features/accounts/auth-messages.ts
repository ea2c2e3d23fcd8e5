import { HttpError, messageOf } from '@/lib/http-client'

export interface FormErrors {
  fields: Partial<Record<'name' | 'email' | 'password', string>>
  form: string | null
}

/** Turns an answer of the sign-in endpoints into words, at a field where it is about one. */
export function authErrors(error: Error | null): FormErrors {
  if (!error) return { fields: {}, form: null }
  if (!(error instanceof HttpError)) return { fields: {}, form: messageOf(error) }
  if (Object.keys(error.fields).length > 0) {
    const { newPassword, ...fields } = error.fields
    return { fields: newPassword ? { ...fields, password: newPassword } : fields, form: null }
  }
  switch (error.authCode) {
    case 'INVALID_EMAIL_OR_PASSWORD':
      // One sentence for both: it must not tell which addresses have an account.
      return { fields: {}, form: 'The e-mail address or the password is not right.' }
    case 'INVALID_EMAIL':
      return { fields: { email: 'This is not a complete e-mail address' }, form: null }
    case 'INVALID_PASSWORD':
    case 'PASSWORD_TOO_SHORT':
    case 'PASSWORD_TOO_LONG':
      return { fields: { password: error.message }, form: null }
    case 'INVALID_TOKEN':
    case 'TOKEN_EXPIRED':
      return { fields: {}, form: 'This link has expired or was used already. Ask for a new one.' }
    default:
      return {
        fields: {},
        form: error.status === 401 ? 'The e-mail address or the password is not right.' : error.message,
      }
  }
}

export const isEmailUnconfirmed = (error: Error | null): boolean =>
  error instanceof HttpError && error.authCode === 'EMAIL_NOT_VERIFIED'
