/** Hatching of cut parts after ISO 128: thin parallel lines at 45°, the other way round in the neighbour. */
interface HatchTarget {
  beginPath: () => void
  moveTo: (x: number, y: number) => void
  lineTo: (x: number, y: number) => void
}

/**
 * Adds 45° lines clipped to the rectangle to the current path. Clipping is arithmetic, which is
 * cheaper on a canvas than a clip region per part.
 * @param spacing distance between lines along x, in the units of the rectangle
 */
export function hatchPath(
  context: HatchTarget,
  rectangle: { left: number; right: number; top: number; bottom: number },
  spacing: number,
  leansRight: boolean,
): void {
  const { left, right, top, bottom } = rectangle
  const height = bottom - top
  if (right <= left || height <= 0 || spacing <= 0) return
  // Lines are tied to the drawing, not to the part, so that they do not crawl while a part is moved.
  const first = Math.floor((left - height) / spacing) * spacing
  for (let foot = first; foot < right + height; foot += spacing) {
    // Leaning right, the line runs from (foot, bottom) up to (foot + height, top); leaning left, mirrored.
    const from = leansRight ? Math.max(foot, left) : Math.max(foot - height, left)
    const to = leansRight ? Math.min(foot + height, right) : Math.min(foot, right)
    if (to <= from) continue
    const yAt = (x: number) => (leansRight ? bottom - (x - foot) : bottom - (foot - x))
    context.moveTo(from, yAt(from))
    context.lineTo(to, yAt(to))
  }
}
