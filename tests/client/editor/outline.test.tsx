// @vitest-environment jsdom
import { BenchActionsContext, createBenchActions } from '@/features/editor/bench-actions'
import { createNudger, type Nudger } from '@/features/editor/actions/nudge'
import { Outline } from '@/features/editor/outline/outline'
import { createToolDriver } from '@/features/editor/tool-driver'
import { LayoutSessionProvider } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'
import { useResultsStore } from '@/stores/results-store'
import { useSelectionStore } from '@/stores/selection-store'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { act, cleanup, render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { useShortcuts } from '@/features/editor/actions/use-shortcuts'
import type { BenchActions } from '@/features/editor/bench-actions'
import { type FakeSession, openFakeLayout } from './fake-session'
import { twoHubs } from './layouts'

function Keyboard({ actions, nudger }: { actions: BenchActions; nudger: Nudger }) {
  useShortcuts(actions.context, nudger)
  return null
}

/** The results store as the worker would leave it for the layout on screen. */
function calculate(): void {
  const document = useLayoutStore.getState().visible!
  useResultsStore.setState({ results: recalculateLayout(document), document, isStale: false, failure: null })
}

function show(canEdit = true): { session: FakeSession; opened: () => number } {
  const session = openFakeLayout(twoHubs(), canEdit)
  calculate()
  let opened = 0
  const nudger = createNudger(session)
  const actions = createBenchActions(session, createToolDriver(session), nudger, () => undefined)
  render(
    <LayoutSessionProvider session={session}>
      <BenchActionsContext value={actions}>
        <Keyboard actions={actions} nudger={nudger} />
        <Outline isOpen onOpenInspector={() => void (opened += 1)} />
      </BenchActionsContext>
    </LayoutSessionProvider>,
  )
  return { session, opened: () => opened }
}

const option = (name: RegExp) => screen.getByRole('option', { name })

beforeEach(() => useSelectionStore.getState().clear())
afterEach(cleanup)

describe('the outline', () => {
  it('lists every part with place, size, fit and result in words', () => {
    show()
    const list = screen.getByRole('listbox', { name: 'Parts of the layout' })
    expect(
      within(list)
        .getAllByRole('group')
        .map((group) => group.getAttribute('aria-label')),
    ).toEqual(['Hubs', 'Bearings', 'Shaft sections', 'Loads, run'])
    const label = option(/^A, gear/).getAttribute('aria-label')
    expect(label).toMatch(/at 50\smm, 40\smm long, diameter 50 H7\/s6, slip safety [\d.]+/)
    expect(within(list).getAllByRole('option').length).toBe(2 + 2 + 3 + 2)
  })

  it('is one stop for Tab; the arrow keys walk and select', async () => {
    show()
    const user = userEvent.setup()
    await user.tab()
    expect(document.activeElement).toBe(option(/^A, gear/))
    await user.keyboard('{ArrowDown}')
    expect(document.activeElement).toBe(option(/^B, gear/))
    expect(useSelectionStore.getState().selectedIds).toEqual(['B'])
    await user.keyboard('{End}')
    expect(document.activeElement?.getAttribute('aria-label')).toMatch(/^Load on B/)
    await user.keyboard('{Home}')
    expect(useSelectionStore.getState().selectedIds).toEqual(['A'])
  })

  it('shifts the part with the arrow keys and speaks the result', async () => {
    vi.useFakeTimers({ shouldAdvanceTime: true })
    try {
      const { session } = show()
      const user = userEvent.setup({ advanceTimers: vi.advanceTimersByTime })
      await user.click(option(/^A, gear/))
      await user.keyboard('{ArrowRight}{ArrowRight}')
      act(() => void vi.advanceTimersByTime(500))
      expect(session.committed).toEqual(['Move A'])
      act(calculate)
      act(() => void vi.advanceTimersByTime(700))
      expect(screen.getByTestId('live-result').textContent).toMatch(/^A at 52\smm, slip safety [\d.]+, \w+/)
    } finally {
      vi.useRealTimers()
    }
  })

  it('removes with Delete and opens the inspector with Enter', async () => {
    const { session, opened } = show()
    const user = userEvent.setup()
    await user.click(option(/^A, gear/))
    await user.keyboard('{Enter}')
    expect(opened()).toBe(1)
    await user.keyboard('{Delete}')
    expect(session.committed).toEqual(['Delete A'])
    expect(screen.queryByRole('option', { name: /^A, gear/ })).toBeNull()
  })

  it('removes a load without its hub', async () => {
    const { session } = show()
    const user = userEvent.setup()
    await user.click(option(/^Load on A/))
    await user.keyboard('{Delete}')
    expect(session.committed).toEqual(['Delete load of A'])
    expect(useLayoutStore.getState().visible?.hubs.length).toBe(2)
    expect(useLayoutStore.getState().visible?.loadCases[0]?.loads.map(({ id }) => id)).toEqual(['run-B'])
  })

  it('shows everything and changes nothing for a person who only reads', async () => {
    const { session } = show(false)
    const user = userEvent.setup()
    await user.click(option(/^A, gear/))
    await user.keyboard('{ArrowRight}{Delete}')
    await user.click(option(/^Load on A/))
    await user.keyboard('{ArrowRight}{Delete}')
    expect(session.committed).toEqual([])
    expect(useLayoutStore.getState().preview).toBeNull()
  })
})
