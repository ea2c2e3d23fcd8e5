import { useEffect } from 'react'
import { Outlet, useParams } from 'react-router'
import { rememberWorkspace } from '../last-workspace'
import { NoAccess } from '../no-access'
import { useSignedIn, WorkspaceContext } from '../workspace-context'
import { TopBar } from './top-bar'

/** Checks that the person belongs to the workspace of the address. The server checks again on every request. */
export function WorkspaceFrame() {
  const { workspaceId } = useParams()
  const workspace = useSignedIn().workspaces.find((candidate) => candidate.id === workspaceId)

  useEffect(() => {
    if (workspace) rememberWorkspace(workspace.id)
  }, [workspace])

  if (!workspace)
    return (
      <>
        <TopBar />
        <main id="main">
          <NoAccess />
        </main>
      </>
    )
  return (
    <WorkspaceContext value={workspace}>
      <Outlet />
    </WorkspaceContext>
  )
}
