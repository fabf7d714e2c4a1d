import { randomUUID } from 'node:crypto'
import type { Request, RequestHandler, Response } from 'express'
import type { Logger } from 'pino'
import { pinoHttp } from 'pino-http'
import { loggablePath } from '../log'

/** Only what is named here is written: headers hold cookies, and what people look for is theirs alone. */
const serializers = {
  req: ({ id, method, originalUrl, ip }: Request & { id?: unknown }) => ({
    id,
    method,
    url: loggablePath(originalUrl),
    ip,
  }),
  res: ({ statusCode }: Response) => ({ statusCode }),
}

/** One line per request, under an id that the answer carries too, so that a report of a fault leads to its line. */
export const requestLog = (log: Logger): RequestHandler =>
  pinoHttp<Request, Response>({
    logger: log,
    wrapSerializers: false,
    serializers,
    genReqId: (_request, response) => {
      const id = randomUUID()
      response.setHeader('X-Request-Id', id)
      return id
    },
    // Watchers ask every few seconds.
    autoLogging: { ignore: (request) => request.url === '/api/health' },
  })
