/**
 * A small cache by text key, newest kept. Keys are the inputs themselves, so an entry can never be
 * stale; object identity would not do because documents cross a worker boundary as copies.
 */
export function memoise<Result>(limit: number): (key: string, compute: () => Result) => Result {
  const entries = new Map<string, Result>()
  return (key, compute) => {
    const known = entries.get(key)
    if (known !== undefined) {
      entries.delete(key)
      entries.set(key, known)
      return known
    }
    const result = compute()
    entries.set(key, result)
    if (entries.size > limit) {
      const oldest = entries.keys().next()
      if (!oldest.done) entries.delete(oldest.value)
    }
    return result
  }
}
