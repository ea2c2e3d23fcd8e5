import type { LayoutStatus } from '@shared/protocol/layouts'

export interface LayoutTable {
  id: string
  workspace_id: string
  name: string
  project: string | null
  status: LayoutStatus
  revision_letter: string
  /** Number of the last entry of its log; 0 when nothing was edited yet. */
  revision: number
  /** Changes when a backup is restored, so that clients resynchronise instead of trusting old revisions. */
  epoch: string
  document: string
  is_archived: 0 | 1
  created_at: string
  created_by: string
  edited_at: string
  edited_by: string
  review_asked_by: string | null
  review_asked_at: string | null
  review_note: string | null
}
