import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { invitationSchema, peopleSchema } from '@shared/protocol/accounts'
import type { Role } from '@shared/protocol/roles'

/** Behind the socket's news, and for open invitations, about which there is none. */
const REFRESH_MS = 30_000

export const peopleQuery = (workspaceId: string) =>
  queryOptions({
    queryKey: queryKeys.people(workspaceId),
    queryFn: ({ signal }) =>
      request(`/api/workspaces/${workspaceId}/members`, { schema: peopleSchema, signal }),
    refetchInterval: REFRESH_MS,
  })

/** Every change of people refreshes the page, whether it worked or not: what is shown is what is so. */
function usePeopleMutation<Variables, Answer>(
  workspaceId: string,
  send: (variables: Variables) => Promise<Answer>,
) {
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: send,
    onSettled: () =>
      Promise.all([
        queryClient.invalidateQueries({ queryKey: queryKeys.people(workspaceId) }),
        // An admin may have changed or removed themselves.
        queryClient.invalidateQueries({ queryKey: queryKeys.me }),
      ]),
  })
}

export const useInvite = (workspaceId: string) =>
  usePeopleMutation(workspaceId, (body: { email: string; role: Role }) =>
    request(`/api/workspaces/${workspaceId}/invitations`, { method: 'POST', body, schema: invitationSchema }),
  )

export const useCancelInvitation = (workspaceId: string) =>
  usePeopleMutation(workspaceId, (invitationId: string) =>
    request(`/api/workspaces/${workspaceId}/invitations/${invitationId}`, { method: 'DELETE' }),
  )

export const useChangeRole = (workspaceId: string) =>
  usePeopleMutation(workspaceId, ({ memberId, role }: { memberId: string; role: Role }) =>
    request(`/api/workspaces/${workspaceId}/members/${memberId}`, { method: 'PATCH', body: { role } }),
  )

export const useRemoveMember = (workspaceId: string) =>
  usePeopleMutation(workspaceId, (memberId: string) =>
    request(`/api/workspaces/${workspaceId}/members/${memberId}`, { method: 'DELETE' }),
  )
