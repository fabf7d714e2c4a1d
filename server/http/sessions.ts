import type { RequestHandler } from 'express'
import session from 'express-session'
import type { Config } from '../config'
import type { Services } from '../services'
import { SESSION_DAYS, SessionStore } from './session-store'

export const cookieName = ({ secureCookies }: Config): string =>
  secureCookies ? '__Host-tautbook' : 'tautbook'

/** Sessions in the database and the person they are for on every request. */
export function sessions({ config, database, clock }: Services): RequestHandler[] {
  return [
    session({
      name: cookieName(config),
      secret: config.sessionSecret,
      store: new SessionStore(database, clock),
      resave: false,
      saveUninitialized: false,
      cookie: {
        httpOnly: true,
        sameSite: 'lax',
        secure: config.secureCookies,
        path: '/',
        maxAge: SESSION_DAYS * 24 * 3_600_000,
      },
    }),
    keepAlive(clock),
  ]
}

const HOUR = 3_600_000

/**
 * A session lives on with use, ours and the browser's cookie alike: it changes once an hour, is therefore written with
 * a later end, and the cookie is sent again.
 */
const keepAlive =
  (clock: () => Date): RequestHandler =>
  (request, _response, next) => {
    const hour = Math.floor(clock().getTime() / HOUR)
    if (request.user && request.session.usedInHour !== hour) request.session.usedInHour = hour
    next()
  }
