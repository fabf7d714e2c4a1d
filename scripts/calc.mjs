// The command line: plain JavaScript, so that it runs on a fresh clone before anything is installed.
import { spawnSync } from 'node:child_process'
import { existsSync } from 'node:fs'
import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

const root = dirname(dirname(fileURLToPath(import.meta.url)))
const require = createRequire(import.meta.url)

/** Standard output belongs to the answer, so what the installer says goes to standard error. */
function install() {
  const npm = process.platform === 'win32' ? 'npm.cmd' : 'npm'
  const { status } = spawnSync(npm, ['ci', '--no-audit', '--no-fund'], { cwd: root, stdio: ['ignore', 2, 2] })
  if (status === 0) return
  process.stderr.write('The packages could not be installed. Check the network, then run npm ci.\n')
  process.exit(1)
}

if (!existsSync(join(root, 'node_modules', 'tsx', 'package.json'))) install()

const [tsx, script] = [require.resolve('tsx/cli'), join(root, 'scripts', 'calc.ts')]
const { status } = spawnSync(process.execPath, [tsx, script, ...process.argv.slice(2)], { stdio: 'inherit' })
process.exit(status ?? 1)
