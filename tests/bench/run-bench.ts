/**
 * `npm run bench [word …]`: runs every `*.bench.ts` of this folder (or those whose name holds one of the
 * words) and prints one JSON line a figure. Each file exports `measure()`. They run one after the other,
 * so that no measurement disturbs another.
 */
import { readdirSync } from 'node:fs'
import type { BenchFigure } from './bench-figure'

interface BenchModule {
  measure: () => Promise<BenchFigure[]> | BenchFigure[]
}

const words = process.argv.slice(2)
const files = readdirSync(import.meta.dirname)
  .filter((name) => name.endsWith('.bench.ts'))
  .filter((name) => words.length === 0 || words.some((word) => name.includes(word)))

if (files.length === 0) {
  console.error(`No measurement has a name with ${words.join(' or ')}.`)
  process.exitCode = 2
}

for (const name of files) {
  try {
    const { measure } = (await import(`./${name}`)) as BenchModule
    for (const figure of await measure()) console.log(JSON.stringify(figure))
  } catch (error) {
    console.error(`${name}: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}`)
    process.exitCode = 1
  }
}
