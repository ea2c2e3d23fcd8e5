import { useMutation, useQueryClient } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { type CreateLayoutBody, layoutSummarySchema, type UpdateLayoutBody } from '@shared/protocol/layouts'

export function useCreateLayout(workspaceId: string) {
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (body: CreateLayoutBody) =>
      request(`/api/workspaces/${workspaceId}/layouts`, {
        method: 'POST',
        body,
        schema: layoutSummarySchema,
      }),
    onSuccess: () => {
      // Not awaited: what follows may be news about a card that the fresh list no longer has.
      void queryClient.invalidateQueries({ queryKey: queryKeys.layouts(workspaceId) })
    },
  })
}

/** Name, project and archive. */
export function useUpdateLayout(workspaceId: string, layoutId: string) {
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (body: UpdateLayoutBody) =>
      request(`/api/layouts/${layoutId}`, { method: 'PATCH', body, schema: layoutSummarySchema }),
    onSuccess: () => {
      // Not awaited: what follows may be news about a card that the fresh list no longer has.
      void queryClient.invalidateQueries({ queryKey: queryKeys.layouts(workspaceId) })
    },
  })
}
