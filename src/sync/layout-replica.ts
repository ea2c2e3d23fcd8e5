/**
 * The client's copy of a layout: what the server confirmed, what waits, what is under the pointer.
 * Writes the store, one update a message; knows neither line nor storage.
 */
import { applyOperations } from '@shared/layout/apply-operations'
import { equalValues } from '@shared/layout/equal-values'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { rebase } from '@shared/layout/rebase'
import type { AcceptedEdit, JoinReply } from '@shared/protocol/realtime'
import type { LayoutState, PendingEdit, Preview } from '@/stores/layout-state'
import type { LayoutStore } from '@/stores/layout-store'

export type EntryResult =
  | { kind: 'applied'; confirmedBefore: LayoutDocument }
  /** Seen already: nothing changed. */
  | { kind: 'old' }
  /** Something before it is missing. */
  | { kind: 'gap' }

export class LayoutReplica {
  /** Confirmed and pending, without the preview. */
  #working: LayoutDocument | null

  constructor(private store: LayoutStore) {
    this.#working = workingOf(store.getState())
  }

  get state(): LayoutState {
    return this.store.getState()
  }

  get working(): LayoutDocument | null {
    return this.#working
  }

  /** From here on another store is written; the one left behind keeps what it shows. */
  moveTo(store: LayoutStore): void {
    this.store = store
  }

  update(change: Partial<LayoutState>): void {
    this.store.setState(change)
  }

  addPending(edit: PendingEdit, working: LayoutDocument): void {
    this.#working = working
    this.store.setState({
      pending: [...this.state.pending, edit],
      preview: null,
      visible: sameIfEqual(this.state.visible, working),
    })
  }

  setPreview(preview: Preview | null): void {
    if (preview === null && this.state.preview === null) return
    this.store.setState({ preview, visible: withPreview(this.#working, preview) })
  }

  /** Takes an edit out of what waits, and its effect with it. */
  removePending(editId: string, also: Partial<LayoutState> = {}): void {
    const pending = this.state.pending.filter((edit) => edit.editId !== editId)
    if (pending.length === this.state.pending.length) this.store.setState(also)
    else this.#settle({ ...also, pending })
  }

  /** Rewinds what waits, applies the entry, re-applies the rest: one update. */
  applyEntry(entry: AcceptedEdit, also: Partial<LayoutState> = {}): EntryResult {
    const { confirmed, revision, pending } = this.state
    if (confirmed === null || entry.revision <= revision) {
      this.removePending(entry.editId, also)
      return { kind: 'old' }
    }
    if (entry.revision > revision + 1) return { kind: 'gap' }
    this.#settle({
      ...also,
      confirmed: applyOperations(confirmed, entry.operations).document,
      revision: entry.revision,
      pending: pending.filter((edit) => edit.editId !== entry.editId),
    })
    return { kind: 'applied', confirmedBefore: confirmed }
  }

  /** The answer to joining. What waits stays, unless the missed edits show that it has arrived. */
  catchUp(reply: Extract<JoinReply, { ok: true }>, waiting: PendingEdit[], also: Partial<LayoutState>): void {
    const { sync } = reply
    const before = this.state.confirmed
    const edits = sync.kind === 'edits' ? sync.edits : []
    const confirmed = sync.kind === 'snapshot' ? sync.document : before && rebase(before, edits)
    const arrived = new Set(edits.map((edit) => edit.editId))
    this.#settle({
      ...also,
      confirmed,
      revision: reply.revision,
      epoch: reply.epoch,
      pending: waiting.filter((edit) => !arrived.has(edit.editId)),
    })
  }

  #settle(change: Partial<LayoutState>): void {
    const next = { ...this.state, ...change }
    this.#working = sameIfEqual(this.#working, workingOf(next))
    const visible = withPreview(this.#working, next.preview)
    this.store.setState({ ...change, visible: sameIfEqual(this.state.visible, visible) })
  }
}

function workingOf({
  confirmed,
  pending,
}: Pick<LayoutState, 'confirmed' | 'pending'>): LayoutDocument | null {
  return confirmed && rebase(confirmed, pending)
}

function withPreview(working: LayoutDocument | null, preview: Preview | null): LayoutDocument | null {
  return working && preview ? applyOperations(working, preview.operations).document : working
}

/**
 * An acknowledgement of one's own edit changes nothing that is seen: keeping the same object spares
 * everybody a redraw and a recalculation.
 */
function sameIfEqual(before: LayoutDocument | null, after: LayoutDocument | null): LayoutDocument | null {
  return before !== null && after !== null && equalValues(before, after) ? before : after
}
