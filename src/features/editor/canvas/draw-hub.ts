/** A hub: cut and hatched above the centre line, its outside below, its seat coloured and patterned by verdict. */
import type { Hub } from '@shared/layout/layout-document'
import type { ThemeColours } from '@/lib/theme-colours'
import type { PartState, PartVerdict } from '../part-states'
import type { PartExtent } from '../tools/part'
import { hatchPath } from './draw-hatching'
import type { Pen } from './drawn'

const HATCH_PX = 7

export interface HubStyle {
  colours: ThemeColours
  state: PartState
  /** Neighbours lean opposite ways. */
  hatchLeansRight: boolean
  isSelected: boolean
  isHovered: boolean
}

/** Closed outline of one half; `sign` -1 is above the centre line. The chamfers are at the bore. */
function halfPath(pen: Pen, hub: Hub, extent: PartExtent, sign: 1 | -1): void {
  const { leftMm, rightMm, innerRadiusMm, outerRadiusMm } = extent
  const wall = outerRadiusMm - innerRadiusMm
  const width = rightMm - leftMm
  const left = Math.min(hub.chamferLeftMm, wall / 2, width / 2)
  const right = Math.min(hub.chamferRightMm, wall / 2, width / 2)
  pen.beginPath()
  pen.moveTo(leftMm, sign * outerRadiusMm)
  pen.lineTo(rightMm, sign * outerRadiusMm)
  pen.lineTo(rightMm, sign * (innerRadiusMm + right))
  pen.lineTo(rightMm - right, sign * innerRadiusMm)
  pen.lineTo(leftMm + left, sign * innerRadiusMm)
  pen.lineTo(leftMm, sign * (innerRadiusMm + left))
  pen.closePath()
}

export function drawHub(pen: Pen, px: number, hub: Hub, extent: PartExtent, style: HubStyle): void {
  const { colours, state } = style
  for (const sign of [-1, 1] as const) {
    halfPath(pen, hub, extent, sign)
    pen.fillStyle = colours.paper
    pen.fill()
    pen.globalAlpha = style.isSelected ? 1 : style.isHovered ? 0.95 : 0.6
    pen.fillStyle = style.isSelected ? colours.steelSoft : colours.hairline
    pen.fill()
    pen.globalAlpha = 1
    if (sign === -1) {
      hatch(pen, px, extent, sign, style.hatchLeansRight, style.isSelected ? colours.steel : colours.quiet)
    }
    if (state.isMisplaced) {
      hatch(pen, px, extent, sign, true, colours.bad)
      hatch(pen, px, extent, sign, false, colours.bad)
    }
    halfPath(pen, hub, extent, sign)
    pen.strokeStyle = state.isMisplaced ? colours.bad : style.isSelected ? colours.steel : colours.ink
    pen.lineWidth = (style.isSelected ? 2 : 1.5) * px
    pen.setLineDash(state.isMisplaced ? [6 * px, 3 * px] : [])
    pen.stroke()
    pen.setLineDash([])
    drawSeat(pen, px, hub, extent, sign, state.verdict, colours)
  }
}

function hatch(
  pen: Pen,
  px: number,
  extent: PartExtent,
  sign: 1 | -1,
  leansRight: boolean,
  colour: string,
): void {
  const { leftMm, rightMm, innerRadiusMm, outerRadiusMm } = extent
  const [top, bottom] = sign === -1 ? [-outerRadiusMm, -innerRadiusMm] : [innerRadiusMm, outerRadiusMm]
  pen.beginPath()
  hatchPath(pen, { left: leftMm, right: rightMm, top, bottom }, HATCH_PX * px, leansRight)
  pen.strokeStyle = colour
  pen.lineWidth = 0.8 * px
  pen.globalAlpha = 0.75
  pen.stroke()
  pen.globalAlpha = 1
}

export const verdictColour = (verdict: PartVerdict, colours: ThemeColours): string =>
  verdict === 'holds'
    ? colours.good
    : verdict === 'fails'
      ? colours.bad
      : verdict === 'warns'
        ? colours.straw
        : colours.edge

/** Holds: a solid bar. Fails: a saw line on it. Warns: long dashes. Not computed: dots. */
function drawSeat(
  pen: Pen,
  px: number,
  hub: Hub,
  { leftMm, rightMm, innerRadiusMm }: PartExtent,
  sign: 1 | -1,
  verdict: PartVerdict,
  colours: ThemeColours,
): void {
  const y = sign * innerRadiusMm
  const from = Math.min(leftMm + hub.chamferLeftMm, rightMm)
  const to = Math.max(rightMm - hub.chamferRightMm, from)
  pen.strokeStyle = verdictColour(verdict, colours)
  pen.lineCap = 'butt'
  pen.lineWidth = 4 * px
  pen.setLineDash(verdict === 'warns' ? [9 * px, 4 * px] : verdict === 'unknown' ? [2 * px, 4 * px] : [])
  pen.beginPath()
  pen.moveTo(from, y)
  pen.lineTo(to, y)
  pen.stroke()
  pen.setLineDash([])
  if (verdict !== 'fails') return
  const tooth = 4 * px
  const count = Math.max(1, Math.floor((to - from) / (2 * tooth)))
  const pitch = (to - from) / count
  pen.beginPath()
  pen.moveTo(from, y)
  for (let index = 0; index < count; index += 1) {
    pen.lineTo(from + (index + 0.5) * pitch, y + sign * 5.5 * px)
    pen.lineTo(from + (index + 1) * pitch, y)
  }
  pen.lineWidth = 1.6 * px
  pen.lineJoin = 'miter'
  pen.stroke()
}
