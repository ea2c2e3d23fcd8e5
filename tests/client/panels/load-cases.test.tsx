// @vitest-environment jsdom
import { screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import { LoadCasesPanel } from '@/features/load-cases/load-cases-panel'
import { useResultsStore, WORST_CASE } from '@/stores/results-store'
import { type PanelBench, renderPanel } from './support/panel-bench'

const field = (name: string | RegExp) => screen.getByRole<HTMLInputElement>('textbox', { name })
const cases = (bench: PanelBench) => bench.layout().loadCases
const caseNamed = (bench: PanelBench, name: string) => cases(bench).find((loadCase) => loadCase.name === name)

describe('load cases', () => {
  it('are added, duplicated with loads of their own, put in order and deleted', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<LoadCasesPanel />)
    await user.click(screen.getByRole('button', { name: 'Duplicate' }))
    expect(cases(bench).map(({ name }) => name)).toEqual(['run', 'run, copy', 'warm-up under load'])
    const copy = caseNamed(bench, 'run, copy')
    expect(copy?.loads.map(({ torqueNm }) => torqueNm)).toEqual([1015, -990, -25])
    expect(copy?.loads[0]?.id).not.toBe(cases(bench)[0]?.loads[0]?.id)
    expect(field('Name of the load case').value).toBe('run, copy')

    await user.click(screen.getByRole('button', { name: 'Move down' }))
    expect(cases(bench).map(({ name }) => name)).toEqual(['run', 'warm-up under load', 'run, copy'])
    await user.click(screen.getByRole('button', { name: 'Delete' }))
    expect(cases(bench).map(({ name }) => name)).toEqual(['run', 'warm-up under load'])
    await user.click(screen.getByRole('button', { name: 'Add load case' }))
    expect(cases(bench).map(({ name }) => name)).toEqual(['run', 'warm-up under load', 'Load case'])
  })

  it('show their results on request', async () => {
    const user = userEvent.setup()
    renderPanel(<LoadCasesPanel />)
    await user.click(screen.getByRole('button', { name: 'Show its results' }))
    expect(useResultsStore.getState().selectedLoadCaseId).toBe('run')
    await user.click(screen.getByRole('button', { name: 'Back to the worst case' }))
    expect(useResultsStore.getState().selectedLoadCaseId).toBe(WORST_CASE)
  })

  it('may have acceptance criteria and hub temperatures of their own, and lose them again', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<LoadCasesPanel />)
    await user.type(field('Fatigue safety'), '1.3{Enter}')
    expect(cases(bench)[0]?.criteria).toEqual({ fatigueSafety: 1.3 })
    await user.clear(field('Fatigue safety'))
    await user.keyboard('{Enter}')
    expect(cases(bench)[0]?.criteria?.fatigueSafety).toBeUndefined()
    await user.type(field('wheel, first stage'), '194 °F{Enter}')
    expect(cases(bench)[0]?.hubTemperaturesC?.['A']).toBeCloseTo(90, 9)
  })
})

describe('loads', () => {
  it('are edited in place in any unit', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<LoadCasesPanel />)
    const force = field(/^Axial on wheel/)
    await user.clear(force)
    await user.type(force, '2.5 kN{Enter}')
    expect(bench.commits[0]?.operations).toEqual([
      {
        type: 'set',
        target: { kind: 'load', loadCaseId: 'run', id: cases(bench)[0]?.loads[0]?.id },
        field: 'axialN',
        before: 1982,
        value: 2500,
      },
    ])
  })

  it('show what is left of the torques and put it on the chosen hub', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<LoadCasesPanel />)
    expect(screen.getByText(/Torques balance/)).toBeDefined()
    const torque = field(/^Torque on wheel/)
    await user.clear(torque)
    await user.type(torque, '1200{Enter}')
    expect(screen.getByText(/Torques do not balance: 185 N·m left/)).toBeDefined()
    await user.selectOptions(screen.getByRole('combobox', { name: 'Hub that takes the difference' }), 'B')
    await user.click(screen.getByRole('button', { name: /^Put −185\sN·m on it$/ }))
    expect(cases(bench)[0]?.loads.find(({ hub }) => hub === 'B')?.torqueNm).toBe(-1175)
    expect(screen.getByText(/Torques balance/)).toBeDefined()
  })

  it('are copied to another case, onto the load of the same hub there', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<LoadCasesPanel />)
    const torque = field(/^Torque on oil pump/)
    await user.clear(torque)
    await user.type(torque, '-30{Enter}')
    await user.click(screen.getByRole('button', { name: 'Load on oil pump drive gear' }))
    await user.click(within(screen.getByRole('menu')).getByRole('menuitem', { name: 'warm-up under load' }))
    const copied = caseNamed(bench, 'warm-up under load')?.loads.filter(({ hub }) => hub === 'C')
    expect(copied).toHaveLength(1)
    expect(copied?.[0]?.torqueNm).toBe(-30)
  })

  it('cannot be changed by somebody who may only read', () => {
    renderPanel(<LoadCasesPanel />, { canEdit: false })
    expect(screen.queryByRole('button', { name: 'Add load' })).toBeNull()
    expect(field(/^Torque on wheel/).readOnly).toBe(true)
  })
})
