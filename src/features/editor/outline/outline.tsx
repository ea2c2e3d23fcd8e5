/**
 * The drawing as a list: every part with its place and result, for the keyboard and for screen
 * readers. Up and down walk and select, left and right shift the part, Enter opens the inspector,
 * Delete removes. It is always in the page; collapsed, it shows itself as soon as it has the focus.
 */
import { type KeyboardEvent, type ReactNode, useDeferredValue, useRef, useState } from 'react'
import type { Operation } from '@shared/layout/operations'
import { useLayoutSession } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'
import { useSelectionStore } from '@/stores/selection-store'
import { actionById } from '../actions/all-actions'
import { nudgeStepMm } from '../actions/nudge'
import { useBenchActions } from '../bench-actions'
import { commitEdit } from '../commit-edit'
import { partExtent, partName, roundMm } from '../tools/part'
import { useViewStore } from '../view-store'
import { LiveResult } from './live-result'
import { type OutlineItem, outlineGroups } from './outline-items'
import { OutlineMark } from './outline-mark'
import { useWordsContext } from './use-words-context'

export function Outline({
  isOpen,
  onOpenInspector,
  header,
}: {
  isOpen: boolean
  onOpenInspector: () => void
  header?: ReactNode
}) {
  const list = useRef<HTMLDivElement>(null)
  const [currentId, setCurrentId] = useState<string | null>(null)
  const session = useLayoutSession()
  const { run } = useBenchActions()
  // A drag redraws the drawing at once; the list may follow when there is time.
  const document = useDeferredValue(useLayoutStore((state) => state.visible))
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  const selectedIds = useSelectionStore((state) => state.selectedIds)
  const words = useWordsContext(document)
  if (!document || !words) return null

  const groups = outlineGroups(words)
  const items = groups.flatMap((group) => group.items)
  const current =
    items.find(({ id }) => id === currentId) ??
    items.find(({ partId }) => selectedIds.includes(partId)) ??
    items[0]

  const goTo = (item: OutlineItem | undefined) => {
    if (!item) return
    setCurrentId(item.id)
    useSelectionStore.getState().select([item.partId])
    const extent = partExtent(document, item.partId)
    if (extent) useViewStore.getState().reveal(extent.leftMm, extent.rightMm)
    const entries = list.current?.querySelectorAll<HTMLElement>('[data-item]') ?? []
    for (const entry of entries) if (entry.dataset['item'] === item.id) entry.focus()
  }

  const changeLoad = (item: OutlineItem, event: KeyboardEvent): boolean => {
    if (!item.load || !canEdit) return false
    const { loadCaseId, load } = item.load
    const target = { kind: 'load' as const, loadCaseId, id: load.id }
    const name = partName(document, load.hub)
    if (event.key === 'Delete' || event.key === 'Backspace') {
      return commitEdit(session, `Delete load of ${name}`, [{ type: 'remove', target }])
    }
    if (event.key !== 'ArrowLeft' && event.key !== 'ArrowRight') return false
    const mmPerPx = 1 / useViewStore.getState().view.pxPerMm
    const step = nudgeStepMm({ shift: event.shiftKey, alt: event.altKey }, mmPerPx)
    const value = roundMm(load.stationMm + (event.key === 'ArrowLeft' ? -step : step))
    const operation: Operation = { type: 'set', target, field: 'stationMm', before: load.stationMm, value }
    return commitEdit(session, `Move load of ${name}`, [operation])
  }

  const onKeyDown = (event: KeyboardEvent) => {
    if (!current) return
    const index = items.indexOf(current)
    if (event.key === 'ArrowDown') goTo(items[Math.min(index + 1, items.length - 1)])
    else if (event.key === 'ArrowUp') goTo(items[Math.max(index - 1, 0)])
    else if (event.key === 'Home') goTo(items[0])
    else if (event.key === 'End') goTo(items.at(-1))
    else if (event.key === 'Enter') {
      useSelectionStore.getState().select([current.partId])
      onOpenInspector()
    } else if (event.key === ' ') useSelectionStore.getState().toggle(current.partId)
    else if (!changeLoad(current, event)) return
    event.preventDefault()
    event.stopPropagation()
  }

  return (
    <section
      aria-label="Outline"
      className={
        isOpen
          ? 'flex min-h-0 w-60 shrink-0 flex-col border-r border-hairline bg-card'
          : 'sr-only focus-within:not-sr-only focus-within:absolute! focus-within:inset-y-0 focus-within:left-0 focus-within:z-20 focus-within:flex focus-within:w-60 focus-within:flex-col focus-within:border-r focus-within:border-hairline focus-within:bg-card'
      }
    >
      {header}
      <div
        ref={list}
        role="listbox"
        aria-label="Parts of the layout"
        aria-multiselectable="true"
        data-own-arrows={current?.load ? '' : undefined}
        className="min-h-0 flex-1 overflow-y-auto pb-3"
        onKeyDown={onKeyDown}
      >
        {items.length === 0 && <p className="px-3 py-4 text-sm text-quiet">Nothing is on the shaft yet.</p>}
        {groups.map((group) => (
          <div key={group.label} role="group" aria-label={group.label}>
            <p aria-hidden="true" className="px-3 pt-3 pb-1 text-xs font-bold text-plum">
              {group.label}
            </p>
            {group.items.map((item) => (
              <div
                key={item.id}
                role="option"
                data-item={item.id}
                aria-selected={selectedIds.includes(item.partId)}
                aria-label={item.spoken}
                tabIndex={item === current ? 0 : -1}
                className={`flex cursor-pointer items-center gap-2 px-3 py-1 text-[13px] -outline-offset-2 ${
                  !item.load && selectedIds.includes(item.partId) ? 'bg-steel-soft' : 'hover:bg-paper'
                }`}
                onFocus={() => setCurrentId(item.id)}
                onPointerEnter={() => useSelectionStore.getState().hover(item.partId)}
                onPointerLeave={() => useSelectionStore.getState().hover(null)}
                onClick={(event) => {
                  if (event.shiftKey) useSelectionStore.getState().toggle(item.partId)
                  else goTo(item)
                }}
                onDoubleClick={onOpenInspector}
              >
                <OutlineMark verdict={item.verdict} />
                <span className="min-w-0 flex-1 truncate font-medium">{item.name}</span>
                <span className="shrink-0 text-xs text-quiet tabular-nums">{item.detail}</span>
              </div>
            ))}
          </div>
        ))}
      </div>
      {canEdit && (
        <p className="border-t border-hairline px-3 py-2 text-xs text-quiet">
          ↑ ↓ choose, ← → shift, Enter inspector, Del remove.{' '}
          <button
            type="button"
            className="font-semibold text-steel underline"
            onClick={() => run(actionById('help'))}
          >
            All keys
          </button>
        </p>
      )}
      <LiveResult words={words} />
    </section>
  )
}
