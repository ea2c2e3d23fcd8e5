/** What a PDF says and where, read back by an independent library. */
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs'

export interface PlacedText {
  text: string
  /** Bounding box in points from the lower left corner of the page. */
  left: number
  right: number
  bottom: number
  top: number
}

export interface PdfPage {
  widthPt: number
  heightPt: number
  /** All runs in drawing order, joined by blanks. */
  text: string
  items: PlacedText[]
}

export async function readPdf(
  bytes: Uint8Array,
): Promise<{ pages: PdfPage[]; info: Record<string, unknown> }> {
  // The library takes the bytes for itself.
  const task = getDocument({ data: new Uint8Array(bytes), verbosity: 0 })
  const pdf = await task.promise
  try {
    const pages: PdfPage[] = []
    for (let number = 1; number <= pdf.numPages; number += 1) {
      const page = await pdf.getPage(number)
      const { width, height } = page.getViewport({ scale: 1 })
      const content = await page.getTextContent()
      const items = content.items.flatMap((item) =>
        'str' in item && item.str.trim() !== '' ? [placed(item)] : [],
      )
      pages.push({
        widthPt: width,
        heightPt: height,
        text: items.map((item) => item.text).join(' '),
        items,
      })
    }
    const { info } = await pdf.getMetadata()
    return { pages, info: info as Record<string, unknown> }
  } finally {
    await task.destroy()
  }
}

/** Share of the letter size that letters really reach above and below the baseline. */
const ASCENT = 0.72
const DESCENT = 0.12

function placed(item: { str: string; transform: number[]; width: number; height: number }): PlacedText {
  const [a = 0, b = 0, , , x = 0, y = 0] = item.transform
  const size = Math.hypot(a, b)
  // The micro sign and the Greek mu share a glyph, and the PDF can name only one of them.
  const text = item.str.normalize('NFKC')
  const isUpright = Math.abs(b) > Math.abs(a)
  return isUpright
    ? { text, left: x - ASCENT * size, right: x + DESCENT * size, bottom: y, top: y + item.width }
    : { text, left: x, right: x + item.width, bottom: y - DESCENT * size, top: y + ASCENT * size }
}

/** Pairs of texts that lie on each other by more than a hair. */
export function overlaps(items: readonly PlacedText[], tolerancePt = 0.4): string[] {
  const found: string[] = []
  const sorted = [...items].sort((one, other) => one.left - other.left)
  sorted.forEach((one, index) => {
    for (const other of sorted.slice(index + 1)) {
      if (other.left > one.right) break
      const across = Math.min(one.right, other.right) - Math.max(one.left, other.left)
      const up = Math.min(one.top, other.top) - Math.max(one.bottom, other.bottom)
      if (across > tolerancePt && up > tolerancePt) found.push(`"${one.text}" and "${other.text}"`)
    }
  })
  return found
}
