import type { Page } from '@playwright/test'
import { paths } from '../src/app/paths'
import { expectSoundPage, narrow } from './support/page-checks'
import { demoSignIn, signInByHand } from './support/sign-in'
import { expect, test } from './support/test'

/** Things of the demo company that a page is about. */
interface Shown {
  job: string
  survey: string
  fitting: string
  cable: string
}

interface Visit {
  path: (shown: Shown) => string
  /** The heading that says the page is there. */
  heading: string | RegExp
}

type Name = keyof typeof paths

/** Before sign-in. An invitation that nobody made leads to a page of its own as well. */
const outside = {
  signIn: { path: () => paths.signIn, heading: /Sign in/ },
  register: { path: () => paths.register, heading: /Register/ },
  invite: { path: () => paths.invite('nobody-was-invited'), heading: /./ },
} satisfies Partial<Record<Name, Visit>>

const ofCompany = {
  jobs: { path: () => paths.jobs, heading: 'Jobs' },
  newJob: { path: () => paths.newJob, heading: 'New job' },
  job: { path: ({ job }) => paths.job(job), heading: /harbour deck/i },
  hardware: { path: () => paths.hardware, heading: 'Hardware' },
  newFitting: { path: () => paths.newFitting, heading: 'New fitting' },
  fitting: { path: ({ fitting }) => paths.fitting(fitting), heading: /./ },
  newCable: { path: () => paths.newCable, heading: 'New cable' },
  cable: { path: ({ cable }) => paths.cable(cable), heading: /./ },
  houseRules: { path: () => paths.houseRules, heading: 'House rules' },
  people: { path: () => paths.people, heading: 'People' },
  company: { path: () => paths.company, heading: 'Company' },
  account: { path: () => paths.account, heading: 'Account' },
} satisfies Partial<Record<Name, Visit>>

const ofSurvey = {
  survey: { path: ({ survey }) => paths.survey(survey), heading: 'Harbour deck' },
  surveyTable: { path: ({ survey }) => paths.surveyTable(survey), heading: 'Harbour deck' },
  surveyHistory: { path: ({ survey }) => paths.surveyHistory(survey), heading: 'History' },
  findings: { path: ({ survey }) => paths.findings(survey), heading: /^Findings/ },
  checks: { path: ({ survey }) => paths.checks(survey), heading: /^Checks/ },
  cutList: { path: ({ survey }) => paths.cutList(survey), heading: /^Cut list/ },
  working: { path: ({ survey }) => paths.working(survey, 'R1', 3), heading: 'Cable R1-3' },
} satisfies Partial<Record<Name, Visit>>

/** Looked at, light and dark and at its narrowest, by a test of its own file. */
const elsewhere = {
  guardRules: 'guard-rules.spec.ts',
  newGuardRules: 'guard-rules.spec.ts',
  guardRulesOf: 'guard-rules.spec.ts',
} satisfies Partial<Record<Name, string>>

// axe reads every page twice, and a busy machine takes its time.
test.describe.configure({ timeout: 240_000 })

async function look(page: Page, visits: Record<string, Visit>, shown: Shown): Promise<void> {
  for (const { path, heading } of Object.values(visits)) {
    await page.goto(path(shown))
    await expect(page.getByRole('heading', { level: 1, name: heading })).toBeVisible()
    await expectSoundPage(page)
  }
}

/** Finds the demo's finished survey and a piece of each kind of hardware. */
async function findShown(page: Page): Promise<Shown> {
  const get = async <Answer>(path: string) => (await (await page.request.get(path)).json()) as Answer
  const { jobs } = await get<{ jobs: { id: string }[] }>('/api/jobs?search=harbour+deck')
  const job = jobs[0]!.id
  const { surveys } = await get<{ surveys: { id: string }[] }>(`/api/jobs/${job}`)
  const { fittings, cables } = await get<Record<'fittings' | 'cables', { key: string }[]>>('/api/hardware')
  return { job, survey: surveys[0]!.id, fitting: fittings[0]!.key, cable: cables[0]!.key }
}

test('@desk every address has its page looked at', () => {
  const visited = [outside, ofCompany, ofSurvey, elsewhere].flatMap((visits) => Object.keys(visits))
  expect(visited.sort()).toEqual(Object.keys(paths).sort())
})

test('pages before sign-in are sound, light and dark', async ({ page, watch }) => {
  watch.allowConsole(/Failed to load resource/)
  await narrow(page)
  await look(page, outside, { job: '', survey: '', fitting: '', cable: '' })
  await page.goto('/nothing-here')
  await expect(page.getByRole('main')).toBeVisible()
  await expectSoundPage(page)
})

test('pages of the company are sound, light and dark', async ({ page }) => {
  await narrow(page)
  await signInByHand(page, demoSignIn('owner'))
  await look(page, ofCompany, await findShown(page))
})

test('pages of a survey are sound, light and dark', async ({ page }) => {
  await narrow(page)
  await signInByHand(page, demoSignIn('owner'))
  await look(page, ofSurvey, await findShown(page))
})

test('the panels, sheets and menus of a survey are sound, light and dark', async ({ page }) => {
  await narrow(page)
  await signInByHand(page, demoSignIn('owner'))
  const { survey } = await findShown(page)
  for (const [query, heading] of [
    ['?bay=B4', /^Bay B4/],
    ['?post=P4', 'Post P4'],
    ['?run=R1', /^Run R1/],
    ['?guard', 'Guard and units'],
  ] as const) {
    await page.goto(paths.survey(survey) + query)
    await expect(page.getByRole('heading', { name: heading })).toBeVisible()
    await expectSoundPage(page)
  }
  await page.goto(paths.survey(survey))
  await page.getByRole('button', { name: 'More of this survey' }).click()
  await expect(page.getByRole('menuitem', { name: /^Findings/ })).toBeVisible()
  await expectSoundPage(page)
  await page.getByRole('menuitem', { name: 'Keys' }).click()
  await expect(page.getByRole('dialog', { name: 'Keys' })).toBeVisible()
  await expectSoundPage(page)
})
