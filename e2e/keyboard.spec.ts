import type { Page } from '@playwright/test'
import { demoSignIn, signInByHand } from './support/sign-in'
import { expect, test } from './support/test'

const presses = async (page: Page, key: string, times: number): Promise<void> => {
  for (let i = 0; i < times; i += 1) await page.keyboard.press(key)
}

test('@desk traces a deck with the keyboard alone, and takes it back', async ({ page }) => {
  await signInByHand(page, demoSignIn('surveyor'))
  await page.goto('/jobs/new')
  await page.getByLabel('Title', { exact: true }).fill('Keys only')
  await page.getByRole('button', { name: 'Open the job' }).press('Enter')
  await page.getByRole('button', { name: 'New survey' }).press('Enter')
  await page.getByLabel('Title', { exact: true }).fill('By keys')
  await page.keyboard.press('Enter')
  await page.getByLabel('Choose file').setInputFiles('demo/photos/harbour-deck.jpg')
  await expect(page.getByRole('application')).toBeVisible()
  await expect(page.getByRole('button', { name: 'Post', pressed: true })).toBeVisible()

  await page.getByRole('application').focus()
  // The first Enter calls the cursor to the middle, the next ones tap there.
  await presses(page, 'Enter', 2)
  await expect(page.getByRole('heading', { name: 'Post P1' })).toBeVisible()
  await presses(page, 'Shift+ArrowRight', 30)
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { name: 'Post P2' })).toBeVisible()

  await page.keyboard.press('b')
  await page.keyboard.press('Enter')
  await presses(page, 'Shift+ArrowLeft', 30)
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { name: 'Bay B1, P2 to P1' })).toBeVisible()
  await expect(page.getByRole('button', { name: 'Run R1' })).toBeVisible()

  await page.keyboard.press('Control+z')
  await expect(page.getByRole('heading', { name: /^Bay/ })).toHaveCount(0)
  await page.keyboard.press('Control+Shift+z')
  await page.keyboard.press('?')
  await expect(page.getByRole('dialog', { name: 'Keys' })).toBeVisible()
  await page.keyboard.press('Escape')
  await expect(page.getByText('Saved')).toBeVisible()
  await page.getByRole('button', { name: 'More of this survey' }).press('Enter')
  await page.getByRole('menuitem', { name: 'History' }).press('Enter')
  await expect(page.getByText('joined P2 and P1 by bay B1').first()).toBeVisible()
})

test('@desk types a survey into the tables, pastes a column and reads its cut list', async ({ page }) => {
  await signInByHand(page, demoSignIn('surveyor'))
  await page.goto('/jobs/new')
  await page.getByLabel('Title', { exact: true }).fill('Typed')
  await page.getByRole('button', { name: 'Open the job' }).click()
  await page.getByRole('button', { name: 'New survey' }).click()
  await page.getByLabel('Title', { exact: true }).fill('By table')
  await page.keyboard.press('Enter')
  await page.getByRole('link', { name: 'Or type the survey as a table' }).click()

  await page.getByRole('button', { name: 'Add post' }).click()
  for (const post of [2, 3]) {
    await page.getByRole('button', { name: 'Add post' }).click()
    await page.getByRole('button', { name: 'Add bay' }).click()
    await expect(page.getByRole('rowheader', { name: `P${post}` })).toBeVisible()
  }
  for (const post of ['P1', 'P2', 'P3']) await page.getByLabel(`Material of ${post}`).selectOption('softwood')
  await page.getByLabel('Size along of P1').fill('three')
  await page.getByLabel('Size along of P1').press('Enter')
  await expect(page.getByRole('alert')).toContainText('three')
  await page.getByLabel('Size along of P1').fill('3 1/2')
  await page.getByLabel('Size along of P1').press('Enter')
  await expect(page.getByLabel('Size along of P2')).toBeFocused()
  for (const post of ['P2', 'P3']) {
    await page.getByLabel(`Size along of ${post}`).fill('3.5')
    await page.getByLabel(`Size along of ${post}`).press('Enter')
  }

  await page.getByLabel('Add a top reading to B1').focus()
  await page.evaluate(() => {
    const clipboardData = new DataTransfer()
    clipboardData.setData('text', '46 1/2\n44 1/8\n')
    document.activeElement?.dispatchEvent(
      new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }),
    )
  })
  await page.getByRole('button', { name: 'Take over 2 of 2' }).click()
  await page.getByLabel('Add a bottom reading to B1').fill('46 1/4')
  await page.getByLabel('Add a bottom reading to B1').press('Enter')
  // One reading, not two: Enter keeps it and leaving the cell keeps nothing more.
  await page.getByRole('button', { name: 'Readings of B1' }).click()
  await expect(page.getByRole('list', { name: 'Readings' }).getByRole('listitem')).toHaveCount(2)
  await page.keyboard.press('Escape')
  await expect(page.getByText('Saved')).toBeVisible()

  await page.getByRole('button', { name: 'Cut list' }).click()
  await expect(page.getByRole('table', { name: /Cables of run R1/ }).locator('tbody tr')).toHaveCount(11)
})
