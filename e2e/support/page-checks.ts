import AxeBuilder from '@axe-core/playwright'
import type { Page } from '@playwright/test'
import { expect } from './test'

/** A phone at its narrowest; a desk stays a desk. */
export async function narrow(page: Page): Promise<void> {
  const size = page.viewportSize()
  if (size && size.width < 600) await page.setViewportSize({ width: 360, height: 740 })
}

/** Nothing on the page reaches beyond its right edge; wide tables scroll in a box of their own. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const { scroll, client } = await page.evaluate(() => {
    const { scrollWidth, clientWidth } = document.documentElement
    return { scroll: scrollWidth, client: clientWidth }
  })
  expect(scroll, `${page.url()} is ${scroll} px wide in a window of ${client} px`).toBeLessThanOrEqual(client)
}

/** axe finds nothing serious or critical on the page as it stands. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze()
  const serious = violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`)
  expect(serious, `serious violations on ${page.url()}`).toEqual([])
}

/** Both checks, light and dark. */
export async function expectSoundPage(page: Page): Promise<void> {
  await expectNoSidewaysScroll(page)
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme })
    await expectAccessible(page)
  }
  await page.emulateMedia({ colorScheme: 'light' })
}
