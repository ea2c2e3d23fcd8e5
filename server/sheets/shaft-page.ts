/** The shaft: its sections, what it carries and how it bends in every load case. */
import { sectionSpans } from '@shared/layout/shaft-geometry'
import type { ShaftLoadCaseResult, StationValue } from '@shared/recalculation/layout-results'
import { drawDiagrams, DIAGRAMS_HEIGHT_MM } from './shaft-diagrams'
import { millimetres, plain, safety, significant } from './sheet-format'
import type { SheetPages } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { type TableCell, type TableColumn, writeTable } from './sheet-table'
import { loadCaseWords, materialWords, partWords } from './sheet-words'

export function writeShaftPages(pages: SheetPages, release: SheetRelease): void {
  const { document, results } = release
  pages.startPage('Shaft')
  pages.paragraph(`Material ${materialWords(document.shaft.material)}. ${criticalSpeedWords(release)}`)
  pages.y += 1
  if (results.shaft.loadCases.length === 0) {
    pages.paragraph('There are no results of the shaft: no load case, or a shaft that is not supported.')
  } else {
    writeTable(
      pages,
      CASE_COLUMNS,
      results.shaft.loadCases.map((result) => caseRow(release, result)),
    )
    pages.subheading('Bearing reactions', 14)
    writeTable(
      pages,
      REACTION_COLUMNS,
      results.shaft.loadCases.flatMap((result) => reactionRows(release, result)),
    )
    pages.subheading('Diagrams', DIAGRAMS_HEIGHT_MM)
    pages.need(DIAGRAMS_HEIGHT_MM)
    drawDiagrams(pages, release)
  }
  writeSections(pages, release)
}

function criticalSpeedWords(release: SheetRelease): string {
  const [first, second] = release.results.shaft.lateralCriticalRpm
  if (first === undefined) return 'Lateral critical speeds are not computed.'
  const fastest = Math.max(0, ...release.document.loadCases.map((loadCase) => loadCase.speedRpm))
  const further = second === undefined ? '' : `, second at ${significant(second, 4)} 1/min`
  const [torsional] = release.results.shaft.torsionalHz
  const twist =
    torsional === undefined
      ? ''
      : ` First torsional frequency of the shaft alone ${significant(torsional)} Hz.`
  return `First lateral critical speed at ${significant(first, 4)} 1/min${further}; the shaft runs at up to ${plain(fastest)} 1/min.${twist}`
}

const CASE_COLUMNS: TableColumn[] = [
  { head: ['Load case'], width: 50 },
  { head: ['Most torque', 'N·m'], width: 24, align: 'right' },
  { head: ['Torque residual', 'N·m'], width: 24, align: 'right' },
  { head: ['Most bending moment', 'N·m at mm'], width: 36, align: 'right' },
  { head: ['Most deflection', 'µm at mm'], width: 34, align: 'right' },
  { head: ['Most equivalent stress', 'MPa at mm'], width: 38, align: 'right' },
  { head: ['Yield safety'], width: 22, align: 'right' },
  { head: ['Fatigue safety', 'at mm'], width: 32, align: 'right' },
  { head: ['Largest slope', 'mrad at'], width: 44, align: 'right' },
]

const atStation = (found: StationValue | null, format = (value: number) => significant(value, 3)) =>
  found === null ? '–' : `${format(found.value)} at ${millimetres(found.stationMm)}`

function caseRow(release: SheetRelease, result: ShaftLoadCaseResult): TableCell[] {
  const steepest = [...result.slopes].sort((a, b) => Math.abs(b.mrad) - Math.abs(a.mrad))[0]
  return [
    { lines: [{ text: loadCaseWords(release.document, result.loadCase), style: { weight: 'strong' } }] },
    significant(result.torqueMaxNm, 4),
    significant(result.torqueResidualNm, 3),
    atStation(result.bendingMaxNm, (value) => significant(value, 4)),
    atStation(result.deflectionMaxUm),
    atStation(result.equivalentMaxMPa),
    safety(result.yieldSafety),
    atStation(result.fatigueSafety, safety),
    steepest ? `${significant(steepest.mrad)} at ${partWords(release.document, steepest.part)}` : '–',
  ]
}

const REACTION_COLUMNS: TableColumn[] = [
  { head: ['Load case'], width: 60 },
  { head: ['Bearing'], width: 50 },
  { head: ['y', 'N'], width: 26, align: 'right' },
  { head: ['z', 'N'], width: 26, align: 'right' },
  { head: ['Radial', 'N'], width: 26, align: 'right' },
  { head: ['Axial', 'N'], width: 26, align: 'right' },
  { head: ['Slope', 'mrad'], width: 26, align: 'right' },
]

function reactionRows(release: SheetRelease, result: ShaftLoadCaseResult): TableCell[][] {
  return result.reactions.map((reaction, index) => [
    index === 0 ? loadCaseWords(release.document, result.loadCase) : '',
    partWords(release.document, reaction.bearing),
    significant(reaction.yN, 4),
    significant(reaction.zN, 4),
    significant(Math.hypot(reaction.yN, reaction.zN), 4),
    significant(reaction.axialN, 4),
    significant(result.slopes.find((slope) => slope.part === reaction.bearing)?.mrad),
  ])
}

function writeSections(pages: SheetPages, release: SheetRelease): void {
  const { document } = release
  pages.subheading('Sections', 16)
  const spans = sectionSpans(document)
  if (spans.length === 0) {
    pages.paragraph('The shaft has no sections.')
    return
  }
  const columns: TableColumn[] = [
    { head: ['No.'], width: 12, align: 'right' },
    { head: ['Id'], width: 30 },
    { head: ['From', 'mm'], width: 26, align: 'right' },
    { head: ['To', 'mm'], width: 26, align: 'right' },
    { head: ['Length', 'mm'], width: 26, align: 'right' },
    { head: ['Diameter', 'mm'], width: 28, align: 'right' },
    { head: ['Bore', 'mm'], width: 26, align: 'right' },
    { head: ['Roughness Rz', 'µm'], width: 28, align: 'right' },
    { head: ['Fillet at right end', 'mm'], width: 30, align: 'right' },
  ]
  const rows = spans.map(({ section, startMm, endMm }, index): TableCell[] => [
    String(index + 1),
    section.id,
    millimetres(startMm),
    millimetres(endMm),
    millimetres(section.lengthMm),
    millimetres(section.outerDiameterMm),
    section.boreDiameterMm > 0 ? millimetres(section.boreDiameterMm) : 'solid',
    plain(section.roughnessRzUm),
    millimetres(section.rightFilletMm),
  ])
  writeTable(pages, columns, rows)
}
