/** What the recalculation found at freezing, and which of it was accepted, by whom and why. */
import type { Finding } from '@shared/recalculation/layout-results'
import { significant, utc, withUnit } from './sheet-format'
import { BODY, type SheetPages } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { type TableCell, type TableColumn, writeTable } from './sheet-table'
import { loadCaseWords, partWords, SEVERITY_WORDS } from './sheet-words'
import { BAD, STRAW } from './sheet-style'

const SEVERITY_COLOURS = { fails: BAD, warns: STRAW, notes: undefined } as const

export function writeFindingsPages(pages: SheetPages, release: SheetRelease): void {
  const { document, results, acceptances } = release
  pages.startPage('Findings and accepted deviations')
  if (release.withdrawal) {
    const { at, byName, reason } = release.withdrawal
    pages.paragraph(`Withdrawn by ${byName}, ${utc(at)}: ${reason}`, {
      ...BODY,
      weight: 'strong',
      colour: BAD,
    })
    pages.y += 2
  }
  if (release.note !== '') {
    pages.paragraph(`Note of ${release.frozenByName} at freezing: ${release.note}`)
    pages.y += 2
  }
  pages.subheading('Accepted deviations')
  if (acceptances.length === 0) pages.paragraph('None. No finding fails in this revision.')
  else {
    const columns: TableColumn[] = [
      { head: ['Finding'], width: 34 },
      { head: ['Where'], width: 60 },
      { head: ['Load case'], width: 46 },
      { head: ['Value / limit'], width: 36 },
      { head: ['Why it is accepted'], width: 130 },
      { head: ['Accepted by, at'], width: 48 },
    ]
    writeTable(
      pages,
      columns,
      acceptances.map((acceptance): TableCell[] => {
        const finding = results.findings.find(
          (candidate) =>
            candidate.code === acceptance.code &&
            candidate.part === acceptance.part &&
            candidate.loadCase === acceptance.loadCase,
        )
        return [
          { lines: [{ text: acceptance.code, style: { weight: 'strong' } }] },
          partWords(document, acceptance.part),
          loadCaseWords(document, acceptance.loadCase),
          finding ? valueWords(finding) : '–',
          acceptance.reason,
          `${release.frozenByName}, ${utc(release.frozenAt)}`,
        ]
      }),
    )
  }
  pages.subheading('Findings')
  if (results.findings.length === 0) {
    pages.paragraph('None.')
    return
  }
  const order = { fails: 0, warns: 1, notes: 2 }
  const findings = [...results.findings].sort((a, b) => order[a.severity] - order[b.severity])
  writeTable(
    pages,
    FINDING_COLUMNS,
    findings.map((finding) => findingRow(release, finding)),
  )
}

const FINDING_COLUMNS: TableColumn[] = [
  { head: ['Severity'], width: 18 },
  { head: ['Finding'], width: 34 },
  { head: ['Where'], width: 54 },
  { head: ['Load case'], width: 40 },
  { head: ['Value / limit'], width: 34 },
  { head: ['Cause'], width: 92 },
  { head: ['What would mend it'], width: 82 },
]

function findingRow(release: SheetRelease, finding: Finding): TableCell[] {
  const colour = SEVERITY_COLOURS[finding.severity]
  return [
    {
      lines: [
        {
          text: SEVERITY_WORDS[finding.severity],
          style: { weight: 'strong', ...(colour ? { colour } : {}) },
        },
      ],
    },
    finding.code,
    partWords(release.document, finding.part),
    loadCaseWords(release.document, finding.loadCase),
    valueWords(finding),
    finding.message,
    finding.remedy,
  ]
}

function valueWords(finding: Finding): string {
  if (finding.value === null) return '–'
  const value = withUnit(significant(finding.value), finding.unit)
  return finding.limit === null ? value : `${value} / ${withUnit(significant(finding.limit), finding.unit)}`
}
