/**
 * The interference window of one hub. `row`: a strip for tables, all rows on a common scale, no text.
 * `full`: with marks, numbers and causes. Inside or outside is told by word, sign and pattern.
 */
import { useId } from 'react'
import { formatNumber, formatResult } from '@/lib/format-quantity'
import { displayUnit, fromStored, type UnitSystem } from '@/lib/quantity-units'
import {
  aboveWord,
  belowWord,
  placeLabels,
  type Span,
  WINDOW_STATE_SIGNS,
  type WindowGeometry,
  windowGeometry,
  type WindowScale,
  windowScale,
  windowSentence,
  type WindowState,
  type WindowValues,
} from '@shared/drawing/interference-window-geometry'

interface InterferenceWindowProps {
  values: WindowValues
  size: 'row' | 'full'
  units: UnitSystem
  /** The common scale of a table; its own when left out. */
  scale?: WindowScale
}

/** Drawn in hundredths of the width, so that the strip stretches with its column and patterns do not. */
const WIDTH = 100
const percent = (value: number) => `${value.toFixed(3)}%`

export function InterferenceWindow({ values, size, units, scale }: InterferenceWindowProps) {
  const usedScale = scale ?? windowScale([values], displayUnit('interference', units).factor)
  const geometry = windowGeometry(values, usedScale, WIDTH)
  const label = windowSentence(values)
  return size === 'row' ? (
    <svg role="img" aria-label={label} className="block h-4 w-full overflow-visible">
      <Strip geometry={geometry} y={2} height={12} barHeight={7} />
    </svg>
  ) : (
    <FullWindow values={values} geometry={geometry} scale={usedScale} label={label} units={units} />
  )
}

interface FullWindowProps {
  values: WindowValues
  geometry: WindowGeometry
  scale: WindowScale
  label: string
  units: UnitSystem
}

/** Width of a letter at 11 px, in hundredths of an inspector of 260 px: enough to keep labels apart. */
const LETTER_WIDTH = 2.25
const ROW_PX = 14

function FullWindow({ values, geometry, scale, label, units }: FullWindowProps) {
  const { minUm, maxUm, requiredUm, permissibleUm } = values
  const number = (um: number) => formatResult(um, 'interference', units).number
  const widthOf = (text: string) => text.length * LETTER_WIDTH + 1

  const barTexts =
    geometry.bar === null || minUm === null || maxUm === null
      ? []
      : [
          {
            text: number(minUm),
            at: geometry.bar.from,
            isOutside: geometry.state === 'empty' || geometry.barBelow !== null,
          },
          {
            text: number(maxUm),
            at: geometry.bar.to,
            isOutside: geometry.state === 'empty' || geometry.barAbove !== null,
          },
        ]
  const markTexts = [
    requiredUm === null || geometry.requiredMark === null
      ? null
      : { text: `${number(requiredUm)} ${belowWord(values)} below`, at: geometry.requiredMark },
    permissibleUm === null || geometry.permissibleMark === null
      ? null
      : { text: `${number(permissibleUm)} ${aboveWord(values)} above`, at: geometry.permissibleMark },
  ]
    .filter((mark) => mark !== null)
    .sort((left, right) => left.at - right.at)
  const place = (texts: readonly { text: string; at: number }[]) =>
    placeLabels(
      texts.map(({ text, at }) => ({ at, width: widthOf(text) })),
      WIDTH,
    ).map((placed, index) => ({ ...placed, text: texts[index]?.text ?? '' }))
  const barLabels = place(barTexts)
  const markLabels = place(markTexts)
  const barRows = Math.max(0, ...barLabels.map(({ row }) => row))
  const markRows = Math.max(0, ...markLabels.map(({ row }) => row))
  const top = 14 + barRows * ROW_PX
  const height = 22
  const unit = displayUnit('interference', units)
  const tickText = (um: number) => {
    const value = Number(fromStored(um, unit).toPrecision(6))
    return formatNumber(value, Math.min(2, (String(value).split('.')[1] ?? '').length))
  }
  const ticksY = top + height + 6

  return (
    <svg
      role="img"
      aria-label={label}
      className="block w-full overflow-visible text-[11px] tabular-nums"
      height={ticksY + 14 + (markRows + 1) * ROW_PX}
    >
      {barLabels.map(({ text, at, row }, index) => (
        <text
          key={index}
          x={percent(at)}
          y={top - 5 - row * ROW_PX}
          textAnchor="middle"
          className={`font-bold ${barTexts[index]?.isOutside === true ? 'fill-bad' : 'fill-good'}`}
        >
          {text}
        </text>
      ))}
      <Strip geometry={geometry} y={top} height={height} barHeight={12} />
      {scale.ticksUm.map((tick) => {
        const at = ((tick - scale.fromUm) / (scale.toUm - scale.fromUm)) * WIDTH
        const isFirst = tick === scale.ticksUm[0]
        const isLast = tick === scale.ticksUm.at(-1)
        return (
          <g key={tick}>
            <line
              x1={percent(at)}
              x2={percent(at)}
              y1={top + height}
              y2={top + height + 3}
              className="stroke-edge"
            />
            <text
              x={percent(at)}
              y={ticksY + 7}
              textAnchor={isFirst ? 'start' : isLast ? 'end' : 'middle'}
              className="fill-quiet text-[10px]"
            >
              {tickText(tick)}
            </text>
          </g>
        )
      })}
      {markLabels.map(({ text, at, row }, index) => (
        <text
          key={index}
          x={percent(at)}
          y={ticksY + 22 + row * ROW_PX}
          textAnchor="middle"
          className="fill-ink font-semibold"
        >
          {text}
        </text>
      ))}
    </svg>
  )
}

const BAR_FILL: Record<WindowState, string> = {
  inside: 'fill-good',
  slips: 'fill-good',
  yields: 'fill-good',
  slipsAndYields: 'fill-good',
  empty: 'fill-bad',
  unknown: 'fill-quiet',
}

/** Zones, marks and bar, without text. */
function Strip({
  geometry,
  y,
  height,
  barHeight,
}: {
  geometry: WindowGeometry
  y: number
  height: number
  barHeight: number
}) {
  const id = useId()
  const barY = y + (height - barHeight) / 2
  const rect = (span: Span | null, className: string, at = y, tall = height) =>
    span === null || span.to <= span.from ? null : (
      <rect
        x={percent(span.from)}
        width={percent(span.to - span.from)}
        y={at}
        height={tall}
        className={className}
      />
    )
  const fill = (span: Span | null, pattern: string, at = y, tall = height) =>
    span === null || span.to <= span.from ? null : (
      <rect
        x={percent(span.from)}
        width={percent(span.to - span.from)}
        y={at}
        height={tall}
        fill={`url(#${id}-${pattern})`}
      />
    )
  return (
    <g>
      <defs>
        <Hatch id={`${id}-below`} direction={-1} className="stroke-bad/45" />
        <Hatch id={`${id}-above`} direction={1} className="stroke-bad/45" />
        <Hatch id={`${id}-outside`} direction={1} className="stroke-card/80" gap={4} />
      </defs>
      {geometry.requiredMark === null && geometry.permissibleMark === null && (
        <rect x="0" width="100%" y={y} height={height} className="fill-hairline/60" />
      )}
      {rect(geometry.slipZone, 'fill-bad-soft')}
      {rect(geometry.yieldZone, 'fill-bad-soft')}
      {fill(geometry.slipZone, 'below')}
      {fill(geometry.yieldZone, 'above')}
      {rect(geometry.window, 'fill-good-soft')}
      {geometry.zeroMark !== null && (
        <Mark at={geometry.zeroMark} y={y} height={height} className="stroke-quiet" dashes="2 2" />
      )}
      {geometry.gap !== null && (
        <>
          {/* Both zones overlap here: hatched from both sides and framed, so that it cannot be taken for a window. */}
          {rect(geometry.gap, 'fill-bad/20')}
          <line
            x1={percent(geometry.gap.from)}
            x2={percent(geometry.gap.to)}
            y1={y}
            y2={y + height}
            className="stroke-bad"
            strokeWidth={1.5}
          />
          <line
            x1={percent(geometry.gap.from)}
            x2={percent(geometry.gap.to)}
            y1={y + height}
            y2={y}
            className="stroke-bad"
            strokeWidth={1.5}
          />
        </>
      )}
      {rect(geometry.bar, BAR_FILL[geometry.state], barY, barHeight)}
      {geometry.state !== 'empty' && (
        <>
          {rect(geometry.barBelow, 'fill-bad', barY, barHeight)}
          {rect(geometry.barAbove, 'fill-bad', barY, barHeight)}
          {fill(geometry.barBelow, 'outside', barY, barHeight)}
          {fill(geometry.barAbove, 'outside', barY, barHeight)}
        </>
      )}
      {geometry.state === 'empty' && fill(geometry.bar, 'outside', barY, barHeight)}
      {geometry.requiredMark !== null && (
        <Mark at={geometry.requiredMark} y={y - 3} height={height + 6} className="stroke-ink" />
      )}
      {geometry.permissibleMark !== null && (
        <Mark at={geometry.permissibleMark} y={y - 3} height={height + 6} className="stroke-ink" />
      )}
    </g>
  )
}

function Mark({
  at,
  y,
  height,
  className,
  dashes,
}: {
  at: number
  y: number
  height: number
  className: string
  dashes?: string
}) {
  return (
    <line
      x1={percent(at)}
      x2={percent(at)}
      y1={y}
      y2={y + height}
      className={className}
      strokeWidth={1.5}
      strokeDasharray={dashes}
    />
  )
}

function Hatch({
  id,
  direction,
  className,
  gap = 6,
}: {
  id: string
  direction: 1 | -1
  className: string
  gap?: number
}) {
  return (
    <pattern
      id={id}
      width={gap}
      height={gap}
      patternUnits="userSpaceOnUse"
      patternTransform={`rotate(${45 * direction})`}
    >
      <line x1={0} y1={0} x2={0} y2={gap} className={className} strokeWidth={1.5} />
    </pattern>
  )
}

/** The sign that goes with the word of a state, for chips and tables. */
export function WindowSign({ state }: { state: WindowState }) {
  return (
    <span
      aria-hidden="true"
      className={state === 'inside' ? 'text-good' : state === 'unknown' ? 'text-quiet' : 'text-bad'}
    >
      {WINDOW_STATE_SIGNS[state]}
    </span>
  )
}
