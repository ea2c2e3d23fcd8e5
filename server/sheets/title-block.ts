/** The title block of the first sheet: 180 mm wide with the data fields of ISO 7200 (from memory). */
import { safety, utc } from './sheet-format'
import { PAPER } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { BAD, QUIET, type TextStyle, THICK_MM, THIN_MM } from './sheet-style'
import type { SheetWriter } from './sheet-writer'

export const TITLE_BLOCK_WIDTH_MM = 180
const ROWS_MM = [9, 15, 9, 9] as const
export const TITLE_BLOCK_HEIGHT_MM = ROWS_MM.reduce<number>((sum, height) => sum + height, 0)

const LABEL: TextStyle = { sizePt: 5.8, colour: QUIET }
const VALUE: TextStyle = { sizePt: 8 }
const STRONG: TextStyle = { sizePt: 8, weight: 'strong' }
const PADDING_MM = 1.6

export function drawTitleBlock(
  writer: SheetWriter,
  release: SheetRelease,
  right: number,
  bottom: number,
  about: { scale: string; sheetCount: number },
): void {
  const left = right - TITLE_BLOCK_WIDTH_MM
  const top = bottom - TITLE_BLOCK_HEIGHT_MM
  const tops = ROWS_MM.map((_, index) => top + ROWS_MM.slice(0, index).reduce<number>((sum, h) => sum + h, 0))
  writer.rect(left, top, TITLE_BLOCK_WIDTH_MM, TITLE_BLOCK_HEIGHT_MM, {
    fill: '#FFFFFF',
    stroke: { widthMm: 2 * THICK_MM },
  })

  const cell = (
    row: number,
    from: number,
    width: number,
    label: string,
    value: string,
    style: TextStyle = VALUE,
  ) => {
    const x = left + from
    const y = tops[row] ?? top
    const height = ROWS_MM[row] ?? 0
    if (from > 0) writer.line({ x, y }, { x, y: y + height }, { widthMm: THIN_MM })
    writer.text(label, x + PADDING_MM, y + 2.9, LABEL)
    writer.text(shrunk(writer, value, width - 2 * PADDING_MM, style).text, x + PADDING_MM, y + height - 2.1, {
      ...style,
      sizePt: shrunk(writer, value, width - 2 * PADDING_MM, style).sizePt,
    })
  }
  tops.slice(1).forEach((y) => writer.line({ x: left, y }, { x: right, y }, { widthMm: THIN_MM }))

  cell(0, 0, 70, 'Owner', release.workspaceName, STRONG)
  cell(0, 70, 50, 'Kind of document', 'Release of a shaft layout')
  cell(0, 120, 60, 'State', stateWords(release), {
    ...STRONG,
    ...(release.withdrawal ? { colour: BAD } : {}),
  })

  drawTitle(writer, release, left, tops[1] ?? top)
  const revisionX = left + 132
  const revisionY = tops[1] ?? top
  writer.line(
    { x: revisionX, y: revisionY },
    { x: revisionX, y: revisionY + ROWS_MM[1] },
    { widthMm: THIN_MM },
  )
  writer.text('Revision', revisionX + PADDING_MM, revisionY + 2.9, LABEL)
  writer.text(release.revisionLetter, revisionX + PADDING_MM, revisionY + 12.4, {
    sizePt: 19,
    weight: 'strong',
  })
  const numberX = left + 156
  writer.line({ x: numberX, y: revisionY }, { x: numberX, y: revisionY + ROWS_MM[1] }, { widthMm: THIN_MM })
  writer.text('Revision number', numberX + PADDING_MM, revisionY + 2.9, LABEL)
  writer.text(String(release.revision), numberX + PADDING_MM, revisionY + 12.4, {
    sizePt: 12,
    weight: 'strong',
  })

  cell(2, 0, 46, 'Review asked by', release.reviewAskedByName ?? 'not asked')
  cell(2, 46, 46, 'Frozen by', release.frozenByName, STRONG)
  cell(2, 92, 40, 'Frozen at', utc(release.frozenAt))
  cell(2, 132, 24, 'Engine version', release.engineVersion)
  cell(2, 156, 24, 'Least slip safety', leastSlipSafety(release))

  cell(3, 0, 92, 'Release', release.id)
  cell(3, 92, 16, 'Scale', about.scale, STRONG)
  cell(3, 108, 12, 'Paper', PAPER.name)
  cell(3, 120, 12, 'Unit', 'mm')
  const projectionX = left + 132
  const lastTop = tops[3] ?? top
  writer.line({ x: projectionX, y: lastTop }, { x: projectionX, y: bottom }, { widthMm: THIN_MM })
  writer.text('Projection', projectionX + PADDING_MM, lastTop + 2.9, LABEL)
  drawFirstAngleSign(writer, projectionX + 12, lastTop + 6)
  cell(3, 156, 24, 'Sheet', `1 of ${about.sheetCount}`, STRONG)
}

function stateWords(release: SheetRelease): string {
  if (release.withdrawal) return 'Withdrawn'
  return release.verdict === 'passes' ? 'Released' : 'Released with accepted deviations'
}

function leastSlipSafety(release: SheetRelease): string {
  const safeties = release.results.hubs
    .flatMap((hub) => hub.loadCases.map((loadCase) => loadCase.slipSafety))
    .filter((value) => value !== null)
  return safeties.length === 0 ? 'no demand' : safety(Math.min(...safeties))
}

/** Two lines at most; the full name stands in the strip and on the schedule as well. */
function drawTitle(writer: SheetWriter, release: SheetRelease, left: number, top: number): void {
  const width = 132 - 2 * PADDING_MM
  writer.text('Title', left + PADDING_MM, top + 2.9, LABEL)
  for (const sizePt of [12, 10.5, 9, 8]) {
    const style: TextStyle = { sizePt, weight: 'strong' }
    const lines = writer.wrap(release.layoutName, width, style)
    const step = writer.lineHeight(style)
    if (lines.length * step > 11 && sizePt > 8) continue
    const shown = lines.slice(0, Math.max(1, Math.floor(11.4 / step)))
    const first = top + 3.6 + (11 - shown.length * step) / 2 + writer.capHeight(style) + 0.6
    shown.forEach((line, index) => {
      const isCut = index === shown.length - 1 && shown.length < lines.length
      writer.text(
        isCut ? writer.fit(`${line} …`, width, style) : line,
        left + PADDING_MM,
        first + index * step,
        style,
      )
    })
    return
  }
}

/** Smaller letters before an ellipsis: names in a title block should stay whole. */
function shrunk(writer: SheetWriter, text: string, widthMm: number, style: TextStyle) {
  for (const sizePt of [style.sizePt, style.sizePt - 1, style.sizePt - 2])
    if (writer.measure(text, { ...style, sizePt }) <= widthMm) return { text, sizePt }
  const sizePt = style.sizePt - 2
  return { text: writer.fit(text, widthMm, { ...style, sizePt }), sizePt }
}

/** Cone and circles of the first angle method (ISO 5456-2, from memory). */
function drawFirstAngleSign(writer: SheetWriter, centreX: number, centreY: number): void {
  const line = { widthMm: THIN_MM }
  const x = centreX - 5.5
  const end = x + 5
  writer.polygon(
    [
      { x, y: centreY - 1.1 },
      { x: end, y: centreY - 2 },
      { x: end, y: centreY + 2 },
      { x, y: centreY + 1.1 },
    ],
    { stroke: line },
  )
  const circles = { x: end + 4.5, y: centreY }
  writer.circle(circles, 2, { stroke: line })
  writer.circle(circles, 1.1, { stroke: line })
  writer.line(
    { x: x - 1, y: centreY },
    { x: end + 1, y: centreY },
    { widthMm: 0.1, dashMm: [1.4, 0.4, 0.3, 0.4] },
  )
  writer.line({ x: circles.x - 3, y: centreY }, { x: circles.x + 3, y: centreY }, { widthMm: 0.1 })
  writer.line({ x: circles.x, y: centreY - 2.5 }, { x: circles.x, y: centreY + 2.5 }, { widthMm: 0.1 })
}
