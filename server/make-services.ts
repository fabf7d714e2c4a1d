import { pino } from 'pino'
import { folderPhotoStorage } from './adapters/photo-storage'
import type { Config } from './config'
import type { OpenDatabase } from './database/client'
import type { Services } from './services'

/** What never reaches a log: whoever reads logs must not be able to sign in with them. */
const secrets = [
  'req.headers.cookie',
  'req.headers.authorization',
  'req.headers["x-csrf-token"]',
  'res.headers["set-cookie"]',
]

/** One-time links carry their token in the address. */
const withoutToken = (url: string): string => url.replace(/(\/invit(?:e|ations)\/)[^/?#]+/, '$1[token]')

/** The real services of a running server. */
export function makeServices(config: Config, open: OpenDatabase): Services {
  const log = pino({
    level: config.logLevel,
    redact: { paths: secrets, censor: '[secret]' },
    serializers: {
      req: (request: { id: unknown; method: string; url: string; remoteAddress: string }) => ({
        id: request.id,
        method: request.method,
        url: withoutToken(request.url),
        remoteAddress: request.remoteAddress,
      }),
      res: (response: { statusCode: number }) => ({ statusCode: response.statusCode }),
    },
  })
  return {
    config,
    open,
    database: open.database,
    photoStorage: folderPhotoStorage(config.photoFolder),
    log,
    clock: () => new Date(),
  }
}
