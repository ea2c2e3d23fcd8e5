/** Dimension lines and words on the drawing, in pixels. */
import type { Pen } from './drawn'

export const FONT = {
  name: '700 12px Manrope, sans-serif',
  detail: '500 11px Manrope, sans-serif',
  strong: '700 11px Manrope, sans-serif',
  small: '500 10.5px Manrope, sans-serif',
}

const ARROW_PX = 6

/** Words with a ground behind them, so that lines never run through them. */
export function drawTag(
  pen: Pen,
  text: string,
  x: number,
  y: number,
  style: { font: string; ink: string; ground: string; align?: 'left' | 'center' | 'right' },
): void {
  pen.font = style.font
  pen.textBaseline = 'middle'
  const width = pen.measureText(text).width
  const align = style.align ?? 'center'
  const left = align === 'center' ? x - width / 2 : align === 'right' ? x - width : x
  pen.fillStyle = style.ground
  pen.beginPath()
  pen.roundRect(left - 4, y - 8, width + 8, 16, 3)
  pen.fill()
  pen.fillStyle = style.ink
  pen.textAlign = 'left'
  pen.fillText(text, left, y + 0.5)
}

/** A line with slim arrowheads; where it is too short for the words they stand beside it. */
export function drawDimension(
  pen: Pen,
  fromPx: number,
  toPx: number,
  y: number,
  text: string,
  style: { font: string; ink: string; ground: string; line?: string; isOutsideHidden?: boolean },
): void {
  const left = Math.min(fromPx, toPx)
  const right = Math.max(fromPx, toPx)
  const length = right - left
  pen.strokeStyle = style.line ?? style.ink
  pen.fillStyle = style.line ?? style.ink
  pen.lineWidth = 1
  pen.beginPath()
  pen.moveTo(left, y)
  pen.lineTo(right, y)
  pen.moveTo(left, y - 5)
  pen.lineTo(left, y + 5)
  pen.moveTo(right, y - 5)
  pen.lineTo(right, y + 5)
  pen.stroke()
  if (length > 3 * ARROW_PX) {
    arrowHead(pen, left, y, 1)
    arrowHead(pen, right, y, -1)
  }
  pen.font = style.font
  const width = pen.measureText(text).width
  if (length >= width + 12) drawTag(pen, text, (left + right) / 2, y, style)
  else if (!style.isOutsideHidden) drawTag(pen, text, (left + right) / 2, y + 14, style)
}

function arrowHead(pen: Pen, x: number, y: number, direction: 1 | -1): void {
  pen.beginPath()
  pen.moveTo(x, y)
  pen.lineTo(x + direction * ARROW_PX, y - 2)
  pen.lineTo(x + direction * ARROW_PX, y + 2)
  pen.closePath()
  pen.fill()
}
