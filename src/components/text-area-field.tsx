import { type ComponentProps, useId } from 'react'
import { classNames } from './class-names'
import { controlClasses, describedBy, Field, type FieldTexts } from './field'

interface TextAreaFieldProps extends FieldTexts, Omit<ComponentProps<'textarea'>, 'id'> {
  id?: string
}

export function TextAreaField({ id, label, hint, error, className, ...rest }: TextAreaFieldProps) {
  const ownId = useId()
  const fieldId = id ?? ownId
  const texts = { label, hint, error }
  return (
    <Field id={fieldId} texts={texts}>
      <textarea
        id={fieldId}
        rows={3}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(fieldId, texts)}
        className={classNames(controlClasses(Boolean(error)), className)}
        {...rest}
      />
    </Field>
  )
}
