/**
 * All open layouts. The rest of the server changes documents and their status through here, so
 * that every change of a layout stands in one sequence and everyone who has it open hears of it.
 *
 * - `changeStatus`: review, freeze, withdraw, next revision. `apply` runs synchronously inside the
 *   layout's queue and inside the transaction that appends the log entry; throw to refuse, and
 *   nothing is stored. Afterwards everyone gets the entry and their new access.
 * - `submitServerEdit`: an edit made for a person by a route, such as a rename.
 * - `announceWorkspace`: lists of the workspace have changed.
 */
import type { Logger } from 'pino'
import { newEditId } from '@shared/layout/new-ids'
import type { Operation } from '@shared/layout/operations'
import type {
  JoinReply,
  JoinRequest,
  LogEntryKind,
  PresenceUpdate,
  RejectReason,
  SubmitOutcome,
} from '@shared/protocol/realtime'
import type { Principal } from '../accounts/principal'
import type { EditStorage, EditTransaction, StoredLayout } from '../edits/edit-storage'
import { acceptServerEdit, appendStatusEntry, refusal, type SubmittedEdit } from '../edits/edits.service'
import { conflict, notFound } from '../http/http-error'
import { LayoutRoom } from './layout-room'
import { systemClock, type RoomClock } from './room-clock'
import { SILENT_TRANSPORT, type MessageOf, type RoomTransport } from './room-transport'

export interface StatusChange<Transaction extends EditTransaction, Result> {
  layoutId: string
  kind: Exclude<LogEntryKind, 'edit'>
  actor: Pick<Principal, 'userId' | 'name'>
  /** In the history: "Freeze revision A". */
  label: string
  /** What the person saw; an edit accepted since makes it a conflict. */
  expectedRevision?: number
  /**
   * Synchronous. `layout` is the state it acts on; `entryRevision` the revision of the log entry
   * that will stand for the change. The document itself must stay as it is.
   */
  apply: (context: { transaction: Transaction; layout: StoredLayout; entryRevision: number }) => Result
}

export interface ServerEdit {
  layoutId: string
  actor: Principal
  label: string
  operations: Operation[]
}

export interface LayoutRooms<Transaction extends EditTransaction = EditTransaction> {
  connect(transport: RoomTransport): void
  join(connectionId: string, principal: Principal, request: JoinRequest): JoinReply
  leave(connectionId: string): void
  submit(
    connectionId: string,
    layoutId: string,
    edit: SubmittedEdit,
    reply: (outcome: SubmitOutcome) => void,
    isTooFast?: boolean,
  ): void
  updatePresence(connectionId: string, update: PresenceUpdate): void
  changePrincipal(connectionId: string, principal: Principal): void
  /** Out at once, with a word to the client. */
  revoke(connectionId: string, reason: RejectReason): void
  changeStatus<Result>(change: StatusChange<Transaction, Result>): Promise<Result>
  submitServerEdit(edit: ServerEdit): Promise<SubmitOutcome>
  announceWorkspace(workspaceId: string, what: MessageOf<'workspace:changed'>['what']): void
  /** One entry a person, for lists. */
  peopleIn(layoutId: string): { userId: string; name: string }[]
  openRoomCount(): number
  close(): void
}

/** Lists may lag a little; one message an edit to everybody of the workspace would be too much. */
const LISTED_INTERVAL_MS = 1_000

export interface LayoutRoomsParts<Transaction extends EditTransaction> {
  storage: EditStorage<Transaction>
  logger: Pick<Logger, 'error'>
  clock?: RoomClock
}

export function createLayoutRooms<Transaction extends EditTransaction>({
  storage,
  logger,
  clock = systemClock,
}: LayoutRoomsParts<Transaction>): LayoutRooms<Transaction> {
  const rooms = new Map<string, LayoutRoom<Transaction>>()
  const roomOf = new Map<string, LayoutRoom<Transaction>>()
  const plannedListings = new Map<string, () => void>()
  let transport = SILENT_TRANSPORT

  function openRoom(layoutId: string): LayoutRoom<Transaction> | null {
    const open = rooms.get(layoutId)
    if (open) return open
    const layout = storage.readLayout(layoutId)
    if (!layout) return null
    const room = new LayoutRoom<Transaction>(layout, {
      storage,
      clock,
      logger,
      transport: () => transport,
      onListed: planListing,
      onIdle: closeRoom,
    })
    rooms.set(layoutId, room)
    return room
  }

  function closeRoom(room: LayoutRoom<Transaction>): void {
    room.stop()
    if (rooms.get(room.layoutId) === room) rooms.delete(room.layoutId)
  }

  function planListing(workspaceId: string): void {
    if (plannedListings.has(workspaceId)) return
    const cancel = clock.after(LISTED_INTERVAL_MS, () => {
      plannedListings.delete(workspaceId)
      transport.sendToWorkspace(workspaceId, { workspaceId, what: 'layouts' })
    })
    plannedListings.set(workspaceId, cancel)
  }

  function leaveRoom(connectionId: string): void {
    roomOf.get(connectionId)?.leave(connectionId)
    roomOf.delete(connectionId)
  }

  function roomJoinedBy(connectionId: string, layoutId: string): LayoutRoom<Transaction> | null {
    const room = roomOf.get(connectionId)
    return room?.layoutId === layoutId ? room : null
  }

  return {
    connect(next) {
      transport = next
    },

    join(connectionId, principal, request) {
      const room = openRoom(request.layoutId)
      if (!room) return { ok: false, ...NOT_FOUND }
      // A connection is in one layout at a time.
      if (roomOf.get(connectionId) !== room) leaveRoom(connectionId)
      const reply = room.join(connectionId, principal, request)
      if (reply.ok) roomOf.set(connectionId, room)
      else if (room.isIdle) closeRoom(room)
      return reply
    },

    leave: leaveRoom,

    submit(connectionId, layoutId, edit, reply, isTooFast) {
      const room = roomJoinedBy(connectionId, layoutId)
      if (room) room.submit(connectionId, edit, reply, isTooFast)
      else reply(refusal('notJoined', 'Open the layout first.'))
    },

    updatePresence(connectionId, { layoutId, ...update }) {
      roomJoinedBy(connectionId, layoutId)?.updatePresence(connectionId, update)
    },

    changePrincipal(connectionId, principal) {
      const room = roomOf.get(connectionId)
      room?.changePrincipal(connectionId, principal)
      if (room && !room.has(connectionId)) roomOf.delete(connectionId)
    },

    revoke(connectionId, reason) {
      roomOf.get(connectionId)?.revoke(connectionId, reason)
      roomOf.delete(connectionId)
    },

    changeStatus: (change) =>
      new Promise((resolve, reject) => {
        const room = openRoom(change.layoutId)
        if (!room) {
          reject(notFound())
          return
        }
        room.enqueueExclusive({
          fail: reject,
          run: () => {
            const { result, entry, layout } = storage.transaction((transaction) =>
              storeStatusChange(transaction, change, clock.now()),
            )
            return {
              layout,
              announce: () => {
                resolve(result)
                room.broadcastEntry(entry)
                room.broadcastAccess(change.actor.name)
                transport.sendToWorkspace(layout.workspaceId, {
                  workspaceId: layout.workspaceId,
                  what: 'releases',
                })
              },
            }
          },
        })
      }),

    submitServerEdit: ({ layoutId, actor, label, operations }) =>
      new Promise((resolve, reject) => {
        const room = openRoom(layoutId)
        if (!room) {
          resolve({ outcome: 'rejected', ...NOT_FOUND })
          return
        }
        room.enqueueExclusive({
          fail: reject,
          run: () => {
            const { outcome, layout } = storage.transaction((transaction) => {
              const present = readLayout(transaction, layoutId)
              const edit = { editId: newEditId(), label, operations }
              return acceptServerEdit(transaction, present, actor, edit, clock.now())
            })
            return {
              layout,
              announce: () => {
                resolve(outcome)
                if ('edit' in outcome) room.broadcastEntry(outcome.edit)
              },
            }
          },
        })
      }),

    announceWorkspace(workspaceId, what) {
      transport.sendToWorkspace(workspaceId, { workspaceId, what })
    },

    peopleIn(layoutId) {
      const people = rooms.get(layoutId)?.people ?? []
      return [...new Map(people.map(({ userId, name }) => [userId, { userId, name }])).values()]
    },

    openRoomCount: () => rooms.size,

    close() {
      for (const cancel of plannedListings.values()) cancel()
      plannedListings.clear()
      for (const room of rooms.values()) room.stop()
      rooms.clear()
      roomOf.clear()
    },
  }
}

const NOT_FOUND = {
  reason: 'notFound',
  message: 'This layout does not exist, or you may not see it.',
} as const

function storeStatusChange<Transaction extends EditTransaction, Result>(
  transaction: Transaction,
  change: StatusChange<Transaction, Result>,
  now: Date,
) {
  const layout = readLayout(transaction, change.layoutId)
  if (change.expectedRevision !== undefined && change.expectedRevision !== layout.revision) {
    throw conflict('The layout was edited in the meantime. Look at the newest state and try again.')
  }
  const result = change.apply({ transaction, layout, entryRevision: layout.revision + 1 })
  const { kind, label, actor } = change
  const entry = appendStatusEntry(transaction, layout, actor, { kind, label, editId: newEditId() }, now)
  return { result, entry, layout: readLayout(transaction, change.layoutId) }
}

function readLayout(transaction: EditTransaction, layoutId: string): StoredLayout {
  const layout = transaction.readLayout(layoutId)
  if (!layout) throw notFound()
  return layout
}
