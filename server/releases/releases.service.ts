/**
 * Review, freeze, withdraw, next revision. Each goes through the queue of the layout's room and one
 * transaction together with its log entry, so that every edit is either in a release or refused.
 */
import { canonicalJson } from '@shared/layout/canonical-json'
import { compareLayouts } from '@shared/comparison/compare-layouts'
import type { LayoutSummary } from '@shared/protocol/layouts'
import type {
  DeskLayout,
  FreezeBody,
  ReleaseDesk,
  ReleaseSummary,
  ReleaseView,
} from '@shared/protocol/releases'
import { nextRevisionLetter } from '@shared/protocol/revision-letter'
import { inputHash } from '@shared/recalculation/input-hash'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { assertCan } from '../accounts/policy'
import type { Principal } from '../accounts/principal'
import type { AppDatabase } from '../database/open-database'
import type { SqliteEditTransaction } from '../edits/edits.repository'
import { conflict, notFound } from '../http/http-error'
import { safeFileName } from '../http/safe-file-name'
import type { LayoutsService } from '../layouts/layouts.service'
import type { LayoutRooms } from '../realtime/layout-rooms'
import { drawReleaseSheet } from '../sheets/release-sheet'
import type { ReleaseMails } from './release-mails'
import { isIntact } from './release-hash'
import type { StoredRelease } from './release-storage'
import { deskFindings, deviationsOf, sheetOfRelease, summaryOfRelease, viewOfRelease } from './release-words'
import {
  findRelease,
  findReviewedLayout,
  hashBefore,
  insertWithdrawal,
  latestRelease,
  layoutsInReview,
  nextRevisionDrafts,
  releasesOfLayout,
  releasesOfWorkspace,
  type ReviewedLayout,
  setLayoutStatus,
} from './releases.repository'
import { storeRelease } from './store-release'

export interface ReleasesService {
  desk(principal: Principal, workspaceId: string): ReleaseDesk
  ofLayout(principal: Principal, layoutId: string): ReleaseSummary[]
  view(principal: Principal, releaseId: string): ReleaseView
  sheet(principal: Principal, releaseId: string): Promise<{ fileName: string; content: Buffer }>
  documentFile(principal: Principal, releaseId: string): { fileName: string; content: string }
  askReview(principal: Principal, layoutId: string, note: string): Promise<LayoutSummary>
  takeBackReview(principal: Principal, layoutId: string): Promise<LayoutSummary>
  freeze(principal: Principal, layoutId: string, body: FreezeBody): Promise<ReleaseSummary>
  withdraw(principal: Principal, releaseId: string, reason: string): Promise<ReleaseSummary>
  nextRevision(principal: Principal, layoutId: string): Promise<LayoutSummary>
}

/** A sheet is about 100 kB and half a second of work. */
const MAX_KEPT_SHEETS = 20

export interface ReleasesParts {
  database: AppDatabase
  rooms: Pick<LayoutRooms<SqliteEditTransaction>, 'changeStatus'>
  layouts: Pick<LayoutsService, 'summary'>
  mails: ReleaseMails
  now?: () => Date
}

export function createReleasesService({
  database,
  rooms,
  layouts,
  mails,
  now = () => new Date(),
}: ReleasesParts): ReleasesService {
  const sheets = new Map<string, Promise<Buffer>>()

  function storedLayout(layoutId: string): ReviewedLayout {
    const layout = findReviewedLayout(database, layoutId)
    if (!layout) throw notFound()
    return layout
  }

  function readableRelease(principal: Principal, releaseId: string): StoredRelease {
    const release = findRelease(database, releaseId)
    if (!release) throw notFound()
    assertCan(principal, 'release:read', { workspaceId: release.workspaceId })
    return release
  }

  /** A release and its withdrawal never change, so neither does its sheet. */
  function drawnSheet(release: StoredRelease): Promise<Buffer> {
    const key = `${release.id} ${release.withdrawal?.withdrawnAt ?? ''}`
    const kept = sheets.get(key)
    if (kept) return kept
    const drawn = drawReleaseSheet(sheetOfRelease(release))
    // A failure is not kept: the next request tries again.
    drawn.catch(() => sheets.delete(key))
    if (sheets.size >= MAX_KEPT_SHEETS) {
      const [oldest] = sheets.keys()
      if (oldest !== undefined) sheets.delete(oldest)
    }
    sheets.set(key, drawn)
    return drawn
  }

  function deskLayout(layout: ReviewedLayout): DeskLayout {
    const results = recalculateLayout(layout.document)
    const last = latestRelease(database, layout.id)
    return {
      layoutId: layout.id,
      name: layout.document.name,
      status: layout.status,
      revisionLetter: layout.revisionLetter,
      revision: layout.revision,
      verdict: results.verdict,
      failingCount: results.findings.filter((finding) => finding.severity === 'fails').length,
      findings: deskFindings(layout.document, results.findings),
      lastReleaseId: last?.id ?? null,
      lastReleaseLetter: last?.revisionLetter ?? null,
      changeCount: last ? compareLayouts(last.document, layout.document).length : null,
    }
  }

  return {
    desk(principal, workspaceId) {
      assertCan(principal, 'release:read', { workspaceId })
      const releases = releasesOfWorkspace(database, workspaceId)
      return {
        waiting: layoutsInReview(database, workspaceId).map((layout) => ({
          ...deskLayout(layout),
          askedByName: layout.reviewAskedByName ?? '',
          askedAt: layout.reviewAskedAt ?? '',
          note: layout.reviewNote ?? '',
        })),
        drafts: nextRevisionDrafts(database, workspaceId).map(deskLayout),
        releases: releases.map(summaryOfRelease),
        deviations: deviationsOf(releases),
      }
    },

    ofLayout(principal, layoutId) {
      const layout = storedLayout(layoutId)
      assertCan(principal, 'release:read', { workspaceId: layout.workspaceId })
      return releasesOfLayout(database, layoutId).map(summaryOfRelease)
    },

    view(principal, releaseId) {
      const release = readableRelease(principal, releaseId)
      const layout = storedLayout(release.layoutId)
      return viewOfRelease(release, layout, isIntact(release, hashBefore(database, release)))
    },

    async sheet(principal, releaseId) {
      const release = readableRelease(principal, releaseId)
      return {
        fileName: `${fileNameOf(release)}.pdf`,
        content: await drawnSheet(release),
      }
    },

    documentFile(principal, releaseId) {
      const release = readableRelease(principal, releaseId)
      return { fileName: `${fileNameOf(release)}.layout.json`, content: canonicalJson(release.document) }
    },

    async askReview(principal, layoutId, note) {
      assertCan(principal, 'layout:askReview', storedLayout(layoutId))
      await rooms.changeStatus({
        layoutId,
        kind: 'review',
        actor: principal,
        label: 'Ask for review',
        apply: ({ transaction, layout }) => {
          assertCan(principal, 'layout:askReview', layout)
          if (layout.status === 'inReview') throw conflict('Review has been asked for already.')
          const review = { askedBy: principal.userId, askedAt: now().toISOString(), note }
          setLayoutStatus(transaction.sql, layoutId, { status: 'inReview', review })
        },
      })
      mails.reviewAsked(storedLayout(layoutId), principal.name, note)
      return layouts.summary(layoutId)
    },

    async takeBackReview(principal, layoutId) {
      assertCan(principal, 'layout:askReview', storedLayout(layoutId))
      await rooms.changeStatus({
        layoutId,
        kind: 'reviewTakenBack',
        actor: principal,
        label: 'Take review back',
        apply: ({ transaction, layout }) => {
          assertCan(principal, 'layout:askReview', layout)
          if (layout.status !== 'inReview') throw conflict('Review is not asked for.')
          setLayoutStatus(transaction.sql, layoutId, { status: 'draft', review: null })
        },
      })
      return layouts.summary(layoutId)
    },

    async freeze(principal, layoutId, body) {
      const seen = storedLayout(layoutId)
      assertCan(principal, 'layout:freeze', seen)
      const release = await rooms.changeStatus({
        layoutId,
        kind: 'freeze',
        actor: principal,
        label: `Freeze revision ${seen.revisionLetter}`,
        expectedRevision: body.revision,
        apply: ({ transaction, layout }) => {
          assertCan(principal, 'layout:freeze', layout)
          return storeRelease(transaction.sql, layout, principal, body, now())
        },
      })
      mails.frozen(release)
      return summaryOfRelease(release)
    },

    async withdraw(principal, releaseId, reason) {
      const seen = readableRelease(principal, releaseId)
      assertCan(principal, 'release:withdraw', { workspaceId: seen.workspaceId })
      const release = await rooms.changeStatus({
        layoutId: seen.layoutId,
        kind: 'withdraw',
        actor: principal,
        label: `Withdraw revision ${seen.revisionLetter}`,
        apply: ({ transaction, layout }) => {
          const present = findRelease(transaction.sql, releaseId)
          if (!present) throw notFound()
          if (present.withdrawal) throw conflict('This release is withdrawn already.')
          const withdrawal = {
            reason,
            withdrawnBy: principal.userId,
            withdrawnByName: principal.name,
            withdrawnAt: now().toISOString(),
          }
          insertWithdrawal(transaction.sql, releaseId, withdrawal)
          // A draft that has moved on to a later letter goes on as it is.
          if (layout.status === 'released' && layout.revisionLetter === present.revisionLetter)
            setLayoutStatus(transaction.sql, layout.layoutId, { status: 'withdrawn' })
          return { ...present, withdrawal }
        },
      })
      mails.withdrawn(release, principal.name, reason)
      return summaryOfRelease(release)
    },

    async nextRevision(principal, layoutId) {
      const seen = storedLayout(layoutId)
      assertCan(principal, 'layout:nextRevision', { workspaceId: seen.workspaceId })
      await rooms.changeStatus({
        layoutId,
        kind: 'nextRevision',
        actor: principal,
        label: `Start revision ${nextRevisionLetter(seen.revisionLetter)}`,
        apply: ({ transaction, layout }) => {
          if (layout.status !== 'released' && layout.status !== 'withdrawn')
            throw conflict('This revision is not released yet, so it goes on as it is.')
          const release = latestRelease(transaction.sql, layoutId)
          if (release?.documentHash !== inputHash(layout.document))
            throw new Error(`Layout ${layoutId} is not what its last release froze`)
          setLayoutStatus(transaction.sql, layoutId, {
            status: 'draft',
            revisionLetter: nextRevisionLetter(layout.revisionLetter),
            review: null,
          })
        },
      })
      return layouts.summary(layoutId)
    },
  }
}

const fileNameOf = (release: StoredRelease) =>
  `${safeFileName(release.layoutName)}-revision-${release.revisionLetter}`
