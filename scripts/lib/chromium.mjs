import { installDebianPackage } from './debian.mjs'
import { onPath, runs } from './find-program.mjs'
import { Trouble } from './trouble.mjs'

/** The browser for the browser tests: the one named by `TAUTBOOK_CHROMIUM`, else Debian's. */
export function findChromium() {
  const named = process.env.TAUTBOOK_CHROMIUM
  if (named) return runs(named) ? named : undefined
  return onPath('chromium', 'chromium-browser')
}

/** Finds Chromium or installs it. @throws Trouble */
export async function requireChromium({ say }) {
  const found = findChromium()
  if (found) return found
  if (process.env.TAUTBOOK_CHROMIUM) {
    throw new Trouble(
      `TAUTBOOK_CHROMIUM names ${process.env.TAUTBOOK_CHROMIUM}, which cannot be run: correct or unset it.`,
    )
  }
  await installDebianPackage({ name: 'chromium', what: 'Chromium', say })
  const installed = findChromium()
  if (!installed)
    throw new Trouble('Chromium was installed but is not on the PATH: add its folder, then start again.')
  return installed
}
