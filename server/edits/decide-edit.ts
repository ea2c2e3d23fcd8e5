/** What an edit comes to, given the document and what others did meanwhile. Data in, plan out. */
import { applyOperations } from '@shared/layout/apply-operations'
import type { DroppedOperation } from '@shared/layout/apply-result'
import { operationWords } from '@shared/layout/field-words'
import { findLoadCase, hasHub } from '@shared/layout/find-target'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation, Target } from '@shared/layout/operations'
import { targetOfAdded } from '@shared/layout/target-of-added'
import { removesTarget, setsSameField } from '@shared/layout/touches'
import type { AcceptedEdit, EditNotice } from '@shared/protocol/realtime'

export type EditDecision =
  | {
      kind: 'accepted' | 'adjusted'
      document: LayoutDocument
      operations: Operation[]
      notices: EditNotice[]
    }
  | { kind: 'noEffect'; notices: EditNotice[] }
  | { kind: 'invalid'; message: string }

/** `since` are the log entries after the revision the author saw. */
export function decideEdit(
  document: LayoutDocument,
  operations: readonly Operation[],
  authorId: string,
  since: readonly AcceptedEdit[],
): EditDecision {
  const result = applyOperations(document, operations)
  const invalid = result.dropped.find((dropped) => dropped.reason === 'invalidValue')
  if (invalid) {
    return {
      kind: 'invalid',
      message: `This value cannot be stored: ${operationWords(document, invalid.operation)}`,
    }
  }

  const others = since.filter((entry) => entry.userId !== authorId)
  const lost = result.dropped.filter((dropped) => dropped.reason !== 'noChange')
  const notices = [
    ...overwriteNotices(document, result.applied, others),
    ...lost.map((dropped) => droppedNotice(document, dropped, since)),
  ]
  if (result.applied.length === 0) return { kind: 'noEffect', notices }
  const isWhole = lost.length === 0 && result.applied.length + result.dropped.length === operations.length
  return {
    kind: isWhole ? 'accepted' : 'adjusted',
    document: result.document,
    operations: result.applied,
    notices,
  }
}

function overwriteNotices(
  document: LayoutDocument,
  applied: readonly Operation[],
  others: readonly AcceptedEdit[],
): EditNotice[] {
  return applied.flatMap((operation): EditNotice[] => {
    if (operation.type !== 'set') return []
    // The last of them holds the value that is overwritten now.
    const entry = [...others]
      .reverse()
      .find((other) =>
        other.operations.some((theirs) => theirs.type === 'set' && setsSameField(theirs, operation)),
      )
    if (!entry) return []
    return [
      {
        kind: 'overwrote',
        what: operationWords(document, operation),
        byName: entry.userName,
        byUserId: entry.userId,
      },
    ]
  })
}

function droppedNotice(
  document: LayoutDocument,
  { operation }: DroppedOperation,
  since: readonly AcceptedEdit[],
): EditNotice {
  const missing = missingTarget(document, operation)
  for (const entry of [...since].reverse()) {
    const removal = entry.operations.find((theirs) => missing !== null && removesTarget(theirs, missing))
    if (removal?.type !== 'remove') continue
    return {
      kind: 'dropped',
      what: removal.name ?? operationWords(document, operation),
      byName: entry.userName,
      byUserId: entry.userId,
    }
  }
  return { kind: 'dropped', what: operationWords(document, operation), byName: null, byUserId: null }
}

/** What was needed and is gone: the target itself, or the hub or load case that an addition belongs to. */
function missingTarget(document: LayoutDocument, operation: Operation): Target | null {
  if (operation.type !== 'add') return operation.target
  switch (operation.collection) {
    case 'loads':
      return findLoadCase(document, operation.loadCaseId)
        ? missingHub(document, operation.item.hub)
        : { kind: 'loadCase', id: operation.loadCaseId }
    case 'timing':
      return missingHub(document, operation.item.hub)
    case 'sections':
    case 'hubs':
    case 'bearings':
    case 'loadCases':
      return targetOfAdded(operation)
  }
}

function missingHub(document: LayoutDocument, id: string): Target | null {
  return hasHub(document, id) ? null : { kind: 'hub', id }
}
