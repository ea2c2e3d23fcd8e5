import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import { z } from 'zod'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { invitationViewSchema } from '@shared/protocol/accounts'

export const invitationQuery = (invitationId: string) =>
  queryOptions({
    queryKey: queryKeys.invitation(invitationId),
    queryFn: ({ signal }) =>
      request(`/api/invitations/${invitationId}`, { schema: invitationViewSchema, signal }),
  })

const acceptedSchema = z.object({ workspaceId: z.string() })

export function useAcceptInvitation(invitationId: string) {
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: () =>
      request(`/api/invitations/${invitationId}/accept`, { method: 'POST', schema: acceptedSchema }),
    // Awaited, so that the workspace is known before its page opens.
    onSuccess: () => queryClient.refetchQueries({ queryKey: queryKeys.me }),
  })
}
