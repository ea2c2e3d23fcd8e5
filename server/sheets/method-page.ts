/** How it was computed, what the model leaves out, the cautions, and how to check the sheet. */
import { criteriaWords } from './load-page'
import { BODY, type SheetPages } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { writeTable } from './sheet-table'

export function writeMethodPages(pages: SheetPages, release: SheetRelease): void {
  pages.startPage('Method, limits and cautions')
  pages.subheading('Cautions')
  for (const caution of release.results.cautions) bullet(pages, caution)
  pages.subheading('What the model does not cover')
  for (const gap of release.method.notCovered) bullet(pages, gap)
  pages.subheading('Criteria of this layout')
  pages.paragraph(`${criteriaWords(release.document.criteria)}.`)
  pages.subheading('How it was computed', 20)
  writeTable(
    pages,
    [
      { head: ['Step'], width: 40 },
      { head: [`Engine ${release.engineVersion}`], width: 220 },
    ],
    release.method.method.map((step) => [
      { lines: [{ text: step.title, style: { weight: 'strong' } }] },
      step.text,
    ]),
    { style: BODY },
  )
  pages.subheading('How to check this sheet', 24)
  pages.paragraph(
    'The document hash is the SHA-256 of the stored layout as canonical JSON (keys sorted, no blanks), the text that the ' +
      'export of the release gives. The release hash covers layout, results, engine version, acceptances, names and times, and the hash of the ' +
      'release before it; it shows a change of what is stored, but not against someone who can rewrite the whole file.',
  )
  pages.y += 1.5
  for (const [label, value] of [
    ['Document hash', release.documentHash],
    ['Release hash', release.releaseHash],
    ['Hash of the release before', release.previousHash ?? 'none, this is the first'],
    ['Release', release.id],
  ] as const) {
    pages.need(5)
    pages.writer.text(label, pages.left, pages.y + 3, BODY)
    pages.writer.text(value, pages.left + 48, pages.y + 3, { ...BODY, weight: 'strong' })
    pages.y += 4.4
  }
}

function bullet(pages: SheetPages, text: string): void {
  const indent = 4
  const lines = pages.writer.wrap(text, pages.width - indent, BODY)
  const step = pages.writer.lineHeight(BODY)
  lines.forEach((line, index) => {
    pages.need(step)
    const baseline = pages.y + pages.writer.capHeight(BODY) + 0.35
    if (index === 0) pages.writer.circle({ x: pages.left + 1.2, y: baseline - 1 }, 0.45, { fill: '#1F242C' })
    pages.writer.text(line, pages.left + indent, baseline, BODY)
    pages.y += step
  })
}
