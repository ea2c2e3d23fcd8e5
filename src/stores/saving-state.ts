import type { LayoutState } from './layout-state'

/**
 * What the chip says. `saved` is said only when nothing waits and the line is open.
 * - `saving`: on its way.
 * - `reconnecting`: nothing waits, but what others do does not arrive.
 * - `notSaved`: something waits and the line is down, or the server refused it and it is kept here.
 * - `readOnly`: nothing waits and nothing can be edited.
 */
export type SavingState = 'saved' | 'saving' | 'reconnecting' | 'notSaved' | 'readOnly'

export function savingState(
  state: Pick<LayoutState, 'pending' | 'refusedEdits' | 'connection' | 'access' | 'confirmed'>,
): SavingState {
  const isConnected = state.connection === 'connected'
  if (state.pending.length > 0) return isConnected ? 'saving' : 'notSaved'
  if (state.refusedEdits.length > 0) return 'notSaved'
  if (state.connection === 'refused') return 'readOnly'
  if (!isConnected || state.confirmed === null) return 'reconnecting'
  return state.access?.canEdit === true ? 'saved' : 'readOnly'
}
