import { type QueryClient, useQueryClient } from '@tanstack/react-query'
import { useEffect } from 'react'
import { queryKeys } from '@/lib/query-keys'
import type { WorkspaceChange } from '@/sync/follow-workspace'

/** Keeps the lists of a workspace fresh while others work in it. The socket's code comes after the page. */
export function useWorkspaceNews(workspaceId: string | null): void {
  const queryClient = useQueryClient()
  useEffect(() => {
    if (workspaceId === null) return
    let isLeft = false
    let stop = () => undefined as void
    import('@/sync/follow-workspace').then(
      ({ followWorkspace }) => {
        if (!isLeft) stop = followWorkspace(workspaceId, (what) => refresh(queryClient, workspaceId, what))
      },
      // Without it the lists still refresh on focus and by the clock.
      () => undefined,
    )
    return () => {
      isLeft = true
      stop()
    }
  }, [workspaceId, queryClient])
}

function refresh(queryClient: QueryClient, workspaceId: string, what: WorkspaceChange): void {
  const invalidate = (queryKey: readonly unknown[]) => void queryClient.invalidateQueries({ queryKey })
  switch (what) {
    case 'layouts':
      return invalidate(queryKeys.layouts(workspaceId))
    case 'releases':
      // One that is open may have been withdrawn.
      invalidate(queryKeys.everyRelease)
      return invalidate(queryKeys.releases(workspaceId))
    case 'people':
      invalidate(queryKeys.people(workspaceId))
      // The change may be about this person.
      return invalidate(queryKeys.me)
  }
}
