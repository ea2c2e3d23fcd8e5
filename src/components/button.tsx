import type { ComponentProps, ReactNode } from 'react'
import { classNames } from './class-names'
import { Spinner } from './spinner'

export type ButtonVariant = 'primary' | 'secondary' | 'quiet' | 'danger' | 'bar' | 'barPrimary'
export type ButtonSize = 'sm' | 'md'

const VARIANTS: Record<ButtonVariant, string> = {
  primary: 'border-steel bg-steel text-on-fill hover:brightness-110',
  secondary: 'border-edge bg-card text-ink hover:bg-steel-soft',
  quiet: 'border-transparent text-ink hover:bg-steel-soft',
  danger: 'border-bad bg-bad text-on-fill hover:brightness-110',
  /** On the dark top bar. */
  bar: 'border-bar-line text-bar-ink hover:bg-bar-line/50',
  barPrimary: 'border-straw-bright bg-straw-bright text-on-straw hover:brightness-105',
}
const SIZES: Record<ButtonSize, string> = {
  sm: 'min-h-8 px-2.5 text-[13px]',
  md: 'min-h-10 px-4 text-sm',
}

/** For links that look like buttons. */
export const buttonClasses = (variant: ButtonVariant = 'secondary', size: ButtonSize = 'md'): string =>
  classNames(
    'inline-flex items-center justify-center gap-2 rounded-md border font-semibold whitespace-nowrap transition-colors',
    'disabled:cursor-not-allowed disabled:opacity-55',
    VARIANTS[variant],
    SIZES[size],
  )

interface ButtonProps extends ComponentProps<'button'> {
  variant?: ButtonVariant
  size?: ButtonSize
  icon?: ReactNode
  /** Shows a spinner and ignores presses; the button keeps its place and its focus. */
  isBusy?: boolean
}

export function Button({
  variant = 'secondary',
  size = 'md',
  icon,
  isBusy = false,
  className,
  children,
  type = 'button',
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      type={type}
      className={classNames(buttonClasses(variant, size), className)}
      aria-disabled={isBusy || undefined}
      onClick={(event) => {
        // A busy submit button must not send its form a second time.
        if (isBusy) event.preventDefault()
        else onClick?.(event)
      }}
      {...rest}
    >
      {isBusy ? <Spinner label="" /> : icon}
      {children}
    </button>
  )
}
