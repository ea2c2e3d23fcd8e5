/**
 * A pen for sheets: everything in millimetres from the top left corner, text by its baseline.
 * Knows paper, not shafts. Bytes depend on what is written and the date given, nothing else.
 */
import PDFDocument from 'pdfkit'
import { cacheLayout } from './cached-layout'
import { drawSign } from './drawn-signs'
import { DRAWN_SIGNS, sheetFonts, textRuns } from './sheet-fonts'
import {
  CAP_HEIGHT,
  INK,
  LINE_SPACING,
  type LineStyle,
  LOWERED_DROP,
  LOWERED_SIZE,
  PT_PER_MM,
  type TextStyle,
  THIN_MM,
  type XY,
} from './sheet-style'

/** Figures of equal width. Asked for only where there are digits: a text without features is laid out from a cache. */
const digitFeatures = (text: string): { features?: ['tnum', 'kern'] } =>
  /\d/.test(text) ? { features: ['tnum', 'kern'] } : {}

export class SheetWriter {
  private readonly pdf: PDFKit.PDFDocument
  private readonly ended: Promise<Buffer>
  private readonly widthsEm = new Map<string, number>()
  private readonly cachedFonts = new Set<string>()

  constructor(about: { title: string; author: string; subject: string; keywords: string; createdAt: Date }) {
    this.pdf = new PDFDocument({
      autoFirstPage: false,
      bufferPages: true,
      lang: 'en-GB',
      displayTitle: true,
      margin: 0,
      pdfVersion: '1.7',
      // The date of the release, so that the same release gives the same bytes at any time.
      info: {
        Title: about.title,
        Author: about.author,
        Subject: about.subject,
        Keywords: about.keywords,
        Creator: 'Hubstead',
        Producer: 'Hubstead',
        CreationDate: about.createdAt,
        ModDate: about.createdAt,
      },
    })
    const chunks: Buffer[] = []
    this.ended = new Promise((resolve, reject) => {
      this.pdf.on('data', (chunk: Buffer) => chunks.push(chunk))
      this.pdf.on('end', () => resolve(Buffer.concat(chunks)))
      this.pdf.on('error', reject)
    })
    const fonts = sheetFonts()
    for (const font of [...fonts.regular, ...fonts.strong]) this.pdf.registerFont(font.name, font.bytes)
  }

  addPage(widthMm: number, heightMm: number): void {
    this.pdf.addPage({ size: [widthMm * PT_PER_MM, heightMm * PT_PER_MM], margin: 0 })
  }

  get pageCount(): number {
    return this.pdf.bufferedPageRange().count
  }

  /** Calls back once per page, in order, with the pen on that page. */
  forEachPage(write: (index: number, count: number) => void): void {
    const { start, count } = this.pdf.bufferedPageRange()
    for (let index = 0; index < count; index += 1) {
      this.pdf.switchToPage(start + index)
      write(index, count)
    }
  }

  finish(): Promise<Buffer> {
    this.pdf.end()
    return this.ended
  }

  /** Width in millimetres. */
  measure(text: string, style: TextStyle): number {
    let widthEm = 0
    for (const run of textRuns(text, style.weight ?? 'regular'))
      widthEm +=
        run.kind === 'sign'
          ? DRAWN_SIGNS[run.sign].widthEm
          : this.runWidthEm(run.text, run.fontName) * (run.isLowered ? LOWERED_SIZE : 1)
    return (widthEm * style.sizePt) / PT_PER_MM
  }

  /** One line; `y` is the baseline. */
  text(text: string, x: number, y: number, style: TextStyle): void {
    const align = style.align ?? 'left'
    const shift = align === 'left' ? 0 : this.measure(text, style) * (align === 'right' ? 1 : 0.5)
    let at = (x - shift) * PT_PER_MM
    const baseline = y * PT_PER_MM
    const colour = style.colour ?? INK
    for (const run of textRuns(text, style.weight ?? 'regular')) {
      if (run.kind === 'sign') {
        drawSign(this.pdf, run.sign, at, baseline, style.sizePt, colour)
        at += DRAWN_SIGNS[run.sign].widthEm * style.sizePt
        continue
      }
      const size = style.sizePt * (run.isLowered ? LOWERED_SIZE : 1)
      const width = this.runWidthEm(run.text, run.fontName) * size
      this.useFont(run.fontName, size).fillColor(colour)
      this.pdf.text(run.text, at, baseline + (run.isLowered ? style.sizePt * LOWERED_DROP : 0), {
        lineBreak: false,
        baseline: 'alphabetic',
        ...digitFeatures(run.text),
      })
      at += width
    }
  }

  /** Reads from bottom to top, as dimensions on a drawing do; (x, y) is the middle of the line. */
  verticalText(text: string, x: number, y: number, style: TextStyle): void {
    this.pdf.save()
    this.pdf.rotate(-90, { origin: [x * PT_PER_MM, y * PT_PER_MM] })
    this.text(text, x, y + (style.sizePt * CAP_HEIGHT) / 2 / PT_PER_MM, style)
    this.pdf.restore()
  }

  /** Breaks at blanks, and inside a word only where the word alone is too long. */
  wrap(text: string, widthMm: number, style: TextStyle): string[] {
    const lines: string[] = []
    const blankMm = this.measure(' ', style)
    for (const paragraph of text.split('\n')) {
      let line = ''
      let lineMm = 0
      for (const word of paragraph.split(/ +/)) {
        const wordMm = this.measure(word, style)
        if (line !== '' && lineMm + blankMm + wordMm <= widthMm) {
          line = `${line} ${word}`
          lineMm += blankMm + wordMm
          continue
        }
        if (line !== '') lines.push(line)
        line = word
        while (this.measure(line, style) > widthMm && line.length > 1) {
          const cut = this.longestPrefix(line, widthMm, style)
          lines.push(line.slice(0, cut))
          line = line.slice(cut)
        }
        lineMm = this.measure(line, style)
      }
      lines.push(line)
    }
    return lines
  }

  /** Shortens to one line with an ellipsis; only where the full text stands elsewhere on the sheet. */
  fit(text: string, widthMm: number, style: TextStyle): string {
    if (this.measure(text, style) <= widthMm) return text
    const cut = this.longestPrefix(text, widthMm - this.measure('…', style), style)
    return `${text.slice(0, cut).trimEnd()}…`
  }

  lineHeight(style: TextStyle): number {
    return (style.sizePt * LINE_SPACING) / PT_PER_MM
  }

  capHeight(style: TextStyle): number {
    return (style.sizePt * CAP_HEIGHT) / PT_PER_MM
  }

  /** Writes wrapped lines below `top` and returns the height used. */
  paragraph(text: string, x: number, top: number, widthMm: number, style: TextStyle): number {
    const lines = this.wrap(text, widthMm, style)
    const step = this.lineHeight(style)
    const anchor = style.align === 'right' ? x + widthMm : style.align === 'centre' ? x + widthMm / 2 : x
    lines.forEach((line, index) =>
      this.text(line, anchor, top + this.capHeight(style) + 0.35 + index * step, style),
    )
    return lines.length * step
  }

  line(from: XY, to: XY, style: LineStyle = {}): void {
    this.polyline([from, to], style)
  }

  polyline(points: readonly XY[], style: LineStyle = {}): void {
    this.path(points, false)
    this.stroke(style)
  }

  polygon(points: readonly XY[], style: { fill?: string; stroke?: LineStyle }): void {
    if (style.fill) {
      this.path(points, true)
      this.pdf.fill(style.fill)
    }
    if (style.stroke) {
      this.path(points, true)
      this.stroke(style.stroke)
    }
  }

  rect(
    x: number,
    y: number,
    width: number,
    height: number,
    style: { fill?: string; stroke?: LineStyle },
  ): void {
    this.polygon(
      [
        { x, y },
        { x: x + width, y },
        { x: x + width, y: y + height },
        { x, y: y + height },
      ],
      style,
    )
  }

  circle(centre: XY, radius: number, style: { fill?: string; stroke?: LineStyle }): void {
    const draw = () => this.pdf.circle(centre.x * PT_PER_MM, centre.y * PT_PER_MM, radius * PT_PER_MM)
    if (style.fill) draw().fill(style.fill)
    if (style.stroke) {
      draw()
      this.stroke(style.stroke)
    }
  }

  /** Thin parallel lines at 45° inside a closed outline. */
  hatch(
    outline: readonly XY[],
    spacingMm: number,
    direction: 'rising' | 'falling',
    style: LineStyle = {},
  ): void {
    const xs = outline.map((point) => point.x)
    const ys = outline.map((point) => point.y)
    const [left, right] = [Math.min(...xs), Math.max(...xs)]
    const [top, bottom] = [Math.min(...ys), Math.max(...ys)]
    const height = bottom - top
    this.pdf.save()
    this.path(outline, true)
    this.pdf.clip()
    const step = spacingMm * Math.SQRT2
    // Lines start on a grid of the page, not of the part, so that one part in two pieces reads as one.
    for (let x = Math.floor((left - height) / step) * step; x < right + height; x += step) {
      const ends = direction === 'rising' ? [bottom, top] : [top, bottom]
      this.path(
        [
          { x, y: ends[0] ?? 0 },
          { x: x + height, y: ends[1] ?? 0 },
        ],
        false,
      )
      this.stroke({ widthMm: 0.13, ...style })
    }
    this.pdf.restore()
  }

  private useFont(name: string, sizePt: number): PDFKit.PDFDocument {
    this.pdf.font(name).fontSize(sizePt)
    if (!this.cachedFonts.has(name)) {
      cacheLayout(this.pdf)
      this.cachedFonts.add(name)
    }
    return this.pdf
  }

  /** Widths grow with the size, so each run is laid out once. */
  private runWidthEm(text: string, fontName: string): number {
    const key = `${fontName} ${text}`
    let widthEm = this.widthsEm.get(key)
    if (widthEm === undefined) {
      widthEm = this.useFont(fontName, 100).widthOfString(text, digitFeatures(text)) / 100
      this.widthsEm.set(key, widthEm)
    }
    return widthEm
  }

  private longestPrefix(text: string, widthMm: number, style: TextStyle): number {
    let low = 1
    let high = text.length
    while (low < high) {
      const middle = Math.ceil((low + high) / 2)
      if (this.measure(text.slice(0, middle), style) <= widthMm) low = middle
      else high = middle - 1
    }
    return low
  }

  private path(points: readonly XY[], isClosed: boolean): void {
    points.forEach((point, index) => {
      if (index === 0) this.pdf.moveTo(point.x * PT_PER_MM, point.y * PT_PER_MM)
      else this.pdf.lineTo(point.x * PT_PER_MM, point.y * PT_PER_MM)
    })
    if (isClosed) this.pdf.closePath()
  }

  private stroke(style: LineStyle): void {
    this.pdf.lineWidth((style.widthMm ?? THIN_MM) * PT_PER_MM).lineJoin('miter')
    const dash = style.dashMm
    // The library takes a list of lengths; its types know only one.
    if (dash) this.pdf.dash(dash.map((length) => length * PT_PER_MM) as unknown as number, {})
    this.pdf.stroke(style.colour ?? INK)
    if (dash) this.pdf.undash()
  }
}
