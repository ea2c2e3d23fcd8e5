import { useParams } from 'react-router'
import { ReleasePage } from '@/features/releases/components/release-page'
import { usePageTitle } from '../../use-page-title'
import { useWorkspace } from '../../workspace-context'

export default function ReleaseRoute() {
  const workspace = useWorkspace()
  const { releaseId = '' } = useParams()
  usePageTitle('Release')
  return <ReleasePage workspaceId={workspace.id} releaseId={releaseId} role={workspace.role} />
}
