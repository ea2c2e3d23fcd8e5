/**
 * One open layout on the client: commits edits, keeps and sends them, follows the server, undoes.
 * Plain TypeScript around a store; the line, the storage and the clock are given to it.
 */
import { applyOperations } from '@shared/layout/apply-operations'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { newClientId, newEditId } from '@shared/layout/new-ids'
import type { Operation } from '@shared/layout/operations'
import {
  MAX_EDIT_BYTES,
  MAX_OPERATIONS_PER_EDIT,
  type AcceptedEdit,
  type JoinReply,
  type PresenceUpdate,
  type RejectReason,
  type SubmitOutcome,
} from '@shared/protocol/realtime'
import type { LayoutState, Notice, PendingEdit } from '@/stores/layout-state'
import { createLayoutStore, EMPTY_LAYOUT_STATE, type LayoutStore } from '@/stores/layout-store'
import type { ClientClock } from './client-clock'
import type { IncomingMessage, OpenConnection } from './connection'
import { EditQueue, isPostponed } from './edit-queue'
import { LayoutLine } from './layout-line'
import { LayoutReplica } from './layout-replica'
import type { CommitResult, LayoutSession, UndoResult } from './layout-session'
import { droppedForOthers, othersNotices, ownNotices, undoNotice } from './notice-words'
import type { Outbox, OutboxRecord } from './outbox'
import { OwnHistory, type HistorySide } from './own-history'
import { PresenceSender } from './presence-sender'
import { readOnlyWords, refusalWords } from './refusal-words'

export interface LayoutSyncParts {
  layoutId: string
  store: LayoutStore
  openConnection: OpenConnection
  outbox: Outbox
  clock: ClientClock
  /** After `close`, when nothing waits any more or nothing more can be sent. */
  onEnd?: () => void
}

const MAX_LABEL = 120
const MAX_NOTICES = 20
const STORAGE_FAILURE =
  'This browser cannot keep unsaved changes over a reload. Leave the page only when it says “Saved”.'

export class LayoutSync implements LayoutSession {
  /** Who writes a store now: of two sessions the one opened later. */
  static readonly #writers = new WeakMap<LayoutStore, LayoutSync>()

  readonly layoutId: string
  readonly #parts: LayoutSyncParts
  readonly #clientId = newClientId()
  readonly #replica: LayoutReplica
  readonly #history: OwnHistory
  readonly #queue: EditQueue
  readonly #line: LayoutLine
  readonly #presence: PresenceSender
  #clientSeq = 0
  /** What earlier tabs left, until the server has said who is asking. */
  #left: OutboxRecord[] = []
  #isClosing = false
  #hasEnded = false

  constructor(parts: LayoutSyncParts) {
    const { layoutId, store, outbox, clock, openConnection } = parts
    this.#parts = parts
    this.layoutId = layoutId
    LayoutSync.#writers.set(store, this)
    store.setState({ ...EMPTY_LAYOUT_STATE, layoutId })
    this.#replica = new LayoutReplica(store)
    this.#history = new OwnHistory((shown) => this.#replica.update(shown))
    this.#queue = new EditQueue({
      outbox,
      clock,
      pending: () => this.#state.pending,
      send: (edit) => this.#line.submit({ layoutId, ...edit }, (outcome) => this.#onOutcome(edit, outcome)),
      onStorageFailure: () => this.#replica.update({ storageFailure: STORAGE_FAILURE }),
      onSilence: () => this.#line.reopen(),
    })
    this.#line = new LayoutLine({
      layoutId,
      clientId: this.#clientId,
      clock,
      openConnection,
      lastSeen: () => (this.#state.confirmed ? this.#state : null),
      onJoined: (reply) => this.#onJoined(reply),
      onInterrupted: (isOpen) => this.#onInterrupted(isOpen),
      onRefused: (reason, message) => this.#onRefused(reason, message),
      onMessage: (incoming) => this.#onMessage(incoming),
    })
    this.#presence = new PresenceSender(layoutId, clock, (update) => this.#line.updatePresence(update))
  }

  /** Reads what was left unsent before the line opens, so that nothing new can get in front of it. */
  async start(): Promise<void> {
    try {
      this.#left = await this.#parts.outbox.load(this.layoutId)
    } catch {
      this.#replica.update({ storageFailure: STORAGE_FAILURE })
    }
    if (!this.#isClosing) this.#line.open()
  }

  commit(label: string, operations: Operation[]): CommitResult {
    const result = this.#commit(label, operations, null)
    if (result.kind !== 'pending') this.clearPreview()
    return result
  }

  setPreview(label: string, operations: Operation[]): void {
    if (this.#state.access?.canEdit) this.#replica.setPreview({ label, operations })
  }

  clearPreview(): void {
    this.#replica.setPreview(null)
  }

  undo(): UndoResult {
    return this.#undo('undo')
  }

  redo(): UndoResult {
    return this.#undo('redo')
  }

  updatePresence(partial: Partial<Omit<PresenceUpdate, 'layoutId'>>): void {
    this.#presence.update(partial)
  }

  dismissNotice(id: string): void {
    this.#replica.update({ notices: this.#state.notices.filter((notice) => notice.id !== id) })
  }

  dismissRefused(editId: string): void {
    this.#replica.update({ refusedEdits: this.#state.refusedEdits.filter((edit) => edit.editId !== editId) })
    this.#queue.forget(editId)
  }

  /**
   * The page has left the layout. What still waits is sent in the background, as long as the
   * browser lets it; the store is free for the next layout.
   */
  close(): void {
    if (this.#isClosing) return
    this.#isClosing = true
    const own = createLayoutStore()
    own.setState({ ...this.#state, preview: null })
    this.#replica.moveTo(own)
    this.#presence.stop()
    // The next layout may be open already.
    if (this.#parts.store.getState().layoutId === this.layoutId)
      this.#parts.store.setState(EMPTY_LAYOUT_STATE)
    this.#endWhenDone()
  }

  get pendingCount(): number {
    return this.#state.pending.length
  }

  get #state(): LayoutState {
    return this.#replica.state
  }

  // Editing

  #commit(label: string, operations: Operation[], undoing: HistorySide | null): CommitResult {
    const { working } = this.#replica
    const { access, you, revision } = this.#state
    if (this.#isClosing || !working || !access || !you) {
      return { kind: 'readOnly', message: 'The layout is not open.' }
    }
    if (!access.canEdit) return { kind: 'readOnly', message: readOnlyWords(access.status) }

    const { document, applied, dropped } = applyOperations(working, operations)
    if (applied.length === 0) return { kind: 'noEffect', dropped }
    if (applied.length > MAX_OPERATIONS_PER_EDIT || JSON.stringify(applied).length > MAX_EDIT_BYTES) {
      return { kind: 'tooLarge', message: 'This is too much for one step. Do it in several.' }
    }
    this.#clientSeq += 1
    const edit: PendingEdit = {
      editId: newEditId(),
      clientId: this.#clientId,
      clientSeq: this.#clientSeq,
      baseRevision: revision,
      label: label.slice(0, MAX_LABEL),
      operations: applied,
    }
    this.#replica.addPending(edit, document)
    this.#history.record(undoing, edit, working, applied)
    this.#queue.keep({ ...this.#recordKey(edit), state: 'pending', edit })
    return { kind: 'pending', editId: edit.editId, dropped }
  }

  #undo(side: HistorySide): UndoResult {
    const entry = this.#history.last(side)
    const { working } = this.#replica
    if (!entry || !working) return { kind: 'nothing' }
    const { label } = entry
    const plan = this.#history.plan(working, entry)
    if (plan.kind === 'refused') {
      this.#history.drop(side)
      this.#addNotices([undoNotice('undoRefused', label, plan.message, this.#now())])
      return { kind: 'refused', label, message: plan.message }
    }
    const result = this.#commit(label, plan.operations, side)
    if (result.kind === 'readOnly' || result.kind === 'tooLarge') {
      return { kind: 'refused', label, message: result.message }
    }
    if (plan.skipped.length > 0) {
      const message = `“${label}” was undone in part: ${plan.skipped.join('; ')}.`
      this.#addNotices([undoNotice('undoSkipped', label, message, this.#now())])
    }
    return { kind: 'done', label, skipped: plan.skipped }
  }

  // The line

  #onJoined(reply: Extract<JoinReply, { ok: true }>): void {
    const { you, pending } = this.#state
    // Another person at the same browser: what the first one left stays in the outbox for them.
    const waiting = you?.userId === reply.you.userId ? pending : this.#takeLeft(reply.you.userId)
    if (you && you.userId !== reply.you.userId) this.#history.clear()
    this.#replica.catchUp(reply, waiting, {
      you: reply.you,
      people: reply.people,
      connection: 'connected',
      refusedReason: null,
    })
    const edits = reply.sync.kind === 'edits' ? reply.sync.edits : []
    for (const entry of edits) {
      this.#afterEntry(
        entry,
        waiting.some((edit) => edit.editId === entry.editId),
        null,
      )
    }
    this.#setAccess(reply.access)
    this.#presence.sendNow()
    this.#continue()
  }

  #takeLeft(userId: string): PendingEdit[] {
    const own = this.#left.filter((record) => record.userId === userId)
    const refusedEdits = own.flatMap((record) => (record.state === 'refused' ? [record.edit] : []))
    this.#replica.update({ refusedEdits })
    const waiting = own.flatMap((record) => (record.state === 'pending' ? [record.edit] : []))
    for (const edit of waiting) this.#queue.markKept(edit.editId)
    return waiting
  }

  #onInterrupted(isOpen: boolean): void {
    this.#queue.onLineClosed()
    const { connection, confirmed, people, you } = this.#state
    if (isOpen || connection === 'refused') return
    this.#replica.update({
      connection: confirmed ? 'reconnecting' : 'connecting',
      people: people.filter((person) => person.connectionId === you?.connectionId),
    })
  }

  #onRefused(reason: RejectReason, message: string): void {
    const { access } = this.#state
    this.#replica.update({ connection: 'refused', refusedReason: { reason, message }, people: [] })
    if (access) this.#setAccess({ ...access, canEdit: false })
    this.#endWhenDone()
  }

  #setAccess(access: NonNullable<LayoutState['access']>): void {
    this.#replica.update({ access })
    if (access.canEdit) return
    // Frozen, or no longer allowed: a drag in progress ends, and there is nothing left to undo.
    this.#replica.setPreview(null)
    this.#history.clear()
  }

  // Answers and messages

  #onOutcome(edit: PendingEdit, outcome: SubmitOutcome): void {
    if (isPostponed(outcome)) {
      this.#queue.onPostponed()
      if (outcome.outcome === 'rejected' && outcome.reason === 'notJoined') this.#line.join()
      return
    }
    this.#queue.onProgress()
    switch (outcome.outcome) {
      case 'accepted':
      case 'adjusted':
        this.#onEntry(outcome.edit)
        break
      case 'noEffect':
        this.#replica.removePending(edit.editId)
        this.#history.forget(edit.editId)
        this.#queue.forget(edit.editId)
        this.#addNotices(ownNotices(edit.label, outcome.notices, this.#now()))
        break
      case 'rejected':
        this.#keepRefused(edit, outcome.reason, outcome.message)
        break
    }
    this.#continue()
  }

  #keepRefused(edit: PendingEdit, reason: RejectReason, message: string): void {
    const refused = { ...edit, reason, message }
    this.#replica.removePending(edit.editId, { refusedEdits: [...this.#state.refusedEdits, refused] })
    this.#history.forget(edit.editId)
    this.#queue.refuse({ ...this.#recordKey(edit), state: 'refused', edit: refused })
  }

  #onMessage({ event, message }: IncomingMessage): void {
    switch (event) {
      case 'edit:accepted':
        this.#onEntry(message.edit)
        this.#continue()
        break
      case 'edit:dropped':
        this.#addNotices(droppedForOthers(message, this.#now()))
        break
      case 'presence:changed':
        this.#replica.update({ people: message.people })
        break
      case 'access:changed':
        this.#setAccess(message.access)
        break
      case 'access:revoked':
        this.#onRefused(message.reason, refusalWords(message.reason))
        break
    }
  }

  #onEntry(entry: AcceptedEdit): void {
    const isOwn = this.#state.pending.some((edit) => edit.editId === entry.editId)
    const result = this.#replica.applyEntry(entry)
    if (result.kind === 'gap') this.#line.join()
    else if (result.kind === 'applied') this.#afterEntry(entry, isOwn, result.confirmedBefore)
    else if (isOwn) this.#queue.forget(entry.editId)
  }

  #afterEntry(entry: AcceptedEdit, isOwn: boolean, confirmedBefore: LayoutDocument | null): void {
    const { you } = this.#state
    if (isOwn) {
      this.#queue.forget(entry.editId)
      if (confirmedBefore) this.#history.settle(entry.editId, confirmedBefore, entry.operations)
      this.#addNotices(ownNotices(entry.label, entry.notices, entry.acceptedAt))
    } else if (you && entry.userId !== you.userId) {
      this.#history.remember(entry)
      this.#addNotices(othersNotices(entry, you.userId))
    }
  }

  #continue(): void {
    this.#queue.pump()
    this.#endWhenDone()
  }

  #endWhenDone(): void {
    const mustWait = this.pendingCount > 0 && this.#state.connection !== 'refused'
    if (!this.#isClosing || this.#hasEnded || mustWait) return
    this.#hasEnded = true
    this.#line.close()
    this.#parts.onEnd?.()
  }

  #recordKey(edit: PendingEdit) {
    return {
      editId: edit.editId,
      layoutId: this.layoutId,
      userId: this.#state.you?.userId ?? '',
      storedAt: this.#parts.clock.now(),
    }
  }

  #addNotices(notices: Notice[]): void {
    if (notices.length === 0) return
    this.#replica.update({ notices: [...this.#state.notices, ...notices].slice(-MAX_NOTICES) })
  }

  #now(): string {
    return new Date(this.#parts.clock.now()).toISOString()
  }
}
