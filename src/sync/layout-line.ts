/** The line of one layout: joins after every opening, notices silence, ignores what old connections say. */
import {
  PROTOCOL_VERSION,
  type JoinReply,
  type PresenceUpdate,
  type RejectReason,
  type SubmitOutcome,
  type SubmitRequest,
} from '@shared/protocol/realtime'
import type { ClientClock } from './client-clock'
import type { IncomingMessage, OpenConnection, RealtimeConnection } from './connection'
import { refusalWords } from './refusal-words'

export interface LayoutLineParts {
  layoutId: string
  clientId: string
  clock: ClientClock
  openConnection: OpenConnection
  /** Where the client's copy stands; null before the first answer. */
  lastSeen: () => { revision: number; epoch: string | null } | null
  onJoined: (reply: Extract<JoinReply, { ok: true }>) => void
  /** Broken, or joining again: answers to what was sent will not come. */
  onInterrupted: (isOpen: boolean) => void
  onRefused: (reason: RejectReason, message: string) => void
  onMessage: (incoming: IncomingMessage) => void
}

const JOIN_TIMEOUT_MS = 10_000
const JOIN_RETRY_MS = 1_000

export class LayoutLine {
  #connection: RealtimeConnection | null = null
  #connectionId: string | null = null
  #isJoined = false
  #cancelTimer: (() => void) | null = null

  constructor(private readonly parts: LayoutLineParts) {}

  open(): void {
    this.#connection = this.parts.openConnection({
      onOpen: (connectionId) => {
        this.#connectionId = connectionId
        this.join()
      },
      onClose: (connectionId) => {
        // The close of a replaced connection may come after the new one has opened.
        if (connectionId !== this.#connectionId) return
        this.#interrupt(null)
      },
      onMessage: (connectionId, incoming) => {
        if (connectionId === this.#connectionId && isFor(this.parts.layoutId, incoming)) {
          this.parts.onMessage(incoming)
        }
      },
      onRefused: (reason) => this.#refuse(reason, refusalWords(reason)),
    })
  }

  /** Also when already joined: the way to fetch what is missing. */
  join(): void {
    const connectionId = this.#connectionId
    if (connectionId === null) return
    this.#interrupt(connectionId)
    const lastSeen = this.parts.lastSeen()
    this.#setTimer(JOIN_TIMEOUT_MS, () => this.reopen())
    this.#connection?.join(
      {
        layoutId: this.parts.layoutId,
        clientId: this.parts.clientId,
        protocolVersion: PROTOCOL_VERSION,
        lastRevision: lastSeen?.revision ?? null,
        epoch: lastSeen?.epoch ?? null,
      },
      (answer) => {
        if (connectionId === this.#connectionId) this.#onAnswer(answer)
      },
    )
  }

  /** False while nothing would carry it. */
  submit(request: SubmitRequest, reply: (outcome: SubmitOutcome) => void): boolean {
    const connectionId = this.#connectionId
    if (!this.#isJoined || connectionId === null || !this.#connection) return false
    this.#connection.submit(request, (outcome) => {
      if (connectionId === this.#connectionId) reply(outcome)
    })
    return true
  }

  updatePresence(update: PresenceUpdate): void {
    if (this.#isJoined) this.#connection?.updatePresence(update)
  }

  reopen(): void {
    this.#connection?.reopen()
  }

  close(): void {
    const connection = this.#connection
    this.#connection = null
    this.#interrupt(null)
    connection?.leave(this.parts.layoutId)
    connection?.close()
  }

  #onAnswer(answer: JoinReply): void {
    // The answer of an earlier attempt on the same connection.
    if (this.#isJoined) return
    if (!answer.ok) {
      const isPassing = answer.reason === 'rateLimited' || answer.reason === 'unavailable'
      if (isPassing) this.#setTimer(JOIN_RETRY_MS, () => this.join())
      else this.#refuse(answer.reason, answer.message)
      return
    }
    this.#cancelTimer?.()
    this.#isJoined = true
    this.parts.onJoined(answer)
  }

  #refuse(reason: RejectReason, message: string): void {
    this.#interrupt(null)
    this.parts.onRefused(reason, message)
  }

  #interrupt(connectionId: string | null): void {
    this.#connectionId = connectionId
    this.#isJoined = false
    this.#cancelTimer?.()
    this.parts.onInterrupted(connectionId !== null)
  }

  #setTimer(delayMs: number, work: () => void): void {
    this.#cancelTimer?.()
    const cancel = this.parts.clock.after(delayMs, () => {
      this.#cancelTimer = null
      work()
    })
    this.#cancelTimer = () => {
      this.#cancelTimer = null
      cancel()
    }
  }
}

function isFor(layoutId: string, { message }: IncomingMessage): boolean {
  return message.layoutId === layoutId
}
