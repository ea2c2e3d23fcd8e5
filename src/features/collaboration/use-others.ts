/** The other windows on this layout, and the other people; one person may have several windows. */
import { useShallow } from 'zustand/react/shallow'
import { useLayoutStore } from '@/stores/layout-store'
import type { PresenceState } from '@shared/protocol/realtime'

export function useOtherWindows(): PresenceState[] {
  return useLayoutStore(
    useShallow((state) =>
      state.people.filter(({ connectionId }) => connectionId !== state.you?.connectionId),
    ),
  )
}

export interface PersonHere {
  userId: string
  name: string
  colourIndex: number
  isYou: boolean
  windows: PresenceState[]
}

/** You first, then the others by name. */
export function peopleHere(people: readonly PresenceState[], yourUserId: string | null): PersonHere[] {
  const byUser = new Map<string, PersonHere>()
  for (const window of people) {
    const known = byUser.get(window.userId)
    if (known) known.windows.push(window)
    else {
      byUser.set(window.userId, {
        userId: window.userId,
        name: window.name,
        colourIndex: window.colourIndex,
        isYou: window.userId === yourUserId,
        windows: [window],
      })
    }
  }
  return [...byUser.values()].sort(
    (a, b) => Number(b.isYou) - Number(a.isYou) || a.name.localeCompare(b.name),
  )
}
