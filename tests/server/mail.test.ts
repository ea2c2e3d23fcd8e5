/** Mails over real SMTP: what is sent, to whom, and what happens when the server is away. */
import { mkdtempSync, rmSync } from 'node:fs'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { pino } from 'pino'
import { SMTPServer } from 'smtp-server'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { type MailCatcher, startMailCatcher } from '@server/mail/mail-catcher'
import { createMailer } from '@server/mail/mailer'
import { invitationMail, renderMail } from '@server/mail/templates'

const logger = pino({ level: 'silent' })
const from = 'Hubstead <no-reply@hubstead.example>'
let folder: string
let catcher: MailCatcher
beforeEach(async () => {
  folder = mkdtempSync(path.join(tmpdir(), 'hubstead-mail-'))
  catcher = await startMailCatcher(folder, logger)
})
afterEach(async () => {
  await catcher.close()
  rmSync(folder, { recursive: true, force: true })
})

describe('a mail', () => {
  it('arrives with its text and link, and is still listed after a restart', async () => {
    const mailer = createMailer({ smtpUrl: catcher.smtpUrl, from, logger })
    const link = { label: 'Open', url: 'http://localhost:4310/invitation/abc?x=1&y=2' }
    mailer.sendMail({
      to: 'a@cedar-line.example',
      ...renderMail({ subject: 'Hello', paragraphs: ['One', 'Two'], link }),
    })
    await mailer.idle()
    expect(catcher.list()).toEqual([
      expect.objectContaining({
        to: 'a@cedar-line.example',
        subject: 'Hello',
        text: expect.stringContaining('One\n\nTwo'),
        links: [link.url],
      }),
    ])
    await mailer.close()
    const again = await startMailCatcher(folder, logger)
    expect(again.list()).toEqual(catcher.list())
    await again.close()
  })

  it.each(['a@x.example, b@x.example', 'a@x.example\r\nBcc: b@x.example', 'a@x.example; b@x.example'])(
    'goes to one address or to nobody: %j',
    async (to) => {
      const mailer = createMailer({ smtpUrl: catcher.smtpUrl, from, logger, retryDelaysMs: [] })
      mailer.sendMail({ to, subject: 'S', text: 'T', html: '<p>T</p>' })
      await mailer.close()
      expect(catcher.list().filter((mail) => mail.to.includes('b@x.example'))).toEqual([])
    },
  )

  it('keeps names out of headers and markup', async () => {
    const mail = invitationMail(
      'Eve\r\nBcc: all@x.example',
      '<img src=x onerror=alert(1)>',
      'viewer',
      'http://x.example/',
    )
    expect(mail.subject).not.toMatch(/[\r\n]/)
    expect(mail.html).not.toContain('<img')
    const mailer = createMailer({ smtpUrl: catcher.smtpUrl, from, logger })
    mailer.sendMail({ to: 'a@cedar-line.example', ...mail })
    await mailer.close()
    expect(catcher.list()[0]?.to).toBe('a@cedar-line.example')
  })
})

describe('a mail server that is away', () => {
  it('is asked again until it takes the mail', async () => {
    let refusals = 2
    const received: string[] = []
    const server = new SMTPServer({
      authOptional: true,
      disabledCommands: ['STARTTLS'],
      onRcptTo: (address, _session, done) => {
        refusals -= 1
        done(refusals >= 0 ? new Error('Come back later') : null)
        if (refusals < 0) received.push(address.address)
      },
      onData: (stream, _session, done) => {
        stream.resume()
        stream.on('end', () => {
          done()
        })
      },
    })
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
    const { port } = server.server.address() as AddressInfo
    const mailer = createMailer({
      smtpUrl: `smtp://127.0.0.1:${port}`,
      from,
      logger,
      retryDelaysMs: [5, 5, 5],
    })
    mailer.sendMail({ to: 'a@cedar-line.example', subject: 'S', text: 'T', html: '<p>T</p>' })
    await mailer.idle()
    expect(received).toEqual(['a@cedar-line.example'])
    await mailer.close()
    await new Promise<void>((resolve) => {
      server.close(resolve)
    })
  })

  it('does not hold up the end of the program', async () => {
    const mailer = createMailer({ smtpUrl: 'smtp://127.0.0.1:1', from, logger })
    mailer.sendMail({ to: 'a@cedar-line.example', subject: 'S', text: 'T', html: '<p>T</p>' })
    const startedAt = performance.now()
    await mailer.close()
    expect(performance.now() - startedAt).toBeLessThan(2_000)
  })
})
