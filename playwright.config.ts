import { execFileSync } from 'node:child_process'
import { mkdtempSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { defineConfig } from '@playwright/test'
import { findChromium } from './tests/support/find-chromium'

const FIND_FREE_PORT = `
  const server = require('node:net').createServer()
  server.listen(0, '127.0.0.1', () => { process.stdout.write(String(server.address().port)); server.close() })
`

const chromium = findChromium()
if (!chromium.ok) throw new Error(chromium.advice)

// Workers read this file too and must come to the same server, hence the environment.
const port = (process.env.E2E_PORT ??= execFileSync(process.execPath, ['-e', FIND_FREE_PORT], {
  encoding: 'utf8',
}))
const dataDir = (process.env.E2E_DATA_DIR ??= mkdtempSync(join(tmpdir(), 'hubstead-e2e-')))
const baseURL = `http://localhost:${port}`

export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: 'test-results',
  // One server, one database, people who meet in it: journeys run one after the other.
  workers: 1,
  fullyParallel: false,
  retries: 0,
  forbidOnly: true,
  timeout: 120_000,
  expect: { timeout: 15_000 },
  reporter: 'list',
  globalTeardown: './tests/support/remove-e2e-data',
  use: {
    baseURL,
    viewport: { width: 1440, height: 900 },
    actionTimeout: 15_000,
    navigationTimeout: 30_000,
    trace: 'off',
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: chromium.path,
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
        '--no-first-run',
      ],
    },
  },
  webServer: {
    command: 'npm run --silent start',
    url: `${baseURL}/api/health`,
    env: { ...process.env, PORT: port, DATA_DIR: dataDir },
    timeout: 180_000,
    gracefulShutdown: { signal: 'SIGTERM', timeout: 10_000 },
    stdout: 'ignore',
    stderr: 'pipe',
  },
})
