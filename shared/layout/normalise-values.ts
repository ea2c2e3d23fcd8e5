/**
 * One stored spelling for "not given": the field is absent. Files and old edits may say null or
 * carry an empty optional object; documents never do, so that equal layouts are equal values and
 * an undone edit gives back exactly what was there.
 */
import type { LoadCase } from './layout-document'

/** A document is six levels deep; a file nested to the stack's limit is not one. */
const MAX_DEPTH = 20

/** A copy without null and undefined members, at any depth. Arrays keep their items. */
export function withoutNulls(value: unknown, depth = 0): unknown {
  if (typeof value !== 'object' || value === null) return value
  if (depth >= MAX_DEPTH) return undefined
  if (Array.isArray(value)) return value.map((item) => withoutNulls(item, depth + 1))
  // fromEntries defines own members, so a hostile `__proto__` key stays a plain key that the schema refuses.
  return Object.fromEntries(
    Object.entries(value)
      .filter(([, member]) => member !== null && member !== undefined)
      .map(([key, member]) => [key, withoutNulls(member, depth + 1)]),
  )
}

/** A load case without empty `criteria` and `hubTemperaturesC`. */
export function withoutEmptyParts(loadCase: LoadCase): LoadCase {
  const { criteria, hubTemperaturesC, ...rest } = loadCase
  return {
    ...rest,
    ...(isEmpty(hubTemperaturesC) ? {} : { hubTemperaturesC }),
    ...(isEmpty(criteria) ? {} : { criteria }),
  }
}

export function isEmpty(record: object | null | undefined): boolean {
  return record === null || record === undefined || Object.keys(record).length === 0
}
