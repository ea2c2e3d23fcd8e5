import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { sectionAddress } from '@/fields/part-address'
import { formatGiven, formatResult } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { useResultsStore } from '@/stores/results-store'
import { shownShaftCases } from '@/stores/shown-load-case'
import type { LayoutDocument, ShaftSection } from '@shared/layout/layout-document'
import { sectionSpans } from '@shared/layout/shaft-geometry'
import { EditingNow } from './editing-now'
import { FieldGrid, Group, ResultRow } from './inspector-parts'

export function SectionFields({
  sections,
  layout,
}: {
  sections: readonly ShaftSection[]
  layout: LayoutDocument
}) {
  const numberOf = (section: ShaftSection) =>
    layout.shaft.sections.findIndex(({ id }) => id === section.id) + 1
  const address = (field: keyof ShaftSection) => sectionAddress(sections, field, numberOf)
  return (
    <FieldGrid>
      <LayoutQuantityField
        label="Length"
        kind="length"
        address={address('lengthMm')}
        min={0}
        isMinExclusive
        max={20_000}
      />
      <LayoutQuantityField
        label="Outer ⌀"
        kind="length"
        address={address('outerDiameterMm')}
        min={Math.max(0, ...sections.map(({ boreDiameterMm }) => boreDiameterMm))}
        isMinExclusive
        max={5_000}
      />
      <LayoutQuantityField
        label="Bore ⌀, 0 is solid"
        kind="length"
        address={address('boreDiameterMm')}
        min={0}
        max={Math.min(...sections.map(({ outerDiameterMm }) => outerDiameterMm))}
      />
      <LayoutQuantityField
        label="Roughness Rz"
        kind="roughness"
        address={address('roughnessRzUm')}
        min={0}
        max={1_000}
      />
      <LayoutQuantityField
        label="Fillet at right end"
        kind="length"
        step={0.1}
        address={address('rightFilletMm')}
        isOptional
        placeholder="sharp"
        min={0}
        max={500}
      />
    </FieldGrid>
  )
}

export function SectionInspector({
  section,
  layout,
  units,
}: {
  section: ShaftSection
  layout: LayoutDocument
  units: UnitSystem
}) {
  const results = useResultsStore((state) => state.results)
  const selected = useResultsStore((state) => state.selectedLoadCaseId)
  const span = sectionSpans(layout).find((item) => item.section.id === section.id)
  if (span === undefined) return null
  const number = layout.shaft.sections.indexOf(span.section) + 1
  const given = (mm: number) => formatGiven(Number(mm.toFixed(3)), 'length', units).text
  const notches = (results === null ? [] : shownShaftCases(results, selected)).flatMap(
    ({ loadCase, notches: list }) =>
      list
        .filter(({ stationMm }) => stationMm >= span.startMm - 1e-6 && stationMm <= span.endMm + 1e-6)
        .map((notch) => ({ ...notch, loadCase })),
  )
  const places = [...new Set(notches.map(({ stationMm, kind }) => `${stationMm} ${kind}`))].flatMap(
    (place) => {
      const [worst] = notches
        .filter(({ stationMm, kind }) => `${stationMm} ${kind}` === place)
        .sort((one, other) => (one.fatigueSafety ?? Infinity) - (other.fatigueSafety ?? Infinity))
      return worst === undefined ? [] : [worst]
    },
  )
  return (
    <>
      <header>
        <h2 className="text-lg leading-6 font-bold">Shaft section {number}</h2>
        <p className="text-[13px] text-quiet">
          z {given(span.startMm)} to {given(span.endMm)}, ⌀{given(section.outerDiameterMm)}
          <EditingNow partKey={`section:${section.id}:`} />
        </p>
      </header>
      <div className="mt-3">
        <SectionFields sections={[section]} layout={layout} />
      </div>
      {places.length > 0 && (
        <Group title="Notches on it" note="fatigue safety">
          {places.map((notch) => (
            <ResultRow
              key={`${notch.stationMm} ${notch.kind} ${notch.part}`}
              label={
                <>
                  {notch.kind === 'shoulder' ? 'Shoulder' : 'Seat edge'} at z {given(notch.stationMm)}, K
                  <sub>f</sub> {notch.fatigueNotchFactor.toFixed(1)}
                </>
              }
              name={`fatigue at z ${given(notch.stationMm)}`}
              value={formatResult(notch.equivalentMPa, 'stress', units).text}
              safety={{
                value: notch.fatigueSafety,
                limit:
                  layout.loadCases.find(({ id }) => id === notch.loadCase)?.criteria?.fatigueSafety ??
                  layout.criteria.fatigueSafety,
                reference: {
                  kind: 'shaftCase',
                  loadCase: notch.loadCase,
                  quantity: 'fatigueSafety',
                  stationMm: notch.stationMm,
                },
              }}
            />
          ))}
        </Group>
      )}
    </>
  )
}
