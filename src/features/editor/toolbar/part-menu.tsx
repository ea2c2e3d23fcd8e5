/** The menu of a part, at the pointer. The keyboard reaches the same actions through the outline and their shortcuts. */
import { useEffect, useRef } from 'react'
import { chordText } from '../actions/action'
import { actionById, PART_MENU_IDS } from '../actions/all-actions'
import { useBenchActions } from '../bench-actions'
import { useViewStore } from '../view-store'

const MENU_WIDTH_PX = 210
const MENU_HEIGHT_PX = 230

export function PartMenu({ place, onClose }: { place: { xPx: number; yPx: number }; onClose: () => void }) {
  const menu = useRef<HTMLDivElement>(null)
  const { run, context } = useBenchActions()
  const widthPx = useViewStore((state) => state.widthPx)
  const heightPx = useViewStore((state) => state.heightPx)
  const now = context()
  const items = PART_MENU_IDS.map((id) => actionById(id)).filter((action) => now && action.isAvailable(now))

  useEffect(() => {
    const opener = document.activeElement
    menu.current?.querySelector<HTMLElement>('[role=menuitem]')?.focus()
    const onPointerDown = (event: PointerEvent) => {
      if (event.target instanceof Node && !menu.current?.contains(event.target)) onClose()
    }
    document.addEventListener('pointerdown', onPointerDown)
    return () => {
      document.removeEventListener('pointerdown', onPointerDown)
      if (opener instanceof HTMLElement) opener.focus({ preventScroll: true })
    }
  }, [onClose])

  const onKeyDown = (event: React.KeyboardEvent) => {
    const entries = [...(menu.current?.querySelectorAll<HTMLElement>('[role=menuitem]') ?? [])]
    const index = entries.indexOf(document.activeElement as HTMLElement)
    if (event.key === 'Escape' || event.key === 'Tab') onClose()
    else if (event.key === 'ArrowDown') entries[(index + 1) % entries.length]?.focus()
    else if (event.key === 'ArrowUp') entries[(index - 1 + entries.length) % entries.length]?.focus()
    else return
    event.preventDefault()
    event.stopPropagation()
  }

  if (items.length === 0) return null
  return (
    <div
      ref={menu}
      role="menu"
      aria-label="Part"
      className="absolute z-30 rounded-md border border-hairline bg-card py-1 text-sm text-ink shadow-lg"
      style={{
        width: MENU_WIDTH_PX,
        left: Math.max(4, Math.min(place.xPx, widthPx - MENU_WIDTH_PX - 4)),
        top: Math.max(4, Math.min(place.yPx, heightPx - MENU_HEIGHT_PX)),
      }}
      onKeyDown={onKeyDown}
    >
      {items.map((action) => {
        const [chord] = action.chords
        return (
          <button
            key={action.id}
            type="button"
            role="menuitem"
            tabIndex={-1}
            className={`flex w-full items-center justify-between gap-4 px-3 py-1.5 text-left -outline-offset-2 hover:bg-steel-soft focus:bg-steel-soft ${
              action.id === 'delete' ? 'text-bad' : ''
            }`}
            onClick={() => {
              onClose()
              run(action)
            }}
          >
            {action.label}
            {chord && <span className="text-xs text-quiet">{chordText(chord)}</span>}
          </button>
        )
      })}
    </div>
  )
}
