/**
 * Keeps the identity of everything that did not change. Each run of the worker arrives as a fresh
 * copy; with this, a hub whose numbers stayed the same keeps the same object, and the rows and
 * shapes that show it are not drawn again.
 */
export function reuseEqual<T>(previous: T, next: T): T {
  if (Object.is(previous, next)) return previous
  if (Array.isArray(previous) && Array.isArray(next)) {
    let isSame = previous.length === next.length
    const kept: unknown[] = next.map((item: unknown, index) => {
      const old: unknown = previous[index]
      const value = index < previous.length ? reuseEqual(old, item) : item
      if (!Object.is(value, old)) isSame = false
      return value
    })
    return isSame ? previous : (kept as T)
  }
  if (isRecord(previous) && isRecord(next)) {
    const keys = Object.keys(next)
    let isSame = keys.length === Object.keys(previous).length
    const kept: Record<string, unknown> = {}
    for (const key of keys) {
      const value = key in previous ? reuseEqual(previous[key], next[key]) : next[key]
      if (!(key in previous) || !Object.is(value, previous[key])) isSame = false
      kept[key] = value
    }
    return isSame ? previous : (kept as T)
  }
  return next
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)
