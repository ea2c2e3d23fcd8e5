/** Releases with their documents; a table where there is room, a list on narrow screens. */
import { useState } from 'react'
import { Link } from 'react-router'
import { Icon } from '@/components/icon'
import { paths } from '@/config/paths'
import { formatDateTime } from '@/lib/format-time'
import type { ReleaseSummary } from '@shared/protocol/releases'
import { DocumentButton } from './document-button'

const FIRST_SHOWN = 12

export function ReleaseList({
  workspaceId,
  releases,
}: {
  workspaceId: string
  releases: readonly ReleaseSummary[]
}) {
  const [showsAll, setShowsAll] = useState(false)
  const shown = showsAll ? releases : releases.slice(0, FIRST_SHOWN)
  return (
    <>
      <ul>
        {shown.map((release) => (
          <ReleaseRow key={release.id} workspaceId={workspaceId} release={release} />
        ))}
      </ul>
      {shown.length < releases.length && (
        <button
          type="button"
          className="mt-3 rounded text-sm font-semibold text-steel underline underline-offset-2"
          onClick={() => setShowsAll(true)}
        >
          Show all {releases.length}
        </button>
      )}
    </>
  )
}

function ReleaseRow({ workspaceId, release }: { workspaceId: string; release: ReleaseSummary }) {
  const isWithdrawn = release.status === 'withdrawn'
  return (
    <li className="grid items-center gap-x-6 gap-y-2 border-b border-hairline py-3 text-sm md:grid-cols-[3rem_minmax(0,2fr)_minmax(0,1.4fr)_minmax(0,1.4fr)_auto]">
      <span
        aria-label={`Revision ${release.revisionLetter}`}
        className={`text-2xl font-extrabold max-md:hidden ${isWithdrawn ? 'text-quiet line-through' : ''}`}
      >
        {release.revisionLetter}
      </span>
      <div className="min-w-0">
        <Link to={paths.release(workspaceId, release.id)} className="font-bold hover:underline">
          <span className="md:hidden">{release.revisionLetter} · </span>
          {release.layoutName}
        </Link>
        {release.note !== '' && <p className="line-clamp-2 text-quiet">{release.note}</p>}
        {isWithdrawn && (
          <p className="text-bad">
            Withdrawn by {release.withdrawnByName}
            {release.withdrawnAt && `, ${formatDateTime(release.withdrawnAt)}`}: {release.withdrawalReason}
          </p>
        )}
      </div>
      <div>
        <p>{release.frozenByName}</p>
        <p className="text-quiet">{formatDateTime(release.frozenAt)}</p>
      </div>
      <div>
        <p className="flex items-center gap-1.5 font-semibold">
          {release.verdict === 'passes' ? (
            <>
              <Icon name="check" className="size-3.5 text-good" />
              Passes
            </>
          ) : (
            <>
              <Icon name="warning" className="size-3.5 text-straw-ink" />
              {release.acceptanceCount} accepted {release.acceptanceCount === 1 ? 'deviation' : 'deviations'}
            </>
          )}
        </p>
        <p className="truncate text-quiet" title={release.documentHash}>
          {release.documentHash.slice(0, 19)}…
        </p>
      </div>
      <DocumentButton releaseId={release.id} file="sheet.pdf" label="Release sheet" size="sm" />
    </li>
  )
}
