/** Under the half section: bearings by name, diameters of the sections, stations of their faces. */
import type { HalfSection } from '@shared/drawing/half-section-geometry'
import { spreadLabels } from '@shared/drawing/spread-labels'
import { type DrawingFrame, paperX, paperY } from './drawing-frame'
import {
  type DimensionNote,
  JOG_MM,
  LEADER,
  NUMBER,
  NUMBER_GAP_MM,
  NUMBER_PITCH_MM,
  numberZone,
  THIN,
  uprightNumber,
} from './drawing-marks'
import { millimetres } from './sheet-format'
import { QUIET } from './sheet-style'
import type { SheetWriter } from './sheet-writer'

const ARROW_MM = 1.8

interface Cell {
  centre: number
  width: number
  text: string
}

const CELL_PADDING_MM = 0.8
const BEARING_ROW_MM = 6.5
const LEAST_CELL_MM = 2.5

function diameterRows(frame: DrawingFrame, section: HalfSection): { label: string; cells: Cell[] }[] {
  const row = (radius: (part: HalfSection['sections'][number]) => number) =>
    section.sections.map((part) => ({
      centre: paperX(frame, (part.fromMm + part.toMm) / 2),
      width: (part.toMm - part.fromMm) * frame.factor,
      text: radius(part) > 0 ? `⌀${millimetres(2 * radius(part))}` : '–',
    }))
  const rows = [{ label: 'Outer', cells: row((part) => part.outerRadiusMm) }]
  if (section.isBored) rows.push({ label: 'Bore', cells: row((part) => part.boreRadiusMm) })
  return rows
}

const isUpright = (writer: SheetWriter, cells: readonly Cell[]) =>
  cells.some((cell) => writer.measure(cell.text, NUMBER) + 2 * CELL_PADDING_MM > cell.width)

const rowHeight = (writer: SheetWriter, cells: readonly Cell[]) =>
  isUpright(writer, cells)
    ? Math.max(...cells.map((cell) => writer.measure(cell.text, NUMBER))) + 2 * CELL_PADDING_MM + 0.6
    : 4.4

/** The scale decides whether diameters stand upright, so the height is asked for a trial frame. */
export function bottomBandHeight(writer: SheetWriter, frame: DrawingFrame, section: HalfSection): number {
  if (section.sections.length === 0) return 4
  const rows = diameterRows(frame, section).reduce((sum, row) => sum + rowHeight(writer, row.cells), 0)
  const bearings = section.bearings.length > 0 ? BEARING_ROW_MM : 2
  return bearings + rows + 3 + JOG_MM + numberZone(writer, [section.lengthMm, 99.99])
}

/** Bearings by name, diameters in cells between the section faces, and the faces as running dimensions. */
export function drawBottomBand(
  writer: SheetWriter,
  frame: DrawingFrame,
  section: HalfSection,
): DimensionNote {
  if (section.sections.length === 0) return { omitted: [] }
  const omitted: string[] = []
  const stations = [0, ...section.sections.map((part) => part.toMm)]
  const edgeY = paperY(frame, -section.largestRadiusMm)
  const cellsTop = edgeY + (section.bearings.length > 0 ? BEARING_ROW_MM : 2)
  const rows = diameterRows(frame, section)
  const cellsBottom = cellsTop + rows.reduce((sum, row) => sum + rowHeight(writer, row.cells), 0)
  const dimensionY = cellsBottom + 3

  stations.forEach((station, index) => {
    const left = section.sections[index - 1]
    const right = section.sections[index]
    const radius = Math.max(left?.outerRadiusMm ?? 0, right?.outerRadiusMm ?? 0)
    const hidden = section.hubs.filter((hub) => hub.fromMm <= station && hub.toMm >= station)
    const from = Math.max(radius, ...hidden.map((hub) => hub.outerRadiusMm))
    const x = paperX(frame, station)
    writer.line({ x, y: paperY(frame, -from) + 0.8 }, { x, y: dimensionY }, THIN)
  })
  drawBearingNames(writer, frame, section, edgeY)

  let top = cellsTop
  for (const row of rows) {
    const height = rowHeight(writer, row.cells)
    const upright = isUpright(writer, row.cells)
    writer.line({ x: paperX(frame, 0), y: top }, { x: paperX(frame, section.lengthMm), y: top }, THIN)
    writer.text(row.label, paperX(frame, 0) - 1.5, top + height / 2 + writer.capHeight(NUMBER) / 2, {
      ...NUMBER,
      colour: QUIET,
      align: 'right',
    })
    let isShort = false
    for (const cell of row.cells) {
      if (cell.width < (upright ? LEAST_CELL_MM : 0)) isShort = true
      else if (upright)
        writer.verticalText(cell.text, cell.centre, top + height / 2, { ...NUMBER, align: 'centre' })
      else
        writer.text(cell.text, cell.centre, top + height / 2 + writer.capHeight(NUMBER) / 2, {
          ...NUMBER,
          align: 'centre',
        })
    }
    if (isShort) omitted.push('diameters of the shortest sections')
    top += height
  }
  writer.line({ x: paperX(frame, 0), y: top }, { x: paperX(frame, section.lengthMm), y: top }, THIN)
  if (!drawRunningDimensions(writer, frame, stations, dimensionY)) omitted.push('faces of the sections')
  return { omitted }
}

function drawBearingNames(
  writer: SheetWriter,
  frame: DrawingFrame,
  section: HalfSection,
  edgeY: number,
): void {
  const labels = section.bearings.map((bearing) => ({
    bearing,
    text: `${bearing.name}, ${bearing.kind}`,
    short: bearing.name,
  }))
  const wishes = (pick: (label: (typeof labels)[number]) => string) =>
    labels.map((label) => ({
      centre: paperX(frame, (label.bearing.fromMm + label.bearing.toMm) / 2),
      size: writer.measure(pick(label), NUMBER),
    }))
  const line = { from: frame.left, to: frame.right }
  const long = spreadLabels(
    wishes((label) => label.text),
    line,
    2,
  )
  const centres =
    long ??
    spreadLabels(
      wishes((label) => label.short),
      line,
      2,
    )
  if (!centres) return
  const baseline = edgeY + BEARING_ROW_MM - 1.9
  labels.forEach((label, index) => {
    const text = long ? label.text : label.short
    const centre = centres[index] ?? 0
    const width = writer.measure(text, NUMBER)
    const x = paperX(frame, (label.bearing.fromMm + label.bearing.toMm) / 2)
    const from = paperY(frame, -label.bearing.outerRadiusMm) + 0.5
    if (baseline - 3.2 > from) writer.line({ x, y: from }, { x, y: baseline - 2.8 }, THIN)
    // An extension line makes room for the name it would cross.
    writer.rect(centre - width / 2 - 0.6, baseline - 2.4, width + 1.2, 3.2, { fill: '#FFFFFF' })
    writer.text(text, centre, baseline, { ...NUMBER, align: 'centre' })
  })
}

/** Superimposed running dimensions from the datum face, the origin marked by a circle. */
function drawRunningDimensions(
  writer: SheetWriter,
  frame: DrawingFrame,
  stations: readonly number[],
  y: number,
): boolean {
  const last = stations.at(-1) ?? 0
  writer.line({ x: paperX(frame, 0), y }, { x: paperX(frame, last), y }, LEADER)
  const places = spreadLabels(
    stations.map((station) => ({ centre: paperX(frame, station), size: NUMBER_PITCH_MM })),
    { from: frame.left, to: frame.right },
    0.2,
  )
  stations.forEach((station, index) => {
    const x = paperX(frame, station)
    if (index === 0) writer.circle({ x, y }, 0.9, { fill: '#FFFFFF', stroke: LEADER })
    else arrowHead(writer, x, y)
    const at = places?.[index]
    if (at === undefined) return
    const jogBottom = y + JOG_MM
    writer.polyline(
      [
        { x, y: y + (index === 0 ? 0.9 : 0) },
        { x, y: y + 1 },
        { x: at, y: jogBottom },
        { x: at, y: jogBottom + NUMBER_GAP_MM / 2 },
      ],
      THIN,
    )
    uprightNumber(writer, millimetres(station), at, jogBottom + NUMBER_GAP_MM, 'down')
  })
  return places !== null
}

function arrowHead(writer: SheetWriter, x: number, y: number): void {
  writer.polygon(
    [
      { x, y },
      { x: x - ARROW_MM, y: y - ARROW_MM / 6 },
      { x: x - ARROW_MM, y: y + ARROW_MM / 6 },
    ],
    { fill: '#1F242C' },
  )
}
