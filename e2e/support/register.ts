import { randomUUID } from 'node:crypto'
import type { Page } from '@playwright/test'
import { expect } from './test'

export const goodPassword = 'a lantern on the quay'

/** An address that nobody in the database has, however often and at whatever size a test runs. */
export const newEmail = (name: string): string => `${name}-${randomUUID().slice(0, 8)}@example.com`

/** Registers a company as a hand would: a place of its own for a test that counts what it sees. */
export async function registerByHand(page: Page, company: string): Promise<{ email: string }> {
  const email = newEmail('owner')
  await page.goto('/register')
  await page.getByLabel('Company').fill(company)
  await page.getByLabel('Your name').fill('Runa Castell')
  await page.getByLabel('Your e-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(goodPassword)
  await page.getByRole('button', { name: 'Register' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Jobs' })).toBeVisible()
  return { email }
}

interface NewJob {
  title: string
  customer?: string
  due?: string
}

/** Opens a job for whoever is signed in, without the form. */
export async function openJob(page: Page, job: NewJob): Promise<{ id: string }> {
  const session = (await (await page.request.get('/api/session')).json()) as { csrfToken: string }
  const answer = await page.request.post('/api/jobs', {
    data: job,
    headers: { 'x-csrf-token': session.csrfToken },
  })
  expect(answer.status()).toBe(201)
  return (await answer.json()) as { id: string }
}

/** Brings a survey file into a new job, without the form. @returns the survey's address */
export async function importSurvey(page: Page, file: object): Promise<string> {
  const job = await openJob(page, { title: 'Imported' })
  const session = (await (await page.request.get('/api/session')).json()) as { csrfToken: string }
  const answer = await page.request.post(`/api/jobs/${job.id}/surveys/import`, {
    data: file,
    headers: { 'x-csrf-token': session.csrfToken },
  })
  expect(answer.status()).toBe(201)
  const { survey } = (await answer.json()) as { survey: { id: string } }
  return `/surveys/${survey.id}`
}

/** The title of every job that the list shows, from the top. */
export const jobsShown = (page: Page, titles: readonly string[]) =>
  page
    .getByRole('link', { name: new RegExp(titles.join('|')) })
    .filter({ visible: true })
    .evaluateAll(
      (links, known) => links.map((link) => known.find((title) => link.textContent.includes(title)) ?? ''),
      titles,
    )
