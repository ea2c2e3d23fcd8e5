/** What every command that serves has in common: a greeting, and an orderly end on a signal. */
import { ConfigError } from '../config'
import { DataFolderInUse } from '../database/instance-lock'
import { MigrationError } from '../database/run-migrations'
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../demo/seed-demo'
import type { RunningServer } from '../index'

/** A stop that hangs must not keep the machine from going down. */
const STOP_LIMIT_MS = 10_000

export async function runUntilStopped(start: () => Promise<RunningServer>): Promise<void> {
  let server: RunningServer
  try {
    server = await start()
  } catch (error) {
    console.error(explain(error))
    process.exitCode = 1
    return
  }
  greet(server)

  let isStopping = false
  const stop = () => {
    if (isStopping) return
    isStopping = true
    setTimeout(() => process.exit(1), STOP_LIMIT_MS).unref()
    server.close().then(
      () => process.exit(0),
      (error: unknown) => {
        console.error(error)
        process.exit(1)
      },
    )
  }
  process.on('SIGTERM', stop)
  process.on('SIGINT', stop)
}

function explain(error: unknown): unknown {
  if (error instanceof ConfigError || error instanceof DataFolderInUse || error instanceof MigrationError)
    return error.message
  if (error instanceof Error && 'code' in error && error.code === 'EADDRINUSE')
    return 'The port is taken. Set PORT to a free one.'
  return error
}

function greet({ url, parts, isNewlySeeded }: RunningServer): void {
  const lines = ['', `Hubstead is at ${url}`]
  if (parts.config.seedDemo) {
    lines.push('', isNewlySeeded ? 'A demo workspace was made. Sign in as:' : 'Demo sign-ins:')
    for (const { email, name, role } of DEMO_PEOPLE) lines.push(`  ${email.padEnd(26)} ${name} (${role})`)
    lines.push(`  password for all: ${DEMO_PASSWORD}`)
  }
  if (parts.catcher) lines.push('', `No mail server is set: mail is caught at ${url}/caught-mail`)
  console.log([...lines, ''].join('\n'))
}
