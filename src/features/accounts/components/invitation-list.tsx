import { Button } from '@/components/button'
import { Cell, ColumnHead, DataTable } from '@/components/data-table'
import { showToast } from '@/components/toast-store'
import { formatDateTime } from '@/lib/format-time'
import { messageOf } from '@/lib/http-client'
import type { Invitation } from '@shared/protocol/accounts'
import { useCancelInvitation } from '../api/people'
import { ROLE_NAMES } from '../role-texts'

/** Invitations that nobody has accepted yet. */
export function InvitationList({
  workspaceId,
  invitations,
  canManage,
}: {
  workspaceId: string
  invitations: Invitation[]
  canManage: boolean
}) {
  const cancel = useCancelInvitation(workspaceId)
  // Awaited here, because callbacks of the mutation die with the last invitation's list.
  const withdraw = async (invitation: Invitation) => {
    try {
      await cancel.mutateAsync(invitation.id)
      showToast(`Invitation of ${invitation.email} withdrawn`)
    } catch (error) {
      showToast(messageOf(error), 'bad')
    }
  }
  return (
    <DataTable label="Open invitations">
      <thead>
        <tr>
          <ColumnHead>E-mail address</ColumnHead>
          <ColumnHead>Role</ColumnHead>
          <ColumnHead className="max-sm:hidden">Invited by</ColumnHead>
          <ColumnHead className="max-sm:hidden">Open until</ColumnHead>
          {canManage && (
            <ColumnHead>
              <span className="sr-only">Actions</span>
            </ColumnHead>
          )}
        </tr>
      </thead>
      <tbody>
        {invitations.map((invitation) => (
          <tr key={invitation.id}>
            <Cell className="font-semibold break-all">{invitation.email}</Cell>
            <Cell>{ROLE_NAMES[invitation.role]}</Cell>
            <Cell className="max-sm:hidden">{invitation.invitedByName}</Cell>
            <Cell className="whitespace-nowrap text-quiet max-sm:hidden">
              {formatDateTime(invitation.expiresAt)}
            </Cell>
            {canManage && (
              <Cell align="right">
                <Button
                  size="sm"
                  variant="quiet"
                  aria-label={`Withdraw the invitation of ${invitation.email}`}
                  isBusy={cancel.isPending && cancel.variables === invitation.id}
                  onClick={() => void withdraw(invitation)}
                >
                  Withdraw
                </Button>
              </Cell>
            )}
          </tr>
        ))}
      </tbody>
    </DataTable>
  )
}
