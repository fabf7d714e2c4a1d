// The built program for the browser tests: its own PostgreSQL, a fresh database with the demo company, an empty data
// folder. Ends, and puts everything away, when told or when the tests that started it are gone.
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { buildWhatIsOld } from '../../scripts/lib/build.mjs'
import { runInForeground } from '../../scripts/lib/child.mjs'
import { inRoot } from '../../scripts/lib/root.mjs'
import { goOn, stopWithParent } from '../../scripts/lib/run-command.mjs'
import { runScript, say } from '../../scripts/lib/script.mjs'
import { startThrowawayCluster } from '../../scripts/lib/throwaway-cluster.mjs'

await runScript(async () => {
  stopWithParent()
  await buildWhatIsOld({ say })
  const cluster = await startThrowawayCluster({ say })
  const dataFolder = mkdtempSync(join(tmpdir(), 'tautbook-e2e-'))
  try {
    goOn()
    const { status } = await runInForeground(process.execPath, [inRoot('dist', 'server', 'main.js')], {
      ...process.env,
      NODE_ENV: 'production',
      HOST: '127.0.0.1',
      DATABASE_URL: cluster.url(),
      TAUTBOOK_DATA: dataFolder,
      TAUTBOOK_DEMO: 'yes',
      PUBLIC_URL: '',
      SESSION_SECRET: 'only-for-browser-tests-on-this-machine',
      LOG_LEVEL: process.env.LOG_LEVEL ?? 'warn',
    })
    return status ?? 1
  } finally {
    await cluster.stop()
    rmSync(dataFolder, { recursive: true, force: true })
  }
})
