/** The parts as konva shapes, one per part, so that moving one draws one. */
import { memo, useCallback, useMemo } from 'react'
import type { Bearing, Hub, LayoutDocument } from '@shared/layout/layout-document'
import { sectionSpans } from '@shared/layout/shaft-geometry'
import { useThemeColours } from '@/lib/theme-colours'
import { useSelectionStore } from '@/stores/selection-store'
import { type PartState, stateOf } from '../part-states'
import { bearingExtent, hubExtent, type PartExtent } from '../tools/part'
import { drawBearing } from './draw-bearing'
import { drawHub } from './draw-hub'
import { drawShaft } from './draw-shaft'
import { Drawn, type Pen } from './drawn'

export const ShaftDrawing = memo(
  function ShaftDrawing({ document }: { document: LayoutDocument }) {
    const colours = useThemeColours()
    const selectedIds = useSelectionStore((state) => state.selectedIds)
    const hoveredId = useSelectionStore((state) =>
      document.shaft.sections.some(({ id }) => id === state.hoveredId) ? state.hoveredId : null,
    )
    const spans = useMemo(() => sectionSpans(document), [document])
    const draw = useCallback(
      (pen: Pen, px: number) =>
        drawShaft(pen, px, spans, { colours, selectedIds: new Set(selectedIds), hoveredId }),
      [spans, colours, selectedIds, hoveredId],
    )
    return <Drawn draw={draw} />
  },
  (a, b) => a.document.shaft === b.document.shaft,
)

interface HubDrawingProps {
  hub: Hub
  /** Only what the extent depends on, compared by value: the shaft under the hub may change without the hub. */
  extent: PartExtent
  state: PartState
  hatchLeansRight: boolean
}

const isSameExtent = (a: PartExtent, b: PartExtent) =>
  a.leftMm === b.leftMm &&
  a.rightMm === b.rightMm &&
  a.innerRadiusMm === b.innerRadiusMm &&
  a.outerRadiusMm === b.outerRadiusMm

const isSameState = (a: PartState, b: PartState) =>
  a.verdict === b.verdict && a.words === b.words && a.isMisplaced === b.isMisplaced

export const HubDrawing = memo(
  function HubDrawing({ hub, extent, state, hatchLeansRight }: HubDrawingProps) {
    const colours = useThemeColours()
    const isSelected = useSelectionStore((store) => store.selectedIds.includes(hub.id))
    const isHovered = useSelectionStore((store) => store.hoveredId === hub.id)
    const draw = useCallback(
      (pen: Pen, px: number) =>
        drawHub(pen, px, hub, extent, { colours, state, hatchLeansRight, isSelected, isHovered }),
      [hub, extent, colours, state, hatchLeansRight, isSelected, isHovered],
    )
    return <Drawn draw={draw} />
  },
  (a, b) =>
    a.hub === b.hub &&
    a.hatchLeansRight === b.hatchLeansRight &&
    isSameExtent(a.extent, b.extent) &&
    isSameState(a.state, b.state),
)

export const BearingDrawing = memo(
  function BearingDrawing({
    bearing,
    extent,
    state,
  }: {
    bearing: Bearing
    extent: PartExtent
    state: PartState
  }) {
    const colours = useThemeColours()
    const isSelected = useSelectionStore((store) => store.selectedIds.includes(bearing.id))
    const isHovered = useSelectionStore((store) => store.hoveredId === bearing.id)
    const draw = useCallback(
      (pen: Pen, px: number) =>
        drawBearing(pen, px, bearing, extent, { colours, state, isSelected, isHovered }),
      [bearing, extent, colours, state, isSelected, isHovered],
    )
    return <Drawn draw={draw} />
  },
  (a, b) => a.bearing === b.bearing && isSameExtent(a.extent, b.extent) && isSameState(a.state, b.state),
)

/** Hubs and bearings of the document, those in hand or those at rest. */
export function PlacedParts({
  document,
  states,
  isIncluded,
}: {
  document: LayoutDocument
  states: ReadonlyMap<string, PartState>
  isIncluded: (id: string) => boolean
}) {
  // Alternation goes by order along the shaft, not by order in the list.
  const leaning = useMemo(() => {
    const ordered = [...document.hubs].sort((a, b) => a.stationMm - b.stationMm)
    return new Map(ordered.map((hub, index) => [hub.id, index % 2 === 0]))
  }, [document.hubs])
  return (
    <>
      {document.bearings.map(
        (bearing) =>
          isIncluded(bearing.id) && (
            <BearingDrawing
              key={bearing.id}
              bearing={bearing}
              extent={bearingExtent(document, bearing)}
              state={stateOf(states, bearing.id)}
            />
          ),
      )}
      {document.hubs.map(
        (hub) =>
          isIncluded(hub.id) && (
            <HubDrawing
              key={hub.id}
              hub={hub}
              extent={hubExtent(document, hub)}
              state={stateOf(states, hub.id)}
              hatchLeansRight={leaning.get(hub.id) ?? true}
            />
          ),
      )}
    </>
  )
}
