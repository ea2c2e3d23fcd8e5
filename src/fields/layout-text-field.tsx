import { type KeyboardEvent, useId, useState } from 'react'
import { classNames } from '@/components/class-names'
import { Icon } from '@/components/icon'
import { keepDraft, keptDraft } from '@/components/kept-drafts'
import { EditorsBadge } from './editors-badge'
import { type FieldAddress, shownValues, useLayoutField } from './layout-field'

interface LayoutTextFieldProps {
  label: string
  address: FieldAddress
  arrangement?: 'stacked' | 'row' | 'cell' | 'title'
  maxLength?: number
  /** An empty text clears the value; otherwise it is refused. */
  isOptional?: boolean
  placeholder?: string
  /** For values that are not plain text: how they are shown, and read back. */
  format?: (stored: unknown) => string
  read?: (text: string) => { ok: true; value: unknown } | { ok: false; message: string }
  className?: string
}

/** A name or a word of the layout. Enter or leaving commits, Escape restores. */
export function LayoutTextField({
  label,
  address,
  arrangement = 'stacked',
  maxLength = 120,
  isOptional = false,
  placeholder,
  format = (stored) => (typeof stored === 'string' ? stored : ''),
  read = (text) => ({ ok: true, value: text }),
  className,
}: LayoutTextFieldProps) {
  const id = useId()
  const field = useLayoutField(address)
  const [draft, setDraft] = useState<string | null>(() => keptDraft(field.draftKey)?.text ?? null)
  const [message, setMessage] = useState<string | null>(() => keptDraft(field.draftKey)?.message ?? null)
  const values = new Set(shownValues(address).map(format))
  const [only = ''] = values
  const stored = values.size > 1 ? '' : only

  const endDraft = () => {
    setDraft(null)
    setMessage(null)
    keepDraft(field.draftKey, null)
  }
  const take = (text: string): string | null => {
    if (text === '') return isOptional ? field.commit(null) : 'Enter something here'
    if (text.length > maxLength) return `At most ${maxLength} characters`
    const result = read(text)
    return result.ok ? field.commit(result.value) : result.message
  }
  const commit = () => {
    if (draft === null) return
    const text = draft.trim()
    if (text === stored.trim()) {
      endDraft()
      return
    }
    const problem = take(text)
    if (problem === null) {
      endDraft()
      return
    }
    setMessage(problem)
    keepDraft(field.draftKey, { text: draft, message: problem })
  }
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Enter') commit()
    if (draft === null) field.onIdleKeyDown(event)
    if (event.key !== 'Escape' || draft === null) return
    event.preventDefault()
    event.stopPropagation()
    endDraft()
  }

  const isBare = arrangement === 'cell' || arrangement === 'title'
  return (
    <div
      className={classNames(
        arrangement === 'row' &&
          'grid grid-cols-[1fr_auto] items-center gap-x-3 border-b border-dashed border-hairline py-0.5',
        arrangement === 'stacked' && 'grid content-start gap-0.5',
        className,
      )}
    >
      <label htmlFor={id} className={isBare ? 'sr-only' : 'flex items-center gap-1.5 text-xs text-quiet'}>
        {label}
        <EditorsBadge names={field.editors} />
      </label>
      <input
        id={id}
        type="text"
        autoComplete="off"
        spellCheck={false}
        readOnly={field.isReadOnly}
        value={draft ?? stored}
        placeholder={values.size > 1 ? 'several' : placeholder}
        aria-invalid={message !== null || undefined}
        aria-describedby={message === null ? undefined : `${id}-error`}
        className={classNames(
          'w-full min-w-0 rounded border bg-transparent font-semibold placeholder:font-normal placeholder:text-quiet focus:border-steel focus:bg-card focus:outline-2 focus:-outline-offset-1 focus:outline-steel',
          arrangement === 'title'
            ? '-mx-1.5 px-1.5 py-0.5 text-base leading-6 font-bold'
            : 'px-2 py-1 text-sm',
          arrangement === 'row' && 'w-32 text-right',
          message !== null
            ? 'border-bad bg-bad-soft'
            : field.isReadOnly
              ? 'border-transparent'
              : isBare
                ? 'border-transparent hover:border-edge'
                : 'border-hairline bg-card hover:border-edge',
        )}
        onChange={(event) => setDraft(event.target.value)}
        onKeyDown={onKeyDown}
        onFocus={() => field.setFocused(true)}
        onBlur={() => {
          commit()
          field.setFocused(false)
        }}
      />
      {message !== null && (
        <p
          id={`${id}-error`}
          role="alert"
          className="col-span-2 flex items-start gap-1 text-xs font-medium text-bad"
        >
          <Icon name="warning" className="mt-0.5 size-3 shrink-0" />
          {message}
        </p>
      )}
    </div>
  )
}
