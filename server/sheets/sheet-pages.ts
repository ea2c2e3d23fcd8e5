/** Paper, frame, the strip at the foot of every sheet and the flow from one sheet to the next. */
import { CAUTIONS_LINE } from '@shared/recalculation/cautions'
import { utc } from './sheet-format'
import type { SheetRelease } from './sheet-release'
import { BAD, HAIRLINE, QUIET, type TextStyle, THICK_MM } from './sheet-style'
import { SheetWriter } from './sheet-writer'

/** One size for every sheet: the drawing at a large scale and the schedule in one row a hub need the room. */
export const PAPER = { name: 'A3', widthMm: 420, heightMm: 297 } as const

/** Filing margin on the left, frame elsewhere (ISO 5457, from memory). */
export const FILING_MARGIN_MM = 20
export const MARGIN_MM = 10
export const STRIP_HEIGHT_MM = 11
const INNER_GAP_MM = 5

export const BODY: TextStyle = { sizePt: 9 }
export const TABLE: TextStyle = { sizePt: 7.8 }
export const SMALL_QUIET: TextStyle = { sizePt: 7.8, colour: QUIET }
export const HEADING: TextStyle = { sizePt: 13, weight: 'strong' }
export const SUBHEADING: TextStyle = { sizePt: 10, weight: 'strong' }
const LABEL: TextStyle = { sizePt: 6.4, colour: QUIET }

export class SheetPages {
  /** Where the next thing goes. */
  y = 0
  private heading = ''

  constructor(
    readonly writer: SheetWriter,
    private readonly release: SheetRelease,
  ) {}

  get frame() {
    return {
      left: FILING_MARGIN_MM,
      top: MARGIN_MM,
      right: PAPER.widthMm - MARGIN_MM,
      bottom: PAPER.heightMm - MARGIN_MM,
    }
  }
  get left(): number {
    return this.frame.left + INNER_GAP_MM
  }
  get width(): number {
    return this.frame.right - this.frame.left - 2 * INNER_GAP_MM
  }
  get bottom(): number {
    return this.frame.bottom - STRIP_HEIGHT_MM - 2
  }

  addPage(): void {
    this.writer.addPage(PAPER.widthMm, PAPER.heightMm)
    const { left, top, right, bottom } = this.frame
    this.writer.rect(left, top, right - left, bottom - top, { stroke: { widthMm: 2 * THICK_MM } })
    this.y = top + INNER_GAP_MM
  }

  /** A sheet of its own with a heading; what runs over continues under the same heading. */
  startPage(heading: string): void {
    this.addPage()
    this.heading = heading
    this.writeHeading(heading)
  }

  /** Goes on to a new sheet unless `heightMm` is still free; true when it did. */
  need(heightMm: number): boolean {
    if (this.y + heightMm <= this.bottom) return false
    this.addPage()
    this.writeHeading(`${this.heading}, continued`)
    return true
  }

  subheading(text: string, heightBelowMm = 10): void {
    this.need(9 + heightBelowMm)
    this.y += 2.5
    this.writer.text(text, this.left, this.y + this.writer.capHeight(SUBHEADING), SUBHEADING)
    this.y += 5.5
  }

  paragraph(text: string, style: TextStyle = BODY, widthMm = this.width): void {
    const lines = this.writer.wrap(text, widthMm, style)
    const step = this.writer.lineHeight(style)
    for (const line of lines) {
      this.need(step)
      this.writer.text(line, this.left, this.y + this.writer.capHeight(style) + 0.35, style)
      this.y += step
    }
  }

  private writeHeading(text: string): void {
    this.writer.text(text, this.left, this.y + this.writer.capHeight(HEADING), HEADING)
    this.y += 8
  }

  /** Only now is the number of sheets known. */
  finishStrips(): void {
    this.writer.forEachPage((index, count) => this.writeStrip(index + 1, count))
  }

  private writeStrip(sheet: number, count: number): void {
    const { writer, release } = this
    const { left, right, bottom } = this.frame
    const top = bottom - STRIP_HEIGHT_MM
    writer.line({ x: left, y: top }, { x: right, y: top }, { widthMm: THICK_MM })
    const upper = top + 4.4
    const lower = top + 8.8
    const pageText = `Sheet ${sheet} of ${count}`
    const pageStyle: TextStyle = { sizePt: 8, weight: 'strong', align: 'right' }
    writer.text(pageText, right - 3, upper, pageStyle)
    const withdrawn = release.withdrawal
    const status = withdrawn
      ? `Withdrawn ${utc(withdrawn.at)}`
      : release.verdict === 'passes'
        ? 'Released'
        : 'Released with accepted deviations'
    writer.text(status, right - 3, lower, {
      sizePt: 7,
      align: 'right',
      ...(withdrawn ? { colour: BAD, weight: 'strong' as const } : {}),
    })
    const hash = `Document ${release.documentHash}`
    const hashStyle: TextStyle = { sizePt: 6.5 }
    const rightColumn =
      right - 3 - Math.max(writer.measure(pageText, pageStyle), writer.measure(status, { sizePt: 7 })) - 6
    const hashWidth = writer.measure(hash, hashStyle)
    writer.text(hash, rightColumn, upper, { ...hashStyle, align: 'right' })
    const revision = `Revision ${release.revisionLetter}, number ${release.revision}`
    const revisionStyle: TextStyle = { sizePt: 8, weight: 'strong' }
    writer.text(revision, left + 3, upper, revisionStyle)
    const nameLeft = left + 3 + writer.measure(revision, revisionStyle) + 4
    writer.text(
      writer.fit(release.layoutName, rightColumn - hashWidth - 6 - nameLeft, { sizePt: 8 }),
      nameLeft,
      upper,
      { sizePt: 8 },
    )
    writer.text(`${CAUTIONS_LINE} Hubstead, engine ${release.engineVersion}.`, left + 3, lower, LABEL)
  }
}

export const RULE = { widthMm: 0.13, colour: HAIRLINE }
