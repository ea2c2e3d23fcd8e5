import type { Logger } from 'pino'
import type { Accounts } from './accounts/accounts'
import type { Config } from './config'
import type { AppDatabase } from './database/open-database'
import type { Site } from './http/origin-check'
import type { MailCatcher } from './mail/mail-catcher'
import type { Mailer } from './mail/mailer'

/** What every part of the server is built from; tests build the same from a fresh folder. */
export interface ServerParts {
  config: Config
  site: Site
  logger: Logger
  database: AppDatabase
  accounts: Accounts
  mailer: Mailer
  /** Null where a mail server is configured. */
  catcher: MailCatcher | null
}
