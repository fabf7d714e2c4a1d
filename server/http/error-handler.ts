import type { ErrorRequestHandler, RequestHandler } from 'express'
import { MulterError } from 'multer'
import type { Logger } from 'pino'
import type { Problem } from '@shared/schemas/problem'
import { AppError, notFound } from '../errors'
import { loggablePath } from '../log'
import { requestId } from './request-log'

/** The one writer of refusals: problem+json for people and programs, the rest for the log. */
export function errorHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    const known = asAppError(error)
    const entry = {
      id: requestId(response),
      code: known.code,
      status: known.status,
      method: request.method,
      path: loggablePath(request.originalUrl),
      detail: known.log,
    }
    if (known.status >= 500) log.error({ ...entry, err: error }, 'request failed')
    else log.info(entry, 'request refused')
    if (response.headersSent) return next(error)
    const problem: Problem = {
      type: `urn:tautbook:problem:${known.code}`,
      title: known.code.replaceAll('-', ' '),
      status: known.status,
      code: known.code,
      detail: known.message,
      ...(known.fields ? { fields: known.fields } : {}),
    }
    response.status(known.status).type('application/problem+json').send(JSON.stringify(problem))
  }
}

/** Whatever no route took. */
export const nothingHere: RequestHandler = (_request, _response, next) => next(notFound('address'))

function asAppError(error: unknown): AppError {
  if (error instanceof AppError) return error
  if (error instanceof MulterError) {
    return new AppError(
      400,
      'upload-not-read',
      `The upload could not be read (${error.message}). Choose the file again.`,
    )
  }
  const { type, status } = (error ?? {}) as { type?: unknown; status?: unknown }
  // What Express's own body parser refuses.
  if (type === 'entity.too.large') {
    return new AppError(413, 'too-large', 'This is larger than the server takes (2 MB). Send less at a time.')
  }
  if (type === 'entity.parse.failed') {
    return new AppError(
      400,
      'not-json',
      'The request is not readable as JSON. Check the file and send it again.',
    )
  }
  // A file of the client that is not there.
  if (status === 404) return notFound('file')
  if (typeof status === 'number' && status >= 400 && status < 500) {
    return new AppError(status, 'not-valid', 'The server could not read this request. Try again.', {
      cause: error,
    })
  }
  return new AppError(
    500,
    'failed',
    'Something went wrong on our side. What you sent was not saved; try again.',
    {
      cause: error,
    },
  )
}
