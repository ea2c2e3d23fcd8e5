import { useQueryClient } from '@tanstack/react-query'
import { useEffect } from 'react'
import { Navigate, Outlet, useLocation } from 'react-router'
import { Button } from '@/components/button'
import { paths } from '@/config/paths'
import { useMe } from '@/features/accounts/api/me'
import { withNext } from '@/features/accounts/next-address'
import { messageOf } from '@/lib/http-client'
import { queryKeys } from '@/lib/query-keys'
import { PageLoading } from '../page-loading'
import { MeContext } from '../workspace-context'

/** Lets only signed-in people through; everyone else signs in first and comes back. */
export function SignedInFrame() {
  const { data: me, error, isPending, refetch, isFetching } = useMe()
  const { pathname, search } = useLocation()

  if (isPending) return <PageLoading />
  if (me === undefined)
    return (
      <main className="mx-auto grid max-w-lg gap-4 px-6 py-20">
        <h1 className="text-2xl font-bold">Hubstead does not answer</h1>
        <p className="text-quiet">{messageOf(error)}</p>
        <Button variant="primary" isBusy={isFetching} className="w-fit" onClick={() => void refetch()}>
          Try again
        </Button>
      </main>
    )
  if (me === null) return <ToSignIn next={pathname === paths.home ? null : pathname + search} />
  return (
    <MeContext value={me}>
      <Outlet />
    </MeContext>
  )
}

function ToSignIn({ next }: { next: string | null }) {
  const queryClient = useQueryClient()
  useEffect(
    // The remembered "nobody" would otherwise send a freshly signed-in person straight back.
    () => () => queryClient.removeQueries({ queryKey: queryKeys.me }),
    [queryClient],
  )
  return <Navigate to={withNext(paths.signIn, next)} replace />
}
