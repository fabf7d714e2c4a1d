import type { Express } from 'express'
import { pino } from 'pino'
import { type MemoryPhotoStorage, memoryPhotoStorage } from '../../server/adapters/fakes/memory-photo-storage'
import { createApp } from '../../server/app'
import { type Config, readConfig } from '../../server/config'
import type { OpenDatabase } from '../../server/database/client'
import type { Services } from '../../server/services'

export interface TestApp {
  app: Express
  services: Services & { photoStorage: MemoryPhotoStorage }
}

const testConfig = (): Config =>
  readConfig({
    NODE_ENV: 'test',
    DATABASE_URL: 'postgres://nobody@127.0.0.1:1/none',
    SESSION_SECRET: 'a secret that only the tests know, long enough',
    LOG_LEVEL: 'silent',
  })

/** The whole server over a test database, with pictures in memory and a clock that stands where it is put. */
export function createTestApp({
  open,
  clock = () => new Date(),
  config = {},
}: {
  open: OpenDatabase
  clock?: () => Date
  config?: Partial<Config>
}): TestApp {
  const services = {
    config: { ...testConfig(), ...config },
    open,
    database: open.database,
    photoStorage: memoryPhotoStorage(),
    log: pino({ level: process.env['TEST_LOG'] ?? 'silent' }),
    clock,
  }
  return { app: createApp(services), services }
}
