import { type KeyboardEvent, type ReactNode, useId, useRef, useState } from 'react'
import { formatAtRest, formatEntered, formatGiven } from '@/lib/format-quantity'
import { parseQuantity } from '@/lib/quantity-entry'
import { displayUnit, fromStored, type QuantityKind, toStored, type UnitSystem } from '@/lib/quantity-units'
import { usePreferencesStore } from '@/stores/preferences-store'
import { classNames } from './class-names'
import { Icon } from './icon'
import { keepDraft, keptDraft } from './kept-drafts'

export interface QuantityFieldProps {
  label: string
  kind: QuantityKind
  /** Stored metric value. */
  value: number | null | undefined
  /** Returns what is wrong with the value, or null when it was taken. `null` clears an optional field. */
  onCommit: (value: number | null) => string | null
  /** Each valid value while typing. */
  onPreview?: (value: number) => void
  /** The typed text was given up; the preview goes too. */
  onCancel?: () => void
  onFocusChange?: (isFocused: boolean) => void
  /** Keys pressed while nothing is typed: what the field does not use itself. */
  onIdleKeyDown?: (event: KeyboardEvent) => void
  /** `stacked`: label above. `row`: label left, value right. `cell`: in a table, label only read out. */
  arrangement?: 'stacked' | 'row' | 'cell'
  min?: number
  max?: number
  isMinExclusive?: boolean
  isOptional?: boolean
  /** Shown while empty: what holds then. */
  placeholder?: string
  allowsRadial?: boolean
  isReadOnly?: boolean
  /** One press of an arrow key, in stored units; Shift is ten times, Alt a tenth. */
  step?: number
  hint?: ReactNode
  /** Beside the label: who else is typing here. */
  badge?: ReactNode
  /** Keeps text with an error while the field is off screen. */
  draftKey?: string
  className?: string
}

const STEPS: Partial<Record<QuantityKind, { metric: number; inch: number }>> = {
  length: { metric: 1, inch: 0.05 },
  interference: { metric: 1, inch: 0.1 },
  roughness: { metric: 0.1, inch: 5 },
  torque: { metric: 10, inch: 10 },
  force: { metric: 100, inch: 25 },
  stress: { metric: 10, inch: 1 },
  temperature: { metric: 5, inch: 10 },
  temperatureDifference: { metric: 5, inch: 10 },
  mass: { metric: 0.1, inch: 0.25 },
  speed: { metric: 50, inch: 50 },
  slope: { metric: 0.1, inch: 0.1 },
  ratio: { metric: 0.05, inch: 0.05 },
}

/**
 * A number with a unit. Takes any unit of its kind and arithmetic, previews while typing, keeps what
 * was typed when it cannot be read. Enter or leaving commits, Escape restores, arrow keys nudge.
 */
export function QuantityField(props: QuantityFieldProps) {
  const {
    label,
    kind,
    value,
    arrangement = 'stacked',
    isReadOnly = false,
    isOptional = false,
    hint,
    badge,
  } = props
  const system = usePreferencesStore((state) => state.units)
  const id = useId()
  const [draft, setDraft] = useState<string | null>(() => keptDraft(props.draftKey)?.text ?? null)
  const [message, setMessage] = useState<string | null>(() => keptDraft(props.draftKey)?.message ?? null)
  const [isFocused, setIsFocused] = useState(false)
  /** The value when typing began: previews change `value` under the typed text. */
  const startValue = useRef<number | null>(value ?? null)

  const unit = displayUnit(kind, system).symbol

  const beginDraft = () => {
    if (draft === null) startValue.current = value ?? null
  }
  const endDraft = () => {
    setDraft(null)
    setMessage(null)
    keepDraft(props.draftKey, null)
  }
  const refuse = (text: string, why: string) => {
    setMessage(why)
    keepDraft(props.draftKey, { text, message: why })
    props.onCancel?.()
  }

  const read = (text: string) => {
    const result = parseQuantity(text, { kind, system, allowsRadial: props.allowsRadial })
    if (!result.ok) return result
    const problem = rangeProblem(result.value, props, system)
    return problem === null ? result : { ok: false as const, message: problem }
  }

  const change = (text: string) => {
    beginDraft()
    setDraft(text)
    const result = read(text)
    if (result.ok) {
      setMessage(null)
      props.onPreview?.(result.value)
    }
  }

  const commit = () => {
    if (draft === null) return
    if (draft.trim() === '' && (isOptional || startValue.current === null)) {
      if (startValue.current === null) {
        props.onCancel?.()
        endDraft()
        return
      }
      const problem = props.onCommit(null)
      if (problem === null) endDraft()
      else refuse(draft, problem)
      return
    }
    const result = read(draft)
    if (!result.ok) {
      refuse(draft, result.message)
      return
    }
    if (result.value === startValue.current) {
      props.onCancel?.()
      endDraft()
      return
    }
    const problem = props.onCommit(result.value)
    if (problem === null) endDraft()
    else refuse(draft, problem)
  }

  const nudge = (direction: 1 | -1, { shiftKey, altKey }: KeyboardEvent) => {
    const shown = displayUnit(kind, system)
    const current =
      draft === null
        ? value
        : (() => {
            const result = parseQuantity(draft, { kind, system, allowsRadial: props.allowsRadial })
            return result.ok ? result.value : null
          })()
    if (current === null || current === undefined) return
    const step =
      props.step === undefined
        ? (STEPS[kind]?.[system] ?? 1)
        : Math.abs(fromStored(props.step, { ...shown, offset: 0 }))
    const factor = shiftKey ? 10 : altKey ? 0.1 : 1
    change(
      formatEntered(toStored(fromStored(current, shown) + direction * step * factor, shown), kind, system),
    )
  }

  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (isReadOnly) return
    if (event.key === 'Enter') {
      commit()
    } else if (event.key === 'Escape' && draft !== null) {
      // Only what was typed is given up: the selection or the dialog around stays.
      event.preventDefault()
      event.stopPropagation()
      props.onCancel?.()
      endDraft()
    } else if (event.key === 'ArrowUp' || event.key === 'ArrowDown') {
      event.preventDefault()
      event.stopPropagation()
      nudge(event.key === 'ArrowUp' ? 1 : -1, event)
    } else if (draft === null) {
      props.onIdleKeyDown?.(event)
    }
  }

  const describedBy = [message === null ? '' : `${id}-error`, hint ? `${id}-hint` : '']
    .filter(Boolean)
    .join(' ')
  const isCell = arrangement === 'cell'
  return (
    <div
      className={classNames(
        arrangement === 'row' &&
          'grid grid-cols-[1fr_auto] items-center gap-x-3 border-b border-dashed border-hairline py-0.5',
        arrangement === 'stacked' && 'grid content-start gap-0.5',
        // A sentence needs the whole row of a grid of narrow fields.
        arrangement === 'stacked' && message !== null && 'col-span-full',
        props.className,
      )}
    >
      <label htmlFor={id} className={isCell ? 'sr-only' : 'flex items-center gap-1.5 text-xs text-quiet'}>
        {label}
        {isCell && unit !== '' && `, ${unit}`}
        {badge}
      </label>
      <span
        className={classNames(
          'flex items-baseline rounded border bg-transparent focus-within:border-steel focus-within:bg-card focus-within:outline-2 focus-within:-outline-offset-1 focus-within:outline-steel',
          message !== null
            ? 'border-bad bg-bad-soft'
            : isReadOnly
              ? 'border-transparent'
              : isCell
                ? 'border-transparent hover:border-edge'
                : 'border-hairline bg-card hover:border-edge',
          arrangement === 'row' && 'w-32',
        )}
      >
        <input
          id={id}
          type="text"
          autoComplete="off"
          spellCheck={false}
          readOnly={isReadOnly}
          value={draft ?? (isFocused ? formatEntered : formatAtRest)(value, kind, system)}
          placeholder={props.placeholder}
          aria-invalid={message !== null || undefined}
          aria-describedby={describedBy === '' ? undefined : describedBy}
          className={classNames(
            'w-full min-w-0 bg-transparent py-1 text-sm font-semibold tabular-nums outline-none placeholder:font-normal placeholder:text-quiet',
            isCell ? 'px-1.5 text-right' : 'pl-2 text-right',
            unit === '' && !isCell && 'pr-2',
          )}
          onChange={(event) => change(event.target.value)}
          onKeyDown={onKeyDown}
          onFocus={() => {
            setIsFocused(true)
            props.onFocusChange?.(true)
          }}
          onBlur={() => {
            commit()
            setIsFocused(false)
            props.onFocusChange?.(false)
          }}
        />
        {!isCell && unit !== '' && (
          <span aria-hidden="true" className="py-1 pr-2 pl-1 text-xs whitespace-nowrap text-quiet">
            {unit}
          </span>
        )}
      </span>
      {message !== null && (
        <p
          id={`${id}-error`}
          role="alert"
          className={classNames(
            'flex items-start gap-1 text-xs font-medium text-bad',
            arrangement === 'row' && 'col-span-2',
            isCell && 'mt-0.5 min-w-40 text-left whitespace-normal',
          )}
        >
          <Icon name="warning" className="mt-0.5 size-3 shrink-0" />
          {message}
        </p>
      )}
      {hint && (
        <p
          id={`${id}-hint`}
          className={classNames(
            'text-xs text-quiet',
            arrangement === 'row' && 'col-span-2',
            isCell && 'sr-only',
          )}
        >
          {hint}
        </p>
      )}
    </div>
  )
}

function rangeProblem(
  value: number,
  {
    kind,
    min,
    max,
    isMinExclusive = false,
  }: Pick<QuantityFieldProps, 'kind' | 'min' | 'max' | 'isMinExclusive'>,
  system: UnitSystem,
): string | null {
  if (min !== undefined && (isMinExclusive ? value <= min : value < min)) {
    return `Must be ${isMinExclusive ? 'more than' : 'at least'} ${formatGiven(min, kind, system).text}`
  }
  if (max !== undefined && value > max) return `Must be at most ${formatGiven(max, kind, system).text}`
  return null
}
