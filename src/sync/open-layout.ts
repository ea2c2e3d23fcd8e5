/** Opens a layout in this browser: real line, real storage, the one store. */
import { useLayoutStore } from '@/stores/layout-store'
import { browserClock } from './client-clock'
import { createIndexedDbOutbox } from './indexed-db-outbox'
import type { LayoutSession } from './layout-session'
import { LayoutSync } from './layout-sync'
import { createMemoryOutbox } from './memory-outbox'
import type { Outbox } from './outbox'
import { socketConnection } from './socket-connection'

/** Also those whose page was left while something still waited. */
const running = new Set<LayoutSync>()
let outbox: Outbox | null = null

export function openLayout(layoutId: string): LayoutSession {
  outbox ??= typeof indexedDB === 'undefined' ? createMemoryOutbox() : createIndexedDbOutbox()
  const sync: LayoutSync = new LayoutSync({
    layoutId,
    store: useLayoutStore,
    openConnection: socketConnection(),
    outbox,
    clock: browserClock,
    onEnd: () => {
      running.delete(sync)
      if (running.size === 0) stopWarning()
    },
  })
  running.add(sync)
  globalThis.addEventListener('beforeunload', warnWhilePending)
  void sync.start()
  return sync
}

/** Asks before leaving only while something waits: a question that comes always is answered blindly. */
function warnWhilePending(event: BeforeUnloadEvent): void {
  if ([...running].some((sync) => sync.pendingCount > 0)) event.preventDefault()
}

function stopWarning(): void {
  globalThis.removeEventListener('beforeunload', warnWhilePending)
}
