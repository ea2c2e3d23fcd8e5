// @vitest-environment jsdom
import { fireEvent, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import { FitSchedule } from '@/features/fit-schedule/fit-schedule'
import { formatFit, parseFit } from '@/features/fit-schedule/fit-entry'
import { useDerivationStore } from '@/stores/derivation-store'
import { useSelectionStore } from '@/stores/selection-store'
import { reducerShaft, renderPanel } from './support/panel-bench'

const table = () => screen.getByRole('table', { name: 'Fit schedule' })
const names = () =>
  within(table())
    .getAllByRole<HTMLInputElement>('textbox', { name: /^Name of/ })
    .map(({ value }) => value.split(',')[0])
const sortBy = (name: RegExp) => screen.getByRole('button', { name })

describe('order of the rows', () => {
  it('follows a column by mouse and by keyboard, turns round on the second press', async () => {
    const user = userEvent.setup()
    renderPanel(<FitSchedule />)
    expect(names()).toEqual(['wheel', 'pinion', 'oil pump drive gear'])
    await user.click(sortBy(/^From z/))
    expect(names()).toEqual(['oil pump drive gear', 'wheel', 'pinion'])
    expect(
      sortBy(/^From z/)
        .closest('th')
        ?.getAttribute('aria-sort'),
    ).toBe('ascending')
    sortBy(/^From z/).focus()
    await user.keyboard('{Enter}')
    expect(names()).toEqual(['pinion', 'wheel', 'oil pump drive gear'])
    await user.click(sortBy(/^Combined/))
    expect(names()[0]).toBe('wheel')
  })

  it('keeps hubs without a value at the end in both directions', async () => {
    const user = userEvent.setup()
    renderPanel(<FitSchedule />)
    await user.click(sortBy(/^Axial/))
    expect(names().at(-1)).toBe('oil pump drive gear')
    await user.click(sortBy(/^Axial/))
    expect(names().at(-1)).toBe('oil pump drive gear')
  })

  it('does not move rows under the fingers while somebody types', async () => {
    const user = userEvent.setup()
    renderPanel(<FitSchedule />)
    await user.click(sortBy(/^From z/))
    const station = within(table()).getByRole('textbox', { name: /^Left face of wheel/ })
    await user.clear(station)
    await user.type(station, '200')
    expect(names()).toEqual(['oil pump drive gear', 'wheel', 'pinion'])
    await user.click(sortBy(/^Length/))
    await user.click(sortBy(/^From z/))
    expect(names()).toEqual(['oil pump drive gear', 'pinion', 'wheel'])
  })
})

describe('a row', () => {
  it('is selected and hovered in step with the drawing', async () => {
    const user = userEvent.setup()
    renderPanel(<FitSchedule />)
    await user.click(within(table()).getByRole('button', { name: 'Select pinion, second stage' }))
    expect(useSelectionStore.getState().selectedIds).toEqual(['B'])
    fireEvent.pointerEnter(
      within(table())
        .getByRole('button', { name: /^Select oil pump/ })
        .closest('tr') as Element,
    )
    expect(useSelectionStore.getState().hoveredId).toBe('C')
  })

  it('says the state of its window in words and shows the failing safety with a sign', () => {
    renderPanel(<FitSchedule />)
    const row = within(table())
      .getByRole('button', { name: /^Select wheel/ })
      .closest('tr') as HTMLElement
    expect(within(row).getByRole('img').getAttribute('aria-label')).toMatch(/^Slips\. Made with 36 to 85 µm/)
    expect(within(row).getByText('Slips')).toBeDefined()
    expect(row.textContent).toContain('✕ fails: 0.56')
  })

  it('opens the derivation of a safety', async () => {
    const user = userEvent.setup()
    renderPanel(<FitSchedule />)
    await user.click(within(table()).getByRole('button', { name: /combined slip safety of pinion/ }))
    expect(useDerivationStore.getState().trail[0]).toMatchObject({
      kind: 'hubCase',
      hub: 'B',
      quantity: 'slipSafety',
    })
  })

  it('takes a fit typed as text and goes to the next row on Enter', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<FitSchedule />)
    const fit = within(table()).getByRole('textbox', { name: /^Fit of wheel/ })
    await user.clear(fit)
    await user.type(fit, 'H7/u6{Enter}')
    expect(bench.layout().hubs[0]?.fit).toEqual({ kind: 'iso286', hole: 'H7', shaft: 'u6' })
    await new Promise((resolve) => setTimeout(resolve))
    expect(document.activeElement).toBe(within(table()).getByRole('textbox', { name: /^Fit of pinion/ }))
  })

  it('stays in the cell and says what is wrong when the fit cannot be read', async () => {
    const user = userEvent.setup()
    const bench = renderPanel(<FitSchedule />)
    const fit = within(table()).getByRole<HTMLInputElement>('textbox', { name: /^Fit of wheel/ })
    await user.clear(fit)
    await user.type(fit, 'tight{Enter}')
    await new Promise((resolve) => setTimeout(resolve))
    expect(document.activeElement).toBe(fit)
    expect(fit.value).toBe('tight')
    expect(within(table()).getByRole('alert').textContent).toContain('H7/u6')
    expect(bench.commits).toEqual([])
  })
})

it('names the hub nearest to slipping and its case under the table', () => {
  renderPanel(<FitSchedule />)
  expect(table().textContent).toContain(
    'nearest to slipping: wheel, first stage, 0.56 against 1.2 in case “warm-up under load”',
  )
})

describe('fit as text', () => {
  it.each([
    ['H7/u6', { kind: 'iso286', hole: 'H7', shaft: 'u6' }],
    ['u6 / H7', { kind: 'iso286', hole: 'H7', shaft: 'u6' }],
    ['35…60', { kind: 'limits', minInterferenceUm: 35, maxInterferenceUm: 60 }],
    ['35 to 60 µm', { kind: 'limits', minInterferenceUm: 35, maxInterferenceUm: 60 }],
    ['1..2 thou', { kind: 'limits', minInterferenceUm: 25.4, maxInterferenceUm: 50.8 }],
    ['0.03 mm … 60 µm', { kind: 'limits', minInterferenceUm: 30, maxInterferenceUm: 60 }],
  ])('%s', (text, value) => {
    expect(parseFit(text, 'metric')).toEqual({ ok: true, value })
  })

  it('refuses what is neither, with words', () => {
    expect(parseFit('H7/H6', 'metric')).toMatchObject({ ok: false })
    expect(parseFit('60…35', 'metric')).toEqual({
      ok: false,
      message: 'The first value is the least interference',
    })
    expect(parseFit('', 'metric')).toMatchObject({ ok: false })
  })

  it('comes back as written', () => {
    for (const { fit } of reducerShaft().hubs) {
      expect(parseFit(formatFit(fit, 'metric'), 'metric')).toEqual({ ok: true, value: fit })
    }
  })
})
