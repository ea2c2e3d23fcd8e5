// @vitest-environment jsdom
import { screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import { ShaftSectionsPanel } from '@/features/shaft-sections/shaft-sections-panel'
import { useSelectionStore } from '@/stores/selection-store'
import { type PanelBench, renderPanel } from './support/panel-bench'

const sections = (bench: PanelBench) => bench.layout().shaft.sections
const field = (name: string) =>
  screen.getByRole<HTMLInputElement>('textbox', { name: new RegExp(`^${name}, mm$`) })

async function choose(user: ReturnType<typeof userEvent.setup>, section: number, action: string) {
  await user.click(screen.getByRole('button', { name: `Section ${section}` }))
  await user.click(within(screen.getByRole('menu')).getByRole('menuitem', { name: action }))
}

describe('shaft sections', () => {
  it('show running stations that follow a changed length', async () => {
    const user = userEvent.setup()
    renderPanel(<ShaftSectionsPanel />)
    const row = () => field('Length of section 2').closest('tr') as HTMLElement
    expect(within(row()).getByText('27')).toBeDefined()
    expect(within(row()).getByText('62')).toBeDefined()
    await user.clear(field('Length of section 1'))
    await user.type(field('Length of section 1'), '30{Enter}')
    expect(within(row()).getByText('30')).toBeDefined()
    expect(within(row()).getByText('65')).toBeDefined()
    expect(screen.getByText(/264 mm in all/)).toBeDefined()
  })

  it('are inserted with the diameter beside, duplicated, moved and deleted', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<ShaftSectionsPanel />)
    await choose(user, 3, 'Insert a section before')
    expect(sections(bench)[2]).toMatchObject({ lengthMm: 40, outerDiameterMm: 55 })
    expect(useSelectionStore.getState().selectedIds).toEqual([sections(bench)[2]?.id])
    await choose(user, 3, 'Delete')
    await choose(user, 4, 'Duplicate')
    expect(sections(bench).map(({ outerDiameterMm }) => outerDiameterMm)).toEqual([
      45, 55, 65, 78, 78, 65, 50,
    ])
    await choose(user, 5, 'Move to the right')
    expect(sections(bench).map(({ outerDiameterMm }) => outerDiameterMm)).toEqual([
      45, 55, 65, 78, 65, 78, 50,
    ])
    await user.click(screen.getByRole('button', { name: 'Add section at the right end' }))
    expect(sections(bench)).toHaveLength(8)
    expect(sections(bench).at(-1)?.outerDiameterMm).toBe(50)
  })

  it('refuse a bore as large as the outside, and take an empty fillet as sharp', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<ShaftSectionsPanel />)
    await user.clear(field('Outer diameter of section 1'))
    await user.type(field('Outer diameter of section 1'), '0{Enter}')
    expect(screen.getByRole('alert').textContent).toContain('Must be more than 0')
    await user.keyboard('{Escape}')
    await user.clear(field('Fillet at the right end of section 1'))
    await user.keyboard('{Enter}')
    expect(sections(bench)[0]?.rightFilletMm).toBeUndefined()
  })
})
