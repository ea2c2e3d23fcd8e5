import { useParams } from 'react-router'

/** From the address: every page that shows releases lies under a workspace. */
export function useWorkspaceId(): string {
  return useParams().workspaceId ?? ''
}
