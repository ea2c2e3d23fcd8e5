import { queryOptions } from '@tanstack/react-query'
import { request } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { type ReleaseView, releaseViewSchema } from '@shared/protocol/releases'
import type { LayoutResults } from '@shared/recalculation/layout-results'

export interface ReleaseDetails extends ReleaseView {
  results: LayoutResults
}

/** What is stored never changes, but the release may be withdrawn and its layout may move on. */
export const releaseQuery = (releaseId: string) =>
  queryOptions({
    queryKey: queryKeys.release(releaseId),
    queryFn: async ({ signal }): Promise<ReleaseDetails> => {
      const view = await request(`/api/releases/${releaseId}`, { schema: releaseViewSchema, signal })
      // Written by the server's own engine and covered by the release hash.
      return { ...view, results: view.results as LayoutResults }
    },
  })
