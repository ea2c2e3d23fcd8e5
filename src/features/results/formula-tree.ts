/**
 * Reads a formula written in plain symbols, such as `p = δ / (D (K_A + K_I))`, into a tree that can be
 * typeset: `_x` a subscript, `^x` a power, `a / b` a fraction, `√(x)` or `sqrt(x)` a root. Whatever it
 * does not know it leaves as text, so nothing of a formula is ever lost.
 */
export type FormulaNode =
  | { kind: 'text'; text: string }
  | { kind: 'row'; items: FormulaNode[] }
  | { kind: 'scripted'; base: FormulaNode; sub: FormulaNode | null; sup: FormulaNode | null }
  | { kind: 'fraction'; above: FormulaNode; below: FormulaNode }
  | { kind: 'root'; content: FormulaNode }
  | { kind: 'group'; content: FormulaNode }

const WORD = /^(?:°[CF]|[\p{L}\p{M}][\p{L}\p{M}\p{N}′″']*|\d+(?:[.,]\d+)*(?:e[+-]?\d+)?)/u

/** `1000 MPa` is one thing, also under a fraction bar. */
const NUMBER_WITH_UNIT = /^\d+(?:\.\d+)? (?:MPa|mm|µm|N·m|°C)(?![\p{L}\p{N}])/u

export function parseFormula(text: string): FormulaNode {
  return new FormulaReader(text.trim()).readRow(false)
}

class FormulaReader {
  private position = 0

  constructor(private readonly source: string) {}

  /** Factors and operators up to the end or, inside brackets, to the closing one. */
  readRow(isInside: boolean): FormulaNode {
    const items: FormulaNode[] = []
    /** Where the product begins that a following slash divides. */
    let productStart = 0
    for (;;) {
      const hadSpace = this.skipSpace()
      const character = this.source[this.position]
      if (character === undefined || (isInside && character === ')')) break
      if (character === '/') {
        this.position += 1
        this.skipSpace()
        const above = items.splice(productStart)
        const below = this.readFactor()
        items.push(
          above.length === 0
            ? { kind: 'text', text: '/' }
            : { kind: 'fraction', above: unwrapped(rowOf(above)), below: unwrapped(below) },
        )
        if (above.length === 0) items.push(below)
        continue
      }
      const operator = /^[=<>≤≥≈+±−–,;-]/u.exec(this.source.slice(this.position))?.[0]
      if (operator !== undefined) {
        this.position += 1
        items.push({ kind: 'text', text: spaced(operator.replace(/[–-]/, '−'), items.at(-1)) })
        productStart = items.length
        continue
      }
      if (hadSpace && items.length > productStart) items.push({ kind: 'text', text: ' ' })
      items.push(this.readFactor())
    }
    return rowOf(items)
  }

  private readFactor(): FormulaNode {
    const rest = this.source.slice(this.position)
    const root = /^(?:√|sqrt)\s*\(/u.exec(rest)
    if (root !== null) {
      this.position += root[0].length
      const content = this.readRow(true)
      this.position += 1
      return this.withScripts({ kind: 'root', content })
    }
    if (rest.startsWith('(')) {
      this.position += 1
      const content = this.readRow(true)
      this.position += 1
      return this.withScripts({ kind: 'group', content })
    }
    return this.withScripts({ kind: 'text', text: this.readWord() })
  }

  private withScripts(base: FormulaNode): FormulaNode {
    let sub: FormulaNode | null = null
    let sup: FormulaNode | null = null
    for (;;) {
      const mark = this.source[this.position]
      if (mark === '_' && sub === null) {
        this.position += 1
        sub = this.readScript()
      } else if (mark === '^' && sup === null) {
        this.position += 1
        sup = this.readScript()
      } else break
    }
    return sub === null && sup === null ? base : { kind: 'scripted', base, sub, sup }
  }

  private readScript(): FormulaNode {
    if (this.source[this.position] === '(') {
      this.position += 1
      const content = this.readRow(true)
      this.position += 1
      return content
    }
    if (this.source[this.position] === '{') {
      const end = this.source.indexOf('}', this.position)
      const text = this.source.slice(this.position + 1, end < 0 ? undefined : end)
      this.position = end < 0 ? this.source.length : end + 1
      return { kind: 'text', text }
    }
    const signed =
      /^[+−-]?[\p{L}\p{M}\p{N},]+(?:\.\d+)?/u.exec(this.source.slice(this.position))?.[0] ?? this.readWord()
    const text = signed.replace(/,$/, '')
    this.position += text.length
    return { kind: 'text', text }
  }

  private readWord(): string {
    const rest = this.source.slice(this.position)
    const word = NUMBER_WITH_UNIT.exec(rest)?.[0] ?? WORD.exec(rest)?.[0] ?? [...rest][0] ?? ''
    this.position += word.length
    return word
  }

  private skipSpace(): boolean {
    const from = this.position
    while (/\s/.test(this.source[this.position] ?? '')) this.position += 1
    return this.position > from
  }
}

const SEPARATOR = /[=<>≤≥≈+±−,;] ?$/

/** Space around an operator; none before a comma, and none after a sign that belongs to what follows. */
function spaced(operator: string, before: FormulaNode | undefined): string {
  if (operator === ',' || operator === ';') return `${operator}  `
  const isSign = before === undefined || (before.kind === 'text' && SEPARATOR.test(before.text))
  return isSign && /[+±−]/.test(operator) ? operator : ` ${operator} `
}

const rowOf = (items: FormulaNode[]): FormulaNode =>
  items.length === 1 && items[0] ? items[0] : { kind: 'row', items }

/** A fraction bar groups by itself: the brackets around its parts are not needed. */
const unwrapped = (node: FormulaNode): FormulaNode => (node.kind === 'group' ? node.content : node)
