import { expectSoundPage } from './support/page-checks'
import { demoSignIn, signInByHand } from './support/sign-in'
import { importSurvey } from './support/register'
import { expect, test } from './support/test'

const post = (id: string) => ({ id, material: 'softwood', along: 3.5, across: 3.5 })

/** One bay of 46 1/2 in, whose two cables at 3 and 8 in leave 5 in less 5/32 in between them: more than 4 in. */
const wideOpening = {
  survey: {
    format: 'tautbook.survey',
    version: 1,
    units: { length: 'in', force: 'lbf' },
    title: 'Wide opening',
    guard: { railTies: true, fall: 60, height: 36 },
    posts: [post('P1'), post('P2')],
    bays: [{ id: 'B1', from: 'P1', to: 'P2', readings: [{ id: 'r1', at: 'top', value: 46.5 }] }],
    runs: [{ id: 'R1', bays: ['B1'], cable: 'c532', cables: { heights: [3, 8] } }],
  },
}
const stop = 'Bay B1: the opening between cables 1 and 2 is 4 27/32 in, and no sphere of 4 in may pass.'

test('@phone a stop leads to its bay, is cured there and is gone from the list', async ({ page }) => {
  test.setTimeout(120_000)
  await signInByHand(page, demoSignIn('surveyor'))
  const survey = await importSurvey(page, wideOpening)
  await page.goto(`${survey}/findings`)
  const found = page.getByRole('listitem').filter({ hasText: stop })
  await expect(found).toContainText('International Residential Code 2021, R312.1.3')
  await expectSoundPage(page)
  await page.getByText('Checks (0)', { exact: true }).tap()
  await expect(page.getByText('No check: nothing noticed needs a look')).toBeVisible()
  await page.getByText(/^All \(/).tap()
  // Only an owner or estimator lets a stop pass.
  await expect(page.getByRole('button', { name: 'Overrule' })).toHaveCount(0)

  await found.getByRole('link', { name: 'Go there' }).tap()
  await expect(page.getByRole('heading', { name: /^Bay B1/ })).toBeVisible()
  await expect(page.getByRole('list', { name: 'Findings' })).toContainText(stop)
  await page.getByRole('button', { name: 'Run R1' }).tap()
  await page.getByText('Even', { exact: true }).tap()
  await expect(page.getByLabel(/^Spacing at most/)).toBeVisible()
  await expect(page.getByText('Saved', { exact: true })).toBeVisible()
  await page.getByRole('button', { name: 'More of this survey' }).tap()
  await page.getByRole('menuitem', { name: /^Findings/ }).tap()
  await expect(page.getByRole('heading', { level: 1, name: /^Findings/ })).toBeVisible()
  await expect(page.getByText(stop)).toHaveCount(0)
  await expect(page.getByText('Stops (0)')).toBeVisible()
})

test('@desk an estimator lets a stop pass with a reason, and makes it stand again', async ({ page }) => {
  test.setTimeout(120_000)
  await signInByHand(page, demoSignIn('estimator'))
  const survey = await importSurvey(page, wideOpening)
  await page.goto(`${survey}/findings`)
  const found = page.getByRole('listitem').filter({ hasText: stop })
  await found.getByRole('button', { name: 'Overrule' }).click()
  await found.getByRole('button', { name: 'Overrule this stop' }).click()
  await expect(found.getByText('Write why it may pass')).toBeVisible()
  await found.getByLabel('Why may it pass?').fill('A glass panel stands behind it')
  await expectSoundPage(page)
  await found.getByRole('button', { name: 'Overrule this stop' }).click()
  await expect(found).toContainText('Overruled by')
  await expect(found).toContainText('A glass panel stands behind it')
  await page.goto(`${survey}/cut-list`)
  await expect(page.getByRole('listitem').filter({ hasText: stop })).toContainText(
    'A glass panel stands behind it',
  )
  // On the survey's screen it says the same, and of the two stops only the other still counts.
  await page.goto(`${survey}?bay=B1`)
  const panel = page.getByRole('list', { name: 'Findings' })
  await expect(panel.getByRole('listitem').filter({ hasText: stop })).toContainText('Overruled by')
  await page.getByRole('button', { name: 'More of this survey' }).click()
  await expect(page.getByRole('menuitem', { name: 'Findings (1 stop)' })).toBeVisible()
  await page.goto(`${survey}/findings`)
  await found.getByRole('button', { name: 'Make it stand again' }).click()
  await expect(found.getByRole('button', { name: 'Overrule', exact: true })).toBeVisible()
  await expect(found).not.toContainText('A glass panel')
})

test('@desk a reason is kept on the screen when somebody else changed the survey meanwhile', async ({
  page,
  context,
  watch,
}) => {
  test.setTimeout(120_000)
  watch.allowConsole(/409/)
  await signInByHand(page, demoSignIn('estimator'))
  const survey = await importSurvey(page, wideOpening)
  await page.goto(`${survey}/findings`)
  const found = page.getByRole('listitem').filter({ hasText: stop })
  await found.getByRole('button', { name: 'Overrule' }).click()
  await found.getByLabel('Why may it pass?').fill('A glass panel stands behind it')

  const other = await context.newPage()
  await other.goto(`${survey}/findings`)
  const foundThere = other.getByRole('listitem').filter({ hasText: stop })
  await foundThere.getByRole('button', { name: 'Overrule' }).click()
  await foundThere.getByLabel('Why may it pass?').fill('Too early')
  await foundThere.getByRole('button', { name: 'Overrule this stop' }).click()
  await foundThere.getByRole('button', { name: 'Make it stand again' }).click()
  await expect(foundThere.getByRole('button', { name: 'Overrule', exact: true })).toBeVisible()

  await found.getByRole('button', { name: 'Overrule this stop' }).click()
  await expect(page.getByText('Somebody changed the survey meanwhile')).toBeVisible()
  await expect(found.getByLabel('Why may it pass?')).toHaveValue('A glass panel stands behind it')
  await found.getByRole('button', { name: 'Overrule this stop' }).click()
  await expect(found).toContainText('Overruled by')
  await expect(found).toContainText('A glass panel stands behind it')
})

test('the checks show the figures an inspector asks for, to scale', async ({ page }) => {
  test.setTimeout(240_000)
  await signInByHand(page, demoSignIn('owner'))
  const survey = await importSurvey(page, wideOpening)
  await page.goto(`${survey}/checks`)
  const bay = page.getByRole('region', { name: 'Bay B1' })
  // 8 − 3 in between centres, less 5/32 in of cable; 3 in less half a cable to the floor.
  await expect(bay).toContainText('4 27/32"')
  await expect(bay).toContainText('2 59/64"')
  await expect(bay.getByRole('img', { name: /^Bay B1 to scale/ })).toBeVisible()
  // Two cables of 150 lbf pull with 300 lbf; 150 · (3 + 8) lbf·in standing free.
  const end = page.getByRole('region', { name: 'Post P1' })
  await expect(end).toContainText('300 lbf')
  await expect(end).toContainText('moment 1650 lbf·in')
  await expect(page.getByText('Confirm with the authority having jurisdiction.').first()).toBeVisible()
  await expectSoundPage(page)
})
