/**
 * The one mapping between the layout (millimetres, y up, station 0 at the left datum face) and the
 * drawing on screen (pixels, y down). One number serves both axes, so a circle stays a circle.
 * Canvas, diagrams and presence marks share it; that is why it stands in lib.
 */
export interface ViewTransform {
  pxPerMm: number
  /** Where station 0 is drawn. */
  originXPx: number
  /** Where the centre line is drawn. */
  originYPx: number
}

export const MIN_PX_PER_MM = 0.02
export const MAX_PX_PER_MM = 200

export const stationToPx = (view: ViewTransform, stationMm: number) =>
  view.originXPx + stationMm * view.pxPerMm
export const heightToPx = (view: ViewTransform, heightMm: number) => view.originYPx - heightMm * view.pxPerMm
export const pxToStation = (view: ViewTransform, xPx: number) => (xPx - view.originXPx) / view.pxPerMm
export const pxToHeight = (view: ViewTransform, yPx: number) => (view.originYPx - yPx) / view.pxPerMm

export const panBy = (view: ViewTransform, dxPx: number, dyPx: number): ViewTransform => ({
  ...view,
  originXPx: view.originXPx + dxPx,
  originYPx: view.originYPx + dyPx,
})

/** Zooms so that the point under the pointer stays under the pointer. */
export function zoomAt(view: ViewTransform, xPx: number, yPx: number, factor: number): ViewTransform {
  const pxPerMm = Math.min(MAX_PX_PER_MM, Math.max(MIN_PX_PER_MM, view.pxPerMm * factor))
  const ratio = pxPerMm / view.pxPerMm
  return {
    pxPerMm,
    originXPx: xPx - (xPx - view.originXPx) * ratio,
    originYPx: yPx - (yPx - view.originYPx) * ratio,
  }
}

export interface DrawingBounds {
  leftMm: number
  rightMm: number
  /** Largest radius above and below the centre line. */
  radiusMm: number
}

export interface ViewMargins {
  left: number
  right: number
  top: number
  bottom: number
}

/** The largest drawing of the bounds inside the margins, centred. */
export function zoomToBounds(
  bounds: DrawingBounds,
  widthPx: number,
  heightPx: number,
  margins: ViewMargins,
): ViewTransform {
  const freeWidth = Math.max(40, widthPx - margins.left - margins.right)
  const freeHeight = Math.max(40, heightPx - margins.top - margins.bottom)
  const lengthMm = Math.max(1, bounds.rightMm - bounds.leftMm)
  const spanMm = Math.max(1, 2 * bounds.radiusMm)
  const pxPerMm = Math.min(
    MAX_PX_PER_MM,
    Math.max(MIN_PX_PER_MM, Math.min(freeWidth / lengthMm, freeHeight / spanMm)),
  )
  return {
    pxPerMm,
    originXPx: margins.left + (freeWidth - lengthMm * pxPerMm) / 2 - bounds.leftMm * pxPerMm,
    originYPx: margins.top + freeHeight / 2,
  }
}
