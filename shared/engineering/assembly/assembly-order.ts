import type { ShaftEnd } from './passage'

export interface PartToMount {
  id: string
  /** Place along the shaft; only the order matters. */
  station: number
  planned: ShaftEnd
  canComeFrom: Readonly<Record<ShaftEnd, boolean>>
}

export interface MountedPart {
  id: string
  side: ShaftEnd
}

export interface AssemblyOrder {
  /** In the order of mounting; empty when there is none. */
  order: MountedPart[]
  /** Parts that come from the other end than planned. */
  changed: string[]
  /** Two parts that would have to go through one another; null when an order exists. */
  conflict: readonly [left: string, right: string] | null
}

/**
 * An order in which all parts can be mounted.
 *
 * Model: a part must be on before any part between it and the end it comes from. Two parts cannot change places, so all
 * parts left of some point come from the left, the others from the right; among such points the one that keeps
 * most planned ends is taken. Inner parts go on first; one end is finished before the shaft is turned.
 * @param parts [-] with the ends each can come from; parts that can come from neither are left out by the caller
 * @returns [-] order, parts whose end was changed, or the pair that makes it impossible
 * @throws EngineeringInputError never; ids and ends are closed types
 *
 * Validity: parts that are rings; split parts are closed afterwards and do not take part.
 * Source: assembly-practice
 * Example: no published number; three parts from the left go on from the innermost to the outermost
 */
export function assemblyOrder(parts: readonly PartToMount[]): AssemblyOrder {
  const row = [...parts].sort((one, other) => one.station - other.station)
  const best = bestDivision(row)
  if (best === null) return { order: [], changed: [], conflict: crossingPair(row) }
  const fromLeft = row.slice(0, best).reverse()
  const fromRight = row.slice(best)
  const order: MountedPart[] = [
    ...fromLeft.map(({ id }) => ({ id, side: 'left' as const })),
    ...fromRight.map(({ id }) => ({ id, side: 'right' as const })),
  ]
  const planned = new Map(row.map((part) => [part.id, part.planned]))
  return {
    order,
    changed: order.filter((mounted) => planned.get(mounted.id) !== mounted.side).map((mounted) => mounted.id),
    conflict: null,
  }
}

/** How many parts come from the left: feasible for all, with the fewest changes of plan. */
function bestDivision(row: readonly PartToMount[]): number | null {
  let best: number | null = null
  let fewest = Infinity
  for (let division = 0; division <= row.length; division += 1) {
    let changes = 0
    const isPossible = row.every((part, index) => {
      const side: ShaftEnd = index < division ? 'left' : 'right'
      if (part.planned !== side) changes += 1
      return part.canComeFrom[side]
    })
    if (isPossible && changes < fewest) {
      best = division
      fewest = changes
    }
  }
  return best
}

/** Without a division, some part that cannot come from the left lies left of one that cannot from the right. */
function crossingPair(row: readonly PartToMount[]): readonly [string, string] | null {
  const left = row.findIndex((part) => !part.canComeFrom.left)
  const right = row.findLastIndex((part) => !part.canComeFrom.right)
  const one = row[left]
  const other = row[right]
  return one && other ? [one.id, other.id] : null
}
