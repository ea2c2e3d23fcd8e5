import { queryOptions } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { caughtMailListSchema } from '@shared/protocol/accounts'

const REFRESH_MS = 3_000

export const caughtMailQuery = queryOptions({
  queryKey: queryKeys.caughtMail,
  queryFn: async ({ signal }) =>
    (await request('/api/caught-mail', { schema: caughtMailListSchema, signal })).mails,
  refetchInterval: REFRESH_MS,
})
