/**
 * One user action as one object: toolbar, context menu, keyboard and help all use the same. What an
 * action needs is read when it is used, so nothing has to be passed around.
 */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { LayoutSession } from '@/sync/layout-session'
import type { ToolDriver } from '../tool-driver'
import type { ToolId } from '../tools/tool'

export interface ActionContext {
  session: LayoutSession
  driver: ToolDriver
  document: LayoutDocument
  selectedIds: readonly string[]
  canEdit: boolean
  canUndo: boolean
  canRedo: boolean
  toolId: ToolId
  /** Opens the list of shortcuts. */
  showHelp: () => void
}

export interface KeyChord {
  /** `event.key`, letters in lower case. */
  key: string
  control?: boolean
  shift?: boolean
  alt?: boolean
}

export type ActionGroup = 'Tools' | 'Edit' | 'Parts' | 'View'

export interface EditorAction {
  id: string
  label: string
  group: ActionGroup
  /** The first one is shown beside the label. */
  chords: readonly KeyChord[]
  isAvailable: (context: ActionContext) => boolean
  perform: (context: ActionContext) => void
}

const KEY_WORDS: Record<string, string> = {
  delete: 'Del',
  backspace: 'Backspace',
  escape: 'Esc',
  arrowleft: '←',
  arrowright: '→',
  ' ': 'Space',
}

/** "Ctrl+Shift+Z". */
export function chordText(chord: KeyChord): string {
  const key = KEY_WORDS[chord.key] ?? (chord.key.length === 1 ? chord.key.toUpperCase() : chord.key)
  return [chord.control && 'Ctrl', chord.alt && 'Alt', chord.shift && 'Shift', key].filter(Boolean).join('+')
}

type KeyPress = Pick<KeyboardEvent, 'key' | 'ctrlKey' | 'metaKey' | 'shiftKey' | 'altKey'>

/** Signs such as + and ? need Shift on some keyboards and not on others, so Shift counts for letters and named keys only. */
const isSign = (key: string) => key.length === 1 && !/[a-z0-9]/.test(key)

export function matchesChord(event: KeyPress, chord: KeyChord): boolean {
  const key = event.key.toLowerCase()
  return (
    key === chord.key &&
    (event.ctrlKey || event.metaKey) === (chord.control ?? false) &&
    event.altKey === (chord.alt ?? false) &&
    (isSign(key) || event.shiftKey === (chord.shift ?? false))
  )
}
