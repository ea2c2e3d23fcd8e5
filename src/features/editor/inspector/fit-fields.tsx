import { Button } from '@/components/button'
import { LayoutChoiceField } from '@/fields/layout-choice-field'
import { useLayoutField } from '@/fields/layout-field'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { hubAddress } from '@/fields/part-address'
import { formatResultPair } from '@/lib/format-quantity'
import { displayUnit, fromStored, type UnitSystem } from '@/lib/quantity-units'
import type { Hub, InterferenceFit } from '@shared/layout/layout-document'
import {
  classLimits,
  type FitOfClass,
  fitsInsideWindow,
  holeClasses,
  interferenceFits,
  windowMargin,
} from '@shared/recalculation/fit-suggestions'
import { FieldGrid } from './inspector-parts'

interface FitFieldsProps {
  hub: Hub
  seatDiameterMm: number | null
  /** Band as made, from the results: what a switch to limits starts from. */
  band: { minUm: number | null; maxUm: number | null }
  window: { requiredUm: number | null; permissibleUm: number | null }
  units: UnitSystem
}

const USUAL_HOLES = ['H6', 'H7', 'H8']
const MOST_SUGGESTIONS = 6

/** The fit by ISO 286 classes, with what each class would give, or by its limits. */
export function FitFields({ hub, seatDiameterMm, band, window, units }: FitFieldsProps) {
  const sizeMm = hub.boreDiameterMm ?? seatDiameterMm ?? 0
  return (
    <>
      <FieldGrid columns={hub.fit.kind === 'iso286' ? 3 : 2}>
        <LayoutChoiceField
          label="Fit given by"
          address={hubAddress([hub], 'fit')}
          options={[
            { value: 'iso286', label: 'ISO 286' },
            { value: 'limits', label: 'limits' },
          ]}
          className={hub.fit.kind === 'limits' ? 'col-span-2' : undefined}
          fromStored={(value) => (value as InterferenceFit).kind}
          toStored={(kind): InterferenceFit =>
            kind === 'limits'
              ? { kind, minInterferenceUm: band.minUm ?? 0, maxInterferenceUm: band.maxUm ?? 50 }
              : (bestFit(sizeMm, window) ?? { kind: 'iso286', hole: 'H7', shaft: 'u6' })
          }
        />
        {hub.fit.kind === 'iso286' ? (
          <IsoClasses
            hub={hub}
            hole={hub.fit.hole}
            shaft={hub.fit.shaft}
            sizeMm={sizeMm}
            window={window}
            units={units}
          />
        ) : (
          <>
            <LayoutQuantityField
              label="Least, diametral"
              kind="interference"
              allowsRadial
              address={hubAddress([hub], 'fit', 'minInterferenceUm')}
              min={-5000}
              max={hub.fit.maxInterferenceUm}
            />
            <LayoutQuantityField
              label="Most, diametral"
              kind="interference"
              allowsRadial
              address={hubAddress([hub], 'fit', 'maxInterferenceUm')}
              min={hub.fit.minInterferenceUm}
              max={5000}
            />
          </>
        )}
      </FieldGrid>
      {hub.fit.kind === 'iso286' && (
        <>
          <LimitsLine sizeMm={sizeMm} hole={hub.fit.hole} shaft={hub.fit.shaft} units={units} />
          <TakeFit hub={hub} fit={hub.fit} sizeMm={sizeMm} window={window} units={units} />
        </>
      )}
      {hub.fit.kind === 'limits' && (
        <p className="mt-1 text-xs text-quiet">Diametral; type r before a radial value, such as r 20 µm.</p>
      )}
    </>
  )
}

function IsoClasses({
  hub,
  hole,
  shaft,
  sizeMm,
  window,
  units,
}: {
  hub: Hub
  hole: string
  shaft: string
  sizeMm: number
  window: FitFieldsProps['window']
  units: UnitSystem
}) {
  const holes = holeClasses(sizeMm)
  const fits = interferenceFits(sizeMm, hole)
  const hasWindow = window.requiredUm !== null || window.permissibleUm !== null
  const inside = hasWindow ? fitsInsideWindow(fits, window).slice(0, MOST_SUGGESTIONS) : []
  const text = (fit: FitOfClass) => {
    const sign = !hasWindow ? '' : windowMargin(fit, window) >= 0 ? ' ✓' : ' ✕'
    return `${fit.shaft}  ${formatResultPair(fit.minUm, fit.maxUm, 'interference', units, ' … ').text}${sign}`
  }
  return (
    <>
      <LayoutChoiceField
        label="Bore class"
        address={hubAddress([hub], 'fit', 'hole')}
        options={[
          ...USUAL_HOLES.filter((name) => holes.includes(name)).map((value) => ({
            value,
            label: value,
            group: 'Hole basis',
          })),
          ...holes
            .filter((name) => !USUAL_HOLES.includes(name))
            .map((value) => ({ value, label: value, group: 'Other' })),
        ]}
      />
      <LayoutChoiceField
        label="Seat class"
        address={hubAddress([hub], 'fit', 'shaft')}
        shown={shaft}
        options={[
          ...inside.map((fit) => ({
            value: fit.shaft,
            label: text(fit),
            group: 'Inside the window, widest tolerance first',
          })),
          ...fits
            .filter((fit) => !inside.includes(fit))
            .map((fit) => ({ value: fit.shaft, label: text(fit), group: 'All with interference' })),
        ]}
      />
    </>
  )
}

/** Where the present fit lies outside the window: one press for the loosest one inside. */
function TakeFit({
  hub,
  fit,
  sizeMm,
  window,
  units,
}: Omit<FitFieldsProps, 'seatDiameterMm' | 'band'> & {
  fit: { hole: string; shaft: string }
  sizeMm: number
}) {
  const field = useLayoutField(hubAddress([hub], 'fit'))
  const fits = interferenceFits(sizeMm, fit.hole)
  const present = fits.find(({ shaft }) => shaft === fit.shaft)
  const hasWindow = window.requiredUm !== null || window.permissibleUm !== null
  if (field.isReadOnly || !hasWindow || (present !== undefined && windowMargin(present, window) >= 0))
    return null
  const better = looserFitInside(fit, sizeMm, window)
  if (better === undefined) return null
  return (
    <Button
      size="sm"
      className="mt-1.5"
      onClick={() => field.commit({ kind: 'iso286', hole: better.hole, shaft: better.shaft })}
    >
      Take {better.hole}/{better.shaft},{' '}
      {formatResultPair(better.minUm, better.maxUm, 'interference', units, ' … ').text}
    </Button>
  )
}

/** The grades chosen first, then one and two grades finer on both sides when the band is too wide. */
function looserFitInside(
  { hole, shaft }: { hole: string; shaft: string },
  sizeMm: number,
  window: FitFieldsProps['window'],
): FitOfClass | undefined {
  const gradeOf = (name: string) => Number(/\d+$/.exec(name)?.[0])
  for (const finer of [0, 1, 2]) {
    const holeClass = hole.replace(/\d+$/, '') + (gradeOf(hole) - finer)
    const grade = String(gradeOf(shaft) - finer)
    const inside = interferenceFits(sizeMm, holeClass).find(
      (other) => other.shaft.replace(/^\D+/, '') === grade && windowMargin(other, window) >= 0,
    )
    if (inside !== undefined) return inside
  }
  return undefined
}

/** Deviations of both classes, the way a drawing gives them. */
function LimitsLine({
  sizeMm,
  hole,
  shaft,
  units,
}: {
  sizeMm: number
  hole: string
  shaft: string
  units: UnitSystem
}) {
  if (sizeMm <= 0) return null
  const unit = displayUnit('interference', units)
  const signed = (um: number) => {
    const value = Number(fromStored(um, unit).toFixed(units === 'inch' ? 2 : 1))
    return value === 0 ? '0' : `${value > 0 ? '+' : '−'}${Math.abs(value)}`
  }
  const words = (name: string) => {
    const limits = classLimits(sizeMm, name)
    return limits.isKnown
      ? `${name} ${signed(limits.upperUm)}/${signed(limits.lowerUm)} ${unit.symbol}`
      : null
  }
  const problems = [hole, shaft].flatMap((name) => {
    const limits = classLimits(sizeMm, name)
    return limits.isKnown ? [] : [limits.message]
  })
  return problems.length > 0 ? (
    <p className="mt-1 text-xs font-medium text-bad">{problems.join('. ')}</p>
  ) : (
    <p className="mt-1 text-xs text-quiet tabular-nums">
      Bore {words(hole)}, seat {words(shaft)}
    </p>
  )
}

function bestFit(sizeMm: number, window: FitFieldsProps['window']): InterferenceFit | null {
  const [best] = fitsInsideWindow(interferenceFits(sizeMm, 'H7'), window)
  return best === undefined ? null : { kind: 'iso286', hole: best.hole, shaft: best.shaft }
}
