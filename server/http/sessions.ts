import type { RequestHandler } from 'express'
import session from 'express-session'
import type { Config } from '../config'
import type { Services } from '../services'
import { serverPassport } from './passport'
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
      // The browser’s copy lives on with use as ours does.
      rolling: true,
      cookie: {
        httpOnly: true,
        sameSite: 'lax',
        secure: config.secureCookies,
        path: '/',
        maxAge: SESSION_DAYS * 24 * 3_600_000,
      },
    }),
    serverPassport.session() as RequestHandler,
  ]
}
