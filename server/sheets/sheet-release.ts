/** What a sheet is drawn from: the stored release and nothing else. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Acceptance, MethodNotes } from '@shared/protocol/releases'
import type { LayoutResults } from '@shared/recalculation/layout-results'

export interface SheetRelease {
  id: string
  workspaceName: string
  layoutName: string
  revisionLetter: string
  revision: number
  frozenAt: string
  frozenByName: string
  reviewAskedByName: string | null
  reviewAskedAt: string | null
  engineVersion: string
  documentHash: string
  releaseHash: string
  previousHash: string | null
  verdict: 'passes' | 'fails'
  note: string
  document: LayoutDocument
  results: LayoutResults
  method: MethodNotes
  acceptances: Acceptance[]
  withdrawal: { at: string; byName: string; reason: string } | null
}
