import { JOINING_METHODS, JOINING_SIDES } from '@/fields/joining-options'
import { LayoutChoiceField } from '@/fields/layout-choice-field'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { hubAddress } from '@/fields/part-address'
import type { Hub } from '@shared/layout/layout-document'
import { FieldGrid } from './inspector-parts'

export function JoiningFields({ hubs }: { hubs: readonly Hub[] }) {
  const methods = new Set(hubs.map(({ joining }) => joining.method))
  const isPressed = methods.size === 1 && methods.has('press')
  const isCooled = methods.has('cool-shaft') || methods.has('heat-and-cool')
  const isHeated = methods.has('heat-hub') || methods.has('heat-and-cool')
  return (
    <FieldGrid>
      <LayoutChoiceField
        label="Method"
        address={hubAddress(hubs, 'joining.method')}
        options={JOINING_METHODS}
      />
      <LayoutChoiceField label="Side" address={hubAddress(hubs, 'joining.side')} options={JOINING_SIDES} />
      <LayoutQuantityField
        label="Ambient"
        kind="temperature"
        address={hubAddress(hubs, 'joining.ambientC')}
        isOptional
        placeholder="20"
        min={-50}
        max={80}
      />
      {!isPressed && (
        <LayoutQuantityField
          label="Joining clearance"
          kind="interference"
          address={hubAddress(hubs, 'joining.clearanceUm')}
          isOptional
          placeholder="by rule"
          min={0}
          max={5000}
        />
      )}
      {isHeated && (
        <>
          <LayoutQuantityField
            label="Handling allowance"
            kind="temperatureDifference"
            address={hubAddress(hubs, 'joining.handlingAllowanceK')}
            isOptional
            placeholder="20"
            min={0}
            max={500}
          />
          <LayoutQuantityField
            label="Hub at most"
            kind="temperature"
            address={hubAddress(hubs, 'joining.maxHubC')}
            isOptional
            placeholder="by material"
            min={20}
            max={1500}
          />
        </>
      )}
      {isCooled && (
        <LayoutQuantityField
          label="Shaft cooled to"
          kind="temperature"
          address={hubAddress(hubs, 'joining.shaftC')}
          isOptional
          placeholder="by need"
          min={-200}
          max={80}
        />
      )}
    </FieldGrid>
  )
}
