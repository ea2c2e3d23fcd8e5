/** Sentences for what happened between people. */
import { newId } from '@shared/layout/new-ids'
import type { AcceptedEdit, EditNotice } from '@shared/protocol/realtime'
import type { Notice } from '@/stores/layout-state'

/** Of an edit of one's own: what it overwrote, what of it found its target gone. */
export function ownNotices(label: string, notices: readonly EditNotice[], at: string): Notice[] {
  return notices.map((notice) => {
    const by = notice.byName ?? 'somebody'
    const message =
      notice.kind === 'overwrote'
        ? `You replaced ${by}’s value: ${notice.what}.`
        : notice.byName === null
          ? `Part of “${label}” had no effect: ${notice.what} is not there.`
          : `Part of “${label}” had no effect: ${notice.byName} has removed ${notice.what}.`
    return { ...notice, id: newId('notice'), isMine: true, label, at, message }
  })
}

/** Of somebody else's edit, for the person it touched. */
export function othersNotices(edit: AcceptedEdit, userId: string): Notice[] {
  return edit.notices
    .filter((notice) => notice.byUserId === userId)
    .map((notice) => ({
      ...notice,
      id: newId('notice'),
      isMine: true,
      label: edit.label,
      at: edit.acceptedAt,
      message:
        notice.kind === 'overwrote'
          ? `${edit.userName} replaced your value: ${notice.what}.`
          : `${edit.userName}’s “${edit.label}” had no effect on ${notice.what}, which you had removed.`,
    }))
}

export function droppedForOthers(
  dropped: { userName: string; label: string; notices: readonly EditNotice[] },
  at: string,
): Notice[] {
  return dropped.notices.map((notice) => ({
    ...notice,
    id: newId('notice'),
    isMine: true,
    label: dropped.label,
    at,
    message: `${dropped.userName}’s “${dropped.label}” had no effect on ${notice.what}, which you had removed.`,
  }))
}

export function undoNotice(
  kind: 'undoSkipped' | 'undoRefused',
  label: string,
  message: string,
  at: string,
): Notice {
  return {
    id: newId('notice'),
    kind,
    what: label,
    byName: null,
    byUserId: null,
    isMine: true,
    label,
    at,
    message,
  }
}
