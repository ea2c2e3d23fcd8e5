/** The types of our sockets and the transport that rooms speak through. */
import type { Server, Socket } from 'socket.io'
import type { ClientToServerEvents, ServerToClientEvents } from '@shared/protocol/realtime'
import type { Principal } from '../accounts/principal'
import type { RoomTransport } from './room-transport'

export interface SocketData {
  principal: Principal
}

type NoEvents = Record<string, never>
export type RealtimeServer = Server<ClientToServerEvents, ServerToClientEvents, NoEvents, SocketData>
export type RealtimeSocket = Socket<ClientToServerEvents, ServerToClientEvents, NoEvents, SocketData>

const layoutAudience = (layoutId: string) => `layout:${layoutId}`
const workspaceAudience = (workspaceId: string) => `workspace:${workspaceId}`

export function socketTransport(io: RealtimeServer): RoomTransport {
  return {
    broadcast(layoutId, event, message, exceptConnectionId) {
      const audience = io.to(layoutAudience(layoutId))
      const others = exceptConnectionId === undefined ? audience : audience.except(exceptConnectionId)
      others.emit(event, ...asArguments(message))
    },
    broadcastVolatile(layoutId, event, message) {
      io.to(layoutAudience(layoutId)).volatile.emit(event, ...asArguments(message))
    },
    send(connectionId, event, message) {
      io.to(connectionId).emit(event, ...asArguments(message))
    },
    sendToWorkspace(workspaceId, message) {
      io.to(workspaceAudience(workspaceId)).emit('workspace:changed', message)
    },
    // With the adapter of one process both take effect at once.
    enter(connectionId, layoutId) {
      void io.sockets.sockets.get(connectionId)?.join(layoutAudience(layoutId))
    },
    leave(connectionId, layoutId) {
      void io.sockets.sockets.get(connectionId)?.leave(layoutAudience(layoutId))
    },
  }
}

/** One workspace audience for each workspace the person belongs to now. */
export function followWorkspaces(socket: RealtimeSocket): void {
  const wanted = new Set([...socket.data.principal.roles.keys()].map(workspaceAudience))
  for (const audience of socket.rooms) {
    if (audience.startsWith(workspaceAudience('')) && !wanted.has(audience)) void socket.leave(audience)
  }
  for (const audience of wanted) void socket.join(audience)
}

/** socket.io types the arguments of a generic event as a tuple it cannot resolve; ours always have one. */
function asArguments<Message>(message: Message): never {
  return [message] as never
}
