import { JOINING_SIDES } from '@/fields/joining-options'
import { LayoutChoiceField } from '@/fields/layout-choice-field'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { LayoutTextField } from '@/fields/layout-text-field'
import { bearingAddress } from '@/fields/part-address'
import { formatResult } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { useResultsStore } from '@/stores/results-store'
import { extreme, shownShaftCases } from '@/stores/shown-load-case'
import type { Bearing, LayoutDocument } from '@shared/layout/layout-document'
import { sectionAt } from '@shared/layout/shaft-geometry'
import { EditingNow } from './editing-now'
import { FieldGrid, Group, ResultRow } from './inspector-parts'

const KINDS = [
  { value: 'locating', label: 'locating' },
  { value: 'floating', label: 'floating' },
]
const HOUSINGS = [
  { value: 'ring', label: 'ring, slides on' },
  { value: 'split', label: 'split, closed on' },
]
const SIDES = [{ value: 'none', label: 'not said' }, ...JOINING_SIDES]

export function BearingFields({
  bearings,
  placeholderBore,
}: {
  bearings: readonly Bearing[]
  placeholderBore?: string
}) {
  const [only] = bearings
  return (
    <FieldGrid>
      <LayoutChoiceField label="Kind" address={bearingAddress(bearings, 'kind')} options={KINDS} />
      <LayoutChoiceField label="Housing" address={bearingAddress(bearings, 'housing')} options={HOUSINGS} />
      {bearings.length === 1 && only !== undefined && (
        <LayoutQuantityField
          label="Centre at"
          kind="length"
          address={bearingAddress([only], 'stationMm')}
          min={-20_000}
          max={20_000}
        />
      )}
      <LayoutQuantityField
        label="Width"
        kind="length"
        address={bearingAddress(bearings, 'widthMm')}
        min={0}
        isMinExclusive
        max={2_000}
      />
      <LayoutQuantityField
        label="Bore ⌀"
        kind="length"
        address={bearingAddress(bearings, 'boreDiameterMm')}
        isOptional
        placeholder={placeholderBore ?? 'as seat'}
        min={0}
        isMinExclusive
        max={5_000}
      />
      <LayoutChoiceField
        label="Mounted"
        address={bearingAddress(bearings, 'side')}
        options={SIDES}
        fromStored={(value) => (typeof value === 'string' ? value : 'none')}
        toStored={(value) => (value === 'none' ? null : value)}
      />
      <LayoutQuantityField
        label="Slope limit"
        kind="slope"
        address={bearingAddress(bearings, 'slopeLimitMrad')}
        isOptional
        placeholder="by criteria"
        min={0}
        isMinExclusive
        max={1_000}
      />
      <LayoutQuantityField
        label="Radial stiffness"
        kind="stiffness"
        step={10}
        address={bearingAddress(bearings, 'radialStiffnessNPerUm')}
        isOptional
        placeholder="rigid"
        min={0}
        isMinExclusive
        max={1e9}
      />
    </FieldGrid>
  )
}

export function BearingInspector({
  bearing,
  layout,
  units,
}: {
  bearing: Bearing
  layout: LayoutDocument
  units: UnitSystem
}) {
  const results = useResultsStore((state) => state.results)
  const selected = useResultsStore((state) => state.selectedLoadCaseId)
  const seat = sectionAt(layout, bearing.stationMm)
  const cases = results === null ? [] : shownShaftCases(results, selected)
  const reactionOf = (item: (typeof cases)[number]) =>
    item.reactions.find((reaction) => reaction.bearing === bearing.id)
  const radial = (item: (typeof cases)[number]) => {
    const reaction = reactionOf(item)
    return reaction === undefined ? null : Math.hypot(reaction.yN, reaction.zN)
  }
  const worst = extreme(cases, radial, 'most')
  const reaction = worst === null ? undefined : reactionOf(worst)
  const steepest = extreme(cases, (item) => slopeAt(item, bearing.id), 'most')
  const slope = steepest === null ? null : slopeAt(steepest, bearing.id)
  const limit = bearing.slopeLimitMrad ?? layout.criteria.bearingSlopeMrad
  const force = (value: number | null | undefined) => formatResult(value ?? null, 'force', units).text
  const caseName = (id: string | undefined) => layout.loadCases.find((loadCase) => loadCase.id === id)?.name
  const reference =
    worst === null
      ? undefined
      : ({ kind: 'shaftCase', loadCase: worst.loadCase, quantity: 'reaction', part: bearing.id } as const)

  return (
    <>
      <header>
        <LayoutTextField
          key={bearing.id}
          label="Name"
          arrangement="title"
          address={bearingAddress([bearing], 'name')}
        />
        <p className="text-[13px] text-quiet">
          {bearing.kind} bearing {seat === null ? 'beside the shaft' : `on ⌀${seat.section.outerDiameterMm}`}
          <EditingNow partKey={`bearing:${bearing.id}:`} />
        </p>
      </header>
      <div className="mt-3">
        <BearingFields
          bearings={[bearing]}
          placeholderBore={seat === null ? undefined : `as seat, ${seat.section.outerDiameterMm}`}
        />
      </div>
      {worst !== null && reaction !== undefined && (
        <Group title="Reaction on the shaft" note={`case “${caseName(worst.loadCase)}”`}>
          <ResultRow label="Radial" value={force(radial(worst))} reference={reference} />
          <ResultRow label="In y" value={force(reaction.yN)} reference={reference} />
          <ResultRow label="In z" value={force(reaction.zN)} reference={reference} />
          <ResultRow label="Axial" value={force(reaction.axialN)} reference={reference} />
        </Group>
      )}
      {steepest !== null && slope !== null && (
        <Group title="Slope" note={`case “${caseName(steepest.loadCase)}”`}>
          <ResultRow
            label={`Slope, allowed ${formatResult(limit, 'slope', units).text}`}
            name="slope at this bearing"
            value={`${slope > limit ? '✕ ' : ''}${formatResult(slope, 'slope', units).text}`}
            reference={{
              kind: 'shaftCase',
              loadCase: steepest.loadCase,
              quantity: 'slope',
              part: bearing.id,
            }}
          />
        </Group>
      )}
    </>
  )
}

function slopeAt(item: { slopes: { part: string; mrad: number }[] }, bearing: string): number | null {
  const found = item.slopes.find(({ part }) => part === bearing)
  return found === undefined ? null : Math.abs(found.mrad)
}
