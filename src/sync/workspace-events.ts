/** Lists of a workspace change while somebody looks at them: one socket for all who want to know. */
import type { ServerToClientEvents } from '@shared/protocol/realtime'
import { openSocket, type RealtimeClientSocket } from './socket-connection'

type WorkspaceChange = Parameters<ServerToClientEvents['workspace:changed']>[0]
type Listener = (change: WorkspaceChange) => void

const listeners = new Set<Listener>()
let socket: RealtimeClientSocket | null = null

/** Returns a function that stops listening. Missing a message does no harm: lists are fetched on showing too. */
export function followWorkspaces(listener: Listener): () => void {
  listeners.add(listener)
  if (!socket) {
    socket = openSocket()
    socket.on('workspace:changed', (change) => {
      for (const each of listeners) each(change)
    })
  }
  return () => {
    listeners.delete(listener)
    if (listeners.size > 0) return
    socket?.disconnect()
    socket = null
  }
}
