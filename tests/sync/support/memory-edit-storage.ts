import type { EditKey, EditStorage, EditTransaction, Receipt, StoredLayout } from '@server/edits/edit-storage'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { AcceptedEdit } from '@shared/protocol/realtime'

export type WriteStep = 'append' | 'storeReceipt' | 'commit'

interface Shelf {
  layout: StoredLayout
  base: { revision: number; document: LayoutDocument } | null
  entries: AcceptedEdit[]
  receipts: Receipt[]
}

export interface MemoryEditTransaction extends EditTransaction {
  /** What a service of another domain would write to the layout's row. */
  setStatus(layoutId: string, change: Partial<Pick<StoredLayout, 'status' | 'revisionLetter'>>): void
}

/** The storage contract without a database. `failures` makes the next such steps throw, as a full disk would. */
export class MemoryEditStorage implements EditStorage<MemoryEditTransaction> {
  #shelves = new Map<string, Shelf>()
  readonly failures: WriteStep[] = []
  transactionCount = 0

  addLayout(layout: StoredLayout): void {
    this.#shelves.set(layout.layoutId, { layout, base: null, entries: [], receipts: [] })
  }

  setEpoch(layoutId: string, epoch: string): void {
    const shelf = this.#shelf(layoutId)
    this.#shelves.set(layoutId, { ...shelf, layout: { ...shelf.layout, epoch } })
  }

  receipts(layoutId: string): Receipt[] {
    return this.#shelf(layoutId).receipts
  }

  readLayout(layoutId: string): StoredLayout | null {
    return this.#shelves.get(layoutId)?.layout ?? null
  }

  readEntries(layoutId: string, afterRevision: number): AcceptedEdit[] {
    return this.#shelf(layoutId).entries.filter((entry) => entry.revision > afterRevision)
  }

  readBase(layoutId: string): Shelf['base'] {
    return this.#shelf(layoutId).base
  }

  transaction<Result>(work: (transaction: MemoryEditTransaction) => Result): Result {
    // Shelves are replaced, never changed: keeping the old map is all that rolling back needs.
    const before = new Map(this.#shelves)
    this.transactionCount += 1
    try {
      const result = work(this.#transaction)
      this.#failIf('commit')
      return result
    } catch (error) {
      this.#shelves = before
      throw error
    }
  }

  readonly #transaction: MemoryEditTransaction = {
    readLayout: (layoutId) => this.readLayout(layoutId),
    readEntries: (layoutId, after) => this.readEntries(layoutId, after),
    readBase: (layoutId) => this.readBase(layoutId),
    findReceipt: (layoutId, key) => findReceipt(this.#shelf(layoutId).receipts, key),
    append: (layoutId, entry, document) => {
      this.#failIf('append')
      const { layout, base, entries, receipts } = this.#shelf(layoutId)
      if (entry.revision !== layout.revision + 1) throw new Error('a log entry has the next revision')
      this.#shelves.set(layoutId, {
        base: base ?? { revision: layout.revision, document: layout.document },
        layout: { ...layout, revision: entry.revision, document: structuredClone(document) },
        entries: [...entries, structuredClone(entry)],
        receipts,
      })
    },
    storeReceipt: (layoutId, receipt) => {
      this.#failIf('storeReceipt')
      const shelf = this.#shelf(layoutId)
      if (findReceipt(shelf.receipts, receipt)) throw new Error('the receipt is there already')
      this.#shelves.set(layoutId, { ...shelf, receipts: [...shelf.receipts, structuredClone(receipt)] })
    },
    setStatus: (layoutId, change) => {
      const shelf = this.#shelf(layoutId)
      this.#shelves.set(layoutId, { ...shelf, layout: { ...shelf.layout, ...change } })
    },
  }

  #failIf(step: WriteStep): void {
    if (this.failures[0] !== step) return
    this.failures.shift()
    throw new Error(`${step} failed`)
  }

  #shelf(layoutId: string): Shelf {
    const shelf = this.#shelves.get(layoutId)
    if (!shelf) throw new Error(`No layout ${layoutId}`)
    return shelf
  }
}

function findReceipt(receipts: Receipt[], key: EditKey): Receipt | null {
  return (
    receipts.find((receipt) => receipt.editId === key.editId) ??
    receipts.find(
      (receipt) =>
        receipt.userId === key.userId &&
        receipt.clientId === key.clientId &&
        receipt.clientSeq === key.clientSeq,
    ) ??
    null
  )
}
