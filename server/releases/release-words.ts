/** Releases in the words of the protocol. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { DeskFinding, ReleaseDesk, ReleaseSummary, ReleaseView } from '@shared/protocol/releases'
import type { Finding } from '@shared/recalculation/layout-results'
import type { SheetRelease } from '../sheets/sheet-release'
import { loadCaseWords, partWords } from '../sheets/sheet-words'
import type { StoredRelease } from './release-storage'
import type { ReviewedLayout } from './releases.repository'

export function summaryOfRelease(release: StoredRelease): ReleaseSummary {
  return {
    id: release.id,
    layoutId: release.layoutId,
    layoutName: release.layoutName,
    revisionLetter: release.revisionLetter,
    revision: release.revision,
    status: release.withdrawal ? 'withdrawn' : 'released',
    frozenAt: release.frozenAt,
    frozenByName: release.frozenByName,
    engineVersion: release.engineVersion,
    documentHash: release.documentHash,
    verdict: release.verdict,
    acceptanceCount: release.acceptances.length,
    note: release.note,
    withdrawnAt: release.withdrawal?.withdrawnAt ?? null,
    withdrawnByName: release.withdrawal?.withdrawnByName ?? null,
    withdrawalReason: release.withdrawal?.reason ?? null,
  }
}

export function viewOfRelease(
  release: StoredRelease,
  layout: Pick<ReviewedLayout, 'status' | 'revisionLetter'>,
  isIntact: boolean,
): ReleaseView {
  return {
    ...summaryOfRelease(release),
    workspaceName: release.workspaceName,
    document: release.document,
    results: release.results,
    acceptances: release.acceptances,
    reviewAskedByName: release.reviewAskedByName,
    reviewAskedAt: release.reviewAskedAt,
    releaseHash: release.releaseHash,
    previousHash: release.previousHash,
    integrity: isIntact ? 'intact' : 'broken',
    method: release.method,
    layoutStatus: layout.status,
    layoutRevisionLetter: layout.revisionLetter,
  }
}

export function sheetOfRelease({ withdrawal, ...release }: StoredRelease): SheetRelease {
  return {
    ...release,
    withdrawal: withdrawal && {
      at: withdrawal.withdrawnAt,
      byName: withdrawal.withdrawnByName,
      reason: withdrawal.reason,
    },
  }
}

export function deskFindings(document: LayoutDocument, findings: readonly Finding[]): DeskFinding[] {
  return findings.flatMap(({ code, severity, part, loadCase, message }) =>
    severity === 'notes' ? [] : [{ code, severity, message, ...placeWords(document, part, loadCase) }],
  )
}

/** Withdrawn releases no longer bind anyone, so their deviations are not listed. */
export function deviationsOf(releases: readonly StoredRelease[]): ReleaseDesk['deviations'] {
  return releases.flatMap((release) =>
    release.withdrawal
      ? []
      : release.acceptances.map(({ code, part, loadCase, reason }) => ({
          releaseId: release.id,
          layoutName: release.layoutName,
          revisionLetter: release.revisionLetter,
          code,
          ...placeWords(release.document, part, loadCase),
          reason,
          acceptedByName: release.frozenByName,
          acceptedAt: release.frozenAt,
        })),
  )
}

function placeWords(document: LayoutDocument, part: string, loadCase: string | null) {
  return {
    part,
    partName: partWords(document, part),
    loadCase,
    loadCaseName: loadCase === null ? null : loadCaseWords(document, loadCase),
  }
}
