import { queryOptions } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { layoutViewSchema } from '@shared/protocol/layouts'

/** The document as the server has it now, for comparing; the bench itself lives on the socket. */
export const layoutViewQuery = (layoutId: string, revision: number) =>
  queryOptions({
    queryKey: [...queryKeys.layout(layoutId), revision],
    queryFn: ({ signal }) => request(`/api/layouts/${layoutId}`, { schema: layoutViewSchema, signal }),
  })
