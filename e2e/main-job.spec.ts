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
] as const

/**
 * Worked out by hand: both bays 47 3/8 in at 33 in and 47 5/16 in at 3 in, a post of 3 1/2 in between them, cables at
 * 2 7/8, 5 3/4 … 31 5/8 in. D = 2 · (47.3125 + 0.0625 · (h − 3) / 30) + 3.5; both sleeves end 3/4 in past the face, so
 * base = D + 1.5. U = √(3 · (1/16)² + (1.4 mm)² + (1/16)² + 2 · (1/32)²) = 0.14358 in, 1.4 mm being the class II tape’s
 * 0.7 mm for each bay. Rounded up to 1/16: cable 1 99.76806, 4 99.80399, 5 99.81598, 9 99.86389, 10 99.87587 in.
 */
const WORKED_OUT = [
  ...Array.from({ length: 4 }, () => 99.8125),
  ...Array.from({ length: 5 }, () => 99.875),
  ...Array.from({ length: 2 }, () => 99.9375),
]
const UPRIGHT = [1500, 2000]

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
    const address = () =>
      page.evaluate(
        () =>
          performance
            .getEntriesByType('resource')
            .map(({ name }) => name)
            .find((name) => name.includes('/picture')) ?? '',
      )
    await expect.poll(address).not.toBe('')
    // Stored 2000 by 1500 with orientation 6: upright it is taller than wide.
    const size = await page.evaluate(
      async (url) => {
        const { width, height } = await createImageBitmap(await (await fetch(url)).blob())
        return [width, height]
      },
      await address(),
    )
    expect(size).toEqual(UPRIGHT)
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
    await chooseTool(page, 'Select')
    await page.getByRole('button', { name: 'Lower the panel' }).tap()
    await tapCanvas(page, feet[2])
    await page.getByRole('button', { name: 'Raise the panel' }).tap()
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
    expect([...rows.values()]).toEqual(WORKED_OUT)
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
