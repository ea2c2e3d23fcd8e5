/** Tables that wrap inside their cells, break between rows and repeat their head. */
import type { SheetPages } from './sheet-pages'
import { RULE, TABLE } from './sheet-pages'
import { type TextStyle, THICK_MM, QUIET } from './sheet-style'
import type { SheetWriter } from './sheet-writer'

export interface TableColumn {
  /** Each line of the head on its own; the last one usually holds the unit. */
  head: string[]
  /** Share of the free width, or a fixed width in millimetres. */
  width: number
  align?: 'left' | 'right' | 'centre'
}

export interface CellLine {
  text: string
  style?: Partial<TextStyle>
}

/** Lines of text, each wrapped to the column, under a drawing of known height where there is one. */
export type TableCell =
  | string
  | {
      drawing?: {
        heightMm: number
        draw: (writer: SheetWriter, x: number, y: number, widthMm: number) => void
      }
      lines: CellLine[]
    }

const PADDING_X = 1.4
const PADDING_Y = 1.1

export function writeTable(
  pages: SheetPages,
  columns: readonly TableColumn[],
  rows: readonly (readonly TableCell[])[],
  options: { style?: TextStyle; widthMm?: number; left?: number } = {},
): void {
  const { writer } = pages
  const style = options.style ?? TABLE
  const left = options.left ?? pages.left
  const total = columns.reduce((sum, column) => sum + column.width, 0)
  const scale = (options.widthMm ?? pages.width) / total
  const widths = columns.map((column) => column.width * scale)
  const starts = widths.map(
    (_, index) => left + widths.slice(0, index).reduce((sum, width) => sum + width, 0),
  )
  const right = left + widths.reduce((sum, width) => sum + width, 0)

  const headStyle: TextStyle = { sizePt: style.sizePt - 0.5, weight: 'strong' }
  const headLines = columns.map((column, index) =>
    column.head.flatMap((line) => writer.wrap(line, (widths[index] ?? 0) - 2 * PADDING_X, headStyle)),
  )
  const headStep = writer.lineHeight(headStyle)
  const headHeight = Math.max(...headLines.map((lines) => lines.length)) * headStep + 2 * PADDING_Y

  const writeHead = () => {
    columns.forEach((column, index) => {
      const lines = headLines[index] ?? []
      const top = pages.y + headHeight - PADDING_Y - lines.length * headStep
      lines.forEach((line, lineIndex) =>
        writer.text(
          line,
          anchorX(starts[index] ?? 0, widths[index] ?? 0, column.align),
          top + writer.capHeight(headStyle) + 0.35 + lineIndex * headStep,
          { ...headStyle, colour: QUIET, align: column.align ?? 'left' },
        ),
      )
    })
    pages.y += headHeight
    writer.line({ x: left, y: pages.y }, { x: right, y: pages.y }, { widthMm: THICK_MM })
  }

  const layRow = (row: readonly TableCell[]) =>
    row.map((cell, index) => layCell(writer, cell, (widths[index] ?? 0) - 2 * PADDING_X, style))

  rows.forEach((row, rowIndex) => {
    const cells = layRow(row)
    const height = Math.max(...cells.map((cell) => cell.heightMm)) + 2 * PADDING_Y
    if (rowIndex === 0) {
      pages.need(headHeight + height)
      writeHead()
    } else if (pages.need(height)) writeHead()
    cells.forEach((cell, index) =>
      cell.draw(
        (starts[index] ?? 0) + PADDING_X,
        pages.y + PADDING_Y,
        (widths[index] ?? 0) - 2 * PADDING_X,
        columns[index]?.align ?? 'left',
      ),
    )
    pages.y += height
    writer.line({ x: left, y: pages.y }, { x: right, y: pages.y }, RULE)
  })
  pages.y += 2
}

interface LaidCell {
  heightMm: number
  draw: (x: number, y: number, widthMm: number, align: 'left' | 'right' | 'centre') => void
}

function layCell(writer: SheetWriter, cell: TableCell, widthMm: number, base: TextStyle): LaidCell {
  const source: CellLine[] = typeof cell === 'string' ? [{ text: cell }] : cell.lines
  const drawing = typeof cell === 'string' ? undefined : cell.drawing
  const lines = source.flatMap((line) => {
    const style = { ...base, ...line.style }
    return writer.wrap(line.text, widthMm, style).map((text) => ({ text, style }))
  })
  return {
    heightMm: lines.reduce((sum, line) => sum + writer.lineHeight(line.style), drawing?.heightMm ?? 0),
    draw: (x, y, width, align) => {
      drawing?.draw(writer, x, y, width)
      let top = y + (drawing?.heightMm ?? 0)
      for (const { text, style } of lines) {
        const anchor = align === 'left' ? x : align === 'right' ? x + width : x + width / 2
        writer.text(text, anchor, top + writer.capHeight(style) + 0.35, { ...style, align })
        top += writer.lineHeight(style)
      }
    },
  }
}

function anchorX(start: number, width: number, align: TableColumn['align']): number {
  if (align === 'right') return start + width - PADDING_X
  return align === 'centre' ? start + width / 2 : start + PADDING_X
}
