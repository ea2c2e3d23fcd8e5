/**
 * Reads what a person types into a field of a quantity: a number, arithmetic, and a unit.
 * `2 in`, `0,05 mm`, `3/8 in`, `1 1/2 in`, `25.4*2`, `(60-12)/2`, `r 20 µm` where a radial value is
 * allowed. The result is the stored metric value or one sentence that says what to type instead.
 */
import {
  displayUnit,
  QUANTITY_KINDS,
  type QuantityKind,
  toStored,
  type Unit,
  type UnitSystem,
} from './quantity-units'

export interface EntryOptions {
  kind: QuantityKind
  /** Decides what a bare number means. */
  system: UnitSystem
  /** The field is diametral but takes `r 20 µm` as well. */
  allowsRadial?: boolean
}

export type EntryResult = { ok: true; value: number } | { ok: false; message: string }

class EntryError extends Error {}

const ONE_UNIT = 'In a product or quotient only one number carries a unit'

export function parseQuantity(
  text: string,
  { kind, system, allowsRadial = false }: EntryOptions,
): EntryResult {
  let source = text
    .trim()
    .replace(/[−–]/g, '-')
    .replace(/[×✕]/g, '*')
    .replace(/÷/g, '/')
    .replace(/[\u00a0\u2009\u202f]/g, ' ')
  const radial = /^r\s*(?=[\d.,(+-])|(?<=[\d)\s])\s*\b(?:radial|r)$/i
  let doubling = 1
  if (kind === 'interference' && radial.test(source)) {
    if (!allowsRadial) return { ok: false, message: 'This field takes a diametral value; leave out the r' }
    source = source.replace(radial, '').trim()
    doubling = 2
  }
  source = source.replace(/^[⌀øØ]\s*/, '')
  if (source === '')
    return {
      ok: false,
      message: `Enter ${QUANTITY_KINDS[kind].noun}, such as ${QUANTITY_KINDS[kind].example}`,
    }
  try {
    const value = new EntryReader(source, kind, displayUnit(kind, system)).read() * doubling
    if (!Number.isFinite(value)) return { ok: false, message: 'This divides by zero or is too large' }
    return { ok: true, value: Number(value.toPrecision(12)) }
  } catch (error) {
    if (error instanceof EntryError) return { ok: false, message: error.message }
    throw error
  }
}

/** A number still without unit, or, with one, already the stored value. */
interface Term {
  value: number
  unit: Unit | null
}

/**
 * sum := term (('+' | '-') term)*
 * term := factor (('*' | '/') factor)*, where a unit after a factor holds for the term so far
 * factor := ('+' | '-') factor | number | '(' sum ')'
 */
class EntryReader {
  private position = 0

  constructor(
    private readonly source: string,
    private readonly kind: QuantityKind,
    private readonly bareUnit: Unit,
  ) {}

  /** The stored value. */
  read(): number {
    const term = this.readSum()
    this.skipSpace()
    if (this.position < this.source.length) this.refuseRest()
    return this.asStored(term)
  }

  private asStored({ value, unit }: Term): number {
    return unit === null ? toStored(value, this.bareUnit) : value
  }

  private readSum(): Term {
    let sum = this.readTerm()
    for (;;) {
      this.skipSpace()
      const sign = this.source[this.position]
      if (sign !== '+' && sign !== '-') return sum
      this.position += 1
      const next = this.readTerm()
      const factor = sign === '+' ? 1 : -1
      if (sum.unit === null && next.unit === null) {
        sum = { value: sum.value + factor * next.value, unit: null }
      } else {
        if (this.kind === 'temperature')
          throw new EntryError('Write the unit once, after one number, such as 60 °C')
        sum = {
          value: this.asStored(sum) + factor * this.asStored(next),
          unit: sum.unit ?? next.unit,
        }
      }
    }
  }

  private readTerm(): Term {
    let term = this.withUnit(this.readFactor())
    for (;;) {
      this.skipSpace()
      const operator = this.source[this.position]
      if (operator !== '*' && operator !== '/') return term
      this.position += 1
      const next = this.readFactor()
      if (next.unit !== null && (term.unit !== null || operator === '/')) {
        throw new EntryError(ONE_UNIT)
      }
      if (operator === '/' && next.value === 0) throw new EntryError('This divides by zero')
      const value = operator === '*' ? term.value * next.value : term.value / next.value
      term = this.withUnit({ value, unit: term.unit ?? next.unit })
    }
  }

  private readFactor(): Term {
    this.skipSpace()
    const character = this.source[this.position]
    if (character === '-' || character === '+') {
      this.position += 1
      const term = this.readFactor()
      return character === '-' ? { ...term, value: -term.value } : term
    }
    if (character === '(') {
      this.position += 1
      const term = this.readSum()
      this.skipSpace()
      if (this.source[this.position] !== ')') throw new EntryError('A bracket is not closed')
      this.position += 1
      return term
    }
    return { value: this.readNumber(), unit: null }
  }

  private readNumber(): number {
    const rest = this.source.slice(this.position)
    const grouped = /^\d{1,3}(?: \d{3})+(?!\d)(?:[.,]\d+)?/.exec(rest)
    const plain = grouped ?? /^(?:\d+(?:[.,]\d+)*[.,]?|[.,]\d+)(?:[eE][+-]?\d+)?/.exec(rest)
    if (plain === null) {
      if (rest === '') throw new EntryError('A number is missing at the end')
      throw new EntryError(`A number is expected before "${rest.slice(0, 12)}"`)
    }
    this.position += plain[0].length
    const whole = numberOf(plain[0].replace(/ /g, ''))
    const fraction = /^ +(\d+)\s*\/\s*(\d+)(?![\d.,])/.exec(this.source.slice(this.position))
    if (fraction === null || !Number.isInteger(whole)) return whole
    const [matched, numerator, denominator] = fraction
    if (Number(denominator) === 0) throw new EntryError('This divides by zero')
    this.position += matched.length
    return whole + Number(numerator) / Number(denominator)
  }

  /** Applies a unit standing here to the value so far. */
  private withUnit(term: Term): Term {
    this.skipSpace()
    const found = unitAt(this.source, this.position, QUANTITY_KINDS[this.kind].units)
    if (found === null) return term
    if (term.unit !== null) throw new EntryError(ONE_UNIT)
    this.position += found.length
    return { value: toStored(term.value, found.unit), unit: found.unit }
  }

  private refuseRest(): never {
    const rest = this.source.slice(this.position).trim()
    const { noun, example, units } = QUANTITY_KINDS[this.kind]
    const word = /^[^\d\s()+*]+(?:[ ·*-][^\d\s()+*-]+)*/.exec(rest)?.[0] ?? rest
    if (unitAt(rest, 0, units) !== null) throw new EntryError(ONE_UNIT)
    for (const other of Object.values(QUANTITY_KINDS)) {
      if (unitAt(rest, 0, other.units)?.length === word.length) {
        throw new EntryError(`"${word}" does not belong here; type ${noun}, such as ${example}`)
      }
    }
    if (units.length === 0) throw new EntryError(`Type a plain number, such as ${example}`)
    throw new EntryError(`"${word.slice(0, 16)}" is not a unit known here; type ${example}`)
  }

  private skipSpace() {
    while (this.source[this.position] === ' ' || this.source[this.position] === '\t') this.position += 1
  }
}

/** `12,5` and `1 234,5` are read with a decimal comma; `1,250` could mean two things and is refused. */
function numberOf(text: string): number {
  const commas = text.split(',').length - 1
  const dots = text.split('.').length - 1
  if (commas > 0 && dots > 0) {
    const decimalMark = text.lastIndexOf(',') > text.lastIndexOf('.') ? ',' : '.'
    const groupMark = decimalMark === ',' ? '.' : ','
    const groups = text.slice(0, text.lastIndexOf(decimalMark)).split(groupMark)
    if (text.split(decimalMark).length !== 2 || groups.slice(1).some((group) => group.length !== 3)) {
      throw new EntryError(`"${text}" cannot be read as one number`)
    }
    return Number(text.replaceAll(groupMark, '').replace(decimalMark, '.'))
  }
  if (dots > 1 || commas > 1) {
    throw new EntryError(`"${text}" cannot be read as one number; leave out the marks between thousands`)
  }
  if (/^[1-9]\d{0,2},\d{3}$/.test(text)) {
    throw new EntryError(
      `The comma in "${text}" can mean two things; type ${text.replace(',', '.')} or ${text.replace(',', '')}`,
    )
  }
  return Number(text.replace(',', '.'))
}

/** The longest unit that stands at `position` and is not the beginning of a longer word. */
function unitAt(
  source: string,
  position: number,
  units: readonly Unit[],
): { unit: Unit; length: number } | null {
  const rest = source.slice(position)
  let best: { unit: Unit; length: number; isExact: boolean } | null = null
  for (const unit of units) {
    for (const name of [unit.symbol, ...unit.aliases]) {
      const here = rest.slice(0, name.length)
      const isExact = here === name
      if (!isExact && here.toLowerCase() !== name.toLowerCase()) continue
      if (/[A-Za-zµμ°]$/.test(name) && /^[A-Za-zµμ²³°]/.test(rest.slice(name.length))) continue
      if (
        best === null ||
        name.length > best.length ||
        (name.length === best.length && isExact && !best.isExact)
      ) {
        best = { unit, length: name.length, isExact }
      }
    }
  }
  return best === null ? null : { unit: best.unit, length: best.length }
}
