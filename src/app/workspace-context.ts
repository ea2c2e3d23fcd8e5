import { createContext, useContext } from 'react'
import type { Me } from '@shared/protocol/accounts'
import { nearestWorkspace } from './last-workspace'

export const MeContext = createContext<Me | null>(null)
export const WorkspaceContext = createContext<Me['workspaces'][number] | null>(null)

/** The signed-in person; only inside SignedInFrame. */
export function useSignedIn(): Me {
  const me = useContext(MeContext)
  if (!me) throw new Error('useSignedIn outside SignedInFrame')
  return me
}

/** The workspace in the address, with the person's role in it; only inside WorkspaceFrame. */
export function useWorkspace(): Me['workspaces'][number] {
  const workspace = useContext(WorkspaceContext)
  if (!workspace) throw new Error('useWorkspace outside WorkspaceFrame')
  return workspace
}

/** On pages outside any workspace, such as the account page, the one opened last; null for a person without any. */
export function useNearestWorkspace(): Me['workspaces'][number] | null {
  const current = useContext(WorkspaceContext)
  const { workspaces } = useSignedIn()
  return current ?? nearestWorkspace(workspaces)
}
