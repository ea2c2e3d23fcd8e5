import { QuantityField, type QuantityFieldProps } from '@/components/quantity-field'
import { EditorsBadge } from './editors-badge'
import { type FieldAddress, shownValues, useLayoutField } from './layout-field'

interface LayoutQuantityFieldProps extends Omit<
  QuantityFieldProps,
  'value' | 'onCommit' | 'onPreview' | 'onCancel' | 'onFocusChange' | 'onIdleKeyDown' | 'badge' | 'draftKey'
> {
  address: FieldAddress
}

/** A quantity of the layout. With several targets it shows their common value, or that they differ. */
export function LayoutQuantityField({ address, placeholder, ...rest }: LayoutQuantityFieldProps) {
  const field = useLayoutField(address)
  const values = new Set(shownValues(address).map((value) => value ?? null))
  const [only] = values
  const isMixed = values.size > 1
  return (
    <QuantityField
      {...rest}
      key={field.draftKey}
      value={!isMixed && typeof only === 'number' ? only : null}
      placeholder={isMixed ? 'several' : placeholder}
      isReadOnly={rest.isReadOnly === true || field.isReadOnly}
      draftKey={field.draftKey}
      badge={<EditorsBadge names={field.editors} />}
      onCommit={field.commit}
      onPreview={field.preview}
      onCancel={field.cancel}
      onFocusChange={field.setFocused}
      onIdleKeyDown={field.onIdleKeyDown}
    />
  )
}
