/** The main job, end to end: two designers on one layout, a slipping wheel, a better fit, a drag, undo, a frozen release. */
import { readFile } from 'node:fs/promises'
import { expect } from '@playwright/test'
import { releaseDeskSchema } from '@shared/protocol/releases'
import {
  chooseLoadCase,
  dragOnDrawing,
  openLayout,
  scheduleField,
  seatVerdict,
  slipSafety,
} from '../support/bench-page'
import { test } from '../support/journey'
import { readPdf } from '../support/read-pdf'

const LAYOUT = 'Conveyor drive, two-stage reducer, intermediate shaft'
const WHEEL = 'wheel, first stage'
const PINION = 'pinion, second stage'
const RUNNING = 'run'

test('from a slipping wheel to a frozen release, two designers and a manager at once', async ({
  openAs,
  problems,
}) => {
  const dina = await openAs('dina')
  const tomas = await openAs('tomas')
  for (const page of [dina, tomas]) {
    await openLayout(page, LAYOUT)
    await chooseLoadCase(page, RUNNING)
  }

  await test.step('the wheel slips: 0.94 against 1.5', async () => {
    for (const page of [dina, tomas]) await expect(slipSafety(page, WHEEL)).toContainText('0.94')
    await expect(seatVerdict(dina)).toContainText('2 of 3')
  })

  await test.step('H7/u6 holds with 1.65, in both browsers', async () => {
    const fit = scheduleField(dina, 'Fit', WHEEL)
    await fit.fill('H7/u6')
    await fit.press('Enter')
    for (const page of [dina, tomas]) {
      await expect(slipSafety(page, WHEEL)).toContainText('1.65')
      await expect(scheduleField(page, 'Fit', WHEEL)).toHaveValue('H7/u6')
      await expect(seatVerdict(page)).toContainText('3 of 3')
    }
  })

  await test.step('a hub dragged by one moves for the other', async () => {
    const station = scheduleField(tomas, 'Left face', PINION)
    await expect(station).toHaveValue('147')
    await dragOnDrawing(dina, { stationMm: 200, heightMm: 42 }, { stationMm: 204, heightMm: 42 })
    await expect(scheduleField(dina, 'Left face', PINION)).not.toHaveValue('147')
    const moved = await scheduleField(dina, 'Left face', PINION).inputValue()
    await expect(station).toHaveValue(moved)
  })

  await test.step('undo takes back only one’s own edit', async () => {
    // Tomas changes something of his own after Dina’s drag.
    const length = scheduleField(tomas, 'Length', WHEEL)
    await length.fill('59')
    await length.press('Enter')
    await expect(scheduleField(dina, 'Length', WHEEL)).toHaveValue('59')

    await dina.getByRole('button', { name: /^Undo/ }).click()
    for (const page of [dina, tomas]) {
      await expect(scheduleField(page, 'Left face', PINION)).toHaveValue('147')
      await expect(scheduleField(page, 'Length', WHEEL)).toHaveValue('59')
    }
    await tomas.getByRole('button', { name: /^Undo/ }).click()
    for (const page of [dina, tomas]) await expect(scheduleField(page, 'Length', WHEEL)).toHaveValue('60')
  })

  const mira = await openAs('mira')
  await openLayout(mira, LAYOUT)

  await test.step('the manager freezes: nothing fails, so nothing has to be accepted', async () => {
    await mira.getByRole('button', { name: 'Freeze layout' }).click()
    await mira.getByRole('dialog').getByRole('button', { name: 'Freeze revision A' }).click()
    await expect(mira.getByRole('dialog')).toBeHidden()
  })

  await test.step('every open browser is read-only at once, and a late edit is refused', async () => {
    for (const page of [dina, tomas]) {
      await expect(page.getByText('Revision A is released')).toBeVisible()
      await expect(scheduleField(page, 'Fit', WHEEL)).not.toBeEditable()
    }
    const layoutId = new URL(dina.url()).pathname.split('/').at(-1) ?? ''
    const late = await dina.request.patch(`/api/layouts/${layoutId}`, {
      headers: { origin: new URL(dina.url()).origin },
      data: { name: 'Too late' },
    })
    expect(late.status()).toBe(409)
    expect(await late.json()).toMatchObject({ error: { code: 'frozen' } })
  })

  await test.step('the release sheet names revision and hash on every page', async () => {
    const [download] = await Promise.all([
      tomas.waitForEvent('download'),
      tomas.getByRole('button', { name: 'Release sheet' }).click(),
    ])
    const { pages } = await readPdf(await readFile(await download.path()))
    const workspaceId = new URL(mira.url()).pathname.split('/')[2] ?? ''
    const desk = releaseDeskSchema.parse(
      await (await mira.request.get(`/api/workspaces/${workspaceId}/releases`)).json(),
    )
    const release = desk.releases.find((each) => each.layoutName === LAYOUT)
    expect(release?.revisionLetter).toBe('A')
    expect(pages.length).toBeGreaterThan(0)
    for (const page of pages) {
      expect(page.text).toContain('Revision A')
      expect(page.text).toContain(release?.documentHash)
    }
  })
  expect(problems).toEqual([])
})
