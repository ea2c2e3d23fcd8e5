/** What lies over the parts: the centre line, the loads, and the handles of the selection. */
import { memo, useCallback, useMemo } from 'react'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { totalLengthMm } from '@shared/layout/shaft-geometry'
import { formatResult } from '@/lib/format-quantity'
import { useThemeColours } from '@/lib/theme-colours'
import { heightToPx, stationToPx } from '@/lib/view-transform'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useSelectionStore } from '@/stores/selection-store'
import { useShownLoadCaseId } from '../shown-loads'
import { handlePlaces } from '../tools/hit-test'
import { loadMarks } from '../tools/load-marks'
import { partExtent } from '../tools/part'
import { useViewStore } from '../view-store'
import { drawLoads } from './draw-loads'
import { Drawn, type Pen } from './drawn'

/** Long dash, dot: the line of symmetry of ISO 128. It runs a little past both ends. */
export const CentreLine = memo(
  function CentreLine({ document }: { document: LayoutDocument }) {
    const colours = useThemeColours()
    const view = useViewStore((state) => state.view)
    const draw = useCallback(
      (pen: Pen) => {
        pen.strokeStyle = colours.quiet
        pen.lineWidth = 1
        pen.setLineDash([18, 4, 2, 4])
        pen.beginPath()
        pen.moveTo(stationToPx(view, 0) - 16, view.originYPx)
        pen.lineTo(stationToPx(view, totalLengthMm(document)) + 16, view.originYPx)
        pen.stroke()
      },
      [document, view, colours],
    )
    return <Drawn draw={draw} />
  },
  (a, b) => a.document.shaft === b.document.shaft,
)

/** While a hub is in hand its live dimensions stand where its loads are; those come back when it is let go. */
export const Loads = memo(function Loads({
  document,
  movingIds,
}: {
  document: LayoutDocument
  movingIds: readonly string[]
}) {
  const colours = useThemeColours()
  const units = usePreferencesStore((state) => state.units)
  const view = useViewStore((state) => state.view)
  const loadCaseId = useShownLoadCaseId(document)
  const selectedIds = useSelectionStore((state) => state.selectedIds)
  const hoveredId = useSelectionStore((state) => state.hoveredId)
  const marks = useMemo(
    () => loadMarks(document, loadCaseId).filter(({ hubId }) => !movingIds.includes(hubId)),
    [document, loadCaseId, movingIds],
  )
  const draw = useCallback(
    (pen: Pen) =>
      drawLoads(pen, view, marks, {
        ink: colours.plum,
        ground: colours.paper,
        isLabelled: (hubId) => hubId === hoveredId || selectedIds.includes(hubId),
        forceText: (forceN) => formatResult(forceN, 'force', units).text,
      }),
    [view, marks, colours, units, selectedIds, hoveredId],
  )
  return <Drawn draw={draw} />
})

export const SelectionHandles = memo(function SelectionHandles({
  document,
  hasHandles,
}: {
  document: LayoutDocument
  hasHandles: boolean
}) {
  const colours = useThemeColours()
  const view = useViewStore((state) => state.view)
  const selectedIds = useSelectionStore((state) => state.selectedIds)
  const draw = useCallback(
    (pen: Pen) => {
      pen.strokeStyle = colours.steel
      for (const id of selectedIds) {
        const extent = partExtent(document, id)
        if (!extent) continue
        const left = stationToPx(view, extent.leftMm)
        const top = heightToPx(view, extent.outerRadiusMm)
        pen.lineWidth = 1.6
        pen.beginPath()
        pen.roundRect(
          left - 3,
          top - 3,
          (extent.rightMm - extent.leftMm) * view.pxPerMm + 6,
          2 * extent.outerRadiusMm * view.pxPerMm + 6,
          3,
        )
        pen.stroke()
      }
      const [onlyId] = selectedIds
      const only = selectedIds.length === 1 && onlyId !== undefined ? partExtent(document, onlyId) : null
      if (!only || !hasHandles) return
      pen.lineWidth = 2
      pen.fillStyle = colours.card
      for (const place of handlePlaces(document, only)) {
        const x = stationToPx(view, place.stationMm)
        const y = heightToPx(view, place.heightMm)
        pen.beginPath()
        if (place.face === 'outside') pen.roundRect(x - 8, y - 6, 16, 6, 3)
        else pen.arc(x, y, 5, 0, 2 * Math.PI)
        pen.fill()
        pen.stroke()
      }
    },
    [document, view, selectedIds, colours, hasHandles],
  )
  return <Drawn draw={draw} />
})
