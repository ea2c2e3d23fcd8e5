import { Navigate, useNavigate } from 'react-router'
import { paths } from '@/config/paths'
import { CreateWorkspaceForm } from '@/features/accounts/components/create-workspace-form'
import { TopBar } from '../../frames/top-bar'
import { nearestWorkspace } from '../../last-workspace'
import { usePageTitle } from '../../use-page-title'
import { useSignedIn } from '../../workspace-context'

/** Leads to the workspace opened last; a person without any starts one here. */
export default function HomeRoute() {
  const { user, workspaces } = useSignedIn()
  const navigate = useNavigate()
  usePageTitle('Start')

  const workspace = nearestWorkspace(workspaces)
  if (workspace) return <Navigate to={paths.layouts(workspace.id)} replace />

  return (
    <>
      <TopBar />
      <main id="main" className="mx-auto grid max-w-md gap-6 px-6 py-16">
        <div>
          <h1 className="text-2xl font-bold">Welcome, {user.name}</h1>
          <p className="mt-2 text-quiet">
            You are in no workspace yet. Start one for your team, or open the link in an invitation that was
            sent to {user.email}.
          </p>
        </div>
        <CreateWorkspaceForm onCreated={(workspaceId) => void navigate(paths.layouts(workspaceId))} />
      </main>
    </>
  )
}
