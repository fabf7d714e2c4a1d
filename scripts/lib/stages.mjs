import { mkdirSync, rmSync } from 'node:fs'
import { buildWhatIsOld } from './build.mjs'
import { requireChromium } from './chromium.mjs'
import { countCheck, readPlaywright, readVitest } from './count-tests.mjs'
import { requirePostgres } from './postgres-programs.mjs'
import { inRoot, root } from './root.mjs'
import { run } from './run-command.mjs'

const LIMIT_MS = 8 * 60_000

/** Without colours, which some programs switch on by the mere presence of `FORCE_COLOR`. */
const { FORCE_COLOR: _, ...plain } = process.env

const node = (args, env = {}) =>
  run(process.execPath, args, { cwd: root, env: { ...plain, NO_COLOR: '1', ...env }, timeout: LIMIT_MS })

/** Outside of `test-results`, which Playwright empties. */
const reportOf = (name) => inRoot('.cache', `${name}.json`)

async function vitest(project) {
  const file = reportOf(project)
  rmSync(file, { force: true })
  mkdirSync(inRoot('.cache'), { recursive: true })
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`]
  const { status, output } = await node([
    'node_modules/vitest/vitest.mjs',
    'run',
    '--project',
    project,
    ...reporters,
  ])
  return { output, ...readVitest({ file, status }) }
}

async function check(args) {
  const { status, output } = await node(args)
  return { output, ...countCheck(status) }
}

async function browser({ say }) {
  const executable = await requireChromium({ say })
  await buildWhatIsOld({ say })
  const file = reportOf('browser')
  rmSync(file, { force: true })
  const env = { TAUTBOOK_CHROMIUM: executable, TAUTBOOK_E2E_REPORT: file }
  const { status, output } = await node(['node_modules/@playwright/test/cli.js', 'test'], env)
  return { output, ...readPlaywright({ file, status }) }
}

/** Every stage, in order; those of one group run side by side, as many as there is room for. */
export const groups = [
  {
    lint: () => check(['node_modules/eslint/bin/eslint.js', '.', '--max-warnings', '0']),
    types: () => check(['node_modules/typescript/bin/tsc', '--noEmit']),
    unit: () => vitest('unit'),
  },
  {
    integration: async ({ say }) => {
      await requirePostgres({ say })
      return vitest('integration')
    },
  },
  { browser },
]

export const stageNames = groups.flatMap((group) => Object.keys(group))
