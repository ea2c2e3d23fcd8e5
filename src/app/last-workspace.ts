/** Which workspace this browser opened last. */
const STORAGE_KEY = 'hubstead.workspace'

export function rememberWorkspace(workspaceId: string): void {
  try {
    localStorage.setItem(STORAGE_KEY, workspaceId)
  } catch {
    // Without storage the first workspace opens.
  }
}

export function lastWorkspaceId(): string | null {
  try {
    return localStorage.getItem(STORAGE_KEY)
  } catch {
    return null
  }
}
