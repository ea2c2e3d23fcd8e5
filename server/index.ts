/** Starts the whole server on one port: migrations, mail, accounts, HTTP, sockets, demo data. */
import { chmodSync, readFileSync } from 'node:fs'
import { createServer, type RequestListener, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import path from 'node:path'
import type { Express, RequestHandler } from 'express'
import type { Logger } from 'pino'
import { createAccounts } from './accounts/accounts'
import { createRevocationHub } from './accounts/revocation'
import { createApp } from './app'
import { calculationRouter } from './calculation/calculation.router'
import type { Config } from './config'
import { lockDataFolder } from './database/instance-lock'
import { type AppDatabase, openDatabase } from './database/open-database'
import { isUpToDate, loadMigrations, type MigrationFile, runMigrations } from './database/run-migrations'
import { startingExamples } from './demo/layout-data'
import { makeDemoDatabase } from './demo/new-demo-database'
import { siteFor } from './http/origin-check'
import { createLogger } from './http/request-log'
import { staticClient } from './http/static-client'
import { createLayoutsService, type LayoutsService } from './layouts/layouts.service'
import { layoutsRouter } from './layouts/layouts.router'
import { startMailCatcher } from './mail/mail-catcher'
import { createMailer } from './mail/mailer'
import type { ServerParts } from './parts'
import { attachRealtime } from './realtime/attach-realtime'
import { createReleaseMails } from './releases/release-mails'
import { releasesRouter } from './releases/releases.router'
import { createReleasesService } from './releases/releases.service'
import { createLayoutRooms, type LayoutRooms } from './realtime/layout-rooms'
import type { SqliteEditTransaction } from './edits/edits.repository'
import { createEditStorage } from './edits/edits.repository'

export interface RunningServer {
  url: string
  port: number
  parts: ServerParts
  layouts: LayoutsService
  rooms: LayoutRooms<SqliteEditTransaction>
  httpServer: Server
  app: Express
  /** True when this start filled a new database with the demo data. */
  isNewlySeeded: boolean
  close(): Promise<void>
}

export interface StartOptions {
  /** Makes what serves the pages; by default the built client. Called before the first request is answered. */
  client?: (httpServer: Server) => Promise<RequestHandler>
  logger?: Logger
}

const HEADERS_TIMEOUT_MS = 15_000
const REQUEST_TIMEOUT_MS = 30_000
/** How long open requests may take to end when the server stops. */
const DRAIN_MS = 4_000

export async function startServer(config: Config, options: StartOptions = {}): Promise<RunningServer> {
  const logger = options.logger ?? createLogger(config)
  const release: (() => Promise<void> | void)[] = []
  /** In the opposite order of starting. */
  const releaseAll = async () => {
    for (const step of release.reverse()) await step()
    release.length = 0
  }

  try {
    const unlock = lockDataFolder(config.dataDir)
    release.push(unlock)

    const migrations = await loadMigrations()
    const isNewlySeeded = config.seedDemo && (await makeDemoDatabase(config, migrations, logger))
    const migrated = await runMigrations(config.databaseFile, migrations)
    if (migrated.applied.length > 0) logger.info(migrated, 'database migrated')
    // The table of sessions is as good as their cookies.
    chmodSync(config.databaseFile, 0o600)
    const database = openDatabase(config.databaseFile)
    release.push(() => {
      database.close()
    })

    let handle: RequestListener = stillStarting
    const httpServer = createServer((request, response) => {
      handle(request, response)
    })
    httpServer.headersTimeout = HEADERS_TIMEOUT_MS
    httpServer.requestTimeout = REQUEST_TIMEOUT_MS
    const port = await listen(httpServer, config)
    release.push(() => stopListening(httpServer))

    const catcher = config.smtpUrl
      ? null
      : await startMailCatcher(path.join(config.dataDir, 'caught-mail'), logger)
    if (catcher) release.push(() => catcher.close())
    const smtpUrl = config.smtpUrl ?? catcher?.smtpUrl ?? ''
    const mailer = createMailer({ smtpUrl, from: config.mailFrom, logger })
    release.push(() => mailer.close())

    const site = siteFor(config.publicUrl, port)
    const revocations = createRevocationHub()
    const accounts = createAccounts({
      databaseFile: config.databaseFile,
      sessionSecret: config.sessionSecret,
      site,
      database,
      mailer,
      revocations,
      logger,
    })
    release.push(() => {
      accounts.close()
    })
    const parts: ServerParts = { config, site, logger, database, accounts, mailer, catcher }

    const rooms = createLayoutRooms({ storage: createEditStorage(database), logger })
    release.push(() => {
      rooms.close()
    })
    const layouts = createLayoutsService(database, rooms, startingExamples)
    const releases = createReleasesService({
      database,
      rooms,
      layouts,
      mails: createReleaseMails(database, mailer, site),
    })
    const routers = [layoutsRouter(layouts), releasesRouter(releases), calculationRouter()]
    const app = createApp(parts, {
      health: healthOf(database, migrations),
      routers,
      client: options.client ? await options.client(httpServer) : staticClient(config.clientDir),
    })

    handle = app
    const realtime = attachRealtime(httpServer, { rooms, accounts, site, logger })
    release.push(() => {
      realtime.close()
    })

    return {
      url: site.publicUrl,
      port,
      parts,
      layouts,
      rooms,
      httpServer,
      app,
      isNewlySeeded,
      close: releaseAll,
    }
  } catch (error) {
    await releaseAll()
    throw error
  }
}

/** The port is ours, the parts behind it are not all there yet. */
const stillStarting: RequestListener = (_request, response) => {
  response.writeHead(503, { 'Retry-After': '1', 'Content-Type': 'text/plain' }).end('Starting')
}

function listen(server: Server, { port, host }: Config): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, host, () => {
      server.off('error', reject)
      resolve((server.address() as AddressInfo).port)
    })
  })
}

function stopListening(server: Server): Promise<void> {
  return new Promise((resolve) => {
    const impatient = setTimeout(() => {
      server.closeAllConnections()
    }, DRAIN_MS)
    server.close(() => {
      clearTimeout(impatient)
      resolve()
    })
    server.closeIdleConnections()
  })
}

function healthOf(database: AppDatabase, migrations: readonly MigrationFile[]) {
  const manifest = JSON.parse(readFileSync(new URL('../package.json', import.meta.url), 'utf8')) as {
    version: string
  }
  return {
    version: manifest.version,
    isDatabaseUsable: () => database.handle.open && database.handle.pragma('quick_check(1)') !== undefined,
    areMigrationsApplied: () => isUpToDate(database.handle, migrations),
  }
}
