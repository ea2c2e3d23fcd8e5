/** `kill -9` under load: what was acknowledged is there afterwards, once, and what was not arrives. */
import { type ChildProcess, fork } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import SqliteHandle from 'better-sqlite3'
import { afterAll, expect, it } from 'vitest'
import { DEMO_PASSWORD } from '@server/demo/seed-demo'
import { freePort } from '../support/free-port'
import { openClient, until, type Reachable } from './support/real-client'

const KILLS = 5
const EDITS_BETWEEN_KILLS = 60

const dataDir = mkdtempSync(path.join(tmpdir(), 'hubstead-death-'))
let running: ChildProcess | null = null
afterAll(() => {
  running?.kill('SIGKILL')
  rmSync(dataDir, { recursive: true, force: true })
})

function start(port: number): Promise<Reachable> {
  const child = fork(path.join(import.meta.dirname, 'support/server-process.ts'), {
    execArgv: ['--import', 'tsx'],
    env: { ...process.env, NODE_ENV: 'test', PORT: String(port), DATA_DIR: dataDir, LOG_LEVEL: 'silent' },
    stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
  })
  running = child
  return new Promise((resolve, reject) => {
    child.once('message', (message) => {
      const { url, port: actual } = message as { url: string; port: number }
      resolve({ url, server: { port: actual } })
    })
    child.once('exit', (code) => reject(new Error(`The server ended with ${String(code)}`)))
  })
}

/** The process has no say in this: no handler runs, nothing is flushed. */
function killSuddenly(): Promise<void> {
  const child = running
  return new Promise((resolve) => {
    if (!child) return resolve()
    child.once('exit', () => resolve())
    child.kill('SIGKILL')
  })
}

async function signIn({ url, server }: Reachable, email: string): Promise<string> {
  const answer = await fetch(`http://127.0.0.1:${server.port}/api/auth/sign-in/email`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: url },
    body: JSON.stringify({ email, password: DEMO_PASSWORD }),
  })
  expect(answer.status).toBe(204)
  return answer.headers
    .getSetCookie()
    .map((each) => each.split(';')[0])
    .join('; ')
}

function oneLayoutId(): string {
  const file = new SqliteHandle(path.join(dataDir, 'hubstead.sqlite'), { readonly: true })
  const row = file.prepare('select id from layout order by id limit 1').get() as { id: string }
  file.close()
  return row.id
}

it('S4 an acknowledged edit survives the sudden death of the process, once', async () => {
  const port = await freePort()
  const app = await start(port)
  const layoutId = oneLayoutId()
  const people = [await signIn(app, 'dina@cedar-line.example'), await signIn(app, 'tomas@cedar-line.example')]
  const clients = await Promise.all(people.map((cookie) => openClient(app, { cookie }, layoutId)))
  const [one, two] = clients as [(typeof clients)[0], (typeof clients)[0]]
  const first = one.state.revision
  let committed = 0
  let acknowledged = 0

  for (let kill = 0; kill < KILLS; kill += 1) {
    for (let at = 0; at < EDITS_BETWEEN_KILLS; at += 1) {
      for (const client of clients) {
        committed += 1
        // Each edit has a value of its own, so that none is without effect.
        client.session.commit('Rename', [
          { type: 'set', target: { kind: 'layout' }, field: 'name', value: `Edit ${committed}` },
        ])
      }
      await new Promise((resolve) => setTimeout(resolve, 2))
    }
    acknowledged = Math.max(one.state.revision, two.state.revision)
    await killSuddenly()
    // A client never knows of a revision that is not stored.
    const file = new SqliteHandle(path.join(dataDir, 'hubstead.sqlite'), { readonly: true })
    const { head } = file.prepare('select revision as head from layout where id = ?').get(layoutId) as {
      head: number
    }
    expect(file.pragma('integrity_check', { simple: true })).toBe('ok')
    file.close()
    expect(head).toBeGreaterThanOrEqual(acknowledged)
    await start(port)
  }

  await until(
    () => clients.every(({ state }) => state.pending.length === 0),
    30_000,
    'Edits are still pending',
  )
  await until(() => one.state.revision === two.state.revision, 10_000)
  for (const { session } of clients) session.close()
  await killSuddenly()

  const file = new SqliteHandle(path.join(dataDir, 'hubstead.sqlite'), { readonly: true })
  const log = file
    .prepare(
      'select revision, edit_id from layout_edit where layout_id = ? and revision > ? order by revision',
    )
    .all(layoutId, first) as { revision: number; edit_id: string }[]
  file.close()
  expect(log.map(({ revision }) => revision)).toEqual(log.map((_, at) => first + 1 + at))
  expect(new Set(log.map(({ edit_id }) => edit_id)).size).toBe(log.length)
  expect(log).toHaveLength(committed)
  expect(acknowledged).toBeGreaterThan(first)
}, 120_000)
