import { PRESENCE_INTERVAL_MS, type PresenceUpdate } from '@shared/protocol/realtime'
import type { ClientClock } from './client-clock'

type OwnPresence = Omit<PresenceUpdate, 'layoutId'>

const NOTHING: OwnPresence = { cursor: null, selection: [], editing: null, ghost: null }
/** The schema of the message allows no more. */
const MAX_SELECTION = 50

/** Sends what this person points at, at most once an interval and always the newest. */
export class PresenceSender {
  #own: OwnPresence = NOTHING
  #cancel: (() => void) | null = null

  constructor(
    private readonly layoutId: string,
    private readonly clock: ClientClock,
    private readonly send: (update: PresenceUpdate) => void,
  ) {}

  update(partial: Partial<OwnPresence>): void {
    this.#own = { ...this.#own, ...partial }
    this.#cancel ??= this.clock.after(PRESENCE_INTERVAL_MS, () => {
      this.#cancel = null
      this.sendNow()
    })
  }

  sendNow(): void {
    const { selection, ...own } = this.#own
    this.send({ layoutId: this.layoutId, ...own, selection: selection.slice(0, MAX_SELECTION) })
  }

  stop(): void {
    this.#cancel?.()
    this.#cancel = null
  }
}
