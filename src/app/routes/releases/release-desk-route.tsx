import { ReleaseDeskSections } from '@/features/releases/components/release-desk'
import { PageHeading } from '../../page-heading'
import { useWorkspace } from '../../workspace-context'

export default function ReleaseDeskRoute() {
  const workspace = useWorkspace()
  return (
    <>
      <PageHeading title="Release desk">
        What waits for review, what is released, and on what terms.
      </PageHeading>
      <ReleaseDeskSections workspaceId={workspace.id} />
    </>
  )
}
