import type { ReactNode } from 'react'
import { Sign } from './sign'

export interface FieldTexts {
  label: string
  /** Quiet words under the label or control. */
  hint?: ReactNode
  /** What is wrong with the value; shown at the field and read out. */
  error?: string | null
}

/** Ids that tie a control to its hint and its error. */
export const describedBy = (id: string, { hint, error }: FieldTexts): string | undefined =>
  [error ? `${id}-error` : '', hint ? `${id}-hint` : ''].filter(Boolean).join(' ') || undefined

export const controlClasses = (hasError: boolean): string =>
  `block w-full min-h-10 rounded-md border bg-card px-3 py-1.5 text-ink placeholder:text-quiet disabled:opacity-60 ${
    hasError ? 'border-bad outline-bad' : 'border-edge'
  }`

/** Label above, control, then hint or error below. */
export function Field({
  id,
  texts,
  isLabelHidden = false,
  children,
}: {
  id: string
  texts: FieldTexts
  isLabelHidden?: boolean
  children: ReactNode
}) {
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className={isLabelHidden ? 'sr-only' : 'text-[13px] font-semibold'}>
        {texts.label}
      </label>
      {children}
      {texts.error && (
        <p id={`${id}-error`} className="flex items-start gap-1.5 text-[13px] font-medium text-bad">
          <Sign name="warning" className="mt-0.5 size-3.5" />
          <span>{texts.error}</span>
        </p>
      )}
      {texts.hint && (
        <p id={`${id}-hint`} className="text-[13px] text-quiet">
          {texts.hint}
        </p>
      )}
    </div>
  )
}
