import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { hubAddress } from '@/fields/part-address'
import type { Hub } from '@shared/layout/layout-document'
import { FieldGrid } from './inspector-parts'
import { FrictionPairs, Unfolding } from './lazy-fields'

/** Three coefficients, each free, and the named pairings of the library that set them. */
export function FrictionFields({ hubs }: { hubs: readonly Hub[] }) {
  const coefficient = (label: string, field: keyof Hub['friction']) => (
    <LayoutQuantityField
      label={label}
      kind="ratio"
      step={0.01}
      address={hubAddress(hubs, `friction.${field}`)}
      min={0}
      isMinExclusive
      max={1.5}
    />
  )
  return (
    <>
      <FieldGrid columns={3}>
        {coefficient('Circumferential', 'circumferential')}
        {coefficient('Axial', 'axial')}
        {coefficient('Pressing on', 'pressing')}
      </FieldGrid>
      <Unfolding summary="Take it from a known pairing">
        <FrictionPairs hubs={hubs} />
      </Unfolding>
    </>
  )
}
