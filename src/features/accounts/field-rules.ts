/** Checks before sending, so that slips are named at their field at once. The server decides. */
export const MIN_PASSWORD_LENGTH = 12
const MAX_PASSWORD_LENGTH = 128

export const emailProblem = (email: string): string | null =>
  !email.trim()
    ? 'Enter your e-mail address'
    : /^[^\s@]+@[^\s@]+\.[^\s@]+$/.test(email.trim())
      ? null
      : 'This is not a complete e-mail address, such as name@company.example'

export const nameProblem = (name: string): string | null => (name.trim() ? null : 'Enter your name')

export const newPasswordProblem = (password: string): string | null =>
  password.length < MIN_PASSWORD_LENGTH
    ? `Use at least ${MIN_PASSWORD_LENGTH} characters; a few words are easy to remember`
    : password.length > MAX_PASSWORD_LENGTH
      ? `Use at most ${MAX_PASSWORD_LENGTH} characters`
      : null
