import { useState } from 'react'
import { Button } from '@/components/button'
import { Icon } from '@/components/icon'
import { InviteDialog } from '@/features/accounts/components/invite-dialog'
import { PeopleList } from '@/features/accounts/components/people-list'
import { WorkspaceNameForm } from '@/features/accounts/components/workspace-name-form'
import { PageHeading } from '../../page-heading'
import { useSignedIn, useWorkspace } from '../../workspace-context'

export default function PeopleRoute() {
  const { user } = useSignedIn()
  const workspace = useWorkspace()
  const [isInviting, setIsInviting] = useState(false)
  const canManage = workspace.role === 'admin'
  return (
    <div className="max-w-5xl">
      <PageHeading
        title="People"
        actions={
          canManage && (
            <Button variant="primary" icon={<Icon name="add" />} onClick={() => setIsInviting(true)}>
              Invite someone
            </Button>
          )
        }
      >
        {canManage
          ? `Who works in ${workspace.name}, and as what.`
          : 'Admins invite people and change roles.'}
      </PageHeading>
      <PeopleList workspaceId={workspace.id} myUserId={user.id} canManage={canManage} />
      {canManage && <WorkspaceNameForm key={workspace.id} workspaceId={workspace.id} name={workspace.name} />}
      {isInviting && <InviteDialog workspaceId={workspace.id} onClose={() => setIsInviting(false)} />}
    </div>
  )
}
