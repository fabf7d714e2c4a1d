import { holdDataFolder, openDataFolder, sessionSecret } from './data-folder.mjs'
import { openKeptCluster } from './kept-cluster.mjs'
import { goOn } from './run-command.mjs'

/** What the server is given beside what is in the environment already. */
const environmentFor = ({ settings, url }) => ({
  ...process.env,
  HOST: settings.host,
  PORT: String(settings.port),
  DATABASE_URL: url,
  TAUTBOOK_DATA: settings.dataFolder,
  SESSION_SECRET: process.env.SESSION_SECRET || sessionSecret(settings.dataFolder),
})

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
    try {
      goOn()
      return await work(environmentFor({ settings, url: cluster.url }))
    } finally {
      await cluster.stop()
    }
  } finally {
    letGo()
  }
}
