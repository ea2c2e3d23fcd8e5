import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router'
import { Banner } from '@/components/banner'
import { Button, buttonClasses } from '@/components/button'
import { LoadFailure } from '@/components/load-failure'
import { Spinner } from '@/components/spinner'
import { paths } from '@/config/paths'
import { formatDateTime } from '@/lib/format-time'
import { HttpError, messageOf } from '@/lib/http-client'
import { invitationQuery, useAcceptInvitation } from '../api/invitation'
import { useSubmission } from '../hooks/use-submission'
import { ROLE_DESCRIPTIONS, ROLE_NAMES } from '../role-texts'

interface InvitationCardProps {
  invitationId: string
  /** Address of the signed-in person. */
  email: string
  onJoined: (workspaceId: string) => void
  onChangePerson: () => Promise<void>
}

export function InvitationCard({ invitationId, email, onJoined, onChangePerson }: InvitationCardProps) {
  const { data: invitation, error, isFetching, refetch } = useQuery(invitationQuery(invitationId))
  const accept = useAcceptInvitation(invitationId)
  const leaving = useSubmission()

  if (!invitation) {
    if (!error) return <Spinner label="Loading the invitation" />
    const isNotTheirs = error instanceof HttpError && (error.status === 404 || error.status === 403)
    if (!isNotTheirs)
      return <LoadFailure message={messageOf(error)} isRetrying={isFetching} onRetry={() => void refetch()} />
    return (
      <div className="grid gap-5">
        <h1 className="text-3xl font-extrabold tracking-tight">This invitation is not open to you</h1>
        <p>
          You are signed in as <strong>{email}</strong>. The invitation was sent to another address, was
          withdrawn or is too old.
        </p>
        {leaving.error && <Banner tone="bad">{messageOf(leaving.error)}</Banner>}
        <div className="flex flex-wrap gap-3">
          <Button
            variant="primary"
            isBusy={leaving.isBusy}
            onClick={() => void leaving.submit(onChangePerson)}
          >
            Sign in as someone else
          </Button>
          <Link to={paths.home} className={buttonClasses('secondary')}>
            Go to your layouts
          </Link>
        </div>
      </div>
    )
  }
  if (invitation.status !== 'pending')
    return (
      <div className="grid gap-5">
        <h1 className="text-3xl font-extrabold tracking-tight">
          {invitation.status === 'accepted' ? 'You have joined already' : 'This invitation is over'}
        </h1>
        <Link to={paths.home} className={`${buttonClasses('primary')} w-fit`}>
          Go to your layouts
        </Link>
      </div>
    )
  return (
    <div className="grid gap-5">
      <h1 className="text-3xl font-extrabold tracking-tight">Join {invitation.workspaceName}</h1>
      <p>
        {invitation.invitedByName} invites you as <strong>{ROLE_NAMES[invitation.role].toLowerCase()}</strong>
        . <span className="text-quiet">{ROLE_DESCRIPTIONS[invitation.role]}</span>
      </p>
      <p className="text-sm text-quiet">
        For {invitation.email}, open until {formatDateTime(invitation.expiresAt)}.
      </p>
      {accept.error && <Banner tone="bad">{messageOf(accept.error)}</Banner>}
      <Button
        variant="primary"
        className="w-fit"
        isBusy={accept.isPending}
        onClick={() => accept.mutate(undefined, { onSuccess: ({ workspaceId }) => onJoined(workspaceId) })}
      >
        Join the workspace
      </Button>
    </div>
  )
}
