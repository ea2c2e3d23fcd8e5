/** The layouts that come with the program: starting examples, and the demo's three with one mistake each. */
import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { parseLayoutFile } from '@shared/layout/layout-file'

export interface StartingExample {
  id: string
  name: string
  story: string
  document: LayoutDocument
}

export interface DemoLayout {
  project: string
  document: LayoutDocument
}

const EXAMPLES = [
  {
    id: 'gear-and-pulley',
    story: 'Two hubs pushed against one collar from both ends. A small layout to begin with.',
  },
  {
    id: 'reducer-intermediate-shaft',
    story: 'A helical wheel, a pinion and a pump gear on the intermediate shaft of a two-stage reducer.',
  },
  {
    id: 'assembled-camshaft',
    story: 'Eight lobes and a drive flange shrunk onto a tube, held to a timing chart.',
  },
  {
    id: 'line-shaft',
    story: 'Three cams, two gears and a pulley along a packaging machine, fitted from both ends.',
  },
]

const DEMO_LAYOUTS = [
  { id: 'reducer-intermediate-shaft', project: 'Conveyor drives' },
  { id: 'assembled-camshaft', project: 'Engines' },
  { id: 'line-shaft', project: 'Packaging' },
]

function load(file: string): LayoutDocument {
  const path = fileURLToPath(new URL(`./data/${file}.layout.json`, import.meta.url))
  const parsed = parseLayoutFile(JSON.parse(readFileSync(path, 'utf8')))
  if (!parsed.ok) throw new Error(`${file}: ${JSON.stringify(parsed.problems[0])}`)
  return parsed.document
}

let examples: StartingExample[] | null = null

export function startingExamples(): StartingExample[] {
  examples ??= EXAMPLES.map(({ id, story }) => {
    const document = load(`${id}.example`)
    return { id, name: document.name, story, document }
  })
  return examples
}

export function demoLayouts(): DemoLayout[] {
  return DEMO_LAYOUTS.map(({ id, project }) => ({ project, document: load(`${id}.demo`) }))
}
