/**
 * Text that could not be taken yet, kept when its field leaves the screen (another part selected,
 * another tab opened), so that coming back finds it with its message. In memory only.
 */
const MOST_KEPT = 50

const drafts = new Map<string, { text: string; message: string }>()

export const keptDraft = (key: string | undefined) => (key === undefined ? undefined : drafts.get(key))

export function keepDraft(key: string | undefined, draft: { text: string; message: string } | null): void {
  if (key === undefined) return
  drafts.delete(key)
  if (draft === null) return
  drafts.set(key, draft)
  const oldest = drafts.keys().next()
  if (drafts.size > MOST_KEPT && !oldest.done) drafts.delete(oldest.value)
}
