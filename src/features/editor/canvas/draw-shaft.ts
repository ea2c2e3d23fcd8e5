/** The shaft in half section: contour with fillets, edges at the steps, the bore cut open above the centre line. */
import type { SectionSpan } from '@shared/layout/shaft-geometry'
import type { ThemeColours } from '@/lib/theme-colours'
import { hatchPath } from './draw-hatching'
import type { Pen } from './drawn'

const HATCH_PX = 7

interface ContourPoint {
  x: number
  radius: number
  /** Control corner of a fillet that ends in this point. */
  corner?: { x: number; radius: number }
}

/** The upper contour from left to right, fillets in the inner corners. Radii in mm, up positive. */
export function shaftContour(spans: readonly SectionSpan[]): ContourPoint[] {
  const points: ContourPoint[] = []
  spans.forEach((span, index) => {
    const radius = span.section.outerDiameterMm / 2
    if (index === 0) points.push({ x: span.startMm, radius })
    const next = spans[index + 1]
    if (!next) {
      points.push({ x: span.endMm, radius })
      return
    }
    const nextRadius = next.section.outerDiameterMm / 2
    const step = Math.abs(nextRadius - radius)
    const low = nextRadius > radius ? span : next
    const fillet = Math.min(span.section.rightFilletMm ?? 0, step, low.section.lengthMm / 2)
    const x = span.endMm
    if (fillet === 0) {
      points.push({ x, radius }, { x, radius: nextRadius })
    } else if (nextRadius > radius) {
      points.push(
        { x: x - fillet, radius },
        { x, radius: radius + fillet, corner: { x, radius } },
        { x, radius: nextRadius },
      )
    } else {
      points.push(
        { x, radius },
        { x, radius: nextRadius + fillet },
        { x: x + fillet, radius: nextRadius, corner: { x, radius: nextRadius } },
      )
    }
  })
  return points
}

/** Closed path of the whole shaft, both sides of the centre line. */
function contourPath(pen: Pen, points: readonly ContourPoint[]): void {
  const side = (sign: 1 | -1) => {
    const ordered = sign === -1 ? points : [...points].reverse()
    ordered.forEach((point, index) => {
      const y = sign * point.radius
      const previous = ordered[index - 1]
      // Going back, a fillet begins in the point that carries its corner.
      const corner = sign === -1 ? point.corner : previous?.corner
      if (index === 0 && sign === -1) pen.moveTo(point.x, y)
      else if (corner) pen.quadraticCurveTo(corner.x, sign * corner.radius, point.x, y)
      else pen.lineTo(point.x, y)
    })
  }
  pen.beginPath()
  side(-1)
  side(1)
  pen.closePath()
}

export interface ShaftStyle {
  colours: ThemeColours
  selectedIds: ReadonlySet<string>
  hoveredId: string | null
}

export function drawShaft(pen: Pen, px: number, spans: readonly SectionSpan[], style: ShaftStyle): void {
  if (spans.length === 0) return
  const { colours } = style
  const contour = shaftContour(spans)
  contourPath(pen, contour)
  pen.fillStyle = colours.card
  pen.fill()
  pen.save()
  pen.clip()
  for (const span of spans) drawInside(pen, px, span, style)
  drawSteps(pen, px, spans, colours)
  pen.restore()
  contourPath(pen, contour)
  pen.strokeStyle = colours.ink
  pen.lineWidth = 1.5 * px
  pen.stroke()
}

/** Colour of a chosen section, the cut wall and the hidden edges of a bore. */
function drawInside(pen: Pen, px: number, { section, startMm, endMm }: SectionSpan, style: ShaftStyle): void {
  const { colours } = style
  const width = endMm - startMm
  const radius = section.outerDiameterMm / 2
  const bore = Math.min(section.boreDiameterMm / 2, radius)
  const isSelected = style.selectedIds.has(section.id)
  if (isSelected || style.hoveredId === section.id) {
    pen.globalAlpha = isSelected ? 1 : 0.5
    pen.fillStyle = colours.steelSoft
    pen.fillRect(startMm, -radius, width, 2 * radius)
    pen.globalAlpha = 1
  }
  if (bore <= 0) return
  pen.fillStyle = colours.paper
  pen.fillRect(startMm, -bore, width, bore)
  pen.beginPath()
  hatchPath(pen, { left: startMm, right: endMm, top: -radius, bottom: -bore }, HATCH_PX * px, false)
  pen.strokeStyle = colours.quiet
  pen.lineWidth = 0.8 * px
  pen.globalAlpha = 0.7
  pen.stroke()
  pen.globalAlpha = 1
  pen.beginPath()
  pen.moveTo(startMm, -bore)
  pen.lineTo(endMm, -bore)
  pen.strokeStyle = colours.ink
  pen.lineWidth = 1.2 * px
  pen.stroke()
  pen.beginPath()
  pen.setLineDash([5 * px, 3 * px])
  pen.moveTo(startMm, bore)
  pen.lineTo(endMm, bore)
  pen.lineWidth = 0.9 * px
  pen.stroke()
  pen.setLineDash([])
}

/** A step is an edge all round; two sections of one diameter are told apart by a thin dashed line. */
function drawSteps(pen: Pen, px: number, spans: readonly SectionSpan[], colours: ThemeColours): void {
  for (const [index, span] of spans.entries()) {
    const next = spans[index + 1]
    if (!next) continue
    const isStep =
      span.section.outerDiameterMm !== next.section.outerDiameterMm ||
      span.section.boreDiameterMm !== next.section.boreDiameterMm
    const radius = Math.max(span.section.outerDiameterMm, next.section.outerDiameterMm) / 2
    const bore = Math.max(span.section.boreDiameterMm, next.section.boreDiameterMm) / 2
    pen.beginPath()
    pen.moveTo(span.endMm, -radius)
    pen.lineTo(span.endMm, -bore)
    pen.moveTo(span.endMm, 0)
    pen.lineTo(span.endMm, radius)
    if (bore === 0) {
      pen.moveTo(span.endMm, 0)
      pen.lineTo(span.endMm, -radius)
    }
    pen.strokeStyle = isStep ? colours.ink : colours.edge
    pen.setLineDash(isStep ? [] : [2 * px, 4 * px])
    pen.lineWidth = (isStep ? 1.2 : 0.8) * px
    pen.stroke()
  }
  pen.setLineDash([])
}
