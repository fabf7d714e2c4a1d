import type { Page } from '@playwright/test'
import { starterHardware } from '../shared/calculation/starter-hardware'
import { expectSoundPage, narrow } from './support/page-checks'
import { registerByHand } from './support/register'
import { demoSignIn, signInByHand } from './support/sign-in'
import { expect, test } from './support/test'

const [cable] = starterHardware.cables
const [fitting] = starterHardware.fittings
if (!cable || !fitting) throw new Error('The starter hardware is empty.')

/** Opens a fitting or cable from the list, as it is shown at this size. */
async function openEntry(page: Page, name: string): Promise<void> {
  await page.goto('/hardware')
  await page.getByRole('link', { name, exact: true }).filter({ visible: true }).click()
  await expect(page.getByRole('heading', { level: 1, name })).toBeVisible()
}

test('an owner changes a fitting, and the drawing follows', async ({ page }) => {
  await narrow(page)
  await registerByHand(page, 'Tarn Rail')
  await openEntry(page, fitting.name)
  await expect(page.getByLabel('Id', { exact: true })).toHaveAttribute('readonly')
  await expect(page.getByRole('img', { name: /3\/4" past the post’s face/ })).toBeVisible()

  await page.getByLabel('Cut past face').fill('1 1/2')
  await page.getByLabel('Cut past face').blur()
  await expect(page.getByRole('img', { name: /1 1\/4" past the post’s face/ })).toBeVisible()
  await expectSoundPage(page)

  await page.getByRole('button', { name: 'Save the fitting' }).click()
  await expect(page.getByText('The fitting is saved.')).toBeVisible()
  await openEntry(page, fitting.name)
  await expect(page.getByLabel('Cut past face')).toHaveValue('1 1/2"')
})

test('what cannot be read or kept is said at its field, and nothing typed is lost', async ({
  page,
  watch,
}) => {
  watch.allowConsole(/status of 4(00|09)/)
  await registerByHand(page, 'Sorrel Guards')
  await page.goto('/hardware/fittings/new')
  await page.getByLabel('Id', { exact: true }).fill(fitting.id)
  await page.getByLabel('Name', { exact: true }).fill('Our own sleeve')
  await page.getByLabel('Take-up').fill('a bit')
  await page.getByRole('button', { name: 'Add the fitting' }).click()
  await expect(page.getByLabel('Take-up')).toBeFocused()
  await expect(page.getByLabel('Take-up')).toHaveValue('a bit')

  await page.getByLabel('Take-up').fill('0')
  await page.getByRole('button', { name: 'Add the fitting' }).click()
  await expect(page.getByText('Write a length above zero.')).toBeVisible()
  await expect(page.getByLabel('Take-up')).toBeFocused()

  await page.getByLabel('Take-up').fill('7/8')
  await page.getByRole('button', { name: 'Add the fitting' }).click()
  await expect(page.getByText(/Choose another id/)).toBeVisible()
  await expect(page.getByLabel('Name', { exact: true })).toHaveValue('Our own sleeve')
  await page.getByLabel('Id', { exact: true }).fill('own-sleeve')
  await page.getByRole('button', { name: 'Add the fitting' }).click()
  await expect(page.getByRole('link', { name: 'Our own sleeve' }).filter({ visible: true })).toBeVisible()
})

test('a cable takes over the stiffness that its wires say', async ({ page }) => {
  await narrow(page)
  await registerByHand(page, 'Lathe & Line')
  await page.goto('/hardware/cables/new')
  await page.getByLabel('Id', { exact: true }).fill('c4-1x19')
  await page.getByLabel('Name', { exact: true }).fill('4 mm 1x19 stainless')
  await page.getByText('1x19', { exact: true }).click()
  await page.getByLabel('Diameter').fill('4 mm')
  await page.getByLabel('Diameter').blur()
  // 19 · π/4 · (4/5 mm)² · 130 kN/mm² is 1241.6 kN, 279 kip.
  await page.getByRole('button', { name: /^Use 279.000 lbf$/ }).click()
  await expect(page.getByLabel('Axial stiffness, lbf')).toHaveValue('279000')
  await expectSoundPage(page)
  await page.getByRole('button', { name: 'Add the cable' }).click()
  await openEntry(page, '4 mm 1x19 stainless')
  await expect(page.getByLabel('Axial stiffness, lbf')).toHaveValue('279000')
})

test('hardware is found, retired and brought back', async ({ page }) => {
  await narrow(page)
  await registerByHand(page, 'Beck & Bay')
  await page.goto('/hardware')
  const shown = (name: string) => page.getByRole('link', { name, exact: true }).filter({ visible: true })
  await expectSoundPage(page)
  await page.getByLabel('Search').fill(fitting.id)
  await expect(shown(fitting.name)).toBeVisible()
  await expect(shown(cable.name)).toHaveCount(0)

  await page
    .getByRole('button', { name: `Retire: ${fitting.name}` })
    .filter({ visible: true })
    .click()
  await expect(shown(fitting.name)).toHaveCount(0)
  await expect(page.getByText('Retired (1)')).toBeVisible()
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect(shown(fitting.name)).toBeVisible()
  await expect(page.getByText('Retired (1)')).toHaveCount(0)
})

test('an owner changes a rule, and brings it back to where it began', async ({ page }) => {
  await narrow(page)
  await registerByHand(page, 'Quarry Step')
  await page.goto('/house-rules')
  const trim = page.getByLabel('Trim', { exact: true })
  const save = page.getByRole('button', { name: 'Save the house rules' })
  await expect(trim).toHaveValue('4"')
  await trim.fill('6')
  await save.click()
  await expect(page.getByText('The house rules are saved.')).toBeVisible()
  await page.reload()
  await expect(trim).toHaveValue('6"')
  await expectSoundPage(page)

  await page.getByRole('button', { name: 'Trim: back to 4"' }).click()
  await expect(trim).toHaveValue('4"')
  await save.click()
  await expect(page.getByText('The house rules are saved.')).toBeVisible()
  await page.reload()
  await expect(trim).toHaveValue('4"')
})

test('a surveyor reads hardware and house rules, and is offered no change', async ({ page }) => {
  await narrow(page)
  await signInByHand(page, demoSignIn('surveyor'))
  await page.goto('/hardware')
  await expect(page.getByRole('heading', { level: 2, name: 'Fittings' })).toBeVisible()
  await expect(page.getByRole('button', { name: /^Retire/ })).toHaveCount(0)
  await expect(page.getByRole('link', { name: /^Add a/ })).toHaveCount(0)
  for (const { name } of [fitting, cable]) {
    await openEntry(page, name)
    await expect(page.getByText('An owner of your company changes it.')).toBeVisible()
    await expect(page.getByRole('main').getByRole('textbox')).toHaveCount(0)
    await expectSoundPage(page)
  }
  await page.goto('/house-rules')
  await expect(page.getByText('150 lbf')).toBeVisible()
  await expect(page.getByRole('main').getByRole('textbox')).toHaveCount(0)
  await expect(page.getByRole('main').getByRole('button')).toHaveCount(0)
  await expectSoundPage(page)
})
