/**
 * Puts the names of the hubs above them so that none covers another, a neighbour's outline or the
 * ruler. A name first tries its own place, then makes way to the side, then rises; where nothing is
 * free it loses its last lines, then it is left out (the outline still has it).
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

export interface LabelFrame {
  topPx: number
  leftPx: number
  rightPx: number
}

export interface LabelBox {
  left: number
  right: number
  top: number
  bottom: number
}

export const LABEL_LINE_PX = 14
const GAP_PX = 5
const SIDE_GAP_PX = 3
/** The middle of a shifted name stays over its hub, or this little beside it. */
const OVER_THE_EDGE_PX = 4
const SHIFT_STEP_PX = 8
const RISE_STEP_PX = 4

const touches = (a: LabelBox, b: LabelBox) =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom

/** @param bodies outlines that no name may cover, such as bearings; the hubs themselves are added */
export function placeLabels(
  wishes: readonly LabelWish[],
  frame: LabelFrame,
  bodies: readonly LabelBox[] = [],
): PlacedLabel[] {
  const hubs = wishes.map((wish) => ({
    id: wish.id,
    left: wish.leftPx,
    right: wish.rightPx,
    top: wish.topPx,
    bottom: Infinity,
  }))
  const taken: LabelBox[] = []
  const ordered = [...wishes].sort(
    (a, b) => Number(b.isImportant) - Number(a.isImportant) || b.topPx - a.topPx || a.centrePx - b.centrePx,
  )
  const placed: PlacedLabel[] = []
  for (const wish of ordered) {
    const obstacles = [...taken, ...bodies, ...hubs.filter((hub) => hub.id !== wish.id)]
    const label = placeOne(wish, obstacles, frame)
    if (!label) continue
    placed.push(label)
    taken.push(boxOf(halfWidth(wish, label.lines), label.centrePx, label.bottomPx, label.lines))
  }
  return placed
}

const halfWidth = (wish: LabelWish, lines: number) =>
  Math.max(0, ...wish.lineWidthsPx.slice(0, lines)) / 2 + SIDE_GAP_PX

function boxOf(half: number, centrePx: number, bottomPx: number, lines: number): LabelBox {
  return {
    left: centrePx - half,
    right: centrePx + half,
    top: bottomPx - lines * LABEL_LINE_PX,
    bottom: bottomPx + GAP_PX - 1,
  }
}

/** Middles to try: over the hub first, then ever further to either side. */
function centresToTry(wish: LabelWish, half: number, frame: LabelFrame): number[] {
  const reach = (wish.rightPx - wish.leftPx) / 2 + OVER_THE_EDGE_PX
  const inFrame = (centre: number) =>
    frame.rightPx - frame.leftPx < 2 * half
      ? wish.centrePx
      : Math.min(Math.max(centre, frame.leftPx + half), frame.rightPx - half)
  const centres = [inFrame(wish.centrePx)]
  for (let shift = SHIFT_STEP_PX; shift <= reach; shift += SHIFT_STEP_PX) {
    centres.push(inFrame(wish.centrePx + shift), inFrame(wish.centrePx - shift))
  }
  return centres
}

function placeOne(wish: LabelWish, obstacles: readonly LabelBox[], frame: LabelFrame): PlacedLabel | null {
  if (wish.rightPx < frame.leftPx || wish.leftPx > frame.rightPx) return null
  const lowest = wish.topPx - GAP_PX
  for (let lines = wish.lineWidthsPx.length; lines >= 1; lines -= 1) {
    const half = halfWidth(wish, lines)
    const centres = centresToTry(wish, half, frame)
    for (let bottomPx = lowest; bottomPx - lines * LABEL_LINE_PX >= frame.topPx; bottomPx -= RISE_STEP_PX) {
      for (const centrePx of centres) {
        const box = boxOf(half, centrePx, bottomPx, lines)
        if (obstacles.some((obstacle) => touches(box, obstacle))) continue
        return { id: wish.id, centrePx, bottomPx, lines, isRaised: lowest - bottomPx > GAP_PX + 1 }
      }
    }
  }
  return null
}
