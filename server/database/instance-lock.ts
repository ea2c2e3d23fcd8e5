/**
 * One process per data folder: open layouts live in its memory, and two would overwrite each other.
 * The lock is SQLite's own on a file of its own, so the system lets go of it even after a kill.
 */
import path from 'node:path'
import SqliteHandle from 'better-sqlite3'

export class DataFolderInUse extends Error {
  override readonly name = 'DataFolderInUse'
}

export function lockDataFolder(dataDir: string): () => void {
  const handle = new SqliteHandle(path.join(dataDir, 'instance.lock'), { timeout: 0 })
  try {
    handle.pragma('journal_mode = DELETE')
    handle.exec('begin exclusive')
  } catch {
    handle.close()
    throw new DataFolderInUse(`Another Hubstead server uses ${dataDir}. Stop it, or set DATA_DIR.`)
  }
  return () => {
    handle.close()
  }
}
