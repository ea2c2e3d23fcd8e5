/**
 * A bench for panels: a real layout and real operations, applied at once as the session would, and
 * results calculated in place as the worker would. No server, no canvas.
 */
import { cleanup, render } from '@testing-library/react'
import { readFileSync } from 'node:fs'
import type { ReactNode } from 'react'
import { act } from 'react'
import { afterEach } from 'vitest'
import { LayoutSessionProvider } from '@/lib/layout-session-context'
import { useDerivationStore } from '@/stores/derivation-store'
import { EMPTY_LAYOUT_STATE, useLayoutStore } from '@/stores/layout-store'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useResultsStore, WORST_CASE } from '@/stores/results-store'
import { useSelectionStore } from '@/stores/selection-store'
import type { LayoutSession } from '@/sync/layout-session'
import { applyOperations } from '@shared/layout/apply-operations'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { parseLayoutFile } from '@shared/layout/layout-file'
import type { Operation } from '@shared/layout/operations'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'

afterEach(() => {
  cleanup()
  useLayoutStore.setState(EMPTY_LAYOUT_STATE)
  useSelectionStore.getState().clear()
  useDerivationStore.getState().close()
  usePreferencesStore.setState({ units: 'metric' })
  useResultsStore.setState({
    results: null,
    document: null,
    isStale: false,
    failure: null,
    selectedLoadCaseId: WORST_CASE,
  })
})

/** The reducer shaft whose first wheel slips; hubs A, B and C, cases `run` and `warm-up`. */
export function reducerShaft(): LayoutDocument {
  // jsdom puts its own URL in place, so the path is made from the folder the tests run in.
  const path = 'server/demo/data/reducer-intermediate-shaft.demo.layout.json'
  const parsed = parseLayoutFile(JSON.parse(readFileSync(path, 'utf8')))
  if (!parsed.ok) throw new Error(parsed.problems.map(({ message }) => message).join('; '))
  return parsed.document
}

let opened = 0

export interface PanelBench {
  commits: { label: string; operations: Operation[] }[]
  previews: Operation[][]
  /** What presence said is being edited, in order. */
  editing: (string | null)[]
  /** Undo and redo asked for, in order. */
  history: ('undo' | 'redo')[]
  layout: () => LayoutDocument
}

export function renderPanel(
  panel: ReactNode,
  { document = reducerShaft(), canEdit = true }: { document?: LayoutDocument; canEdit?: boolean } = {},
): PanelBench {
  let current = document
  // Texts kept off screen belong to a layout: each test opens another one.
  const layoutId = `layout-${(opened += 1)}`
  const bench: PanelBench = { commits: [], previews: [], editing: [], history: [], layout: () => current }
  const show = (visible: LayoutDocument) =>
    act(() => {
      useLayoutStore.setState({ visible })
      useResultsStore.setState({ results: recalculateLayout(visible), document: visible })
    })
  const session: LayoutSession = {
    layoutId,
    commit: (label, operations) => {
      if (!canEdit) return { kind: 'readOnly', message: 'You may read this layout, not change it.' }
      bench.commits.push({ label, operations })
      const result = applyOperations(current, operations)
      current = result.document
      show(current)
      return result.applied.length > 0
        ? { kind: 'pending', editId: 'edit-1', dropped: result.dropped }
        : { kind: 'noEffect', dropped: result.dropped }
    },
    setPreview: (_label, operations) => {
      bench.previews.push(operations)
      show(applyOperations(current, operations).document)
    },
    clearPreview: () => show(current),
    undo: () => {
      bench.history.push('undo')
      return { kind: 'nothing' }
    },
    redo: () => {
      bench.history.push('redo')
      return { kind: 'nothing' }
    },
    updatePresence: ({ editing }) => {
      if (editing !== undefined) bench.editing.push(editing)
    },
    dismissNotice: () => undefined,
    dismissRefused: () => undefined,
    close: () => undefined,
  }
  useLayoutStore.setState({
    layoutId,
    access: { role: canEdit ? 'designer' : 'viewer', canEdit, status: 'draft', revisionLetter: 'A' },
  })
  show(current)
  render(<LayoutSessionProvider session={session}>{panel}</LayoutSessionProvider>)
  return bench
}
