/** Every exported function of the core says what it gives, with units, range, validity, source and an example. */
import { readdirSync, readFileSync } from 'node:fs'
import { join, relative } from 'node:path'
import ts from 'typescript'
import { describe, expect, it } from 'vitest'
import { SOURCE_REGISTRY } from '@shared/engineering/sources/source-registry'

const ROOT = join(import.meta.dirname, '../../shared/engineering')
const KNOWN_SOURCES = new Set<string>(SOURCE_REGISTRY.map((source) => source.id))

/** Tools of the trade, not formulas: they compute nothing an engineer would look up. */
const WITHOUT_FORMULAS = ['quantities', 'linear-algebra', 'sources']

interface PublicFunction {
  file: string
  name: string
  parameters: string[]
  comment: string
  returnsNothing: boolean
}

function sourceFiles(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name)
    if (entry.isDirectory()) return WITHOUT_FORMULAS.includes(entry.name) ? [] : sourceFiles(path)
    return entry.name.endsWith('.ts') && folder !== ROOT ? [path] : []
  })
}

function publicFunctions(path: string): PublicFunction[] {
  const text = readFileSync(path, 'utf8')
  const file = ts.createSourceFile(path, text, ts.ScriptTarget.ES2022, true)
  return file.statements.flatMap((statement) => {
    if (!ts.isFunctionDeclaration(statement) || !statement.name) return []
    const isExported = statement.modifiers?.some((modifier) => modifier.kind === ts.SyntaxKind.ExportKeyword)
    if (!isExported) return []
    const ranges = ts.getLeadingCommentRanges(text, statement.pos) ?? []
    const last = ranges.at(-1)
    return [
      {
        file: relative(ROOT, path),
        name: statement.name.text,
        parameters: statement.parameters.map((parameter) => parameter.name.getText(file)),
        returnsNothing: statement.type?.kind === ts.SyntaxKind.VoidKeyword,
        comment: last ? text.slice(last.pos, last.end) : '',
      },
    ]
  })
}

/** Builders and look-ups of models that no formula stands behind keep a one-sentence comment. */
const isFormula = (one: PublicFunction) => /\b(Model|Source|Validity):/.test(one.comment)

const functions = sourceFiles(ROOT).flatMap(publicFunctions)
const formulas = functions.filter(isFormula)

/** `[mm]`, `[-]`, `[N, N·m, m]` … */
const UNIT = /\[[^\]]+\]/
const PARAMETER = /@param ([\w.]+) (.*)/g

describe('public functions of shared/engineering', () => {
  it('are found', () => {
    expect(formulas.length).toBeGreaterThan(40)
  })

  it.each(functions.map((one) => [`${one.file} ${one.name}`, one] as const))(
    '%s has a comment',
    (_name, one) => {
      expect(one.comment).toMatch(/^\/\*\*/)
    },
  )
})

describe.each(formulas.map((one) => [`${one.file} ${one.name}`, one] as const))('%s', (_name, one) => {
  const { comment } = one
  it('says what it gives, by which model and in which range', () => {
    expect(comment).toMatch(/^\/\*\*\s+\* \S.*\.\n/)
    expect(comment).toMatch(/\* Model: \S/)
    expect(comment).toMatch(/\* Validity: \S/)
  })
  it('describes each parameter with its unit', () => {
    const described = [...comment.matchAll(PARAMETER)]
    for (const [, name, text] of described) expect(text, name).toMatch(UNIT)
    const roots = new Set(described.map(([, name]) => name?.split('.')[0]))
    for (const parameter of one.parameters)
      if (/^\w+$/.test(parameter)) expect([...roots], parameter).toContain(parameter)
  })
  it('gives the unit of what it returns, and reason codes where it throws', () => {
    if (!one.returnsNothing) expect(comment).toMatch(/@returns \[[^\]]+\]/)
    if (comment.includes('@throws'))
      expect(comment).toMatch(/@throws (nothing|EngineeringInputError\s+(`|never|as `))/)
  })
  it('names registered sources and an example', () => {
    const sources = /\* Source: ([\s\S]*?)\n \* Example: \S/.exec(comment)?.[1] ?? ''
    expect(sources).not.toBe('')
    // what stands in brackets is a remark: "(from memory; axle tests)"
    const plain = sources.replace(/\([^)]*\)/g, '').replace(/\s*\*\s*/g, ' ')
    const named = plain.split(';').map((part) => part.trim().split(/[\s,]/)[0] ?? '')
    for (const id of named) expect([...KNOWN_SOURCES]).toContain(id)
  })
})

it('registers each source once, with citation, edition and clauses', () => {
  expect(KNOWN_SOURCES.size).toBe(SOURCE_REGISTRY.length)
  for (const source of SOURCE_REGISTRY) {
    expect(source.citation.length).toBeGreaterThan(10)
    expect(source.edition).not.toBe('')
    expect(source.clauses).not.toBe('')
  }
})
