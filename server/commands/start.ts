/** `npm start`: builds the client when it changed, then serves it. */
import { readConfig } from '../config'
import { startServer } from '../index'
import { buildClientWhenChanged } from './build-client'
import { runUntilStopped } from './run-until-stopped'

await runUntilStopped(async () => {
  const config = readConfig(process.env)
  await buildClientWhenChanged()
  return startServer(config)
})
