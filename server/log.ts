import { pino, type Logger } from 'pino'
import type { Config } from './config'

/** A one-time link is as good as a password until it is used, and a query may hold what people search for. */
export const loggablePath = (url: string): string =>
  url.replace(/\?.*$/, '').replace(/(\/(?:api\/)?(?:invite|invitations?)\/)[^/]+/, '$1…')

/** What lets somebody in; nobody means to write it, and it is not written even where somebody does. */
const secrets = [
  'password',
  'current',
  'next',
  'token',
  'csrf',
  'csrfToken',
  'cookie',
  'authorization',
  'headers',
]

/** One line of JSON per event. What a request's line has is said in `http/request-log.ts`. */
export function createLog({ logLevel }: Pick<Config, 'logLevel'>, to?: pino.DestinationStream): Logger {
  const options: pino.LoggerOptions = {
    level: logLevel,
    base: undefined,
    timestamp: pino.stdTimeFunctions.isoTime,
    formatters: { level: (label) => ({ level: label }) },
    redact: {
      paths: secrets.flatMap((name) => [name, `*.${name}`]),
      censor: '…',
    },
  }
  return to ? pino(options, to) : pino(options)
}
