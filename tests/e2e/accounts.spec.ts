import { expect } from '@playwright/test'
import { mailTo } from '../support/caught-mail'
import { signIn, test } from '../support/journey'
import { DEMO_PASSWORD, PEOPLE } from '../support/people'

test('a new person signs up, confirms by the mailed link, and signs in', async ({
  openNew,
  problems,
  request,
}) => {
  const email = `noor-${Date.now()}@cedar-line.example`
  const password = 'a long walk to the lathe'
  const page = await openNew()

  await page.goto('/sign-up')
  await page.getByLabel('Your name').fill('Noor Halim')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Create account' }).click()
  await expect(page.getByRole('heading', { name: 'Look in your mail' })).toBeVisible()

  // Not before the address is confirmed.
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByText('Confirm your e-mail address first')).toBeVisible()

  const mail = await mailTo(request, email)
  const link = mail.links.find((each) => each.includes('confirm-email'))
  expect(link).toBeDefined()
  await page.goto(link ?? '')
  await expect(page.getByRole('heading', { name: 'Your address is confirmed' })).toBeVisible()

  await page.context().clearCookies()
  await signIn(page, email, password)
  // In no workspace yet, so the page offers to make one.
  await expect(page.getByText(/workspace/i).first()).toBeVisible()
  expect(problems).toEqual([])
})

test('a wrong password is answered at the form and nothing typed is lost', async ({ openNew, problems }) => {
  const page = await openNew()
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(PEOPLE.sam.email)
  await page.getByLabel('Password', { exact: true }).fill('not the one')
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(
    page
      .getByText(/password/i)
      .filter({ hasText: /not|wrong|do not match/i })
      .first(),
  ).toBeVisible()
  await expect(page.getByLabel('E-mail address')).toHaveValue(PEOPLE.sam.email)
  await expect(page).toHaveURL(/sign-in/)
  expect(problems).toEqual([])
})

test('signing out ends the session on the server too', async ({ openNew, problems }) => {
  const page = await openNew()
  await signIn(page, PEOPLE.ada.email, DEMO_PASSWORD)
  expect((await page.request.get('/api/me')).status()).toBe(200)
  const cookies = await page.context().cookies()

  await page.getByRole('button', { name: 'Account' }).click()
  await page.getByRole('menuitem', { name: 'Sign out' }).click()
  await expect(page.getByRole('button', { name: 'Sign in' })).toBeVisible()

  // The old cookie put back opens nothing.
  await page.context().addCookies(cookies)
  expect((await page.request.get('/api/me')).status()).toBe(401)
  expect(problems).toEqual([])
})
