/** Numbers and names as they stand in the sentences of findings. */

/** A tie goes to the even digit, so that a long list of rounded values is not biased upward. */
function roundHalfEven(value: number): number {
  const floor = Math.floor(value)
  const rest = value - floor
  if (Math.abs(rest - 0.5) > 1e-9) return Math.round(value)
  return floor % 2 === 0 ? floor : floor + 1
}

/** To a number of significant digits, without exponent and without trailing zeros. */
export function significant(value: number, digits: number): string {
  if (value === 0 || !Number.isFinite(value)) return '0'
  const magnitude = Math.floor(Math.log10(Math.abs(value)))
  const decimals = Math.min(9, Math.max(0, digits - 1 - magnitude))
  const scale = 10 ** decimals
  return String(roundHalfEven(value * scale) / scale)
}

/** Safeties carry two decimals: 0.94 against 1.5 reads at a glance. */
export function safetyText(value: number): string {
  return value >= 100 ? significant(value, 3) : String(roundHalfEven(value * 100) / 100)
}

export const torqueText = (newtonMetres: number) => `${significant(newtonMetres, 4)} N·m`
export const forceText = (newtons: number) =>
  Math.abs(newtons) >= 10_000 ? `${significant(newtons / 1000, 3)} kN` : `${significant(newtons, 4)} N`
export const stressText = (megapascals: number) => `${significant(megapascals, 3)} MPa`
export const micrometreText = (micrometres: number) => `${significant(micrometres, 3)} µm`
/** Dimensions keep what a drawing would show: at most hundredths. */
export const millimetreText = (millimetres: number) => `${roundHalfEven(millimetres * 100) / 100} mm`
export const temperatureText = (celsius: number) => `${roundHalfEven(celsius)} °C`
export const degreeText = (degrees: number) => `${roundHalfEven(degrees * 100) / 100}°`

/** A name that begins a sentence. */
export function capitalised(name: string): string {
  return name.charAt(0).toUpperCase() + name.slice(1)
}

/** A name inside a sentence; a leading abbreviation or id keeps its capitals. */
export function inSentence(name: string): string {
  return /^[A-Z][a-z]/.test(name) ? name.charAt(0).toLowerCase() + name.slice(1) : name
}

/** "a", "a and b", "a, b and c". */
export function listed(items: readonly string[]): string {
  if (items.length <= 1) return items[0] ?? ''
  return `${items.slice(0, -1).join(', ')} and ${items[items.length - 1] ?? ''}`
}
