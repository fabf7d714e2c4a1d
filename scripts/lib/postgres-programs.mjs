import { join } from 'node:path'
import { installDebianPackage } from './debian.mjs'
import { namesIn, pathFolders, runs } from './find-program.mjs'
import { run } from './run-command.mjs'
import { Trouble } from './trouble.mjs'

const DEBIAN = '/usr/lib/postgresql'
const OLDEST = 13
const needed = ['postgres', 'initdb', 'pg_ctl', 'pg_isready', 'psql']

const isWhole = (folder) => needed.every((name) => runs(join(folder, name)))

/** Folders that hold a whole PostgreSQL: those on the PATH, then Debian's, newest first. */
export function postgresFolders() {
  const debian = namesIn(DEBIAN)
    .filter((name) => /^\d+$/.test(name))
    .sort((a, b) => Number(b) - Number(a))
    .map((name) => join(DEBIAN, name, 'bin'))
  return [...new Set([...pathFolders(), ...debian])].filter(isWhole)
}

async function majorOf(folder) {
  const { output } = await run(join(folder, 'postgres'), ['--version'], { cwd: '/' })
  return Number(/\) (\d+)/.exec(output)?.[1] ?? 0)
}

/** A folder with PostgreSQL of the wanted major version; any from 13 on when none is wanted. */
async function findPostgres(major) {
  for (const folder of postgresFolders()) {
    const found = await majorOf(folder)
    if (major === undefined ? found >= OLDEST : found === major) return folder
  }
  return undefined
}

/** Finds PostgreSQL or installs it; an existing cluster asks for its own version. @throws Trouble */
export async function requirePostgres({ say, major }) {
  const found = await findPostgres(major)
  if (found) return found
  const name = major === undefined ? 'postgresql' : `postgresql-${major}`
  await installDebianPackage({ name, what: major === undefined ? 'PostgreSQL' : `PostgreSQL ${major}`, say })
  const installed = await findPostgres(major)
  if (!installed) {
    throw new Trouble(
      `PostgreSQL was installed but its programs are not in ${DEBIAN}: add their folder to the PATH, then start again.`,
    )
  }
  return installed
}
