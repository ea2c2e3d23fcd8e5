/** Which workspace this browser opened last. */
const STORAGE_KEY = 'hubstead.workspace'

export function rememberWorkspace(workspaceId: string): void {
  try {
    localStorage.setItem(STORAGE_KEY, workspaceId)
  } catch {
    // Without storage the first workspace opens.
  }
}

function lastWorkspaceId(): string | null {
  try {
    return localStorage.getItem(STORAGE_KEY)
  } catch {
    return null
  }
}

export function nearestWorkspace<Workspace extends { id: string }>(
  workspaces: Workspace[],
): Workspace | null {
  const lastId = lastWorkspaceId()
  return workspaces.find((workspace) => workspace.id === lastId) ?? workspaces[0] ?? null
}
