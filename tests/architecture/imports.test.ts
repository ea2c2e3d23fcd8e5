import { describe, expect, it } from 'vitest'
import { allZones, importProblem, isRuled, matches, zoneOf } from './import-rules'
import { findCycles, importGraph, importsOf, isBarrel, sourceFiles } from './source-files'

const FOLDERS = ['src', 'server', 'shared', 'migrations']
const files = sourceFiles(FOLDERS)
const zones = allZones()

describe('the import rules', () => {
  it('hold for every import of the project', () => {
    const problems = files.flatMap((file) =>
      importsOf(file).flatMap((specifier) => {
        const problem = importProblem(file.path, specifier, zones)
        return problem ? [`${file.path}: ${problem}`] : []
      }),
    )
    expect(problems).toEqual([])
  })

  it('cover every source file', () => {
    expect(files.filter((file) => isRuled(file.path) && !zoneOf(file.path, zones))).toEqual([])
  })

  it.each([
    ['shared/engineering/shaft/beam.ts', 'zod'],
    ['shared/engineering/shaft/beam.ts', '../../layout/layout-document'],
    ['shared/layout/operations.ts', '../engineering/shaft/beam'],
    ['shared/protocol/realtime.ts', 'node:crypto'],
    ['shared/recalculation/recalculate-layout.ts', '@shared/protocol/realtime'],
    ['src/stores/layout-store.ts', 'react'],
    ['src/sync/connection.ts', 'konva'],
    ['src/components/button.tsx', '@shared/layout/layout-document'],
    ['src/app/router.tsx', '@server/config'],
    ['src/workers/recalculation-worker.ts', '../stores/results-store'],
    ['server/layouts/layouts.router.ts', './layouts.repository'],
    ['server/edits/edits.service.ts', 'express'],
    ['server/edits/edits.repository.ts', '../mail/send-mail'],
    ['server/realtime/layout-room.ts', 'kysely'],
    ['migrations/20261201T0900_create_accounts.ts', '../server/config'],
    ['server/app.ts', '../tests/support/test-app'],
  ])('refuse %s importing %s', (from, specifier) => {
    expect(importProblem(from, specifier, zones)).toMatch(/may not import/)
  })

  it('keep features apart, whichever folders there are', () => {
    const features = zones.filter((zone) => matches('src/features/*', zone.name)).map((zone) => zone.name)
    expect(features.length).toBeGreaterThan(1)
    for (const feature of features) {
      const other = features.find((name) => name !== feature) ?? ''
      expect(importProblem(`${feature}/page.tsx`, other.replace('src', '@') + '/page', zones)).toMatch(
        /another feature/,
      )
    }
  })

  it('allow no cycles', () => {
    expect(findCycles(importGraph(files)).map((cycle) => cycle.join(' -> '))).toEqual([])
  })

  it('find a cycle where there is one', () => {
    const graph = new Map([
      ['a', ['b']],
      ['b', ['c']],
      ['c', ['b']],
    ])
    expect(findCycles(graph)).toEqual([['b', 'c', 'b']])
  })
})

describe('barrel files', () => {
  it('do not exist', () => {
    expect(files.filter(isBarrel).map((file) => file.path)).toEqual([])
  })

  it('are told from files with something of their own', () => {
    expect(isBarrel({ path: 'a.ts', text: "export { x } from './x'\nexport * from './y'" })).toBe(true)
    expect(isBarrel({ path: 'a.ts', text: "import { x } from './x'\nexport { x }" })).toBe(true)
    expect(isBarrel({ path: 'a.ts', text: "import { x } from './x'\nexport const y = x + 1" })).toBe(false)
  })
})
