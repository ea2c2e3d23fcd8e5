/** Loads of the case on screen, drawn under their hubs: arrows in the plane, dot and cross out of it. */
import { heightToPx, stationToPx, type ViewTransform } from '@/lib/view-transform'
import type { LoadMark } from '../tools/load-marks'
import { drawTag, FONT } from './draw-dimension'
import type { Pen } from './drawn'

interface LoadStyle {
  ink: string
  ground: string
  /** Values are written for these hubs only; the drawing stays calm. */
  isLabelled: (hubId: string) => boolean
  forceText: (forceN: number) => string
}

const HEAD_PX = 6

export function drawLoads(pen: Pen, view: ViewTransform, marks: readonly LoadMark[], style: LoadStyle): void {
  pen.strokeStyle = style.ink
  pen.fillStyle = style.ink
  pen.lineWidth = 1.8
  for (const mark of marks) {
    const x = Math.round(stationToPx(view, mark.stationMm)) + 0.5
    const y = heightToPx(view, -mark.radiusMm) + 4
    const length = Math.abs(mark.forceYPx)
    pen.strokeStyle = style.ink
    pen.fillStyle = style.ink
    if (length > 0) {
      line(pen, x, y, x, y + length)
      // Up: the head touches the hub. Down: the load pulls away from it.
      if (mark.forceYPx > 0) head(pen, x, y, 'up')
      else head(pen, x, y + length, 'down')
    }
    if (mark.outOfPlane !== 0) drawOutOfPlane(pen, length > 0 ? x + 11 : x, y + 6, mark.outOfPlane)
    if (mark.axialPx !== 0) {
      const axialY = y + Math.max(length, 12) + 5
      line(pen, x, axialY, x + mark.axialPx, axialY)
      head(pen, x + mark.axialPx, axialY, mark.axialPx > 0 ? 'right' : 'left')
    }
    if (style.isLabelled(mark.hubId)) {
      const { forceYN, forceZN } = mark.load
      const words = [
        forceYN !== 0 && `y ${style.forceText(forceYN)}`,
        forceZN !== 0 && `z ${style.forceText(forceZN)}`,
      ].filter((word) => word !== false)
      const tag = { font: FONT.strong, ink: style.ink, ground: style.ground, align: 'left' as const }
      words.forEach((word, index) => drawTag(pen, word, x + 22, y + 8 + index * 15, tag))
    }
  }
}

function line(pen: Pen, x1: number, y1: number, x2: number, y2: number): void {
  pen.beginPath()
  pen.moveTo(x1, y1)
  pen.lineTo(x2, y2)
  pen.stroke()
}

function head(pen: Pen, x: number, y: number, direction: 'up' | 'down' | 'left' | 'right'): void {
  const isUpright = direction === 'up' || direction === 'down'
  const back = direction === 'up' || direction === 'left' ? HEAD_PX + 1 : -HEAD_PX - 1
  pen.beginPath()
  pen.moveTo(x, y)
  pen.lineTo(isUpright ? x - 4 : x + back, isUpright ? y + back : y - 4)
  pen.lineTo(isUpright ? x + 4 : x + back, isUpright ? y + back : y + 4)
  pen.closePath()
  pen.fill()
}

/** A dot is the tip of an arrow towards the reader, a cross its tail. */
function drawOutOfPlane(pen: Pen, x: number, y: number, direction: 1 | -1): void {
  const radius = 5
  pen.save()
  pen.lineWidth = 1.3
  pen.beginPath()
  pen.arc(x, y, radius, 0, 2 * Math.PI)
  pen.stroke()
  if (direction === 1) {
    pen.beginPath()
    pen.arc(x, y, 1.6, 0, 2 * Math.PI)
    pen.fill()
  } else {
    const reach = radius * Math.SQRT1_2
    line(pen, x - reach, y - reach, x + reach, y + reach)
    line(pen, x - reach, y + reach, x + reach, y - reach)
  }
  pen.restore()
}
