import { randomUUID } from 'node:crypto'
import type { RequestHandler } from 'express'
import type { Logger } from 'pino'
import { loggablePath } from '../log'

/**
 * One line per request, written when it is over, under an id that the answer carries too, so that a report of a fault
 * leads to its line. Only what is named here is written: headers hold cookies, and what people send is theirs alone.
 */
export function requestLog(log: Logger): RequestHandler {
  // Nothing to hide in these lines, so nothing is looked for in them.
  const lines = log.child({}, { redact: [] })
  return (request, response, next) => {
    const began = performance.now()
    const id = randomUUID()
    response.setHeader('X-Request-Id', id)
    // Watchers ask every few seconds.
    if (request.path === '/api/health') return next()
    response.once('close', () => {
      lines.info(
        {
          id,
          method: request.method,
          path: loggablePath(request.originalUrl),
          status: response.statusCode,
          ms: Math.round(performance.now() - began),
          ip: request.ip,
          person: request.user?.id,
          ...(response.writableFinished ? {} : { broken: true }),
        },
        'request',
      )
    })
    next()
  }
}

/** The id of the request that this answers. */
export const requestId = (response: { getHeader: (name: string) => unknown }): unknown =>
  response.getHeader('X-Request-Id')
