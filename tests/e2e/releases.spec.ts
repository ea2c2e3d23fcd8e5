/** Review, deviations, freeze, sheet, next revision, comparison and withdrawal, each by the page. */
import { readFile } from 'node:fs/promises'
import { expect } from '@playwright/test'
import { releaseDeskSchema } from '@shared/protocol/releases'
import { createLayout, openLayout, scheduleField, slipSafety } from '../support/bench-page'
import { test } from '../support/journey'
import { readPdf } from '../support/read-pdf'

const WHEEL = 'wheel, first stage'
const NAME = 'Reducer on its way to release'

test('a layout is reviewed, released with deviations, revised, compared and withdrawn', async ({
  openAs,
  problems,
}) => {
  const dina = await openAs('dina')
  const { workspaceId } = await createLayout(dina, 'reducer-intermediate-shaft', NAME)
  await openLayout(dina, NAME)
  const fit = scheduleField(dina, 'Fit', WHEEL)
  await fit.fill('H7/t6')
  await fit.press('Enter')
  await expect(slipSafety(dina, WHEEL)).toContainText('0.56')

  await dina.getByRole('button', { name: 'Ask for review' }).click()
  await dina.getByLabel('Note for the reviewer').fill('The wheel keeps H7/t6 for the first batch.')
  await dina.getByRole('dialog').getByRole('button', { name: 'Ask for review' }).click()
  await expect(dina.getByRole('button', { name: 'Take back' })).toBeVisible()

  // The manager finds it on the desk, with what fails in it.
  const mira = await openAs('mira')
  await mira.goto(`/w/${workspaceId}/releases`)
  const waiting = mira.getByRole('region', { name: 'Waiting for review' }).getByRole('listitem').filter({
    hasText: NAME,
  })
  await expect(waiting).toContainText('The wheel keeps H7/t6 for the first batch.')
  await waiting.getByRole('button', { name: '2 findings fail' }).click()
  await expect(waiting).toContainText('slips at the lower end of its tolerance')
  await waiting.getByRole('link', { name: 'Open on the bench' }).click()

  await mira.getByRole('button', { name: 'Freeze layout' }).click()
  const dialog = mira.getByRole('dialog')
  await dialog.getByRole('button', { name: 'Freeze revision A' }).click()
  await expect(dialog.getByText('Say in at least ten characters why this is acceptable')).toHaveCount(2)
  for (const field of await dialog.getByLabel(/^Why slip of wheel/).all())
    await field.fill('Bench test over 200 h at 1.3 times the torque.')
  await dialog.getByRole('button', { name: 'Freeze revision A' }).click()
  await expect(dialog).toBeHidden()

  // Read-only at once for the designer, who did not reload.
  await expect(dina.getByText('Revision A is released')).toBeVisible()
  await expect(scheduleField(dina, 'Fit', WHEEL)).not.toBeEditable()

  const [download] = await Promise.all([
    dina.waitForEvent('download'),
    dina.getByRole('button', { name: 'Release sheet' }).click(),
  ])
  expect(download.suggestedFilename()).toBe('Reducer-on-its-way-to-release-revision-A.pdf')
  const { pages } = await readPdf(await readFile(await download.path()))
  const answer = await mira.request.get(`/api/workspaces/${workspaceId}/releases`)
  const release = releaseDeskSchema
    .parse(await answer.json())
    .releases.find((each) => each.layoutName === NAME)
  for (const page of pages) {
    expect(page.text).toContain('Revision A')
    expect(page.text).toContain(release?.documentHash)
  }

  // A draft of revision B with a fit that holds; the release keeps its own.
  await mira.getByRole('button', { name: 'Start next revision' }).click()
  await mira.getByRole('dialog').getByRole('button', { name: 'Start revision B' }).click()
  const draftFit = scheduleField(dina, 'Fit', WHEEL)
  await expect(draftFit).toBeEditable()
  await draftFit.fill('H7/u6')
  await draftFit.press('Enter')
  await expect(slipSafety(mira, WHEEL)).toContainText('1.27')

  await mira.goto(`/w/${workspaceId}/releases/${release?.id ?? ''}?show=compare`)
  await expect(mira.getByRole('heading', { level: 1 })).toHaveText(`${NAME}, revision A`)
  const change = mira.getByRole('tabpanel').getByRole('listitem').filter({ hasText: 'Wheel, first stage' })
  await expect(change).toContainText('H7/t6')
  await expect(change).toContainText('H7/u6')
  await mira.getByRole('tab', { name: 'Findings' }).click()
  await expect(mira.getByText('Accepted by Mira Kast')).toHaveCount(2)

  await mira.getByRole('button', { name: 'Withdraw' }).click()
  await mira.getByLabel('Reason').fill('The first batch was scrapped.')
  await mira.getByRole('dialog').getByRole('button', { name: 'Withdraw' }).click()
  await expect(mira.getByText('Withdrawn. Do not build from it.')).toBeVisible()
  await mira.getByRole('link', { name: 'Release desk' }).first().click()
  await expect(mira.getByRole('region', { name: 'Withdrawn' })).toContainText('The first batch was scrapped.')
  expect(problems).toEqual([])
})
