/**
 * One spelling of a JSON value: keys sorted, no blanks, absent keys left out. Equal values give
 * equal text whatever the order in which they were built, so text and hashes can be compared.
 */
export function canonicalJson(value: unknown): string {
  if (value === null) return 'null'
  switch (typeof value) {
    case 'boolean':
      return value ? 'true' : 'false'
    case 'number':
      if (!Number.isFinite(value)) throw new TypeError('A number that is not finite has no JSON spelling')
      // JSON.stringify writes -0 as 0 already; the shortest round-trip form is the same everywhere.
      return JSON.stringify(value)
    case 'string':
      return JSON.stringify(value)
    case 'object':
      return Array.isArray(value) ? canonicalArray(value) : canonicalObject(value as Record<string, unknown>)
    default:
      throw new TypeError(`A value of type ${typeof value} has no JSON spelling`)
  }
}

function canonicalArray(items: readonly unknown[]): string {
  return `[${items.map((item) => canonicalJson(item ?? null)).join(',')}]`
}

function canonicalObject(record: Record<string, unknown>): string {
  const members = Object.keys(record)
    .filter((key) => record[key] !== undefined)
    .sort()
    .map((key) => `${JSON.stringify(key)}:${canonicalJson(record[key])}`)
  return `{${members.join(',')}}`
}
