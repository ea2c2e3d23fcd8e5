/** From stations and radii in millimetres of the part to millimetres of the paper. */
import type { Point } from '@shared/drawing/half-section-geometry'
import type { XY } from './sheet-style'

export interface DrawingFrame {
  /** Millimetres of paper for one millimetre of the part. */
  factor: number
  /** Paper position of the left datum face and of the axis. */
  datumX: number
  axisY: number
  /** Space across which labels may spread. */
  left: number
  right: number
}

export const paperX = (frame: DrawingFrame, stationMm: number) => frame.datumX + stationMm * frame.factor

/** Radius positive above the axis. */
export const paperY = (frame: DrawingFrame, radiusMm: number) => frame.axisY - radiusMm * frame.factor

export const onPaper =
  (frame: DrawingFrame, side: 1 | -1 = 1) =>
  (point: Point): XY => ({ x: paperX(frame, point.x), y: paperY(frame, side * point.y) })
