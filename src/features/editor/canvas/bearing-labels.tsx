/** Names under the bearings. They keep off each other, the tools at the left and the loads of near hubs. */
import { memo, useCallback } from 'react'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { useThemeColours } from '@/lib/theme-colours'
import { heightToPx, stationToPx, type ViewTransform } from '@/lib/view-transform'
import { type PartState, stateOf } from '../part-states'
import { useShownLoadCaseId } from '../shown-loads'
import { type LoadMark, loadMarks } from '../tools/load-marks'
import { bearingExtent } from '../tools/part'
import { drawingMargins, useViewStore } from '../view-store'
import { drawTag, FONT } from './draw-dimension'
import { Drawn, type Pen } from './drawn'
import type { LabelBox } from './label-layout'

const BELOW_PX = 12
const ROW_PX = 15
const MOST_ROWS = 3
const HALF_HEIGHT_PX = 8

/** The ground a load covers: its arrow, and the sign for the force out of the plane beside it. */
function loadBox(mark: LoadMark, view: ViewTransform): LabelBox {
  const x = stationToPx(view, mark.stationMm)
  const top = heightToPx(view, -mark.radiusMm) + 4
  return {
    left: x - 6 + Math.min(0, mark.axialPx),
    right: x + Math.max(mark.outOfPlane === 0 ? 6 : 17, mark.axialPx),
    top,
    bottom: top + Math.max(14, Math.abs(mark.forceYPx)) + (mark.axialPx === 0 ? 0 : 10),
  }
}

const touches = (a: LabelBox, b: LabelBox) =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom

interface BearingLabelsProps {
  document: LayoutDocument
  states: ReadonlyMap<string, PartState>
}

export const BearingLabels = memo(function BearingLabels({ document, states }: BearingLabelsProps) {
  const colours = useThemeColours()
  const view = useViewStore((state) => state.view)
  const widthPx = useViewStore((state) => state.widthPx)
  const loadCaseId = useShownLoadCaseId(document)
  const draw = useCallback(
    (pen: Pen) => {
      pen.font = FONT.strong
      const taken = loadMarks(document, loadCaseId).map((mark) => loadBox(mark, view))
      const frame = { left: drawingMargins(widthPx, 0).left - 4, right: widthPx - 4 }
      for (const bearing of [...document.bearings].sort((a, b) => a.stationMm - b.stationMm)) {
        const extent = bearingExtent(document, bearing)
        const state = stateOf(states, bearing.id)
        const isWrong = state.verdict === 'fails'
        const x = stationToPx(view, bearing.stationMm)
        const top = heightToPx(view, -extent.outerRadiusMm) + BELOW_PX
        const boxOf = (text: string, row: number): LabelBox => {
          const half = pen.measureText(text).width / 2 + 5
          const isInFrame = x >= frame.left && x <= frame.right
          const middle = isInFrame ? Math.min(Math.max(x, frame.left + half), frame.right - half) : x
          const y = top + row * ROW_PX
          return {
            left: middle - half,
            right: middle + half,
            top: y - HALF_HEIGHT_PX,
            bottom: y + HALF_HEIGHT_PX,
          }
        }
        const whole = isWrong ? `✕ ${bearing.name} ${state.words}` : `${bearing.name}, ${bearing.kind}`
        const short = isWrong ? `✕ ${bearing.name}` : bearing.name
        // The short name at its place goes before the whole one further down.
        const wishes = Array.from({ length: MOST_ROWS }, (_, row) =>
          [whole, short].map((text) => ({ text, box: boxOf(text, row) })),
        ).flat()
        // Where nothing is free the name alone still stands under its bearing.
        const { text, box } = wishes.find((wish) => !taken.some((other) => touches(wish.box, other))) ?? {
          text: short,
          box: boxOf(short, 0),
        }
        taken.push(box)
        drawTag(pen, text, (box.left + box.right) / 2, box.top + HALF_HEIGHT_PX, {
          font: FONT.strong,
          ink: isWrong ? colours.bad : colours.steel,
          ground: colours.paper,
        })
      }
    },
    [document, states, view, widthPx, loadCaseId, colours],
  )
  return <Drawn draw={draw} />
})
