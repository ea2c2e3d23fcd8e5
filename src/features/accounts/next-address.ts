/** Where to go after signing in, carried in the address as `?next=`. */

/** Only paths of this site: an address from outside must not choose where a person lands. */
export function safeNext(next: string | null): string | null {
  if (!next) return null
  try {
    const base = 'https://here.invalid'
    const url = new URL(next, base)
    return url.origin === base && next.startsWith('/') ? url.pathname + url.search : null
  } catch {
    return null
  }
}

export const withNext = (path: string, next: string | null): string =>
  next ? `${path}?${new URLSearchParams({ next }).toString()}` : path
