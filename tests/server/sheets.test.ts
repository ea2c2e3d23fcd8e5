/** The release sheet, read back from the PDF. */
import { createHash } from 'node:crypto'
import { afterEach, beforeAll, describe, expect, it, vi } from 'vitest'
import { demoLayouts } from '@server/demo/layout-data'
import { METHOD_NOTES } from '@server/releases/method-notes'
import { drawReleaseSheet } from '@server/sheets/release-sheet'
import type { SheetRelease } from '@server/sheets/sheet-release'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { CAUTIONS_LINE } from '@shared/recalculation/cautions'
import { inputHash } from '@shared/recalculation/input-hash'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { overlaps, type PdfPage, readPdf } from '../support/read-pdf'
import { lineShaftWithThirtyHubs } from './sheets-fixtures'

const PT_PER_MM = 72 / 25.4
const REASON = 'Bench test over 200 h at 1.3 times the torque, report 17.'

const [reducer, camshaft, lineShaft] = demoLayouts().map(({ document }) => document) as [
  LayoutDocument,
  LayoutDocument,
  LayoutDocument,
]

function releaseOf(document: LayoutDocument, change: Partial<SheetRelease> = {}): SheetRelease {
  const results = recalculateLayout(document)
  return {
    id: '5f0c2f7e-1b7d-4a40-9d0e-8b9a6b1c2d3e',
    workspaceName: 'Cedar Line drives',
    layoutName: document.name,
    revisionLetter: 'C',
    revision: 42,
    frozenAt: '2026-12-01T09:30:00.000Z',
    frozenByName: 'Mira Kast',
    reviewAskedByName: 'Dina Reyes',
    reviewAskedAt: '2026-11-30T14:00:00.000Z',
    engineVersion: results.engineVersion,
    documentHash: inputHash(document),
    releaseHash: `sha256:${'ab12'.repeat(16)}`,
    previousHash: null,
    verdict: results.verdict,
    note: 'First batch of ten.',
    document,
    results,
    method: METHOD_NOTES,
    acceptances: results.findings.flatMap(({ code, part, loadCase, severity }) =>
      severity === 'fails' ? [{ code, part, loadCase, reason: REASON }] : [],
    ),
    withdrawal: null,
    ...change,
  }
}

const draw = async (release: SheetRelease) => readPdf(await drawReleaseSheet(release))
const whole = (pages: readonly PdfPage[]) =>
  pages
    .map((page) => page.text)
    .join(' ')
    .replaceAll(/\s+/g, ' ')
/** As the reader spells it. */
const spelled = (text: string) => text.normalize('NFKC').replaceAll(/\s+/g, ' ')

afterEach(() => {
  vi.useRealTimers()
})

describe('every sheet', () => {
  it('carries revision letter and number, document hash, sheet number, engine and the caution', async () => {
    const release = releaseOf(reducer)
    const { pages } = await draw(release)
    expect(pages.length).toBeGreaterThan(3)
    pages.forEach((page, index) => {
      expect(page.text).toContain('Revision C, number 42')
      expect(page.text).toContain(`Document ${release.documentHash}`)
      expect(page.text).toContain(`Sheet ${index + 1} of ${pages.length}`)
      expect(page.text).toContain(CAUTIONS_LINE)
      expect(page.text).toContain(`engine ${release.engineVersion}`)
    })
  })

  it('says so when the release is withdrawn', async () => {
    const withdrawal = {
      at: '2026-12-03T08:00:00.000Z',
      byName: 'Mira Kast',
      reason: 'The wheel drawing was wrong.',
    }
    const { pages } = await draw(releaseOf(reducer, { withdrawal }))
    for (const page of pages) expect(page.text).toContain('Withdrawn 2026-12-03 08:00 UTC')
    expect(whole(pages)).toContain('The wheel drawing was wrong.')
  })

  it('is A3, as the title block says', async () => {
    const { pages } = await draw(releaseOf(reducer))
    for (const page of pages) {
      expect(page.widthPt / PT_PER_MM).toBeCloseTo(420, 1)
      expect(page.heightPt / PT_PER_MM).toBeCloseTo(297, 1)
    }
  })
})

describe('the content', () => {
  it('has title block, scale, hubs with their windows, and who froze it when', async () => {
    const release = releaseOf(reducer)
    const { pages } = await draw(release)
    const [first, schedule] = pages
    for (const text of [
      'Cedar Line drives',
      'Mira Kast',
      'Dina Reyes',
      '2026-12-01 09:30 UTC',
      release.id,
      '1:1',
    ])
      expect(first?.text).toContain(text)
    for (const hub of release.results.hubs) {
      const name = reducer.hubs.find((each) => each.id === hub.id)?.name ?? ''
      expect(schedule?.text).toContain(name)
      for (const um of [
        hub.interference.minUm,
        hub.interference.maxUm,
        hub.window.requiredUm,
        hub.window.permissibleUm,
      ])
        expect(schedule?.text).toContain(String(Math.round(um ?? Number.NaN)))
    }
    // Wheel A of the flawed reducer shaft: 0.94 running, 0.56 warming up.
    expect(schedule?.text).toContain('0.56 too low')
    expect(schedule?.text).toContain('0.94')
  })

  it('prints every finding, every accepted deviation with reason and person, and the note', async () => {
    const release = releaseOf(reducer)
    const text = whole((await draw(release)).pages)
    expect(release.acceptances).toHaveLength(2)
    expect(text.split(REASON)).toHaveLength(3)
    expect(text).toContain('Mira Kast, 2026-12-01 09:30 UTC')
    expect(text).toContain('First batch of ten.')
    for (const finding of release.results.findings)
      expect(text).toContain(spelled(finding.message).slice(0, 40))
  })

  it('prints all cautions and all that the model does not cover', async () => {
    const release = releaseOf(lineShaft)
    const text = whole((await draw(release)).pages)
    expect(release.results.cautions.length).toBeGreaterThan(0)
    for (const line of [...release.results.cautions, ...METHOD_NOTES.notCovered])
      expect(text).toContain(spelled(line))
  })

  it('is what was stored: results are not computed again', async () => {
    const stored = structuredClone(recalculateLayout(reducer))
    const [wheel] = stored.hubs
    if (!wheel) throw new Error('no hub')
    for (const loadCase of wheel.loadCases) loadCase.slipSafety = 7.77
    const { pages } = await draw(releaseOf(reducer, { results: stored }))
    expect(pages[1]?.text).toContain('7.77')
    expect(pages[1]?.text).not.toContain('0.56 too low')
  })

  it('shows letters beyond Latin, and a box for what no bundled font has', async () => {
    const { pages } = await draw(
      releaseOf(reducer, {
        frozenByName: 'Łucja Ωmega',
        workspaceName: 'Ateliér Žďár',
        layoutName: 'Welle 軸',
      }),
    )
    const text = whole(pages).replaceAll(' ', '')
    for (const word of ['Łucja', 'Ωmega', 'Ateliér', 'Žďár', 'Welle?']) expect(text).toContain(word)
  })
})

describe('the bytes', () => {
  it('depend on the release alone', async () => {
    const once = await drawReleaseSheet(releaseOf(reducer))
    vi.useFakeTimers({ now: new Date('2031-05-05T05:05:05Z'), toFake: ['Date'] })
    const later = await drawReleaseSheet(releaseOf(reducer))
    const sha256 = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex')
    expect(sha256(later)).toBe(sha256(once))
    const { info } = await readPdf(once)
    expect(info.CreationDate).toBe('D:20261201093000Z')
    expect(info.Title).toBe(`${reducer.name}, revision C`)
  })
})

describe.each([
  ['three hubs', reducer],
  ['nine hubs on a tube of 28 sections', camshaft],
  ['six hubs on a long shaft', lineShaft],
  ['thirty hubs with long names', lineShaftWithThirtyHubs()],
])('with %s', (_name, document) => {
  let pages: PdfPage[]
  beforeAll(async () => {
    pages = (await draw(releaseOf(document))).pages
  })

  it('no text lies on another or leaves the frame', () => {
    pages.forEach((page, index) => {
      expect(overlaps(page.items), `sheet ${index + 1}`).toEqual([])
      for (const item of page.items) {
        expect(item.left, item.text).toBeGreaterThanOrEqual(20 * PT_PER_MM)
        expect(item.right, item.text).toBeLessThanOrEqual(410 * PT_PER_MM)
        expect(item.bottom, item.text).toBeGreaterThanOrEqual(10 * PT_PER_MM)
        expect(item.top, item.text).toBeLessThanOrEqual(287 * PT_PER_MM)
      }
    })
  })

  it('every hub has its item number on the drawing and its row in the schedule', () => {
    const numbers = new Set(pages[0]?.items.map((item) => item.text))
    document.hubs.forEach((_, index) => expect(numbers).toContain(String(index + 1)))
    const text = whole(pages)
    for (const hub of document.hubs) expect(text).toContain(`id ${hub.id}`)
  })
})

describe('a layout that cannot be computed', () => {
  it('still prints, and says what is missing', async () => {
    const empty: LayoutDocument = { ...reducer, hubs: [], loadCases: [], bearings: [], timing: [] }
    const { pages } = await draw(releaseOf(empty))
    expect(whole(pages)).toContain('The layout has no hubs.')
    const bare: LayoutDocument = { ...empty, shaft: { ...empty.shaft, sections: [] } }
    expect((await draw(releaseOf(bare))).pages.length).toBeGreaterThan(3)
  })
})
