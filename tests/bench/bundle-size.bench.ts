/** JavaScript a browser fetches to show a page, as sent: each file gzipped. */
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { gzipSync } from 'node:zlib'
import { build, type Manifest } from 'vite'
import type { BenchFigure } from './bench-figure'

const SIGN_IN_GOAL_KB = 90
const BENCH_GOAL_KB = 330

/** Modules that a page imports dynamically on its way to being shown. */
const SIGN_IN_ENTRIES = ['index.html']
const BENCH_ENTRIES = ['index.html', 'src/app/data-routes.tsx', 'src/app/routes/bench/bench-route.tsx']
/** Workers are built apart from the manifest; the bench starts this one. */
const WORKER_FILE = /recalculation-worker[^/]*\.js$/

/** Files of the chunks and of everything they import statically. */
function filesOf(manifest: Manifest, entries: readonly string[]): Set<string> {
  const files = new Set<string>()
  const visit = (key: string) => {
    const chunk = manifest[key]
    if (!chunk) throw new Error(`The build has no chunk ${key}`)
    if (files.has(chunk.file)) return
    files.add(chunk.file)
    chunk.imports?.forEach(visit)
  }
  entries.forEach(visit)
  return files
}

export async function measure(): Promise<BenchFigure[]> {
  const outDir = mkdtempSync(join(tmpdir(), 'hubstead-bundle-'))
  try {
    await build({ logLevel: 'error', build: { outDir, emptyOutDir: true, manifest: true } })
    const manifest = JSON.parse(readFileSync(join(outDir, '.vite', 'manifest.json'), 'utf8')) as Manifest
    const workers = readdirSync(join(outDir, 'assets'))
      .map((name) => `assets/${name}`)
      .filter((file) => WORKER_FILE.test(file))
    const gzippedKb = (files: Iterable<string>) => {
      const bytes = [...files].reduce(
        (sum, file) => sum + gzipSync(readFileSync(join(outDir, file))).length,
        0,
      )
      return Math.round(bytes / 100) / 10
    }
    const figure = (name: string, files: Iterable<string>, goal: number): BenchFigure => ({
      figure: name,
      value: gzippedKb(files),
      unit: 'kB',
      goal,
      runs: 1,
    })
    return [
      figure('JavaScript for the sign-in page, gzip', filesOf(manifest, SIGN_IN_ENTRIES), SIGN_IN_GOAL_KB),
      figure(
        'JavaScript for the bench, gzip',
        new Set([...filesOf(manifest, BENCH_ENTRIES), ...workers]),
        BENCH_GOAL_KB,
      ),
    ]
  } finally {
    rmSync(outDir, { recursive: true, force: true })
  }
}
