/** What part of the layout is on screen, shared by section and diagrams, and the station under the pointer. */
import { create } from 'zustand'
import {
  type DrawingBounds,
  heightToPx,
  panBy,
  stationToPx,
  type ViewMargins,
  type ViewTransform,
  zoomAt,
  zoomToBounds,
} from '@/lib/view-transform'

/**
 * Room for the ruler and the names above the drawing, for loads and dimensions below it, and for the
 * tools at its left.
 */
export function drawingMargins(widthPx: number, heightPx: number): ViewMargins {
  const isNarrow = widthPx < 560
  return {
    left: isNarrow ? 16 : 116,
    right: isNarrow ? 16 : 28,
    // Three lines of a failing hub's name and words.
    top: 76,
    bottom: Math.min(88, Math.max(62, heightPx * 0.24)),
  }
}

/** True while the bounds keep at least half of their margins. */
function isInSight(bounds: DrawingBounds, view: ViewTransform, widthPx: number, heightPx: number): boolean {
  const margins = drawingMargins(widthPx, heightPx)
  return (
    stationToPx(view, bounds.leftMm) >= margins.left / 2 &&
    stationToPx(view, bounds.rightMm) <= widthPx - margins.right / 2 &&
    heightToPx(view, bounds.radiusMm) >= margins.top / 2 &&
    heightToPx(view, -bounds.radiusMm) <= heightPx - margins.bottom / 2
  )
}

interface ViewState {
  view: ViewTransform
  widthPx: number
  heightPx: number
  /** True until somebody pans or zooms: then a change of size keeps the whole shaft in sight. */
  isWhole: boolean
  bounds: DrawingBounds | null
  hoverStationMm: number | null
  resize: (widthPx: number, heightPx: number) => void
  /**
   * Says what "the whole shaft" is. It does not move the drawing under somebody's hand, unless the
   * shaft has outgrown a drawing that was to show it whole.
   */
  setBounds: (bounds: DrawingBounds) => void
  showWhole: () => void
  pan: (dxPx: number, dyPx: number) => void
  zoom: (factor: number, xPx?: number, yPx?: number) => void
  /** Shifts the drawing just enough to bring a stretch of shaft into sight. */
  reveal: (leftMm: number, rightMm: number) => void
  hoverStation: (stationMm: number | null) => void
}

export const useViewStore = create<ViewState>()((set, get) => ({
  view: { pxPerMm: 2, originXPx: 120, originYPx: 200 },
  widthPx: 0,
  heightPx: 0,
  isWhole: true,
  bounds: null,
  hoverStationMm: null,
  resize: (widthPx, heightPx) => {
    const { widthPx: oldWidth, heightPx: oldHeight, isWhole, view } = get()
    if (oldWidth === widthPx && oldHeight === heightPx) return
    // Somebody's own view keeps its middle; only the first size has no middle to keep.
    const kept = oldWidth === 0 ? view : panBy(view, 0, (heightPx - oldHeight) / 2)
    set({ widthPx, heightPx, view: kept })
    if (isWhole) get().showWhole()
  },
  setBounds: (bounds) => {
    const { bounds: before, isWhole, view, widthPx, heightPx } = get()
    set({ bounds })
    if (isWhole && (before === null || !isInSight(bounds, view, widthPx, heightPx))) get().showWhole()
  },
  showWhole: () => {
    const { bounds, widthPx, heightPx } = get()
    if (!bounds || widthPx === 0 || heightPx === 0) return
    const margins = drawingMargins(widthPx, heightPx)
    set({ view: zoomToBounds(bounds, widthPx, heightPx, margins), isWhole: true })
  },
  pan: (dxPx, dyPx) => set((state) => ({ view: panBy(state.view, dxPx, dyPx), isWhole: false })),
  zoom: (factor, xPx, yPx) =>
    set((state) => ({
      view: zoomAt(state.view, xPx ?? state.widthPx / 2, yPx ?? state.view.originYPx, factor),
      isWhole: false,
    })),
  reveal: (leftMm, rightMm) => {
    const { view, widthPx, heightPx } = get()
    const margins = drawingMargins(widthPx, heightPx)
    const leftPx = view.originXPx + leftMm * view.pxPerMm
    const rightPx = view.originXPx + rightMm * view.pxPerMm
    const overRight = rightPx - (widthPx - margins.right)
    const overLeft = margins.left - leftPx
    if (overLeft > 0) set({ view: panBy(view, overLeft, 0), isWhole: false })
    else if (overRight > 0) set({ view: panBy(view, -Math.min(overRight, -overLeft), 0), isWhole: false })
  },
  hoverStation: (stationMm) =>
    set((state) => (state.hoverStationMm === stationMm ? state : { hoverStationMm: stationMm })),
}))
