/** Repeatable randomness: the same seed gives the same run. */
export interface Random {
  next(): number
  /** 0 … count − 1 */
  integer(count: number): number
  chance(probability: number): boolean
  pick<Item>(items: readonly Item[]): Item | undefined
}

/** mulberry32: small, quick, good enough for picking test steps. */
export function seededRandom(seed: number): Random {
  let state = seed >>> 0
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296
  }
  const integer = (count: number) => Math.floor(next() * count)
  return {
    next,
    integer,
    chance: (probability) => next() < probability,
    pick: (items) => items[integer(items.length)],
  }
}
