/** The release sheet: a PDF of the stored release. The same release always gives the same bytes. */
import { writeDrawingPage, writeTitleBlock } from './drawing-page'
import { writeFindingsPages } from './findings-page'
import { writeLoadPages } from './load-page'
import { writeMethodPages } from './method-page'
import { writeSchedulePages } from './schedule-page'
import { writeShaftPages } from './shaft-page'
import { SheetPages } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { SheetWriter } from './sheet-writer'

export async function drawReleaseSheet(release: SheetRelease): Promise<Buffer> {
  const writer = new SheetWriter({
    title: `${release.layoutName}, revision ${release.revisionLetter}`,
    author: release.frozenByName,
    subject: `Release of a shaft layout, ${release.workspaceName}`,
    keywords: `${release.documentHash} ${release.releaseHash}`,
    createdAt: new Date(release.frozenAt),
  })
  const pages = new SheetPages(writer, release)
  const { scale } = writeDrawingPage(pages, release)
  for (const writePages of [
    writeSchedulePages,
    writeLoadPages,
    writeShaftPages,
    writeFindingsPages,
    writeMethodPages,
  ]) {
    // People edit live on this process: let their edits through between the sheets.
    await new Promise((resolve) => setImmediate(resolve))
    writePages(pages, release)
  }
  writer.forEachPage((index, sheetCount) => {
    if (index === 0) writeTitleBlock(pages, release, { scale, sheetCount })
  })
  pages.finishStrips()
  return writer.finish()
}
