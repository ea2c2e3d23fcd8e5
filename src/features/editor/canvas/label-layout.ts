/**
 * Puts the names of the hubs above them so that none covers another, a neighbour's outline or the
 * ruler. A name first tries its own place, then rises row by row; where no row is free it loses its
 * second lines, then it is left out (the outline and the tooltip still have it).
 */
export interface LabelWish {
  id: string
  /** Middle of the hub on screen. */
  centrePx: number
  /** Top of the hub on screen. */
  topPx: number
  leftPx: number
  rightPx: number
  /** Width of each line, top to bottom. */
  lineWidthsPx: readonly number[]
  /** Kept when there is little room: selected, failing. */
  isImportant: boolean
}

export interface PlacedLabel {
  id: string
  centrePx: number
  /** Baseline of the last line. */
  bottomPx: number
  lines: number
  /** A leader line is drawn when the name is not right above its hub. */
  isRaised: boolean
}

interface Box {
  left: number
  right: number
  top: number
  bottom: number
}

export const LABEL_LINE_PX = 14
const GAP_PX = 5
const SIDE_GAP_PX = 5

const touches = (a: Box, b: Box) =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom

export function placeLabels(
  wishes: readonly LabelWish[],
  frame: { topPx: number; leftPx: number; rightPx: number },
): PlacedLabel[] {
  const bodies = wishes.map((wish) => ({
    id: wish.id,
    left: wish.leftPx,
    right: wish.rightPx,
    top: wish.topPx,
    bottom: Infinity,
  }))
  const taken: Box[] = []
  const ordered = [...wishes].sort(
    (a, b) => Number(b.isImportant) - Number(a.isImportant) || b.topPx - a.topPx || a.centrePx - b.centrePx,
  )
  const placed: PlacedLabel[] = []
  for (const wish of ordered) {
    const obstacles = [...taken, ...bodies.filter((body) => body.id !== wish.id)]
    const label = placeOne(wish, obstacles, frame)
    if (!label) continue
    placed.push(label)
    taken.push(boxOf(wish, label.centrePx, label.bottomPx, label.lines))
  }
  return placed
}

function boxOf(wish: LabelWish, centrePx: number, bottomPx: number, lines: number): Box {
  const half = Math.max(0, ...wish.lineWidthsPx.slice(0, lines)) / 2 + SIDE_GAP_PX
  return {
    left: centrePx - half,
    right: centrePx + half,
    top: bottomPx - lines * LABEL_LINE_PX,
    bottom: bottomPx + GAP_PX - 1,
  }
}

function placeOne(
  wish: LabelWish,
  obstacles: readonly Box[],
  frame: { topPx: number; leftPx: number; rightPx: number },
): PlacedLabel | null {
  if (wish.rightPx < frame.leftPx || wish.leftPx > frame.rightPx) return null
  for (let lines = wish.lineWidthsPx.length; lines >= 1; lines -= 1) {
    const half = Math.max(0, ...wish.lineWidthsPx.slice(0, lines)) / 2 + SIDE_GAP_PX
    const room = frame.rightPx - frame.leftPx
    const centrePx =
      room < 2 * half
        ? wish.centrePx
        : Math.min(Math.max(wish.centrePx, frame.leftPx + half), frame.rightPx - half)
    const lowest = wish.topPx - GAP_PX
    // The name may stand beside a taller neighbour's middle only when it clears its outline.
    for (let bottomPx = lowest; bottomPx - lines * LABEL_LINE_PX >= frame.topPx; bottomPx -= 4) {
      const box = boxOf(wish, centrePx, bottomPx, lines)
      if (!obstacles.some((obstacle) => touches(box, obstacle))) {
        return { id: wish.id, centrePx, bottomPx, lines, isRaised: lowest - bottomPx > 6 }
      }
    }
  }
  return null
}
