/** Names over the hubs with fit and verdict in words, and diameters on the shaft. */
import { memo, useCallback, useMemo } from 'react'
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'
import { sectionSpans } from '@shared/layout/shaft-geometry'
import { formatGiven } from '@/lib/format-quantity'
import { useThemeColours } from '@/lib/theme-colours'
import { heightToPx, stationToPx, type ViewTransform } from '@/lib/view-transform'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useSelectionStore } from '@/stores/selection-store'
import { type PartState, stateOf } from '../part-states'
import { bearingExtent, hubExtent } from '../tools/part'
import { drawingMargins, useViewStore } from '../view-store'
import { FONT } from './draw-dimension'
import { Drawn, type Pen } from './drawn'
import { LABEL_LINE_PX, type LabelWish, placeLabels } from './label-layout'
import { RULER_HEIGHT_PX } from './ruler'

interface HubWords {
  hub: Hub
  state: PartState
  lines: string[]
}

function wordsOf(hub: Hub, state: PartState, diameter: string): HubWords {
  const fit = hub.fit.kind === 'iso286' ? `${hub.fit.hole}/${hub.fit.shaft}` : 'own limits'
  const verdict = state.words === '' ? [] : [`${state.verdict === 'fails' ? '✕' : '!'} ${state.words}`]
  return { hub, state, lines: [hub.name, `⌀${diameter} ${fit}`, ...verdict] }
}

const fontOfLine = (index: number) => (index === 0 ? FONT.name : index === 1 ? FONT.detail : FONT.strong)

/** The verdict matters more than the fit: with room for two lines it takes the second place. */
function linesShown({ lines }: HubWords, count: number): { text: string; index: number }[] {
  const all = lines.map((text, index) => ({ text, index }))
  return count === 2 && all.length === 3 ? all.filter(({ index }) => index !== 1) : all.slice(0, count)
}

function measureAll(pen: Pen, document: LayoutDocument, words: readonly HubWords[], view: ViewTransform) {
  return words.map((entry) => {
    const extent = hubExtent(document, entry.hub)
    return {
      id: entry.hub.id,
      centrePx: stationToPx(view, (extent.leftMm + extent.rightMm) / 2),
      topPx: heightToPx(view, extent.outerRadiusMm),
      leftPx: stationToPx(view, extent.leftMm),
      rightPx: stationToPx(view, extent.rightMm),
      lineWidthsPx: entry.lines.map((line, index) => {
        pen.font = fontOfLine(index)
        return pen.measureText(line).width
      }),
    }
  })
}

export const PartLabels = memo(function PartLabels({
  document,
  states,
}: {
  document: LayoutDocument
  states: ReadonlyMap<string, PartState>
}) {
  const colours = useThemeColours()
  const units = usePreferencesStore((state) => state.units)
  const view = useViewStore((state) => state.view)
  const widthPx = useViewStore((state) => state.widthPx)
  const selectedIds = useSelectionStore((state) => state.selectedIds)

  const words = useMemo(
    () =>
      document.hubs.map((hub) => {
        const diameter = formatGiven(hubExtent(document, hub).innerRadiusMm * 2, 'length', units)
        return wordsOf(hub, stateOf(states, hub.id), diameter.number)
      }),
    [document, states, units],
  )

  const draw = useCallback(
    (pen: Pen) => {
      const wishes: LabelWish[] = measureAll(pen, document, words, view).map((wish, index) => ({
        ...wish,
        // Clear of the outline and the handle on top of a selected hub.
        topPx: wish.topPx - (selectedIds.includes(wish.id) ? 7 : 0),
        isImportant: selectedIds.includes(wish.id) || words[index]?.state.verdict === 'fails',
      }))
      const bodies = document.bearings.map((bearing) => {
        const extent = bearingExtent(document, bearing)
        return {
          left: stationToPx(view, extent.leftMm),
          right: stationToPx(view, extent.rightMm),
          top: heightToPx(view, extent.outerRadiusMm),
          bottom: Infinity,
        }
      })
      const frame = {
        topPx: RULER_HEIGHT_PX + 3,
        leftPx: drawingMargins(widthPx, 0).left - 4,
        rightPx: widthPx - 4,
      }
      const placed = placeLabels(wishes, frame, bodies)
      pen.textAlign = 'center'
      pen.textBaseline = 'alphabetic'
      for (const label of placed) {
        const entry = words.find(({ hub }) => hub.id === label.id)
        const wish = wishes.find(({ id }) => id === label.id)
        if (!entry || !wish) continue
        if (label.isRaised) {
          pen.strokeStyle = colours.edge
          pen.lineWidth = 0.8
          pen.beginPath()
          pen.moveTo(wish.centrePx, label.bottomPx + 3)
          pen.lineTo(wish.centrePx, wish.topPx)
          pen.stroke()
        }
        const shown = linesShown(entry, label.lines)
        shown.forEach(({ text, index }, row) => {
          pen.font = fontOfLine(index)
          pen.fillStyle =
            index === 0
              ? selectedIds.includes(label.id)
                ? colours.steel
                : colours.ink
              : index === 1
                ? colours.quiet
                : entry.state.verdict === 'fails'
                  ? colours.bad
                  : colours.strawInk
          pen.fillText(text, label.centrePx, label.bottomPx - (shown.length - 1 - row) * LABEL_LINE_PX)
        })
      }
    },
    [document, words, view, widthPx, colours, selectedIds],
  )
  return <Drawn draw={draw} />
})

/** The diameter stands on each section long enough for it, below the centre line where nothing is cut. */
export const DiameterLabels = memo(function DiameterLabels({ document }: { document: LayoutDocument }) {
  const colours = useThemeColours()
  const units = usePreferencesStore((state) => state.units)
  const view = useViewStore((state) => state.view)
  const draw = useCallback(
    (pen: Pen) => {
      pen.font = FONT.small
      pen.textAlign = 'center'
      pen.textBaseline = 'middle'
      pen.fillStyle = colours.quiet
      for (const { section, startMm, endMm } of sectionSpans(document)) {
        const bore = section.boreDiameterMm
        const text =
          `⌀${formatGiven(section.outerDiameterMm, 'length', units).number}` +
          (bore > 0 ? `/${formatGiven(bore, 'length', units).number}` : '')
        const roomPx = (endMm - startMm) * view.pxPerMm
        const heightPx = (section.outerDiameterMm / 2) * view.pxPerMm
        if (pen.measureText(text).width + 8 > roomPx || heightPx < 16) continue
        pen.fillText(text, stationToPx(view, (startMm + endMm) / 2), view.originYPx + heightPx * 0.55)
      }
    },
    [document, units, view, colours],
  )
  return <Drawn draw={draw} />
})
