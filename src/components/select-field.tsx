import { type ComponentProps, useId } from 'react'
import { classNames } from './class-names'
import { controlClasses, describedBy, Field, type FieldTexts } from './field'
import { Icon } from './icon'

export interface SelectOption {
  value: string
  label: string
  disabled?: boolean
}
interface SelectFieldProps
  extends FieldTexts, Omit<ComponentProps<'select'>, 'id' | 'children' | 'onChange'> {
  id?: string
  options: readonly SelectOption[]
  isLabelHidden?: boolean
  onValueChange: (value: string) => void
}

/** The browser's own list: right on every device, and known to every screen reader. */
export function SelectField({
  id,
  label,
  hint,
  error,
  options,
  isLabelHidden,
  onValueChange,
  className,
  ...rest
}: SelectFieldProps) {
  const ownId = useId()
  const fieldId = id ?? ownId
  const texts = { label, hint, error }
  return (
    <Field id={fieldId} texts={texts} isLabelHidden={isLabelHidden}>
      <div className="relative">
        <select
          id={fieldId}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(fieldId, texts)}
          className={classNames(controlClasses(Boolean(error)), 'appearance-none pr-8', className)}
          onChange={(event) => onValueChange(event.target.value)}
          {...rest}
        >
          {options.map((option) => (
            <option key={option.value} value={option.value} disabled={option.disabled}>
              {option.label}
            </option>
          ))}
        </select>
        <Icon
          name="chevronDown"
          className="pointer-events-none absolute top-1/2 right-2.5 size-3.5 -translate-y-1/2"
        />
      </div>
    </Field>
  )
}
