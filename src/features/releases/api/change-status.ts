import { useMutation, useQueryClient } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { layoutSummarySchema } from '@shared/protocol/layouts'
import { type FreezeBody, releaseSummarySchema } from '@shared/protocol/releases'

function useRefreshReleases(workspaceId: string) {
  const queryClient = useQueryClient()
  return () =>
    Promise.all([
      queryClient.invalidateQueries({ queryKey: queryKeys.releases(workspaceId) }),
      queryClient.invalidateQueries({ queryKey: queryKeys.layouts(workspaceId) }),
      queryClient.invalidateQueries({ queryKey: queryKeys.everyRelease }),
    ])
}

export function useAskReview(workspaceId: string, layoutId: string) {
  const refresh = useRefreshReleases(workspaceId)
  return useMutation({
    mutationFn: (note: string) =>
      request(`/api/layouts/${layoutId}/review`, {
        method: 'POST',
        body: { note },
        schema: layoutSummarySchema,
      }),
    onSuccess: refresh,
  })
}

export function useTakeBackReview(workspaceId: string, layoutId: string) {
  const refresh = useRefreshReleases(workspaceId)
  return useMutation({
    mutationFn: () =>
      request(`/api/layouts/${layoutId}/review`, { method: 'DELETE', schema: layoutSummarySchema }),
    onSuccess: refresh,
  })
}

export function useFreezeLayout(workspaceId: string, layoutId: string) {
  const refresh = useRefreshReleases(workspaceId)
  return useMutation({
    mutationFn: (body: FreezeBody) =>
      request(`/api/layouts/${layoutId}/freeze`, { method: 'POST', body, schema: releaseSummarySchema }),
    onSuccess: refresh,
  })
}

export function useNextRevision(workspaceId: string, layoutId: string) {
  const refresh = useRefreshReleases(workspaceId)
  return useMutation({
    mutationFn: () =>
      request(`/api/layouts/${layoutId}/next-revision`, { method: 'POST', schema: layoutSummarySchema }),
    onSuccess: refresh,
  })
}

export function useWithdrawRelease(workspaceId: string, releaseId: string) {
  const refresh = useRefreshReleases(workspaceId)
  return useMutation({
    mutationFn: (reason: string) =>
      request(`/api/releases/${releaseId}/withdraw`, {
        method: 'POST',
        body: { reason },
        schema: releaseSummarySchema,
      }),
    onSuccess: refresh,
  })
}
