import { type ComponentProps, type ReactNode, useId } from 'react'

interface CheckboxProps extends Omit<ComponentProps<'input'>, 'type' | 'id' | 'onChange'> {
  label: ReactNode
  onCheckedChange: (isChecked: boolean) => void
}

export function Checkbox({ label, onCheckedChange, ...rest }: CheckboxProps) {
  const id = useId()
  return (
    <div className="flex items-start gap-2.5">
      <input
        id={id}
        type="checkbox"
        className="mt-0.5 size-4.5 shrink-0 accent-steel"
        onChange={(event) => onCheckedChange(event.target.checked)}
        {...rest}
      />
      <label htmlFor={id} className="text-sm">
        {label}
      </label>
    </div>
  )
}
