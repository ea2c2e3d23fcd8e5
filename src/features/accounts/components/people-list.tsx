import { useQuery } from '@tanstack/react-query'
import { LoadFailure } from '@/components/load-failure'
import { Spinner } from '@/components/spinner'
import { messageOf } from '@/lib/http-client'
import { ROLES } from '@shared/protocol/roles'
import { peopleQuery } from '../api/people'
import { InvitationList } from './invitation-list'
import { MemberRow } from './member-row'
import { RoleGuide } from './role-guide'

interface PeopleListProps {
  workspaceId: string
  myUserId: string
  canManage: boolean
}

export function PeopleList({ workspaceId, myUserId, canManage }: PeopleListProps) {
  const { data: people, error, isFetching, refetch } = useQuery(peopleQuery(workspaceId))
  if (!people)
    return error ? (
      <LoadFailure message={messageOf(error)} isRetrying={isFetching} onRetry={() => void refetch()} />
    ) : (
      <Spinner label="Loading the people" />
    )
  const members = [...people.members].sort(
    (a, b) => ROLES.indexOf(b.role) - ROLES.indexOf(a.role) || a.name.localeCompare(b.name),
  )
  const pending = people.invitations.filter((invitation) => invitation.status === 'pending')
  return (
    <>
      <ul aria-label="Members" className="border-t border-hairline">
        {members.map((member) => (
          <MemberRow
            key={member.id}
            workspaceId={workspaceId}
            member={member}
            isMe={member.userId === myUserId}
            canManage={canManage}
          />
        ))}
      </ul>
      {pending.length > 0 && (
        <section className="mt-10">
          <h2 className="mb-2 text-lg font-bold">Open invitations</h2>
          <InvitationList workspaceId={workspaceId} invitations={pending} canManage={canManage} />
        </section>
      )}
      <RoleGuide />
    </>
  )
}
