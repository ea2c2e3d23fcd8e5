/** The interference window in a row of the schedule, in the same geometry as on screen. */
import {
  type Span,
  windowGeometry,
  windowStateWords,
  type WindowScale,
  type WindowValues,
} from '@shared/drawing/interference-window-geometry'
import { spreadLabels } from '@shared/drawing/spread-labels'
import { whole } from './sheet-format'
import { BAD, GOOD, INK, QUIET, type TextStyle, THIN_MM } from './sheet-style'
import type { SheetWriter } from './sheet-writer'

const NUMBER: TextStyle = { sizePt: 6.5 }
const TRACK_MM = 4.2
const BAR_MM = 2
const NUMBERS_MM = 2.9
const ZONE_FILL = '#F3DCD6'
const WINDOW_FILL = '#DCEBE1'

export const WINDOW_DRAWING_HEIGHT_MM = 2 * NUMBERS_MM + TRACK_MM + 1.4

export function drawWindow(
  writer: SheetWriter,
  values: WindowValues,
  scale: WindowScale,
  x: number,
  y: number,
  widthMm: number,
): void {
  const geometry = windowGeometry(values, scale, widthMm)
  const top = y + NUMBERS_MM
  const band = (span: Span | null, fill: string) => {
    if (span) writer.rect(x + span.from, top, span.to - span.from, TRACK_MM, { fill })
  }
  const hatched = (span: Span | null) => {
    if (!span || span.to - span.from < 0.2) return
    writer.hatch(corners(x + span.from, top, span.to - span.from, TRACK_MM), 1.1, 'rising', {
      colour: '#C99A90',
    })
  }
  writer.rect(x, top, widthMm, TRACK_MM, { fill: '#F5F2EA' })
  band(geometry.window, WINDOW_FILL)
  band(geometry.slipZone, ZONE_FILL)
  band(geometry.yieldZone, ZONE_FILL)
  hatched(geometry.slipZone)
  hatched(geometry.yieldZone)

  if (geometry.bar) {
    const barTop = top + (TRACK_MM - BAR_MM) / 2
    const width = Math.max(0.6, geometry.bar.to - geometry.bar.from)
    writer.rect(x + geometry.bar.from, barTop, width, BAR_MM, {
      fill: geometry.state === 'inside' ? GOOD : INK,
    })
    for (const outside of [geometry.barBelow, geometry.barAbove]) {
      if (!outside) continue
      const part = corners(x + outside.from, barTop, Math.max(0.6, outside.to - outside.from), BAR_MM)
      writer.polygon(part, { fill: '#FFFFFF' })
      writer.hatch(part, 0.7, 'falling', { colour: BAD, widthMm: 0.22 })
      writer.polygon(part, { stroke: { widthMm: THIN_MM, colour: BAD } })
    }
  }
  for (const mark of [geometry.requiredMark, geometry.permissibleMark]) {
    if (mark === null) continue
    writer.line({ x: x + mark, y: top - 0.5 }, { x: x + mark, y: top + TRACK_MM + 0.9 }, { widthMm: 0.3 })
  }
  numbersAt(
    writer,
    x,
    widthMm,
    y + 2.1,
    [
      { at: geometry.bar?.from ?? null, value: values.minUm },
      { at: geometry.bar?.to ?? null, value: values.maxUm },
    ],
    { ...NUMBER, weight: 'strong' },
  )
  numbersAt(
    writer,
    x,
    widthMm,
    top + TRACK_MM + 3,
    [
      { at: geometry.requiredMark, value: values.requiredUm },
      { at: geometry.permissibleMark, value: values.permissibleUm },
    ],
    NUMBER,
  )
  if (!geometry.bar)
    writer.text(windowStateWords(values), x + widthMm / 2, top + TRACK_MM / 2 + 0.8, {
      ...NUMBER,
      colour: QUIET,
      align: 'centre',
    })
}

function numbersAt(
  writer: SheetWriter,
  x: number,
  widthMm: number,
  baseline: number,
  marks: { at: number | null; value: number | null }[],
  style: TextStyle,
): void {
  const shown = marks.flatMap(({ at, value }) =>
    at === null || value === null ? [] : [{ at, text: whole(value) }],
  )
  const centres = spreadLabels(
    shown.map(({ at, text }) => ({ centre: at, size: writer.measure(text, style) })),
    { from: 0, to: widthMm },
    1.2,
  )
  shown.forEach(({ text }, index) =>
    writer.text(text, x + (centres?.[index] ?? 0), baseline, { ...style, align: 'centre' }),
  )
}

const corners = (x: number, y: number, width: number, height: number) => [
  { x, y },
  { x: x + width, y },
  { x: x + width, y: y + height },
  { x, y: y + height },
]
