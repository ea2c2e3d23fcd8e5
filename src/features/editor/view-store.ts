/** What part of the layout is on screen, shared by section and diagrams, and the station under the pointer. */
import { create } from 'zustand'
import {
  type DrawingBounds,
  panBy,
  type ViewMargins,
  type ViewTransform,
  zoomAt,
  zoomToBounds,
} from '@/lib/view-transform'

/** Room for the ruler and the names above the drawing, and for loads and dimensions below it. */
export const DRAWING_MARGINS: ViewMargins = { left: 116, right: 28, top: 76, bottom: 88 }
const NARROW_MARGINS: ViewMargins = { left: 16, right: 16, top: 80, bottom: 72 }

const marginsFor = (widthPx: number) => (widthPx < 560 ? NARROW_MARGINS : DRAWING_MARGINS)

interface ViewState {
  view: ViewTransform
  widthPx: number
  heightPx: number
  /** True until somebody pans or zooms: then a change of size keeps the whole shaft in sight. */
  isWhole: boolean
  bounds: DrawingBounds | null
  hoverStationMm: number | null
  resize: (widthPx: number, heightPx: number) => void
  /** Says what "the whole shaft" is. It does not move the drawing while somebody works in it. */
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
    const isFirst = get().bounds === null
    set({ bounds })
    if (isFirst && get().isWhole) get().showWhole()
  },
  showWhole: () => {
    const { bounds, widthPx, heightPx } = get()
    if (!bounds || widthPx === 0 || heightPx === 0) return
    set({ view: zoomToBounds(bounds, widthPx, heightPx, marginsFor(widthPx)), isWhole: true })
  },
  pan: (dxPx, dyPx) => set((state) => ({ view: panBy(state.view, dxPx, dyPx), isWhole: false })),
  zoom: (factor, xPx, yPx) =>
    set((state) => ({
      view: zoomAt(state.view, xPx ?? state.widthPx / 2, yPx ?? state.view.originYPx, factor),
      isWhole: false,
    })),
  reveal: (leftMm, rightMm) => {
    const { view, widthPx } = get()
    const margins = marginsFor(widthPx)
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
