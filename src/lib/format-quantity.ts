/**
 * Numbers for people: two to four significant digits for results, everything that was typed for
 * entered values, a narrow space between thousands, the unit always beside the number.
 */
import { displayUnit, fromStored, type QuantityKind, type UnitSystem } from './quantity-units'

export const NOT_COMPUTED = '–'
const THOUSANDS_GAP = '\u202f'
const BEFORE_UNIT = '\u00a0'

/** Decimals of a result by size: 0.42, 5.31, 54.2, 268, 1 405. */
export function formatNumber(value: number, decimals = decimalsFor(value)): string {
  const fixed = Math.abs(value).toFixed(decimals)
  const [whole = '0', fraction] = fixed.split('.')
  const grouped = whole.length > 3 ? whole.replace(/\B(?=(\d{3})+$)/g, THOUSANDS_GAP) : whole
  const sign = value < 0 && Number(fixed) !== 0 ? '−' : ''
  return sign + grouped + (fraction === undefined ? '' : `.${fraction}`)
}

function decimalsFor(value: number): number {
  const size = Math.abs(value)
  if (size >= 100 || size < 0.00005) return 0
  if (size >= 9.995) return 1
  if (size >= 0.0995) return 2
  return size >= 0.00995 ? 3 : 4
}

export interface FormattedQuantity {
  number: string
  unit: string
  /** Both, with a no-break space. */
  text: string
}

const assemble = (number: string, unit: string): FormattedQuantity => ({
  number,
  unit,
  text:
    unit === '' || number === NOT_COMPUTED
      ? number
      : unit === '°'
        ? `${number}°`
        : `${number}${BEFORE_UNIT}${unit}`,
})

/** Large forces read better in thousands. */
const THOUSANDS: Record<string, { above: number; factor: number; unit: string }> = {
  N: { above: 9_999.5, factor: 1_000, unit: 'kN' },
  lbf: { above: 9_999.5, factor: 1_000, unit: 'kip' },
}

/** 68 293 rpm would claim more than a calculation knows. */
const fourDigits = (value: number) => (Math.abs(value) >= 10_000 ? Number(value.toPrecision(4)) : value)

/** A calculated value. */
export function formatResult(
  stored: number | null,
  kind: QuantityKind,
  system: UnitSystem,
): FormattedQuantity {
  const unit = displayUnit(kind, system)
  if (stored === null || !Number.isFinite(stored)) return assemble(NOT_COMPUTED, unit.symbol)
  const value = fourDigits(fromStored(stored, unit))
  const thousands = THOUSANDS[unit.symbol]
  if (thousands !== undefined && Math.abs(value) >= thousands.above) {
    const scaled = value / thousands.factor
    return assemble(formatNumber(scaled, Math.abs(scaled) >= 100 ? 0 : 1), thousands.unit)
  }
  return assemble(formatNumber(value, resultDecimals(value, kind, system)), unit.symbol)
}

function resultDecimals(value: number, kind: QuantityKind, system: UnitSystem): number {
  const size = Math.abs(value)
  switch (kind) {
    case 'temperature':
    case 'temperatureDifference':
    case 'speed':
      return 0
    case 'interference':
    case 'roughness':
      if (system === 'inch' && kind === 'interference') return size >= 9.95 ? 1 : 2
      return size >= 9.95 || size === 0 ? 0 : 1
    case 'length':
      return Math.min(decimalsFor(value) + (system === 'inch' ? 1 : 0), 4)
    case 'force':
      return 0
    default:
      return decimalsFor(value)
  }
}

/** Two values that belong together, the unit once: `1 405 / 820 N·m`. */
export function formatResultPair(
  first: number | null,
  second: number | null,
  kind: QuantityKind,
  system: UnitSystem,
  joint = ' / ',
): FormattedQuantity {
  const unit = displayUnit(kind, system)
  const thousands = THOUSANDS[unit.symbol]
  const sizes = [first, second].map((stored) => (stored === null ? 0 : Math.abs(fromStored(stored, unit))))
  const isScaled = thousands !== undefined && Math.max(...sizes) >= thousands.above
  const one = (stored: number | null) => {
    if (stored === null || !Number.isFinite(stored)) return NOT_COMPUTED
    if (!isScaled) return formatResult(stored, kind, system).number
    const scaled = fromStored(stored, unit) / thousands.factor
    return formatNumber(scaled, Math.abs(scaled) >= 100 ? 0 : 1)
  }
  return assemble(one(first) + joint + one(second), isScaled ? thousands.unit : unit.symbol)
}

/** A value somebody typed, in full, without grouping: what a field shows and takes back. */
export function formatEntered(
  stored: number | null | undefined,
  kind: QuantityKind,
  system: UnitSystem,
): string {
  if (stored === null || stored === undefined || !Number.isFinite(stored)) return ''
  const value = fromStored(stored, displayUnit(kind, system))
  return String(Number(system === 'inch' ? value.toPrecision(7) : value.toPrecision(10)))
}

/** A field nobody is typing in: no more decimals than anybody measures. Focus shows the value in full. */
export function formatAtRest(
  stored: number | null | undefined,
  kind: QuantityKind,
  system: UnitSystem,
): string {
  if (stored === null || stored === undefined || !Number.isFinite(stored)) return ''
  const value = fromStored(stored, displayUnit(kind, system))
  return String(Math.abs(value) >= 0.01 ? Number(value.toFixed(4)) : Number(value.toPrecision(4)))
}

/** An entered value for reading, with its unit. */
export function formatGiven(
  stored: number | null | undefined,
  kind: QuantityKind,
  system: UnitSystem,
): FormattedQuantity {
  const { symbol } = displayUnit(kind, system)
  if (stored === null || stored === undefined || !Number.isFinite(stored))
    return assemble(NOT_COMPUTED, symbol)
  const value = fromStored(stored, displayUnit(kind, system))
  const decimals = Math.min(system === 'inch' && kind === 'length' ? 4 : 3, decimalsOf(value))
  return assemble(formatNumber(value, decimals), symbol)
}

const decimalsOf = (value: number) => (String(value).split('.')[1] ?? '').replace(/e.*$/, '').length

/**
 * A safety against its limit. Rounding must not hide a failure: 1.497 against 1.5 is shown as 1.497,
 * not as 1.50. A safety without demand is `null`.
 */
export function formatSafety(value: number | null, limit?: number | null): string {
  if (value === null || !Number.isFinite(value)) return NOT_COMPUTED
  if (value >= 100) return '> 99'
  const decimals = value >= 9.995 ? 1 : 2
  for (let digits = decimals; digits <= 4; digits += 1) {
    const rounded = Number(value.toFixed(digits))
    if (limit === undefined || limit === null || value >= limit || rounded < limit)
      return formatNumber(value, digits)
  }
  return `< ${formatNumber(limit ?? value, 2)}`
}

const KIND_OF_UNIT: Record<string, QuantityKind> = {
  mm: 'length',
  µm: 'interference',
  MPa: 'stress',
  'N·m': 'torque',
  N: 'force',
  '°C': 'temperature',
  K: 'temperatureDifference',
  rpm: 'speed',
  mrad: 'slope',
  kg: 'mass',
  '°': 'angle',
}

/** A number of a finding or a derivation, whose unit comes as text. */
export function formatWithUnit(value: number | null, unit: string, system: UnitSystem = 'metric'): string {
  if (value === null || !Number.isFinite(value)) return NOT_COMPUTED
  const kind = KIND_OF_UNIT[unit]
  if (kind !== undefined) return formatResult(value, kind, system).text
  return assemble(unit === '' ? formatSafety(value) : formatNumber(value), unit).text
}
