/** Shaft, hubs and bearings in half section: cut above the axis, seen from outside below it. */
import type { DrawnBearing, DrawnHub, HalfSection } from '@shared/drawing/half-section-geometry'
import { type DrawingFrame, onPaper, paperX, paperY } from './drawing-frame'
import { type LineStyle, THICK_MM, THIN_MM, type XY } from './sheet-style'
import type { SheetWriter } from './sheet-writer'

const EDGE: LineStyle = { widthMm: THICK_MM }
const THIN: LineStyle = { widthMm: THIN_MM }
const HUB_HATCH_MM = 1.9
/** Closer lines than the hubs', so that tube and hub read as two parts. */
const SHAFT_HATCH_MM = 1.3
const CUT_FILL = '#F1EBDD'
const CENTRE_LINE_DASH_MM = [6, 1.2, 0.6, 1.2]
const CENTRE_LINE_OVERHANG_MM = 6

export function drawParts(writer: SheetWriter, frame: DrawingFrame, section: HalfSection): void {
  drawShaft(writer, frame, section)
  for (const bearing of section.bearings) drawBearing(writer, frame, bearing)
  for (const hub of section.hubs) drawHub(writer, frame, hub)
  writer.line(
    { x: paperX(frame, section.fromMm) - CENTRE_LINE_OVERHANG_MM, y: frame.axisY },
    { x: paperX(frame, section.toMm) + CENTRE_LINE_OVERHANG_MM, y: frame.axisY },
    { ...THIN, dashMm: CENTRE_LINE_DASH_MM },
  )
}

function drawShaft(writer: SheetWriter, frame: DrawingFrame, section: HalfSection): void {
  const upper = section.outline.map(onPaper(frame))
  const lower = section.outline.map(onPaper(frame, -1))
  if (upper.length === 0) return
  if (section.isBored) hatchWall(writer, frame, section)
  writer.polyline(upper, EDGE)
  writer.polyline(lower, EDGE)
  section.sections.forEach((part, index) => {
    const next = section.sections[index + 1]
    if (part.boreRadiusMm > 0) {
      const y = paperY(frame, part.boreRadiusMm)
      writer.line({ x: paperX(frame, part.fromMm), y }, { x: paperX(frame, part.toMm), y }, EDGE)
    }
    if (!next) return
    const x = paperX(frame, part.toMm)
    const thinner = Math.min(part.outerRadiusMm, next.outerRadiusMm)
    // The edge of a step runs on to the axis where the shaft is seen from outside.
    const isStep = part.outerRadiusMm !== next.outerRadiusMm
    if (isStep) writer.line({ x, y: paperY(frame, -thinner) }, { x, y: frame.axisY }, EDGE)
    // Above the axis: the shoulder of a bore where both sides are cut, else the whole face.
    const [bore, nextBore] = [part.boreRadiusMm, next.boreRadiusMm]
    const isCutThrough = bore > 0 && nextBore > 0
    if (bore === nextBore && (isCutThrough || !isStep)) return
    const [from, to] = isCutThrough ? [bore, nextBore] : [thinner, 0]
    writer.line({ x, y: paperY(frame, from) }, { x, y: paperY(frame, to) }, EDGE)
  })
}

/** The wall of a bored shaft above the axis; solid stretches of it stay uncut. */
function hatchWall(writer: SheetWriter, frame: DrawingFrame, section: HalfSection): void {
  for (const part of section.sections) {
    if (part.boreRadiusMm <= 0) continue
    const corners: XY[] = [
      { x: paperX(frame, part.fromMm), y: paperY(frame, part.outerRadiusMm) },
      { x: paperX(frame, part.toMm), y: paperY(frame, part.outerRadiusMm) },
      { x: paperX(frame, part.toMm), y: paperY(frame, part.boreRadiusMm) },
      { x: paperX(frame, part.fromMm), y: paperY(frame, part.boreRadiusMm) },
    ]
    writer.hatch(corners, SHAFT_HATCH_MM, 'falling')
  }
}

function drawHub(writer: SheetWriter, frame: DrawingFrame, hub: DrawnHub): void {
  const cut = hub.cut.map(onPaper(frame))
  writer.polygon(cut, { fill: CUT_FILL })
  writer.hatch(cut, HUB_HATCH_MM, hub.hatch)
  writer.polygon(cut, { stroke: EDGE })
  const x = paperX(frame, hub.fromMm)
  const width = paperX(frame, hub.toMm) - x
  const bottom = paperY(frame, -hub.outerRadiusMm)
  // From outside the hub hides its seat, and its faces run on to the axis.
  writer.rect(x, frame.axisY, width, bottom - frame.axisY, { fill: '#FFFFFF' })
  writer.polyline(
    [
      { x, y: frame.axisY },
      { x, y: bottom },
      { x: x + width, y: bottom },
      { x: x + width, y: frame.axisY },
    ],
    EDGE,
  )
}

/** A square with its diagonals on both sides: the simplified picture of a rolling or plain bearing. */
function drawBearing(writer: SheetWriter, frame: DrawingFrame, bearing: DrawnBearing): void {
  const left = paperX(frame, bearing.fromMm)
  const right = paperX(frame, bearing.toMm)
  for (const side of [1, -1] as const) {
    const inner = paperY(frame, side * bearing.boreRadiusMm)
    const outer = paperY(frame, side * bearing.outerRadiusMm)
    const top = Math.min(inner, outer)
    writer.rect(left, top, right - left, Math.abs(outer - inner), { fill: '#FFFFFF', stroke: EDGE })
    writer.line({ x: left, y: inner }, { x: right, y: outer }, THIN)
    if (bearing.kind === 'locating') writer.line({ x: left, y: outer }, { x: right, y: inner }, THIN)
  }
}
