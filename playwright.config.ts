import { execFileSync } from 'node:child_process'
import { defineConfig } from '@playwright/test'
import { findChromium } from './scripts/lib/chromium.mjs'

/**
 * `npx playwright test -g "part of a title"` runs alone: it builds what is old and starts a server with a database of
 * its own. A title with `@phone` or `@desk` runs at that size only, any other at both.
 */
const port = (process.env['TAUTBOOK_E2E_PORT'] ??= freePort())
const address = `http://127.0.0.1:${port}`

/** Chosen once; the workers inherit it through the environment. */
function freePort(): string {
  const probe =
    "const s=require('net').createServer().listen(0,'127.0.0.1',()=>{console.log(s.address().port);s.close()})"
  return execFileSync(process.execPath, ['-e', probe], { encoding: 'utf8' }).trim()
}

const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]

export default defineConfig({
  testDir: 'e2e',
  outputDir: 'test-results',
  timeout: 60_000,
  expect: { timeout: 10_000 },
  forbidOnly: true,
  retries: 0,
  workers: 2,
  fullyParallel: false,
  reporter: [
    ['list'],
    ['json', { outputFile: process.env['TAUTBOOK_E2E_REPORT'] ?? 'test-results/report.json' }],
  ],
  use: {
    baseURL: address,
    colorScheme: 'light',
    locale: 'en-US',
    timezoneId: 'UTC',
    trace: 'retain-on-failure',
    screenshot: 'only-on-failure',
    launchOptions: { executablePath: findChromium() ?? 'chromium', args: flags },
  },
  projects: [
    {
      name: 'phone',
      grepInvert: /@desk/,
      use: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true, deviceScaleFactor: 2 },
    },
    { name: 'desk', grepInvert: /@phone/, use: { viewport: { width: 1440, height: 900 } } },
  ],
  webServer: {
    command: 'exec node e2e/support/serve.mjs',
    env: { PORT: port },
    url: `${address}/api/health`,
    timeout: 120_000,
    reuseExistingServer: false,
    stdout: 'ignore',
    stderr: 'pipe',
    // Told, not killed: a killed server would leave its PostgreSQL behind.
    gracefulShutdown: { signal: 'SIGTERM', timeout: 15_000 },
  },
})
