import { useMutation, useQueryClient } from '@tanstack/react-query'
import { z } from 'zod'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'

/** Only the id is needed: the rest comes with a fresh "who am I". */
const createdSchema = z.object({ id: z.string() })

export function useCreateWorkspace() {
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (name: string) =>
      request('/api/workspaces', { method: 'POST', body: { name }, schema: createdSchema }),
    // Awaited, so that the new workspace is known before its page opens.
    onSuccess: () => queryClient.refetchQueries({ queryKey: queryKeys.me }),
  })
}
