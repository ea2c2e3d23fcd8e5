/** The edits that arrived in one turn, in order, inside one transaction. */
import { MAX_CATCH_UP_EDITS, type AcceptedEdit, type SubmitOutcome } from '@shared/protocol/realtime'
import type { Principal } from '../accounts/principal'
import type { EditTransaction, StoredLayout } from '../edits/edit-storage'
import { acceptEdit, refusal, type EditResult, type SubmittedEdit } from '../edits/edits.service'
import type { RecentEntries } from './recent-entries'

export interface Session {
  connectionId: string
  principal: Principal
  /**
   * An edit that could not be stored just now. Until it comes again, later ones of the same
   * connection are refused too, so that a person's edits keep their order.
   */
  stalledEditId: string | null
}

export interface EditJob {
  kind: 'edit'
  session: Session
  edit: SubmittedEdit
  reply: (outcome: SubmitOutcome) => void
  /**
   * The connection is beyond its limit. Such an edit passes through the queue as well, because only
   * what comes after it has to wait for it, not what still waits before it.
   */
  isTooFast: boolean
}

/** `result` is null for an edit that has to come again. */
export interface TurnResult {
  job: EditJob
  result: EditResult | null
}

export interface EditTurn {
  transaction: EditTransaction
  layout: StoredLayout
  jobs: readonly EditJob[]
  recent: RecentEntries
  now: Date
}

const TRY_AGAIN = refusal('unavailable', 'This could not be stored just now. It will be tried again.')
const TOO_FAST = refusal('rateLimited', 'Too many edits at once. They will be sent again.')

export function runEditTurn({ transaction, layout: committed, jobs, recent, now }: EditTurn): TurnResult[] {
  let layout = committed
  const resumed = new Set<string>()
  const fresh: AcceptedEdit[] = []

  /** What others did since the author looked: committed entries, and those of this turn. */
  function entriesSince(revision: number): AcceptedEdit[] {
    if (revision >= committed.revision) return fresh.filter((entry) => entry.revision > revision)
    const from = Math.max(revision, committed.revision - MAX_CATCH_UP_EDITS)
    const remembered = recent.since(from)
    if (remembered) return [...remembered, ...fresh]
    const stored = transaction
      .readEntries(committed.layoutId, from)
      .filter((entry) => entry.revision <= committed.revision)
    recent.replace(stored)
    return [...stored, ...fresh]
  }

  return jobs.map((job) => {
    const { session, edit } = job
    if (mustWait(job, resumed, transaction, layout.layoutId)) return { job, result: null }
    if (job.isTooFast) {
      session.stalledEditId = edit.editId
      resumed.delete(edit.editId)
      return { job, result: null }
    }
    resumed.add(edit.editId)
    const result = acceptEdit(
      transaction,
      layout,
      session.principal,
      edit,
      entriesSince(edit.baseRevision),
      now,
    )
    if (result.isNew && 'edit' in result.outcome) fresh.push(result.outcome.edit)
    layout = result.layout
    return { job, result }
  })
}

/** Nothing of it was stored: it and what comes after it on the same connection has to come again. */
export function postpone(job: EditJob): void {
  job.session.stalledEditId ??= job.edit.editId
  job.reply(TRY_AGAIN)
}

/** The answer to the author. */
export function answer({ job, result }: TurnResult): void {
  const { session, edit } = job
  if (!result) {
    job.reply(job.isTooFast ? TOO_FAST : TRY_AGAIN)
    return
  }
  if (session.stalledEditId === edit.editId) session.stalledEditId = null
  job.reply(result.outcome)
}

/**
 * `resumed` holds what this turn has taken up again. The edit that is waited for may also have
 * been answered elsewhere: another tab of the same person sends what it finds in the outbox.
 */
function mustWait(
  { session, edit }: EditJob,
  resumed: ReadonlySet<string>,
  transaction: EditTransaction,
  layoutId: string,
): boolean {
  const { stalledEditId, principal } = session
  if (stalledEditId === null || stalledEditId === edit.editId || resumed.has(stalledEditId)) return false
  const key = { editId: stalledEditId, userId: principal.userId, clientId: '', clientSeq: 0 }
  if (transaction.findReceipt(layoutId, key) === null) return true
  session.stalledEditId = null
  return false
}
