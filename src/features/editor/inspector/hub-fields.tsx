import { LayoutChoiceField } from '@/fields/layout-choice-field'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { LayoutTextField } from '@/fields/layout-text-field'
import { hubAddress } from '@/fields/part-address'
import { formatGiven } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'
import { faceStations, shoulders } from '@shared/layout/shaft-geometry'
import { FieldGrid } from './inspector-parts'

const ROLES = ['gear', 'cam', 'pulley', 'disc', 'ring', 'other'].map((value) => ({ value, label: value }))

export function HubLengthField({ hubs }: { hubs: readonly Hub[] }) {
  return (
    <LayoutQuantityField
      label="Length"
      kind="length"
      address={hubAddress(hubs, 'lengthMm')}
      min={0}
      isMinExclusive
      max={5_000}
    />
  )
}

export function HubOuterDiameterField({ hubs }: { hubs: readonly Hub[] }) {
  return (
    <LayoutQuantityField
      label="Outer ⌀"
      kind="length"
      address={hubAddress(hubs, 'outerDiameterMm')}
      min={0}
      isMinExclusive
      max={10_000}
    />
  )
}

/** What is changed most: where it is and how big. */
export function HubDimensionFields({ hubs }: { hubs: readonly Hub[] }) {
  return (
    <FieldGrid columns={3}>
      <LayoutQuantityField
        label="Left face at"
        kind="length"
        address={hubAddress(hubs, 'stationMm')}
        min={-20_000}
        max={20_000}
      />
      <HubLengthField hubs={hubs} />
      <HubOuterDiameterField hubs={hubs} />
    </FieldGrid>
  )
}

interface HubOtherFieldsProps {
  hub: Hub
  layout: LayoutDocument
  seatDiameterMm: number | null
  units: UnitSystem
}

export function HubOtherFields({ hub, layout, seatDiameterMm, units }: HubOtherFieldsProps) {
  return (
    <FieldGrid>
      <LayoutChoiceField label="Role" address={hubAddress([hub], 'role')} options={ROLES} />
      <LayoutQuantityField
        label="Bore ⌀"
        kind="length"
        address={hubAddress([hub], 'boreDiameterMm')}
        isOptional
        placeholder={
          seatDiameterMm === null
            ? 'as seat'
            : `as seat, ${formatGiven(seatDiameterMm, 'length', units).number}`
        }
        min={0}
        isMinExclusive
        max={5_000}
      />
      <LayoutQuantityField
        label="Chamfer, left"
        kind="length"
        step={0.5}
        address={hubAddress([hub], 'chamferLeftMm')}
        min={0}
        max={hub.lengthMm / 2}
      />
      <LayoutQuantityField
        label="Chamfer, right"
        kind="length"
        step={0.5}
        address={hubAddress([hub], 'chamferRightMm')}
        min={0}
        max={hub.lengthMm / 2}
      />
      <LayoutChoiceField
        label="Pushed against"
        address={hubAddress([hub], 'abutmentStationMm')}
        options={abutmentChoices(hub, layout, units)}
        fromStored={(value) => (typeof value === 'number' ? String(value) : 'none')}
        toStored={(value) => (value === 'none' ? null : Number(value))}
      />
      <LayoutQuantityField
        label="Phase angle"
        kind="angle"
        address={hubAddress([hub], 'phaseDeg')}
        isOptional
        placeholder="none"
        min={-3600}
        max={3600}
      />
      <LayoutTextField
        label="Group"
        address={hubAddress([hub], 'group')}
        isOptional
        maxLength={80}
        placeholder="none"
      />
      <LayoutQuantityField
        label="Mass"
        kind="mass"
        address={hubAddress([hub], 'massKg')}
        isOptional
        placeholder="by size"
        min={0}
        max={100_000}
      />
    </FieldGrid>
  )
}

/** Shoulder faces and faces of neighbours; a station that is no face any more stays and says so. */
function abutmentChoices(hub: Hub, layout: LayoutDocument, units: UnitSystem) {
  const words = (mm: number) => formatGiven(Number(mm.toFixed(3)), 'length', units).text
  const steps = shoulders(layout)
  const stepStations = new Set(steps.map(({ stationMm }) => stationMm))
  const choices = [
    { value: 'none', label: 'nothing' },
    ...steps.map(({ stationMm, leftDiameterMm, rightDiameterMm }) => ({
      value: String(stationMm),
      label: `z ${words(stationMm)}, shoulder ⌀${leftDiameterMm} to ⌀${rightDiameterMm}`,
      group: 'Shoulders',
    })),
    ...faceStations(layout, hub.id)
      .filter((stationMm) => !stepStations.has(stationMm))
      .map((stationMm) => ({
        value: String(stationMm),
        label: `z ${words(stationMm)}`,
        group: 'Faces of other parts',
      })),
  ]
  const current = hub.abutmentStationMm
  if (typeof current === 'number' && !choices.some(({ value }) => value === String(current))) {
    choices.push({ value: String(current), label: `z ${words(current)}, no face there` })
  }
  return choices
}
