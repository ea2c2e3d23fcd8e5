/** Reading and writing the layout file. Every problem is reported with its path, not only the first. */
import { checkReferences } from './check-references'
import { describeIssue } from './describe-issue'
import { DEFAULT_CRITERIA, layoutDocumentSchema, type LayoutDocument } from './layout-document'
import { withoutEmptyParts, withoutNulls } from './normalise-values'

export interface LayoutFileProblem {
  /** Such as `hubs[2].fit.hole`; empty for the whole file. */
  path: string
  message: string
}

export type ParsedLayoutFile =
  { ok: true; document: LayoutDocument } | { ok: false; problems: LayoutFileProblem[] }

/** More would help nobody, and a hostile file could make millions. */
const MAX_PROBLEMS = 100

export function parseLayoutFile(content: unknown): ParsedLayoutFile {
  if (!isRecord(content)) {
    return { ok: false, problems: [{ path: '', message: 'A layout file holds one JSON object' }] }
  }
  const parsed = layoutDocumentSchema.safeParse(withDefaults(withoutNulls(content)))
  if (!parsed.success) {
    const problems = parsed.error.issues.flatMap((issue) => describeIssue(issue, content))
    return { ok: false, problems: problems.slice(0, MAX_PROBLEMS) }
  }
  const document = { ...parsed.data, loadCases: parsed.data.loadCases.map(withoutEmptyParts) }
  const problems = checkReferences(document)
  return problems.length > 0
    ? { ok: false, problems: problems.slice(0, MAX_PROBLEMS) }
    : { ok: true, document }
}

/** The file as people read it: two spaces, the order of the format's description. */
export function serialiseLayoutFile(document: LayoutDocument): string {
  // Parsing puts members into the order in which the schema declares them.
  return `${JSON.stringify(layoutDocumentSchema.parse(document), null, 2)}\n`
}

/** What a file may leave out. Anything of the wrong type is left for the schema to report. */
function withDefaults(content: unknown): unknown {
  const file = content as Record<string, unknown>
  const criteria = file['criteria'] ?? {}
  return {
    ...file,
    timing: file['timing'] ?? [],
    criteria: isRecord(criteria) ? { ...DEFAULT_CRITERIA, ...criteria } : criteria,
    loadCases: Array.isArray(file['loadCases']) ? file['loadCases'].map(withLoadIds) : file['loadCases'],
  }
}

/** Loads without an id get `load-1`, `load-2` … : the same file always gives the same document. */
function withLoadIds(loadCase: unknown): unknown {
  if (!isRecord(loadCase) || !Array.isArray(loadCase['loads'])) return loadCase
  const loads: unknown[] = loadCase['loads']
  const taken = new Set(loads.map((load) => (isRecord(load) ? load['id'] : undefined)))
  let number = 0
  const nextId = () => {
    do number += 1
    while (taken.has(`load-${number}`))
    return `load-${number}`
  }
  return {
    ...loadCase,
    loads: loads.map((load) =>
      isRecord(load) && load['id'] === undefined ? { id: nextId(), ...load } : load,
    ),
  }
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}
