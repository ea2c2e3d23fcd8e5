/** Units, letters, lines and colours of the sheets. */
import type { FontWeight } from './sheet-fonts'

export const PT_PER_MM = 72 / 25.4
/** Share of the letter size from baseline to the top of a capital. */
export const CAP_HEIGHT = 0.72
export const LINE_SPACING = 1.32
export const LOWERED_SIZE = 0.64
export const LOWERED_DROP = 0.14

export const INK = '#1F242C'
export const QUIET = '#5B6472'
export const HAIRLINE = '#C9C2B3'
export const GOOD = '#2E7A5A'
export const BAD = '#B0392B'
export const STRAW = '#8A5F10'
export const STEEL = '#2B4C7E'

/** Line widths of drawing practice: visible edges twice the thin lines (ISO 128, from memory). */
export const THICK_MM = 0.35
export const THIN_MM = 0.18

export interface TextStyle {
  sizePt: number
  weight?: FontWeight
  colour?: string
  align?: 'left' | 'right' | 'centre'
}
export interface LineStyle {
  widthMm?: number
  colour?: string
  dashMm?: number[]
}
export interface XY {
  x: number
  y: number
}
