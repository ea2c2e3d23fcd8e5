/**
 * Manrope for the sheets. The bundled files are split by script and none holds the technical
 * signs, so a text is cut into runs: each run in the file that has its letters, the missing signs
 * drawn, and what no file can show replaced by an empty box (never dropped).
 */
import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import * as fontkit from 'fontkit'
import { woffToSfnt } from './woff-to-sfnt'

const require = createRequire(import.meta.url)

const SUBSETS = ['latin', 'latin-ext', 'greek', 'cyrillic', 'cyrillic-ext', 'vietnamese'] as const
type Subset = (typeof SUBSETS)[number]

const WEIGHT_NUMBERS = { regular: 500, strong: 700 } as const
export type FontWeight = keyof typeof WEIGHT_NUMBERS

/** Signs that Manrope does not have; `spelling` is what a text search in the PDF finds. */
export const DRAWN_SIGNS = {
  '⌀': { widthEm: 0.82, spelling: 'Ø' },
  '≥': { widthEm: 0.66, spelling: '>=' },
  '≤': { widthEm: 0.66, spelling: '<=' },
  '→': { widthEm: 0.9, spelling: '->' },
  '□': { widthEm: 0.62, spelling: '?' },
} as const
export type DrawnSign = keyof typeof DRAWN_SIGNS

/** Signs whose look is another letter's, so that no second font is needed. */
const SAME_LOOK: Record<string, string> = {
  μ: 'µ',
  '∅': '⌀',
  '⩾': '≥',
  '⩽': '≤',
  '\u00a0': ' ',
  '\u202f': ' ',
  '\u2009': ' ',
  '‑': '-',
}
const LOWERED_DIGITS = '₀₁₂₃₄₅₆₇₈₉'

export interface LetterRun {
  kind: 'letters'
  text: string
  fontName: string
  isLowered: boolean
}
export interface SignRun {
  kind: 'sign'
  sign: DrawnSign
}
export type TextRun = LetterRun | SignRun

interface LoadedFont {
  name: string
  bytes: Buffer
  has: (codePoint: number) => boolean
}

const loadFont = (weight: FontWeight, subset: Subset): LoadedFont => {
  const file = require.resolve(
    `@fontsource/manrope/files/manrope-${subset}-${WEIGHT_NUMBERS[weight]}-normal.woff`,
  )
  const bytes = woffToSfnt(readFileSync(file))
  const font = fontkit.create(bytes)
  if (!('hasGlyphForCodePoint' in font)) throw new Error(`The font file of ${subset} is a collection`)
  return { name: `manrope-${weight}-${subset}`, bytes, has: (code) => font.hasGlyphForCodePoint(code) }
}

let loaded: Record<FontWeight, LoadedFont[]> | null = null

/** Read once per process: some 200 kB. */
export function sheetFonts(): Record<FontWeight, LoadedFont[]> {
  loaded ??= {
    regular: SUBSETS.map((subset) => loadFont('regular', subset)),
    strong: SUBSETS.map((subset) => loadFont('strong', subset)),
  }
  return loaded
}

const isDrawnSign = (letter: string): letter is DrawnSign => letter in DRAWN_SIGNS

export function textRuns(text: string, weight: FontWeight): TextRun[] {
  const fonts = sheetFonts()[weight]
  const runs: TextRun[] = []
  for (const original of text.normalize('NFC')) {
    const lowered = LOWERED_DIGITS.indexOf(original)
    const letter = lowered >= 0 ? String(lowered) : (SAME_LOOK[original] ?? original)
    // Control characters have no shape and no width.
    if (/\p{Cc}|\p{Cf}/u.test(letter)) continue
    if (isDrawnSign(letter)) {
      runs.push({ kind: 'sign', sign: letter })
      continue
    }
    const font = fonts.find((candidate) => candidate.has(letter.codePointAt(0) ?? 0))
    if (!font) {
      runs.push({ kind: 'sign', sign: '□' })
      continue
    }
    const last = runs.at(-1)
    const isLowered = lowered >= 0
    if (last?.kind === 'letters' && last.fontName === font.name && last.isLowered === isLowered)
      last.text += letter
    else runs.push({ kind: 'letters', text: letter, fontName: font.name, isLowered })
  }
  return runs
}
