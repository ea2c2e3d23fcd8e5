import { queryOptions } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { layoutReleasesSchema } from '@shared/protocol/releases'

/**
 * Under the key of the workspace's releases, so that its news refreshes them too. On the bench the
 * news comes as status and letter of the open layout: `state` is whatever makes an answer outdated.
 */
export const layoutReleasesQuery = (workspaceId: string, layoutId: string, state = '') =>
  queryOptions({
    queryKey: [...queryKeys.releases(workspaceId), 'layout', layoutId, state],
    queryFn: async ({ signal }) =>
      (await request(`/api/layouts/${layoutId}/releases`, { schema: layoutReleasesSchema, signal })).releases,
  })
