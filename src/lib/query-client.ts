import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query'
import { HttpError } from './http-client'
import { queryKeys } from './query-keys'

const ACCESS_STATUSES = [401, 403, 404]

/** Signed out elsewhere, removed, or of another role now. */
const mayBeLostAccess = (error: unknown) =>
  error instanceof HttpError && ACCESS_STATUSES.includes(error.status)

/** A refusal stays a refusal; only silence and server trouble are worth asking again. */
const isWorthRetrying = (error: unknown) =>
  !(error instanceof HttpError) || error.status === 0 || error.status >= 502

export function createQueryClient(): QueryClient {
  // Asking who we are again leads to the sign-in page or away from the workspace. What is on screen stays
  // until that is answered.
  const onError = (error: unknown) => {
    if (mayBeLostAccess(error)) void client.invalidateQueries({ queryKey: queryKeys.me })
  }
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({
      onError: (error, query) => {
        if (query.queryKey[0] !== queryKeys.me[0]) onError(error)
      },
    }),
    mutationCache: new MutationCache({ onError }),
    defaultOptions: {
      queries: {
        staleTime: 10_000,
        retry: (failureCount, error) => failureCount < 2 && isWorthRetrying(error),
      },
      mutations: { retry: false },
    },
  })
  return client
}

export const queryClient = createQueryClient()
