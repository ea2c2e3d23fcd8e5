/** A session that writes straight into the layout store: what a person alone would see. */
import { useLayoutStore } from '@/stores/layout-store'
import type { LayoutSession } from '@/sync/layout-session'
import { applyOperations } from '@shared/layout/apply-operations'
import type { LayoutDocument } from '@shared/layout/layout-document'

export interface FakeSession extends LayoutSession {
  committed: string[]
}

export function openFakeLayout(document: LayoutDocument, canEdit = true): FakeSession {
  useLayoutStore.setState({
    layoutId: 'layout',
    confirmed: document,
    visible: document,
    preview: null,
    access: { role: canEdit ? 'designer' : 'viewer', canEdit, status: 'draft', revisionLetter: 'A' },
  })
  const committed: string[] = []
  const confirmed = () => useLayoutStore.getState().confirmed ?? document
  return {
    layoutId: 'layout',
    committed,
    commit(label, operations) {
      const { document: next, dropped } = applyOperations(confirmed(), operations)
      committed.push(label)
      useLayoutStore.setState({ confirmed: next, visible: next, preview: null })
      return { kind: 'pending', editId: `edit-${committed.length}`, dropped }
    },
    setPreview(label, operations) {
      const visible = applyOperations(confirmed(), operations).document
      useLayoutStore.setState({ preview: { label, operations }, visible })
    },
    clearPreview: () => useLayoutStore.setState({ preview: null, visible: confirmed() }),
    undo: () => ({ kind: 'nothing' }),
    redo: () => ({ kind: 'nothing' }),
    updatePresence: () => undefined,
    dismissNotice: () => undefined,
    dismissRefused: () => undefined,
    close: () => undefined,
  }
}
