/** This release against another one of its layout, or against the layout as it is now. */
import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { LoadFailure } from '@/components/load-failure'
import { SelectField } from '@/components/select-field'
import { Spinner } from '@/components/spinner'
import { messageOf } from '@/lib/http-client'
import { compareLayouts } from '@shared/comparison/compare-layouts'
import type { ReleaseSummary } from '@shared/protocol/releases'
import { layoutReleasesQuery } from '../api/layout-releases'
import { layoutViewQuery } from '../api/layout-view'
import { type ReleaseDetails, releaseQuery } from '../api/release'
import { ChangeList } from './change-list'

const NOW = 'now'

export function ReleaseCompare({ workspaceId, release }: { workspaceId: string; release: ReleaseDetails }) {
  const releases = useQuery(layoutReleasesQuery(workspaceId, release.layoutId))
  const [chosen, setChosen] = useState<string | null>(null)
  if (releases.isPending) return <Spinner label="Loading the other releases" />
  if (!releases.data)
    return (
      <LoadFailure
        message={messageOf(releases.error)}
        isRetrying={releases.isFetching}
        onRetry={() => void releases.refetch()}
      />
    )
  const others = releases.data.filter((other) => other.id !== release.id)
  const hasDraft = release.layoutStatus === 'draft' || release.layoutStatus === 'inReview'
  const options = [
    ...(hasDraft ? [{ value: NOW, label: `Draft of revision ${release.layoutRevisionLetter}` }] : []),
    ...others.map((other) => ({ value: other.id, label: `Release ${other.revisionLetter}` })),
  ]
  const earlier = nearestEarlier(others, release)
  const selected = chosen ?? earlier?.id ?? options[0]?.value
  if (selected === undefined)
    return (
      <p className="text-sm">This is the only release of the layout and no draft has moved on from it.</p>
    )
  const other = others.find((each) => each.id === selected)
  return (
    <div className="grid grid-cols-1 gap-4">
      <div className="max-w-xs">
        <SelectField label="Compare with" value={selected} options={options} onValueChange={setChosen} />
      </div>
      {other ? <AgainstRelease release={release} other={other} /> : <AgainstDraft release={release} />}
    </div>
  )
}

function AgainstRelease({ release, other }: { release: ReleaseDetails; other: ReleaseSummary }) {
  const query = useQuery(releaseQuery(other.id))
  if (query.isPending) return <Spinner label="Comparing" />
  if (!query.data)
    return (
      <LoadFailure
        message={messageOf(query.error)}
        isRetrying={query.isFetching}
        onRetry={() => void query.refetch()}
      />
    )
  // The older one is always the "before".
  const [before, after] = other.frozenAt < release.frozenAt ? [query.data, release] : [release, query.data]
  return (
    <ChangeList
      differences={compareLayouts(before.document, after.document)}
      beforeName={`release ${before.revisionLetter}`}
      afterName={`release ${after.revisionLetter}`}
    />
  )
}

function AgainstDraft({ release }: { release: ReleaseDetails }) {
  const layout = useQuery({ ...layoutViewQuery(release.layoutId, 0), staleTime: 0 })
  if (layout.isPending) return <Spinner label="Comparing" />
  if (!layout.data)
    return (
      <LoadFailure
        message={messageOf(layout.error)}
        isRetrying={layout.isFetching}
        onRetry={() => void layout.refetch()}
      />
    )
  return (
    <ChangeList
      differences={compareLayouts(release.document, layout.data.document)}
      beforeName={`release ${release.revisionLetter}`}
      afterName={`draft ${layout.data.revisionLetter}`}
    />
  )
}

function nearestEarlier(others: readonly ReleaseSummary[], release: ReleaseSummary) {
  return others
    .filter((other) => other.frozenAt < release.frozenAt)
    .sort((a, b) => b.frozenAt.localeCompare(a.frozenAt))[0]
}
