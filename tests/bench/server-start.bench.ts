/** From the start command to the first page: on a new data folder, and again when nothing changed. */
import { type ChildProcess, spawn } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { freePort } from '../support/free-port'
import { type BenchFigure, median } from './bench-figure'

const RUNS = 5
const START_LIMIT_MS = 180_000
const POLL_MS = 10

async function stop(server: ChildProcess): Promise<void> {
  if (server.exitCode !== null) return
  const ended = new Promise((resolve) => server.once('exit', resolve))
  server.kill('SIGTERM')
  await ended
}

async function startToFirstPage(dataDir: string): Promise<number> {
  const port = await freePort()
  const startedAt = performance.now()
  const server = spawn(join('node_modules', '.bin', 'tsx'), ['server/commands/start.ts'], {
    // A build in the same process leaves NODE_ENV at production, which starts only with real services.
    env: {
      ...process.env,
      NODE_ENV: 'development',
      PORT: String(port),
      DATA_DIR: dataDir,
      LOG_LEVEL: 'error',
    },
    stdio: 'ignore',
  })
  try {
    while (performance.now() - startedAt < START_LIMIT_MS) {
      if (server.exitCode !== null) throw new Error(`The server ended with ${server.exitCode}`)
      const isUp = await fetch(`http://127.0.0.1:${port}/`).then(
        (response) => response.ok,
        () => false,
      )
      if (isUp) return performance.now() - startedAt
      await sleep(POLL_MS)
    }
    throw new Error('The server did not answer in time')
  } finally {
    await stop(server)
  }
}

function figure(name: string, times: number[], goal: number | null): BenchFigure {
  return {
    figure: name,
    value: Math.round(median(times)),
    unit: 'ms',
    goal,
    runs: times.length,
    min: Math.round(Math.min(...times)),
    max: Math.round(Math.max(...times)),
  }
}

export async function measure(): Promise<BenchFigure[]> {
  const onNewFolder: number[] = []
  const again: number[] = []
  // Not measured: whatever must be built is built here.
  const warmUp = mkdtempSync(join(tmpdir(), 'hubstead-bench-'))
  await startToFirstPage(warmUp)
  rmSync(warmUp, { recursive: true, force: true })
  for (let run = 0; run < RUNS; run += 1) {
    const dataDir = mkdtempSync(join(tmpdir(), 'hubstead-bench-'))
    try {
      onNewFolder.push(await startToFirstPage(dataDir))
      again.push(await startToFirstPage(dataDir))
    } finally {
      rmSync(dataDir, { recursive: true, force: true })
    }
  }
  return [
    figure('server start to first page, new data folder', onNewFolder, null),
    figure('server start to first page, nothing changed', again, 3_000),
  ]
}
