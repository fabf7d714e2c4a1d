import { expect, test } from './support/test'

test('the program and its database answer, and the first page opens', async ({ page, request }) => {
  const health = await request.get('/api/health')
  expect(await health.json()).toEqual({ status: 'ok', database: 'ok' })
  await page.goto('/')
  await expect(page.locator('body')).not.toBeEmpty()
})
