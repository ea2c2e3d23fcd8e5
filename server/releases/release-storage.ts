/** A release as services and repository exchange it; rows stay in the repository. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Acceptance, MethodNotes } from '@shared/protocol/releases'
import type { LayoutResults } from '@shared/recalculation/layout-results'

export interface Withdrawal {
  reason: string
  withdrawnBy: string
  withdrawnByName: string
  withdrawnAt: string
}

/** Everything the release hash covers. */
export interface ReleaseContent {
  id: string
  workspaceId: string
  workspaceName: string
  layoutId: string
  layoutName: string
  sequence: number
  revisionLetter: string
  revision: number
  document: LayoutDocument
  documentHash: string
  results: LayoutResults
  engineVersion: string
  method: MethodNotes
  verdict: 'passes' | 'fails'
  acceptances: Acceptance[]
  note: string
  reviewAskedByName: string | null
  reviewAskedAt: string | null
  frozenBy: string
  frozenByName: string
  frozenAt: string
  previousHash: string | null
}

export interface StoredRelease extends ReleaseContent {
  releaseHash: string
  withdrawal: Withdrawal | null
}
