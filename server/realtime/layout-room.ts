/**
 * One open layout: who is in it, and one queue through which everything that changes it goes, one
 * at a time. What the room remembers changes only after the transaction has committed; what it
 * says, it says after that.
 */
import type { Logger } from 'pino'
import {
  MAX_CATCH_UP_EDITS,
  type AcceptedEdit,
  type JoinReply,
  type JoinRequest,
  type PresenceState,
  type PresenceUpdate,
  type RejectReason,
  type SubmitOutcome,
} from '@shared/protocol/realtime'
import { can } from '../accounts/policy'
import { roleIn, type Principal } from '../accounts/principal'
import type { EditReads, EditStorage, EditTransaction, StoredLayout } from '../edits/edit-storage'
import { acceptEdit, refusal, type EditResult, type SubmittedEdit } from '../edits/edits.service'
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

interface Session {
  connectionId: string
  principal: Principal
  /**
   * An edit that could not be stored just now. Until it comes again, later ones of the same
   * connection are refused too, so that a person's edits keep their order.
   */
  stalledEditId: string | null
}

interface EditJob {
  kind: 'edit'
  session: Session
  edit: SubmittedEdit
  reply: (outcome: SubmitOutcome) => void
  isTooFast: boolean
}

interface ExclusiveJob<Transaction extends EditTransaction> extends ExclusiveWork<Transaction> {
  kind: 'exclusive'
}

const TRY_AGAIN = refusal('unavailable', 'This could not be stored just now. It will be tried again.')

const TOO_FAST = refusal('rateLimited', 'Too many edits at once. They will be sent again.')

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
    this.#sessions.set(connectionId, { connectionId, principal, stalledEditId: null })
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

  /**
   * `isTooFast`: the connection is beyond its limit. Such an edit passes through the queue as well,
   * because only what comes after it has to wait for it, not what still waits before it.
   */
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
    let results: { job: EditJob; result: EditResult | null }[]
    try {
      results = this.parts.storage.transaction((transaction) => {
        let layout = this.layout
        const resumed = new Set<string>()
        const fresh: AcceptedEdit[] = []
        return jobs.map((job) => {
          if (isStalled(job, resumed)) return { job, result: null }
          if (job.isTooFast) {
            job.session.stalledEditId = job.edit.editId
            resumed.delete(job.edit.editId)
            return { job, result: null }
          }
          resumed.add(job.edit.editId)
          const since = this.#entriesSince(job.edit.baseRevision, transaction, fresh)
          const result = acceptEdit(transaction, layout, job.session.principal, job.edit, since, this.#now())
          if (result.isNew && 'edit' in result.outcome) fresh.push(result.outcome.edit)
          layout = result.layout
          return { job, result }
        })
      })
    } catch (error) {
      this.#recover(jobs, error)
      return
    }
    for (const { result } of results) if (result) this.layout = result.layout
    for (const { job, result } of results) this.#answer(job, result)
  }

  /** What others did since the author looked: committed entries, and those of this turn. */
  #entriesSince(revision: number, transaction: EditReads, fresh: readonly AcceptedEdit[]): AcceptedEdit[] {
    if (revision >= this.layout.revision) return fresh.filter((entry) => entry.revision > revision)
    const from = Math.max(revision, this.layout.revision - MAX_CATCH_UP_EDITS)
    let committed = this.#recent.since(from)
    if (!committed) {
      committed = transaction
        .readEntries(this.layoutId, from)
        .filter((entry) => entry.revision <= this.layout.revision)
      this.#recent.replace(committed)
    }
    return [...committed, ...fresh]
  }

  #now(): Date {
    return this.parts.clock.now()
  }

  /** One bad write must not take the others of its turn with it: each gets a transaction of its own. */
  #recover(jobs: EditJob[], error: unknown): void {
    if (jobs.length > 1) {
      for (const job of jobs) this.#runEdits([job])
      return
    }
    this.parts.logger.error({ err: error, layoutId: this.layoutId }, 'An edit could not be stored')
    this.#reload()
    for (const job of jobs) {
      job.session.stalledEditId = job.edit.editId
      job.reply(TRY_AGAIN)
    }
  }

  #answer(job: EditJob, result: EditResult | null): void {
    if (!result) {
      job.reply(job.isTooFast ? TOO_FAST : TRY_AGAIN)
      return
    }
    if (job.session.stalledEditId === job.edit.editId) job.session.stalledEditId = null
    const { outcome, isNew } = result
    job.reply(outcome)
    if (!isNew) return
    if (outcome.outcome === 'accepted' || outcome.outcome === 'adjusted') {
      this.broadcastEntry(outcome.edit, job.session.connectionId)
    } else if (outcome.outcome === 'noEffect') {
      this.#tellRemovers(job, outcome.notices)
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

/** `resumed` holds what this turn takes up again: after that the way is free. */
function isStalled(job: EditJob, resumed: ReadonlySet<string>): boolean {
  const { stalledEditId } = job.session
  return stalledEditId !== null && stalledEditId !== job.edit.editId && !resumed.has(stalledEditId)
}
