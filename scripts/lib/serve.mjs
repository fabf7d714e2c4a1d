import { holdDataFolder, openDataFolder, sessionSecret } from './data-folder.mjs'
import { openKeptCluster } from './kept-cluster.mjs'
import { goOn } from './run-command.mjs'
import { report } from './trouble.mjs'

/** What the server is given beside what is in the environment already. */
const environmentFor = ({ settings, url }) => ({
  ...process.env,
  HOST: settings.host,
  PORT: String(settings.port),
  DATABASE_URL: url,
  TAUTBOOK_DATA: settings.dataFolder,
  SESSION_SECRET: process.env.SESSION_SECRET || sessionSecret(settings.dataFolder),
})

const LOOK_EVERY_MS = 2000

/** Starts the database again when it is killed while the server runs; returns how to leave off. */
function keepUp({ cluster, say }) {
  let starting = Promise.resolve()
  let busy = false
  const look = async () => {
    if (busy || !cluster.isGone()) return
    busy = true
    say('The database was ended from outside: starting it again …')
    starting = cluster.startAgain().then(() => undefined, report)
    await starting
    busy = false
  }
  const timer = setInterval(look, LOOK_EVERY_MS)
  return () => {
    clearInterval(timer)
    return starting
  }
}

/**
 * Opens data folder and database, does the work, and closes both, however the work ends. With a `DATABASE_URL` given
 * the database is somebody else’s and is neither started nor stopped. @throws Trouble
 */
export async function withDatabase({ settings, say }, work) {
  openDataFolder(settings.dataFolder)
  const letGo = settings.databaseUrl ? () => undefined : holdDataFolder(settings.dataFolder)
  try {
    if (settings.databaseUrl) return await work(environmentFor({ settings, url: settings.databaseUrl }))
    const cluster = await openKeptCluster({ ...settings, say })
    const leave = keepUp({ cluster, say })
    try {
      goOn()
      return await work(environmentFor({ settings, url: cluster.url }))
    } finally {
      await leave()
      await cluster.stop()
    }
  } finally {
    letGo()
  }
}
