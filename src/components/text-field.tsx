import { type ComponentProps, useId } from 'react'
import { classNames } from './class-names'
import { controlClasses, describedBy, Field, type FieldTexts } from './field'

interface TextFieldProps extends FieldTexts, Omit<ComponentProps<'input'>, 'id'> {
  id?: string
  isLabelHidden?: boolean
}

export function TextField({ id, label, hint, error, isLabelHidden, className, ...rest }: TextFieldProps) {
  const ownId = useId()
  const fieldId = id ?? ownId
  const texts = { label, hint, error }
  return (
    <Field id={fieldId} texts={texts} isLabelHidden={isLabelHidden}>
      <input
        id={fieldId}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(fieldId, texts)}
        className={classNames(controlClasses(Boolean(error)), className)}
        {...rest}
      />
    </Field>
  )
}
