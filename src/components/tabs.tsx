import { type KeyboardEvent, type ReactNode, useId, useRef } from 'react'

export interface TabItem {
  id: string
  label: ReactNode
}

/**
 * Tabs and the panel of the chosen one. Arrow keys move and choose at once; Home and End jump.
 * The caller owns the choice, so that it can live in the address.
 */
export function Tabs({
  label,
  items,
  selectedId,
  onSelect,
  children,
  panelClassName = '',
}: {
  label: string
  items: readonly TabItem[]
  selectedId: string
  onSelect: (id: string) => void
  /** The panel of the selected tab. */
  children: ReactNode
  panelClassName?: string
}) {
  const baseId = useId()
  const list = useRef<HTMLDivElement>(null)

  const onKeyDown = (event: KeyboardEvent) => {
    const index = items.findIndex((item) => item.id === selectedId)
    const target =
      event.key === 'ArrowRight'
        ? (index + 1) % items.length
        : event.key === 'ArrowLeft'
          ? (index - 1 + items.length) % items.length
          : event.key === 'Home'
            ? 0
            : event.key === 'End'
              ? items.length - 1
              : -1
    const item = items[target]
    if (!item) return
    event.preventDefault()
    event.stopPropagation()
    onSelect(item.id)
    list.current?.querySelectorAll<HTMLElement>('[role=tab]')[target]?.focus()
  }

  return (
    <>
      <div
        ref={list}
        role="tablist"
        aria-label={label}
        className="flex gap-5 overflow-x-auto border-b border-hairline px-4"
        onKeyDown={onKeyDown}
      >
        {items.map((item) => {
          const isSelected = item.id === selectedId
          return (
            <button
              key={item.id}
              type="button"
              role="tab"
              id={`${baseId}-${item.id}`}
              aria-selected={isSelected}
              aria-controls={`${baseId}-panel`}
              tabIndex={isSelected ? 0 : -1}
              className={`-mb-px border-b-2 py-2 text-sm font-semibold whitespace-nowrap -outline-offset-2 ${
                isSelected ? 'border-straw text-ink' : 'border-transparent text-quiet hover:text-ink'
              }`}
              onClick={() => onSelect(item.id)}
            >
              {item.label}
            </button>
          )
        })}
      </div>
      <div
        role="tabpanel"
        id={`${baseId}-panel`}
        aria-labelledby={`${baseId}-${selectedId}`}
        className={panelClassName}
      >
        {children}
      </div>
    </>
  )
}
