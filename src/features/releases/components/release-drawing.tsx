/** The frozen shaft in half section: the geometry that the sheet prints, in the colours of the screen. */
import { useId } from 'react'
import {
  type DrawnHub,
  type HalfSection,
  halfSection,
  type Point,
} from '@shared/drawing/half-section-geometry'
import { spreadLabels } from '@shared/drawing/spread-labels'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { HubResult } from '@shared/recalculation/layout-results'

/** Drawn in a box of this width, so that letters keep their size whatever the shaft's. */
const WIDTH = 1000
const SIDE = 24
const LABEL_BAND = 46
const BALLOON_RADIUS = 12
const LEAST_HALF_HEIGHT = 40
const MOST_HALF_HEIGHT = 110

export function ReleaseDrawing({
  document,
  results,
}: {
  document: LayoutDocument
  results: readonly HubResult[]
}) {
  const id = useId()
  const section = halfSection(document)
  const lengthMm = Math.max(1, section.toMm - section.fromMm)
  const radiusMm = Math.max(1, section.largestRadiusMm)
  const factor = Math.min((WIDTH - 2 * SIDE) / lengthMm, MOST_HALF_HEIGHT / radiusMm)
  const half = Math.max(LEAST_HALF_HEIGHT, radiusMm * factor)
  const axis = LABEL_BAND + half
  const left = (WIDTH - lengthMm * factor) / 2 - section.fromMm * factor
  const x = (station: number) => left + station * factor
  const path = (points: readonly Point[], side: 1 | -1) =>
    points
      .map((point, index) => `${index === 0 ? 'M' : 'L'}${x(point.x)} ${axis - side * point.y * factor}`)
      .join('')
  const hubs = [...section.hubs].sort((a, b) => a.fromMm + a.toMm - b.fromMm - b.toMm)
  const balloons = spreadLabels(
    hubs.map((hub) => ({ centre: x((hub.fromMm + hub.toMm) / 2), size: 2 * BALLOON_RADIUS })),
    { from: 0, to: WIDTH },
    3,
  )
  return (
    <svg
      role="img"
      aria-label={`Half section of the shaft with ${section.hubs.length} hubs and ${section.bearings.length} bearings`}
      viewBox={`0 0 ${WIDTH} ${axis + half + 8}`}
      className="block w-full min-w-2xl"
    >
      <defs>
        {(['rising', 'falling'] as const).map((direction) => (
          <pattern
            key={direction}
            id={`${id}-${direction}`}
            width="7"
            height="7"
            patternUnits="userSpaceOnUse"
            patternTransform={`rotate(${direction === 'rising' ? 45 : -45})`}
          >
            <line x1="0" y1="0" x2="0" y2="7" className="stroke-quiet" strokeWidth="1.4" />
          </pattern>
        ))}
      </defs>
      <g fill="none" className="stroke-ink" strokeWidth="1.6" strokeLinejoin="round">
        <path d={`${path(section.outline, 1)}`} className="fill-card" />
        <path d={`${path(section.outline, -1)}`} className="fill-card" />
        <ShaftFaces section={section} x={x} y={(radius) => axis - radius * factor} hatch={`${id}-falling`} />
        {section.bearings.map((bearing) =>
          ([1, -1] as const).map((side) => {
            const inner = axis - side * bearing.boreRadiusMm * factor
            const outer = axis - side * bearing.outerRadiusMm * factor
            const from = x(bearing.fromMm)
            const to = x(bearing.toMm)
            return (
              <g key={`${bearing.id} ${side}`}>
                <rect
                  x={from}
                  width={to - from}
                  y={Math.min(inner, outer)}
                  height={Math.abs(outer - inner)}
                  className="fill-card"
                />
                <path d={`M${from} ${inner}L${to} ${outer}`} strokeWidth="0.9" />
                {bearing.kind === 'locating' && (
                  <path d={`M${from} ${outer}L${to} ${inner}`} strokeWidth="0.9" />
                )}
              </g>
            )
          }),
        )}
        {section.hubs.map((hub) => (
          <g key={hub.id}>
            <path d={`${path(hub.cut, 1)}Z`} className="fill-paper" stroke="none" />
            <path d={`${path(hub.cut, 1)}Z`} fill={`url(#${id}-${hub.hatch})`} />
            <rect
              x={x(hub.fromMm)}
              width={(hub.toMm - hub.fromMm) * factor}
              y={axis}
              height={hub.outerRadiusMm * factor}
              className="fill-paper"
            />
          </g>
        ))}
        <line
          x1={x(section.fromMm) - 14}
          x2={x(section.toMm) + 14}
          y1={axis}
          y2={axis}
          strokeWidth="1"
          strokeDasharray="18 4 3 4"
        />
      </g>
      {hubs.map((hub, index) => (
        <Balloon
          key={hub.id}
          hub={hub}
          at={balloons?.[index] ?? x((hub.fromMm + hub.toMm) / 2)}
          target={{
            x: x((hub.fromMm + hub.toMm) / 2),
            y: axis - (hub.boreRadiusMm + (hub.outerRadiusMm - hub.boreRadiusMm) * 0.7) * factor,
          }}
          fails={results.find((result) => result.id === hub.id)?.verdict !== 'passes'}
        />
      ))}
    </svg>
  )
}

/** Edges of the steps, and the cut wall of a bored shaft above the axis. */
function ShaftFaces({
  section,
  x,
  y,
  hatch,
}: {
  section: HalfSection
  x: (station: number) => number
  y: (radius: number) => number
  hatch: string
}) {
  return section.sections.map((part, index) => {
    const next = section.sections[index + 1]
    const thinner = Math.min(part.outerRadiusMm, next?.outerRadiusMm ?? part.outerRadiusMm)
    const isStep = next !== undefined && next.outerRadiusMm !== part.outerRadiusMm
    return (
      <g key={part.id}>
        {part.boreRadiusMm > 0 && (
          <rect
            x={x(part.fromMm)}
            width={x(part.toMm) - x(part.fromMm)}
            y={y(part.outerRadiusMm)}
            height={y(part.boreRadiusMm) - y(part.outerRadiusMm)}
            fill={`url(#${hatch})`}
            stroke="none"
          />
        )}
        {part.boreRadiusMm > 0 && <path d={`M${x(part.fromMm)} ${y(part.boreRadiusMm)}H${x(part.toMm)}`} />}
        {isStep && (
          <path
            d={`M${x(part.toMm)} ${y(-thinner)}V${y(0)}${part.boreRadiusMm === 0 ? `V${y(thinner)}` : ''}`}
            strokeWidth="1.2"
          />
        )}
      </g>
    )
  })
}

function Balloon({ hub, at, target, fails }: { hub: DrawnHub; at: number; target: Point; fails: boolean }) {
  const y = BALLOON_RADIUS + 2
  return (
    <g>
      <title>{hub.name}</title>
      <path
        d={`M${target.x} ${target.y}V${LABEL_BAND}L${at} ${y + BALLOON_RADIUS}`}
        fill="none"
        className="stroke-quiet"
      />
      <circle cx={target.x} cy={target.y} r="2" className="fill-ink" />
      <circle
        cx={at}
        cy={y}
        r={BALLOON_RADIUS}
        className={fails ? 'fill-bad-soft stroke-bad' : 'fill-card stroke-ink'}
        strokeWidth={fails ? 2 : 1.2}
        strokeDasharray={fails ? '4 2' : undefined}
      />
      <text x={at} y={y + 4.5} textAnchor="middle" className="fill-ink text-[13px] font-bold">
        {hub.item}
      </text>
    </g>
  )
}
