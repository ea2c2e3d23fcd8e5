import { MAX_CATCH_UP_EDITS, type AcceptedEdit } from '@shared/protocol/realtime'

/**
 * The newest committed entries of one log, without gaps. An edit is compared with what others did
 * since its author looked; reading that from the database for each edit would make an edit that
 * claims to be very old as dear as the log is long.
 */
export class RecentEntries {
  #entries: AcceptedEdit[] = []

  add(entry: AcceptedEdit): void {
    const last = this.#entries.at(-1)
    if (last && entry.revision !== last.revision + 1) this.#entries = []
    this.#entries.push(entry)
    if (this.#entries.length > MAX_CATCH_UP_EDITS) this.#entries.shift()
  }

  replace(entries: AcceptedEdit[]): void {
    this.#entries = entries.slice(-MAX_CATCH_UP_EDITS)
  }

  /** Entries after a revision; null when they do not reach back that far. */
  since(revision: number): AcceptedEdit[] | null {
    const [first] = this.#entries
    if (!first || first.revision > revision + 1) return null
    return this.#entries.filter((entry) => entry.revision > revision)
  }
}
