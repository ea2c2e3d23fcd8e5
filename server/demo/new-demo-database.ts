/**
 * Makes the database of a new data folder with the demo in it. It is filled under another name and
 * renamed when complete: a start that is broken off half way is simply done again.
 */
import { existsSync, renameSync, rmSync } from 'node:fs'
import type { Logger } from 'pino'
import { createAccounts } from '../accounts/accounts'
import { createRevocationHub } from '../accounts/revocation'
import type { Config } from '../config'
import { openDatabase } from '../database/open-database'
import { type MigrationFile, runMigrations } from '../database/run-migrations'
import { createEditStorage } from '../edits/edits.repository'
import { siteFor } from '../http/origin-check'
import { createLayoutsService } from '../layouts/layouts.service'
import type { Mailer } from '../mail/mailer'
import { createLayoutRooms } from '../realtime/layout-rooms'
import { startingExamples } from './layout-data'
import { seedDemo } from './seed-demo'

/** The demo people's addresses need no confirming, and they do not exist. */
const NO_MAIL: Mailer = {
  sendMail: () => {
    throw new Error('The demo data sends no mail')
  },
  idle: () => Promise.resolve(),
  close: () => Promise.resolve(),
}

/** True when there was no database yet and now there is one. */
export async function makeDemoDatabase(
  config: Config,
  migrations: readonly MigrationFile[],
  logger: Logger,
): Promise<boolean> {
  if (existsSync(config.databaseFile)) return false
  const unfinished = `${config.databaseFile}.new`
  for (const suffix of ['', '-wal', '-shm']) rmSync(unfinished + suffix, { force: true })

  await runMigrations(unfinished, migrations)
  const database = openDatabase(unfinished)
  const accounts = createAccounts({
    databaseFile: unfinished,
    sessionSecret: config.sessionSecret,
    site: siteFor(config.publicUrl, config.port),
    database,
    mailer: NO_MAIL,
    revocations: createRevocationHub(),
    logger,
  })
  const rooms = createLayoutRooms({ storage: createEditStorage(database), logger })
  try {
    await seedDemo(accounts, createLayoutsService(database, rooms, startingExamples))
  } finally {
    rooms.close()
    accounts.close()
    database.close()
  }
  renameSync(unfinished, config.databaseFile)
  return true
}
