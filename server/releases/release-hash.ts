/** Hashes that show a change of what is stored. */
import { createHash } from 'node:crypto'
import { canonicalJson } from '@shared/layout/canonical-json'
import { inputHash } from '@shared/recalculation/input-hash'
import type { ReleaseContent, StoredRelease } from './release-storage'

export function hashRelease(content: ReleaseContent): string {
  // Named one by one, so that a later field does not silently change the hashes of older releases.
  const covered: ReleaseContent = {
    id: content.id,
    workspaceId: content.workspaceId,
    workspaceName: content.workspaceName,
    layoutId: content.layoutId,
    layoutName: content.layoutName,
    sequence: content.sequence,
    revisionLetter: content.revisionLetter,
    revision: content.revision,
    document: content.document,
    documentHash: content.documentHash,
    results: content.results,
    engineVersion: content.engineVersion,
    method: content.method,
    verdict: content.verdict,
    acceptances: content.acceptances,
    note: content.note,
    reviewAskedByName: content.reviewAskedByName,
    reviewAskedAt: content.reviewAskedAt,
    frozenBy: content.frozenBy,
    frozenByName: content.frozenByName,
    frozenAt: content.frozenAt,
    previousHash: content.previousHash,
  }
  return `sha256:${createHash('sha256').update(canonicalJson(covered)).digest('hex')}`
}

/** False when what is stored was changed behind the triggers. */
export function isIntact(release: StoredRelease, previousHash: string | null): boolean {
  return (
    inputHash(release.document) === release.documentHash &&
    hashRelease(release) === release.releaseHash &&
    release.previousHash === previousHash
  )
}
