import { useQueryClient } from '@tanstack/react-query'
import { useEffect } from 'react'
import { Link } from 'react-router'
import { buttonClasses } from '@/components/button'
import { queryKeys } from '@/lib/query-keys'

/** Somebody followed the link without being signed in. */
export function InvitationForNobody({
  signInAddress,
  signUpAddress,
}: {
  signInAddress: string
  signUpAddress: string
}) {
  const queryClient = useQueryClient()
  useEffect(
    // The remembered "nobody" must not greet the person who comes back signed in.
    () => () => queryClient.removeQueries({ queryKey: queryKeys.me }),
    [queryClient],
  )
  return (
    <div className="grid gap-5">
      <h1 className="text-3xl font-extrabold tracking-tight">You are invited to a workspace</h1>
      <p className="text-quiet">
        In Hubstead a team lays out, checks and releases the fits of the hubs on a shaft together. Go on with
        the address to which the invitation was sent; you come back here afterwards.
      </p>
      <div className="flex flex-wrap gap-3">
        <Link to={signUpAddress} className={buttonClasses('primary')}>
          Create an account
        </Link>
        <Link to={signInAddress} className={buttonClasses('secondary')}>
          Sign in
        </Link>
      </div>
    </div>
  )
}
