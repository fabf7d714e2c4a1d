import { folderPhotoStorage } from './adapters/photo-storage'
import { createApp } from './app'
import { ConfigError, readConfig, type Config } from './config'
import { openDatabase, type OpenDatabase } from './database/client'
import { demoSignInLines } from './database/demo-sign-ins'
import { explainDatabaseFailure } from './database/explain-failure'
import { migrateDatabase } from './database/migrate'
import { seedDemo } from './database/seed/seed-demo'
import { explainListenFailure, listen } from './listen'
import { createLog } from './log'
import type { Services } from './services'

const say = (text: string): boolean => process.stdout.write(`${text}\n`)

/** The server from first to last: database to its present shape, demo the first time, listen, close when told. */
async function run(config: Config): Promise<void> {
  await migrateDatabase({ url: config.databaseUrl, folder: config.migrationsFolder })
  const open = openDatabase({ url: config.databaseUrl })
  try {
    const services = makeServices(config, open)
    if (config.demo) await seedDemo({ ...services, folder: config.demoFolder })
    const listening = await listen(createApp(services), config)
    try {
      greet(config.publicUrl ?? listening.address, config.demo ? await demoSignInLines(open) : [])
      await untilTold()
    } finally {
      await listening.close()
    }
  } finally {
    await open.close()
  }
}

const makeServices = (config: Config, open: OpenDatabase): Services => ({
  config,
  open,
  database: open.database,
  photoStorage: folderPhotoStorage(config.photoFolder),
  log: createLog(config),
  clock: () => new Date(),
})

function greet(address: string, signIns: string[]): void {
  say(`Tautbook is ready at ${address}`)
  if (signIns.length > 0) say(['Sign in to the demo company as', ...signIns].join('\n'))
}

/** Resolves at the first SIGINT or SIGTERM, or when the program that started this one is gone. */
function untilTold(): Promise<void> {
  return new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => resolve())
    if (process.connected) process.on('disconnect', () => resolve())
  })
}

const fileSentences: Record<string, (place: string) => string> = {
  ENOSPC: (place) => `The disk that holds ${place} is full: free about 500 MB there, then start again.`,
  EACCES: (place) => `This user may not use ${place}: allow it, or name another folder with TAUTBOOK_DATA.`,
  EROFS: (place) => `${place} cannot be written: name another folder with TAUTBOOK_DATA.`,
}

function explainFileFailure(error: unknown): string | undefined {
  const { code = '', path: place } = error as NodeJS.ErrnoException
  return place === undefined ? undefined : fileSentences[code]?.(place)
}

/** Failures that somebody can mend get a sentence; anything else is a fault of ours and keeps its stack. */
function explain(error: unknown, config: Config): string {
  return (
    explainDatabaseFailure(error, config.databaseUrl) ??
    explainListenFailure(error, config) ??
    explainFileFailure(error) ??
    (error instanceof Error ? (error.stack ?? error.message) : String(error))
  )
}

async function main(): Promise<number> {
  let config: Config
  try {
    config = readConfig(process.env)
  } catch (error) {
    if (!(error instanceof ConfigError)) throw error
    for (const fault of error.faults) process.stderr.write(`${fault}\n`)
    return 1
  }
  try {
    await run(config)
    return 0
  } catch (error) {
    process.stderr.write(`${explain(error, config)}\n`)
    return 1
  }
}

process.exit(await main())
