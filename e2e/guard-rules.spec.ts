import { expectSoundPage, narrow } from './support/page-checks'
import { importSurvey, registerByHand } from './support/register'
import { expect, test } from './support/test'

const post = (id: string) => ({ id, material: 'softwood', along: 3.5, across: 3.5 })
const deck = {
  survey: {
    format: 'tautbook.survey',
    version: 1,
    units: { length: 'in', force: 'lbf' },
    title: 'Harbour edge',
    guard: { rules: 'harbour-town', railTies: true, fall: 60, height: 36 },
    posts: [post('P1'), post('P2')],
    bays: [{ id: 'B1', from: 'P1', to: 'P2', readings: [{ id: 'r1', at: 'top', value: 46.5 }] }],
    runs: [{ id: 'R1', bays: ['B1'], cable: 'c532' }],
  },
}

test('@desk an owner copies published rules, asks for more, and surveys are held to that', async ({
  page,
  watch,
}) => {
  watch.allowConsole(/Failed to load resource/)
  test.setTimeout(240_000)
  await registerByHand(page, 'Castell Guards')
  await page.goto('/guard-rules')
  await expectSoundPage(page)
  await page.getByRole('link', { name: /^International Residential Code 2021/ }).click()
  await expect(page.getByText('R312.1.3, read in the text')).toBeVisible()
  await expectSoundPage(page)

  await page.getByRole('link', { name: 'Copy and edit' }).click()
  await page.getByLabel('Name', { exact: true }).fill('Harbour town by-law')
  await page.getByLabel('Edition').fill('2026')
  await page.getByLabel('Id', { exact: true }).fill('harbour-town')
  await page.getByLabel('Height at least', { exact: true }).fill('42')
  await page.getByLabel('Section of: Height at least').fill('By-law 7, 3')
  await page.getByLabel('Section of: Height at least').blur()
  await expectSoundPage(page)
  await page.getByRole('button', { name: 'Save the guard rules' }).click()
  await expect(page.getByRole('link', { name: /^Harbour town by-law 2026/ })).toBeVisible()

  const survey = await importSurvey(page, deck)
  await page.goto(`${survey}/findings`)
  const stop = page
    .getByRole('listitem')
    .filter({ hasText: 'The guard is 36 in high, the rules ask for 42 in' })
  await expect(stop).toContainText('Harbour town by-law 2026, By-law 7, 3')
  // Nothing of another company's: the id is theirs alone, and published ids are refused.
  await page.goto('/guard-rules/new?from=irc-2021')
  await page.getByLabel('Id', { exact: true }).fill('irc-2021')
  await page.getByRole('button', { name: 'Save the guard rules' }).click()
  await expect(page.getByText('irc-2021 is the id of published rules').first()).toBeVisible()
})

test('@phone own rules are chosen on the survey, and one gesture gives the guard their height', async ({
  page,
  watch,
}) => {
  watch.allowConsole(/Failed to load resource/)
  test.setTimeout(240_000)
  await narrow(page)
  await registerByHand(page, 'Slate Quay')
  await page.goto('/guard-rules/new?from=irc-2021')
  const height = page.getByLabel('Height at least', { exact: true })
  const save = page.getByRole('button', { name: 'Save the guard rules' })
  await height.fill('0')
  await save.click()
  await expect(page.getByText('Write a length above zero.')).toBeVisible()
  await expect(height).toBeFocused()
  await height.fill('42')
  await page.getByRole('link', { name: 'Guard rules' }).first().click()
  await expect(page.getByText(/is not saved yet and would be lost/)).toBeVisible()
  await page.getByRole('button', { name: 'Close toast' }).click()
  await expect(height).toHaveValue('42"')
  await save.click()
  await expect(page.getByRole('link', { name: /, own 2021/ })).toBeVisible()

  const survey = await importSurvey(page, {
    survey: { ...deck.survey, guard: { ...deck.survey.guard, rules: 'irc-2021' } },
  })
  const tooLow = page.getByRole('listitem').filter({ hasText: 'the rules ask for 42 in' })
  await page.goto(`${survey}?guard`)
  const panel = page.getByRole('dialog', { name: 'Guard and units' })
  await expect(panel.getByText('R312.1.2, read in the text')).toBeVisible()
  await panel.getByLabel('Rules followed').selectOption({ label: 'International Residential Code, own 2021' })
  await expect(panel.getByText(/^These rules ask for 42"/)).toBeVisible()
  await expectSoundPage(page)
  await panel.getByRole('button', { name: 'Close' }).click()
  await expect(page.getByText('Saved')).toBeVisible()
  await page.goto(`${survey}/findings`)
  await expect(tooLow).toBeVisible()

  await page.goto(`${survey}?guard`)
  await panel.getByRole('button', { name: 'Make the guard 42" high' }).click()
  await expect(panel.getByLabel('Height', { exact: true })).toHaveValue('42"')
  await expect(panel.getByRole('button', { name: /^Make the guard/ })).toHaveCount(0)
  await panel.getByRole('button', { name: 'Close' }).click()
  await expect(page.getByText('Saved')).toBeVisible()
  await page.goto(`${survey}/findings`)
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
  await expect(tooLow).toHaveCount(0)
})
