/** A bearing: a square with its rolling body, above and below; a bar at its foot when it holds the shaft axially. */
import type { Bearing } from '@shared/layout/layout-document'
import type { ThemeColours } from '@/lib/theme-colours'
import type { PartState } from '../part-states'
import type { PartExtent } from '../tools/part'
import type { Pen } from './drawn'

export interface BearingStyle {
  colours: ThemeColours
  state: PartState
  isSelected: boolean
  isHovered: boolean
}

export function drawBearing(
  pen: Pen,
  px: number,
  bearing: Bearing,
  extent: PartExtent,
  style: BearingStyle,
): void {
  const { colours, state } = style
  const { leftMm, rightMm, innerRadiusMm, outerRadiusMm } = extent
  const width = rightMm - leftMm
  const height = outerRadiusMm - innerRadiusMm
  const middle = (innerRadiusMm + outerRadiusMm) / 2
  const isWrong = state.verdict === 'fails'
  const line = isWrong ? colours.bad : colours.steel
  for (const sign of [-1, 1] as const) {
    const top = sign === -1 ? -outerRadiusMm : innerRadiusMm
    pen.beginPath()
    pen.roundRect(leftMm, top, width, height, Math.min(2 * px, width / 4))
    pen.fillStyle = colours.paper
    pen.fill()
    pen.globalAlpha = style.isSelected ? 1 : style.isHovered ? 0.9 : 0.65
    pen.fillStyle = isWrong ? colours.badSoft : colours.steelSoft
    pen.fill()
    pen.globalAlpha = 1
    pen.strokeStyle = line
    pen.lineWidth = (style.isSelected ? 2.2 : 1.3) * px
    pen.setLineDash(isWrong ? [5 * px, 3 * px] : [])
    pen.stroke()
    pen.setLineDash([])
    pen.beginPath()
    pen.arc((leftMm + rightMm) / 2, sign * middle, Math.min(width, height) * 0.3, 0, 2 * Math.PI)
    pen.fillStyle = colours.card
    pen.fill()
    pen.stroke()
    if (bearing.kind === 'locating') drawLocatingMark(pen, px, extent, sign, line)
  }
}

/** Two short bars beside the outer ring: it can move neither left nor right. */
function drawLocatingMark(pen: Pen, px: number, extent: PartExtent, sign: 1 | -1, colour: string): void {
  const height = (extent.outerRadiusMm - extent.innerRadiusMm) * 0.45
  const far = sign * extent.outerRadiusMm
  pen.beginPath()
  for (const x of [extent.leftMm - 3 * px, extent.rightMm + 3 * px]) {
    pen.moveTo(x, far)
    pen.lineTo(x, far - sign * height)
  }
  pen.strokeStyle = colour
  pen.lineWidth = 2.4 * px
  pen.stroke()
}
