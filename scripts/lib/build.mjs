import { mkdirSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { namesIn } from './find-program.mjs'
import { inRoot, root } from './root.mjs'
import { goOn, run } from './run-command.mjs'
import { troubleOf } from './trouble.mjs'

/** What each half is made of; a folder counts with all that is in it and, so that a deletion shows, for itself. */
const common = ['shared', 'package.json', 'package-lock.json', 'tsconfig.json', 'scripts/lib/build.mjs']
const halves = {
  client: {
    sources: [...common, 'src', 'public', 'index.html', 'vite.config.ts', 'tailwind.config.ts'],
    command: ['node_modules/vite/bin/vite.js', 'build', '--manifest', '--logLevel', 'warn'],
  },
  server: {
    sources: [...common, 'server'],
    command: ['scripts/lib/bundle-server.mjs'],
  },
}

/** When a file, or the newest thing in a folder, was last changed; 0 for what is not there. */
export function newestChange(path) {
  const stat = statSync(path, { throwIfNoEntry: false })
  if (!stat) return 0
  if (!stat.isDirectory()) return stat.mtimeMs
  return namesIn(path).reduce(
    (newest, name) => Math.max(newest, newestChange(join(path, name))),
    stat.mtimeMs,
  )
}

const stampOf = (half) => inRoot('dist', `${half}.built`)

/** A half is current when it was whole after its sources last changed. */
export function isCurrent(half) {
  const built = statSync(stampOf(half), { throwIfNoEntry: false })?.mtimeMs ?? 0
  return halves[half].sources.every((source) => newestChange(inRoot(source)) < built)
}

async function build(half, say) {
  say(`Building the ${half} …`)
  const began = new Date()
  // Gone before the work begins, so that a build cut short never passes for a whole one.
  rmSync(stampOf(half), { force: true })
  const env = { ...process.env, NODE_ENV: 'production' }
  const { status, output } = await run(process.execPath, halves[half].command, { cwd: root, env })
  goOn()
  if (status !== 0)
    throw troubleOf({
      sentence: `The ${half} could not be built: mend what is said above, then start again.`,
      folder: root,
      output,
    })
  mkdirSync(inRoot('dist'), { recursive: true })
  writeFileSync(stampOf(half), `${began.toISOString()}\n`)
}

/** Builds client and server where older than their sources. @throws Trouble */
export async function buildWhatIsOld({ say }) {
  const results = await Promise.allSettled(
    Object.keys(halves)
      .filter((half) => !isCurrent(half))
      .map((half) => build(half, say)),
  )
  const failed = results.find(({ status }) => status === 'rejected')
  if (failed) throw failed.reason
}
