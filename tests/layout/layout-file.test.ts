import { describe, expect, it } from 'vitest'
import { demoLayouts } from '@server/demo/layout-data'
import { blankLayout } from '@shared/layout/blank-layout'
import { canonicalJson } from '@shared/layout/canonical-json'
import { DEFAULT_CRITERIA, layoutDocumentSchema } from '@shared/layout/layout-document'
import { parseLayoutFile, serialiseLayoutFile } from '@shared/layout/layout-file'
import { sampleLayout } from '../sync/support/sample-layout'

const file = () => JSON.parse(serialiseLayoutFile(sampleLayout())) as Record<string, any> // eslint-disable-line @typescript-eslint/no-explicit-any -- files under test are broken on purpose

function problemsOf(content: unknown) {
  const parsed = parseLayoutFile(content)
  return parsed.ok ? [] : parsed.problems
}

describe('the layout file', () => {
  it('reads what it wrote', () => {
    for (const document of [
      sampleLayout(),
      blankLayout('Blank'),
      ...demoLayouts().map((demo) => demo.document),
    ]) {
      expect(parseLayoutFile(JSON.parse(serialiseLayoutFile(document)))).toEqual({ ok: true, document })
    }
  })

  it('fills in what a file may leave out', () => {
    const { timing: _timing, ...content } = file()
    content['criteria'] = { slipSafety: 2 }
    content['loadCases'][0].loads[0].id = 'load-2'
    delete content['loadCases'][0].loads[1].id
    const parsed = parseLayoutFile(content)
    if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems))
    expect(parsed.document.timing).toEqual([])
    expect(parsed.document.criteria).toEqual({ ...DEFAULT_CRITERIA, slipSafety: 2 })
    // Numbered without clashing with the ids that are given.
    expect(parsed.document.loadCases[0]?.loads.map(({ id }) => id)).toEqual(['load-2', 'load-1'])
  })

  it('treats null as not given', () => {
    const content = file()
    content['hubs'][0].abutmentStationMm = null
    content['bearings'][0].radialStiffnessNPerUm = null
    content['loadCases'][0].criteria = {}
    const parsed = parseLayoutFile(content)
    expect(parsed).toEqual({ ok: true, document: sampleLayout() })
  })

  it('D12 reports every problem with its path', () => {
    const content = file()
    content['format'] = 'other'
    content['hubs'][0].lengthMm = -2
    content['hubs'][0].colour = 'red'
    content['hubs'][1].material = { yieldMPa: 200 }
    content['hubs'][1].fit = { kind: 'iso286', hole: 'h7', shaft: 'u6' }
    content['bearings'][0].kind = 'loose'
    delete content['loadCases'][1].speedRpm
    const paths = problemsOf(content).map((problem) => problem.path)
    for (const path of [
      'format',
      'hubs[0].lengthMm',
      'hubs[0].colour',
      'hubs[1].material.youngsModulusMPa',
      'hubs[1].fit.hole',
      'bearings[0].kind',
      'loadCases[1].speedRpm',
    ]) {
      expect(paths).toContain(path)
    }
    expect(problemsOf(content).every(({ message }) => message.length > 3)).toBe(true)
  })

  it('D12 refuses ids used twice and names that lead nowhere', () => {
    const content = file()
    content['bearings'][0].id = 'A'
    content['loadCases'][0].loads[0].hub = 'X'
    content['loadCases'][1].hubTemperaturesC = { Y: 40 }
    content['timing'][0].hub = 'Z'
    expect(problemsOf(content)).toEqual([
      { path: 'bearings[0].id', message: '"A" is already used at hubs[0].id' },
      { path: 'loadCases[0].loads[0].hub', message: 'There is no hub "X"' },
      { path: 'loadCases[1].hubTemperaturesC.Y', message: 'There is no hub "Y"' },
      { path: 'timing[0].hub', message: 'There is no hub "Z"' },
    ])
  })

  it.each([
    ['nothing', undefined],
    ['a list', []],
    ['a number', 3],
    ['nesting without end', JSON.parse(`{"a":${'['.repeat(50_000)}${']'.repeat(50_000)}}`)],
    ['a hostile key', JSON.parse('{"__proto__": {"format": "hubstead-layout"}}')],
    ['lists where objects belong', { hubs: [[], null, 4], loadCases: [[]], criteria: [] }],
    ['numbers beyond what a number holds', JSON.parse('{"shaft": {"sections": [{"lengthMm": 1e999}]}}')],
  ])('D12 refuses %s without falling over', (_what, content: unknown) => {
    expect(problemsOf(content).length).toBeGreaterThan(0)
  })

  it('the blank layout is a valid document', () => {
    expect(layoutDocumentSchema.safeParse(blankLayout('New')).success).toBe(true)
  })
})

describe('canonicalJson', () => {
  it('spells equal values alike', () => {
    const scattered = { b: [1, { d: undefined, c: null }], a: -0 }
    expect(canonicalJson(scattered)).toBe('{"a":0,"b":[1,{"c":null}]}')
    expect(canonicalJson({ a: 0, b: [1, { c: null }] })).toBe(canonicalJson(scattered))
  })

  it('refuses what JSON cannot say', () => {
    expect(() => canonicalJson({ a: NaN })).toThrow(TypeError)
    expect(() => canonicalJson({ a: Infinity })).toThrow(TypeError)
    expect(() => canonicalJson(() => 1)).toThrow(TypeError)
  })
})
