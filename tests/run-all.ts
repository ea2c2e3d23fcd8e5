/**
 * Everything that must hold: types, lint, unit and reference tests, the production build, and the
 * journeys in Chromium. The last line is `N passed, N failed`, from the counts of the runners; a failed
 * type check, lint run or build counts as one failure.
 */
import { spawn } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { findOrInstallChromium } from './support/find-chromium'
import { countPlaywright, countVitest, readCounts, type TestCounts } from './support/test-counts'

interface StepOutcome {
  name: string
  counts: TestCounts
  summary: string
  seconds: number
}

interface CommandResult {
  hasFailed: boolean
  output: string
  seconds: number
}

const STEP_LIMIT_MS = 9 * 60_000
const reports = mkdtempSync(join(tmpdir(), 'hubstead-tests-'))
const bin = (name: string) => join('node_modules', '.bin', name)

/** `isQuiet` keeps the output for later, for commands that run side by side. */
function run(command: string, args: string[], options: { isQuiet?: boolean; env?: object } = {}) {
  const startedAt = Date.now()
  return new Promise<CommandResult>((resolve) => {
    let output = ''
    const child = spawn(command, args, {
      stdio: ['ignore', 'pipe', 'pipe'],
      env: { ...process.env, ...options.env },
      // A group of its own, so that a run over its time takes its servers and browsers with it.
      detached: true,
    })
    const end = (hasFailed: boolean) => {
      clearTimeout(timer)
      resolve({ hasFailed, output, seconds: (Date.now() - startedAt) / 1000 })
    }
    const timer = setTimeout(() => {
      take(`\nStopped after ${STEP_LIMIT_MS / 60_000} minutes.\n`)
      if (child.pid !== undefined) process.kill(-child.pid, 'SIGKILL')
    }, STEP_LIMIT_MS)
    const take = (chunk: Buffer | string) => {
      output += chunk.toString()
      if (!options.isQuiet) process.stdout.write(chunk)
    }
    child.stdout.on('data', take)
    child.stderr.on('data', take)
    child.on('error', (error) => {
      take(`${error.message}\n`)
      end(true)
    })
    child.on('close', (code) => end(code !== 0))
  })
}

function checked(name: string, results: CommandResult[]): StepOutcome {
  const failed = results.filter((result) => result.hasFailed)
  for (const result of failed) console.log(`\n${name} failed:\n${result.output.trimEnd()}\n`)
  return {
    name,
    counts: { passed: 0, failed: failed.length === 0 ? 0 : 1, skipped: 0 },
    summary: failed.length === 0 ? 'clean' : 'failed',
    seconds: Math.max(0, ...results.map((result) => result.seconds)),
  }
}

function counted(name: string, counts: TestCounts, seconds: number): StepOutcome {
  const skipped = counts.skipped > 0 ? `, ${counts.skipped} skipped` : ''
  return { name, counts, summary: `${counts.passed} passed, ${counts.failed} failed${skipped}`, seconds }
}

async function checkSources(): Promise<StepOutcome[]> {
  console.log('Checking types, lint rules and formatting …')
  const quiet = { isQuiet: true }
  // One after the other inside each half: the halves keep two cores busy.
  const [types, [lint, format]] = await Promise.all([
    run(bin('tsc'), ['--noEmit'], quiet),
    (async () => [
      await run(bin('eslint'), ['.'], quiet),
      await run(bin('prettier'), ['--check', '.'], quiet),
    ])(),
  ])
  return [
    checked('typecheck', [types]),
    checked(
      'lint',
      [lint, format].filter((each) => each !== undefined),
    ),
  ]
}

async function runUnitTests(): Promise<StepOutcome> {
  const report = join(reports, 'vitest.json')
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]
  const result = await run(bin('vitest'), ['run', ...reporters])
  return counted('unit and reference', readCounts(report, countVitest, result.hasFailed), result.seconds)
}

async function runJourneys(): Promise<StepOutcome> {
  const chromium = findOrInstallChromium()
  if (!chromium.ok) {
    console.log(`\n${chromium.advice}\n`)
    return {
      name: 'browser',
      counts: { passed: 0, failed: 1, skipped: 0 },
      summary: 'no browser',
      seconds: 0,
    }
  }
  const report = join(reports, 'playwright.json')
  const result = await run(bin('playwright'), ['test', '--reporter=list,json'], {
    env: { CHROMIUM_PATH: chromium.path, PLAYWRIGHT_JSON_OUTPUT_FILE: report },
  })
  return counted('browser', readCounts(report, countPlaywright, result.hasFailed), result.seconds)
}

const outcomes = await checkSources()
outcomes.push(await runUnitTests())
console.log('\nBuilding for production …')
outcomes.push(checked('build', [await run('npm', ['run', '--silent', 'build'], { isQuiet: true })]))
outcomes.push(await runJourneys())
rmSync(reports, { recursive: true, force: true })

const passed = outcomes.reduce((sum, { counts }) => sum + counts.passed, 0)
const failed = outcomes.reduce((sum, { counts }) => sum + counts.failed + counts.skipped, 0)
console.log('')
for (const { name, summary, seconds } of outcomes) {
  console.log(`${name.padEnd(20)}${summary.padEnd(36)}${seconds.toFixed(0).padStart(4)} s`)
}
console.log(`${passed} passed, ${failed} failed`)
process.exitCode = failed === 0 ? 0 : 1
