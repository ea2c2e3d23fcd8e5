/**
 * What waits for an answer: kept in the outbox before it is sent, sent in order, sent again after
 * a break with the same number. Knows nothing of documents.
 */
import type { SubmitOutcome } from '@shared/protocol/realtime'
import type { PendingEdit } from '@/stores/layout-state'
import type { ClientClock } from './client-clock'
import type { Outbox, OutboxRecord } from './outbox'

export interface EditQueueParts {
  outbox: Outbox
  clock: ClientClock
  /** Oldest first; the queue sends from this list. */
  pending: () => readonly PendingEdit[]
  /** False while there is no line that would carry it. */
  send: (edit: PendingEdit) => boolean
  onStorageFailure: () => void
  /** An answer is overdue although the line looks open. */
  onSilence: () => void
}

/** Enough to keep a slow line busy; the rest waits here, where it can still be shown and kept. */
const MAX_IN_FLIGHT = 40
const ANSWER_TIMEOUT_MS = 15_000
const FIRST_RETRY_MS = 250
const LAST_RETRY_MS = 5_000

export class EditQueue {
  readonly #kept = new Set<string>()
  readonly #inFlight = new Set<string>()
  #retryMs = FIRST_RETRY_MS
  #cancelRetry: (() => void) | null = null
  #cancelWatch: (() => void) | null = null

  constructor(private readonly parts: EditQueueParts) {}

  /** Keeps it first: what is sent and then lost with the tab could not be told from what never was. */
  keep(record: OutboxRecord): void {
    this.parts.outbox
      .put(record)
      .catch(() => this.parts.onStorageFailure())
      .finally(() => {
        this.#kept.add(record.editId)
        this.pump()
      })
  }

  /** It came from the outbox and is still there. */
  markKept(editId: string): void {
    this.#kept.add(editId)
  }

  /** Answered for good. */
  forget(editId: string): void {
    this.#kept.delete(editId)
    this.#inFlight.delete(editId)
    if (this.#inFlight.size === 0) this.#stopWatching()
    this.parts.outbox.remove(editId).catch(() => this.parts.onStorageFailure())
  }

  /** A refused edit stays in the outbox as such, until its author has seen it. */
  refuse(record: OutboxRecord): void {
    this.#inFlight.delete(record.editId)
    this.parts.outbox.put(record).catch(() => this.parts.onStorageFailure())
  }

  pump(): void {
    if (this.#cancelRetry) return
    for (const edit of this.parts.pending()) {
      if (this.#inFlight.has(edit.editId)) continue
      // In order: one that is not kept yet holds up those after it.
      if (!this.#kept.has(edit.editId) || this.#inFlight.size >= MAX_IN_FLIGHT) break
      this.#inFlight.add(edit.editId)
      if (this.parts.send(edit)) continue
      this.#inFlight.delete(edit.editId)
      break
    }
    if (this.#inFlight.size > 0) this.#watch()
  }

  /** An answer came that is not about "later". */
  onProgress(): void {
    this.#retryMs = FIRST_RETRY_MS
    this.#stopWatching()
    if (this.#inFlight.size > 0) this.#watch()
  }

  /** "Not now": everything from the first unanswered one goes again, after a while. */
  onPostponed(): void {
    this.#inFlight.clear()
    this.#stopWatching()
    if (this.#cancelRetry) return
    this.#cancelRetry = this.parts.clock.after(this.#retryMs, () => {
      this.#cancelRetry = null
      this.pump()
    })
    this.#retryMs = Math.min(this.#retryMs * 2, LAST_RETRY_MS)
  }

  /** The line broke: no answer to what was sent on it will count. */
  onLineClosed(): void {
    this.#inFlight.clear()
    this.#stopWatching()
    this.#cancelRetry?.()
    this.#cancelRetry = null
  }

  #watch(): void {
    this.#cancelWatch ??= this.parts.clock.after(ANSWER_TIMEOUT_MS, () => {
      this.#cancelWatch = null
      this.parts.onSilence()
    })
  }

  #stopWatching(): void {
    this.#cancelWatch?.()
    this.#cancelWatch = null
  }
}

/** Answers that say nothing about the edit itself. */
export function isPostponed(outcome: SubmitOutcome): boolean {
  if (outcome.outcome !== 'rejected') return false
  switch (outcome.reason) {
    case 'rateLimited':
    case 'unavailable':
    case 'notJoined':
      return true
    case 'frozen':
    case 'forbidden':
    case 'invalid':
    case 'tooLarge':
    case 'signedOut':
    case 'protocolVersion':
    case 'notFound':
      return false
  }
}
