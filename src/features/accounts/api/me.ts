import { queryOptions, useQuery } from '@tanstack/react-query'
import { HttpError, request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { type Me, meSchema } from '@shared/protocol/accounts'

/** Null when signed out: that is an answer, not a failure. */
async function fetchMe(): Promise<Me | null> {
  try {
    return await request('/api/me', { schema: meSchema })
  } catch (error) {
    if (error instanceof HttpError && error.status === 401) return null
    throw error
  }
}

export const meQuery = queryOptions({ queryKey: queryKeys.me, queryFn: fetchMe, staleTime: 60_000 })

export const useMe = () => useQuery(meQuery)
