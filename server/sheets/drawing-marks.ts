/** What both bands of dimensions around the half section are made of. */
import { millimetres } from './sheet-format'
import { type LineStyle, QUIET, type TextStyle, THIN_MM } from './sheet-style'
import type { SheetWriter } from './sheet-writer'

export const NUMBER: TextStyle = { sizePt: 7 }
export const THIN: LineStyle = { widthMm: 0.13, colour: QUIET }
export const LEADER: LineStyle = { widthMm: THIN_MM }
/** Room one upright number takes along the shaft. */
export const NUMBER_PITCH_MM = 2.9
/** Height in which a line changes from a part's place to its number's. */
export const JOG_MM = 4
export const NUMBER_GAP_MM = 1

export interface DimensionNote {
  /** Words for what could not be written for want of room; empty when all of it stands there. */
  omitted: string[]
}

export const numberZone = (writer: SheetWriter, values: readonly number[]): number =>
  Math.max(6, ...values.map((value) => writer.measure(millimetres(value), NUMBER))) + 2 * NUMBER_GAP_MM

/** Starts at (x, y) and runs up, or ends there from below. */
export function uprightNumber(
  writer: SheetWriter,
  text: string,
  x: number,
  y: number,
  direction: 'up' | 'down',
): void {
  writer.verticalText(text, x, y, { ...NUMBER, align: direction === 'up' ? 'left' : 'right' })
}
