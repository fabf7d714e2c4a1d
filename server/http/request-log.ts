import { randomUUID } from 'node:crypto'
import type { RequestHandler } from 'express'
import type { Logger } from 'pino'
import { pinoHttp } from 'pino-http'

/** One line per request, under an id that the answer carries too, so that a report of a fault leads to its line. */
export const requestLog = (log: Logger): RequestHandler =>
  pinoHttp({
    logger: log,
    genReqId: (_request, response) => {
      const id = randomUUID()
      response.setHeader('X-Request-Id', id)
      return id
    },
    // Watchers ask every few seconds.
    autoLogging: { ignore: (request) => request.url === '/api/health' },
  })
