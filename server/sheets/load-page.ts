/** Load cases as entered: what acts, and the criteria each is judged by. */
import type { Criteria } from '@shared/layout/layout-document'
import { millimetres, plain } from './sheet-format'
import type { SheetPages } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { type TableCell, type TableColumn, writeTable } from './sheet-table'
import { partWords } from './sheet-words'

const CRITERIA_WORDS: { key: keyof Criteria; label: string; unit: string }[] = [
  { key: 'slipSafety', label: 'slip safety', unit: '' },
  { key: 'hubYieldSafety', label: 'hub yield safety', unit: '' },
  { key: 'brittleSafety', label: 'safety of brittle hubs', unit: '' },
  { key: 'shaftYieldSafety', label: 'shaft yield safety', unit: '' },
  { key: 'fatigueSafety', label: 'fatigue safety', unit: '' },
  { key: 'meshSlopeMrad', label: 'slope at a gear at most', unit: ' mrad' },
  { key: 'meshDeflectionUm', label: 'deflection at a gear at most', unit: ' µm' },
  { key: 'bearingSlopeMrad', label: 'slope at a bearing at most', unit: ' mrad' },
  { key: 'minGapMm', label: 'gap at least', unit: ' mm' },
  { key: 'minLengthToDiameter', label: 'length to diameter at least', unit: '' },
]

export function criteriaWords(criteria: Partial<Criteria>): string {
  return CRITERIA_WORDS.flatMap(({ key, label, unit }) => {
    const value = criteria[key]
    return value === null || value === undefined ? [] : [`${label} ${plain(value)}${unit}`]
  }).join(', ')
}

export function writeLoadPages(pages: SheetPages, release: SheetRelease): void {
  const { document } = release
  pages.startPage('Load cases')
  pages.paragraph(
    'Torque is positive when the part drives the shaft in its sense of rotation. Axial force is positive to the right, ' +
      'y up, z completes a right-handed system. Forces are those that act on the shaft.',
  )
  pages.y += 1
  if (document.loadCases.length === 0) {
    pages.paragraph('There are no load cases: nothing was checked against a demand.')
    return
  }
  const columns: TableColumn[] = [
    { head: ['Load case'], width: 52 },
    { head: ['Speed', '1/min'], width: 20, align: 'right' },
    { head: ['Application factor'], width: 20, align: 'right' },
    { head: ['Shaft', '°C'], width: 16, align: 'right' },
    { head: ['Hubs', '°C'], width: 16, align: 'right' },
    { head: ['Hubs at their own temperature'], width: 70 },
    { head: ['Own criteria'], width: 80 },
  ]
  const rows = document.loadCases.map((loadCase): TableCell[] => [
    { lines: [{ text: loadCase.name, style: { weight: 'strong' } }] },
    plain(loadCase.speedRpm),
    plain(loadCase.applicationFactor),
    plain(loadCase.shaftC),
    plain(loadCase.hubC),
    Object.entries(loadCase.hubTemperaturesC ?? {})
      .map(([hub, temperature]) => `${partWords(document, hub)} ${plain(temperature)}`)
      .join(', ') || 'none',
    criteriaWords(loadCase.criteria ?? {}) || 'those of the layout',
  ])
  writeTable(pages, columns, rows)
  for (const loadCase of document.loadCases) {
    pages.subheading(`Loads of ${loadCase.name}`, 16)
    if (loadCase.loads.length === 0) pages.paragraph('None.')
    else
      writeTable(
        pages,
        LOAD_COLUMNS,
        loadCase.loads.map((load): TableCell[] => [
          partWords(document, load.hub),
          millimetres(load.stationMm),
          plain(load.torqueNm),
          plain(load.forceYN),
          plain(load.forceZN),
          plain(load.axialN),
          plain(load.momentYNm),
          plain(load.momentZNm),
        ]),
      )
  }
}

const LOAD_COLUMNS: TableColumn[] = [
  { head: ['Acts on'], width: 70 },
  { head: ['Station', 'mm'], width: 22, align: 'right' },
  { head: ['Torque', 'N·m'], width: 24, align: 'right' },
  { head: ['Force y', 'N'], width: 24, align: 'right' },
  { head: ['Force z', 'N'], width: 24, align: 'right' },
  { head: ['Axial force', 'N'], width: 24, align: 'right' },
  { head: ['Moment y', 'N·m'], width: 24, align: 'right' },
  { head: ['Moment z', 'N·m'], width: 24, align: 'right' },
]
