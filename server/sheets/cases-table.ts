/** Every hub in every load case: the full record behind the schedule. */
import { safety, significant } from './sheet-format'
import type { SheetPages } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { type TableCell, type TableColumn, writeTable } from './sheet-table'
import { loadCaseWords } from './sheet-words'
import { QUIET } from './sheet-style'

export function writeCasesTable(pages: SheetPages, release: SheetRelease): void {
  const { document, results } = release
  pages.subheading('Every hub in every load case', 20)
  const columns: TableColumn[] = [
    { head: ['Item'], width: 8, align: 'right' },
    { head: ['Hub'], width: 44 },
    { head: ['Load case'], width: 34 },
    { head: ['Effective interference', 'min / max, µm'], width: 28, align: 'right' },
    { head: ['Temperature', 'µm'], width: 20, align: 'right' },
    { head: ['Speed', 'µm'], width: 14, align: 'right' },
    { head: ['Pressure', 'min / max, MPa'], width: 26, align: 'right' },
    { head: ['Torque held / required', 'N·m'], width: 30, align: 'right' },
    { head: ['Axial held / required', 'kN'], width: 28, align: 'right' },
    { head: ['Safety: torque / axial / slip'], width: 36, align: 'right' },
    { head: ['Hub hoop / equivalent', 'MPa'], width: 28, align: 'right' },
    { head: ['Yield safety', 'hub / shaft'], width: 24, align: 'right' },
  ]
  const rows = document.hubs.flatMap((hub, index) =>
    (results.hubs.find((result) => result.id === hub.id)?.loadCases ?? []).map(
      (loadCase, position): TableCell[] => [
        String(index + 1),
        { lines: [{ text: hub.name, ...(position > 0 ? { style: { colour: QUIET } } : {}) }] },
        loadCaseWords(document, loadCase.loadCase),
        `${significant(loadCase.effectiveMinUm)} / ${significant(loadCase.effectiveMaxUm)}`,
        significant(loadCase.thermalChangeUm),
        significant(loadCase.speedLossUm),
        `${significant(loadCase.pressureMinMPa)} / ${significant(loadCase.pressureMaxMPa)}`,
        `${significant(loadCase.torqueCapacityNm, 4)} / ${significant(loadCase.requiredTorqueNm, 4)}`,
        `${significant(thousandth(loadCase.axialCapacityN))} / ${significant(thousandth(loadCase.requiredAxialN))}`,
        `${safety(loadCase.torqueSafety)} / ${safety(loadCase.axialSafety)} / ${safety(loadCase.slipSafety)}`,
        `${significant(loadCase.hubHoopMaxMPa)} / ${significant(loadCase.hubEquivalentMaxMPa)}`,
        `${safety(loadCase.hubYieldSafety)} / ${safety(loadCase.shaftYieldSafety)}`,
      ],
    ),
  )
  if (rows.length === 0) pages.paragraph('There are no load cases.')
  else writeTable(pages, columns, rows)
}

const thousandth = (value: number | null) => (value === null ? null : value / 1000)
