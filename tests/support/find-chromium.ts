/** Finds the browser of the journeys: CHROMIUM_PATH, then Debian's, then Debian's package when we are root. */
import { spawnSync } from 'node:child_process'
import { existsSync } from 'node:fs'

const DEBIAN_CHROMIUM = '/usr/bin/chromium'

export type ChromiumSearch = { ok: true; path: string } | { ok: false; advice: string }

export function findChromium(): ChromiumSearch {
  const named = process.env.CHROMIUM_PATH
  if (named !== undefined && named !== '') {
    if (existsSync(named)) return { ok: true, path: named }
    return { ok: false, advice: `CHROMIUM_PATH is ${named}, and there is no file there.` }
  }
  if (existsSync(DEBIAN_CHROMIUM)) return { ok: true, path: DEBIAN_CHROMIUM }
  return {
    ok: false,
    advice:
      'The browser tests need Chromium. Install it (Debian: apt-get install chromium) ' +
      'or set CHROMIUM_PATH to the browser to use.',
  }
}

function aptGet(...args: string[]): boolean {
  const run = spawnSync('apt-get', args, {
    stdio: ['ignore', 'inherit', 'inherit'],
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
  })
  return run.status === 0
}

export function findOrInstallChromium(): ChromiumSearch {
  const found = findChromium()
  const mayInstall = !process.env.CHROMIUM_PATH && process.getuid?.() === 0
  if (found.ok || !mayInstall) return found
  console.log('Chromium is not here; installing the Debian package.')
  const isInstalled = aptGet('update') && aptGet('install', '-y', '--no-install-recommends', 'chromium')
  return isInstalled ? findChromium() : found
}
