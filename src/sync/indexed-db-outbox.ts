import { inOrder, type Outbox, type OutboxRecord } from './outbox'

const DATABASE_NAME = 'hubstead-outbox'
const EDITS = 'edits'
const BY_LAYOUT = 'byLayout'

/** The database opens once, at the first use; a failure reaches every call, and each call tries again. */
export function createIndexedDbOutbox(factory: IDBFactory = indexedDB): Outbox {
  let opening: Promise<IDBDatabase> | null = null
  const open = () => {
    opening ??= openDatabase(factory).catch((error: unknown) => {
      opening = null
      throw error
    })
    return opening
  }

  async function inTransaction<Result>(
    mode: IDBTransactionMode,
    work: (edits: IDBObjectStore) => IDBRequest<Result>,
  ): Promise<Result> {
    const database = await open()
    return new Promise((resolve, reject) => {
      // Relaxed: the browser has it, which survives the tab. Waiting for the disk would cost every edit.
      const transaction = database.transaction(EDITS, mode, { durability: 'relaxed' })
      const request = work(transaction.objectStore(EDITS))
      transaction.oncomplete = () => resolve(request.result)
      transaction.onerror = () => reject(failure(transaction.error))
      transaction.onabort = () => reject(failure(transaction.error))
    })
  }

  return {
    async load(layoutId) {
      const records: unknown = await inTransaction(
        'readonly',
        (edits) => edits.index(BY_LAYOUT).getAll(layoutId) as IDBRequest<unknown>,
      )
      // Only `put` below writes this store.
      return inOrder(records as OutboxRecord[])
    },
    async put(record) {
      await inTransaction('readwrite', (edits) => edits.put(record))
    },
    async remove(editId) {
      await inTransaction('readwrite', (edits) => edits.delete(editId))
    },
  }
}

function openDatabase(factory: IDBFactory): Promise<IDBDatabase> {
  return new Promise((resolve, reject) => {
    const request = factory.open(DATABASE_NAME, 1)
    request.onupgradeneeded = () => {
      request.result.createObjectStore(EDITS, { keyPath: 'editId' }).createIndex(BY_LAYOUT, 'layoutId')
    }
    request.onsuccess = () => {
      // A later version of the page may need to upgrade it.
      request.result.onversionchange = () => request.result.close()
      resolve(request.result)
    }
    request.onerror = () => reject(failure(request.error))
    request.onblocked = () => reject(new Error('Another tab holds an older version of the storage'))
  })
}

function failure(error: DOMException | null): Error {
  return error ?? new Error('The storage of this browser failed')
}
