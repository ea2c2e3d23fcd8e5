/** Says above the drawing why it can only be read, and since when. */
import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router'
import { Icon } from '@/components/icon'
import { paths } from '@/config/paths'
import { formatDateTime } from '@/lib/format-time'
import { useLayoutStore } from '@/stores/layout-store'
import { layoutReleasesQuery } from './api/layout-releases'
import { useWorkspaceId } from './use-workspace-id'

export function FrozenBanner({ layoutId }: { layoutId: string }) {
  const workspaceId = useWorkspaceId()
  const status = useLayoutStore((state) => state.access?.status ?? null)
  const letter = useLayoutStore((state) => state.access?.revisionLetter ?? '')
  const isFrozen = status === 'released' || status === 'withdrawn'
  const releases = useQuery({
    ...layoutReleasesQuery(workspaceId, layoutId, `${status ?? ''} ${letter}`),
    enabled: isFrozen,
  })
  if (!isFrozen) return null
  const release = releases.data?.find((each) => each.revisionLetter === letter)
  const isWithdrawn = status === 'withdrawn'
  return (
    <div
      role="status"
      className={`flex flex-wrap items-center gap-x-3 gap-y-1 border-b px-4 py-2 text-[13px] ${
        isWithdrawn ? 'border-bad/40 bg-bad-soft' : 'border-straw/50 bg-straw-soft'
      }`}
    >
      <Icon name="lock" className="size-3.5 shrink-0" />
      <p className="min-w-0 flex-1">
        <span className="font-semibold">
          Revision {letter} is {isWithdrawn ? 'withdrawn' : 'released'}
        </span>
        {release && !isWithdrawn && ` by ${release.frozenByName}, ${formatDateTime(release.frozenAt)}`}
        {release?.withdrawnAt &&
          ` by ${release.withdrawnByName ?? ''}, ${formatDateTime(release.withdrawnAt)}: ${release.withdrawalReason ?? ''}`}
        . {isWithdrawn ? 'Do not build from it. ' : ''}It no longer changes; the next revision starts from it.
      </p>
      {release && (
        <Link
          to={paths.release(workspaceId, release.id)}
          className="shrink-0 font-semibold text-steel underline underline-offset-2"
        >
          Open the release
        </Link>
      )}
    </div>
  )
}
