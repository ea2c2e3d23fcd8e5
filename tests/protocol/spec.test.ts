/** Every rule of SPEC.md has a test whose title begins with its id, and no title names a rule that is not there. */
import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { expect, it } from 'vitest'
import { PROJECT_ROOT } from '../architecture/import-rules'

const RULE = /^- \*\*([A-Z]\d+)\*\*/gm
const TITLE = /\b(?:it|test)(?:\.each\((?:[^()]|\([^()]*\))*\))?\(\s*['"`]((?:[A-Z]\d+ )+)/g
const FOLDERS = ['tests/layout', 'tests/sync']

const rules = [...readFileSync(join(PROJECT_ROOT, 'shared/protocol/SPEC.md'), 'utf8').matchAll(RULE)].map(
  ([, id]) => id,
)
const tested = new Set(
  FOLDERS.flatMap((folder) =>
    readdirSync(join(PROJECT_ROOT, folder))
      .filter((name) => name.endsWith('.test.ts'))
      .flatMap((name) => [...readFileSync(join(PROJECT_ROOT, folder, name), 'utf8').matchAll(TITLE)])
      .flatMap(([, ids]) => ids?.trim().split(' ') ?? []),
  ),
)

it('numbers each rule once', () => {
  expect(rules.length).toBeGreaterThan(50)
  expect(new Set(rules).size).toBe(rules.length)
})

it('has a test for each rule', () => {
  expect(rules.filter((id) => id !== undefined && !tested.has(id))).toEqual([])
})

it('has a rule for each title', () => {
  expect([...tested].filter((id) => !rules.includes(id))).toEqual([])
})
