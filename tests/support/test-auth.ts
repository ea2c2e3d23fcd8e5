import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { pino } from 'pino'
import { type Auth, createAuth } from '@server/accounts/auth'
import { createRevocationHub } from '@server/accounts/revocation'
import { loadMigrations, runMigrations } from '@server/database/run-migrations'
import { siteFor } from '@server/http/origin-check'
import { createMailer } from '@server/mail/mailer'

/** The sign-in package as configured, on a fresh database, without a server around it. */
export async function createTestAuth(): Promise<{ auth: Auth; close: () => Promise<void> }> {
  const folder = mkdtempSync(path.join(tmpdir(), 'hubstead-accounts-'))
  const databaseFile = path.join(folder, 'test.sqlite')
  await runMigrations(databaseFile, await loadMigrations())
  const logger = pino({ level: 'silent' })
  const mailer = createMailer({ smtpUrl: 'smtp://127.0.0.1:1', from: 'a@hubstead.example', logger })
  const auth = createAuth({
    databaseFile,
    site: siteFor(null, 4310),
    sessionSecret: 'a secret for this test, long enough',
    mailer,
    revocations: createRevocationHub(),
    logger,
  })
  return {
    auth,
    close: async () => {
      await mailer.close()
      auth.handle.close()
      rmSync(folder, { recursive: true, force: true })
    },
  }
}
