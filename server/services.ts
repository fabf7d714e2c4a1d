import type { Logger } from 'pino'
import type { PhotoStorage } from './adapters/photo-storage'
import type { Config } from './config'
import type { Database, OpenDatabase } from './database/client'

/** What handlers work with; made once at the start, or by a test. */
export interface Services {
  config: Config
  open: OpenDatabase
  database: Database
  photoStorage: PhotoStorage
  log: Logger
  clock: () => Date
}
