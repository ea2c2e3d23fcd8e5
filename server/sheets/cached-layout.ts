/**
 * The PDF library lays a text with font features out anew every time it measures or writes it, and
 * caches only texts without. Most texts of a sheet are figures of equal width, which is a feature,
 * so their words are cached here in the same way.
 */
interface LaidRun {
  glyphs: unknown[]
  positions: unknown[]
  advanceWidth: number
}
interface LayoutFont {
  layoutRun(text: string, features?: readonly string[]): LaidRun
  layout(text: string, features?: readonly string[], onlyWidth?: boolean): LaidRun
}

const isLayoutFont = (font: unknown): font is LayoutFont =>
  typeof font === 'object' && font !== null && 'layoutRun' in font && 'layout' in font

/** Takes the font a document has just been set to. A library that works otherwise is left alone. */
export function cacheLayout(pdf: PDFKit.PDFDocument): void {
  const font = (pdf as unknown as { _font?: unknown })._font
  if (!isLayoutFont(font)) return
  const plainLayout = font.layout.bind(font)
  const words = new Map<string, LaidRun>()
  const layWord = (word: string, features: readonly string[]): LaidRun => {
    const key = `${features.join()} ${word}`
    const cached = words.get(key)
    if (cached) return cached
    const run = font.layoutRun(word, features)
    words.set(key, run)
    return run
  }
  font.layout = (text, features, onlyWidth) => {
    if (!features) return plainLayout(text, features, onlyWidth)
    // A word keeps the blank after it, so that the pair is kerned as in one piece.
    const runs = (text.match(/[^ ]* |[^ ]+$/g) ?? []).map((word) => layWord(word, features))
    return {
      glyphs: runs.flatMap((run) => run.glyphs),
      positions: runs.flatMap((run) => run.positions),
      advanceWidth: runs.reduce((sum, run) => sum + run.advanceWidth, 0),
    }
  }
}
