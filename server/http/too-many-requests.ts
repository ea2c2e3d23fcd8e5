import { HttpError } from './http-error'

export class TooManyRequests extends HttpError {
  readonly retryAfterS: number

  constructor(waitMs: number) {
    const seconds = Math.max(1, Math.ceil(waitMs / 1000))
    const words = seconds < 90 ? `${seconds} seconds` : `${Math.ceil(seconds / 60)} minutes`
    super('too-many-requests', `Too many tries. Wait ${words} and try again.`)
    this.retryAfterS = seconds
  }
}
