/** Sockets on the HTTP server: who may connect, what each event does, who is cut off and when. */
import type { Server as HttpServer } from 'node:http'
import type { Logger } from 'pino'
import { Server } from 'socket.io'
import { MAX_MESSAGE_BYTES, type RejectReason } from '@shared/protocol/realtime'
import type { Accounts } from '../accounts/accounts'
import type { Principal } from '../accounts/principal'
import type { Revocation } from '../accounts/revocation'
import { isSameSite, type Site } from '../http/origin-check'
import type { LayoutRooms } from './layout-rooms'
import { handleEvents } from './socket-events'
import { createSocketLimits } from './socket-limits'
import { followWorkspaces, socketTransport, type RealtimeServer, type RealtimeSocket } from './socket-server'

export interface RealtimeParts {
  rooms: LayoutRooms
  accounts: Pick<Accounts, 'getPrincipal' | 'recheck' | 'onRevoked'>
  site: Site
  logger: Pick<Logger, 'error' | 'warn'>
}

export interface Realtime {
  /** Ends the sockets; the HTTP server is its owner's to close. */
  close(): void
}

/** A tab that vanished without a word is gone for the others after 15 s, not after 45. */
const PING_INTERVAL_MS = 5_000
const PING_TIMEOUT_MS = 10_000
/** Sessions also end by the clock, and nobody announces that. */
const RECHECK_INTERVAL_MS = 60_000
/** Somebody with forty tabs is a script. */
const MAX_SOCKETS_PER_PERSON = 40

export function attachRealtime(httpServer: HttpServer, parts: RealtimeParts): Realtime {
  const { rooms, accounts, site, logger } = parts
  const io: RealtimeServer = new Server(httpServer, {
    transports: ['websocket'],
    serveClient: false,
    pingInterval: PING_INTERVAL_MS,
    pingTimeout: PING_TIMEOUT_MS,
    maxHttpBufferSize: MAX_MESSAGE_BYTES,
    // Browsers let any page open a WebSocket to us, cookies included: only this check stops it.
    allowRequest: (request, answer) => answer(null, isSameSite(request.headers, site)),
    // connectionStateRecovery stays off: our own revisions catch up further, and recovery would pass by io.use.
  })
  const limits = createSocketLimits()
  rooms.connect(socketTransport(io))

  io.use((socket, next) => {
    admit(socket).then(
      (refusal) => next(refusal ?? undefined),
      (error: unknown) => {
        logger.error({ err: error }, 'A socket could not be admitted')
        next(new ConnectionRefused('unavailable'))
      },
    )
  })

  async function admit(socket: RealtimeSocket): Promise<ConnectionRefused | null> {
    const principal = await accounts.getPrincipal(socket.handshake.headers)
    if (!principal) return new ConnectionRefused('signedOut')
    if (socketsOf(principal.userId).length >= MAX_SOCKETS_PER_PERSON)
      return new ConnectionRefused('rateLimited')
    socket.data.principal = principal
    return null
  }

  io.on('connection', (socket) => {
    followWorkspaces(socket)
    handleEvents(socket, { rooms, limits, logger })
    socket.on('disconnect', () => {
      rooms.leave(socket.id)
      limits.forget(socket.id)
    })
    // Between the handshake's query and now the session may have ended.
    recheck(socket)
  })

  function socketsOf(userId: string): RealtimeSocket[] {
    return [...io.sockets.sockets.values()].filter((socket) => socket.data.principal.userId === userId)
  }

  function recheck(socket: RealtimeSocket): void {
    const principal = accounts.recheck(socket.data.principal)
    if (principal) change(socket, principal)
    else cut(socket)
  }

  function change(socket: RealtimeSocket, principal: Principal): void {
    const before = socket.data.principal
    socket.data.principal = principal
    if (isSamePerson(before, principal)) return
    followWorkspaces(socket)
    rooms.changePrincipal(socket.id, principal)
  }

  function cut(socket: RealtimeSocket): void {
    rooms.revoke(socket.id, 'signedOut')
    socket.disconnect(true)
  }

  function onRevoked(revocation: Revocation): void {
    // Before sockets leave its audience: the person concerned shall hear it too.
    if (revocation.kind !== 'session') rooms.announceWorkspace(revocation.workspaceId, 'people')
    for (const socket of socketsOf(revocation.userId)) {
      if (revocation.kind !== 'session') recheck(socket)
      else if (socket.data.principal.sessionId === revocation.sessionId) cut(socket)
    }
  }

  const stopListening = accounts.onRevoked(onRevoked)
  const rechecking = setInterval(() => {
    for (const socket of io.sockets.sockets.values()) recheck(socket)
  }, RECHECK_INTERVAL_MS)
  rechecking.unref()

  return {
    close() {
      clearInterval(rechecking)
      stopListening()
      rooms.close()
      // Not disconnectSockets: that tells clients to stay away, and after a restart they shall come back.
      io.engine.close()
    },
  }
}

/** Reaches the client as `connect_error` with the reason in its data. */
class ConnectionRefused extends Error {
  readonly data: { reason: RejectReason }

  constructor(reason: RejectReason) {
    super(reason)
    this.data = { reason }
  }
}

function isSamePerson(before: Principal, after: Principal): boolean {
  if (before.name !== after.name || before.roles.size !== after.roles.size) return false
  return [...after.roles].every(([workspaceId, role]) => before.roles.get(workspaceId) === role)
}
