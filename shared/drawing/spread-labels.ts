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
