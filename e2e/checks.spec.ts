import { expectSoundPage, narrow } from './support/page-checks'
import { demoSignIn, signInByHand } from './support/sign-in'
import { importSurvey } from './support/register'
import { expect, test } from './support/test'

const post = (id: string) => ({ id, material: 'softwood', along: 3.5, across: 3.5 })
const survey = (more: object) => ({
  survey: { format: 'tautbook.survey', version: 1, units: { length: 'in', force: 'lbf' }, ...more },
})

/** One bay of 46 1/2 in with three cables of 5/32 in at 3, 6 and 10 in, and its top open. */
const level = survey({
  title: 'Level',
  guard: { railTies: true, fall: 60, height: 36 },
  posts: [post('P1'), post('P2')],
  bays: [{ id: 'B1', from: 'P1', to: 'P2', readings: [{ id: 'r1', at: 'top', value: 46.5 }] }],
  runs: [{ id: 'R1', bays: ['B1'], cable: 'c532', tension: 150, cables: { heights: [3, 6, 10] } }],
})

const stairBay = (id: string, from: string, to: string) => ({
  id,
  from,
  to,
  kind: 'stair',
  rise: 7.5,
  going: 10,
  readings: [{ id: 'r1', at: 'top', value: 44 }],
})
/** Two flights of 7 1/2 over 10 that meet square at a post, their holes at one height. */
const stairs = survey({
  title: 'Stairs',
  guard: { fall: 60, height: 36, stair: { height: 36 } },
  posts: [post('P1'), post('P2'), post('P3')],
  bays: [stairBay('B1', 'P1', 'P2'), stairBay('B2', 'P2', 'P3')],
  runs: ['R1', 'R2'].map((id, i) => ({
    id,
    bays: [`B${i + 1}`],
    cable: 'c532',
    tension: 150,
    cables: { heights: [5, 9] },
  })),
  corners: [{ post: 'P2', angle: 90 }],
})

test('the checks of a level bay show what was worked out by hand', async ({ page }) => {
  test.setTimeout(120_000)
  await narrow(page)
  await signInByHand(page, demoSignIn('owner'))
  await page.goto(`${await importSurvey(page, level)}/cut-list`)
  await page.getByRole('link', { name: 'Checks', exact: true }).click()
  await expect(page.getByRole('heading', { level: 1, name: /^Checks/ })).toBeVisible()
  await expect(page.getByText('International Residential Code 2021').first()).toBeVisible()
  await expect(page.getByText('Confirm with the authority having jurisdiction.').first()).toBeVisible()

  const figure = (region: string, label: string) =>
    page.getByRole('region', { name: region }).locator('dl > div').filter({ hasText: label })
  // 10 − 6 in between centres, less 5/32 in of cable; the rules let no sphere of 4 in through.
  await expect(figure('Bay B1', 'Clear opening, cables 2 and 3')).toContainText('3 27/32"')
  await expect(figure('Bay B1', 'Clear opening, cables 2 and 3')).toContainText('holds')
  // 3 in less half a cable.
  await expect(figure('Bay B1', 'Below the lowest cable')).toContainText('2 59/64"')
  // 36 in less a rail of 1 1/2 in, less 10 in and half a cable: a stop.
  const top = figure('Bay B1', 'Above the highest cable')
  await expect(top).toContainText('24 27/64"')
  await expect(top.getByRole('img', { name: 'stop' })).toBeVisible()
  // One cable’s share of 50 lbf on 12 in at a pitch of 4 in: 50 · 4 / 12.
  await expect(figure('Bay B1', 'Infill load: deflection')).toContainText('16.7 lbf on one cable')
  await expect(figure('Bay B1', 'Push-through')).toContainText('US codes set no force')
  await expect(page.getByRole('img', { name: /^Bay B1 to scale, no spacers, span 46 1\/2"/ })).toBeVisible()

  // The starter catalogue’s cable has EA 151 410 lbf: 150 + 151 410 · 16·10⁻⁶ · 35 K, and less 25 K of it.
  await expect(figure('Run R1', 'In the cold, -20 °C')).toContainText('235 lbf')
  await expect(figure('Run R1', 'In the heat, 40 °C')).toContainText('89 lbf')

  // Three cables of 150 lbf.
  await expect(figure('Post P1', 'Pull of all cables')).toContainText('450 lbf')
  // Held at 34 1/2 in: foot 150 · (31.5 + 28.5 + 24.5) / 34.5 = 367.391 lbf; at the third cable
  // 367.391 · 10 − 150 · (7 + 4) = 2023.91 lbf·in; over 3.5³ / 6 = 7.14583 in³.
  const propped = figure('Post P1', 'Held by the top rail: this one counts')
  await expect(propped).toContainText('283 psi')
  await expect(propped).toContainText('moment 2024 lbf·in')
  await expect(propped).toContainText('The survey says that the top rail ties this post.')
  // 150 · (3 + 6 + 10) lbf·in.
  await expect(figure('Post P1', 'Standing free, for comparison')).toContainText('moment 2850 lbf·in')
  // 200 lbf · 36 in over 7.14583 in³.
  await expect(figure('Post P1', '200 lbf at the top')).toContainText('1008 psi')
  await expect(figure('Post P1', 'Allowed in bending')).toContainText('1100 psi')
  // 3 1/2 − 1 1/2 in, and (3 1/2 − 9/16) / 2 in.
  await expect(figure('Post P1', 'Back wall left')).toContainText('2"')
  await expect(figure('Post P1', 'Edge distance left')).toContainText('1 15/32"')
  await expect(page.getByRole('img', { name: /^Post P1 cut level at the cable’s height/ })).toBeVisible()
  await expectSoundPage(page)
})

test('the checks of stairs measure square to the cables, and stagger the holes of a corner', async ({
  page,
}) => {
  test.setTimeout(120_000)
  await narrow(page)
  await signInByHand(page, demoSignIn('estimator'))
  await page.goto(`${await importSurvey(page, stairs)}/checks`)
  const bay = page.getByRole('region', { name: 'Bay B1' })
  // cos θ = 10 / 12.5: 4 · 0.8 − 5/32 = 3.04375 in.
  await expect(bay).toContainText('≈ 3 3/64"')
  // The lowest cable’s edge is 5 − (5/64) / 0.8 = 4.90234 in above the nosings: legs of 12.40234 and 16.53646 in,
  // 20.67057 in between them; 12.40234 + 16.53646 − 20.67057 = 8.26823 in.
  const triangle = bay.locator('dl > div').filter({ hasText: 'Sphere in the stair triangle' })
  await expect(triangle).toContainText('8 17/64"')
  await expect(triangle.getByRole('img', { name: 'stop' })).toBeVisible()

  // Bodies of 2 1/2 in past 1 3/4 − 9/32 in overlap by 1 1/32 in; 9/32 + 9/32 + 1/4 in cure it.
  const corner = page.getByRole('region', { name: 'Corner P2, runs R1 and R2' })
  await expect(corner).toContainText('1 1/32"')
  await expect(
    corner.getByRole('img', { name: /holes of runs R1 and R2 at least 13\/16" apart/ }),
  ).toBeVisible()
  await expect(corner).toContainText('higher or lower, which leaves')
  await expect(corner.locator('dl').getByRole('img', { name: 'stop' })).toBeVisible()
  // Nobody said that the rail ties the post: standing free counts.
  await expect(page.getByRole('region', { name: 'Post P1, run R1' })).toContainText(
    'Nobody said whether the top rail ties this post: the worse is taken.',
  )
  await expectSoundPage(page)
})
