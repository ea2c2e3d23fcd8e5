/** Ways to reach things on the bench as a person does: by name, or by place on the shaft. */
import type { Locator, Page } from '@playwright/test'
import { layoutSummarySchema, type LayoutSummary } from '@shared/protocol/layouts'
import { meSchema } from '@shared/protocol/accounts'

/** Opens a layout from the list of layouts. */
export async function openLayout(page: Page, name: string): Promise<void> {
  await page.goto('/')
  await page.getByRole('link', { name }).click()
  await page.getByRole('status').filter({ hasText: 'all edits saved' }).waitFor()
  await seatVerdict(page).waitFor()
}

/** "Fails: 2 of 3 seats hold" */
export function seatVerdict(page: Page): Locator {
  return page.getByRole('region', { name: 'Verdict' }).getByText(/seats? holds?/)
}

export async function chooseLoadCase(page: Page, name: string): Promise<void> {
  await page.getByRole('region', { name: 'Verdict' }).getByRole('combobox').selectOption({ label: name })
}

export function slipSafety(page: Page, hub: string): Locator {
  return page.getByRole('button', { name: `formula of combined slip safety of ${hub}` })
}

export function scheduleField(page: Page, what: string, hub: string): Locator {
  return page.getByRole('table', { name: 'Fit schedule' }).getByRole('textbox', { name: `${what} of ${hub}` })
}

/** A part in the outline; its accessible name says place, fit and result. */
export function outlineItem(page: Page, name: string): Locator {
  return page.getByRole('option', { name: new RegExp(`^${name},`) })
}

export interface ShaftPlace {
  stationMm: number
  heightMm: number
}

/** Where a place on the shaft is drawn, in pixels of the page. */
export async function pixelOf(page: Page, place: ShaftPlace): Promise<{ x: number; y: number }> {
  const canvas = page.getByTestId('layout-canvas')
  const box = await canvas.boundingBox()
  if (!box) throw new Error('The drawing is not on the page')
  const number = async (name: string) => Number(await canvas.getAttribute(name))
  const pxPerMm = await number('data-px-per-mm')
  return {
    x: box.x + (await number('data-origin-x-px')) + place.stationMm * pxPerMm,
    y: box.y + (await number('data-origin-y-px')) - place.heightMm * pxPerMm,
  }
}

/** Presses, moves in several steps as a hand does, and calls `before` while the button is still down. */
export async function dragOnDrawing(
  page: Page,
  from: ShaftPlace,
  to: ShaftPlace,
  whileDragging?: () => Promise<void>,
): Promise<void> {
  const start = await pixelOf(page, from)
  const end = await pixelOf(page, to)
  await page.mouse.move(start.x, start.y)
  await page.mouse.down()
  await page.mouse.move(end.x, end.y, { steps: 12 })
  await whileDragging?.()
  await page.mouse.up()
}

/** A layout of one's own in the first workspace, so that journeys do not meet in one document. */
export async function createLayout(page: Page, exampleId: string, name: string): Promise<LayoutSummary> {
  const headers = { origin: new URL(page.url()).origin }
  const me = meSchema.parse(await (await page.request.get('/api/me')).json())
  const workspaceId = me.workspaces[0]?.id ?? ''
  const response = await page.request.post(`/api/workspaces/${workspaceId}/layouts`, {
    headers,
    data: { name, from: { kind: 'example', exampleId } },
  })
  return layoutSummarySchema.parse(await response.json())
}
