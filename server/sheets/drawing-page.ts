/** The first sheet: the shaft in half section, the item list and the title block. */
import { halfSection } from '@shared/drawing/half-section-geometry'
import { drawItemList, itemListHeight } from './item-list'
import { drawShaftDrawing, planShaftDrawing } from './shaft-drawing'
import { MARGIN_MM, PAPER, type SheetPages, STRIP_HEIGHT_MM } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { QUIET, type TextStyle } from './sheet-style'
import { drawTitleBlock, TITLE_BLOCK_HEIGHT_MM, TITLE_BLOCK_WIDTH_MM } from './title-block'

const NOTE: TextStyle = { sizePt: 7, colour: QUIET }
interface DrawingPage {
  scale: string
}

export function writeDrawingPage(pages: SheetPages, release: SheetRelease): DrawingPage {
  pages.addPage()
  const { writer, frame } = pages
  const foot = frame.bottom - STRIP_HEIGHT_MM
  const listWidth = frame.right - frame.left - TITLE_BLOCK_WIDTH_MM - 8
  const footHeight = Math.max(TITLE_BLOCK_HEIGHT_MM, itemListHeight(release.document, listWidth))
  const section = halfSection(release.document)
  const planned = planShaftDrawing(writer, section, {
    left: frame.left + 4,
    right: frame.right - 4,
    top: frame.top + 12,
    bottom: foot - footHeight - 4,
  })
  writer.text(
    'Half section, cut above the axis. Stations from the left datum face and diameters in millimetres.',
    frame.left + 6,
    frame.top + 6,
    NOTE,
  )
  const omitted = drawShaftDrawing(writer, section, planned)
  if (omitted.length > 0)
    writer.text(
      `Left out for want of room: ${omitted.join(', ')}; see the tables.`,
      frame.left + 6,
      frame.top + 10,
      NOTE,
    )
  drawItemList(writer, release, {
    left: frame.left + 4,
    top: foot - footHeight + (footHeight > TITLE_BLOCK_HEIGHT_MM ? 1 : 3),
    widthMm: listWidth,
  })
  return { scale: planned.label }
}

/** Written last: the number of sheets stands in it. */
export function writeTitleBlock(
  pages: SheetPages,
  release: SheetRelease,
  about: { scale: string; sheetCount: number },
): void {
  drawTitleBlock(
    pages.writer,
    release,
    PAPER.widthMm - MARGIN_MM,
    pages.frame.bottom - STRIP_HEIGHT_MM,
    about,
  )
}
