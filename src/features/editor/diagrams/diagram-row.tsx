/** One diagram: its curve over the stations of the section above, its peak, and the value at the pointer. */
import { memo } from 'react'
import { formatResult } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { stationToPx, type ViewTransform } from '@/lib/view-transform'
import {
  areaPath,
  type Curve,
  curvePath,
  type DiagramSeries,
  peakOf,
  valueAt,
  valueRange,
} from './diagram-series'

const TONES: Record<DiagramSeries['tone'], { text: string; stroke: string; fill: string }> = {
  plum: { text: 'text-plum', stroke: 'stroke-plum', fill: 'fill-plum' },
  steel: { text: 'text-steel', stroke: 'stroke-steel', fill: 'fill-steel' },
  straw: { text: 'text-straw-ink', stroke: 'stroke-straw', fill: 'fill-straw' },
  bronze: { text: 'text-bronze-ink', stroke: 'stroke-bronze', fill: 'fill-bronze' },
}

const PADDING_PX = 5
/** Where a peak's words would leave the drawing they stand on its other side. */
const WORDS_PX = 90

interface DiagramRowProps {
  series: DiagramSeries
  stationMm: readonly number[]
  view: ViewTransform
  widthPx: number
  heightPx: number
  hoverStationMm: number | null
  showPlanes: boolean
  units: UnitSystem
  caseName: string
  onOpen: () => void
}

export const DiagramRow = memo(function DiagramRow({
  series,
  stationMm,
  view,
  widthPx,
  heightPx,
  hoverStationMm,
  showPlanes,
  units,
  caseName,
  onOpen,
}: DiagramRowProps) {
  const tone = TONES[series.tone]
  const planes: readonly Curve[] = showPlanes ? series.planes : []
  const { least, most } = valueRange([series.main, ...planes])
  const toX = (station: number) => stationToPx(view, station)
  const toY = (value: number) =>
    heightPx - PADDING_PX - ((value - least) / (most - least)) * (heightPx - 2 * PADDING_PX)
  const text = (value: number | null) => formatResult(value, series.kind, units).text

  const peak = peakOf(stationMm, series.main.values)
  const hovered = hoverStationMm === null ? null : valueAt(stationMm, series.main.values, hoverStationMm)
  const peakX = peak ? toX(peak.stationMm) : 0
  const isPeakInSight = peak !== null && peakX > 0 && peakX < widthPx
  const wordsLeft = peakX > widthPx - WORDS_PX

  return (
    <div className="relative" style={{ height: heightPx }}>
      <svg
        width={widthPx}
        height={heightPx}
        className="absolute inset-0 cursor-help overflow-hidden"
        aria-hidden="true"
        onClick={onOpen}
      >
        <line
          x1={toX(stationMm[0] ?? 0)}
          x2={toX(stationMm.at(-1) ?? 0)}
          y1={toY(0)}
          y2={toY(0)}
          className="stroke-edge"
        />
        <path d={areaPath(stationMm, series.main.values, toX, toY)} className={`${tone.fill} opacity-15`} />
        {planes.map((plane, index) => (
          <path
            key={plane.name}
            d={curvePath(stationMm, plane.values, toX, toY)}
            fill="none"
            strokeWidth={1}
            strokeDasharray={index === 0 ? '5 3' : '1.5 3'}
            className={tone.stroke}
          />
        ))}
        <path
          d={curvePath(stationMm, series.main.values, toX, toY)}
          fill="none"
          strokeWidth={1.6}
          strokeLinejoin="round"
          className={tone.stroke}
        />
        {isPeakInSight && <circle cx={peakX} cy={toY(peak.value)} r={2.8} className={tone.fill} />}
        {isPeakInSight && (
          <text
            x={peakX + (wordsLeft ? -7 : 7)}
            y={peak.value >= 0 ? toY(peak.value) + 14 : toY(peak.value) - 6}
            textAnchor={wordsLeft ? 'end' : 'start'}
            className="fill-ink stroke-paper text-[11px] font-bold [paint-order:stroke]"
            strokeWidth={3}
          >
            {text(peak.value)}
          </text>
        )}
        {hovered !== null && hoverStationMm !== null && (
          <>
            <line
              x1={toX(hoverStationMm)}
              x2={toX(hoverStationMm)}
              y1={0}
              y2={heightPx}
              className="stroke-steel opacity-45"
            />
            <circle
              cx={toX(hoverStationMm)}
              cy={toY(hovered)}
              r={3.2}
              strokeWidth={1.6}
              className={`fill-card ${tone.stroke}`}
            />
          </>
        )}
      </svg>
      <button
        type="button"
        className="absolute top-0 left-0 cursor-help rounded bg-paper/85 py-0.5 pr-2 pl-3 text-left leading-tight"
        aria-label={`${series.title}, ${peak ? `largest ${text(peak.value)} at ${formatResult(peak.stationMm, 'length', units).text}` : 'zero'}, ${caseName}: show formula`}
        onClick={onOpen}
      >
        <span className={`block text-xs font-bold ${tone.text}`}>{series.title}</span>
        <span className="block text-[11px] text-quiet tabular-nums">
          {hovered === null ? `max ${text(peak?.value ?? 0)}` : text(hovered)}
        </span>
      </button>
    </div>
  )
})
