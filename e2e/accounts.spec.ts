import type { Page } from '@playwright/test'
import { expectSoundPage, narrow } from './support/page-checks'
import { goodPassword, newEmail, registerByHand } from './support/register'
import { signInByHand } from './support/sign-in'
import { expect, test } from './support/test'

test.beforeEach(({ page }) => narrow(page))

/** A refusal on purpose: the browser notes every answer from 400 upwards. */
const refusals = /Failed to load resource/

/** Adds an estimator and answers with the one-time link, as it is shown this once. */
async function addEstimator(page: Page, name: string, email: string): Promise<string> {
  await page.getByRole('link', { name: 'People' }).filter({ visible: true }).click()
  await page.getByRole('button', { name: 'Add a person' }).click()
  const sheet = page.getByRole('dialog', { name: 'Add a person' })
  await sheet.getByLabel('Name').fill(name)
  await sheet.getByLabel('E-mail address').fill(email)
  await sheet.getByRole('checkbox', { name: /^estimator/ }).check()
  await sheet.getByRole('button', { name: 'Add and make the link' }).click()
  const link = await sheet.getByLabel('One-time link').inputValue()
  await expectSoundPage(page)
  await page.keyboard.press('Escape')
  await expect(page.getByLabel('One-time link')).toHaveCount(0)
  return link
}

test('a company is registered, a person joins by a one-time link and is signed out when disabled', async ({
  page,
  browser,
}) => {
  await registerByHand(page, 'Castell Guards')
  await expect(page.getByText('No jobs yet')).toBeVisible()
  await expectSoundPage(page)
  const email = newEmail('estimator')
  const link = await addEstimator(page, 'Noor Lindqvist', email)
  const card = page.getByRole('main').getByRole('listitem').filter({ hasText: 'Noor Lindqvist' })
  await expect(card).toContainText('Invited')

  const other = await browser.newContext()
  const theirs = await other.newPage()
  await narrow(theirs)
  await test.step('the link says whom it is for and takes a password, once', async () => {
    await theirs.goto(link)
    await expect(theirs.getByRole('heading', { level: 1 })).toHaveText('Welcome, Noor Lindqvist')
    await expect(theirs.getByText(email)).toBeVisible()
    await expectSoundPage(theirs)
    const password = theirs.getByLabel('Password', { exact: true })
    await password.fill('too short')
    await theirs.getByRole('button', { name: 'Set password and sign in' }).click()
    await expect(password).toHaveAccessibleDescription(/Use at least 12 characters/)
    await expect(password).toBeFocused()
    await expect(password).toHaveValue('too short')
    await password.fill(goodPassword)
    await theirs.getByRole('button', { name: 'Set password and sign in' }).click()
    await expect(theirs.getByRole('heading', { level: 1, name: 'Jobs' })).toBeVisible()
    const again = await other.newPage()
    await again.goto(link)
    await expect(again.getByRole('alert')).toBeVisible()
    await expect(again.getByLabel('Password', { exact: true })).toHaveCount(0)
    await again.close()
  })

  await test.step('only an owner may manage people', async () => {
    await theirs.getByRole('link', { name: 'People' }).filter({ visible: true }).click()
    await expect(theirs.getByText('An owner of your company adds people')).toBeVisible()
    await expect(theirs.getByRole('button', { name: /Disable|Add a person|Roles of/ })).toHaveCount(0)
    await theirs.goto('/jobs')
    await expect(theirs.getByText('No jobs yet')).toBeVisible()
  })

  await test.step('disabled, they are signed out at the next thing they ask for', async () => {
    await page.reload()
    await expect(card).toContainText('Active')
    await page.getByRole('button', { name: 'Disable Noor Lindqvist' }).click()
    await expect(card).toContainText('Disabled')
    await theirs.getByLabel(/^Search/).fill('anything')
    await expect(theirs).toHaveURL(/\/sign-in\?next=/)
    await theirs.getByLabel('E-mail address').fill(email)
    await theirs.getByLabel('Password', { exact: true }).fill(goodPassword)
    await theirs.getByRole('button', { name: 'Sign in' }).click()
    await expect(theirs.getByRole('alert')).toContainText('not right')
    await expect(theirs.getByLabel('E-mail address')).toHaveValue(email)
  })

  await test.step('enabled again, they come back to where they were', async () => {
    await page.getByRole('button', { name: 'Enable Noor Lindqvist' }).click()
    await expect(card).toContainText('Active')
    await theirs.getByRole('button', { name: 'Sign in' }).click()
    await expect(theirs).toHaveURL(/\/jobs\?search=anything$/)
    await expect(theirs.getByText('No job fits')).toBeVisible()
  })
  await other.close()
})

test('a company that cannot be registered keeps what was typed and says why at the field', async ({
  page,
  watch,
}) => {
  watch.allowConsole(refusals)
  await page.goto('/register')
  await page.getByLabel('Company').fill('Castell Guards')
  await page.getByText('Millimetres, newtons').click()
  await page.getByLabel('Your name').fill('Runa Castell')
  await page.getByLabel('Your e-mail address').fill(newEmail('owner'))
  const password = page.getByLabel('Password', { exact: true })
  await expect(password).toHaveAccessibleDescription(/12 to 64 characters/)
  await password.fill('password1234')
  await page.getByRole('button', { name: 'Register' }).click()
  await expect(password).toHaveAttribute('aria-invalid', 'true')
  await expect(page.getByLabel('Company')).toHaveValue('Castell Guards')
  await expectSoundPage(page)
  await password.fill(goodPassword)
  await page.getByRole('button', { name: 'Register' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Jobs' })).toBeVisible()
  await page.goto('/company')
  await expect(page.getByRole('radio', { name: /Millimetres/ })).toBeChecked()
})

test('the own password is changed, and signing out ends the session', async ({ page, watch }) => {
  watch.allowConsole(refusals)
  const { email } = await registerByHand(page, 'Castell Guards')
  await page.goto('/account')
  await page.getByLabel('Present password').fill('not this one, surely')
  await page.getByLabel('New password').fill('another lantern, further out')
  await page.getByRole('button', { name: 'Change password' }).click()
  await expect(page.getByLabel('Present password')).toHaveAttribute('aria-invalid', 'true')
  await expect(page.getByLabel('New password')).toHaveValue('another lantern, further out')
  await page.getByLabel('Present password').fill(goodPassword)
  await page.getByRole('button', { name: 'Change password' }).click()
  await expect(page.getByText('Your password is changed')).toBeVisible()
  await page.getByRole('main').getByRole('button', { name: 'Sign out' }).click()
  await expect(page).toHaveURL(/\/sign-in$/)
  await page.goto('/account')
  await expect(page).toHaveURL(/\/sign-in\?next=%2Faccount$/)
  await signInByHand(page, { email, password: 'another lantern, further out' })
})

test('the company’s units and name are changed by its owner', async ({ page, watch }) => {
  watch.allowConsole(refusals)
  await registerByHand(page, 'Castell Guards')
  await page.goto('/company')
  await page.getByLabel('Name', { exact: true }).fill('Castell & Daughter')
  await page.getByText('1/32 in', { exact: true }).click()
  await page.getByRole('button', { name: 'Save' }).click()
  await expect(page.getByText('Saved.')).toBeVisible()
  await page.reload()
  await expect(page.getByLabel('Name', { exact: true })).toHaveValue('Castell & Daughter')
  await expect(page.getByRole('radio', { name: '1/32 in' })).toBeChecked()
})
