/** Builds the browser client when anything it is made from has changed since the last build. */
import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'

const ROOT = fileURLToPath(new URL('../..', import.meta.url))
const INPUTS = [
  'index.html',
  'vite.config.ts',
  'tsconfig.json',
  'package-lock.json',
  'public',
  'src',
  'shared',
]
const CLIENT = path.join(ROOT, 'dist', 'client')
/** Beside the build, not inside: that folder is served. */
const FINGERPRINT = path.join(ROOT, 'dist', 'client-inputs.sha256')

function filesUnder(relative: string): string[] {
  const full = path.join(ROOT, relative)
  if (!existsSync(full)) return []
  if (!statSync(full).isDirectory()) return [relative]
  return readdirSync(full, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.relative(ROOT, path.join(entry.parentPath, entry.name)))
    .sort()
}

/** By content, so that a fresh checkout with new dates does not build again. */
function fingerprint(): string {
  const hash = createHash('sha256')
  for (const file of INPUTS.flatMap(filesUnder)) {
    hash
      .update(file)
      .update('\0')
      .update(readFileSync(path.join(ROOT, file)))
      .update('\0')
  }
  return hash.digest('hex')
}

export async function buildClientWhenChanged(): Promise<void> {
  const present = fingerprint()
  const isBuilt = existsSync(path.join(CLIENT, 'index.html')) && existsSync(FINGERPRINT)
  if (isBuilt && readFileSync(FINGERPRINT, 'utf8') === present) return
  console.log('Building the client …')
  // Half a second to load, needed only here.
  const { build } = await import('vite')
  await build({ root: ROOT, logLevel: 'warn' })
  writeFileSync(FINGERPRINT, present)
}
