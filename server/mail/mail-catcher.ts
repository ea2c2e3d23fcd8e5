/**
 * The local stand-in for a mail server: a real SMTP server on loopback that keeps what it gets, in
 * memory for the page and as files beside the database.
 */
import { randomUUID } from 'node:crypto'
import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import type { AddressInfo } from 'node:net'
import path from 'node:path'
import { simpleParser } from 'mailparser'
import type { Logger } from 'pino'
import { SMTPServer } from 'smtp-server'
import { type CaughtMail, caughtMailSchema } from '@shared/protocol/accounts'

export interface MailCatcher {
  smtpUrl: string
  /** Newest first. */
  list(): CaughtMail[]
  close(): Promise<void>
}

const KEPT_MAILS = 200
const MAX_MAIL_BYTES = 1024 * 1024

export async function startMailCatcher(folder: string, logger: Logger): Promise<MailCatcher> {
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  const mails = readKept(folder)

  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    size: MAX_MAIL_BYTES,
    logger: false,
    onData(stream, session, done) {
      simpleParser(stream).then(
        (parsed) => {
          const mail: CaughtMail = {
            id: randomUUID(),
            at: new Date().toISOString(),
            to: session.envelope.rcptTo.map((recipient) => recipient.address).join(', '),
            subject: parsed.subject ?? '',
            text: parsed.text ?? '',
            links: parsed.text?.match(/https?:\/\/\S+/g) ?? [],
          }
          writeFileSync(
            path.join(folder, `${mail.at.replace(/[:.]/g, '-')}-${mail.id}.json`),
            JSON.stringify(mail),
            {
              mode: 0o600,
            },
          )
          mails.unshift(mail)
          mails.splice(KEPT_MAILS)
          done()
        },
        (error: unknown) => {
          done(error instanceof Error ? error : new Error(String(error)))
        },
      )
    },
  })
  server.on('error', (error) => {
    logger.error({ err: error }, 'mail catcher')
  })
  await new Promise<void>((resolve, reject) => {
    server.server.once('error', reject)
    server.listen(0, '127.0.0.1', resolve)
  })
  const { port } = server.server.address() as AddressInfo

  return {
    smtpUrl: `smtp://127.0.0.1:${port}`,
    list: () => [...mails],
    close: () =>
      new Promise((resolve) => {
        server.close(() => {
          resolve()
        })
      }),
  }
}

/** File names begin with the time, so their order is the order of arrival. */
function readKept(folder: string): CaughtMail[] {
  const files = readdirSync(folder)
    .filter((file) => file.endsWith('.json'))
    .sort()
    .reverse()
  for (const file of files.slice(KEPT_MAILS)) rmSync(path.join(folder, file))
  return files.slice(0, KEPT_MAILS).flatMap((file) => {
    const parsed = caughtMailSchema.safeParse(JSON.parse(readFileSync(path.join(folder, file), 'utf8')))
    return parsed.success ? [parsed.data] : []
  })
}
