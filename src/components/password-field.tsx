import { type ComponentProps, useId, useState } from 'react'
import { controlClasses, describedBy, Field, type FieldTexts } from './field'

/** Pasting and password managers work; what was typed can be shown. */
export function PasswordField({
  label,
  hint,
  error,
  ...rest
}: FieldTexts & Omit<ComponentProps<'input'>, 'id' | 'type'>) {
  const id = useId()
  const [isShown, setIsShown] = useState(false)
  const texts = { label, hint, error }
  return (
    <Field id={id} texts={texts}>
      <div className="relative">
        <input
          id={id}
          type={isShown ? 'text' : 'password'}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, texts)}
          autoCapitalize="none"
          spellCheck={false}
          className={`${controlClasses(Boolean(error))} pr-16`}
          {...rest}
        />
        <button
          type="button"
          aria-pressed={isShown}
          aria-label="Show password"
          className="absolute inset-y-0 right-0 rounded-md px-3 text-[13px] font-semibold text-quiet hover:text-ink"
          onClick={() => setIsShown(!isShown)}
        >
          {isShown ? 'Hide' : 'Show'}
        </button>
      </div>
    </Field>
  )
}
