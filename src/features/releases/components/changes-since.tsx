/** What a draft changed since the release it came from; fetched when it is opened. */
import { useQuery } from '@tanstack/react-query'
import { LoadFailure } from '@/components/load-failure'
import { Spinner } from '@/components/spinner'
import { messageOf } from '@/lib/http-client'
import { compareLayouts } from '@shared/comparison/compare-layouts'
import { layoutViewQuery } from '../api/layout-view'
import { releaseQuery } from '../api/release'
import { ChangeList } from './change-list'

export function ChangesSince({
  releaseId,
  releaseLetter,
  layoutId,
  revision,
  letter,
}: {
  releaseId: string
  releaseLetter: string
  layoutId: string
  revision: number
  letter: string
}) {
  const release = useQuery(releaseQuery(releaseId))
  const layout = useQuery(layoutViewQuery(layoutId, revision))
  const failed = [release, layout].find((query) => query.isError)
  if (failed)
    return (
      <LoadFailure
        message={messageOf(failed.error)}
        isRetrying={failed.isFetching}
        onRetry={() => void failed.refetch()}
      />
    )
  if (!release.data || !layout.data) return <Spinner label="Comparing" />
  return (
    <ChangeList
      differences={compareLayouts(release.data.document, layout.data.document)}
      beforeName={`release ${releaseLetter}`}
      afterName={`draft ${letter}`}
    />
  )
}
