import { pino, type Logger } from 'pino'
import type { Config } from './config'

/** A one-time link is as good as a password until it is used, and a query may hold what people search for. */
export const loggablePath = (url: string): string =>
  url.replace(/\?.*$/, '').replace(/(\/(?:api\/)?invitations?\/)[^/]+/, '$1…')

/** Headers hold cookies, and what people look for is theirs alone. */
const dropped = ['req.headers', 'req.query', 'req.params', 'res.headers']

/** One line of JSON per event. Of a request it has method, path and sender; never headers, query or body. */
export function createLog({ logLevel }: Pick<Config, 'logLevel'>, to?: pino.DestinationStream): Logger {
  const options: pino.LoggerOptions = {
    level: logLevel,
    base: undefined,
    timestamp: pino.stdTimeFunctions.isoTime,
    formatters: { level: (label) => ({ level: label }) },
    redact: {
      paths: [...dropped, 'req.url'],
      censor: (value, [, field]) =>
        field === 'url' && typeof value === 'string' ? loggablePath(value) : undefined,
    },
  }
  return to ? pino(options, to) : pino(options)
}
