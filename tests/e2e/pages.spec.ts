import { expect, type Page } from '@playwright/test'
import { meSchema } from '@shared/protocol/accounts'
import { layoutListSchema } from '@shared/protocol/layouts'
import { openLayout, seatVerdict } from '../support/bench-page'
import { test } from '../support/journey'

/** The parts of the visible page wider than the window: what one would have to scroll sideways for. */
const sidewaysOverflow = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)

const backgroundLightness = (page: Page) =>
  page.evaluate(() => {
    const [red = 0, green = 0, blue = 0] = (
      getComputedStyle(document.body).backgroundColor.match(/[\d.]+/g) ?? []
    ).map(Number)
    return (red + green + blue) / (3 * 255)
  })

async function mainPages(page: Page): Promise<{ address: string; heading: RegExp }[]> {
  const me = meSchema.parse(await (await page.request.get('/api/me')).json())
  const workspace = me.workspaces[0]?.id ?? ''
  const answer = await page.request.get(`/api/workspaces/${workspace}/layouts`)
  const { layouts } = layoutListSchema.parse(await answer.json())
  const shaft = layouts.find(({ name }) => name.includes('camshaft')) ?? layouts[0]
  return [
    { address: `/w/${workspace}/layouts`, heading: /Layouts/ },
    { address: `/w/${workspace}/layouts/${shaft?.id}`, heading: new RegExp(shaft?.name ?? '-') },
    { address: `/w/${workspace}/releases`, heading: /Release desk/ },
    { address: `/w/${workspace}/people`, heading: /People/ },
    { address: '/account', heading: /account/i },
    { address: '/caught-mail', heading: /mail/i },
  ]
}

test('every main page opens in both themes within the content security policy', async ({
  openAs,
  problems,
}) => {
  const ada = await openAs('ada')
  await ada.goto('/account')
  for (const theme of ['dark', 'light'] as const) {
    await ada.emulateMedia({ colorScheme: theme })
    for (const { address, heading } of await mainPages(ada)) {
      await ada.goto(address)
      await expect(ada.getByRole('heading', { level: 1, name: heading })).toBeVisible()
      await expect
        .poll(() => backgroundLightness(ada))
        [theme === 'dark' ? 'toBeLessThan' : 'toBeGreaterThan'](0.5)
    }
  }
  expect(problems).toEqual([])
})

test('the theme chosen in the menu wins over the system and is kept', async ({ openAs, problems }) => {
  const ada = await openAs('ada', { colorScheme: 'light' })
  await ada.goto('/')
  await expect.poll(() => backgroundLightness(ada)).toBeGreaterThan(0.5)
  await ada.getByRole('button', { name: 'Account' }).click()
  await ada.getByRole('menuitemradio', { name: 'Dark' }).click()
  await expect.poll(() => backgroundLightness(ada)).toBeLessThan(0.5)
  await ada.reload()
  await expect.poll(() => backgroundLightness(ada)).toBeLessThan(0.5)
  expect(problems).toEqual([])
})

test('on a phone the findings of a layout can be read', async ({ openAs, problems }) => {
  const vera = await openAs('vera', { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true })
  await openLayout(vera, 'Assembled inlet camshaft, four cylinders')
  await expect(seatVerdict(vera)).toBeVisible()
  await vera.getByRole('tab', { name: /Findings/ }).click()
  await expect(vera.getByText(/195|165/).first()).toBeVisible()
  expect(await sidewaysOverflow(vera)).toBeLessThanOrEqual(0)
  expect(problems).toEqual([])
})

test('the bench fits a screen of 1024 by 768 without scrolling sideways', async ({ openAs, problems }) => {
  const dina = await openAs('dina', { viewport: { width: 1024, height: 768 } })
  await openLayout(dina, 'Cartoning machine, line shaft')
  await expect(dina.getByTestId('layout-canvas')).toBeVisible()
  expect(await sidewaysOverflow(dina)).toBeLessThanOrEqual(0)
  expect(problems).toEqual([])
})
