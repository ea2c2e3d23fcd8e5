import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { countPlaywright, countVitest, readCounts } from '../support/test-counts'

const folder = mkdtempSync(join(tmpdir(), 'hubstead-counts-'))
afterAll(() => rmSync(folder, { recursive: true, force: true }))

const vitestReport = {
  numPassedTests: 5,
  numFailedTests: 1,
  numPendingTests: 2,
  numTodoTests: 0,
  testResults: [
    { status: 'passed', assertionResults: [{ status: 'passed' }] },
    { status: 'failed', assertionResults: [{ status: 'failed' }] },
    { status: 'failed', assertionResults: [] },
  ],
}

describe('counting what the runners report', () => {
  it('counts a test file that could not be loaded as one failure', () => {
    expect(countVitest(vitestReport)).toEqual({ passed: 5, failed: 2, skipped: 2 })
  })

  it('counts flaky journeys and errors outside tests as failures', () => {
    const stats = { expected: 3, unexpected: 1, flaky: 1, skipped: 0 }
    expect(countPlaywright({ stats, errors: [{}] })).toEqual({ passed: 3, failed: 3, skipped: 0 })
  })

  it('reports a failure when there is no report', () => {
    expect(readCounts(join(folder, 'missing.json'), countVitest, false).failed).toBe(1)
  })

  it('reports a failure when the runner failed without naming a test', () => {
    const file = join(folder, 'vitest.json')
    const clean = { ...vitestReport, numFailedTests: 0, testResults: [] }
    writeFileSync(file, JSON.stringify(clean))
    expect(readCounts(file, countVitest, false).failed).toBe(0)
    expect(readCounts(file, countVitest, true).failed).toBe(1)
  })

  it('reports a failure when no test ran', () => {
    const file = join(folder, 'empty.json')
    const stats = { expected: 0, unexpected: 0, flaky: 0, skipped: 0 }
    writeFileSync(file, JSON.stringify({ stats, errors: [] }))
    expect(readCounts(file, countPlaywright, false).failed).toBe(1)
  })
})
