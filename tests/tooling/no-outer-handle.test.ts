import { parser } from 'typescript-eslint'
import { Linter } from 'eslint'
import { describe, expect, it } from 'vitest'
import { noOuterHandle } from '../architecture/lint-rules/no-outer-handle'

const linter = new Linter()

function problems(code: string): number {
  return linter.verify(code, {
    languageOptions: { parser: parser },
    plugins: { local: { rules: { 'no-outer-handle': noOuterHandle as never } } },
    rules: { 'local/no-outer-handle': 'error' },
  }).length
}

describe('the outer database handle inside a transaction', () => {
  it.each([
    'writeTransaction((trx) => { db.selectFrom("layout") })',
    'db.transaction().execute(async (trx) => { await db.insertInto("layout") })',
    'sqlite.transaction(() => { sqlite.prepare("DELETE FROM layout").run() })',
    'writeTransaction((trx) => { save(db, layout) })',
  ])('is reported: %s', (code) => {
    expect(problems(`const db = open(); const sqlite = open(); ${code}`)).toBe(1)
  })

  it.each([
    'writeTransaction((trx) => { trx.selectFrom("layout") })',
    'writeTransaction((db) => { db.selectFrom("layout") })',
    'writeTransaction((trx) => { parts.db = null; return { db: trx } })',
    'db.selectFrom("layout")',
  ])('is not reported: %s', (code) => {
    expect(problems(`const db = open(); ${code}`)).toBe(0)
  })
})
