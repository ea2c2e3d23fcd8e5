/**
 * One open layout: who is in it, and one queue through which everything that changes it goes, one
 * at a time. What the room remembers changes only after the transaction has committed; what it
 * says, it says after that.
 */
import type { Logger } from 'pino'
import type {
  AcceptedEdit,
  JoinReply,
  JoinRequest,
  PresenceState,
  PresenceUpdate,
  RejectReason,
  SubmitOutcome,
} from '@shared/protocol/realtime'
import { can } from '../accounts/policy'
import { roleIn, type Principal } from '../accounts/principal'
import type { EditStorage, EditTransaction, StoredLayout } from '../edits/edit-storage'
import { refusal, type SubmittedEdit } from '../edits/edits.service'
import { answer, postpone, runEditTurn, type EditJob, type Session, type TurnResult } from './edit-turn'
import { RecentEntries } from './recent-entries'
import type { RoomClock } from './room-clock'
import { accessOf, catchUp } from './room-answers'
import { RoomPresence } from './room-presence'
import type { RoomTransport } from './room-transport'

export interface RoomParts<Transaction extends EditTransaction> {
  storage: EditStorage<Transaction>
  clock: RoomClock
  logger: Pick<Logger, 'error'>
  transport: () => RoomTransport
  /** Something a list of layouts shows has changed. */
  onListed: (workspaceId: string) => void
  onIdle: (room: LayoutRoom<Transaction>) => void
}

/**
 * Work that needs the queue to itself. It runs its own transaction, returns the layout as it is
 * afterwards, and what to say once that is remembered. A failure means nothing was stored.
 */
export interface ExclusiveWork<Transaction extends EditTransaction> {
  run: (storage: EditStorage<Transaction>) => { layout: StoredLayout; announce: () => void }
  fail: (error: unknown) => void
}

interface ExclusiveJob<Transaction extends EditTransaction> extends ExclusiveWork<Transaction> {
  kind: 'exclusive'
}

export class LayoutRoom<Transaction extends EditTransaction = EditTransaction> {
  readonly #sessions = new Map<string, Session>()
  readonly #presence: RoomPresence
  readonly #recent = new RecentEntries()
  #jobs: (EditJob | ExclusiveJob<Transaction>)[] = []
  #isDrainPlanned = false

  constructor(
    private layout: StoredLayout,
    private readonly parts: RoomParts<Transaction>,
  ) {
    this.#presence = new RoomPresence(layout.layoutId, parts.clock, parts.transport)
  }

  get layoutId(): string {
    return this.layout.layoutId
  }

  get people(): PresenceState[] {
    return this.#presence.people
  }

  has(connectionId: string): boolean {
    return this.#sessions.has(connectionId)
  }

  get isIdle(): boolean {
    return this.#sessions.size === 0 && this.#jobs.length === 0 && !this.#isDrainPlanned
  }

  /** Entering and reading the log happen in one turn: no edit can fall between them. */
  join(connectionId: string, principal: Principal, request: JoinRequest): JoinReply {
    const role = roleIn(principal, this.layout.workspaceId)
    if (role === null || !can(principal, 'layout:read', this.layout)) {
      return { ok: false, reason: 'notFound', message: 'This layout does not exist, or you may not see it.' }
    }
    this.parts.transport().enter(connectionId, this.layoutId)
    // Joining again on the same connection, to fetch what is missing, does not free the way.
    const stalledEditId = this.#sessions.get(connectionId)?.stalledEditId ?? null
    this.#sessions.set(connectionId, { connectionId, principal, stalledEditId })
    const you = this.#presence.add(connectionId, principal, role)
    this.parts.onListed(this.layout.workspaceId)
    return {
      ok: true,
      epoch: this.layout.epoch,
      revision: this.layout.revision,
      access: accessOf(this.layout, principal),
      you,
      people: this.people,
      sync: catchUp(this.parts.storage, this.layout, request),
    }
  }

  leave(connectionId: string): void {
    if (!this.#sessions.delete(connectionId)) return
    this.parts.transport().leave(connectionId, this.layoutId)
    this.#presence.remove(connectionId)
    this.parts.onListed(this.layout.workspaceId)
    this.#reportIdle()
  }

  submit(
    connectionId: string,
    edit: SubmittedEdit,
    reply: (outcome: SubmitOutcome) => void,
    isTooFast = false,
  ): void {
    const session = this.#sessions.get(connectionId)
    if (!session) {
      reply(refusal('notJoined', 'Open the layout first.'))
      return
    }
    this.#enqueue({ kind: 'edit', session, edit, reply, isTooFast })
  }

  updatePresence(connectionId: string, update: Omit<PresenceUpdate, 'layoutId'>): void {
    this.#presence.update(connectionId, update)
  }

  enqueueExclusive(work: ExclusiveWork<Transaction>): void {
    this.#enqueue({ kind: 'exclusive', ...work })
  }

  /** Role or name changed, or the person may no longer be here. */
  changePrincipal(connectionId: string, principal: Principal): void {
    const session = this.#sessions.get(connectionId)
    if (!session) return
    const role = roleIn(principal, this.layout.workspaceId)
    if (role === null || !can(principal, 'layout:read', this.layout)) {
      this.revoke(connectionId, 'notFound')
      return
    }
    session.principal = principal
    this.#presence.add(connectionId, principal, role)
    this.#sendAccess(session, null)
  }

  /** The person is out at once, with whatever of theirs still waits in the queue. */
  revoke(connectionId: string, reason: RejectReason): void {
    const session = this.#sessions.get(connectionId)
    if (!session) return
    session.principal = { ...session.principal, roles: new Map() }
    const message = { layoutId: this.layoutId, reason }
    this.parts.transport().send(connectionId, 'access:revoked', message)
    this.leave(connectionId)
  }

  broadcastEntry(entry: AcceptedEdit, exceptConnectionId?: string): void {
    this.#recent.add(entry)
    const message = { layoutId: this.layoutId, edit: entry }
    this.parts.transport().broadcast(this.layoutId, 'edit:accepted', message, exceptConnectionId)
    this.parts.onListed(this.layout.workspaceId)
  }

  broadcastAccess(byName: string): void {
    for (const session of this.#sessions.values()) this.#sendAccess(session, byName)
  }

  stop(): void {
    this.#presence.stop()
  }

  #enqueue(job: EditJob | ExclusiveJob<Transaction>): void {
    this.#jobs.push(job)
    if (this.#isDrainPlanned) return
    this.#isDrainPlanned = true
    this.parts.clock.defer(() => this.#drain())
  }

  #drain(): void {
    this.#isDrainPlanned = false
    const jobs = this.#jobs
    this.#jobs = []
    let edits: EditJob[] = []
    for (const job of jobs) {
      if (job.kind === 'edit') {
        edits.push(job)
        continue
      }
      this.#runEdits(edits)
      edits = []
      this.#runExclusive(job)
    }
    this.#runEdits(edits)
    this.#reportIdle()
  }

  /** All edits of one turn in one transaction: one write to disk for all of them. */
  #runEdits(jobs: EditJob[]): void {
    if (jobs.length === 0) return
    let results: TurnResult[]
    try {
      results = this.parts.storage.transaction((transaction) =>
        runEditTurn({
          transaction,
          layout: this.layout,
          jobs,
          recent: this.#recent,
          now: this.parts.clock.now(),
        }),
      )
    } catch (error) {
      this.#recover(jobs, error)
      return
    }
    for (const { result } of results) if (result) this.layout = result.layout
    for (const each of results) {
      answer(each)
      if (each.result?.isNew) this.#announce(each.job, each.result.outcome)
    }
  }

  /** One bad write must not take the others of its turn with it: each gets a transaction of its own. */
  #recover(jobs: EditJob[], error: unknown): void {
    if (jobs.length > 1) {
      for (const job of jobs) this.#runEdits([job])
      return
    }
    this.parts.logger.error({ err: error, layoutId: this.layoutId }, 'An edit could not be stored')
    this.#reload()
    for (const job of jobs) postpone(job)
  }

  #announce(job: EditJob, outcome: SubmitOutcome): void {
    switch (outcome.outcome) {
      case 'accepted':
      case 'adjusted':
        this.broadcastEntry(outcome.edit, job.session.connectionId)
        break
      case 'noEffect':
        this.#tellRemovers(job, outcome.notices)
        break
      case 'rejected':
        break
    }
  }

  /** An edit without effect has no revision and no broadcast; whoever removed its target still hears of it. */
  #tellRemovers(job: EditJob, notices: AcceptedEdit['notices']): void {
    const { userId, name } = job.session.principal
    const removers = new Set(notices.map((notice) => notice.byUserId))
    for (const session of this.#sessions.values()) {
      if (session.principal.userId === userId || !removers.has(session.principal.userId)) continue
      this.parts.transport().send(session.connectionId, 'edit:dropped', {
        layoutId: this.layoutId,
        userName: name,
        label: job.edit.label,
        notices: notices.filter((notice) => notice.byUserId === session.principal.userId),
      })
    }
  }

  #runExclusive(job: ExclusiveJob<Transaction>): void {
    let done: ReturnType<typeof job.run>
    try {
      done = job.run(this.parts.storage)
    } catch (error) {
      this.#reload()
      job.fail(error)
      return
    }
    this.layout = done.layout
    done.announce()
  }

  #reload(): void {
    try {
      this.layout = this.parts.storage.readLayout(this.layoutId) ?? this.layout
    } catch (error) {
      this.parts.logger.error({ err: error, layoutId: this.layoutId }, 'A layout could not be read again')
    }
  }

  #sendAccess(session: Session, byName: string | null): void {
    this.parts.transport().send(session.connectionId, 'access:changed', {
      layoutId: this.layoutId,
      access: accessOf(this.layout, session.principal),
      byName,
    })
  }

  #reportIdle(): void {
    if (this.isIdle) this.parts.onIdle(this)
  }
}
