/** Freezing itself: what is checked and what is stored, inside the transaction of the log entry. */
import { randomUUID } from 'node:crypto'
import type { FreezeBody } from '@shared/protocol/releases'
import { inputHash } from '@shared/recalculation/input-hash'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import type { Principal } from '../accounts/principal'
import type { WriteTransaction } from '../database/open-database'
import type { StoredLayout } from '../edits/edit-storage'
import { HttpError, notFound } from '../http/http-error'
import { checkAcceptances } from './check-acceptances'
import { METHOD_NOTES } from './method-notes'
import { hashRelease } from './release-hash'
import type { ReleaseContent, StoredRelease } from './release-storage'
import { findReviewedLayout, insertRelease, latestRelease, setLayoutStatus } from './releases.repository'

/** Calculates from the stored document, never from what a client says. Throwing stores nothing. */
export function storeRelease(
  transaction: WriteTransaction,
  layout: StoredLayout,
  principal: Principal,
  body: FreezeBody,
  now: Date,
): StoredRelease {
  const results = recalculateLayout(layout.document)
  const { missing, unknown } = checkAcceptances(results.findings, body.acceptances)
  if (Object.keys(unknown).length > 0)
    throw new HttpError('bad-request', 'A reason is given for something that does not fail.', unknown)
  const missingCount = Object.keys(missing).length
  if (missingCount > 0)
    throw new HttpError(
      'fails',
      missingCount === 1
        ? 'One finding fails and is not accepted.'
        : `${missingCount} findings fail and are not accepted.`,
      missing,
    )
  const about = findReviewedLayout(transaction, layout.layoutId)
  if (!about) throw notFound()
  const previous = latestRelease(transaction, layout.layoutId)
  const content: ReleaseContent = {
    id: randomUUID(),
    workspaceId: layout.workspaceId,
    workspaceName: about.workspaceName,
    layoutId: layout.layoutId,
    layoutName: layout.document.name,
    sequence: (previous?.sequence ?? 0) + 1,
    revisionLetter: layout.revisionLetter,
    revision: layout.revision,
    document: layout.document,
    documentHash: inputHash(layout.document),
    results,
    engineVersion: results.engineVersion,
    method: METHOD_NOTES,
    verdict: results.verdict,
    acceptances: body.acceptances,
    note: body.note ?? '',
    reviewAskedByName: about.reviewAskedByName,
    reviewAskedAt: about.reviewAskedAt,
    frozenBy: principal.userId,
    frozenByName: principal.name,
    frozenAt: now.toISOString(),
    previousHash: previous?.releaseHash ?? null,
  }
  const release = { ...content, releaseHash: hashRelease(content), withdrawal: null }
  insertRelease(transaction, release)
  setLayoutStatus(transaction, layout.layoutId, { status: 'released' })
  return release
}
