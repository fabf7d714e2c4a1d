import type { Page } from '@playwright/test'
import { expectSoundPage, narrow } from './support/page-checks'
import { demoSignIn, signInByHand } from './support/sign-in'
import { expect, test } from './support/test'

/** The demo's finished survey, by its job's title. */
async function openDemoSurvey(page: Page): Promise<string> {
  await page.goto('/jobs?search=harbour+deck')
  await page
    .getByRole('link', { name: /harbour deck/i })
    .filter({ visible: true })
    .first()
    .click()
  await page
    .getByRole('link', { name: /^Open survey/ })
    .first()
    .click()
  await expect(page.getByRole('application')).toBeVisible()
  return new URL(page.url()).pathname
}

// axe reads every page twice, and a busy machine takes its time.
test.describe.configure({ timeout: 240_000 })

test('pages before sign-in are sound, light and dark', async ({ page }) => {
  await narrow(page)
  for (const path of ['/sign-in', '/register', '/nothing-here']) {
    await page.goto(path)
    await expect(page.getByRole('main')).toBeVisible()
    await expectSoundPage(page)
  }
})

test('pages of the company are sound, light and dark', async ({ page }) => {
  await narrow(page)
  await signInByHand(page, demoSignIn('owner'))
  const pages: [path: string, heading: string | RegExp][] = [
    ['/jobs', 'Jobs'],
    ['/jobs/new', 'New job'],
    ['/hardware', 'Hardware'],
    ['/hardware/fittings/new', 'New fitting'],
    ['/hardware/cables/new', 'New cable'],
    ['/house-rules', 'House rules'],
    ['/people', 'People'],
    ['/company', 'Company'],
    ['/account', 'Account'],
  ]
  for (const [path, heading] of pages) {
    await page.goto(path)
    await expect(page.getByRole('heading', { level: 1, name: heading })).toBeVisible()
    await expectSoundPage(page)
  }
})

test('pages of a survey are sound, light and dark', async ({ page }) => {
  await narrow(page)
  await signInByHand(page, demoSignIn('owner'))
  const survey = await openDemoSurvey(page)
  await expectSoundPage(page)
  for (const [query, heading] of [
    ['?bay=B4', /^Bay B4/],
    ['?post=P4', 'Post P4'],
    ['?run=R1', /^Run R1/],
  ] as const) {
    await page.goto(survey + query)
    await expect(page.getByRole('heading', { name: heading })).toBeVisible()
    await expectSoundPage(page)
  }
  for (const [path, heading] of [
    ['/table', 'Harbour deck'],
    ['/history', 'History'],
    ['/cut-list', /^Cut list/],
    ['/cut-list/R1/3', 'Cable R1-3'],
  ] as const) {
    await page.goto(survey + path)
    await expect(page.getByRole('heading', { level: 1, name: heading })).toBeVisible()
    await expectSoundPage(page)
  }
})
