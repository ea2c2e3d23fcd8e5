/**
 * The real server on a free port and a fresh data folder: migrations, demo data, HTTP, sockets and a
 * real SMTP server on loopback. Close it after the test; `restart` keeps the data.
 */
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { type Config, readConfig } from '@server/config'
import { demoLayouts } from '@server/demo/layout-data'
import { DEMO_PASSWORD, DEMO_PEOPLE } from '@server/demo/seed-demo'
import { createLogger } from '@server/http/request-log'
import { type RunningServer, startServer } from '@server/index'
import type { CaughtMail } from '@shared/protocol/accounts'
import type { Role } from '@shared/protocol/roles'

export interface Answer {
  status: number
  headers: Headers
  /** Parsed JSON, or the text, or null when there is none. */
  body: any // eslint-disable-line @typescript-eslint/no-explicit-any -- tests read answers field by field
  text: string
}

export interface RequestOptions {
  method?: string
  body?: unknown
  headers?: Record<string, string>
}

/** Somebody with a cookie, or nobody yet. */
export interface TestPerson {
  email: string
  userId: string
  /** As sent in the Cookie header; '' when signed out. */
  cookie: string
  get(path: string): Promise<Answer>
  post(path: string, body?: unknown): Promise<Answer>
  patch(path: string, body: unknown): Promise<Answer>
  delete(path: string): Promise<Answer>
  request(path: string, options?: RequestOptions): Promise<Answer>
}

export interface TestApp {
  /** Changes with `restart`. */
  readonly server: RunningServer
  readonly url: string
  dataDir: string
  /** Of the demo workspace. */
  workspaceId: string
  /** Reducer shaft, camshaft, line shaft: each flawed. */
  layoutIds: string[]
  /** Signed in as the demo person of that role; `tomas` is the second designer. */
  signInAs(role: Role | 'tomas'): Promise<TestPerson>
  signIn(email: string, password: string): Promise<TestPerson>
  signedOut(): TestPerson
  /** Opens and confirms an account through the mail, then signs in. */
  newPerson(name: string, email: string, password?: string): Promise<TestPerson>
  /** Waits for a mail to this address whose subject matches; the newest first. */
  mailTo(email: string, subject?: RegExp): Promise<CaughtMail>
  restart(): Promise<void>
  close(): Promise<void>
}

export const NEW_PERSON_PASSWORD = 'quiet lathe, loud press'

export interface TestAppOptions {
  /** Serves these pages instead of the built client. */
  clientDir?: string
  /** Gets the log, one JSON line an entry. */
  logTo?: NodeJS.WritableStream
  environment?: Record<string, string>
}

export async function startTestApp({
  environment = {},
  clientDir,
  logTo,
}: TestAppOptions = {}): Promise<TestApp> {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'hubstead-test-'))
  const config = (): Config => ({
    ...readConfig({ NODE_ENV: 'test', PORT: '0', DATA_DIR: dataDir, LOG_LEVEL: 'silent', ...environment }),
    ...(clientDir ? { clientDir } : {}),
  })
  const start = (present: Config) =>
    startServer(present, logTo ? { logger: createLogger(present, logTo) } : {})
  let server = await start(config())

  const origin = () => server.url
  async function send(cookie: string, target: string, options: RequestOptions = {}): Promise<Answer> {
    const { method = 'GET', body, headers = {} } = options
    const response = await fetch(`http://127.0.0.1:${server.port}${target}`, {
      method,
      redirect: 'manual',
      headers: {
        ...(cookie ? { cookie } : {}),
        ...(method === 'GET' ? {} : { origin: origin() }),
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...headers,
      },
      body: body === undefined ? undefined : JSON.stringify(body),
    })
    const text = await response.text()
    const isJson = response.headers.get('content-type')?.includes('json') ?? false
    return {
      status: response.status,
      headers: response.headers,
      text,
      body: isJson ? (JSON.parse(text) as unknown) : text || null,
    }
  }

  function person(email: string, userId: string, cookie: string): TestPerson {
    const request = (target: string, options?: RequestOptions) => send(cookie, target, options)
    return {
      email,
      userId,
      cookie,
      request,
      get: (target) => request(target),
      post: (target, body) => request(target, { method: 'POST', body }),
      patch: (target, body) => request(target, { method: 'PATCH', body }),
      delete: (target) => request(target, { method: 'DELETE' }),
    }
  }

  const app: TestApp = {
    get server() {
      return server
    },
    get url() {
      return server.url
    },
    dataDir,
    workspaceId: '',
    layoutIds: [],

    async signIn(email, password) {
      const answer = await send('', '/api/auth/sign-in/email', { method: 'POST', body: { email, password } })
      if (answer.status !== 204) throw new Error(`Sign-in of ${email}: ${answer.status} ${answer.text}`)
      const cookie = answer.headers
        .getSetCookie()
        .map((each) => each.split(';')[0])
        .join('; ')
      const me = await send(cookie, '/api/me')
      return person(email, me.body.user.id as string, cookie)
    },
    signInAs(role) {
      const found = DEMO_PEOPLE.find((each) =>
        role === 'tomas' ? each.email.startsWith('tomas@') : each.role === role,
      )
      if (!found) throw new Error(`No demo person is ${role}`)
      return app.signIn(found.email, DEMO_PASSWORD)
    },
    signedOut: () => person('', '', ''),

    async newPerson(name, email, password = NEW_PERSON_PASSWORD) {
      const nobody = app.signedOut()
      const signUp = await nobody.post('/api/auth/sign-up/email', { name, email, password })
      if (signUp.status !== 204) throw new Error(`Sign-up of ${email}: ${signUp.status} ${signUp.text}`)
      const mail = await app.mailTo(email, /confirm/i)
      const token = new URL(mail.links[0] ?? '').searchParams.get('token')
      const confirmed = await nobody.post('/api/auth/verify-email', { token })
      if (confirmed.status !== 204) throw new Error(`Confirming ${email}: ${confirmed.text}`)
      return app.signIn(email, password)
    },

    async mailTo(email, subject = /./) {
      for (let tries = 0; tries < 100; tries += 1) {
        await server.parts.mailer.idle()
        const found = server.parts.catcher
          ?.list()
          .find((mail) => mail.to === email && subject.test(mail.subject))
        if (found) return found
        await new Promise((resolve) => setTimeout(resolve, 20))
      }
      throw new Error(`No mail to ${email} matching ${String(subject)}`)
    },

    async restart() {
      const { port } = server
      await server.close()
      server = await start({ ...config(), port })
    },
    async close() {
      await server.close()
      rmSync(dataDir, { recursive: true, force: true })
    },
  }

  if (server.isNewlySeeded) {
    const me = await (await app.signInAs('admin')).get('/api/me')
    app.workspaceId = me.body.workspaces[0].id as string
    const { database } = server.parts
    const stored = database.all(database.kysely.selectFrom('layout').select(['id', 'name']))
    app.layoutIds = demoLayouts().map(
      ({ document }) => stored.find(({ name }) => name === document.name)?.id ?? '',
    )
  }
  return app
}
