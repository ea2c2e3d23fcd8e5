/**
 * One person's own edits, and how to undo one of them now. Pure data: an undo is a new edit built
 * against the present document, never a return to an old one, so what others did since stays.
 */
import { applyOperation } from '@shared/layout/apply-operations'
import { hubDependents } from '@shared/layout/apply-remove'
import { readField } from '@shared/layout/apply-set'
import { equalValues } from '@shared/layout/equal-values'
import { operationWords, targetWords } from '@shared/layout/field-words'
import { findLoadCase, findTarget, hasHub, orderOf, targetKey } from '@shared/layout/find-target'
import { invertOperations } from '@shared/layout/invert-operations'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type {
  AddOperation,
  Operation,
  RemoveOperation,
  ReorderOperation,
  SetOperation,
} from '@shared/layout/operations'
import { settableField } from '@shared/layout/settable-fields'
import { seatUnder } from '@shared/layout/shaft-geometry'
import { targetOfAdded } from '@shared/layout/target-of-added'

export interface HistoryEntry {
  editId: string
  label: string
  /** As applied: what an untouched document still shows of this edit. */
  applied: Operation[]
  inverse: Operation[]
  /** Hubs that this edit removed and that stood on the shaft then. */
  seatedHubs: string[]
}

export interface EditHistory {
  undo: readonly HistoryEntry[]
  redo: readonly HistoryEntry[]
}

export type UndoPlan =
  { kind: 'edit'; operations: Operation[]; skipped: string[] } | { kind: 'refused'; message: string }

export const EMPTY_HISTORY: EditHistory = { undo: [], redo: [] }

/** Enough for a working day; each entry keeps what it removed. */
const MAX_ENTRIES = 200

export function historyEntry(
  editId: string,
  label: string,
  documentBefore: LayoutDocument,
  applied: Operation[],
): HistoryEntry {
  const seatedHubs = applied.flatMap((operation) => {
    if (operation.type !== 'remove' || operation.target.kind !== 'hub') return []
    const { id } = operation.target
    const hub = documentBefore.hubs.find((each) => each.id === id)
    return hub && seatUnder(documentBefore, hub) ? [id] : []
  })
  return { editId, label, applied, inverse: invertOperations(documentBefore, applied), seatedHubs }
}

/** A new edit of the person's own: what was undone before can no longer be redone. */
export function recordEdit(history: EditHistory, entry: HistoryEntry): EditHistory {
  return { undo: pushed(history.undo, entry), redo: [] }
}

/** The last entry of `from` was undone by the edit that `entry` stands for. */
export function recordUndo(history: EditHistory, from: keyof EditHistory, entry: HistoryEntry): EditHistory {
  const to = from === 'undo' ? 'redo' : 'undo'
  return { ...history, [from]: history[from].slice(0, -1), [to]: pushed(history[to], entry) }
}

export function dropLast(history: EditHistory, from: keyof EditHistory): EditHistory {
  return { ...history, [from]: history[from].slice(0, -1) }
}

/** The server refused the edit, or it came to nothing: there is nothing to undo. */
export function forgetEdit(history: EditHistory, editId: string): EditHistory {
  const keep = (entry: HistoryEntry) => entry.editId !== editId
  return { undo: history.undo.filter(keep), redo: history.redo.filter(keep) }
}

/**
 * The server's order is known now. Undoing must give back what stood there in that order, which
 * may be a value that somebody else set just before.
 */
export function settleEdit(
  history: EditHistory,
  editId: string,
  documentBefore: LayoutDocument,
  operations: Operation[],
): EditHistory {
  const settle = (entry: HistoryEntry) =>
    entry.editId === editId ? historyEntry(editId, entry.label, documentBefore, operations) : entry
  return { undo: history.undo.map(settle), redo: history.redo.map(settle) }
}

/** `changedBy` names who last set a field, as far as this browser saw it. */
export function planUndo(
  document: LayoutDocument,
  entry: HistoryEntry,
  changedBy: (operation: SetOperation) => string | null,
): UndoPlan {
  let current = document
  const operations: Operation[] = []
  const skipped: string[] = []
  for (const inverse of entry.inverse) {
    const step = planStep(current, entry, inverse, changedBy)
    if (step.kind === 'refused') return step
    if (step.kind === 'skipped') {
      if (step.what !== null) skipped.push(step.what)
      continue
    }
    const result = applyOperation(current, inverse)
    current = result.document
    for (const applied of result.applied) operations.push(applied)
  }
  if (operations.length > 0) return { kind: 'edit', operations, skipped }
  const what = skipped.length > 0 ? skipped.join('; ') : 'it no longer shows in the layout'
  return { kind: 'refused', message: `“${entry.label}” was not undone: ${what}.` }
}

type Step =
  | { kind: 'do' }
  /** `what` is null when there is nothing to say: the wanted state is there already. */
  | { kind: 'skipped'; what: string | null }
  | { kind: 'refused'; message: string }

const DO: Step = { kind: 'do' }
const ALREADY_SO: Step = { kind: 'skipped', what: null }

function planStep(
  document: LayoutDocument,
  entry: HistoryEntry,
  inverse: Operation,
  changedBy: (operation: SetOperation) => string | null,
): Step {
  switch (inverse.type) {
    case 'set':
      return planSet(document, inverse, changedBy)
    case 'remove':
      return planRemove(document, entry, inverse)
    case 'add':
      return planAdd(document, entry, inverse)
    case 'reorder':
      return planReorder(document, entry, inverse)
  }
}

/** Only what still has the value this edit gave it is set back. */
function planSet(
  document: LayoutDocument,
  inverse: SetOperation,
  changedBy: (operation: SetOperation) => string | null,
): Step {
  const target = findTarget(document, inverse.target)
  const field = settableField(inverse.target.kind, inverse.field)
  if (!target || !field) {
    return { kind: 'skipped', what: `${operationWords(document, inverse)} is no longer there` }
  }
  const present = readField(target, field.path)
  if (equalValues(present ?? null, inverse.value ?? null)) return ALREADY_SO
  if (equalValues(present ?? null, inverse.before ?? null)) return DO
  const by = changedBy(inverse)
  const words = operationWords(document, inverse)
  return { kind: 'skipped', what: `${words} has been changed since${by === null ? '' : ` by ${by}`}` }
}

/** Taking back an addition must not take somebody else's work on it along. */
function planRemove(document: LayoutDocument, entry: HistoryEntry, inverse: RemoveOperation): Step {
  const present = findTarget(document, inverse.target)
  if (!present) return ALREADY_SO
  const added = entry.applied.find(
    (operation): operation is AddOperation =>
      operation.type === 'add' && targetKey(targetOfAdded(operation)) === targetKey(inverse.target),
  )
  const dependents = inverse.target.kind === 'hub' ? hubDependents(document, inverse.target.id) : []
  if (equalValues(present, added?.item) && dependents.length === 0) return DO
  const words = targetWords(document, inverse.target)
  return {
    kind: 'refused',
    message: `“${entry.label}” was not undone: ${words} has been worked on since and would be lost.`,
  }
}

/** What was removed comes back only where it still has a place. */
function planAdd(document: LayoutDocument, entry: HistoryEntry, inverse: AddOperation): Step {
  if (findTarget(document, targetOfAdded(inverse))) return ALREADY_SO
  const refused = (why: string): Step => ({
    kind: 'refused',
    message: `“${entry.label}” was not undone: ${why}.`,
  })
  switch (inverse.collection) {
    case 'hubs': {
      const hadSeat = entry.seatedHubs.includes(inverse.item.id)
      return hadSeat && !seatUnder(document, inverse.item)
        ? refused(`there is no shaft under ${inverse.item.name} any more`)
        : DO
    }
    case 'loads':
      if (!findLoadCase(document, inverse.loadCaseId)) return refused('the load case of its load is gone')
      return hasHub(document, inverse.item.hub) ? DO : refused('the hub of its load is gone')
    case 'timing':
      return hasHub(document, inverse.item.hub) ? DO : refused('the hub of its timing is gone')
    case 'sections':
    case 'bearings':
    case 'loadCases':
      return DO
  }
}

function planReorder(document: LayoutDocument, entry: HistoryEntry, inverse: ReorderOperation): Step {
  const moved = entry.applied.find(
    (operation): operation is ReorderOperation =>
      operation.type === 'reorder' && targetKey(operation.target) === targetKey(inverse.target),
  )
  const present = orderOf(document, inverse.target)
  if (present === inverse.index) return ALREADY_SO
  if (present === moved?.index) return DO
  return { kind: 'skipped', what: `${operationWords(document, inverse)} has been changed since` }
}

function pushed(entries: readonly HistoryEntry[], entry: HistoryEntry): HistoryEntry[] {
  return [...entries, entry].slice(-MAX_ENTRIES)
}
