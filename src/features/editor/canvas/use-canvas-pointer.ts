/** Turns browser pointer events on the drawing into plain pointer records for the tool driver. */
import { type PointerEvent, useCallback, useMemo, useRef } from 'react'
import { pxToHeight, pxToStation } from '@/lib/view-transform'
import { useLayoutStore } from '@/stores/layout-store'
import { useSelectionStore } from '@/stores/selection-store'
import { shownLoadCaseId } from '../shown-loads'
import type { ToolDriver } from '../tool-driver'
import { useToolStore } from '../tool-store'
import { hitTest } from '../tools/hit-test'
import type { ToolPointer } from '../tools/tool'
import { useViewStore } from '../view-store'

const MIDDLE_BUTTON = 1
const RIGHT_BUTTON = 2

interface Finger {
  xPx: number
  yPx: number
}

interface CanvasPointerOptions {
  driver: ToolDriver
  onCursor: (cursor: { xMm: number; yMm: number } | null) => void
  onContextMenu: (place: { xPx: number; yPx: number }) => void
}

export function useCanvasPointer({ driver, onCursor, onContextMenu }: CanvasPointerOptions) {
  const fingers = useRef(new Map<number, Finger>())
  const isPinching = useRef(false)

  const record = useCallback((event: PointerEvent<HTMLElement>): ToolPointer => {
    const { view } = useViewStore.getState()
    const box = event.currentTarget.getBoundingClientRect()
    const xPx = event.clientX - box.left
    const yPx = event.clientY - box.top
    const place = { stationMm: pxToStation(view, xPx), heightMm: pxToHeight(view, yPx) }
    const { visible, access } = useLayoutStore.getState()
    const isTouch = event.pointerType === 'touch'
    return {
      ...place,
      xPx,
      yPx,
      isTouch,
      shift: event.shiftKey,
      alt: event.altKey,
      control: event.ctrlKey || event.metaKey,
      hit: visible
        ? hitTest({
            ...place,
            document: visible,
            mmPerPx: 1 / view.pxPerMm,
            selectedIds: useSelectionStore.getState().selectedIds,
            loadCaseId: shownLoadCaseId(visible),
            canEdit: (access?.canEdit ?? false) && useToolStore.getState().toolId === 'select',
            isTouch,
          })
        : null,
    }
  }, [])

  return useMemo(() => {
    /** Two fingers shift and zoom together, about the point between them. */
    const pinch = (event: PointerEvent<HTMLElement>, now: Finger) => {
      const other = [...fingers.current].find(([id]) => id !== event.pointerId)?.[1]
      const before = fingers.current.get(event.pointerId)
      if (!other || !before) return
      const spread = (finger: Finger) =>
        Math.max(10, Math.hypot(finger.xPx - other.xPx, finger.yPx - other.yPx))
      const store = useViewStore.getState()
      store.pan((now.xPx - before.xPx) / 2, (now.yPx - before.yPx) / 2)
      store.zoom(spread(now) / spread(before), (now.xPx + other.xPx) / 2, (now.yPx + other.yPx) / 2)
    }

    return {
      onPointerDown(event: PointerEvent<HTMLElement>) {
        const pointer = record(event)
        event.currentTarget.setPointerCapture(event.pointerId)
        if (pointer.isTouch) {
          fingers.current.set(event.pointerId, pointer)
          if (fingers.current.size === 2) {
            driver.cancel()
            isPinching.current = true
          }
          if (isPinching.current) return
        }
        if (event.button === MIDDLE_BUTTON) {
          event.preventDefault()
          driver.holdPan(true)
        }
        if (event.button !== RIGHT_BUTTON) driver.pointer('down', pointer)
      },
      onPointerMove(event: PointerEvent<HTMLElement>) {
        const pointer = record(event)
        if (isPinching.current) {
          pinch(event, pointer)
          fingers.current.set(event.pointerId, pointer)
          return
        }
        useViewStore.getState().hoverStation(pointer.stationMm)
        onCursor({ xMm: pointer.stationMm, yMm: pointer.heightMm })
        driver.pointer('move', pointer)
      },
      onPointerUp(event: PointerEvent<HTMLElement>) {
        fingers.current.delete(event.pointerId)
        if (isPinching.current) {
          isPinching.current = fingers.current.size > 0
          return
        }
        if (event.button === RIGHT_BUTTON) return
        driver.pointer('up', record(event))
        if (event.button === MIDDLE_BUTTON) driver.holdPan(false)
      },
      onPointerCancel(event: PointerEvent<HTMLElement>) {
        fingers.current.delete(event.pointerId)
        isPinching.current = fingers.current.size > 0
        driver.cancel()
        driver.holdPan(false)
      },
      onPointerLeave(event: PointerEvent<HTMLElement>) {
        if (event.currentTarget.hasPointerCapture(event.pointerId)) return
        useViewStore.getState().hoverStation(null)
        onCursor(null)
        driver.leave()
      },
      onContextMenu(event: React.MouseEvent<HTMLElement>) {
        event.preventDefault()
        const box = event.currentTarget.getBoundingClientRect()
        const place = { xPx: event.clientX - box.left, yPx: event.clientY - box.top }
        const { hoveredId, selectedIds, select } = useSelectionStore.getState()
        if (hoveredId !== null && !selectedIds.includes(hoveredId)) select([hoveredId])
        onContextMenu(place)
      },
    }
  }, [driver, record, onCursor, onContextMenu])
}
