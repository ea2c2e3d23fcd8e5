import { queryOptions } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { layoutListSchema } from '@shared/protocol/layouts'

/** Behind the socket's news, for the time it is down. */
const REFRESH_MS = 30_000

export const layoutListQuery = (workspaceId: string, isArchived: boolean) =>
  queryOptions({
    queryKey: [...queryKeys.layouts(workspaceId), { isArchived }],
    queryFn: async ({ signal }) =>
      (
        await request(`/api/workspaces/${workspaceId}/layouts${isArchived ? '?archived=true' : ''}`, {
          schema: layoutListSchema,
          signal,
        })
      ).layouts,
    refetchInterval: REFRESH_MS,
  })
