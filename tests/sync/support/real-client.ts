/** A person with the real client and a real socket to a real server. */
import { newClientId } from '@shared/layout/new-ids'
import type { ClientToServerEvents, JoinReply, SubmitOutcome } from '@shared/protocol/realtime'
import type { LayoutState } from '@/stores/layout-state'
import { createLayoutStore, type LayoutStore } from '@/stores/layout-store'
import { browserClock } from '@/sync/client-clock'
import { LayoutSync } from '@/sync/layout-sync'
import { createMemoryOutbox } from '@/sync/memory-outbox'
import { openSocket, socketConnection, type RealtimeClientSocket } from '@/sync/socket-connection'

/** What a client needs to know of a server, whether it runs in this process or in one of its own. */
export interface Reachable {
  readonly url: string
  readonly server: { readonly port: number }
}

export interface RealClient {
  session: LayoutSync
  store: LayoutStore
  readonly state: LayoutState
}

export function socketFor(app: Reachable, cookie: string, origin = app.url): RealtimeClientSocket {
  return openSocket(`http://127.0.0.1:${app.server.port}`, { cookie, origin })
}

export async function openClient(
  app: Reachable,
  person: { cookie: string },
  layoutId: string,
): Promise<RealClient> {
  const store = createLayoutStore()
  const session = new LayoutSync({
    layoutId,
    store,
    outbox: createMemoryOutbox(),
    clock: browserClock,
    openConnection: socketConnection(() => socketFor(app, person.cookie)),
  })
  await session.start()
  const client: RealClient = {
    session,
    store,
    get state() {
      return store.getState()
    },
  }
  await until(() => client.state.visible !== null || client.state.connection === 'refused')
  return client
}

/** Waits for something that happens soon; says so when it does not. */
export async function until(
  isSo: () => boolean,
  timeoutMs = 5_000,
  what = 'It did not happen in time',
): Promise<void> {
  const end = Date.now() + timeoutMs
  while (!isSo()) {
    if (Date.now() > end) throw new Error(what)
    await new Promise((resolve) => setTimeout(resolve, 5))
  }
}

/** A socket without our client on top, to say what our client never would. */
export class RawSocket {
  readonly clientId = newClientId()

  constructor(readonly socket: RealtimeClientSocket) {}

  static async connect(app: Reachable, cookie: string): Promise<RawSocket> {
    const socket = socketFor(app, cookie)
    await new Promise<void>((resolve, reject) => {
      socket.once('connect', resolve)
      socket.once('connect_error', reject)
    })
    return new RawSocket(socket)
  }

  /** The answer, or 'nothing' when none comes. */
  ask(event: keyof ClientToServerEvents, payload: unknown, timeoutMs = 400): Promise<unknown> {
    return new Promise((resolve) => {
      const timer = setTimeout(() => resolve('nothing'), timeoutMs)
      const answer = (reply: unknown) => {
        clearTimeout(timer)
        resolve(reply)
      }
      this.socket.emit(event, ...([payload, answer] as never))
    })
  }

  async join(layoutId: string): Promise<JoinReply> {
    const request = { layoutId, clientId: this.clientId, protocolVersion: 1, lastRevision: null, epoch: null }
    return (await this.ask('layout:join', request, 3_000)) as JoinReply
  }

  async submit(layoutId: string, edit: Record<string, unknown>): Promise<SubmitOutcome> {
    const request = { layoutId, clientId: this.clientId, baseRevision: 0, label: 'Raw', ...edit }
    return (await this.ask('edit:submit', request, 3_000)) as SubmitOutcome
  }

  /** Past the client library, which would choke on it itself. */
  writeText(text: string): void {
    this.socket.io.engine.write(text)
  }

  close(): void {
    this.socket.disconnect()
  }
}
