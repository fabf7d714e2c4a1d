import path from 'node:path'
import express, { type Express } from 'express'
import type { Config } from './config'
import type { OpenDatabase } from './database/client'

export interface Services {
  config: Config
  open: OpenDatabase
}

export function createApp({ config, open }: Services): Express {
  const app = express()
  app.disable('x-powered-by')
  app.get('/api/health', (_request, response, next) => {
    open.sql`select 1`.then(() => response.json({ status: 'ok', database: 'ok' }), next)
  })
  app.use(express.static(config.clientFolder))
  app.get(/^\/(?!api\/)/, (_request, response) => {
    response.sendFile(path.join(config.clientFolder, 'index.html'))
  })
  return app
}
