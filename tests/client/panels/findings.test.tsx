// @vitest-environment jsdom
import { screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import { announcement } from '@/features/results/announcement'
import { FindingsList } from '@/features/results/findings-list'
import { VerdictStrip } from '@/features/results/verdict-strip'
import { useResultsStore } from '@/stores/results-store'
import { useSelectionStore } from '@/stores/selection-store'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { reducerShaft, renderPanel } from './support/panel-bench'

/** The same shaft with the fit that holds. */
function mendedShaft(): LayoutDocument {
  const layout = reducerShaft()
  return {
    ...layout,
    hubs: layout.hubs.map((hub) =>
      hub.id === 'A' ? { ...hub, fit: { kind: 'iso286', hole: 'H7', shaft: 'u6' } } : hub,
    ),
  }
}

describe('the list of findings', () => {
  it('groups by severity with counts and words, value against limit', () => {
    renderPanel(<FindingsList />)
    const fails = screen.getByRole('region', { name: 'Fails' })
    expect(within(fails).getAllByRole('listitem')).toHaveLength(2)
    expect(within(fails).getAllByRole('button')[0]?.textContent).toContain('0.94 against 1.50')
    expect(screen.getByRole('button', { name: /Fails 2/ }).getAttribute('aria-pressed')).toBe('true')
  })

  it('selects the part and shows the load case of the finding pressed', async () => {
    const user = userEvent.setup()
    renderPanel(<FindingsList />)
    const [, second] = within(screen.getByRole('region', { name: 'Fails' })).getAllByRole('button')
    await user.click(second as HTMLElement)
    expect(useSelectionStore.getState().selectedIds).toEqual(['A'])
    expect(useResultsStore.getState().selectedLoadCaseId).toBe('warm-up')
  })

  it('can leave out a severity and other parts', async () => {
    const user = userEvent.setup()
    useSelectionStore.getState().select(['C'])
    renderPanel(<FindingsList />)
    await user.click(screen.getByRole('button', { name: /Notes/ }))
    expect(screen.queryByRole('region', { name: 'Notes' })).toBeNull()
    await user.click(screen.getByRole('checkbox', { name: 'Only selected parts' }))
    expect(screen.queryByRole('region', { name: 'Fails' })).toBeNull()
    expect(screen.getByRole('region', { name: 'Warns' })).toBeDefined()
  })
})

describe('what is spoken about findings', () => {
  const before = reducerShaft()
  const after = mendedShaft()
  const flawed = recalculateLayout(before).findings
  const mended = recalculateLayout(after).findings

  it('gives the count first and then only what changed', () => {
    expect(announcement(null, flawed, before)).toBe('2 findings fail.')
    expect(announcement(flawed, flawed, before)).toBe('')
    expect(announcement(flawed, mended, after)).toBe('Mended: wheel, first stage: slips. Nothing fails.')
    expect(announcement(mended, flawed, before)).toBe('New: wheel, first stage: slips. 2 findings fail.')
  })
})

describe('the verdict strip', () => {
  it('counts the seats that hold and names the worst with its case', () => {
    renderPanel(<VerdictStrip />)
    expect(screen.getByText(/2 of 3 seats hold/)).toBeDefined()
    expect(screen.getByText('wheel, first stage slips in case “warm-up under load”')).toBeDefined()
    expect(screen.getByText('worst case governs: 2 cases checked')).toBeDefined()
  })

  it('follows the chosen case', async () => {
    const user = userEvent.setup()
    renderPanel(<VerdictStrip />)
    await user.selectOptions(screen.getByRole('combobox'), 'run')
    expect(screen.getByText('wheel, first stage slips in case “run”')).toBeDefined()
    expect(screen.getByText(/application factor 1.5/)).toBeDefined()
  })

  it('says that all hold and that nothing fails when it is so', () => {
    renderPanel(<VerdictStrip />, { document: mendedShaft() })
    expect(screen.getByText(/3 of 3 seats hold/)).toBeDefined()
    expect(screen.getByText('nothing fails')).toBeDefined()
  })
})
