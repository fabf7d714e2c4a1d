import type { RequestHandler } from 'express'
import { ipKeyGenerator, rateLimit } from 'express-rate-limit'
import { AppError } from '../errors'

const MINUTE = 60_000

const tooMany = (wait: string): AppError =>
  new AppError(429, 'too-many-requests', `Too many tries from here. Wait ${wait} and try again.`)

/** For everything: far above what a person does, low enough to stop a runaway script. */
export const generalLimit = (requestsPerMinute: number): RequestHandler =>
  rateLimit({
    windowMs: MINUTE,
    limit: requestsPerMinute,
    standardHeaders: 'draft-7',
    legacyHeaders: false,
    handler: (_request, _response, next) => next(tooMany('a minute')),
  })

/** For guessing: sign-ins and one-time links, per address. Answers below 400 do not count. */
export const guessLimit = (): RequestHandler =>
  rateLimit({
    windowMs: 15 * MINUTE,
    limit: 30,
    standardHeaders: 'draft-7',
    legacyHeaders: false,
    skipSuccessfulRequests: true,
    handler: (_request, _response, next) => next(tooMany('15 minutes')),
  })

/** For companies: each costs a password hash and rows that stay, so those that succeed count too. */
export const registerLimit = (): RequestHandler =>
  rateLimit({
    windowMs: 60 * MINUTE,
    limit: 30,
    standardHeaders: 'draft-7',
    legacyHeaders: false,
    handler: (_request, _response, next) => next(tooMany('an hour')),
  })

/** For guessing one person's password from many addresses. */
export const emailLimit = (): RequestHandler =>
  rateLimit({
    windowMs: 15 * MINUTE,
    limit: 10,
    standardHeaders: false,
    legacyHeaders: false,
    skipSuccessfulRequests: true,
    keyGenerator: (request) => {
      const { email } = (request.body ?? {}) as { email?: unknown }
      return typeof email === 'string' ? email.trim().toLowerCase() : ipKeyGenerator(request.ip ?? '')
    },
    handler: (_request, _response, next) => next(tooMany('15 minutes')),
  })
