/**
 * Places labels along a line so that none overlaps another and each stays as near as it can to
 * the thing it names. Solved exactly: labels that would touch form a block that sits at the mean
 * of what its members want (pool adjacent violators), then the blocks are pushed inside the line.
 */

export interface LabelWish {
  /** Where its centre wants to be. */
  centre: number
  size: number
}

/**
 * Returns the centre of each label in the order given, or null when the labels together are
 * longer than the line.
 */
export function spreadLabels(
  wishes: readonly LabelWish[],
  line: { from: number; to: number },
  gap: number,
): number[] | null {
  const total = wishes.reduce((sum, wish) => sum + wish.size, 0) + gap * Math.max(0, wishes.length - 1)
  if (total > line.to - line.from + 1e-9) return null
  const order = wishes
    .map((wish, index) => ({ ...wish, index }))
    .sort((a, b) => a.centre - b.centre || a.index - b.index)

  // A block is a run of labels side by side; `start` is the left edge its members want on average.
  const blocks: { items: typeof order; length: number; wanted: number; start: number }[] = []
  const clampStart = (start: number, length: number) => Math.min(Math.max(start, line.from), line.to - length)
  for (const item of order) {
    const wanted = item.centre - item.size / 2
    let block = { items: [item], length: item.size, wanted, start: clampStart(wanted, item.size) }
    let previous = blocks.at(-1)
    while (previous && previous.start + previous.length + gap > block.start - 1e-9) {
      blocks.pop()
      const offset = previous.length + gap
      const count = previous.items.length + block.items.length
      const mean =
        (previous.wanted * previous.items.length + (block.wanted - offset) * block.items.length) / count
      const length = offset + block.length
      block = {
        items: [...previous.items, ...block.items],
        length,
        wanted: mean,
        start: clampStart(mean, length),
      }
      previous = blocks.at(-1)
    }
    blocks.push(block)
  }

  const centres = new Array<number>(wishes.length).fill(0)
  for (const block of blocks) {
    let at = block.start
    for (const item of block.items) {
      centres[item.index] = at + item.size / 2
      at += item.size + gap
    }
  }
  return centres
}

/**
 * Shares labels out over as few rows as will hold them, taking turns from left to right, so that
 * neighbours stand at different heights. Null when even `maxRows` rows are too short.
 */
export function spreadOverRows(
  wishes: readonly LabelWish[],
  line: { from: number; to: number },
  gap: number,
  maxRows: number,
): { row: number; centre: number }[] | null {
  const order = wishes.map((wish, index) => ({ wish, index })).sort((a, b) => a.wish.centre - b.wish.centre)
  for (let rows = 1; rows <= maxRows; rows += 1) {
    const placed = new Array<{ row: number; centre: number }>(wishes.length)
    let fits = true
    for (let row = 0; row < rows && fits; row += 1) {
      const members = order.filter((_, place) => place % rows === row)
      const centres = spreadLabels(
        members.map((member) => member.wish),
        line,
        gap,
      )
      if (!centres) fits = false
      else
        members.forEach((member, place) => {
          placed[member.index] = { row, centre: centres[place] ?? 0 }
        })
    }
    if (fits) return placed
  }
  return null
}
