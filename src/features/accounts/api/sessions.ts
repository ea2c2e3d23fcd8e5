import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { sessionListSchema } from '@shared/protocol/accounts'

export const sessionsQuery = queryOptions({
  queryKey: queryKeys.sessions,
  queryFn: async ({ signal }) =>
    (await request('/api/me/sessions', { schema: sessionListSchema, signal })).sessions,
})

/** One session by its id, or all but this one. */
export function useRevokeSessions() {
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (which: { sessionId: string } | 'others') =>
      request(which === 'others' ? '/api/me/sessions' : `/api/me/sessions/${which.sessionId}`, {
        method: 'DELETE',
      }),
    onSettled: () => queryClient.invalidateQueries({ queryKey: queryKeys.sessions }),
  })
}
