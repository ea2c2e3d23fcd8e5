/** The few numbers that decide, above the drawing: do the seats hold, does the shaft, in which case. */
import type { ReactNode } from 'react'
import { ValueButton } from '@/components/value-button'
import { formatGiven, formatResult, formatSafety, NOT_COMPUTED } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { useDerivationStore } from '@/stores/derivation-store'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useResultsStore } from '@/stores/results-store'
import { extreme, isWorst, shownShaftCases, worstBearingSlope } from '@/stores/shown-load-case'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { LayoutResults } from '@shared/recalculation/layout-results'
import { LoadCaseChoice } from './load-case-choice'
import { countHoldingSeats } from './seat-verdict'
import { useLasting } from './use-lasting'

export function VerdictStrip() {
  const results = useResultsStore((state) => state.results)
  const document = useResultsStore((state) => state.document)
  const selected = useResultsStore((state) => state.selectedLoadCaseId)
  const isUpdating = useLasting(
    useResultsStore((state) => state.isStale),
    document,
  )
  const failure = useResultsStore((state) => state.failure)
  const units = usePreferencesStore((state) => state.units)

  return (
    <section
      aria-label="Verdict"
      aria-busy={isUpdating}
      className="flex flex-col gap-x-6 gap-y-2 px-5 py-3 sm:flex-row sm:items-start"
    >
      {results === null || document === null ? (
        <Figure value="–" caption={failure ?? 'calculating'} tone={failure === null ? 'plain' : 'bad'} />
      ) : (
        <Figures
          results={results}
          document={document}
          selected={selected}
          units={units}
          isUpdating={isUpdating}
        />
      )}
      <div className="shrink-0 sm:ml-auto sm:max-w-56 sm:text-right">
        <LoadCaseChoice />
        <p role="status" className="text-xs text-quiet">
          {failure !== null && results !== null ? (
            <span className="text-bad">Not calculated: {failure}</span>
          ) : isUpdating ? (
            'updating…'
          ) : (
            <CaseCaption document={document} selected={selected} units={units} />
          )}
        </p>
      </div>
    </section>
  )
}

interface FiguresProps {
  results: LayoutResults
  document: LayoutDocument
  selected: string | null
  units: UnitSystem
  isUpdating: boolean
}

function Figures({ results, document, selected, units, isUpdating }: FiguresProps) {
  const open = useDerivationStore((state) => state.open)
  const cases = shownShaftCases(results, selected)
  const seats = countHoldingSeats(results, document, selected)
  const fatigue = extreme(cases, (item) => item.fatigueSafety?.value ?? null, 'least')
  const fatigueLimit = (loadCase: string) =>
    document.loadCases.find(({ id }) => id === loadCase)?.criteria?.fatigueSafety ??
    document.criteria.fatigueSafety
  const deflection = extreme(cases, (item) => item.deflectionMaxUm?.value ?? null, 'most')
  const slope = worstBearingSlope(document, cases)
  const critical = results.shaft.lateralCriticalRpm[0] ?? null
  const speedMost = Math.max(0, ...document.loadCases.map(({ speedRpm }) => speedRpm))
  const isNearCritical = results.findings.some(
    ({ code, severity }) => code === 'critical-speed' && severity !== 'notes',
  )
  const inCase = (loadCase: string) => {
    if (!isWorst(selected) || document.loadCases.length < 2) return ''
    const name = document.loadCases.find(({ id }) => id === loadCase)?.name
    return name === undefined ? '' : `in case “${name}”`
  }

  return (
    <div className={`flex flex-wrap gap-x-5 gap-y-2 xl:gap-x-7 ${isUpdating ? 'opacity-60' : ''}`}>
      <Figure
        value={
          seats.total === 0
            ? 'No hubs yet'
            : `${seats.holding} of ${seats.total} ${seats.total === 1 ? 'seat holds' : 'seats hold'}`
        }
        caption={seats.caption}
        isCaptionBad={seats.isOtherwiseFailing}
        tone={seats.total === 0 ? 'plain' : seats.holding === seats.total ? 'good' : 'bad'}
      />
      {fatigue?.fatigueSafety ? (
        <Figure
          value={
            <ValueButton
              label="formula of the fatigue safety"
              onOpen={() =>
                open({ kind: 'shaftCase', loadCase: fatigue.loadCase, quantity: 'fatigueSafety' })
              }
            >
              {formatSafety(fatigue.fatigueSafety.value, fatigueLimit(fatigue.loadCase))}
            </ValueButton>
          }
          caption={`shaft fatigue safety, at z ${formatGiven(Number(fatigue.fatigueSafety.stationMm.toFixed(1)), 'length', units).text}`}
          title={inCase(fatigue.loadCase)}
          tone={fatigue.fatigueSafety.value < fatigueLimit(fatigue.loadCase) ? 'bad' : 'plain'}
        />
      ) : (
        <Figure value={NOT_COMPUTED} caption="shaft fatigue safety" tone="plain" />
      )}
      {deflection?.deflectionMaxUm ? (
        <Figure
          value={
            <ValueButton
              label="formula of the largest deflection"
              onOpen={() =>
                open({ kind: 'shaftCase', loadCase: deflection.loadCase, quantity: 'deflectionMax' })
              }
            >
              {formatResult(deflection.deflectionMaxUm.value, 'interference', units).text}
            </ValueButton>
          }
          caption="largest deflection"
          title={inCase(deflection.loadCase)}
          tone="plain"
        />
      ) : (
        <Figure value={NOT_COMPUTED} caption="largest deflection" tone="plain" />
      )}
      {slope === null ? (
        <Figure value={NOT_COMPUTED} caption="slope at bearings" tone="plain" />
      ) : (
        <Figure
          value={
            <ValueButton
              label={`formula of the slope at bearing ${slope.bearing.name}`}
              onOpen={() =>
                open({
                  kind: 'shaftCase',
                  loadCase: slope.loadCase,
                  quantity: 'slope',
                  part: slope.bearing.id,
                })
              }
            >
              {formatResult(slope.mrad, 'slope', units).text}
            </ValueButton>
          }
          caption={`slope at bearing ${slope.bearing.name}`}
          title={inCase(slope.loadCase)}
          tone={slope.mrad > slope.limitMrad ? 'bad' : 'plain'}
        />
      )}
      <Figure
        value={
          critical === null ? (
            NOT_COMPUTED
          ) : (
            <ValueButton
              label="formula of the first lateral critical speed"
              onOpen={() => open({ kind: 'shaft', quantity: 'lateralCriticalRpm' })}
            >
              {formatResult(critical, 'speed', units).text}
            </ValueButton>
          )
        }
        caption="first lateral critical"
        title={
          critical === null || speedMost === 0
            ? ''
            : `${formatSafety(critical / speedMost)} times the highest speed`
        }
        tone={isNearCritical ? 'bad' : 'plain'}
      />
    </div>
  )
}

type Tone = 'plain' | 'good' | 'bad'
const TONES: Record<Tone, string> = { plain: 'text-ink', good: 'text-good', bad: 'text-bad' }

function Figure({
  value,
  caption,
  title,
  tone,
  isCaptionBad = false,
}: {
  value: ReactNode
  caption: string
  title?: string
  tone: Tone
  isCaptionBad?: boolean
}) {
  return (
    <div title={title === '' ? undefined : title} className="max-w-44 xl:max-w-none">
      <p className={`text-base leading-6 font-bold whitespace-nowrap tabular-nums xl:text-lg ${TONES[tone]}`}>
        {tone === 'bad' && <span aria-hidden="true">✕ </span>}
        {tone === 'bad' && <span className="sr-only">Fails: </span>}
        {value}
      </p>
      <p className={`text-xs text-balance ${isCaptionBad ? 'font-semibold text-bad' : 'text-quiet'}`}>
        {isCaptionBad && <span aria-hidden="true">✕ </span>}
        {caption}
      </p>
    </div>
  )
}

function CaseCaption({
  document,
  selected,
  units,
}: {
  document: LayoutDocument | null
  selected: string | null
  units: UnitSystem
}) {
  if (document === null) return null
  const count = document.loadCases.length
  if (isWorst(selected)) {
    if (count === 0) return 'no load case yet'
    return count === 1 ? '1 case checked' : `worst case governs: ${count} cases checked`
  }
  const loadCase = document.loadCases.find(({ id }) => id === selected)
  if (loadCase === undefined) return null
  return `${formatGiven(loadCase.speedRpm, 'speed', units).text}, application factor ${loadCase.applicationFactor}`
}
