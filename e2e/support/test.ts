import { test as base } from '@playwright/test'

/**
 * The test every browser test uses: it fails when a page throws, writes to `console.error`, or asks any other machine
 * for anything. A test that provokes a refusal on purpose lets that through with `allowConsole`.
 */
export interface Watch {
  /** Lets console errors through whose text matches. */
  allowConsole: (pattern: RegExp) => void
}

export const test = base.extend<{ watch: Watch }>({
  watch: [
    async ({ context, baseURL }, use) => {
      const allowed: RegExp[] = []
      const faults: string[] = []
      await context.route(
        (url) => url.protocol.startsWith('http') && url.origin !== baseURL,
        async (route) => {
          faults.push(`asked another machine: ${route.request().url()}`)
          await route.abort()
        },
      )
      context.on('weberror', (error) => faults.push(`page error: ${error.error().message}`))
      context.on('console', (message) => {
        if (message.type() === 'error') faults.push(`console.error: ${message.text()}`)
      })
      await use({ allowConsole: (pattern) => void allowed.push(pattern) })
      const left = faults.filter((fault) => !allowed.some((pattern) => pattern.test(fault)))
      base.expect(left, 'what the page must not do unnoticed').toEqual([])
    },
    { auto: true },
  ],
})

export const expect = test.expect
