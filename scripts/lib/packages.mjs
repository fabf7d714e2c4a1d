import { existsSync, readFileSync, statSync } from 'node:fs'
import { goOn, run } from './run-command.mjs'
import { inRoot, root } from './root.mjs'
import { Trouble, troubleOf } from './trouble.mjs'

const readPackages = (file) => JSON.parse(readFileSync(file, 'utf8')).packages ?? {}

/** Whether what is installed is what the lock file names; npm's own note of it is written last, so it proves a whole install. */
export function packagesAreCurrent(folder = root) {
  const [lock, installed] = [`${folder}/package-lock.json`, `${folder}/node_modules/.package-lock.json`]
  if (!existsSync(installed)) return false
  if (statSync(installed).mtimeMs >= statSync(lock).mtimeMs) return true
  const [wanted, present] = [readPackages(lock), readPackages(installed)]
  return Object.entries(wanted).every(
    ([path, entry]) => path === '' || entry.optional || present[path]?.version === entry.version,
  )
}

/** Installs the packages from the lock file if need be. @throws Trouble */
export async function installPackages({ say }) {
  if (packagesAreCurrent()) return
  say('Installing the packages …')
  const npm = process.platform === 'win32' ? 'npm.cmd' : 'npm'
  const { status, output } = await run(npm, ['ci', '--include=dev', '--no-audit', '--no-fund'], { cwd: root })
  goOn()
  if (status === 0) return
  const sentence = `The packages could not be installed in ${inRoot('node_modules')}: check the network and that the folder can be written, then start again.`
  throw output.includes('not found') && status === null
    ? new Trouble('npm is not on the PATH: install Node 20 with npm, then start again.')
    : troubleOf({ sentence, folder: root, output })
}
