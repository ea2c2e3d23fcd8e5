import { queryOptions } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { releaseDeskSchema } from '@shared/protocol/releases'

/** Behind the socket's news, for the time it is down. */
const REFRESH_MS = 30_000

export const releaseDeskQuery = (workspaceId: string) =>
  queryOptions({
    queryKey: [...queryKeys.releases(workspaceId), 'desk'],
    queryFn: ({ signal }) =>
      request(`/api/workspaces/${workspaceId}/releases`, { schema: releaseDeskSchema, signal }),
    refetchInterval: REFRESH_MS,
  })
