import { useQuery } from '@tanstack/react-query'
import { type ReactNode, useState } from 'react'
import { EmptyState } from '@/components/empty-state'
import { LoadFailure } from '@/components/load-failure'
import { Spinner } from '@/components/spinner'
import { TextField } from '@/components/text-field'
import { formatAgo, formatDateTime } from '@/lib/format-time'
import { messageOf } from '@/lib/http-client'
import { releaseDeskQuery } from '../api/release-desk'
import { DeskLayoutRow } from './desk-layout-row'
import { DeviationList } from './deviation-list'
import { ReleaseList } from './release-list'

const SEARCH_FROM = 6

export function ReleaseDeskSections({ workspaceId }: { workspaceId: string }) {
  const desk = useQuery(releaseDeskQuery(workspaceId))
  const [search, setSearch] = useState('')
  if (desk.isPending) return <Spinner label="Loading the release desk" />
  if (!desk.data)
    return (
      <LoadFailure
        message={messageOf(desk.error)}
        isRetrying={desk.isFetching}
        onRetry={() => void desk.refetch()}
      />
    )
  const words = search.trim().toLowerCase()
  const matches = (name: string) => name.toLowerCase().includes(words)
  const waiting = desk.data.waiting.filter((layout) => matches(layout.name))
  const drafts = desk.data.drafts.filter((layout) => matches(layout.name))
  const deviations = desk.data.deviations.filter((deviation) => matches(deviation.layoutName))
  const releases = desk.data.releases.filter((release) => matches(release.layoutName))
  const inForce = releases.filter((release) => release.status === 'released')
  const withdrawn = releases.filter((release) => release.status === 'withdrawn')
  const total = desk.data.waiting.length + desk.data.drafts.length + desk.data.releases.length
  if (total === 0)
    return (
      <EmptyState title="Nothing is waiting and nothing is released yet">
        A designer asks for review on the bench; a manager freezes the layout there. Both then show up here,
        with the release sheet.
      </EmptyState>
    )
  return (
    <div className="grid grid-cols-1 gap-10">
      {total >= SEARCH_FROM && (
        <div className="max-w-sm">
          <TextField
            label="Search by layout"
            type="search"
            value={search}
            onChange={(event) => setSearch(event.target.value)}
          />
        </div>
      )}
      <DeskSection
        title="Waiting for review"
        count={waiting.length}
        whenEmpty="No layout is waiting for review."
      >
        <ul>
          {waiting.map((layout) => (
            <DeskLayoutRow key={layout.layoutId} workspaceId={workspaceId} layout={layout}>
              <p className="mt-0.5 text-sm text-quiet">
                {layout.askedByName} asked{' '}
                <time dateTime={layout.askedAt} title={formatDateTime(layout.askedAt)}>
                  {formatAgo(layout.askedAt)}
                </time>
              </p>
              {layout.note !== '' && (
                <p className="mt-1 max-w-prose text-sm wrap-break-word">{layout.note}</p>
              )}
            </DeskLayoutRow>
          ))}
        </ul>
      </DeskSection>
      {drafts.length > 0 && (
        <DeskSection title="Next revisions in work" count={drafts.length}>
          <ul>
            {drafts.map((layout) => (
              <DeskLayoutRow key={layout.layoutId} workspaceId={workspaceId} layout={layout} />
            ))}
          </ul>
        </DeskSection>
      )}
      <DeskSection title="Released" count={inForce.length} whenEmpty="No release is in force.">
        <ReleaseList workspaceId={workspaceId} releases={inForce} />
      </DeskSection>
      {deviations.length > 0 && (
        <DeskSection title="Accepted deviations" count={deviations.length}>
          <DeviationList workspaceId={workspaceId} deviations={deviations} />
        </DeskSection>
      )}
      {withdrawn.length > 0 && (
        <DeskSection title="Withdrawn" count={withdrawn.length}>
          <ReleaseList workspaceId={workspaceId} releases={withdrawn} />
        </DeskSection>
      )}
    </div>
  )
}

function DeskSection({
  title,
  count,
  whenEmpty,
  children,
}: {
  title: string
  count: number
  whenEmpty?: string
  children: ReactNode
}) {
  return (
    <section aria-label={title}>
      <h2 className="flex items-baseline gap-2 border-b border-edge pb-2 text-base font-bold">
        {title}
        <span className="text-sm font-semibold text-quiet tabular-nums">{count}</span>
      </h2>
      {count === 0 ? <p className="py-3 text-sm text-quiet">{whenEmpty}</p> : children}
    </section>
  )
}
