import { readFile } from 'node:fs/promises'
import type { Page } from '@playwright/test'
import readWorkbook from 'read-excel-file/node'
import { chooseTool, tapCanvas } from './support/canvas'
import { demoSignIn, signInByHand } from './support/sign-in'
import { expect, test } from './support/test'

/** The three feet on the photo, as shares of the canvas; the photo stands upright in it. */
const feet = [
  { x: 0.25, y: 0.6 },
  { x: 0.5, y: 0.6 },
  { x: 0.75, y: 0.6 },
]

/** Keys a length in on the keypad: digits, then the fraction's key. */
async function keyIn(page: Page, digits: string, fraction?: string): Promise<void> {
  for (const digit of digits) await page.getByRole('button', { name: digit, exact: true }).tap()
  if (fraction) await page.getByRole('button', { name: `${fraction} inch`, exact: true }).tap()
}

/** `95 3/4"` in inches. */
function inchesOf(text: string): number {
  const match = /^(?:struck: )?(\d+)?\s*(?:(\d+)\/(\d+))?"/.exec(text)
  if (!match) throw new Error(`not a length: ${text}`)
  return Number(match[1] ?? 0) + (match[2] ? Number(match[2]) / Number(match[3]) : 0)
}

test('@phone from sign-in to a cut list that the shop can download, by touch alone', async ({ page }) => {
  await signInByHand(page, demoSignIn('surveyor'))

  await test.step('a new job and a new survey', async () => {
    await page.getByRole('link', { name: 'New job' }).tap()
    await page.getByLabel('Title', { exact: true }).fill('Ferrow, mill stair')
    await page.getByLabel('Customer').fill('Lene Ferrow')
    await page.getByRole('button', { name: 'Open the job' }).tap()
    await page.getByRole('button', { name: 'New survey' }).tap()
    await page.getByLabel('Title', { exact: true }).fill('Upper landing')
    await page.getByRole('button', { name: 'Begin the survey' }).tap()
    await expect(page.getByRole('heading', { name: 'Upper landing' })).toBeVisible()
  })

  await test.step('a photo that the phone stored lying on its side', async () => {
    await page.getByLabel('Choose file').setInputFiles('demo/photos/mill-stair.jpg')
    await expect(page.getByRole('application')).toBeVisible()
    const picture = await page.request.get(
      await page.evaluate(
        () =>
          performance
            .getEntriesByType('resource')
            .map(({ name }) => name)
            .find((name) => name.includes('/picture')) ?? '',
      ),
    )
    expect(picture.headers()['content-type']).toBe('image/jpeg')
  })

  await test.step('three posts and two bays', async () => {
    await expect(page.getByText('Tap the foot of a post')).toBeVisible()
    for (const foot of feet) await tapCanvas(page, foot)
    await chooseTool(page, 'Bay')
    for (const foot of feet) await tapCanvas(page, foot)
    await expect(page.getByText(/material of P1|P1/).first()).toBeVisible()
  })

  await test.step('the posts: two of softwood, the third veneered hardwood', async () => {
    await page.getByRole('button', { name: /Next missing/ }).tap()
    const panel = page.getByRole('complementary', { name: 'Panel' })
    await expect(panel.getByRole('heading', { name: 'Post P1' })).toBeVisible()
    await panel.getByText('Softwood', { exact: true }).tap()
    await panel.getByRole('button', { name: '4x4' }).tap()
    await panel.getByRole('button', { name: 'The same for the 2 posts without material' }).tap()
    await page.goto(`${page.url().split('?')[0] ?? ''}?post=P3`)
    await expect(panel.getByRole('heading', { name: 'Post P3' })).toBeVisible()
    await panel.getByText('Veneered', { exact: true }).tap()
    await panel.getByRole('group', { name: 'Core under the cover' }).getByText('Hardwood').tap()
    await panel.getByLabel('Thickness of the cover').fill('1/4')
    await panel.getByLabel('Thickness of the cover').blur()
    await expect(page.getByText('Saved')).toBeVisible()
  })

  await test.step('both bays read in, top and bottom, on the keypad', async () => {
    await page.getByRole('button', { name: /Next missing/ }).tap()
    for (const bay of ['B1', 'B2']) {
      await expect(page.getByRole('heading', { name: `Bay ${bay}` })).toBeVisible()
      await keyIn(page, '47', '3/8')
      await page.getByRole('button', { name: 'Add top' }).tap()
      await keyIn(page, '47', '5/16')
      await page.getByRole('button', { name: 'Add bottom' }).tap()
    }
    await expect(page.getByText('Nothing is missing.')).toBeVisible()
  })

  const cuts = await test.step('the cut list and the working of a length', async () => {
    await page.getByRole('button', { name: 'Cut list' }).tap()
    await expect(page.getByRole('heading', { name: 'Cut list: Upper landing' })).toBeVisible()
    const rows = page.getByRole('table', { name: /Cables of run R1/ }).locator('tbody tr')
    await expect(rows).toHaveCount(11)
    const shown = new Map<number, number>()
    for (const row of await rows.all()) {
      const name = (await row.locator('td').nth(0).innerText()).trim()
      const cut = await row.locator('td').nth(1).locator('.sr-only').first().innerText()
      shown.set(Number(name.split('-')[1]), inchesOf(cut))
    }
    await page.getByRole('link', { name: 'Working of cable R1-10' }).tap()
    await expect(page.getByRole('heading', { name: 'Path, bay by bay and post by post' })).toBeVisible()
    await expect(page.getByText('Slop: every limit that may fall the wrong way')).toBeVisible()
    await page.goBack()
    return shown
  })

  await test.step('the workbook, read by another program, holds the same lengths', async () => {
    const download = page.waitForEvent('download')
    await page.getByRole('link', { name: 'XLSX' }).tap()
    const rows = await readCutListSheet(await readFile(await (await download).path()))
    expect(rows).toEqual(cuts)
  })
})

/** Cut lengths by cable, from the first sheet. */
async function readCutListSheet(workbook: Buffer): Promise<Map<number, number>> {
  const sheets = await readWorkbook(workbook)
  const rows = sheets.find(({ sheet }) => sheet === 'Cut list')?.data ?? []
  const header = rows.findIndex((row) => row.includes('Cable'))
  const columns = rows[header] ?? []
  const cable = columns.indexOf('Cable')
  const cut = columns.findIndex((name) => String(name).startsWith('Cut or shop length'))
  return new Map(
    rows
      .slice(header + 1)
      .filter((row) => typeof row[cable] === 'number')
      .map((row) => [Number(row[cable]), Number(row[cut])]),
  )
}
