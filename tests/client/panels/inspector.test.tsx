// @vitest-environment jsdom
import { act, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import { Inspector } from '@/features/editor/inspector/inspector'
import { useDerivationStore } from '@/stores/derivation-store'
import { useLayoutStore } from '@/stores/layout-store'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useSelectionStore } from '@/stores/selection-store'
import { reducerShaft, renderPanel } from './support/panel-bench'

const field = (name: string) => screen.getByRole<HTMLInputElement>('textbox', { name })
const hub = (bench: ReturnType<typeof renderPanel>, id: string) =>
  bench.layout().hubs.find((item) => item.id === id)

function inspect(id: string, options?: Parameters<typeof renderPanel>[1]) {
  useSelectionStore.getState().select([id])
  return renderPanel(<Inspector />, options)
}

describe('a field of a hub', () => {
  it('previews while typing and commits one operation on Enter, with what was on screen before', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.clear(field('Length'))
    await user.type(field('Length'), '64')
    expect(bench.commits).toEqual([])
    expect(bench.previews.at(-1)).toEqual([
      { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'lengthMm', before: 60, value: 64 },
    ])
    await user.keyboard('{Enter}')
    expect(bench.commits).toEqual([
      {
        label: 'Change length of wheel, first stage',
        operations: [
          { type: 'set', target: { kind: 'hub', id: 'A' }, field: 'lengthMm', before: 60, value: 64 },
        ],
      },
    ])
    expect(field('Length').value).toBe('64')
  })

  it('takes units and arithmetic', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.clear(field('Length'))
    await user.type(field('Length'), '2.5 in - 0.5 mm{Enter}')
    expect(hub(bench, 'A')?.lengthMm).toBe(63)
  })

  it('keeps the typed text and says what is wrong when it cannot be read', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.clear(field('Length'))
    await user.type(field('Length'), '60 kg{Enter}')
    expect(field('Length').value).toBe('60 kg')
    expect(field('Length').getAttribute('aria-invalid')).toBe('true')
    expect(screen.getByRole('alert').textContent).toContain('"kg" does not belong here')
    expect(bench.commits).toEqual([])
    expect(bench.layout().hubs[0]?.lengthMm).toBe(60)

    await user.clear(field('Length'))
    await user.type(field('Length'), '0{Enter}')
    expect(screen.getByRole('alert').textContent).toContain('Must be more than 0')
  })

  it('keeps that text while another part is looked at', async () => {
    const user = userEvent.setup()
    inspect('A')
    await user.clear(field('Outer ⌀'))
    await user.type(field('Outer ⌀'), '10x5{Enter}')
    act(() => useSelectionStore.getState().select(['B']))
    expect(field('Outer ⌀').value).toBe('94.12')
    act(() => useSelectionStore.getState().select(['A']))
    expect(field('Outer ⌀').value).toBe('10x5')
    await user.click(field('Outer ⌀'))
    await user.keyboard('{Escape}')
    expect(field('Outer ⌀').value).toBe('105')
  })

  it('gives up what was typed on Escape, and the preview with it', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.clear(field('Left face at'))
    await user.type(field('Left face at'), '80')
    expect(useLayoutStore.getState().visible?.hubs[0]?.stationMm).toBe(80)
    await user.keyboard('{Escape}')
    expect(field('Left face at').value).toBe('72')
    expect(useLayoutStore.getState().visible?.hubs[0]?.stationMm).toBe(72)
    await user.tab()
    expect(bench.commits).toEqual([])
  })

  it('nudges with the arrow keys, ten times with Shift, as one edit', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.click(field('Left face at'))
    await user.keyboard('{ArrowUp}{ArrowUp}{Shift>}{ArrowUp}{/Shift}{ArrowDown}')
    expect(field('Left face at').value).toBe('83')
    await user.tab()
    expect(bench.commits).toHaveLength(1)
    expect(hub(bench, 'A')?.stationMm).toBe(83)
  })

  it('undoes the last edit when nothing is typed, and leaves undo to the text while something is', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.clear(field('Length'))
    await user.type(field('Length'), '64')
    await user.keyboard('{Control>}z{/Control}')
    expect(bench.history).toEqual([])
    await user.keyboard('{Enter}{Control>}z{/Control}{Control>}{Shift>}z{/Shift}{/Control}')
    expect(bench.history).toEqual(['undo', 'redo'])
  })

  it('commits nothing when the value is the same', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.clear(field('Length'))
    await user.type(field('Length'), '6 cm{Enter}')
    expect(bench.commits).toEqual([])
    expect(field('Length').value).toBe('60')
  })

  it('shows and takes inches when the person prefers them; stored values stay metric', async () => {
    const user = userEvent.setup()
    usePreferencesStore.setState({ units: 'inch' })
    const bench = inspect('A')
    expect(field('Length').value).toBe('2.3622')
    await user.clear(field('Length'))
    await user.type(field('Length'), '2.5{Enter}')
    expect(hub(bench, 'A')?.lengthMm).toBe(63.5)
  })

  it('tells others which field is being edited, and shows who edits one', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.click(field('Length'))
    await user.tab()
    expect(bench.editing.slice(0, 2)).toEqual(['hub:A:lengthMm', null])

    act(() =>
      useLayoutStore.setState({
        people: [
          {
            connectionId: 'other',
            userId: 'user-2',
            name: 'Tomas Berg',
            role: 'designer',
            colourIndex: 1,
            cursor: null,
            selection: ['A'],
            editing: 'hub:A:outerDiameterMm',
            ghost: null,
          },
        ],
      }),
    )
    expect(screen.getByText('Tomas')).toBeDefined()
    expect(screen.getByText(/Tomas is editing outer diameter/)).toBeDefined()
  })

  it('cannot be typed in by somebody who may only read', async () => {
    const user = userEvent.setup()
    const bench = inspect('A', { canEdit: false })
    expect(field('Length').readOnly).toBe(true)
    await user.type(field('Length'), '99{Enter}')
    expect(bench.commits).toEqual([])
  })
})

describe('the fit of a hub', () => {
  it('shows that the wheel slips and what would mend it, and takes that fit', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    expect(screen.getByText('Slips')).toBeDefined()
    await user.click(screen.getByRole('button', { name: /^Take H7\/u6/ }))
    expect(hub(bench, 'A')?.fit).toEqual({ kind: 'iso286', hole: 'H7', shaft: 'u6' })
    expect(screen.getByText('Inside window')).toBeDefined()
  })

  it('changes one class and keeps the other', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.selectOptions(screen.getByRole('combobox', { name: 'Seat class' }), 's6')
    expect(bench.commits[0]?.operations).toEqual([
      {
        type: 'set',
        target: { kind: 'hub', id: 'A' },
        field: 'fit',
        before: { kind: 'iso286', hole: 'H7', shaft: 't6' },
        value: { kind: 'iso286', hole: 'H7', shaft: 's6' },
      },
    ])
  })

  it('turns into limits that start from what the classes gave, and takes a radial value', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.selectOptions(screen.getByRole('combobox', { name: 'Fit given by' }), 'limits')
    const fit = hub(bench, 'A')?.fit
    expect(fit?.kind === 'limits' && Math.round(fit.minInterferenceUm)).toBe(36)
    await user.clear(field('Most, diametral'))
    await user.type(field('Most, diametral'), 'r 50 µm{Enter}')
    expect(hub(bench, 'A')?.fit).toMatchObject({ kind: 'limits', maxInterferenceUm: 100 })
  })
})

describe('a layout without load cases', () => {
  it('still shows the stresses of the fit at rest', () => {
    const layout = reducerShaft()
    useSelectionStore.getState().select(['A'])
    renderPanel(<Inspector />, { document: { ...layout, loadCases: [] } })
    expect(screen.getByText('Hub bore, equivalent, at rest')).toBeDefined()
    expect(screen.queryByText('Combined slip safety')).toBeNull()
  })
})

describe('other properties', () => {
  it('sets both holding coefficients from a named pairing in one edit', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.click(screen.getByText('Take it from a known pairing'))
    await user.selectOptions(
      await screen.findByRole('combobox', { name: 'Holding, like' }),
      'ss-shrink-degreased',
    )
    expect(bench.commits).toHaveLength(1)
    expect(hub(bench, 'A')?.friction).toMatchObject({ circumferential: 0.2, axial: 0.2, pressing: 0.12 })
  })

  it('replaces one value of a material of its own and keeps the rest', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.click(screen.getByText(/^31CrMoV9-N, yield 800/))
    await screen.findByRole('textbox', { name: 'Yield strength' })
    await user.clear(field('Yield strength'))
    await user.type(field('Yield strength'), '750{Enter}')
    expect(hub(bench, 'A')?.material).toMatchObject({ yieldMPa: 750, tensileMPa: 1000 })
  })

  it('takes a material from the library, and starts own values from it', async () => {
    const user = userEvent.setup()
    const bench = inspect('A')
    await user.click(screen.getByText(/^31CrMoV9-N, yield 800/))
    await user.selectOptions(await screen.findByRole('combobox', { name: 'Material' }), '42CrMo4-QT-100')
    expect(hub(bench, 'A')?.material).toBe('42CrMo4-QT-100')
    await user.selectOptions(screen.getByRole('combobox', { name: 'Material' }), 'own-values')
    expect(hub(bench, 'A')?.material).toMatchObject({ name: '42CrMo4-QT-100', yieldMPa: 650, brittle: false })
  })

  it('gives a value to all selected hubs', async () => {
    const user = userEvent.setup()
    useSelectionStore.getState().select(['A', 'B'])
    const bench = renderPanel(<Inspector />)
    expect(field('Length').placeholder).toBe('several')
    await user.type(field('Length'), '66{Enter}')
    expect(bench.commits).toHaveLength(1)
    expect(bench.layout().hubs.map(({ lengthMm }) => lengthMm)).toEqual([66, 66, 30])
  })

  it('opens the derivation of a number', async () => {
    const user = userEvent.setup()
    inspect('A')
    await user.click(screen.getByRole('button', { name: /formula of the safety of combined slip safety/ }))
    expect(useDerivationStore.getState().trail).toEqual([
      { kind: 'hubCase', hub: 'A', loadCase: 'warm-up', quantity: 'slipSafety' },
    ])
  })

  it('changes an acceptance criterion when nothing is selected', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<Inspector />)
    await user.clear(field('Slip safety'))
    await user.type(field('Slip safety'), '1.3{Enter}')
    expect(bench.layout().criteria.slipSafety).toBe(1.3)
  })
})
