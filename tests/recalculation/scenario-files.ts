import { readFileSync } from 'node:fs'
import { parseLayoutFile } from '@shared/layout/layout-file'
import type { LayoutDocument } from '@shared/layout/layout-document'

export const SCENARIO_FILES = [
  's1-flawed',
  's1-fixed',
  's2-flawed',
  's2-fixed',
  's3-flawed',
  's3-fixed',
] as const
export type ScenarioFile = (typeof SCENARIO_FILES)[number]

export const scenarioPath = (name: ScenarioFile) => new URL(`./data/${name}.layout.json`, import.meta.url)

export function scenario(name: ScenarioFile): LayoutDocument {
  const parsed = parseLayoutFile(JSON.parse(readFileSync(scenarioPath(name), 'utf8')))
  if (!parsed.ok) throw new Error(`${name} is refused: ${JSON.stringify(parsed.problems)}`)
  return parsed.document
}
