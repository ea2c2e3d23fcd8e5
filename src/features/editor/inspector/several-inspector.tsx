import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { hubAddress } from '@/fields/part-address'
import type { UnitSystem } from '@/lib/quantity-units'
import type { Bearing, Hub, LayoutDocument, ShaftSection } from '@shared/layout/layout-document'
import { BearingFields } from './bearing-inspector'
import { FrictionFields } from './friction-fields'
import { HubLengthField, HubOuterDiameterField } from './hub-fields'
import { FieldGrid, Group } from './inspector-parts'
import { JoiningFields } from './joining-fields'
import { MaterialFields, Unfolding } from './lazy-fields'
import { materialWords } from './material-words'
import { SectionFields } from './section-inspector'

interface SeveralInspectorProps {
  hubs: readonly Hub[]
  bearings: readonly Bearing[]
  sections: readonly ShaftSection[]
  layout: LayoutDocument
  units: UnitSystem
}

const counted = (count: number, noun: string) =>
  count === 0 ? [] : [`${count} ${noun}${count === 1 ? '' : 's'}`]

/** What several selected parts have in common; a value typed here goes to all of that kind. */
export function SeveralInspector({ hubs, bearings, sections, layout, units }: SeveralInspectorProps) {
  const [firstHub] = hubs
  const names = [...hubs.map(({ name }) => name), ...bearings.map(({ name }) => `bearing ${name}`)]
  return (
    <>
      <header>
        <h2 className="text-lg leading-6 font-bold">
          {[
            ...counted(hubs.length, 'hub'),
            ...counted(bearings.length, 'bearing'),
            ...counted(sections.length, 'section'),
          ].join(', ')}
        </h2>
        <p className="text-[13px] text-quiet">{names.join(', ')}</p>
        <p className="mt-1 text-xs text-quiet">A value typed here is given to all of that kind.</p>
      </header>
      {firstHub !== undefined && (
        <>
          <Group title={hubs.length === 1 ? `Hub ${firstHub.name}` : 'All selected hubs'}>
            <FieldGrid>
              <HubLengthField hubs={hubs} />
              <HubOuterDiameterField hubs={hubs} />
              <LayoutQuantityField
                label="Bore roughness Rz"
                kind="roughness"
                address={hubAddress(hubs, 'roughnessRzUm')}
                min={0}
                max={1_000}
              />
            </FieldGrid>
            <Unfolding
              summary={`Material: ${materialWords(firstHub.material, units)}${hubs.length > 1 ? ' …' : ''}`}
            >
              <MaterialFields
                address={hubAddress(hubs, 'material')}
                material={firstHub.material}
                units={units}
              />
            </Unfolding>
          </Group>
          <Group title="Assembly">
            <JoiningFields hubs={hubs} />
          </Group>
          <Group title="Friction">
            <FrictionFields hubs={hubs} />
          </Group>
        </>
      )}
      {bearings.length > 0 && (
        <Group title={bearings.length === 1 ? 'The bearing' : 'All selected bearings'}>
          <BearingFields bearings={bearings} />
        </Group>
      )}
      {sections.length > 0 && (
        <Group title={sections.length === 1 ? 'The section' : 'All selected sections'}>
          <SectionFields sections={sections} layout={layout} />
        </Group>
      )}
    </>
  )
}
