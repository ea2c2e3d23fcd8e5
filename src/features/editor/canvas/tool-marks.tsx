/** What the tool in hand shows: snap guides, the place of a new part, the selection rectangle, a measurement. */
import { memo, useCallback } from 'react'
import { formatGiven } from '@/lib/format-quantity'
import { type ThemeColours, useThemeColours } from '@/lib/theme-colours'
import { heightToPx, stationToPx, type ViewTransform } from '@/lib/view-transform'
import { usePreferencesStore } from '@/stores/preferences-store'
import { roundMm } from '../tools/part'
import type { Marquee, PlacementMark, ToolDisplay } from '../tools/tool'
import { useViewStore } from '../view-store'
import { drawDimension, drawTag, FONT } from './draw-dimension'
import { Drawn, type Pen } from './drawn'
import { RULER_HEIGHT_PX } from './ruler'

/** Above the dimension strip. */
const GUIDE_WORDS_ABOVE_BOTTOM_PX = 50

function drawGuides(
  pen: Pen,
  view: ViewTransform,
  display: ToolDisplay,
  heightPx: number,
  colours: ThemeColours,
) {
  pen.strokeStyle = colours.bronze
  pen.lineWidth = 1
  for (const guide of display.guides) {
    const x = Math.round(stationToPx(view, guide.stationMm)) + 0.5
    pen.setLineDash([4, 3])
    pen.beginPath()
    pen.moveTo(x, RULER_HEIGHT_PX)
    pen.lineTo(x, heightPx)
    pen.stroke()
    pen.setLineDash([])
    const style = { font: FONT.small, ink: colours.bronze, ground: colours.paper }
    drawTag(pen, guide.kind, x, heightPx - GUIDE_WORDS_ABOVE_BOTTOM_PX, style)
  }
}

/** The stretches of height a new part would fill, in mm above the centre line. */
function placementHalves(mark: PlacementMark): [low: number, high: number][] {
  switch (mark.kind) {
    case 'section':
    case 'step':
      return [[-mark.outerRadiusMm, mark.outerRadiusMm]]
    case 'load':
      return []
    case 'hub':
    case 'bearing':
      return [
        [mark.innerRadiusMm, mark.outerRadiusMm],
        [-mark.outerRadiusMm, -mark.innerRadiusMm],
      ]
  }
}

function drawPlacement(pen: Pen, view: ViewTransform, mark: PlacementMark, colours: ThemeColours) {
  const left = stationToPx(view, mark.leftMm)
  const right = stationToPx(view, mark.rightMm)
  pen.strokeStyle = colours.steel
  pen.fillStyle = colours.steelSoft
  pen.lineWidth = 1.5
  pen.setLineDash([5, 3])
  for (const [low, high] of placementHalves(mark)) {
    pen.beginPath()
    pen.rect(left, heightToPx(view, high), Math.max(right - left, 0.01), (high - low) * view.pxPerMm)
    pen.globalAlpha = 0.55
    pen.fill()
    pen.globalAlpha = 1
    pen.stroke()
  }
  pen.setLineDash([])
  if (mark.kind === 'load') drawLoadMark(pen, view, mark, colours)
  // Within the shaft: above it are the names, below it the loads.
  const y = view.originYPx + (mark.kind === 'load' ? 22 : -22)
  drawTag(pen, mark.caption, (left + right) / 2, y, {
    font: FONT.strong,
    ink: mark.kind === 'load' ? colours.plum : colours.steel,
    ground: colours.card,
  })
}

/** A negative radius stands for a force upwards: the head touches the hub from below. */
function drawLoadMark(pen: Pen, view: ViewTransform, mark: PlacementMark, colours: ThemeColours) {
  const x = stationToPx(view, mark.leftMm)
  const foot = heightToPx(view, -Math.abs(mark.outerRadiusMm)) + 4
  const isUp = mark.outerRadiusMm < 0
  const tip = isUp ? foot : foot + 34
  const back = isUp ? 8 : -8
  pen.strokeStyle = colours.plum
  pen.lineWidth = 2
  pen.beginPath()
  pen.moveTo(x, foot)
  pen.lineTo(x, foot + 34)
  pen.moveTo(x - 5, tip + back)
  pen.lineTo(x, tip)
  pen.lineTo(x + 5, tip + back)
  pen.stroke()
}

function drawMarquee(pen: Pen, view: ViewTransform, marquee: Marquee, colours: ThemeColours) {
  pen.strokeStyle = colours.steel
  pen.fillStyle = colours.steel
  pen.lineWidth = 1
  pen.beginPath()
  pen.rect(
    stationToPx(view, marquee.leftMm),
    heightToPx(view, marquee.topMm),
    (marquee.rightMm - marquee.leftMm) * view.pxPerMm,
    (marquee.topMm - marquee.bottomMm) * view.pxPerMm,
  )
  pen.globalAlpha = 0.12
  pen.fill()
  pen.globalAlpha = 1
  pen.stroke()
}

export const ToolMarks = memo(function ToolMarks({ display }: { display: ToolDisplay }) {
  const colours = useThemeColours()
  const units = usePreferencesStore((state) => state.units)
  const view = useViewStore((state) => state.view)
  const heightPx = useViewStore((state) => state.heightPx)
  const draw = useCallback(
    (pen: Pen) => {
      drawGuides(pen, view, display, heightPx, colours)
      if (display.placement) drawPlacement(pen, view, display.placement, colours)
      if (display.marquee) drawMarquee(pen, view, display.marquee, colours)
      if (!display.measure) return
      const { fromMm, toMm } = display.measure
      const text = formatGiven(roundMm(Math.abs(toMm - fromMm)), 'length', units).text
      const style = { font: FONT.name, ink: colours.bronze, ground: colours.card, line: colours.bronze }
      drawDimension(pen, stationToPx(view, fromMm), stationToPx(view, toMm), view.originYPx - 14, text, style)
    },
    [display, view, heightPx, colours, units],
  )
  return <Drawn draw={draw} />
})
