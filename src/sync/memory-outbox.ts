import { inOrder, type Outbox, type OutboxRecord } from './outbox'

/** For a browser that offers no storage: edits wait as long as the page lives. */
export function createMemoryOutbox(): Outbox {
  const records = new Map<string, OutboxRecord>()
  return {
    load: async (layoutId) => inOrder([...records.values()].filter((record) => record.layoutId === layoutId)),
    put: async (record) => {
      records.set(record.editId, structuredClone(record))
    },
    remove: async (editId) => {
      records.delete(editId)
    },
  }
}
