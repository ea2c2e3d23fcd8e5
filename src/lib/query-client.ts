import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query'
import { HttpError } from './http-client'
import { queryKeys } from './query-keys'

const isSignedOut = (error: unknown) => error instanceof HttpError && error.status === 401

/** A refusal stays a refusal; only silence and server trouble are worth asking again. */
const isWorthRetrying = (error: unknown) =>
  !(error instanceof HttpError) || error.status === 0 || error.status >= 502

export function createQueryClient(): QueryClient {
  // A 401 means the session ended elsewhere: asking who we are again leads to the sign-in page. What is
  // on screen stays until that is answered.
  const onError = (error: unknown) => {
    if (isSignedOut(error)) void client.invalidateQueries({ queryKey: queryKeys.me })
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
