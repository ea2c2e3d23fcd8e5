/** Torque, bending, deflection and equivalent stress along the shaft, all load cases on one axis. */
import type { ShaftDiagrams, ShaftLoadCaseResult } from '@shared/recalculation/layout-results'
import { totalLengthMm } from '@shared/layout/shaft-geometry'
import { millimetres, significant } from './sheet-format'
import type { SheetPages } from './sheet-pages'
import type { SheetRelease } from './sheet-release'
import { loadCaseWords } from './sheet-words'
import { INK, QUIET, STEEL, STRAW, type TextStyle, type XY } from './sheet-style'
import type { SheetWriter } from './sheet-writer'

const PLOTS: { title: string; unit: string; values: (diagrams: ShaftDiagrams) => number[] }[] = [
  { title: 'Torque', unit: 'N·m', values: (diagrams) => diagrams.torqueNm },
  { title: 'Bending moment', unit: 'N·m', values: (diagrams) => diagrams.bendingNm },
  { title: 'Deflection', unit: 'µm', values: (diagrams) => diagrams.deflectionUm },
  { title: 'Equivalent stress', unit: 'MPa', values: (diagrams) => diagrams.equivalentMPa },
]
const PLOT_MM = 17
const GAP_MM = 3
const LEGEND_MM = 6
const AXIS_MM = 6
const LABEL_MM = 34
export const DIAGRAMS_HEIGHT_MM = LEGEND_MM + PLOTS.length * (PLOT_MM + GAP_MM) + AXIS_MM

/** Told apart by dash as well as by colour: the sheet is read in black and white too. */
const CASE_LINES = [
  { colour: STEEL },
  { colour: STRAW, dashMm: [2.4, 1] },
  { colour: '#6B3A5B', dashMm: [0.7, 0.7] },
  { colour: '#2E7A5A', dashMm: [3, 0.8, 0.7, 0.8] },
  { colour: INK, dashMm: [1.4, 0.6] },
]
const MAX_CASES = CASE_LINES.length

const SMALL: TextStyle = { sizePt: 7 }
const QUIET_SMALL: TextStyle = { sizePt: 6.5, colour: QUIET }

export function drawDiagrams(pages: SheetPages, release: SheetRelease): void {
  const { writer } = pages
  const cases = release.results.shaft.loadCases.slice(0, MAX_CASES)
  const lengthMm = totalLengthMm(release.document)
  const left = pages.left + LABEL_MM
  const right = pages.left + pages.width - 4
  if (lengthMm <= 0) return
  writeLegend(pages, release, cases)
  const xAt = (station: number) => left + (station / lengthMm) * (right - left)
  for (const plot of PLOTS) {
    drawPlot(writer, pages, cases, plot, xAt, left, right)
    pages.y += PLOT_MM + GAP_MM
  }
  const step = axisStep(lengthMm)
  for (let station = 0; station <= lengthMm + 1e-6; station += step) {
    const x = xAt(station)
    writer.line({ x, y: pages.y - GAP_MM }, { x, y: pages.y - GAP_MM + 1 }, { widthMm: 0.15 })
    writer.text(millimetres(station), x, pages.y + 1, { ...QUIET_SMALL, align: 'centre' })
  }
  writer.text('Station, mm', pages.left, pages.y + 1, QUIET_SMALL)
  pages.y += AXIS_MM
}

function writeLegend(pages: SheetPages, release: SheetRelease, cases: ShaftLoadCaseResult[]): void {
  const { writer } = pages
  let x = pages.left + LABEL_MM
  cases.forEach((loadCase, index) => {
    const name = writer.fit(loadCaseWords(release.document, loadCase.loadCase), 50, SMALL)
    writer.line(
      { x, y: pages.y + 1.6 },
      { x: x + 9, y: pages.y + 1.6 },
      { ...CASE_LINES[index], widthMm: 0.4 },
    )
    writer.text(name, x + 10.5, pages.y + 2.5, SMALL)
    x += 16 + writer.measure(name, SMALL)
  })
  const hidden = release.results.shaft.loadCases.length - cases.length
  if (hidden > 0) writer.text(`and ${hidden} more, see the table`, x, pages.y + 2.5, QUIET_SMALL)
  pages.y += LEGEND_MM
}

function drawPlot(
  writer: SheetWriter,
  pages: SheetPages,
  cases: ShaftLoadCaseResult[],
  plot: (typeof PLOTS)[number],
  xAt: (station: number) => number,
  left: number,
  right: number,
): void {
  const all = cases.flatMap((loadCase) => plot.values(loadCase.diagrams))
  const high = all.reduce((most, value) => Math.max(most, value), 0)
  const low = all.reduce((least, value) => Math.min(least, value), 0)
  const span = high - low || 1
  const top = pages.y
  const yAt = (value: number) => top + ((high - value) / span) * PLOT_MM
  writer.text(plot.title, pages.left, top + 3, { ...SMALL, weight: 'strong' })
  writer.text(`${significant(low)} to ${significant(high)} ${plot.unit}`, pages.left, top + 6.4, QUIET_SMALL)
  writer.line({ x: left, y: yAt(0) }, { x: right, y: yAt(0) }, { widthMm: 0.18, colour: QUIET })
  cases.forEach((loadCase, index) => {
    const values = plot.values(loadCase.diagrams)
    const points = loadCase.diagrams.stationMm.flatMap((station, place): XY[] => {
      const value = values[place]
      return value === undefined ? [] : [{ x: xAt(station), y: yAt(value) }]
    })
    if (points.length > 1) writer.polyline(points, { ...CASE_LINES[index], widthMm: 0.35 })
  })
}

function axisStep(lengthMm: number): number {
  const rough = lengthMm / 8
  const power = 10 ** Math.floor(Math.log10(rough))
  return ([1, 2, 5, 10].find((factor) => factor * power >= rough) ?? 10) * power
}
