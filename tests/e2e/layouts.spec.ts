import { readFileSync } from 'node:fs'
import { expect } from '@playwright/test'
import { test } from '../support/journey'

test('a layout is started, exported, imported, put away, and a colleague’s list follows', async ({
  openAs,
  problems,
}) => {
  const name = `Countershaft ${Date.now()}`
  const dina = await openAs('dina')
  const vera = await openAs('vera')
  await dina.goto('/')
  await vera.goto('/')

  await dina.getByRole('button', { name: 'New layout' }).click()
  await dina.getByRole('button', { name: 'Create layout' }).click()
  await expect(dina.getByText('Give the layout a name')).toBeVisible()
  await expect(dina.getByLabel('Name', { exact: true })).toBeFocused()
  await dina.getByText('From an example').click()
  await dina.getByRole('radio', { name: /Gear and pulley/ }).check()
  await dina.getByLabel('Name', { exact: true }).fill(name)
  await dina.getByRole('button', { name: 'Create layout' }).click()
  await expect(dina.getByRole('heading', { level: 1, name })).toBeVisible()
  await expect(vera.getByRole('article', { name })).toBeVisible()

  await dina.getByRole('link', { name: 'Hubstead, layouts' }).click()
  const menu = dina.getByRole('button', { name: `Actions for ${name}`, exact: true })
  await menu.focus()
  await dina.keyboard.press('ArrowDown')
  await dina.keyboard.press('e')
  const download = dina.waitForEvent('download')
  await dina.keyboard.press('Enter')
  const path = await (await download).path()
  const file = JSON.parse(readFileSync(path, 'utf8')) as {
    name: string
    shaft: { sections: { lengthMm: number }[] }
  }
  expect(file.name).toBe(name)

  await dina.getByRole('button', { name: 'Import' }).click()
  const chooser = dina.getByLabel('Layout file')
  const broken = structuredClone(file)
  if (broken.shaft.sections[0]) broken.shaft.sections[0].lengthMm = -4
  const asFile = (content: unknown) => ({
    name: 'countershaft.layout.json',
    mimeType: 'application/json',
    buffer: Buffer.from(JSON.stringify(content)),
  })
  await chooser.setInputFiles(asFile(broken))
  await expect(dina.getByText('shaft.sections[0].lengthMm')).toBeVisible()
  await chooser.setInputFiles(asFile({ ...file, name: `${name} again` }))
  await expect(dina.getByText('can be imported')).toBeVisible()
  await dina.getByRole('button', { name: 'Import layout' }).click()
  await expect(dina.getByRole('heading', { level: 1, name: `${name} again` })).toBeVisible()

  await dina.getByRole('link', { name: 'Hubstead, layouts' }).click()
  await menu.click()
  await dina.getByRole('menuitem', { name: 'Archive' }).click()
  await expect(vera.getByRole('article', { name, exact: true })).toBeHidden()
  await expect(vera.getByRole('article', { name: `${name} again` })).toBeVisible()
  await expect(vera.getByRole('button', { name: /^Actions for/ })).toHaveCount(0)
  expect(problems).toEqual([])
})
