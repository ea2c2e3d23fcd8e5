import { Chip } from '@/components/chip'
import { InterferenceWindow } from '@/drawings/interference-window'
import { LayoutTextField } from '@/fields/layout-text-field'
import { hubAddress } from '@/fields/part-address'
import { formatGiven } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { useResultsStore } from '@/stores/results-store'
import { shownHubCase } from '@/stores/shown-load-case'
import { windowState, windowStateWords, windowValuesOf } from '@shared/drawing/interference-window-geometry'
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'
import { seatUnder } from '@shared/layout/shaft-geometry'
import type { HubResult } from '@shared/recalculation/layout-results'
import { EditingNow } from './editing-now'
import { FitFields } from './fit-fields'
import { FrictionFields } from './friction-fields'
import { HubDimensionFields, HubOtherFields } from './hub-fields'
import { FitResults, GripResults, JoiningResults } from './hub-results'
import { Group } from './inspector-parts'
import { JoiningFields } from './joining-fields'
import { MaterialFields, Unfolding } from './lazy-fields'
import { materialWords } from './material-words'
import { RestStress, ServiceStress } from './stress-results'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'

interface HubInspectorProps {
  hub: Hub
  layout: LayoutDocument
  units: UnitSystem
}

export function HubInspector({ hub, layout, units }: HubInspectorProps) {
  const result = useResultsStore((state) => state.results?.hubs.find(({ id }) => id === hub.id) ?? null)
  const selected = useResultsStore((state) => state.selectedLoadCaseId)
  const seat = seatUnder(layout, hub)
  const seatDiameterMm = result?.seat.diameterMm ?? seat?.span.section.outerDiameterMm ?? null
  const shown = result === null ? null : shownHubCase(result, selected)
  const loadCase = layout.loadCases.find(({ id }) => id === shown?.loadCase)
  const criteria = { ...layout.criteria, ...loadCase?.criteria }
  const window = result?.window ?? { requiredUm: null, permissibleUm: null }
  const given = (mm: number) => formatGiven(Number(mm.toFixed(3)), 'length', units).number

  return (
    <>
      <header>
        <div className="flex items-start justify-between gap-2">
          <LayoutTextField
            key={hub.id}
            label="Name"
            arrangement="title"
            address={hubAddress([hub], 'name')}
            className="min-w-0 flex-1"
          />
          {result !== null && <StateChip result={result} />}
        </div>
        <p className="text-[13px] text-quiet">
          {seatDiameterMm === null ? 'no seat under it' : `on seat ⌀${given(seatDiameterMm)}`}, z{' '}
          {given(hub.stationMm)} to {given(hub.stationMm + hub.lengthMm)}
          <EditingNow partKey={`hub:${hub.id}:`} />
        </p>
      </header>

      {result === null ? (
        <p className="mt-4 text-sm text-quiet">Calculating…</p>
      ) : (
        <WindowBlock result={result} units={units} />
      )}

      <div className="mt-3">
        <HubDimensionFields hubs={[hub]} />
      </div>

      <Group title="Fit">
        <FitFields
          hub={hub}
          seatDiameterMm={seatDiameterMm}
          band={result?.interference ?? { minUm: null, maxUm: null }}
          window={window}
          units={units}
        />
        {result !== null && <FitResults result={result} shown={shown} units={units} />}
      </Group>

      {result !== null && result.verdict === 'notComputable' && (
        <p className="mt-3 rounded-md bg-straw-soft px-3 py-2 text-sm">
          <strong className="font-semibold">Not computed.</strong> {result.notComputable.join(' ')}
        </p>
      )}
      {result !== null && shown !== null && (
        <Group title="Grip, at the loosest" note={loadCase && `case “${loadCase.name}”`}>
          <GripResults result={result} shown={shown} units={units} />
        </Group>
      )}
      {result !== null && result.verdict !== 'notComputable' && (
        <Group title="Stress, at the tightest" note={loadCase && `case “${loadCase.name}”`}>
          {shown !== null && (
            <ServiceStress result={result} shown={shown} criteria={criteria} units={units} />
          )}
          <RestStress result={result} criteria={layout.criteria} units={units} />
        </Group>
      )}
      <Group title="Assembly">
        {result !== null && <JoiningResults hub={hub} result={result} units={units} />}
        <JoiningFields hubs={[hub]} />
      </Group>
      <Group title="Material and surface">
        <Unfolding summary={materialWords(hub.material, units)}>
          <MaterialFields address={hubAddress([hub], 'material')} material={hub.material} units={units} />
        </Unfolding>
        <div className="mt-1.5">
          <LayoutQuantityField
            label="Bore roughness Rz"
            kind="roughness"
            address={hubAddress([hub], 'roughnessRzUm')}
            min={0}
            max={1000}
          />
        </div>
      </Group>
      <Group title="Friction">
        <FrictionFields hubs={[hub]} />
      </Group>
      <Group title="Other">
        <HubOtherFields hub={hub} layout={layout} seatDiameterMm={seatDiameterMm} units={units} />
      </Group>
    </>
  )
}

function StateChip({ result }: { result: HubResult }) {
  const state = windowState(windowValuesOf(result))
  const tone = state === 'inside' ? 'good' : state === 'unknown' ? 'neutral' : 'bad'
  return (
    <span className="mt-1 shrink-0">
      <Chip tone={tone} icon={tone === 'good' ? 'check' : tone === 'bad' ? 'warning' : 'info'}>
        {windowStateWords(windowValuesOf(result))}
      </Chip>
    </span>
  )
}

/** The window, large, with what sets its marks and, where it is needed, what would open it. */
function WindowBlock({ result, units }: { result: HubResult; units: UnitSystem }) {
  const values = windowValuesOf(result)
  const state = windowState(values)
  const { window } = result
  return (
    <section aria-label="Interference window" className="mt-3">
      <h3 className="mb-1 text-[13px] text-quiet">Interference window, {units === 'inch' ? 'thou' : 'µm'}</h3>
      <InterferenceWindow values={values} size="full" units={units} />
      <dl className="mt-1 grid grid-cols-[auto_1fr] gap-x-2 text-xs leading-5">
        {window.requiredUm !== null && (
          <>
            <dt className="text-quiet">Least</dt>
            <dd>{window.requiredCause}</dd>
          </>
        )}
        {window.permissibleUm !== null && (
          <>
            <dt className="text-quiet">Most</dt>
            <dd>{window.permissibleCause}</dd>
          </>
        )}
      </dl>
      {state !== 'inside' && (state === 'empty' || window.remedies.length > 0) && (
        <div className="mt-2 rounded-md border border-bad/40 bg-bad-soft px-3 py-2 text-[13px]">
          <p className="font-semibold">
            {state === 'empty'
              ? 'The window is empty: it takes more interference to hold than the parts stand.'
              : 'What would bring the band inside:'}
          </p>
          {window.remedies.length > 0 && (
            <ul className="mt-1 list-disc pl-4">
              {window.remedies.map((remedy) => (
                <li key={remedy}>{remedy}</li>
              ))}
            </ul>
          )}
        </div>
      )}
    </section>
  )
}
