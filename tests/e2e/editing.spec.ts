import { expect, type Page } from '@playwright/test'
import {
  createLayout,
  dragOnDrawing,
  openLayout,
  outlineItem,
  scheduleField,
  slipSafety,
} from '../support/bench-page'
import { test } from '../support/journey'

const WHEEL = 'wheel, first stage'
const PUMP_GEAR = 'oil pump drive gear'
const EXAMPLE = 'reducer-intermediate-shaft'

const saved = (page: Page) => page.getByRole('status').filter({ hasText: 'all edits saved' })

test('an edit made without a connection survives a reload and arrives afterwards', async ({
  openAs,
  problems,
}) => {
  const dina = await openAs('dina')
  const name = 'Reducer for the offline journey'
  await createLayout(dina, EXAMPLE, name)
  await openLayout(dina, name)

  await dina.context().setOffline(true)
  const fit = scheduleField(dina, 'Fit', WHEEL)
  await fit.fill('H7/s6')
  await fit.press('Enter')
  await expect(fit).toHaveValue('H7/s6')
  // The chip never says saved while something is pending.
  await expect(saved(dina)).toBeHidden()

  // The page itself must come from somewhere, so the line is up again for the reload alone.
  const address = dina.url()
  await dina.goto('about:blank')
  await dina.context().setOffline(false)
  await dina.goto(address)
  await expect(scheduleField(dina, 'Fit', WHEEL)).toHaveValue('H7/s6')
  await expect(saved(dina)).toBeVisible()

  const tomas = await openAs('tomas')
  await openLayout(tomas, name)
  await expect(scheduleField(tomas, 'Fit', WHEEL)).toHaveValue('H7/s6')
  expect(problems).toEqual([])
})

test('a drag shows its numbers while it lasts and Escape leaves everything as it was', async ({
  openAs,
  problems,
}) => {
  const dina = await openAs('dina')
  const name = 'Reducer for the dragging journey'
  await createLayout(dina, EXAMPLE, name)
  await openLayout(dina, name)
  const station = scheduleField(dina, 'Left face', PUMP_GEAR)
  const before = await station.inputValue()
  const left = Number(before)

  await dragOnDrawing(
    dina,
    { stationMm: left + 15, heightMm: 33 },
    { stationMm: left + 11, heightMm: 33 },
    async () => {
      await expect(station).not.toHaveValue(before)
      await dina.keyboard.press('Escape')
      await expect(station).toHaveValue(before)
    },
  )
  await expect(station).toHaveValue(before)
  await expect(dina.getByRole('button', { name: /^Undo/ })).toBeDisabled()
  expect(problems).toEqual([])
})

test('the outline selects, moves and takes back with the keyboard alone', async ({ openAs, problems }) => {
  const dina = await openAs('dina')
  const name = 'Reducer for the keyboard journey'
  await createLayout(dina, EXAMPLE, name)
  await openLayout(dina, name)
  const station = scheduleField(dina, 'Left face', PUMP_GEAR)
  const before = Number(await station.inputValue())

  const first = outlineItem(dina, PUMP_GEAR)
  await first.focus()
  await dina.keyboard.press('ArrowDown')
  await expect(outlineItem(dina, WHEEL)).toBeFocused()
  await expect(outlineItem(dina, WHEEL)).toHaveAttribute('aria-selected', 'true')
  await dina.keyboard.press('ArrowUp')
  await expect(first).toBeFocused()

  await dina.keyboard.press('ArrowLeft')
  await expect.poll(async () => Number(await station.inputValue())).toBeLessThan(before)
  await expect(dina.getByTestId('live-result')).toContainText(PUMP_GEAR)
  await dina.keyboard.press('Control+z')
  await expect(station).toHaveValue(String(before))
  expect(problems).toEqual([])
})

test('a field refuses what it cannot read, says why, and keeps what was typed', async ({
  openAs,
  problems,
}) => {
  const dina = await openAs('dina')
  const name = 'Reducer for the typing journey'
  await createLayout(dina, EXAMPLE, name)
  await openLayout(dina, name)
  const length = scheduleField(dina, 'Length', WHEEL)
  const slip = await slipSafety(dina, WHEEL).textContent()

  await length.fill('sixty')
  await length.press('Enter')
  await expect(length).toHaveAttribute('aria-invalid', 'true')
  await expect(length).toHaveValue('sixty')
  await expect(slipSafety(dina, WHEEL)).toHaveText(slip ?? '')

  // Arithmetic and units are understood: 2 in + 4 mm.
  await length.fill('2 in')
  await length.press('Enter')
  await expect(length).toHaveValue('50.8')
  await expect(slipSafety(dina, WHEEL)).not.toHaveText(slip ?? '')
  await length.fill('25.4*2+9.2')
  await length.press('Enter')
  await expect(length).toHaveValue('60')
  expect(problems).toEqual([])
})
