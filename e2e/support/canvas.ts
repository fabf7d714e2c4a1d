import type { Page } from '@playwright/test'

/** A place on the photo's canvas, as shares of its width and height. */
export interface Share {
  x: number
  y: number
}

/** Taps the canvas with a finger. */
export async function tapCanvas(page: Page, { x, y }: Share): Promise<void> {
  const box = await page.getByRole('application').boundingBox()
  if (!box) throw new Error('There is no canvas on this page.')
  await page.touchscreen.tap(box.x + box.width * x, box.y + box.height * y)
}

/** Chooses a tool on the rail. */
export const chooseTool = (page: Page, name: string): Promise<void> =>
  page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name, exact: true }).tap()
