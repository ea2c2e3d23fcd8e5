import { useId, useState } from 'react'
import { classNames } from '@/components/class-names'
import { Icon } from '@/components/icon'
import { EditorsBadge } from './editors-badge'
import { type FieldAddress, shownValues, useLayoutField } from './layout-field'

export interface Choice {
  value: string
  label: string
  /** Heading it stands under. */
  group?: string
}

interface LayoutChoiceFieldProps {
  label: string
  address: FieldAddress
  options: readonly Choice[]
  arrangement?: 'stacked' | 'row' | 'cell'
  /** From the option chosen to what is stored. */
  toStored?: (value: string) => unknown
  /** From what is stored to an option. */
  fromStored?: (value: unknown) => string
  /** Shown while closed instead of the option's text, which may be long. */
  shown?: string
  className?: string
}

/** One of a few values of the layout; choosing commits at once. */
export function LayoutChoiceField({
  label,
  address,
  options,
  arrangement = 'stacked',
  toStored = (value) => value,
  fromStored = (value) => (typeof value === 'string' ? value : ''),
  shown,
  className,
}: LayoutChoiceFieldProps) {
  const id = useId()
  const field = useLayoutField(address)
  const [message, setMessage] = useState<string | null>(null)
  const values = new Set(shownValues(address).map(fromStored))
  const [only = ''] = values
  const isMixed = values.size > 1
  const isKnown = !isMixed && options.some(({ value }) => value === only)
  return (
    <div
      className={classNames(
        arrangement === 'row' &&
          'grid grid-cols-[1fr_auto] items-center gap-x-3 border-b border-dashed border-hairline py-0.5',
        arrangement === 'stacked' && 'grid content-start gap-0.5',
        className,
      )}
    >
      <label
        htmlFor={id}
        className={arrangement === 'cell' ? 'sr-only' : 'flex items-center gap-1.5 text-xs text-quiet'}
      >
        {label}
        <EditorsBadge names={field.editors} />
      </label>
      <span
        className={classNames(
          'relative flex items-center rounded border focus-within:outline-2 focus-within:-outline-offset-1 focus-within:outline-steel',
          field.isReadOnly
            ? 'border-transparent'
            : arrangement === 'cell'
              ? 'border-transparent hover:border-edge'
              : 'border-hairline bg-card hover:border-edge',
          arrangement === 'row' && 'min-w-32',
        )}
      >
        <select
          id={id}
          disabled={field.isReadOnly}
          value={isKnown ? only : ''}
          aria-invalid={message !== null || undefined}
          aria-describedby={message === null ? undefined : `${id}-error`}
          className={classNames(
            'w-full min-w-0 appearance-none truncate bg-transparent py-1 pr-6 pl-2 text-sm font-semibold outline-none disabled:opacity-100',
            shown === undefined
              ? 'disabled:text-ink'
              : 'text-transparent [&_optgroup]:bg-card [&_optgroup]:text-quiet [&_option]:bg-card [&_option]:text-ink',
          )}
          onFocus={() => field.setFocused(true)}
          onBlur={() => field.setFocused(false)}
          onChange={(event) => setMessage(field.commit(toStored(event.target.value)))}
        >
          {!isKnown && <option value="">{isMixed ? 'several' : only}</option>}
          <GroupedOptions options={options} />
        </select>
        {shown !== undefined && (
          <span aria-hidden="true" className="pointer-events-none absolute left-2 text-sm font-semibold">
            {isMixed ? 'several' : shown}
          </span>
        )}
        {!field.isReadOnly && (
          <Icon name="chevronDown" className="pointer-events-none absolute right-1.5 size-3 text-quiet" />
        )}
      </span>
      {message !== null && (
        <p id={`${id}-error`} role="alert" className="col-span-2 text-xs font-medium text-bad">
          {message}
        </p>
      )}
    </div>
  )
}

/** Options as they are, then those with a heading under it. */
export function GroupedOptions({ options }: { options: readonly Choice[] }) {
  const groups = [...new Set(options.map(({ group }) => group))]
  return groups.map((group) => {
    const entries = options
      .filter((option) => option.group === group)
      .map(({ value, label }) => (
        <option key={value} value={value}>
          {label}
        </option>
      ))
    return group === undefined ? (
      entries
    ) : (
      <optgroup key={group} label={group}>
        {entries}
      </optgroup>
    )
  })
}
