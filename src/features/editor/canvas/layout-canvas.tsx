/**
 * The drawing of the shaft. Konva keeps three layers: ground, parts, and what moves or lies on top,
 * so that a drag redraws only the last one. The canvas has no content for a screen reader; the
 * labelled wrapper says what it shows and the outline mirrors it.
 */
import { type ReactNode, useEffect, useId, useMemo, useRef, useState } from 'react'
import type Konva from 'konva/lib/Core'
import { Group, Layer, Stage } from 'react-konva/lib/ReactKonvaCore'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { totalLengthMm } from '@shared/layout/shaft-geometry'
import { useLayoutStore } from '@/stores/layout-store'
import { usePartStates } from '../part-states'
import { useToolStore } from '../tool-store'
import type { ToolDriver } from '../tool-driver'
import { partExtents } from '../tools/part'
import { useViewStore } from '../view-store'
import { BearingLabels } from './bearing-labels'
import { DimensionStrip, LiveDimensions } from './dimensions'
import { DrawingBoundary } from './drawing-boundary'
import { CentreLine, Loads, SelectionHandles } from './marks'
import { DiameterLabels, PartLabels } from './part-labels'
import { PlacedParts, ShaftDrawing } from './parts'
import { Ruler, StationCursor, StationGrid } from './ruler'
import { ToolMarks } from './tool-marks'
import { useCanvasPointer } from './use-canvas-pointer'
import { useCanvasWheel } from './use-canvas-wheel'

interface LayoutCanvasProps {
  document: LayoutDocument
  driver: ToolDriver
  onCursor: (cursor: { xMm: number; yMm: number } | null) => void
  onContextMenu: (place: { xPx: number; yPx: number }) => void
  letsPageScroll: boolean
  /** DOM laid over the drawing, such as other people's cursors. */
  children?: ReactNode
}

const radiusMmOf = (document: LayoutDocument) =>
  Math.max(10, ...partExtents(document).map((part) => part.outerRadiusMm))

/** Keeps the store's size in step with the wrapper and redraws once the typeface is there. */
function useCanvasSize(
  wrapper: React.RefObject<HTMLDivElement | null>,
  stage: React.RefObject<Konva.Stage | null>,
) {
  useEffect(() => {
    const element = wrapper.current
    if (!element) return
    const observer = new ResizeObserver(([entry]) => {
      if (!entry) return
      const { width, height } = entry.contentRect
      useViewStore.getState().resize(Math.floor(width), Math.floor(height))
    })
    observer.observe(element)
    void Promise.all(['500', '700'].map((weight) => document.fonts.load(`${weight} 12px Manrope`))).then(() =>
      stage.current?.batchDraw(),
    )
    return () => observer.disconnect()
  }, [wrapper, stage])
}

export function LayoutCanvas({
  document,
  driver,
  onCursor,
  onContextMenu,
  letsPageScroll,
  children,
}: LayoutCanvasProps) {
  const wrapper = useRef<HTMLDivElement>(null)
  const stage = useRef<Konva.Stage>(null)
  const helpId = useId()
  const [failure, setFailure] = useState<string | null>(null)
  const view = useViewStore((state) => state.view)
  const widthPx = useViewStore((state) => state.widthPx)
  const heightPx = useViewStore((state) => state.heightPx)
  const display = useToolStore((state) => state.display)
  const hasHandles = useToolStore((state) => state.toolId === 'select')
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  const confirmed = useLayoutStore((state) => state.confirmed)
  const states = usePartStates()

  useCanvasSize(wrapper, stage)
  useCanvasWheel(wrapper)
  const handlers = useCanvasPointer({ driver, onCursor, onContextMenu })

  useEffect(() => {
    if (!confirmed) return
    useViewStore.getState().setBounds({
      leftMm: 0,
      rightMm: totalLengthMm(confirmed),
      radiusMm: radiusMmOf(confirmed),
    })
  }, [confirmed])

  const moving = useMemo(() => new Set(display.movingIds), [display.movingIds])
  const failing = [...states.values()].filter(({ verdict }) => verdict === 'fails').length
  const place = {
    x: view.originXPx,
    y: view.originYPx,
    scaleX: view.pxPerMm,
    scaleY: view.pxPerMm,
  }

  return (
    <div
      ref={wrapper}
      data-testid="layout-canvas"
      data-px-per-mm={view.pxPerMm}
      data-origin-x-px={view.originXPx}
      data-origin-y-px={view.originYPx}
      className="relative min-h-0 min-w-0 flex-1 overflow-hidden select-none"
    >
      <div
        role="img"
        aria-label={`Half section of ${document.name}: ${document.hubs.length} hubs, ${document.bearings.length} bearings, ${failing === 0 ? 'nothing fails' : `${failing} failing`}`}
        aria-describedby={helpId}
        className="absolute inset-0"
        style={{ cursor: display.cursor, touchAction: letsPageScroll ? 'pan-y' : 'none' }}
        {...handlers}
      >
        {widthPx > 0 && (
          <Stage ref={stage} width={widthPx} height={heightPx} listening={false}>
            <Layer listening={false}>
              <DrawingBoundary onError={setFailure}>
                <StationGrid />
              </DrawingBoundary>
            </Layer>
            <Layer listening={false}>
              <DrawingBoundary onError={setFailure}>
                <Group {...place}>
                  <ShaftDrawing document={document} />
                  <PlacedParts document={document} states={states} isIncluded={(id) => !moving.has(id)} />
                </Group>
                <DiameterLabels document={document} />
                <CentreLine document={document} />
              </DrawingBoundary>
            </Layer>
            <Layer listening={false}>
              <DrawingBoundary onError={setFailure}>
                <Group {...place}>
                  <PlacedParts document={document} states={states} isIncluded={(id) => moving.has(id)} />
                </Group>
                <BearingLabels document={document} states={states} />
                <Loads document={document} movingIds={display.movingIds} />
                <PartLabels document={document} states={states} />
                <DimensionStrip document={document} />
                <SelectionHandles document={document} hasHandles={canEdit && hasHandles} />
                <LiveDimensions document={document} display={display} />
                <ToolMarks display={display} />
                <Ruler />
                <StationCursor />
              </DrawingBoundary>
            </Layer>
          </Stage>
        )}
      </div>
      <p id={helpId} className="sr-only">
        Every part is also in the outline, where it can be selected, moved and removed with the keyboard.
      </p>
      {failure !== null && (
        <p role="alert" className="absolute inset-x-8 top-1/3 rounded bg-bad-soft p-4 text-center text-bad">
          {failure}
        </p>
      )}
      {children}
    </div>
  )
}
