import { LayoutChoiceField } from '@/fields/layout-choice-field'
import type { FieldAddress } from '@/fields/layout-field'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { LayoutTextField } from '@/fields/layout-text-field'
import { formatResult } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { findLibraryMaterial, MATERIAL_LIBRARY } from '@shared/engineering/materials/material-library'
import { type LibraryMaterial, PROVENANCE } from '@shared/engineering/materials/material'
import { toCelsius, toMPa } from '@shared/engineering/quantities/units'
import type { InlineMaterial, MaterialReference } from '@shared/layout/layout-document'
import { FieldGrid } from './inspector-parts'

interface MaterialFieldsProps {
  address: FieldAddress
  material: MaterialReference
  units: UnitSystem
  label?: string
}

const OWN = 'own-values'

/** A library material, or its values given directly. */
export function MaterialFields({ address, material, units, label = 'Material' }: MaterialFieldsProps) {
  const entry = typeof material === 'string' ? findLibraryMaterial(material) : undefined
  return (
    <>
      <LayoutChoiceField
        label={label}
        address={address}
        arrangement="stacked"
        options={[
          {
            value: OWN,
            label:
              typeof material === 'object' && material.name ? `${material.name} (own values)` : 'own values',
          },
          ...MATERIAL_LIBRARY.map((item) => ({
            value: item.id,
            label: `${item.name} ${item.condition}`,
            group: 'Library',
          })),
        ]}
        fromStored={(value) => (typeof value === 'string' ? (findLibraryMaterial(value)?.id ?? value) : OWN)}
        toStored={(id): MaterialReference => (id === OWN ? inlineOf(material) : id)}
      />
      {entry !== undefined && <LibraryNote entry={entry} units={units} />}
      {typeof material === 'string' && entry === undefined && (
        <p className="mt-1 text-xs font-medium text-bad">
          The library has no “{material}”. Choose another or give own values.
        </p>
      )}
      {typeof material === 'object' && <InlineFields address={address} />}
    </>
  )
}

function LibraryNote({ entry, units }: { entry: LibraryMaterial; units: UnitSystem }) {
  const yieldText = formatResult(toMPa(entry.yieldStrength.value), 'stress', units).text
  const tensileText = formatResult(toMPa(entry.tensileStrength.value), 'stress', units).text
  const { text, isFromMemory } = PROVENANCE[entry.yieldStrength.provenance]
  return (
    <p className="mt-1 text-xs text-quiet">
      Yield {yieldText}, tensile {tensileText}, {entry.behaviour}; {entry.section}. Joining up to{' '}
      {formatResult(toCelsius(entry.maxJoiningTemperature.value), 'temperature', units).text}. Strength:{' '}
      {text}
      {isFromMemory && ' (from memory)'}.
    </p>
  )
}

function InlineFields({ address }: { address: FieldAddress }) {
  const part = (inside: keyof InlineMaterial): FieldAddress => ({ ...address, inside })
  return (
    <FieldGrid>
      <LayoutTextField label="Name" address={part('name')} isOptional maxLength={80} className="col-span-2" />
      <LayoutQuantityField
        label="Yield strength"
        kind="stress"
        address={part('yieldMPa')}
        min={0}
        isMinExclusive
        max={10_000}
      />
      <LayoutQuantityField
        label="Tensile strength"
        kind="stress"
        address={part('tensileMPa')}
        min={0}
        isMinExclusive
        max={10_000}
      />
      <LayoutQuantityField
        label="Young’s modulus"
        kind="stress"
        step={1000}
        address={part('youngsModulusMPa')}
        min={0}
        isMinExclusive
        max={2_000_000}
      />
      <LayoutQuantityField
        label="Poisson ratio"
        kind="ratio"
        step={0.01}
        address={part('poissonRatio')}
        min={0}
        max={0.499}
      />
      <LayoutQuantityField
        label="Expansion"
        kind="expansion"
        step={1e-7}
        address={part('expansionPerK')}
        min={0}
        max={1e-3}
      />
      <LayoutQuantityField
        label="Density"
        kind="density"
        step={10}
        address={part('densityKgM3')}
        min={0}
        isMinExclusive
        max={30_000}
      />
      <LayoutChoiceField
        label="Behaviour"
        address={part('brittle')}
        options={[
          { value: 'ductile', label: 'ductile' },
          { value: 'brittle', label: 'brittle' },
        ]}
        fromStored={(value) => (value === true ? 'brittle' : 'ductile')}
        toStored={(value) => value === 'brittle'}
      />
      <LayoutQuantityField
        label="Joining up to"
        kind="temperature"
        address={part('maxJoiningC')}
        isOptional
        placeholder="not given"
        min={20}
        max={1500}
      />
    </FieldGrid>
  )
}

/** Own values start from what the library says, so that one value can be replaced by a certificate. */
function inlineOf(material: MaterialReference): InlineMaterial {
  if (typeof material === 'object') return material
  const entry = findLibraryMaterial(material)
  if (entry === undefined) {
    return {
      name: material,
      youngsModulusMPa: 206_000,
      poissonRatio: 0.3,
      expansionPerK: 11.5e-6,
      densityKgM3: 7_850,
      yieldMPa: 340,
      tensileMPa: 600,
      brittle: false,
      maxJoiningC: null,
    }
  }
  const rounded = (value: number) => Number(value.toPrecision(10))
  return {
    name: entry.id,
    youngsModulusMPa: rounded(toMPa(entry.youngsModulus.value)),
    poissonRatio: entry.poissonRatio.value,
    expansionPerK: rounded(entry.expansion.value),
    densityKgM3: rounded(entry.density.value),
    yieldMPa: rounded(toMPa(entry.yieldStrength.value)),
    tensileMPa: rounded(toMPa(entry.tensileStrength.value)),
    brittle: entry.isBrittle,
    maxJoiningC: rounded(toCelsius(entry.maxJoiningTemperature.value)),
  }
}
