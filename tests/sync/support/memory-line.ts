/**
 * The line between clients and rooms with both directions as queues that a test flushes, breaks,
 * repeats or delays. Everything that passes is copied through JSON and the protocol's schemas, as
 * it would be on a real socket.
 */
import type { Principal } from '@server/accounts/principal'
import type { LayoutRooms } from '@server/realtime/layout-rooms'
import type { RoomTransport } from '@server/realtime/room-transport'
import { joinRequestSchema, presenceUpdateSchema, submitRequestSchema } from '@shared/protocol/realtime'
import type { ConnectionHandlers, IncomingMessage, OpenConnection } from '@/sync/connection'

type Delivery = () => void

interface Pipe {
  id: string
  principal: Principal
  handlers: ConnectionHandlers
  /** What the client thinks. */
  isOpen: boolean
  toServer: Delivery[]
  toClient: Delivery[]
  lastSubmit: Delivery | null
}

export class MemoryLines {
  readonly #pipes = new Map<string, Pipe>()
  readonly #audiences = new Map<string, Set<string>>()
  readonly workspaceMessages: unknown[] = []
  /** How many of the next edits arrive beyond the limit of their connection. */
  tooFastCount = 0
  #lastId = 0

  constructor(private readonly rooms: LayoutRooms) {
    rooms.connect(this.#transport)
  }

  /** A line for one browser: opens at once, and again only when `reconnect` says so. */
  forBrowser(principal: () => Principal): BrowserLine {
    return new BrowserLine(this, principal)
  }

  open(principal: Principal, handlers: ConnectionHandlers): Pipe {
    this.#lastId += 1
    const id = `connection-${this.#lastId}`
    const pipe: Pipe = {
      id,
      principal,
      handlers,
      isOpen: true,
      toServer: [],
      toClient: [],
      lastSubmit: null,
    }
    this.#pipes.set(id, pipe)
    return pipe
  }

  /** A message that the server never sent in this order. */
  deliverTo(connectionId: string | null, event: string, message: unknown): void {
    if (connectionId !== null) this.#toPipe(connectionId, event, message)
  }

  /** What the server does when it learns that a connection is gone. */
  serverSeesClose(id: string): void {
    this.rooms.leave(id)
    this.#pipes.delete(id)
  }

  submitTo(pipe: Pipe, request: unknown, reply: (answer: never) => void): Delivery {
    const copy = json(request)
    return () => {
      if (!this.#pipes.has(pipe.id)) return
      const { layoutId, ...edit } = submitRequestSchema.parse(copy)
      const isTooFast = this.tooFastCount > 0
      if (isTooFast) this.tooFastCount -= 1
      const answer = (outcome: unknown) => this.#answer(pipe, reply, outcome)
      this.rooms.submit(pipe.id, layoutId, edit, answer, isTooFast)
    }
  }

  joinTo(pipe: Pipe, request: unknown, reply: (answer: never) => void): Delivery {
    const copy = json(request)
    return () => {
      if (!this.#pipes.has(pipe.id)) return
      const answer = this.rooms.join(pipe.id, pipe.principal, joinRequestSchema.parse(copy))
      this.#answer(pipe, reply, answer)
    }
  }

  presenceTo(pipe: Pipe, update: unknown): Delivery {
    const copy = json(update)
    return () => this.rooms.updatePresence(pipe.id, presenceUpdateSchema.parse(copy))
  }

  #answer(pipe: Pipe, reply: (answer: never) => void, answer: unknown): void {
    const copy = json(answer)
    pipe.toClient.push(() => reply(copy as never))
  }

  readonly #transport: RoomTransport = {
    broadcast: (layoutId, event, message, except) => this.#toAudience(layoutId, event, message, except),
    broadcastVolatile: (layoutId, event, message) => this.#toAudience(layoutId, event, message),
    send: (id, event, message) => this.#toPipe(id, event, message),
    sendToWorkspace: (_workspaceId, message) => {
      this.workspaceMessages.push(message)
    },
    enter: (id, layoutId) => {
      this.#audiences.set(layoutId, (this.#audiences.get(layoutId) ?? new Set()).add(id))
    },
    leave: (id, layoutId) => {
      this.#audiences.get(layoutId)?.delete(id)
    },
  }

  #toAudience(layoutId: string, event: string, message: unknown, except?: string): void {
    for (const id of this.#audiences.get(layoutId) ?? []) if (id !== except) this.#toPipe(id, event, message)
  }

  #toPipe(id: string, event: string, message: unknown): void {
    const pipe = this.#pipes.get(id)
    const incoming = { event, message: json(message) } as IncomingMessage
    pipe?.toClient.push(() => pipe.handlers.onMessage(pipe.id, incoming))
  }
}

export class BrowserLine {
  #pipe: Pipe | null = null
  #handlers: ConnectionHandlers | null = null
  /** Closed by the client, unknown to the server until `serverNotices`. */
  #halfOpen: string[] = []
  #lateCloses: Delivery[] = []
  isOnline = true
  reopenCount = 0
  /** Submits that reached the wire, in order; for tests of resending. */
  readonly submitted: { editId: string; clientId: string; clientSeq: number }[] = []

  constructor(
    private lines: MemoryLines,
    private readonly principal: () => Principal,
  ) {}

  readonly openConnection: OpenConnection = (handlers) => {
    this.#handlers = handlers
    // As a real line, it opens after whoever asked has it in hand.
    queueMicrotask(() => this.reconnect())
    return {
      join: (request, reply) => this.#push((pipe) => this.lines.joinTo(pipe, request, reply)),
      submit: (request, reply) =>
        this.#push((pipe) => {
          const { editId, clientId, clientSeq } = request
          this.submitted.push({ editId, clientId, clientSeq })
          pipe.lastSubmit = this.lines.submitTo(pipe, request, reply)
          return pipe.lastSubmit
        }),
      updatePresence: (update) => this.#push((pipe) => this.lines.presenceTo(pipe, update)),
      leave: () => undefined,
      reopen: () => {
        this.reopenCount += 1
        this.disconnect()
        if (this.isOnline) this.#connect()
      },
      close: () => {
        this.disconnect()
        this.#handlers = null
      },
    }
  }

  get connectionId(): string | null {
    return this.#pipe?.id ?? null
  }

  get queued(): { toServer: number; toClient: number } {
    return { toServer: this.#pipe?.toServer.length ?? 0, toClient: this.#pipe?.toClient.length ?? 0 }
  }

  flushToServer(count = Infinity): void {
    for (let at = 0; at < count; at += 1) {
      const delivery = this.#pipe?.toServer.shift()
      if (!delivery) return
      delivery()
    }
  }

  flushToClient(count = Infinity): void {
    for (let at = 0; at < count; at += 1) {
      const delivery = this.#pipe?.toClient.shift()
      if (!delivery) return
      delivery()
    }
  }

  /** From the next opening on it leads to another server. */
  moveTo(lines: MemoryLines): void {
    this.lines = lines
  }

  /** Swallowed without a sign: the line still looks open. */
  loseToServer(): void {
    this.#pipe?.toServer.splice(0)
  }

  loseToClient(): void {
    this.#pipe?.toClient.splice(0)
  }

  /** The network delivers the last edit twice. */
  repeatLastSubmit(): void {
    if (this.#pipe?.lastSubmit) this.#pipe.toServer.push(this.#pipe.lastSubmit)
  }

  /** What is under way is lost in both directions. The server learns of it later. */
  disconnect({ isCloseLate = false } = {}): void {
    const pipe = this.#pipe
    if (!pipe) return
    this.#pipe = null
    pipe.isOpen = false
    this.#halfOpen.push(pipe.id)
    const tellClient = () => pipe.handlers.onClose(pipe.id)
    if (isCloseLate) this.#lateCloses.push(tellClient)
    else tellClient()
  }

  /** A close event that comes when a new connection is open already. */
  deliverLateCloses(): void {
    for (const deliver of this.#lateCloses.splice(0)) deliver()
  }

  serverNotices(): void {
    for (const id of this.#halfOpen.splice(0)) this.lines.serverSeesClose(id)
  }

  reconnect(): void {
    if (!this.#pipe && this.#handlers && this.isOnline) this.#connect()
  }

  /** The tab is gone without a word: nothing of it runs any more. */
  crash(): void {
    const pipe = this.#pipe
    this.#pipe = null
    this.#handlers = null
    if (pipe) this.#halfOpen.push(pipe.id)
  }

  #connect(): void {
    if (!this.#handlers) return
    this.#pipe = this.lines.open(this.principal(), this.#handlers)
    this.#handlers.onOpen(this.#pipe.id)
  }

  #push(make: (pipe: Pipe) => Delivery): void {
    if (this.#pipe) this.#pipe.toServer.push(make(this.#pipe))
  }
}

function json(value: unknown): unknown {
  return JSON.parse(JSON.stringify(value)) as unknown
}
