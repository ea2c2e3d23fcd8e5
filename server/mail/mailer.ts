/** Sends one mail to one address at a time over SMTP; a failing server is asked again a few times. */
import type { Logger } from 'pino'
import { createTransport } from 'nodemailer'
import type { MailContent } from './templates'

export interface Mail extends MailContent {
  to: string
}

export interface Mailer {
  /**
   * Takes the mail and returns at once: how long an answer takes must not tell whether an address
   * has an account, and a slow mail server must not hold up a freeze.
   */
  sendMail(mail: Mail): void
  /** Resolves when nothing waits any more. */
  idle(): Promise<void>
  close(): Promise<void>
}

export interface MailerOptions {
  smtpUrl: string
  from: string
  logger: Logger
  retryDelaysMs?: readonly number[]
}

const RETRY_DELAYS_MS = [2_000, 15_000, 60_000]
const SMTP_TIMEOUT_MS = 15_000

export function createMailer({
  smtpUrl,
  from,
  logger,
  retryDelaysMs = RETRY_DELAYS_MS,
}: MailerOptions): Mailer {
  const transport = createTransport({
    url: smtpUrl,
    connectionTimeout: SMTP_TIMEOUT_MS,
    greetingTimeout: SMTP_TIMEOUT_MS,
    socketTimeout: SMTP_TIMEOUT_MS,
    // A mail body is text of ours; it never reads files or addresses.
    disableFileAccess: true,
    disableUrlAccess: true,
  })
  const underway = new Set<Promise<void>>()
  const closing = new AbortController()

  async function deliver(mail: Mail): Promise<void> {
    for (const delayMs of [...retryDelaysMs, null]) {
      try {
        await transport.sendMail({
          from,
          // The object form cannot be read as a list of several addresses.
          to: { name: '', address: mail.to },
          subject: mail.subject,
          text: mail.text,
          html: mail.html,
        })
        return
      } catch (error) {
        if (delayMs === null || closing.signal.aborted) {
          logger.error({ err: error, subject: mail.subject }, 'mail not sent')
          return
        }
        logger.warn({ err: error, subject: mail.subject }, 'mail not sent yet, trying again')
        await pause(delayMs, closing.signal)
      }
    }
  }

  return {
    sendMail(mail) {
      const delivery = deliver(mail).finally(() => underway.delete(delivery))
      underway.add(delivery)
    },
    async idle() {
      while (underway.size > 0) await Promise.all(underway)
    },
    async close() {
      closing.abort()
      while (underway.size > 0) await Promise.all(underway)
      transport.close()
    },
  }
}

function pause(ms: number, signal: AbortSignal): Promise<void> {
  return new Promise((resolve) => {
    if (signal.aborted) {
      resolve()
      return
    }
    const finish = () => {
      clearTimeout(timer)
      signal.removeEventListener('abort', finish)
      resolve()
    }
    const timer = setTimeout(finish, ms)
    signal.addEventListener('abort', finish)
  })
}
