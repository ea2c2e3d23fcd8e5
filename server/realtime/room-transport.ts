/** How a room speaks. The product speaks through socket.io, tests through queues flushed by hand. */
import type { ServerToClientEvents } from '@shared/protocol/realtime'

export type ServerEvent = keyof ServerToClientEvents
export type MessageOf<Event extends ServerEvent> = Parameters<ServerToClientEvents[Event]>[0]

export interface RoomTransport {
  /** Everyone in a layout, except one connection. Encoded once. */
  broadcast<Event extends ServerEvent>(
    layoutId: string,
    event: Event,
    message: MessageOf<Event>,
    exceptConnectionId?: string,
  ): void
  /** Like `broadcast`, but may be lost when a line is slow: only for what the next message replaces. */
  broadcastVolatile<Event extends ServerEvent>(
    layoutId: string,
    event: Event,
    message: MessageOf<Event>,
  ): void
  send<Event extends ServerEvent>(connectionId: string, event: Event, message: MessageOf<Event>): void
  /** Everyone who belongs to a workspace and has a page open. */
  sendToWorkspace(workspaceId: string, message: MessageOf<'workspace:changed'>): void
  /** Membership of a layout's audience; takes effect in the same turn. */
  enter(connectionId: string, layoutId: string): void
  leave(connectionId: string, layoutId: string): void
}

/** Before the sockets are attached nobody listens. */
export const SILENT_TRANSPORT: RoomTransport = {
  broadcast: () => undefined,
  broadcastVolatile: () => undefined,
  send: () => undefined,
  sendToWorkspace: () => undefined,
  enter: () => undefined,
  leave: () => undefined,
}
