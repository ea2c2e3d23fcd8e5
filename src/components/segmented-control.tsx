import { useId } from 'react'

/** A few choices side by side, one always chosen: radio buttons that look like one control. */
export function SegmentedControl<Value extends string>({
  label,
  options,
  value,
  onChange,
  isLabelHidden = false,
}: {
  label: string
  options: readonly { value: Value; label: string }[]
  value: Value
  onChange: (value: Value) => void
  isLabelHidden?: boolean
}) {
  const name = useId()
  return (
    <fieldset className="grid gap-1.5">
      <legend className={isLabelHidden ? 'sr-only' : 'mb-1.5 text-[13px] font-semibold'}>{label}</legend>
      <div className="inline-flex w-fit rounded-md border border-edge bg-card p-0.5">
        {options.map((option) => (
          <label
            key={option.value}
            className="cursor-pointer rounded px-3 py-1 text-sm font-semibold text-quiet has-checked:bg-steel has-checked:text-on-fill has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-steel"
          >
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={option.value === value}
              onChange={() => onChange(option.value)}
              className="sr-only"
            />
            {option.label}
          </label>
        ))}
      </div>
    </fieldset>
  )
}
