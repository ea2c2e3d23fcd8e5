/** Sends an edit and says so when it could not be taken: an edit never disappears in silence. */
import type { Operation } from '@shared/layout/operations'
import { showToast } from '@/components/toast-store'
import type { LayoutSession } from '@/sync/layout-session'

export function commitEdit(session: LayoutSession, label: string, operations: Operation[]): boolean {
  if (operations.length === 0) return false
  const result = session.commit(label, operations)
  if (result.kind === 'readOnly' || result.kind === 'tooLarge') showToast(result.message, 'bad')
  return result.kind === 'pending'
}
