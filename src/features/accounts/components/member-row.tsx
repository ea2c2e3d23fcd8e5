import { useState } from 'react'
import { Avatar } from '@/components/avatar'
import { Button } from '@/components/button'
import { ConfirmDialog } from '@/components/confirm-dialog'
import { SelectField } from '@/components/select-field'
import { showToast } from '@/components/toast-store'
import { formatDate } from '@/lib/format-time'
import { messageOf } from '@/lib/http-client'
import type { Member } from '@shared/protocol/accounts'
import { ROLES, roleSchema } from '@shared/protocol/roles'
import { useChangeRole, useRemoveMember } from '../api/people'
import { ROLE_DESCRIPTIONS, ROLE_NAMES } from '../role-texts'

const options = ROLES.map((role) => ({ value: role, label: ROLE_NAMES[role] }))

interface MemberRowProps {
  workspaceId: string
  member: Member
  isMe: boolean
  canManage: boolean
}

export function MemberRow({ workspaceId, member, isMe, canManage }: MemberRowProps) {
  const changeRole = useChangeRole(workspaceId)
  const remove = useRemoveMember(workspaceId)
  const [isRemoving, setIsRemoving] = useState(false)
  // While the change is under way the row shows what was asked for; a refusal brings the old role back.
  const role = changeRole.isPending ? changeRole.variables.role : member.role

  // Awaited here, because callbacks of the mutation die with the row.
  const confirmRemoval = async () => {
    try {
      await remove.mutateAsync(member.id)
      showToast(`${member.name} was removed`)
    } catch {
      // The dialog shows why.
    }
  }

  return (
    <li className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-4 gap-y-2 border-b border-hairline py-3 sm:grid-cols-[minmax(0,1fr)_11rem_8rem_5rem]">
      <div className="flex min-w-0 items-center gap-3">
        <Avatar name={member.name} />
        <div className="min-w-0">
          <p className="font-semibold">
            {member.name} {isMe && <span className="font-normal text-quiet">(you)</span>}
          </p>
          <p className="truncate text-[13px] text-quiet">{member.email}</p>
        </div>
      </div>
      <div className="max-sm:order-last max-sm:col-span-2 max-sm:pl-11">
        {canManage ? (
          <SelectField
            label={`Role of ${member.name}`}
            isLabelHidden
            options={options}
            value={role}
            disabled={changeRole.isPending}
            error={changeRole.error ? messageOf(changeRole.error) : undefined}
            onValueChange={(value) =>
              changeRole.mutate(
                { memberId: member.id, role: roleSchema.parse(value) },
                { onSuccess: () => showToast(`${member.name} is now ${value}`) },
              )
            }
          />
        ) : (
          <span title={ROLE_DESCRIPTIONS[member.role]}>{ROLE_NAMES[member.role]}</span>
        )}
      </div>
      <p className="text-sm text-quiet max-sm:hidden">since {formatDate(member.joinedAt)}</p>
      {canManage && (
        <div className="text-right">
          <Button
            size="sm"
            variant="quiet"
            aria-label={`Remove ${member.name}`}
            onClick={() => setIsRemoving(true)}
          >
            Remove
          </Button>
          {isRemoving && (
            <ConfirmDialog
              title={isMe ? 'Leave this workspace?' : `Remove ${member.name}?`}
              confirmLabel={isMe ? 'Leave' : 'Remove'}
              isDangerous
              isBusy={remove.isPending}
              error={remove.error ? messageOf(remove.error) : null}
              onConfirm={() => void confirmRemoval()}
              onClose={() => setIsRemoving(false)}
            >
              <p>
                {isMe ? 'You lose' : `${member.name} loses`} access to every layout and release of this
                workspace at once, also in open browsers. Past edits and signatures keep the name.
              </p>
            </ConfirmDialog>
          )}
        </div>
      )}
    </li>
  )
}
