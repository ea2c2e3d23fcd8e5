/** The environment, parsed once. Everything here has a row in the table of the README. */
import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { z } from 'zod'

const MIN_SECRET_LENGTH = 32
const flag = z.enum(['0', '1', 'true', 'false']).transform((value) => value === '1' || value === 'true')

const environmentSchema = z.object({
  NODE_ENV: z.enum(['production', 'development', 'test']).default('development'),
  PORT: z.coerce.number().int().min(0).max(65_535).default(4310),
  /** Loopback by default: the demo people have known passwords. */
  HOST: z.string().min(1).default('127.0.0.1'),
  DATA_DIR: z.string().min(1).default('data'),
  PUBLIC_URL: z.url({ protocol: /^https?$/ }).optional(),
  SESSION_SECRET: z.string().min(MIN_SECRET_LENGTH).optional(),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }).optional(),
  MAIL_FROM: z.string().max(200).default('Hubstead <no-reply@hubstead.example>'),
  TRUST_PROXY_HOPS: z.coerce.number().int().min(0).max(5).default(0),
  SEED_DEMO: flag.optional(),
  LOG_LEVEL: z.enum(['silent', 'fatal', 'error', 'warn', 'info', 'debug']).default('info'),
})

export interface Config {
  isProduction: boolean
  port: number
  host: string
  dataDir: string
  databaseFile: string
  clientDir: string
  /** Set when the service is reached under another address than the one it listens on. */
  publicUrl: string | null
  sessionSecret: string
  /** Null: a real SMTP server starts on loopback and keeps what it receives. */
  smtpUrl: string | null
  mailFrom: string
  trustedProxyHops: number
  seedDemo: boolean
  logLevel: z.infer<typeof environmentSchema>['LOG_LEVEL']
}

export class ConfigError extends Error {
  override readonly name = 'ConfigError'
}

export function readConfig(environment: NodeJS.ProcessEnv): Config {
  // An empty variable means the same as none.
  const given = Object.fromEntries(Object.entries(environment).filter(([, value]) => value !== ''))
  const parsed = environmentSchema.safeParse(given)
  if (!parsed.success) {
    const lines = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`)
    throw new ConfigError(`The environment is not usable.\n${lines.join('\n')}`)
  }
  const env = parsed.data
  const isProduction = env.NODE_ENV === 'production'
  if (isProduction) requireForProduction(env)

  const dataDir = path.resolve(env.DATA_DIR)
  mkdirSync(dataDir, { recursive: true, mode: 0o700 })
  return {
    isProduction,
    port: env.PORT,
    host: env.HOST,
    dataDir,
    databaseFile: path.join(dataDir, 'hubstead.sqlite'),
    clientDir: fileURLToPath(new URL('../dist/client', import.meta.url)),
    publicUrl: env.PUBLIC_URL ? new URL(env.PUBLIC_URL).origin : null,
    sessionSecret: env.SESSION_SECRET ?? localSecret(dataDir),
    smtpUrl: env.SMTP_URL ?? null,
    mailFrom: env.MAIL_FROM,
    trustedProxyHops: env.TRUST_PROXY_HOPS,
    seedDemo: env.SEED_DEMO ?? !isProduction,
    logLevel: env.LOG_LEVEL,
  }
}

function requireForProduction(env: z.infer<typeof environmentSchema>): void {
  const missing: string[] = []
  if (!env.PUBLIC_URL?.startsWith('https://')) missing.push('PUBLIC_URL: an https address')
  if (!env.SESSION_SECRET) missing.push(`SESSION_SECRET: at least ${MIN_SECRET_LENGTH} random characters`)
  else if (new Set(env.SESSION_SECRET).size < 12) missing.push('SESSION_SECRET: random, not a pattern')
  if (!env.SMTP_URL) missing.push('SMTP_URL: the mail server')
  if (missing.length > 0) throw new ConfigError(`In production these are needed.\n${missing.join('\n')}`)
}

/** Outside production: random per data folder, so that nobody's checkout shares a secret. */
function localSecret(dataDir: string): string {
  const file = path.join(dataDir, 'session-secret')
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600 })
  return readFileSync(file, 'utf8').trim()
}
