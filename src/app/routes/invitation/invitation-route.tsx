import { useQueryClient } from '@tanstack/react-query'
import { useNavigate, useParams } from 'react-router'
import { paths } from '@/config/paths'
import { signOut } from '@/features/accounts/api/auth-endpoints'
import { useMe } from '@/features/accounts/api/me'
import { InvitationCard } from '@/features/accounts/components/invitation-card'
import { InvitationForNobody } from '@/features/accounts/components/invitation-for-nobody'
import { withNext } from '@/features/accounts/next-address'
import { LoadFailure } from '@/components/load-failure'
import { messageOf } from '@/lib/http-client'
import { PageLoading } from '../../page-loading'
import { usePageTitle } from '../../use-page-title'

export default function InvitationRoute() {
  usePageTitle('Invitation')
  const { invitationId = '' } = useParams()
  const { data: me, isPending, error, isFetching, refetch } = useMe()
  const queryClient = useQueryClient()
  const navigate = useNavigate()
  const here = paths.invitation(invitationId)

  const changePerson = async () => {
    await signOut()
    await navigate(withNext(paths.signIn, here))
    queryClient.clear()
  }

  return (
    <div className="mx-auto w-full max-w-md px-6 py-16">
      {me ? (
        <InvitationCard
          invitationId={invitationId}
          email={me.user.email}
          onJoined={(workspaceId) => void navigate(paths.layouts(workspaceId), { replace: true })}
          onChangePerson={changePerson}
        />
      ) : me === null ? (
        <InvitationForNobody
          signInAddress={withNext(paths.signIn, here)}
          signUpAddress={withNext(paths.signUp, here)}
        />
      ) : isPending ? (
        <PageLoading />
      ) : (
        <LoadFailure message={messageOf(error)} isRetrying={isFetching} onRetry={() => void refetch()} />
      )}
    </div>
  )
}
