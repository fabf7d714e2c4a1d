import { tapCanvas } from './support/canvas'
import { demoSignIn, signInByHand } from './support/sign-in'
import { expect, test } from './support/test'

test('@phone keeps what is traced without signal, and sends it once when the signal is back', async ({
  page,
  context,
  watch,
}) => {
  watch.allowConsole(/ERR_INTERNET_DISCONNECTED|Failed to load resource/)
  await signInByHand(page, demoSignIn('surveyor'))
  await page.goto('/jobs/new')
  await page.getByLabel('Title', { exact: true }).fill('No signal')
  await page.getByRole('button', { name: 'Open the job' }).tap()
  await page.getByRole('button', { name: 'New survey' }).tap()
  await page.getByLabel('Title', { exact: true }).fill('In the woods')
  await page.getByRole('button', { name: 'Begin the survey' }).tap()
  await page.getByLabel('Choose file').setInputFiles('demo/photos/harbour-deck.jpg')
  await expect(page.getByText('Tap the foot of a post')).toBeVisible()
  await expect(page.getByText('Saved', { exact: true })).toBeVisible()

  await context.setOffline(true)
  for (const x of [0.25, 0.5, 0.75]) await tapCanvas(page, { x, y: 0.5 })
  await expect(page.getByText('On this screen, waiting to be sent (3)')).toBeVisible()
  await page.getByRole('link', { name: /^Back to job/ }).tap()
  await expect(page.getByText('3 changes have not been sent yet and would be lost.')).toBeVisible()
  await expect(page.getByRole('heading', { name: 'In the woods' })).toBeVisible()

  const survey = page.url()
  await context.setOffline(false)
  // Sent: the page that was asked for opens, and the question goes.
  await expect(page.getByRole('heading', { level: 1, name: 'No signal' })).toBeVisible()
  await expect(page.getByText('3 changes have not been sent yet')).toHaveCount(0)
  await page.goto(`${survey}/history`)
  await expect(page.getByText(/put post P\d/)).toHaveCount(3)
})

test('@phone keeps a photo that could not be sent, and sends it when told to', async ({ page, watch }) => {
  watch.allowConsole(/ERR_FAILED|Failed to load resource/)
  await signInByHand(page, demoSignIn('surveyor'))
  await page.goto('/jobs/new')
  await page.getByLabel('Title', { exact: true }).fill('Photo without signal')
  await page.getByRole('button', { name: 'Open the job' }).tap()
  await page.getByRole('button', { name: 'New survey' }).tap()
  await page.getByLabel('Title', { exact: true }).fill('Far out')
  await page.getByRole('button', { name: 'Begin the survey' }).tap()
  await page.route('**/api/surveys/*/photos', (route) => route.abort())
  await page.getByLabel('Choose file').setInputFiles('demo/photos/harbour-deck.jpg')
  const kept = page.getByRole('list', { name: 'Photos not sent yet' })
  await expect(kept).toContainText('harbour-deck.jpg is kept on this screen and was not sent.')
  // A public network answers every request with its own page.
  await page.unroute('**/api/surveys/*/photos')
  await page.route('**/api/surveys/*/photos', (route) =>
    route.fulfill({ status: 403, contentType: 'text/html', body: '<h1>Accept our terms</h1>' }),
  )
  await kept.getByRole('button', { name: 'Send again' }).tap()
  await expect(kept).toContainText('Something other than the server answered.')
  await page.unroute('**/api/surveys/*/photos')
  await kept.getByRole('button', { name: 'Send again' }).tap()
  await expect(page.getByText('Tap the foot of a post')).toBeVisible()
  await expect(kept).toHaveCount(0)
})
