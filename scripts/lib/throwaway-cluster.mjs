import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { blockingFolder, clusterAccount, letPass } from './cluster-account.mjs'
import { makeCluster, newPassword, startCluster, stopCluster, urlOf } from './cluster.mjs'
import { isAlive } from './cluster-process.mjs'
import { namesIn } from './find-program.mjs'
import { requirePostgres } from './postgres-programs.mjs'
import { Trouble } from './trouble.mjs'

const PREFIX = 'tautbook-test-'
/** Nothing in it outlives the tests, so nothing need reach the disk. */
const HURRIED = [
  'fsync=off',
  'synchronous_commit=off',
  'full_page_writes=off',
  'max_connections=60',
  'max_wal_size=2GB',
]

/** A new folder of ours that the account can get to. @throws Trouble */
function makePlace(account) {
  for (const base of [tmpdir(), '/var/tmp', '/dev/shm']) {
    const place = mkdtempSync(join(base, PREFIX))
    letPass(place)
    if (blockingFolder(account, place) === undefined) return place
    rmSync(place, { recursive: true })
  }
  throw new Trouble(
    `The user postgres, as whom PostgreSQL runs, reaches neither ${tmpdir()} nor /var/tmp: allow it (chmod o+x ${tmpdir()}).`,
  )
}

async function remove({ programs, account, place }) {
  await stopCluster({ programs, account, folder: join(place, 'database') })
  rmSync(place, { recursive: true, force: true, maxRetries: 5 })
}

/** Clusters whose tests were killed before they could put them away. */
async function sweep({ programs, account, base }) {
  const places = namesIn(base)
    .filter((name) => name.startsWith(PREFIX))
    .map((name) => join(base, name))
  for (const place of places) {
    try {
      if (!isAlive(Number(readFileSync(join(place, 'owner'), 'utf8'))))
        await remove({ programs, account, place })
    } catch {
      // Somebody else’s, or just being made or removed: theirs to put away.
    }
  }
}

/** A PostgreSQL of its own for one run of tests; gone after `stop`. @throws Trouble */
export async function startThrowawayCluster({ say = () => undefined } = {}) {
  const programs = await requirePostgres({ say })
  const account = clusterAccount()
  const place = makePlace(account)
  writeFileSync(join(place, 'owner'), String(process.pid))
  await sweep({ programs, account, base: join(place, '..') })
  const [folder, password] = [join(place, 'database'), newPassword()]
  try {
    await makeCluster({ programs, account, folder, password, hurried: true })
    const port = await startCluster({ programs, account, folder, options: HURRIED })
    return {
      /** The address of any of its databases; `postgres` is there from the start. */
      url: (database = 'postgres') => urlOf({ port, password, database }),
      stop: () => remove({ programs, account, place }),
    }
  } catch (error) {
    await remove({ programs, account, place })
    throw error
  }
}
