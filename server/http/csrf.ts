import { randomBytes, timingSafeEqual } from 'node:crypto'
import type { Request, RequestHandler } from 'express'
import type { Config } from '../config'
import { AppError } from '../errors'

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS'])
const HEADER = 'x-csrf-token'

/** The session's token, made the first time it is asked for. */
export function csrfToken(request: Request): string {
  request.session.csrf ??= randomBytes(24).toString('base64url')
  return request.session.csrf
}

/**
 * Requests that change something must come from our own pages: the browser's Origin, where it sends one, is ours, and
 * the header carries the session's token (synchroniser token pattern).
 */
export function protectFromForgery({ publicUrl }: Pick<Config, 'publicUrl'>): RequestHandler {
  const publicHost = publicUrl === undefined ? undefined : hostOf(publicUrl)
  return (request, _response, next) => {
    if (SAFE.has(request.method)) return next()
    const origin = request.get('origin')
    if (origin !== undefined && ![publicHost, request.get('host')].includes(hostOf(origin))) {
      throw forged(`origin ${origin} for host ${request.get('host') ?? ''}`)
    }
    const expected = request.session.csrf
    const given = request.get(HEADER)
    if (expected === undefined || given === undefined || !same(expected, given)) throw forged('token')
    next()
  }
}

const forged = (log: string) =>
  new AppError(403, 'stale-page', 'This page is out of date. Reload it and try again; nothing was changed.', {
    log,
  })

const hostOf = (origin: string): string => (URL.canParse(origin) ? new URL(origin).host : '')

function same(a: string, b: string): boolean {
  const [left, right] = [Buffer.from(a), Buffer.from(b)]
  return left.length === right.length && timingSafeEqual(left, right)
}
