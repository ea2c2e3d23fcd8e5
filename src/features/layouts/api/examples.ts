import { queryOptions } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { exampleListSchema } from '@shared/protocol/layouts'

export const examplesQuery = queryOptions({
  queryKey: queryKeys.examples,
  queryFn: async ({ signal }) =>
    (await request('/api/examples', { schema: exampleListSchema, signal })).examples,
  staleTime: Infinity,
})
