import { useMutation, useQueryClient } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { meSchema } from '@shared/protocol/accounts'

export function useUpdateName() {
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (name: string) => request('/api/me', { method: 'PATCH', body: { name }, schema: meSchema }),
    onSuccess: (me) => queryClient.setQueryData(queryKeys.me, me),
  })
}
