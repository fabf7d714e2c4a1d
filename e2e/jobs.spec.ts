import { readFileSync } from 'node:fs'
import { expectSoundPage, narrow } from './support/page-checks'
import { jobsShown, openJob, registerByHand } from './support/register'
import { expect, test } from './support/test'

test.beforeEach(({ page }) => narrow(page))

const titles = ['Ridge deck', 'Harbour stair', 'Mill balcony']

test('jobs are searched, filtered and sorted, and the address keeps what is shown', async ({ page }) => {
  await registerByHand(page, 'Castell Guards')
  await openJob(page, { title: 'Ridge deck', customer: 'Oda Fenwick', due: '2020-01-02' })
  const { id } = await openJob(page, { title: 'Harbour stair', customer: 'Lev Marchetti', due: '2019-05-01' })
  await openJob(page, { title: 'Mill balcony', customer: 'Oda Fenwick' })

  await page.goto(`/jobs/${id}`)
  await page.getByRole('button', { name: 'Move on to check' }).click()
  await expect(page.getByRole('heading', { name: /Check the cut list/ })).toBeVisible()

  await page.goto('/jobs')
  await expect(page.getByText('3 jobs.')).toBeVisible()
  await expect(page.getByText(/days late/).filter({ visible: true })).toHaveCount(2)
  await expectSoundPage(page)

  await page.getByLabel(/^Search/).fill('fenwick')
  await expect(page.getByText('2 jobs.')).toBeVisible()
  expect((await jobsShown(page, titles)).sort()).toEqual(['Mill balcony', 'Ridge deck'])
  await expect(page).toHaveURL(/\/jobs\?search=fenwick$/)
  await page.reload()
  await expect(page.getByText('2 jobs.')).toBeVisible()
  await expect(page.getByLabel(/^Search/)).toHaveValue('fenwick')

  await page.getByLabel('Stage').selectOption('check')
  await expect(page.getByText('No job fits')).toBeVisible()
  await page.getByLabel(/^Search/).fill('')
  await expect(page.getByText('1 job.')).toBeVisible()
  expect(await jobsShown(page, titles)).toEqual(['Harbour stair'])

  await page.getByLabel('Stage').selectOption('all')
  await page.getByLabel('Sort by').selectOption('due date')
  await expect(page).toHaveURL(/\/jobs\?sort=due$/)
  await expect.poll(() => jobsShown(page, titles)).toEqual(['Harbour stair', 'Ridge deck', 'Mill balcony'])
})

test('the list goes on after the first fifty jobs', async ({ page }) => {
  await registerByHand(page, 'Castell Guards')
  for (let number = 1; number <= 52; number += 1) await openJob(page, { title: `Deck ${number}` })
  await page.goto('/jobs?sort=number')
  await expect(page.getByText('The first 50 jobs.')).toBeVisible()
  await page.getByRole('button', { name: 'Show more' }).click()
  await expect(page.getByText('52 jobs.', { exact: true })).toBeVisible()
  await expect(page.getByRole('button', { name: 'Show more' })).toHaveCount(0)
})

test('a job is opened, edited without losing what was typed, and moved on and back', async ({
  page,
  watch,
}) => {
  watch.allowConsole(/ERR_FAILED/)
  await registerByHand(page, 'Castell Guards')
  await page.getByRole('link', { name: 'New job' }).first().click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('New job')
  await page.getByLabel('Title').fill('Fenwick, ridge deck')
  await page.getByLabel('With').selectOption('Runa Castell')
  await page.getByRole('button', { name: 'Open the job' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Fenwick, ridge deck')
  await expectSoundPage(page)

  await page.getByRole('button', { name: 'Edit' }).click()
  const sheet = page.getByRole('dialog', { name: 'Edit the job' })
  await expect(sheet.getByLabel('With')).toHaveValue(/.+/)
  await sheet.getByLabel('Site').fill('3 Ridge Road')
  await page.route('**/api/jobs/*', (route) =>
    route.request().method() === 'PATCH' ? route.abort() : route.continue(),
  )
  await sheet.getByRole('button', { name: 'Save' }).click()
  await expect(sheet.getByRole('alert')).toContainText('no connection')
  await expect(sheet.getByLabel('Site')).toHaveValue('3 Ridge Road')
  await expectSoundPage(page)
  await page.unroute('**/api/jobs/*')
  await sheet.getByRole('button', { name: 'Save' }).click()
  await expect(page.getByText('3 Ridge Road')).toBeVisible()
  await expect(page.getByRole('definition').filter({ hasText: 'Runa Castell' })).toBeVisible()

  await page.getByRole('button', { name: 'Move on to check' }).click()
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect(page.getByRole('button', { name: 'Move on to check' })).toBeVisible()
  await page.getByRole('button', { name: 'Other stage' }).click()
  await page.getByRole('menuitem', { name: 'lost' }).click()
  await expect(page.getByText('This job is lost.')).toBeVisible()
})

test('a survey file is refused with every fault, brought in once mended, and put away', async ({
  page,
  watch,
}) => {
  watch.allowConsole(/Failed to load resource/)
  await registerByHand(page, 'Castell Guards')
  const { id } = await openJob(page, { title: 'Ridge deck' })
  const good = readFileSync('tests/worked-examples/in/two-bays.json', 'utf8')
  const file = (text: string) => ({
    name: 'two-bays.json',
    mimeType: 'application/json',
    buffer: Buffer.from(text),
  })
  await page.goto(`/jobs/${id}`)
  await page.getByRole('button', { name: 'New survey' }).click()
  const choose = page.getByLabel('Or from a survey file')
  await choose.setInputFiles(file('posts, bays and readings'))
  await expect(page.getByRole('alert')).toContainText('cannot be read as JSON')
  await choose.setInputFiles(
    file(good.replace('"material": "hardwood"', '"material": "bamboo"').replace('"to": "P3"', '"to": 3')),
  )
  await expect(
    page.getByRole('list', { name: 'What is wrong in the file' }).getByRole('listitem'),
  ).toHaveText([/material/, /to/])
  await expectSoundPage(page)
  await choose.setInputFiles(file(good))
  await expect(page.getByText('Imported as Two bays.')).toBeVisible()
  await page.getByRole('button', { name: 'Open it' }).click()
  await expect(page).toHaveURL(/\/surveys\//)

  await page.goto(`/jobs/${id}`)
  await expect(page.getByText('3 posts, 2 bays')).toBeVisible()
  await page.getByRole('button', { name: 'Put away survey Two bays' }).click()
  await expectSoundPage(page)
  await page.getByRole('button', { name: 'Put it away' }).click()
  await expect(page.getByText('Nothing measured yet')).toBeVisible()
})
