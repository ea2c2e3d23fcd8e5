/** The line over socket.io. Its own buffering is not used: only what is asked for while open is sent. */
import { io, type Socket } from 'socket.io-client'
import type { ClientToServerEvents, RejectReason, ServerToClientEvents } from '@shared/protocol/realtime'
import type { ConnectionHandlers, IncomingEvents, OpenConnection } from './connection'

export type RealtimeClientSocket = Socket<ServerToClientEvents, ClientToServerEvents>

const RECONNECT_MIN_MS = 250
const RECONNECT_MAX_MS = 5_000
const HANDSHAKE_TIMEOUT_MS = 8_000
/** The library does not try again by itself when the server closed the socket or refused it for now. */
const RETRY_MS = 2_000

const EVENTS: readonly (keyof IncomingEvents)[] = [
  'edit:accepted',
  'edit:dropped',
  'access:changed',
  'access:revoked',
  'presence:changed',
]

/** Each line has a socket of its own: a connection can be in one layout at a time. */
export function openSocket(address?: string, extraHeaders?: Record<string, string>): RealtimeClientSocket {
  const options = {
    transports: ['websocket'],
    forceNew: true,
    reconnectionDelay: RECONNECT_MIN_MS,
    reconnectionDelayMax: RECONNECT_MAX_MS,
    timeout: HANDSHAKE_TIMEOUT_MS,
    extraHeaders,
  }
  return address === undefined ? io(options) : io(address, options)
}

export function socketConnection(open: () => RealtimeClientSocket = openSocket): OpenConnection {
  return (handlers) => {
    const socket = open()
    const stopFollowing = followSocket(socket, handlers)
    const whenOpen = (work: () => void) => {
      if (socket.connected) work()
    }
    return {
      join: (request, reply) => whenOpen(() => socket.emit('layout:join', request, reply)),
      submit: (request, reply) => whenOpen(() => socket.emit('edit:submit', request, reply)),
      updatePresence: (update) => whenOpen(() => socket.volatile.emit('presence:update', update)),
      leave: (layoutId) => whenOpen(() => socket.emit('layout:leave', { layoutId })),
      reopen: () => {
        socket.disconnect().connect()
      },
      close: () => {
        stopFollowing()
        socket.disconnect()
      },
    }
  }
}

function followSocket(socket: RealtimeClientSocket, handlers: ConnectionHandlers): () => void {
  let connectionId: string | null = null
  let retry: ReturnType<typeof setTimeout> | undefined
  const connectLater = () => {
    clearTimeout(retry)
    retry = setTimeout(() => socket.connect(), RETRY_MS)
  }

  socket.on('connect', () => {
    connectionId = socket.id ?? null
    if (connectionId !== null) handlers.onOpen(connectionId)
  })
  socket.on('disconnect', (reason) => {
    if (connectionId !== null) handlers.onClose(connectionId)
    connectionId = null
    if (reason === 'io server disconnect') connectLater()
  })
  socket.on('connect_error', (error) => {
    const reason = reasonOf(error)
    if (reason === 'signedOut' || reason === 'rateLimited') {
      handlers.onRefused(reason)
      // The library's own attempts go on only after errors of the transport.
      return
    }
    if (!socket.active) connectLater()
  })
  for (const event of EVENTS) {
    socket.on(event, ((message: never) => {
      if (connectionId !== null) handlers.onMessage(connectionId, { event, message })
    }) as never)
  }
  return () => {
    clearTimeout(retry)
    socket.removeAllListeners()
  }
}

function reasonOf(error: Error): RejectReason | null {
  const data = 'data' in error ? error.data : null
  if (typeof data !== 'object' || data === null || !('reason' in data)) return null
  return data.reason as RejectReason
}
