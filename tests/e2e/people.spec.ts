import { expect } from '@playwright/test'
import { mailTo } from '../support/caught-mail'
import { test } from '../support/journey'

test('an invited person without an account joins, is given another role, and is removed', async ({
  openAs,
  openNew,
  problems,
  request,
}) => {
  const email = `iris-${Date.now()}@cedar-line.example`
  const password = 'a long walk to the lathe'
  const ada = await openAs('ada')
  await ada.goto('/')
  await ada.getByRole('link', { name: 'People' }).click()
  await ada.getByRole('button', { name: 'Invite someone' }).click()
  await ada.getByLabel('E-mail address').fill(email)
  await ada.getByLabel('Role', { exact: true }).selectOption('designer')
  await ada.getByRole('button', { name: 'Send invitation' }).click()
  await expect(ada.getByText(`Invitation sent to ${email}`)).toBeVisible()

  const iris = await openNew()
  const invitation = (await mailTo(request, email)).links.find((link) => link.includes('/invitation/'))
  await iris.goto(invitation ?? '')
  await iris.getByRole('link', { name: 'Create an account' }).click()
  await iris.getByLabel('Your name').fill('Iris Holm')
  await iris.getByLabel('E-mail address').fill(email)
  await iris.getByLabel('Password', { exact: true }).fill(password)
  await iris.getByRole('button', { name: 'Create account' }).click()
  await expect(iris.getByRole('heading', { name: 'Look in your mail' })).toBeVisible()

  // The page of caught mail has the link too; it leads back to the invitation through sign-in.
  await iris.getByRole('link', { name: 'open the caught mail' }).click()
  await iris
    .getByRole('link', { name: /confirm-email/ })
    .first()
    .click()
  await iris.getByRole('link', { name: 'Sign in' }).click()
  await iris.getByLabel('E-mail address').fill(email)
  await iris.getByLabel('Password', { exact: true }).fill(password)
  await iris.getByRole('button', { name: 'Sign in' }).click()
  await iris.getByRole('button', { name: 'Join the workspace' }).click()
  await expect(iris.getByRole('button', { name: 'New layout' })).toBeVisible()

  // Both browsers follow without a reload.
  await ada.getByLabel('Role of Iris Holm').selectOption('viewer')
  await expect(iris.getByRole('button', { name: 'New layout' })).toBeHidden()
  await ada.getByRole('button', { name: 'Remove Iris Holm' }).click()
  await ada.getByRole('dialog').getByRole('button', { name: 'Remove' }).click()
  await expect(ada.getByLabel('Role of Iris Holm')).toBeHidden()
  await expect(iris.getByRole('heading', { name: 'You have no access to this page' })).toBeVisible()
  expect(problems).toEqual([])
})
