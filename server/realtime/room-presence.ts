/**
 * Who is in a layout and what they point at. Never stored. Moves of many people within one
 * interval become one message, because one message a move to each of the others grows with the
 * square of the people.
 */
import {
  PRESENCE_INTERVAL_MS,
  type Person,
  type PresenceState,
  type PresenceUpdate,
} from '@shared/protocol/realtime'
import type { Principal } from '../accounts/principal'
import type { Role } from '@shared/protocol/roles'
import type { RoomClock } from './room-clock'
import type { RoomTransport } from './room-transport'

const NOTHING = { cursor: null, selection: [], editing: null, ghost: null }

export class RoomPresence {
  readonly #people = new Map<string, PresenceState>()
  #cancelFlush: (() => void) | null = null

  constructor(
    private readonly layoutId: string,
    private readonly clock: RoomClock,
    private readonly transport: () => RoomTransport,
  ) {}

  get people(): PresenceState[] {
    return [...this.#people.values()]
  }

  /** Name, role and colour come from the server; a client cannot pass for somebody else. */
  add(connectionId: string, principal: Principal, role: Role): Person {
    const known = this.#people.get(connectionId)
    const person: Person = {
      connectionId,
      userId: principal.userId,
      name: principal.name,
      role,
      colourIndex: known?.colourIndex ?? this.#colourFor(principal.userId),
    }
    this.#people.set(connectionId, { ...NOTHING, ...known, ...person })
    this.#announce()
    return person
  }

  update(
    connectionId: string,
    { cursor, selection, editing, ghost }: Omit<PresenceUpdate, 'layoutId'>,
  ): void {
    const state = this.#people.get(connectionId)
    if (!state) return
    this.#people.set(connectionId, { ...state, cursor, selection, editing, ghost })
    this.#cancelFlush ??= this.clock.after(PRESENCE_INTERVAL_MS, () => {
      this.#cancelFlush = null
      this.transport().broadcastVolatile(this.layoutId, 'presence:changed', this.#message())
    })
  }

  remove(connectionId: string): void {
    if (this.#people.delete(connectionId)) this.#announce()
  }

  stop(): void {
    this.#cancelFlush?.()
    this.#cancelFlush = null
  }

  /** Coming and going must arrive: a lost message would leave a ghost until somebody moves. */
  #announce(): void {
    this.stop()
    this.transport().broadcast(this.layoutId, 'presence:changed', this.#message())
  }

  #message() {
    return { layoutId: this.layoutId, people: this.people }
  }

  /** One colour a person, also with two windows; the least one free. */
  #colourFor(userId: string): number {
    const people = this.people
    const own = people.find((person) => person.userId === userId)
    if (own) return own.colourIndex
    const taken = new Set(people.map((person) => person.colourIndex))
    let index = 0
    while (taken.has(index)) index += 1
    return index
  }
}
