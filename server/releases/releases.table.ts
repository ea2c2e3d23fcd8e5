/** Rows of releases. Both tables refuse every change after the insert, by triggers. */

export interface LayoutReleaseTable {
  id: string
  workspace_id: string
  /** Names as they were at freezing, so that a sheet never changes with a later renaming. */
  workspace_name: string
  layout_id: string
  layout_name: string
  /** 1 for the first release of the layout. */
  sequence: number
  revision_letter: string
  /** Revision of the document at freezing. */
  revision: number
  /** Canonical JSON: the text whose SHA-256 is `document_hash`. */
  document: string
  document_hash: string
  results: string
  engine_version: string
  /** What the engine of that day did and did not cover, as printed on the sheet. */
  method: string
  verdict: 'passes' | 'fails'
  acceptances: string
  note: string
  review_asked_by_name: string | null
  review_asked_at: string | null
  frozen_by: string
  frozen_by_name: string
  frozen_at: string
  /** `release_hash` of the release before it in this layout; null for the first. */
  previous_hash: string | null
  /** SHA-256 over everything above. */
  release_hash: string
}

export interface LayoutReleaseWithdrawalTable {
  release_id: string
  reason: string
  withdrawn_by: string
  withdrawn_by_name: string
  withdrawn_at: string
}
