/** The fit schedule: one row for each hub with its window. */
import { windowScale, windowValuesOf } from '@shared/drawing/interference-window-geometry'
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'
import type { HubLoadCaseResult, HubResult } from '@shared/recalculation/layout-results'
import { writeCasesTable } from './cases-table'
import { fitWords } from './item-list'
import { millimetres, safety, significant, whole, withUnit } from './sheet-format'
import { type SheetPages, SMALL_QUIET } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { type CellLine, type TableCell, type TableColumn, writeTable } from './sheet-table'
import { loadCaseWords, materialWords, METHOD_WORDS } from './sheet-words'
import { BAD, QUIET } from './sheet-style'
import { drawWindow, WINDOW_DRAWING_HEIGHT_MM } from './window-drawing'

const COLUMNS: TableColumn[] = [
  { head: ['Item'], width: 8, align: 'right' },
  { head: ['Hub, material'], width: 46 },
  { head: ['Seat, mm'], width: 27 },
  { head: ['Fit', 'Interference, µm'], width: 29 },
  { head: ['Interference window', 'as made, µm'], width: 66 },
  { head: ['Pressure', 'min / max, MPa'], width: 19, align: 'right' },
  { head: ['Torque held', 'required, N·m'], width: 21, align: 'right' },
  { head: ['Axial held', 'required, kN'], width: 19, align: 'right' },
  { head: ['Slip safety', 'governing case'], width: 27, align: 'right' },
  { head: ['Yield safety', 'hub / shaft'], width: 20, align: 'right' },
  { head: ['Joining'], width: 37 },
  { head: ['Order'], width: 14 },
]

const STRONG = { weight: 'strong' as const }
const quiet = (text: string): CellLine => ({
  text,
  style: { colour: QUIET },
})

export function writeSchedulePages(pages: SheetPages, release: SheetRelease): void {
  const { document, results } = release
  pages.startPage('Fit schedule')
  if (document.hubs.length === 0) {
    pages.paragraph('The layout has no hubs.')
    return
  }
  const byId = new Map(results.hubs.map((hub) => [hub.id, hub]))
  const scale = windowScale(results.hubs.map(windowValuesOf))
  pages.paragraph(
    `All windows share one axis from ${whole(scale.fromUm)} to ${whole(scale.toUm)} µm of diametral interference. ` +
      'Bar: what the tolerances produce. Hatched: outside the window. Holding is at the loosest fit, stress at the tightest.',
    SMALL_QUIET,
  )
  pages.y += 1
  const rows = document.hubs.map((hub, index) => {
    const result = byId.get(hub.id)
    return result ? hubRow(release, hub, result, index + 1, scale) : missingRow(hub, index + 1)
  })
  writeTable(pages, COLUMNS, rows)
  writeCasesTable(pages, release)
}

function missingRow(hub: Hub, item: number): TableCell[] {
  return [String(item), hub.name, ...Array.from({ length: COLUMNS.length - 2 }, () => 'not computed')]
}

function hubRow(
  release: SheetRelease,
  hub: Hub,
  result: HubResult,
  item: number,
  scale: ReturnType<typeof windowScale>,
): TableCell[] {
  const { document } = release
  const governing = result.loadCases.find((loadCase) => loadCase.loadCase === result.governingLoadCase)
  const { requiredUm, requiredCause, permissibleUm, permissibleCause } = result.window
  const values = windowValuesOf(result)
  const causes = [
    requiredUm === null ? '' : `${whole(requiredUm)} µm: ${requiredCause}.`,
    permissibleUm === null ? '' : `${whole(permissibleUm)} µm: ${permissibleCause}.`,
    result.window.isEmpty ? 'The window is empty.' : '',
  ].filter((text) => text !== '')
  const hubSafety = extreme(Math.min, [
    result.atRest.hubYieldSafety,
    ...result.loadCases.map((c) => c.hubYieldSafety),
  ])
  const shaftSafety = extreme(Math.min, [
    result.atRest.shaftYieldSafety,
    ...result.loadCases.map((c) => c.shaftYieldSafety),
  ])
  const mostPressure = extreme(Math.max, [
    result.atRest.pressureMaxMPa,
    ...result.loadCases.map((c) => c.pressureMaxMPa),
  ])
  const leastPressure = extreme(
    Math.min,
    result.loadCases.map((c) => c.pressureMinMPa),
  )
  return [
    { lines: [{ text: String(item), style: STRONG }] },
    {
      lines: [
        { text: hub.name, style: STRONG },
        quiet(`${hub.role}, id ${hub.id}`),
        quiet(materialWords(hub.material)),
        ...(result.verdict === 'passes'
          ? []
          : [
              {
                text: result.verdict === 'fails' ? 'Fails' : 'Not computed',
                style: { ...STRONG, colour: BAD },
              },
            ]),
      ],
    },
    {
      lines: [
        { text: `⌀${millimetres(result.seat.diameterMm)} × ${millimetres(hub.lengthMm)}` },
        quiet(`at ${millimetres(hub.stationMm)} to ${millimetres(hub.stationMm + hub.lengthMm)}`),
        quiet(`hub ⌀${millimetres(hub.outerDiameterMm)}`),
        quiet(`effective ${significant(result.seat.effectiveLengthMm, 4)}`),
      ],
    },
    {
      lines: [
        { text: fitWords(hub.fit), style: STRONG },
        { text: `${whole(result.interference.minUm)} to ${whole(result.interference.maxUm)} as made` },
        quiet(`embedding loss ${significant(result.interference.embeddingLossUm, 2)}`),
      ],
    },
    {
      drawing: {
        heightMm: WINDOW_DRAWING_HEIGHT_MM,
        draw: (writer, x, y, widthMm) => drawWindow(writer, values, scale, x, y, widthMm),
      },
      lines: causes.map(quiet),
    },
    {
      lines: [{ text: significant(leastPressure) }, { text: significant(mostPressure) }],
    },
    {
      lines: [
        { text: significant(governing?.torqueCapacityNm, 4) },
        quiet(significant(governing?.requiredTorqueNm, 4)),
      ],
    },
    {
      lines: [
        { text: significant(thousandth(governing?.axialCapacityN)) },
        quiet(significant(thousandth(governing?.requiredAxialN))),
      ],
    },
    { lines: slipLines(document, governing) },
    { lines: [{ text: safety(hubSafety) }, { text: safety(shaftSafety) }] },
    { lines: joiningLines(hub, result) },
    {
      lines: [
        { text: result.assembly.order === null ? 'none' : `No. ${result.assembly.order}`, style: STRONG },
        quiet(`from ${result.assembly.side}`),
      ],
    },
  ]
}

function slipLines(document: LayoutDocument, loadCase: HubLoadCaseResult | undefined): CellLine[] {
  if (!loadCase) return [{ text: 'no demand' }]
  const isLow = loadCase.slipSafety !== null && loadCase.slipSafety < loadCase.slipSafetyLimit
  return [
    {
      text: `${safety(loadCase.slipSafety)}${isLow ? ' too low' : ''}`,
      style: { ...STRONG, ...(isLow ? { colour: BAD } : {}) },
    },
    quiet(`at least ${safety(loadCase.slipSafetyLimit)}`),
    quiet(loadCaseWords(document, loadCase.loadCase)),
  ]
}

function joiningLines(hub: Hub, result: HubResult): CellLine[] {
  const { joiningC, ovenC, limitC, pressForceMaxN } = result.assembly
  const lines: CellLine[] = [{ text: METHOD_WORDS[hub.joining.method] }]
  if (hub.joining.method === 'press')
    lines.push({ text: `force ${withUnit(significant(thousandth(pressForceMaxN)), 'kN')}`, style: STRONG })
  else {
    lines.push({ text: `joins at ${withUnit(whole(joiningC), '°C')}` })
    lines.push({ text: `oven ${withUnit(whole(ovenC), '°C')}`, style: STRONG })
    if (limitC !== null) lines.push(quiet(`at most ${whole(limitC)} °C`))
  }
  return lines
}

const thousandth = (value: number | null | undefined) =>
  value === null || value === undefined ? null : value / 1000

function extreme(pick: (...values: number[]) => number, values: (number | null)[]): number | null {
  const known = values.filter((value) => value !== null)
  return known.length === 0 ? null : pick(...known)
}
