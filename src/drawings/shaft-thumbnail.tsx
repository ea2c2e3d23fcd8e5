import { useId } from 'react'
import type { Thumbnail } from '@shared/protocol/layouts'

const WIDTH = 400
const HEIGHT = 190
const MARGIN_X = 20
const MARGIN_Y = 22
/** A short thick shaft would otherwise fill the picture like a wall. */
const MAX_PX_PER_MM = 2.2

/**
 * The shaft in half section, to one scale: hatched hubs above the centre line, outlines below. A seat that
 * fails is drawn thick, broken and crossed, so that it shows without colour too.
 */
export function ShaftThumbnail({ thumbnail, label }: { thumbnail: Thumbnail; label: string }) {
  const hatchId = useId()
  const { sections, hubs, bearings } = thumbnail
  const totalMm = sections.reduce((sum, section) => sum + section.lengthMm, 0)
  const leftMm = Math.min(0, ...hubs.map((hub) => hub.stationMm))
  const rightMm = Math.max(totalMm, ...hubs.map((hub) => hub.stationMm + hub.lengthMm))
  const bearingOuterMm = (diameterMm: number) => diameterMm * 1.75
  const widestMm = Math.max(
    1,
    ...sections.map((section) => section.outerDiameterMm),
    ...hubs.map((hub) => hub.outerDiameterMm),
    ...bearings.map((bearing) => bearingOuterMm(bearing.diameterMm)),
  )
  const scale = Math.min(
    (WIDTH - 2 * MARGIN_X) / Math.max(1, rightMm - leftMm),
    (HEIGHT - 2 * MARGIN_Y) / widestMm,
    MAX_PX_PER_MM,
  )
  const axis = HEIGHT / 2
  const start = (WIDTH - (rightMm - leftMm) * scale) / 2
  const x = (stationMm: number) => start + (stationMm - leftMm) * scale
  const half = (diameterMm: number) => (diameterMm / 2) * scale
  const startsMm = sections.map((_, index) =>
    sections.slice(0, index).reduce((sum, section) => sum + section.lengthMm, 0),
  )

  return (
    <svg viewBox={`0 0 ${WIDTH} ${HEIGHT}`} role="img" aria-label={label} className="block w-full">
      <defs>
        <pattern
          id={hatchId}
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0v6" className="stroke-quiet" strokeWidth="1.1" />
        </pattern>
      </defs>
      <g className="fill-card stroke-ink" strokeWidth="1.2">
        {sections.map((section, index) => (
          <rect
            key={index}
            x={x(startsMm[index] ?? 0)}
            y={axis - half(section.outerDiameterMm)}
            width={section.lengthMm * scale}
            height={2 * half(section.outerDiameterMm)}
          />
        ))}
      </g>
      <g className="fill-none stroke-quiet" strokeWidth="0.8" strokeDasharray="4 3">
        {sections.map(
          (section, index) =>
            section.boreDiameterMm > 0 && (
              <path
                key={index}
                d={[-1, 1]
                  .map(
                    (side) =>
                      `M${x(startsMm[index] ?? 0)} ${axis + side * half(section.boreDiameterMm)}h${section.lengthMm * scale}`,
                  )
                  .join('')}
              />
            ),
        )}
      </g>
      {bearings.map((bearing, index) => {
        const inner = half(bearing.diameterMm)
        const height = half(bearingOuterMm(bearing.diameterMm)) - inner
        const width = bearing.widthMm * scale
        const left = x(bearing.stationMm) - width / 2
        return (
          <g key={index} className="fill-steel-soft stroke-steel" strokeWidth="1">
            {[axis - inner - height, axis + inner].map((top) => (
              <g key={top}>
                <rect x={left} y={top} width={width} height={height} rx="1" />
                <circle
                  cx={left + width / 2}
                  cy={top + height / 2}
                  r={Math.min(width, height) * 0.28}
                  className="fill-card"
                />
              </g>
            ))}
          </g>
        )
      })}
      {hubs.map((hub, index) => {
        const left = x(hub.stationMm)
        const width = hub.lengthMm * scale
        const inner = half(hub.boreDiameterMm)
        const outer = half(hub.outerDiameterMm)
        const isFailing = hub.verdict === 'fails'
        const seat = `M${left} ${axis - inner}h${width}M${left} ${axis + inner}h${width}`
        const seatClass = isFailing ? 'stroke-bad' : hub.verdict === 'passes' ? 'stroke-good' : 'stroke-quiet'
        return (
          <g key={index}>
            <rect x={left} y={axis - outer} width={width} height={outer - inner} className="fill-paper" />
            <rect x={left} y={axis - outer} width={width} height={outer - inner} fill={`url(#${hatchId})`} />
            <rect x={left} y={axis + inner} width={width} height={outer - inner} className="fill-paper" />
            <g className="fill-none stroke-ink" strokeWidth="1.2">
              <rect x={left} y={axis - outer} width={width} height={outer - inner} />
              <rect x={left} y={axis + inner} width={width} height={outer - inner} />
            </g>
            <path
              d={seat}
              className={seatClass}
              strokeWidth="3.5"
              strokeDasharray={isFailing ? '5 2.5' : undefined}
            />
            {isFailing && (
              <path
                d={`M${left + width / 2 - 4} ${axis - outer - 12}l8 8m0 -8l-8 8`}
                className="stroke-bad"
                strokeWidth="2"
                strokeLinecap="round"
              />
            )}
          </g>
        )
      })}
      <path
        d={`M${x(leftMm) - 14} ${axis}H${x(rightMm) + 14}`}
        className="stroke-quiet"
        strokeWidth="0.9"
        strokeDasharray="12 3 2 3"
      />
    </svg>
  )
}
