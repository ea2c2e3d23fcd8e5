/** News that a list of the workspace changed, for pages that have no layout open. */
import type { ServerToClientEvents } from '@shared/protocol/realtime'
import { openSocket } from './socket-connection'

export type WorkspaceChange = Parameters<ServerToClientEvents['workspace:changed']>[0]['what']

const ALL_CHANGES: readonly WorkspaceChange[] = ['layouts', 'releases', 'people']

export function followWorkspace(workspaceId: string, onChange: (what: WorkspaceChange) => void): () => void {
  const socket = openSocket()
  let hasMissedNews = false
  socket.on('connect', () => {
    if (hasMissedNews) ALL_CHANGES.forEach(onChange)
    hasMissedNews = false
  })
  socket.on('disconnect', (reason) => {
    hasMissedNews = true
    // Cut by the server: the person may have been signed out or removed. Asking the server finds out.
    if (reason === 'io server disconnect') onChange('people')
  })
  socket.on('workspace:changed', (message) => {
    if (message.workspaceId === workspaceId) onChange(message.what)
  })
  return () => {
    socket.removeAllListeners()
    socket.disconnect()
  }
}
