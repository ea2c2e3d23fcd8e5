/** Where edits wait that the server has not answered, or has refused. Survives reload and crash. */
import type { PendingEdit, RefusedEdit } from '@/stores/layout-state'

export type OutboxRecord = OutboxKey &
  ({ state: 'pending'; edit: PendingEdit } | { state: 'refused'; edit: RefusedEdit })

interface OutboxKey {
  editId: string
  layoutId: string
  /** Somebody else at the same browser neither sees nor sends it. */
  userId: string
  /** Milliseconds; orders what different tabs left behind. */
  storedAt: number
}

export interface Outbox {
  /** In the order in which they were made. */
  load(layoutId: string): Promise<OutboxRecord[]>
  /** Settles when the record would survive the tab. Replaces one with the same edit id. */
  put(record: OutboxRecord): Promise<void>
  remove(editId: string): Promise<void>
}

export function inOrder(records: readonly OutboxRecord[]): OutboxRecord[] {
  return [...records].sort(
    (left, right) => left.storedAt - right.storedAt || left.edit.clientSeq - right.edit.clientSeq,
  )
}
