/** The circles of the end view, drawn in millimetres and scaled by the SVG's own box. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { useSelectionStore } from '@/stores/selection-store'
import { hubExtent } from '../tools/part'
import {
  direction,
  type ForceMark,
  labelRows,
  lobePath,
  type PhaseMark,
  type ViewedFrom,
} from './end-view-geometry'

interface EndViewDrawingProps {
  document: LayoutDocument
  phases: readonly PhaseMark[]
  forces: readonly ForceMark[]
  from: ViewedFrom
}

/** The drawing is scaled so that the largest part has this radius; words keep their size. */
const RADIUS = 72
const HALF = 112
/** Words nearer than this on the circle would touch. */
const CLEARANCE_DEG = 24

export function EndViewDrawing({ document, phases, forces, from }: EndViewDrawingProps) {
  const selectedIds = useSelectionStore((state) => state.selectedIds)
  const hoveredId = useSelectionStore((state) => state.hoveredId)
  const lobes = phases.filter((mark) => mark.isCam)
  const hubs = document.hubs.map((hub) => ({ hub, radius: hubExtent(document, hub).outerRadiusMm }))
  const sectionRadii = document.shaft.sections.map((section) => section.outerDiameterMm / 2)
  // A collar would cover the lobes; with cams on the shaft, their seats are what matters.
  const shaftRadius = Math.max(
    1,
    ...(lobes.length > 0 ? lobes.map((mark) => mark.boreRadiusMm) : sectionRadii),
  )
  const bore = Math.min(
    ...document.shaft.sections.map((section) => section.boreDiameterMm / 2),
    Number.MAX_VALUE,
  )
  const largest = Math.max(shaftRadius, ...hubs.map(({ radius }) => radius))
  const scale = RADIUS / largest
  const isMarked = (id: string) => selectedIds.includes(id) || hoveredId === id
  // Big ones first, so that small ones are not covered; cams have their lobes instead of a circle.
  const circles = hubs.filter(({ hub }) => hub.role !== 'cam').sort((a, b) => b.radius - a.radius)
  const words = angleWords(phases, forces)

  return (
    <svg
      viewBox={`${-HALF} ${-HALF} ${2 * HALF} ${2 * HALF}`}
      className="mx-auto my-1 max-h-64 w-full shrink-0"
      role="img"
      aria-label={`End view from the ${from}: ${phases.length} phase angles, ${forces.length} forces. The list below has the values.`}
    >
      <Graduation />
      {circles.map(({ hub, radius }) => (
        <circle
          key={hub.id}
          r={radius * scale}
          className={isMarked(hub.id) ? 'fill-steel-soft stroke-steel' : 'fill-hairline/60 stroke-ink'}
          strokeWidth={isMarked(hub.id) ? 1.8 : 1}
        />
      ))}
      {lobes.map((mark) => (
        <path
          key={mark.hubId}
          d={lobePath(mark.boreRadiusMm * scale, mark.outerRadiusMm * scale, mark.phaseDeg, from)}
          className={
            mark.isOff
              ? 'fill-bad/10 stroke-bad'
              : isMarked(mark.hubId)
                ? 'fill-steel-soft stroke-steel'
                : 'fill-bronze/10 stroke-bronze'
          }
          strokeWidth={isMarked(mark.hubId) ? 2 : 1.2}
          strokeDasharray={mark.isOff ? '4 2.5' : undefined}
        />
      ))}
      {document.shaft.sections.length > 0 && (
        <circle r={shaftRadius * scale} className="fill-card stroke-ink" strokeWidth={1.2} />
      )}
      {bore > 0 && bore < shaftRadius && (
        <circle r={bore * scale} className="fill-paper stroke-ink" strokeWidth={1} />
      )}
      <path
        d={`M-${RADIUS + 8} 0H${RADIUS + 8}M0 -${RADIUS + 8}V${RADIUS + 8}`}
        className="stroke-quiet"
        strokeWidth={0.7}
        strokeDasharray="9 2 1 2"
      />
      {phases.map((mark, index) => (
        <PhaseLine
          key={mark.hubId}
          mark={mark}
          from={from}
          row={words[index] ?? null}
          isMarked={isMarked(mark.hubId)}
        />
      ))}
      {forces.map((mark, index) => (
        <ForceArrow
          key={`${mark.hubId}-${index}`}
          mark={mark}
          from={from}
          startRadius={mark.outerRadiusMm * scale}
          row={words[phases.length + index] ?? null}
          isMarked={isMarked(mark.hubId)}
        />
      ))}
    </svg>
  )
}

/**
 * Which angles are written, and how far out: equal angles once, neighbours in rows.
 * @returns for each phase and then each force its row, or null when it is not written
 */
function angleWords(phases: readonly PhaseMark[], forces: readonly ForceMark[]): (number | null)[] {
  const angles = [
    ...phases.map((mark) => round(mark.phaseDeg)),
    ...forces.map((mark) => Math.round(mark.angleDeg)),
  ]
  const isFirst = (index: number) => angles.indexOf(angles[index] ?? 0) === index
  const rows = labelRows(
    angles.filter((_, index) => isFirst(index)),
    CLEARANCE_DEG,
  )
  let next = 0
  return angles.map((_, index) => (isFirst(index) ? (rows[next++] ?? 0) : null))
}

/** A mark every ten degrees, longer every ninety. */
function Graduation() {
  return (
    <g className="stroke-edge" strokeWidth={0.8}>
      <circle r={RADIUS + 8} fill="none" className="stroke-hairline" />
      {Array.from({ length: 36 }, (_, index) => {
        const { x, y } = direction(index * 10, 'left')
        const inner = RADIUS + (index % 9 === 0 ? 3 : 5.5)
        return <line key={index} x1={x * inner} y1={y * inner} x2={x * (RADIUS + 8)} y2={y * (RADIUS + 8)} />
      })}
    </g>
  )
}

function PhaseLine({
  mark,
  from,
  row,
  isMarked,
}: {
  mark: PhaseMark
  from: ViewedFrom
  /** Row of the words, outward; null when the same angle is written already. */
  row: number | null
  isMarked: boolean
}) {
  const at = direction(mark.phaseDeg, from)
  const words = RADIUS + 18 + (row ?? 0) * 11
  const tone = mark.isOff ? 'stroke-bad' : isMarked ? 'stroke-steel' : 'stroke-bronze'
  const ink = mark.isOff ? 'fill-bad' : isMarked ? 'fill-steel' : 'fill-bronze'
  const required = mark.isOff && mark.requiredDeg !== null ? direction(mark.requiredDeg, from) : null
  return (
    <g>
      <line x1={0} y1={0} x2={at.x * (words - 7)} y2={at.y * (words - 7)} className={tone} strokeWidth={1} />
      {required && (
        <line
          x1={0}
          y1={0}
          x2={required.x * (RADIUS + 8)}
          y2={required.y * (RADIUS + 8)}
          className="stroke-good"
          strokeWidth={1.2}
          strokeDasharray="3 2"
        />
      )}
      {row !== null && (
        <Words x={at.x * words} y={at.y * words} className={ink}>{`${round(mark.phaseDeg)}°`}</Words>
      )}
    </g>
  )
}

const round = (value: number) => Math.round(value * 10) / 10

function ForceArrow({
  mark,
  from,
  startRadius,
  row,
  isMarked,
}: {
  mark: ForceMark
  from: ViewedFrom
  startRadius: number
  /** Row of the words, outward; null when the same angle is written already. */
  row: number | null
  isMarked: boolean
}) {
  const at = direction(mark.angleDeg, from)
  const tip = RADIUS + 10
  const side = { x: -at.y, y: at.x }
  const back = tip - 7
  const words = RADIUS + 19 + (row ?? 0) * 11
  const tone = isMarked ? 'stroke-steel' : 'stroke-plum'
  const fill = isMarked ? 'fill-steel' : 'fill-plum'
  return (
    <g>
      <line
        x1={at.x * startRadius}
        y1={at.y * startRadius}
        x2={at.x * back}
        y2={at.y * back}
        className={tone}
        strokeWidth={1.8}
      />
      <path
        d={`M${at.x * tip} ${at.y * tip}L${at.x * back + side.x * 3.4} ${at.y * back + side.y * 3.4}L${at.x * back - side.x * 3.4} ${at.y * back - side.y * 3.4}Z`}
        className={fill}
      />
      {row !== null && (
        <Words x={at.x * words} y={at.y * words} className={fill}>{`${Math.round(mark.angleDeg)}°`}</Words>
      )}
    </g>
  )
}

function Words({ x, y, className, children }: { x: number; y: number; className: string; children: string }) {
  return (
    <text
      x={x}
      y={y}
      textAnchor="middle"
      dominantBaseline="central"
      className={`stroke-paper text-[9.5px] font-bold [paint-order:stroke] ${className}`}
      strokeWidth={2.5}
    >
      {children}
    </text>
  )
}
