/** Who, when, with what engine, and the hashes: the title block of the page. */
import type { ReactNode } from 'react'
import { Sign } from '@/components/sign'
import { formatDateTime } from '@/lib/format-time'
import type { ReleaseDetails } from '../api/release'

export function ReleaseFacts({ release }: { release: ReleaseDetails }) {
  return (
    <dl className="grid border-t border-l border-hairline text-sm sm:grid-cols-2 lg:grid-cols-4">
      <Fact term="Verdict">
        {release.verdict === 'passes' ? (
          <span className="inline-flex items-center gap-1.5 font-semibold text-good">
            <Sign name="check" className="size-3.5" />
            Passes
          </span>
        ) : (
          <span className="inline-flex items-center gap-1.5 font-semibold text-straw-ink">
            <Sign name="warning" className="size-3.5" />
            {release.acceptanceCount} accepted {release.acceptanceCount === 1 ? 'deviation' : 'deviations'}
          </span>
        )}
      </Fact>
      <Fact term="Frozen">
        {release.frozenByName}, {formatDateTime(release.frozenAt)}
      </Fact>
      <Fact term="Review asked">
        {release.reviewAskedByName === null
          ? 'not asked'
          : `${release.reviewAskedByName}${release.reviewAskedAt === null ? '' : `, ${formatDateTime(release.reviewAskedAt)}`}`}
      </Fact>
      <Fact term="Revision number, engine">
        {release.revision}, engine {release.engineVersion}
      </Fact>
      <Fact term="Document hash" isWide>
        <span className="break-all tabular-nums">{release.documentHash}</span>
      </Fact>
      <Fact term="Stored data">
        {release.integrity === 'intact' ? (
          <span className="inline-flex items-center gap-1.5">
            <Sign name="check" className="size-3.5 text-good" />
            agrees with its hashes
          </span>
        ) : (
          <span className="inline-flex items-center gap-1.5 font-semibold text-bad">
            <Sign name="cross" className="size-3.5" />
            was changed after freezing
          </span>
        )}
      </Fact>
      <Fact term="Release before">
        {release.previousHash === null ? (
          'none, this is the first'
        ) : (
          <span className="tabular-nums" title={release.previousHash}>
            {release.previousHash.slice(0, 19)}…
          </span>
        )}
      </Fact>
    </dl>
  )
}

function Fact({ term, isWide = false, children }: { term: string; isWide?: boolean; children: ReactNode }) {
  return (
    <div className={`min-w-0 border-r border-b border-hairline px-3 py-2 ${isWide ? 'sm:col-span-2' : ''}`}>
      <dt className="text-xs text-quiet">{term}</dt>
      <dd className="mt-0.5">{children}</dd>
    </div>
  )
}
