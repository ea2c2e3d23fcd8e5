/** The curves under the section as pure data: what is drawn, where its peak is, its value at a station. */
import type { QuantityReference } from '@shared/recalculation/derivation'
import type { ShaftDiagrams } from '@shared/recalculation/layout-results'
import type { QuantityKind } from '@/lib/quantity-units'

export interface Curve {
  name: string
  values: readonly number[]
}

export interface DiagramSeries {
  id: 'torque' | 'bending' | 'deflection' | 'equivalent'
  title: string
  kind: QuantityKind
  tone: 'plum' | 'steel' | 'straw' | 'bronze'
  main: Curve
  /** The two planes behind a resultant. */
  planes: readonly Curve[]
  opens: Extract<QuantityReference, { kind: 'shaftCase' }>['quantity']
}

export const diagramSeries = (diagrams: ShaftDiagrams): readonly DiagramSeries[] => [
  {
    id: 'torque',
    title: 'Torque',
    kind: 'torque',
    tone: 'plum',
    main: { name: 'Torque', values: diagrams.torqueNm },
    planes: [],
    opens: 'torqueMax',
  },
  {
    id: 'bending',
    title: 'Bending',
    kind: 'torque',
    tone: 'steel',
    main: { name: 'Resultant', values: diagrams.bendingNm },
    planes: [
      { name: 'about y', values: diagrams.bendingYNm },
      { name: 'about z', values: diagrams.bendingZNm },
    ],
    opens: 'bendingMax',
  },
  {
    id: 'deflection',
    title: 'Deflection',
    kind: 'interference',
    tone: 'straw',
    main: { name: 'Resultant', values: diagrams.deflectionUm },
    planes: [
      { name: 'along y', values: diagrams.deflectionYUm },
      { name: 'along z', values: diagrams.deflectionZUm },
    ],
    opens: 'deflectionMax',
  },
  {
    id: 'equivalent',
    title: 'Equivalent stress',
    kind: 'stress',
    tone: 'bronze',
    main: { name: 'Equivalent stress', values: diagrams.equivalentMPa },
    planes: [],
    opens: 'equivalentMax',
  },
]

export interface ValueRange {
  least: number
  most: number
}

/** Always with zero, so that the line of zero is in sight; never empty, so that nothing divides by zero. */
export function valueRange(curves: readonly Curve[]): ValueRange {
  let least = 0
  let most = 0
  for (const { values } of curves) {
    for (const value of values) {
      if (value < least) least = value
      if (value > most) most = value
    }
  }
  return least === most ? { least: 0, most: 1 } : { least, most }
}

/** The value largest in size; the first of equals. Null when the curve is zero all along. */
export function peakOf(
  stationMm: readonly number[],
  values: readonly number[],
): { stationMm: number; value: number } | null {
  let best = -1
  let size = 0
  values.forEach((value, index) => {
    if (Math.abs(value) > size) {
      size = Math.abs(value)
      best = index
    }
  })
  const station = stationMm[best]
  const value = values[best]
  return station === undefined || value === undefined ? null : { stationMm: station, value }
}

/**
 * The value at a station, linear between the points; at a jump the side right of it. Null beyond
 * both ends.
 */
export function valueAt(
  stationMm: readonly number[],
  values: readonly number[],
  wantedMm: number,
): number | null {
  const last = stationMm.length - 1
  const first = stationMm[0]
  const end = stationMm[last]
  if (first === undefined || end === undefined || wantedMm < first || wantedMm > end) return null
  let low = 0
  let high = last
  // The last point at or left of the station.
  while (low < high) {
    const middle = Math.ceil((low + high) / 2)
    if ((stationMm[middle] ?? Infinity) <= wantedMm) low = middle
    else high = middle - 1
  }
  const from = stationMm[low] ?? 0
  const to = stationMm[low + 1]
  const value = values[low] ?? 0
  const next = values[low + 1]
  if (to === undefined || next === undefined || to === from) return value
  return value + ((next - value) * (wantedMm - from)) / (to - from)
}

/** SVG path through the points; a jump is two points at one station and so a vertical stroke. */
export function curvePath(
  stationMm: readonly number[],
  values: readonly number[],
  toX: (stationMm: number) => number,
  toY: (value: number) => number,
): string {
  return stationMm
    .map((station, index) => {
      const x = toX(station).toFixed(2)
      const y = toY(values[index] ?? 0).toFixed(2)
      return `${index === 0 ? 'M' : 'L'}${x} ${y}`
    })
    .join('')
}

/** The same, closed along the line of zero, for the fill. */
export function areaPath(
  stationMm: readonly number[],
  values: readonly number[],
  toX: (stationMm: number) => number,
  toY: (value: number) => number,
): string {
  const first = stationMm[0]
  const last = stationMm.at(-1)
  if (first === undefined || last === undefined) return ''
  const curve = curvePath(stationMm, values, toX, toY).replace(/^M/, 'L')
  return `M${toX(first).toFixed(2)} ${toY(0).toFixed(2)}${curve}L${toX(last).toFixed(2)} ${toY(0).toFixed(2)}Z`
}
