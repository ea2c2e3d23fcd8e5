/** The dimension strip under the section: the chain of section lengths and the whole length. */
import { memo, useCallback } from 'react'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { sectionSpans, totalLengthMm } from '@shared/layout/shaft-geometry'
import { formatGiven } from '@/lib/format-quantity'
import { useThemeColours } from '@/lib/theme-colours'
import { heightToPx, stationToPx } from '@/lib/view-transform'
import { usePreferencesStore } from '@/stores/preferences-store'
import { roundMm } from '../tools/part'
import type { ToolDisplay } from '../tools/tool'
import { useViewStore } from '../view-store'
import { drawDimension, FONT } from './draw-dimension'
import { Drawn, type Pen } from './drawn'
import { neighbourDimensions } from './neighbour-dimensions'

export const DimensionStrip = memo(
  function DimensionStrip({ document }: { document: LayoutDocument }) {
    const colours = useThemeColours()
    const units = usePreferencesStore((state) => state.units)
    const view = useViewStore((state) => state.view)
    const heightPx = useViewStore((state) => state.heightPx)
    const draw = useCallback(
      (pen: Pen) => {
        const spans = sectionSpans(document)
        if (spans.length === 0) return
        const text = (mm: number) => formatGiven(roundMm(mm), 'length', units).number
        const style = { ink: colours.ink, ground: colours.paper, line: colours.edge, isOutsideHidden: true }
        for (const { section, startMm, endMm } of spans) {
          const from = stationToPx(view, startMm)
          const to = stationToPx(view, endMm)
          drawDimension(pen, from, to, heightPx - 32, text(section.lengthMm), { ...style, font: FONT.small })
        }
        const from = stationToPx(view, 0)
        const to = stationToPx(view, totalLengthMm(document))
        const whole = formatGiven(roundMm(totalLengthMm(document)), 'length', units).text
        drawDimension(pen, from, to, heightPx - 13, whole, { ...style, font: FONT.strong })
      },
      [document, units, view, heightPx, colours],
    )
    return <Drawn draw={draw} />
  },
  (a, b) => a.document.shaft === b.document.shaft,
)

/** While something moves: its length and both gaps, right under it. */
export const LiveDimensions = memo(function LiveDimensions({
  document,
  display,
}: {
  document: LayoutDocument
  display: ToolDisplay
}) {
  const colours = useThemeColours()
  const units = usePreferencesStore((state) => state.units)
  const view = useViewStore((state) => state.view)
  const draw = useCallback(
    (pen: Pen) => {
      const live = neighbourDimensions(document, display.movingIds)
      if (!live) return
      const y = heightToPx(view, -live.radiusMm) + 22
      for (const { fromMm, toMm, kind } of live.dimensions) {
        const isOverlap = kind === 'overlap'
        const length = formatGiven(roundMm(toMm - fromMm), 'length', units).text
        drawDimension(
          pen,
          stationToPx(view, fromMm),
          stationToPx(view, toMm),
          // Inside the shaft, where the parts run into each other and nothing else is written.
          isOverlap ? view.originYPx - 20 : y,
          isOverlap ? `✕ overlaps ${length}` : length,
          {
            font: FONT.strong,
            ink: isOverlap ? colours.bad : colours.steel,
            ground: colours.card,
            line: isOverlap ? colours.bad : colours.steel,
          },
        )
      }
    },
    [document, display, view, units, colours],
  )
  return <Drawn draw={draw} />
})
