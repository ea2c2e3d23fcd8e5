import { randomUUID } from 'node:crypto'
import type { IncomingMessage } from 'node:http'
import { type Logger, pino } from 'pino'
import { pinoHttp } from 'pino-http'
import type { Config } from '../config'

/** Nothing that opens an account may stand in a log, wherever it turns up. */
const SECRETS = [
  'cookie',
  'authorization',
  '["set-cookie"]',
  'password',
  'newPassword',
  'currentPassword',
  'token',
]

export function createLogger(config: Pick<Config, 'logLevel'>, destination?: NodeJS.WritableStream): Logger {
  const options = {
    level: config.logLevel,
    base: null,
    timestamp: pino.stdTimeFunctions.isoTime,
    redact: {
      paths: SECRETS.flatMap((name) => {
        const at = (parent: string) => (name.startsWith('[') ? `${parent}${name}` : `${parent}.${name}`)
        return [name, at('*'), at('req.headers'), at('res.headers')]
      }),
      censor: 'removed',
    },
  }
  return destination ? pino(options, destination) : pino(options)
}

/** Links from mails carry their secret in the query: only the path is logged. */
const pathOnly = (url: string | undefined) => url?.split('?')[0]

export function requestLog(logger: Logger) {
  return pinoHttp({
    logger,
    genReqId: () => randomUUID(),
    // Quiet on success: assets and health checks would drown what matters.
    customLogLevel: (_request, response, error) =>
      error || response.statusCode >= 500 ? 'error' : response.statusCode >= 400 ? 'info' : 'debug',
    serializers: {
      req: (request: IncomingMessage & { id?: unknown; method?: string; url?: string }) => ({
        id: request.id,
        method: request.method,
        path: pathOnly(request.url),
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  })
}
