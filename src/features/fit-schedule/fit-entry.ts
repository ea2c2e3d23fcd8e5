/** A fit as one text, the way a drawing gives it: `H7/u6`, or limits such as `35…60`. */
import { formatNumber } from '@/lib/format-quantity'
import { parseQuantity } from '@/lib/quantity-entry'
import { displayUnit, fromStored, type UnitSystem } from '@/lib/quantity-units'
import type { InterferenceFit } from '@shared/layout/layout-document'

export function formatFit(fit: InterferenceFit, units: UnitSystem): string {
  if (fit.kind === 'iso286') return `${fit.hole}/${fit.shaft}`
  const unit = displayUnit('interference', units)
  const number = (um: number) => {
    const value = fromStored(um, unit)
    return Number.isInteger(value) ? formatNumber(value, 0) : formatNumber(value, units === 'inch' ? 2 : 1)
  }
  return `${number(fit.minInterferenceUm)}…${number(fit.maxInterferenceUm)}`
}

export type FitEntry = { ok: true; value: InterferenceFit } | { ok: false; message: string }

export function parseFit(text: string, units: UnitSystem): FitEntry {
  const classes = /^\s*([A-Za-z]{1,2}\d{1,2})\s*[/ -]\s*([A-Za-z]{1,2}\d{1,2})\s*$/.exec(text)
  if (classes !== null) return readClasses(classes[1] ?? '', classes[2] ?? '')

  const [first, last, ...rest] = text.split(/\s*(?:…|\.\.+|\bto\b|;)\s*/)
  if (first === undefined || last === undefined || rest.length > 0) {
    return { ok: false, message: 'Type classes such as H7/u6, or limits such as 35…60' }
  }
  const options = { kind: 'interference', system: units, allowsRadial: true } as const
  // A unit written once, after the second value, holds for both.
  const unit = /[^\d\s.,)]+$/.exec(last)?.[0] ?? ''
  const least = parseQuantity(/[^\d\s.,)]$/.test(first) ? first : `${first} ${unit}`, options)
  const most = parseQuantity(last, options)
  if (!least.ok) return least
  if (!most.ok) return most
  if (least.value > most.value) return { ok: false, message: 'The first value is the least interference' }
  return {
    ok: true,
    value: { kind: 'limits', minInterferenceUm: least.value, maxInterferenceUm: most.value },
  }
}

/** Either order; what tells them apart is the capital letter of the hole. */
function readClasses(one: string, other: string): FitEntry {
  const isHole = (name: string) => /^[A-Z]{1,2}\d/.test(name)
  const isShaft = (name: string) => /^[a-z]{1,2}\d/.test(name)
  if (isHole(one) && isShaft(other)) return { ok: true, value: { kind: 'iso286', hole: one, shaft: other } }
  if (isShaft(one) && isHole(other)) return { ok: true, value: { kind: 'iso286', hole: other, shaft: one } }
  return {
    ok: false,
    message: 'One class needs a capital letter (bore) and one a small letter (seat): H7/u6',
  }
}
