/** Numbers and dates as the sheets print them: units by the caller, true minus, UTC. */

const MINUS = '−'
const DASH = '–'

/** Three significant digits by default, never an exponent, thousands parted by a thin gap. */
export function significant(value: number | null | undefined, digits = 3): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return DASH
  if (value === 0) return '0'
  const magnitude = Math.floor(Math.log10(Math.abs(value)))
  const decimals = Math.min(6, Math.max(0, digits - 1 - magnitude))
  return grouped(value.toFixed(decimals))
}

/** A value as entered: up to four significant digits, no padding. */
export function plain(value: number | null | undefined): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return DASH
  const rounded = Number(value.toPrecision(4))
  return grouped(Math.abs(rounded) >= 1 ? String(rounded) : String(Number(rounded.toFixed(6))))
}

/** A length as entered: up to three decimals, no padding. */
export function millimetres(value: number | null | undefined): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return DASH
  return grouped(String(Number(value.toFixed(3))))
}

/** Interference and temperature are judged in whole units. */
export function whole(value: number | null | undefined): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return DASH
  return grouped(String(Math.round(value) + 0))
}

export function safety(value: number | null | undefined): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return DASH
  if (value >= 100) return '> 99'
  return value.toFixed(2)
}

export function withUnit(text: string, unit: string): string {
  return text === DASH || unit === '' ? text : `${text} ${unit}`
}

/** 2026-12-01 09:30 UTC */
export function utc(iso: string): string {
  const date = new Date(iso)
  if (Number.isNaN(date.getTime())) return iso
  return `${date.toISOString().slice(0, 16).replace('T', ' ')} UTC`
}

function grouped(digits: string): string {
  const [integer = '', fraction] = digits.replace('-', '').split('.')
  const parted = integer.length > 4 ? integer.replace(/\B(?=(\d{3})+$)/g, '\u202f') : integer
  const sign = digits.startsWith('-') && /[1-9]/.test(digits) ? MINUS : ''
  return sign + parted + (fraction === undefined ? '' : `.${fraction}`)
}
