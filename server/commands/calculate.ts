/**
 * `npm run --silent calculate -- layout.json` (or `-` for standard input) prints the results of a
 * layout file as one JSON object; with `--contact` the contact solution of the whole shaft stands
 * beside them under `contact`. Exit status 0: nothing fails; 3: some finding fails; 2: the input
 * is refused, each problem with its path on standard error and nothing on standard output.
 */
import { readFileSync } from 'node:fs'
import { parseLayoutFile, type LayoutFileProblem } from '@shared/layout/layout-file'
import { calculateContact } from '@shared/recalculation/contact/calculate-contact'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'

const NOTHING_FAILS = 0
const REFUSED = 2
const SOMETHING_FAILS = 3
const STANDARD_INPUT = 0
const CONTACT_OPTION = '--contact'

type Input = { text: string; problem: null } | { text: null; problem: string }

function readInput(source: string | undefined): Input {
  if (source === undefined)
    return {
      text: null,
      problem: 'Name a layout file, or - for standard input: npm run --silent calculate -- layout.json',
    }
  try {
    return { text: readFileSync(source === '-' ? STANDARD_INPUT : source, 'utf8'), problem: null }
  } catch (error) {
    const reason =
      error instanceof Error && 'code' in error && error.code === 'ENOENT'
        ? 'there is no such file'
        : 'it cannot be read'
    return { text: null, problem: `${source}: ${reason}` }
  }
}

function parseJson(text: string): { content: unknown; problem: null } | { content: null; problem: string } {
  try {
    // editors on some systems put a byte order mark in front
    return { content: JSON.parse(text.replace(/^\uFEFF/, '')) as unknown, problem: null }
  } catch (error) {
    return {
      content: null,
      problem: `The file is not JSON: ${error instanceof Error ? error.message : 'unreadable'}`,
    }
  }
}

function refuse(problems: readonly string[]): number {
  process.stderr.write(`${problems.join('\n')}\n`)
  return REFUSED
}

const inWords = ({ path, message }: LayoutFileProblem) => (path === '' ? message : `${path}: ${message}`)

function calculate(words: readonly string[]): number {
  const withContact = words.includes(CONTACT_OPTION)
  const [source] = words.filter((word) => word !== CONTACT_OPTION)
  const input = readInput(source)
  if (input.problem !== null) return refuse([input.problem])
  const json = parseJson(input.text)
  if (json.problem !== null) return refuse([json.problem])
  const parsed = parseLayoutFile(json.content)
  if (!parsed.ok) return refuse(parsed.problems.map(inWords))
  const results = recalculateLayout(parsed.document)
  const printed = withContact ? { ...results, contact: calculateContact(parsed.document) } : results
  process.stdout.write(`${JSON.stringify(printed, null, 2)}\n`)
  return results.verdict === 'fails' ? SOMETHING_FAILS : NOTHING_FAILS
}

// set, not exit(): output to a pipe may still be under way
process.exitCode = calculate(process.argv.slice(2))
