import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { PROJECT_ROOT } from '../architecture/import-rules'

const folder = mkdtempSync(join(tmpdir(), 'hubstead-calculate-'))
afterAll(() => rmSync(folder, { recursive: true }))

function calculate(words: string[], input = ''): { status: number | null; stdout: string; stderr: string } {
  return spawnSync(process.execPath, ['--import', 'tsx', 'server/commands/calculate.ts', ...words], {
    cwd: PROJECT_ROOT,
    input,
    encoding: 'utf8',
  })
}

const scenario = (name: string) => join(PROJECT_ROOT, 'tests/recalculation/data', `${name}.layout.json`)

function written(content: string): string {
  const path = join(folder, 'layout.json')
  writeFileSync(path, content)
  return path
}

describe('the calculate command', () => {
  it('prints one JSON object and ends with 0 where nothing fails', () => {
    const { status, stdout, stderr } = calculate([scenario('s1-fixed')])
    expect(status).toBe(0)
    expect(stderr).toBe('')
    expect(JSON.parse(stdout)).toMatchObject({
      verdict: 'passes',
      hubs: [{ id: 'A' }, { id: 'B' }, { id: 'C' }],
    })
  })

  it('ends with 3 where a finding fails, and still prints the results', () => {
    const { status, stdout } = calculate([scenario('s1-flawed')])
    expect(status).toBe(3)
    expect(JSON.parse(stdout)).toMatchObject({ verdict: 'fails' })
  })

  it('reads standard input', () => {
    const { status, stdout } = calculate(
      ['-'],
      JSON.stringify({
        format: 'hubstead-layout',
        version: 1,
        name: 'Bare shaft',
        shaft: { material: 'C45E-QT', sections: [{ id: 's1', lengthMm: 100, outerDiameterMm: 40 }] },
        hubs: [],
        bearings: [],
        loadCases: [],
      }),
    )
    expect(status).not.toBe(2)
    expect(JSON.parse(stdout)).toMatchObject({ hubs: [] })
  })

  it('adds the contact block on request', () => {
    const { stdout } = calculate([scenario('s1-fixed'), '--contact'])
    expect(JSON.parse(stdout)).toMatchObject({
      contact: { notComputable: null, hubs: [{ id: 'A' }, {}, {}] },
    })
  })

  it.each([
    ['no file', ['nowhere.json'], 'nowhere.json: there is no such file'],
    ['no words', [], 'Name a layout file'],
    ['no JSON', [written('{')], 'not JSON'],
  ])('ends with 2 and says why: %s', (_name, words, reason) => {
    const { status, stdout, stderr } = calculate(words)
    expect(status).toBe(2)
    expect(stdout).toBe('')
    expect(stderr).toContain(reason)
  })

  it('ends with 2 and names each problem with its path', () => {
    const path = join(folder, 'wrong.json')
    writeFileSync(
      path,
      JSON.stringify({
        format: 'hubstead-layout',
        version: 1,
        name: 'Wrong',
        shaft: { material: 'C45E-QT', sections: [{ id: 's1', lengthMm: -1, outerDiameterMm: 'thick' }] },
        hubs: [],
        bearings: [],
        loadCases: [],
      }),
    )
    const { status, stdout, stderr } = calculate([path])
    expect(status).toBe(2)
    expect(stdout).toBe('')
    expect(stderr).toMatch(/shaft.sections.*lengthMm: /)
    expect(stderr).toMatch(/shaft.sections.*outerDiameterMm: /)
  })
})
