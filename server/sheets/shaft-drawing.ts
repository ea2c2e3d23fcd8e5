/** The half section with all that stands around it, at the largest standard scale that fits. */
import type { HalfSection } from '@shared/drawing/half-section-geometry'
import { standardScale } from '@shared/drawing/standard-scale'
import { bottomBandHeight, drawBottomBand } from './drawing-bottom-band'
import type { DrawingFrame } from './drawing-frame'
import { drawParts } from './drawing-parts'
import { drawTopBand, topBandHeight } from './drawing-top-band'
import type { SheetWriter } from './sheet-writer'

export interface DrawingArea {
  left: number
  top: number
  right: number
  bottom: number
}

/** Room for the words left of the diameter rows and for the ends of the centre line. */
const SIDE_ROOM_MM = 11

interface Planned {
  label: string
  frame: DrawingFrame
}

export function planShaftDrawing(writer: SheetWriter, section: HalfSection, area: DrawingArea): Planned {
  const widthMm = Math.max(1, section.toMm - section.fromMm)
  const heightMm = Math.max(1, 2 * section.largestRadiusMm)
  const free = { widthMm: area.right - area.left - 2 * SIDE_ROOM_MM, heightMm: area.bottom - area.top }
  const top = topBandHeight(writer, section)
  const frameAt = (factor: number, bottom: number): DrawingFrame => {
    const spare = area.bottom - area.top - top - heightMm * factor - bottom
    return {
      factor,
      left: area.left,
      right: area.right,
      datumX: (area.left + area.right) / 2 - ((section.fromMm + section.toMm) / 2) * factor,
      axisY: area.top + top + Math.max(0, spare / 2) + (heightMm / 2) * factor,
    }
  }
  // A smaller scale may set the diameters upright and need a higher band: try again with that band.
  let bottom = 30
  let scale = standardScale({ widthMm, heightMm }, { ...free, heightMm: free.heightMm - top - bottom })
  for (let round = 0; round < 3; round += 1) {
    bottom = bottomBandHeight(writer, frameAt(scale.factor, bottom), section)
    scale = standardScale({ widthMm, heightMm }, { ...free, heightMm: free.heightMm - top - bottom })
  }
  return { label: scale.label, frame: frameAt(scale.factor, bottom) }
}

/** Returns what had to be left out for want of room. */
export function drawShaftDrawing(writer: SheetWriter, section: HalfSection, planned: Planned): string[] {
  drawParts(writer, planned.frame, section)
  const top = drawTopBand(writer, planned.frame, section)
  const bottom = drawBottomBand(writer, planned.frame, section)
  return [...top.omitted, ...bottom.omitted]
}
