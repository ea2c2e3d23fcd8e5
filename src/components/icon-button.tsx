import type { ComponentProps } from 'react'
import { buttonClasses, type ButtonVariant } from './button'
import { classNames } from './class-names'
import { Icon, type IconName } from './icon'
import { Tooltip } from './tooltip'

interface IconButtonProps extends Omit<ComponentProps<'button'>, 'aria-label' | 'children'> {
  icon: IconName
  /** Read out and shown on hover and focus. */
  label: string
  variant?: ButtonVariant
}

export function IconButton({
  icon,
  label,
  variant = 'quiet',
  className,
  type = 'button',
  ...rest
}: IconButtonProps) {
  return (
    <Tooltip text={label}>
      <button
        type={type}
        aria-label={label}
        className={classNames(buttonClasses(variant, 'sm'), 'size-8 px-0!', className)}
        {...rest}
      >
        <Icon name={icon} />
      </button>
    </Tooltip>
  )
}
