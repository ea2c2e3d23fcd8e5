import {
  type CSSProperties,
  type KeyboardEvent,
  type ReactNode,
  useEffect,
  useId,
  useLayoutEffect,
  useRef,
  useState,
} from 'react'
import { classNames } from './class-names'
import { Icon, type IconName } from './icon'

export type MenuItem =
  | {
      kind?: 'action'
      label: string
      icon?: IconName
      onSelect: () => void
      isDangerous?: boolean
      isDisabled?: boolean
    }
  | { kind: 'choice'; label: string; isChosen: boolean; onSelect: () => void }
  | { kind: 'heading'; label: string }
  | { kind: 'separator' }

/** Between the button, the list and the edge of the window. */
const LIST_GAP_PX = 4

/**
 * A button that opens a list of actions. Arrow keys, Home, End and first letters move; Escape and Tab close;
 * focus comes back to the button.
 */
export function Menu({
  label,
  button,
  buttonClassName,
  items,
  align = 'end',
}: {
  /** Accessible name of the button and the list. */
  label: string
  button: ReactNode
  buttonClassName?: string
  items: readonly MenuItem[]
  align?: 'start' | 'end'
}) {
  const [isOpen, setIsOpen] = useState(false)
  const root = useRef<HTMLDivElement>(null)
  const trigger = useRef<HTMLButtonElement>(null)
  const list = useRef<HTMLDivElement>(null)
  const [place, setPlace] = useState<CSSProperties>({})
  const menuId = useId()

  const entries = () => [
    ...(root.current?.querySelectorAll<HTMLElement>('[data-menu-item]:not([disabled])') ?? []),
  ]
  const close = () => {
    setIsOpen(false)
    trigger.current?.focus()
  }

  // Fixed to the window: inside a scrolling table the list would be cut off, or would scroll the table.
  useLayoutEffect(() => {
    if (!isOpen || !trigger.current || !list.current) return
    const button = trigger.current.getBoundingClientRect()
    const height = list.current.scrollHeight
    const roomBelow = window.innerHeight - button.bottom
    const isBelow = roomBelow >= height + 2 * LIST_GAP_PX || roomBelow >= button.top
    setPlace({
      ...(isBelow
        ? { top: button.bottom + LIST_GAP_PX, maxHeight: roomBelow - 2 * LIST_GAP_PX }
        : { bottom: window.innerHeight - button.top + LIST_GAP_PX, maxHeight: button.top - 2 * LIST_GAP_PX }),
      ...(align === 'end'
        ? { right: Math.max(LIST_GAP_PX, document.documentElement.clientWidth - button.right) }
        : { left: button.left }),
    })
  }, [isOpen, align])

  useEffect(() => {
    if (!isOpen) return
    entries()[0]?.focus({ preventScroll: true })
    const onPointerDown = (event: PointerEvent) => {
      if (event.target instanceof Node && !root.current?.contains(event.target)) setIsOpen(false)
    }
    // The list does not move with what scrolls under it; a late event of an earlier scroll changes nothing.
    const openedAt = trigger.current?.getBoundingClientRect().top ?? 0
    const onScroll = () => {
      const top = trigger.current?.getBoundingClientRect().top ?? openedAt
      if (Math.abs(top - openedAt) > 1) setIsOpen(false)
    }
    document.addEventListener('pointerdown', onPointerDown)
    document.addEventListener('scroll', onScroll, true)
    return () => {
      document.removeEventListener('pointerdown', onPointerDown)
      document.removeEventListener('scroll', onScroll, true)
    }
  }, [isOpen])

  const onKeyDown = (event: KeyboardEvent) => {
    if (!isOpen) {
      if (event.key === 'ArrowDown') {
        event.preventDefault()
        setIsOpen(true)
      }
      return
    }
    if (event.key === 'Tab') return setIsOpen(false)
    const all = entries()
    const index = all.indexOf(document.activeElement as HTMLElement)
    const target =
      event.key === 'ArrowDown'
        ? all[(index + 1) % all.length]
        : event.key === 'ArrowUp'
          ? all[(index - 1 + all.length) % all.length]
          : event.key === 'Home'
            ? all[0]
            : event.key === 'End'
              ? all.at(-1)
              : /^\p{L}$/u.test(event.key)
                ? [...all.slice(index + 1), ...all].find((entry) =>
                    entry.textContent?.toLowerCase().startsWith(event.key.toLowerCase()),
                  )
                : undefined
    if (event.key === 'Escape') close()
    else if (!target) return
    else target.focus()
    event.preventDefault()
    event.stopPropagation()
  }

  return (
    <div ref={root} className="relative inline-flex" onKeyDown={onKeyDown}>
      <button
        ref={trigger}
        type="button"
        aria-label={label}
        aria-haspopup="menu"
        aria-expanded={isOpen}
        aria-controls={isOpen ? menuId : undefined}
        className={buttonClassName}
        onClick={() => setIsOpen(!isOpen)}
      >
        {button}
      </button>
      {isOpen && (
        <div
          ref={list}
          id={menuId}
          style={place}
          role="menu"
          aria-label={label}
          className="fixed z-50 min-w-48 overflow-auto rounded-md border border-hairline bg-card py-1 text-sm text-ink shadow-lg text-left"
        >
          {items.map((item, index) => {
            if (item.kind === 'separator')
              return <div key={index} role="separator" className="my-1 border-t border-hairline" />
            if (item.kind === 'heading')
              return (
                <p key={index} className="px-3 pt-2 pb-1 text-xs font-semibold text-quiet">
                  {item.label}
                </p>
              )
            const isChoice = item.kind === 'choice'
            return (
              <button
                key={index}
                type="button"
                data-menu-item
                role={isChoice ? 'menuitemradio' : 'menuitem'}
                aria-checked={isChoice ? item.isChosen : undefined}
                tabIndex={-1}
                disabled={!isChoice && item.isDisabled}
                className={classNames(
                  'flex w-full items-center gap-2.5 px-3 py-2 text-left whitespace-nowrap -outline-offset-2 hover:bg-steel-soft focus:bg-steel-soft disabled:opacity-50',
                  !isChoice && item.isDangerous && 'text-bad',
                )}
                onClick={() => {
                  // Focus returns first, so that a dialog opened by the action gives it back to the button.
                  close()
                  item.onSelect()
                }}
              >
                {isChoice ? (
                  <Icon name="check" className={`size-4 ${item.isChosen ? '' : 'invisible'}`} />
                ) : (
                  item.icon && <Icon name={item.icon} />
                )}
                {item.label}
              </button>
            )
          })}
        </div>
      )}
    </div>
  )
}
