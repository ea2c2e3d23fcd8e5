/** What drawing, outline and toolbar have in common: the tool driver, the actions, the keyboard, the help. */
import { lazy, type ReactNode, Suspense, useEffect, useMemo, useState } from 'react'
import { showToast } from '@/components/toast-store'
import { useLayoutSession } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'
import { useSelectionStore } from '@/stores/selection-store'
import { createNudger } from './actions/nudge'
import { useShortcuts } from './actions/use-shortcuts'
import { type BenchActions, BenchActionsContext, createBenchActions } from './bench-actions'
import { createToolDriver } from './tool-driver'
import { partKind } from './tools/part'
import { useViewStore } from './view-store'

const ShortcutsDialog = lazy(async () => ({
  default: (await import('./toolbar/shortcuts-dialog')).ShortcutsDialog,
}))

const MOST_SHARED_SELECTION = 50

export function EditorProvider({ children }: { children: ReactNode }) {
  const session = useLayoutSession()
  const [isHelpOpen, setIsHelpOpen] = useState(false)
  const actions = useMemo(
    () =>
      createBenchActions(session, createToolDriver(session), createNudger(session), () =>
        setIsHelpOpen(true),
      ),
    [session],
  )
  useShortcuts(actions.context, actions.nudger)
  useSelectionUpkeep()
  useDropWhenReadOnly(actions)

  // The next layout starts afresh. Children have measured themselves by now, so nothing is reset on opening.
  useEffect(
    () => () => {
      actions.driver.dispose()
      useSelectionStore.getState().clear()
      useViewStore.setState({ isWhole: true, bounds: null, hoverStationMm: null })
    },
    [actions],
  )

  // What this person has selected is drawn in the other windows.
  useEffect(
    () =>
      useSelectionStore.subscribe((state, previous) => {
        if (state.selectedIds === previous.selectedIds) return
        session.updatePresence({ selection: state.selectedIds.slice(0, MOST_SHARED_SELECTION) })
      }),
    [session],
  )

  return (
    <BenchActionsContext value={actions}>
      {children}
      {isHelpOpen && (
        <Suspense fallback={null}>
          <ShortcutsDialog onClose={() => setIsHelpOpen(false)} />
        </Suspense>
      )}
    </BenchActionsContext>
  )
}

/** A part that somebody else removed is not selected any more. */
function useSelectionUpkeep(): void {
  useEffect(
    () =>
      useLayoutStore.subscribe((state, previous) => {
        const document = state.visible
        if (!document || document === previous.visible) return
        const { selectedIds, select } = useSelectionStore.getState()
        const still = selectedIds.filter((id) => partKind(document, id) !== null)
        if (still.length < selectedIds.length) select(still)
      }),
    [],
  )
}

/** Who may no longer edit, because of a freeze or of another role, drops what is in hand and hears of it. */
function useDropWhenReadOnly({ driver, nudger }: BenchActions): void {
  useEffect(
    () =>
      useLayoutStore.subscribe((state, previous) => {
        if (state.access?.canEdit !== false || previous.access?.canEdit !== true) return
        const wasNudging = nudger.cancel()
        const wasDragging = driver.cancel()
        driver.takeUp('select')
        if (wasNudging || wasDragging) {
          showToast('This layout can no longer be changed, so what you were moving was put back.', 'straw')
        }
      }),
    [driver, nudger],
  )
}
