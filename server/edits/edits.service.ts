/**
 * One edit against one layout, inside a transaction that its caller opened. Nothing here is
 * remembered: what it returns becomes true when the caller's transaction has committed.
 */
import type { LayoutDocument } from '@shared/layout/layout-document'
import {
  MAX_DOCUMENT_BYTES,
  MAX_EDIT_BYTES,
  SERVER_CLIENT_ID,
  type AcceptedEdit,
  type LogEntryKind,
  type RejectReason,
  type SubmitOutcome,
  type SubmitRequest,
} from '@shared/protocol/realtime'
import { decide } from '../accounts/policy'
import type { Principal } from '../accounts/principal'
import { decideEdit, type EditDecision } from './decide-edit'
import type { EditTransaction, StoredLayout } from './edit-storage'

export interface EditResult {
  outcome: SubmitOutcome
  layout: StoredLayout
  /** False for the repeated answer of an edit that was sent again: nobody else needs to hear of it. */
  isNew: boolean
}

export type SubmittedEdit = Omit<SubmitRequest, 'layoutId'>

/**
 * An edit from a browser. `since` is what others did after the revision its author saw. A known
 * one gets the answer it got the first time, whatever happened since.
 */
export function acceptEdit(
  transaction: EditTransaction,
  layout: StoredLayout,
  author: Principal,
  edit: SubmittedEdit,
  since: readonly AcceptedEdit[],
  now: Date,
): EditResult {
  const { editId, clientId, clientSeq } = edit
  const key = { editId, clientId, clientSeq, userId: author.userId }
  const receipt = transaction.findReceipt(layout.layoutId, key)
  if (receipt) {
    const isSame = receipt.userId === author.userId && receipt.editId === editId
    const outcome = isSame ? receipt.outcome : refusal('invalid', 'This edit number is already used.')
    return { outcome, layout, isNew: false }
  }
  const judgement = judgeEdit(layout, author, edit, since, now)
  const result = storeJudgement(transaction, layout, judgement)
  // Refusals too: an edit that its author was told is refused must not be accepted when a copy of it comes late.
  transaction.storeReceipt(layout.layoutId, { ...key, outcome: result.outcome })
  return result
}

/** An edit made on behalf of a person by the server itself, such as a rename over HTTP. It is never sent twice. */
export function acceptServerEdit(
  transaction: EditTransaction,
  layout: StoredLayout,
  author: Principal,
  edit: Pick<SubmittedEdit, 'editId' | 'label' | 'operations'>,
  now: Date,
): EditResult {
  const numbered = { ...edit, ...serverKey(layout), baseRevision: layout.revision }
  return storeJudgement(transaction, layout, judgeEdit(layout, author, numbered, [], now))
}

/** Status changes stand in the log like edits, so that what came before a freeze is settled by its revision. */
export function appendStatusEntry(
  transaction: EditTransaction,
  layout: StoredLayout,
  actor: Pick<Principal, 'userId' | 'name'>,
  change: { kind: Exclude<LogEntryKind, 'edit'>; editId: string; label: string },
  now: Date,
): AcceptedEdit {
  const entry: AcceptedEdit = {
    ...change,
    ...serverKey(layout),
    revision: layout.revision + 1,
    userId: actor.userId,
    userName: actor.name,
    operations: [],
    notices: [],
    acceptedAt: now.toISOString(),
  }
  transaction.append(layout.layoutId, entry, layout.document)
  return entry
}

export function refusal(reason: RejectReason, message: string): SubmitOutcome {
  return { outcome: 'rejected', reason, message }
}

type Judgement =
  | { kind: 'store'; outcome: 'accepted' | 'adjusted'; edit: AcceptedEdit; document: LayoutDocument }
  | { kind: 'answer'; outcome: SubmitOutcome }

function judgeEdit(
  layout: StoredLayout,
  author: Principal,
  edit: SubmittedEdit,
  since: readonly AcceptedEdit[],
  now: Date,
): Judgement {
  switch (decide(author, 'layout:edit', { workspaceId: layout.workspaceId, status: layout.status })) {
    case 'not-found':
    case 'forbidden':
      return { kind: 'answer', outcome: refusal('forbidden', 'Your role does not allow editing.') }
    case 'frozen':
      return {
        kind: 'answer',
        outcome: refusal('frozen', `Revision ${layout.revisionLetter} was frozen before this edit arrived.`),
      }
    case 'allowed':
      break
  }
  if (JSON.stringify(edit.operations).length > MAX_EDIT_BYTES) return tooLarge('This edit is too large.')

  const decision = decideSafely(layout.document, edit.operations, author.userId, since)
  switch (decision.kind) {
    case 'invalid':
      return { kind: 'answer', outcome: refusal('invalid', decision.message) }
    case 'noEffect':
      return {
        kind: 'answer',
        outcome: { outcome: 'noEffect', revision: layout.revision, notices: decision.notices },
      }
    case 'accepted':
    case 'adjusted': {
      if (JSON.stringify(decision.document).length > MAX_DOCUMENT_BYTES) {
        return tooLarge('The layout would become too large.')
      }
      const accepted: AcceptedEdit = {
        kind: 'edit',
        revision: layout.revision + 1,
        editId: edit.editId,
        clientId: edit.clientId,
        clientSeq: edit.clientSeq,
        userId: author.userId,
        userName: author.name,
        label: edit.label,
        operations: decision.operations,
        notices: decision.notices,
        acceptedAt: now.toISOString(),
      }
      return { kind: 'store', outcome: decision.kind, edit: accepted, document: decision.document }
    }
  }
}

/** Were there an edit that our own code cannot digest, it must not be sent again for ever. */
function decideSafely(...parameters: Parameters<typeof decideEdit>): EditDecision {
  try {
    return decideEdit(...parameters)
  } catch {
    return { kind: 'invalid', message: 'This edit cannot be applied.' }
  }
}

function storeJudgement(
  transaction: EditTransaction,
  layout: StoredLayout,
  judgement: Judgement,
): EditResult {
  if (judgement.kind !== 'store') return { outcome: judgement.outcome, layout, isNew: true }
  const { edit, document } = judgement
  transaction.append(layout.layoutId, edit, document)
  return {
    outcome: { outcome: judgement.outcome, edit },
    layout: { ...layout, document, revision: edit.revision },
    isNew: true,
  }
}

/** The revision makes it unique: there is one entry a revision. */
function serverKey(layout: StoredLayout): { clientId: string; clientSeq: number } {
  return { clientId: SERVER_CLIENT_ID, clientSeq: layout.revision + 1 }
}

function tooLarge(message: string): Judgement {
  return { kind: 'answer', outcome: refusal('tooLarge', message) }
}
