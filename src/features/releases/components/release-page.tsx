/** One release, read only: what was frozen, with what results, and how it differs from others. */
import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { Link, useSearchParams } from 'react-router'
import { Banner } from '@/components/banner'
import { Button, buttonClasses } from '@/components/button'
import { EmptyState } from '@/components/empty-state'
import { LoadFailure } from '@/components/load-failure'
import { Spinner } from '@/components/spinner'
import { type TabItem, Tabs } from '@/components/tabs'
import { paths } from '@/config/paths'
import { formatDateTime } from '@/lib/format-time'
import { HttpError, messageOf } from '@/lib/http-client'
import { usePreferencesStore } from '@/stores/preferences-store'
import { type Role, roleCovers } from '@shared/protocol/roles'
import { type ReleaseDetails, releaseQuery } from '../api/release'
import { DocumentButton } from './document-button'
import { NextRevisionDialog } from './next-revision-dialog'
import { ReleaseCompare } from './release-compare'
import { ReleaseDrawing } from './release-drawing'
import { ReleaseFacts } from './release-facts'
import { ReleaseFindings } from './release-findings'
import { ReleaseMethod } from './release-method'
import { ReleaseSchedule } from './release-schedule'
import { ReleaseShaft } from './release-shaft'
import { WithdrawDialog } from './withdraw-dialog'

const TABS = ['schedule', 'findings', 'shaft', 'compare', 'method'] as const
type TabId = (typeof TABS)[number]
const isTab = (value: string | null): value is TabId => TABS.some((tab) => tab === value)

export function ReleasePage({
  workspaceId,
  releaseId,
  role,
}: {
  workspaceId: string
  releaseId: string
  role: Role
}) {
  const query = useQuery(releaseQuery(releaseId))
  if (query.isPending) return <Spinner label="Loading the release" />
  if (!query.data) {
    if (query.error instanceof HttpError && query.error.code === 'not-found')
      return (
        <EmptyState
          title="There is no such release"
          action={
            <Link to={paths.releases(workspaceId)} className={buttonClasses()}>
              To the release desk
            </Link>
          }
        >
          It does not exist, or you may not see it.
        </EmptyState>
      )
    return (
      <LoadFailure
        message={messageOf(query.error)}
        isRetrying={query.isFetching}
        onRetry={() => void query.refetch()}
      />
    )
  }
  return <LoadedRelease workspaceId={workspaceId} release={query.data} role={role} />
}

function LoadedRelease({
  workspaceId,
  release,
  role,
}: {
  workspaceId: string
  release: ReleaseDetails
  role: Role
}) {
  const units = usePreferencesStore((state) => state.units)
  const [search, setSearch] = useSearchParams()
  const asked = search.get('show')
  const tab: TabId = isTab(asked) ? asked : 'schedule'
  const [dialog, setDialog] = useState<'withdraw' | 'nextRevision' | null>(null)
  const isManager = roleCovers(role, 'manager')
  const isCurrent =
    release.layoutRevisionLetter === release.revisionLetter &&
    (release.layoutStatus === 'released' || release.layoutStatus === 'withdrawn')
  const failing = release.results.findings.filter((finding) => finding.severity === 'fails').length
  const items: TabItem[] = [
    { id: 'schedule', label: 'Fit schedule' },
    { id: 'findings', label: failing > 0 ? `Findings (${failing} accepted)` : 'Findings' },
    { id: 'shaft', label: 'Shaft' },
    { id: 'compare', label: 'Compare' },
    { id: 'method', label: 'Method and limits' },
  ]
  return (
    <article>
      <div className="mb-5 flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <div className="min-w-0">
          <p className="text-sm">
            <Link to={paths.releases(workspaceId)} className="text-quiet hover:underline">
              Release desk
            </Link>
          </p>
          <h1 className="text-2xl font-extrabold tracking-tight wrap-break-word">
            {release.layoutName}, revision {release.revisionLetter}
          </h1>
        </div>
        <div className="flex flex-wrap gap-3">
          <DocumentButton releaseId={release.id} file="sheet.pdf" label="Release sheet" variant="primary" />
          <DocumentButton releaseId={release.id} file="document.json" label="Layout file" />
          <Link to={paths.bench(workspaceId, release.layoutId)} className={buttonClasses()}>
            Open on the bench
          </Link>
          {isManager && isCurrent && (
            <Button onClick={() => setDialog('nextRevision')}>Start next revision</Button>
          )}
          {isManager && release.status === 'released' && (
            <Button onClick={() => setDialog('withdraw')}>Withdraw</Button>
          )}
        </div>
      </div>
      <div className="grid grid-cols-1 gap-5">
        {release.integrity === 'broken' && (
          <Banner tone="bad" title="What is stored no longer agrees with its hashes">
            Somebody changed the database behind the program. Do not build from this release; compare with a
            backup.
          </Banner>
        )}
        {release.withdrawnAt !== null && (
          <Banner tone="bad" title="Withdrawn. Do not build from it.">
            {release.withdrawnByName}, {formatDateTime(release.withdrawnAt)}: {release.withdrawalReason}
          </Banner>
        )}
        {release.note !== '' && <p className="max-w-prose text-sm wrap-break-word">{release.note}</p>}
        <ReleaseFacts release={release} />
        <div
          className="overflow-x-auto border border-hairline bg-card px-2 py-3"
          tabIndex={0}
          role="region"
          aria-label="Drawing"
        >
          <ReleaseDrawing document={release.document} results={release.results.hubs} />
        </div>
        <div>
          <Tabs
            label="Parts of the release"
            items={items}
            selectedId={tab}
            onSelect={(id) => setSearch(id === 'schedule' ? {} : { show: id }, { replace: true })}
            panelClassName="pt-4"
          >
            {tab === 'schedule' && <ReleaseSchedule release={release} units={units} />}
            {tab === 'findings' && <ReleaseFindings release={release} />}
            {tab === 'shaft' && <ReleaseShaft release={release} units={units} />}
            {tab === 'compare' && <ReleaseCompare workspaceId={workspaceId} release={release} />}
            {tab === 'method' && <ReleaseMethod release={release} />}
          </Tabs>
        </div>
      </div>
      {dialog === 'withdraw' && (
        <WithdrawDialog
          workspaceId={workspaceId}
          releaseId={release.id}
          layoutName={release.layoutName}
          letter={release.revisionLetter}
          onClose={() => setDialog(null)}
        />
      )}
      {dialog === 'nextRevision' && (
        <NextRevisionDialog
          workspaceId={workspaceId}
          layoutId={release.layoutId}
          letter={release.revisionLetter}
          onClose={() => setDialog(null)}
        />
      )}
    </article>
  )
}
