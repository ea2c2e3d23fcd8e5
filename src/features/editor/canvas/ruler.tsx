/** The ruler along the top, the lines that carry it down through the drawing, and the station under the pointer. */
import { memo, useCallback } from 'react'
import { formatGiven } from '@/lib/format-quantity'
import { useThemeColours } from '@/lib/theme-colours'
import { stationToPx } from '@/lib/view-transform'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useViewStore } from '../view-store'
import { drawTag, FONT } from './draw-dimension'
import { Drawn, type Pen } from './drawn'
import { rulerTicks } from './ruler-ticks'

export const RULER_HEIGHT_PX = 26
const UNIT_WIDTH_PX = 46

export const StationGrid = memo(function StationGrid() {
  const colours = useThemeColours()
  const isInch = usePreferencesStore((state) => state.units === 'inch')
  const view = useViewStore((state) => state.view)
  const widthPx = useViewStore((state) => state.widthPx)
  const heightPx = useViewStore((state) => state.heightPx)
  const draw = useCallback(
    (pen: Pen) => {
      pen.strokeStyle = colours.hairline
      pen.lineWidth = 1
      pen.globalAlpha = 0.75
      pen.beginPath()
      for (const tick of rulerTicks(view, widthPx, isInch)) {
        if (tick.label === null) continue
        const x = Math.round(stationToPx(view, tick.stationMm)) + 0.5
        pen.moveTo(x, RULER_HEIGHT_PX)
        pen.lineTo(x, heightPx)
      }
      pen.stroke()
    },
    [colours, isInch, view, widthPx, heightPx],
  )
  return <Drawn draw={draw} />
})

/** Drawn above the parts: when zoomed in, hubs slide under the ruler. */
export const Ruler = memo(function Ruler() {
  const colours = useThemeColours()
  const units = usePreferencesStore((state) => state.units)
  const view = useViewStore((state) => state.view)
  const widthPx = useViewStore((state) => state.widthPx)
  const isInch = units === 'inch'
  const draw = useCallback(
    (pen: Pen) => {
      pen.fillStyle = colours.paper
      pen.fillRect(0, 0, widthPx, RULER_HEIGHT_PX)
      pen.strokeStyle = colours.edge
      pen.fillStyle = colours.quiet
      pen.font = FONT.detail
      pen.textAlign = 'center'
      pen.textBaseline = 'alphabetic'
      pen.lineWidth = 1
      pen.beginPath()
      pen.moveTo(0, RULER_HEIGHT_PX - 0.5)
      pen.lineTo(widthPx, RULER_HEIGHT_PX - 0.5)
      for (const tick of rulerTicks(view, widthPx, isInch)) {
        const x = Math.round(stationToPx(view, tick.stationMm)) + 0.5
        pen.moveTo(x, RULER_HEIGHT_PX - (tick.label === null ? 4 : 9))
        pen.lineTo(x, RULER_HEIGHT_PX)
        // The right end belongs to the unit.
        if (tick.label !== null && x < widthPx - UNIT_WIDTH_PX)
          pen.fillText(tick.label, x, RULER_HEIGHT_PX - 12)
      }
      pen.stroke()
      pen.textAlign = 'right'
      pen.fillText(isInch ? 'in' : 'mm', widthPx - 8, RULER_HEIGHT_PX - 12)
    },
    [colours, isInch, view, widthPx],
  )
  return <Drawn draw={draw} />
})

/** The station under the pointer, here or in a diagram. */
export const StationCursor = memo(function StationCursor() {
  const colours = useThemeColours()
  const units = usePreferencesStore((state) => state.units)
  const view = useViewStore((state) => state.view)
  const heightPx = useViewStore((state) => state.heightPx)
  const stationMm = useViewStore((state) => state.hoverStationMm)
  const draw = useCallback(
    (pen: Pen) => {
      if (stationMm === null) return
      const x = Math.round(stationToPx(view, stationMm)) + 0.5
      pen.strokeStyle = colours.steel
      pen.globalAlpha = 0.45
      pen.lineWidth = 1
      pen.beginPath()
      pen.moveTo(x, RULER_HEIGHT_PX)
      pen.lineTo(x, heightPx)
      pen.stroke()
      pen.globalAlpha = 1
      const text = formatGiven(Math.round(stationMm * 10) / 10, 'length', units).text
      drawTag(pen, text, x, RULER_HEIGHT_PX - 13, {
        font: FONT.strong,
        ink: colours.onFill,
        ground: colours.steel,
      })
    },
    [colours, units, view, heightPx, stationMm],
  )
  return <Drawn draw={draw} />
})
