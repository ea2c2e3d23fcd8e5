import { useMutation, useQueryClient } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'

export function useRenameWorkspace(workspaceId: string) {
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (name: string) =>
      request(`/api/workspaces/${workspaceId}`, { method: 'PATCH', body: { name } }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: queryKeys.me }),
  })
}
