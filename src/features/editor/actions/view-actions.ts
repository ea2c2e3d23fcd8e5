/** Zoom, help, and Escape. They change nothing in the layout. */
import { partExtent } from '../tools/part'
import { useViewStore } from '../view-store'
import type { EditorAction } from './action'

const ZOOM_FACTOR = 1.25

export const VIEW_ACTIONS: readonly EditorAction[] = [
  {
    id: 'zoom-in',
    label: 'Zoom in',
    group: 'View',
    chords: [{ key: '+' }, { key: '=' }],
    isAvailable: () => true,
    perform: () => useViewStore.getState().zoom(ZOOM_FACTOR),
  },
  {
    id: 'zoom-out',
    label: 'Zoom out',
    group: 'View',
    chords: [{ key: '-' }],
    isAvailable: () => true,
    perform: () => useViewStore.getState().zoom(1 / ZOOM_FACTOR),
  },
  {
    id: 'zoom-to-whole',
    label: 'Show the whole shaft',
    group: 'View',
    chords: [{ key: '0' }],
    isAvailable: () => true,
    perform: () => useViewStore.getState().showWhole(),
  },
  {
    id: 'reveal-selection',
    label: 'Bring the selection into sight',
    group: 'View',
    chords: [{ key: '.' }],
    isAvailable: ({ selectedIds }) => selectedIds.length > 0,
    perform: ({ document, selectedIds }) => {
      const extents = selectedIds.flatMap((id) => partExtent(document, id) ?? [])
      if (extents.length === 0) return
      useViewStore
        .getState()
        .reveal(
          Math.min(...extents.map((part) => part.leftMm)),
          Math.max(...extents.map((part) => part.rightMm)),
        )
    },
  },
  {
    id: 'help',
    label: 'Keyboard shortcuts',
    group: 'View',
    chords: [{ key: '?' }],
    isAvailable: () => true,
    perform: ({ showHelp }) => showHelp(),
  },
  {
    id: 'cancel',
    label: 'Put back what is being dragged; then leave the tool; then select nothing',
    group: 'Edit',
    chords: [{ key: 'escape' }],
    isAvailable: () => true,
    perform: ({ driver }) => void driver.cancel(),
  },
]
