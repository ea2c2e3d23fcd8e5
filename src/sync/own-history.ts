/** This person's undo and redo in one session, and what the store shows of them. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation, SetOperation } from '@shared/layout/operations'
import { setsSameField } from '@shared/layout/touches'
import type { AcceptedEdit } from '@shared/protocol/realtime'
import {
  dropLast,
  EMPTY_HISTORY,
  forgetEdit,
  historyEntry,
  planUndo,
  recordEdit,
  recordUndo,
  settleEdit,
  type EditHistory,
  type HistoryEntry,
  type UndoPlan,
} from '@/stores/history'
import type { LayoutState } from '@/stores/layout-state'

export type HistorySide = keyof EditHistory
type ShownHistory = Pick<LayoutState, 'canUndo' | 'canRedo' | 'undoLabel' | 'redoLabel'>

/** Others' edits remembered to name who changed a field; for older ones it says "changed since". */
const MAX_REMEMBERED = 300

export class OwnHistory {
  #history: EditHistory = EMPTY_HISTORY
  #othersEdits: AcceptedEdit[] = []

  constructor(private readonly show: (shown: ShownHistory) => void) {}

  last(side: HistorySide): HistoryEntry | null {
    return this.#history[side].at(-1) ?? null
  }

  plan(document: LayoutDocument, entry: HistoryEntry): UndoPlan {
    return planUndo(document, entry, (operation) => this.#lastWriter(operation))
  }

  /** `undoing` names the side whose last entry this edit undoes; null for a new edit. */
  record(
    undoing: HistorySide | null,
    edit: { editId: string; label: string },
    documentBefore: LayoutDocument,
    applied: Operation[],
  ): void {
    const entry = historyEntry(edit.editId, edit.label, documentBefore, applied)
    this.#set(undoing === null ? recordEdit(this.#history, entry) : recordUndo(this.#history, undoing, entry))
  }

  drop(side: HistorySide): void {
    this.#set(dropLast(this.#history, side))
  }

  forget(editId: string): void {
    this.#set(forgetEdit(this.#history, editId))
  }

  settle(editId: string, documentBefore: LayoutDocument, operations: Operation[]): void {
    this.#set(settleEdit(this.#history, editId, documentBefore, operations))
  }

  clear(): void {
    this.#set(EMPTY_HISTORY)
  }

  remember(othersEdit: AcceptedEdit): void {
    this.#othersEdits = [...this.#othersEdits, othersEdit].slice(-MAX_REMEMBERED)
  }

  #lastWriter(operation: SetOperation): string | null {
    const isIt = (theirs: Operation) => theirs.type === 'set' && setsSameField(theirs, operation)
    return [...this.#othersEdits].reverse().find((edit) => edit.operations.some(isIt))?.userName ?? null
  }

  #set(history: EditHistory): void {
    this.#history = history
    const undoLabel = this.last('undo')?.label ?? null
    const redoLabel = this.last('redo')?.label ?? null
    this.show({ canUndo: undoLabel !== null, canRedo: redoLabel !== null, undoLabel, redoLabel })
  }
}
