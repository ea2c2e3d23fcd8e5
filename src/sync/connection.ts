/**
 * The line to the server as the sync engine sees it. The product has one over socket.io; tests
 * have one whose queues they flush by hand. Opening again after a break is the line's own business.
 */
import type {
  JoinReply,
  JoinRequest,
  PresenceUpdate,
  RejectReason,
  ServerToClientEvents,
  SubmitOutcome,
  SubmitRequest,
} from '@shared/protocol/realtime'

export type IncomingEvents = Pick<
  ServerToClientEvents,
  'edit:accepted' | 'edit:dropped' | 'access:changed' | 'access:revoked' | 'presence:changed'
>

export type IncomingMessage = {
  [Event in keyof IncomingEvents]: { event: Event; message: Parameters<IncomingEvents[Event]>[0] }
}[keyof IncomingEvents]

/** Every call names the connection it belongs to: what an old one says late must not be taken for the new one's. */
export interface ConnectionHandlers {
  onOpen(connectionId: string): void
  onClose(connectionId: string): void
  onMessage(connectionId: string, incoming: IncomingMessage): void
  /** The server does not let us in; trying again would not help. */
  onRefused(reason: RejectReason): void
}

export interface RealtimeConnection {
  /** Answers may never come; whoever needs one waits with a clock of his own. */
  join(request: JoinRequest, reply: (answer: JoinReply) => void): void
  submit(request: SubmitRequest, reply: (outcome: SubmitOutcome) => void): void
  /** May be lost. */
  updatePresence(update: PresenceUpdate): void
  leave(layoutId: string): void
  /** The line looks open but nothing comes: break it and open a new one. */
  reopen(): void
  close(): void
}

export type OpenConnection = (handlers: ConnectionHandlers) => RealtimeConnection
