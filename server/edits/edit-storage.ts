/**
 * What the room needs of its storage. Two implementations pass one contract suite: SQLite for the
 * product, memory for tests that look at the protocol alone. All of it is synchronous: between
 * reading the head and writing the next entry nothing else can run.
 */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { LayoutStatus } from '@shared/protocol/layouts'
import type { AcceptedEdit, SubmitOutcome } from '@shared/protocol/realtime'

export interface StoredLayout {
  layoutId: string
  workspaceId: string
  document: LayoutDocument
  /** Number of the last log entry; that of the base when there is none. */
  revision: number
  epoch: string
  status: LayoutStatus
  revisionLetter: string
}

export interface EditKey {
  editId: string
  /** Numbers count a person’s own edits: nobody can use up somebody else’s. */
  userId: string
  clientId: string
  clientSeq: number
}

/** The answer an edit got, and for whom. */
export interface Receipt extends EditKey {
  outcome: SubmitOutcome
}

export interface EditReads {
  readLayout(layoutId: string): StoredLayout | null
  /** Entries after a revision, oldest first. */
  readEntries(layoutId: string, afterRevision: number): AcceptedEdit[]
  /** What the log starts from; null while it is empty. */
  readBase(layoutId: string): { revision: number; document: LayoutDocument } | null
}

export interface EditTransaction extends EditReads {
  /** By edit id, or by person, client and sequence number: whichever is known. */
  findReceipt(layoutId: string, key: EditKey): Receipt | null
  /** Appends an entry at head + 1 and stores the document after it. Throws when the head is another. */
  append(layoutId: string, entry: AcceptedEdit, document: LayoutDocument): void
  storeReceipt(layoutId: string, receipt: Receipt): void
}

export interface EditStorage<Transaction extends EditTransaction = EditTransaction> extends EditReads {
  /** All of it or nothing. A callback that returns a promise does not compile. */
  transaction<Result>(work: (transaction: Transaction) => Synchronous<Result>): Result
}

type Synchronous<Result> = Result extends PromiseLike<unknown> ? never : Result
