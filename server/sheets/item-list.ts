/** The parts of the drawing by item number, beside the title block. */
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'
import type { HubResult } from '@shared/recalculation/layout-results'
import { millimetres, plain } from './sheet-format'
import type { SheetRelease } from './sheet-release'
import { QUIET, type TextStyle, THIN_MM } from './sheet-style'
import type { SheetWriter } from './sheet-writer'

const TEXT: TextStyle = { sizePt: 7.4 }
const HEAD: TextStyle = { sizePt: 6, colour: QUIET, weight: 'strong' }
const ROW_MM = 4.2
const HEAD_MM = 5
const LEAST_COLUMN_MM = 84
const LEAST_ROWS = 8
const MOST_ROWS = 16

/** Words for a fit as drawings write it: classes, or limits of interference. */
export function fitWords(fit: Hub['fit']): string {
  if (fit.kind === 'iso286') return `${fit.hole}/${fit.shaft}`
  return `${plain(fit.minInterferenceUm)} to ${plain(fit.maxInterferenceUm)} µm`
}

export const itemListRows = (document: LayoutDocument, widthMm: number) => {
  const columns = Math.max(1, Math.floor(widthMm / LEAST_COLUMN_MM))
  // One column first: a second one begins only where the title block's height is used up.
  const rows = Math.min(MOST_ROWS, Math.max(LEAST_ROWS, Math.ceil(document.hubs.length / columns)))
  return {
    columns: Math.max(1, Math.min(columns, Math.ceil(document.hubs.length / Math.max(1, rows)))),
    rows,
  }
}

export const itemListHeight = (document: LayoutDocument, widthMm: number) =>
  HEAD_MM + itemListRows(document, widthMm).rows * ROW_MM + 6

export function drawItemList(
  writer: SheetWriter,
  release: SheetRelease,
  area: { left: number; top: number; widthMm: number },
): void {
  const { document, results } = release
  const { columns, rows } = itemListRows(document, area.widthMm)
  const columnWidth = Math.min(125, area.widthMm / columns)
  const byId = new Map(results.hubs.map((hub) => [hub.id, hub]))
  const shown = document.hubs.slice(0, columns * rows)
  for (let column = 0; column < columns && column * rows < shown.length; column += 1) {
    const x = area.left + column * columnWidth
    const right = x + columnWidth - 4
    const fitX = right - 41
    const stateX = right - 12
    const nameWidth = fitX - x - 8
    const headY = area.top + 3
    writer.text('Item', x, headY, HEAD)
    writer.text('Hub', x + 7, headY, HEAD)
    writer.text('Seat and fit', fitX, headY, HEAD)
    writer.text('State', stateX, headY, HEAD)
    writer.line({ x, y: area.top + 4.2 }, { x: right, y: area.top + 4.2 }, { widthMm: THIN_MM })
    shown.slice(column * rows, (column + 1) * rows).forEach((hub, index) => {
      const y = area.top + HEAD_MM + index * ROW_MM + 2.6
      const result = byId.get(hub.id)
      writer.text(String(column * rows + index + 1), x + 5, y, { ...TEXT, align: 'right' })
      writer.text(writer.fit(hub.name, nameWidth, TEXT), x + 7, y, TEXT)
      const seat = `⌀${millimetres(result?.seat.diameterMm)} ${fitWords(hub.fit)}`
      writer.text(writer.fit(seat, stateX - fitX - 1, TEXT), fitX, y, TEXT)
      writer.text(verdictWord(result), stateX, y, { ...TEXT, weight: 'strong' })
    })
  }
  if (shown.length < document.hubs.length)
    writer.text(
      `Items ${shown.length + 1} to ${document.hubs.length} stand in the fit schedule.`,
      area.left,
      area.top + HEAD_MM + rows * ROW_MM + 3,
      { ...TEXT, colour: QUIET },
    )
}

export function verdictWord(result: HubResult | undefined): string {
  if (!result) return 'not computed'
  switch (result.verdict) {
    case 'passes':
      return 'passes'
    case 'fails':
      return 'fails'
    case 'notComputable':
      return 'not computed'
  }
}
