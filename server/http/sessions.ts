import type { Request, RequestHandler } from 'express'
import session from 'express-session'
import passport from 'passport'
import type { Config } from '../config'
import type { Services } from '../services'
import { SESSION_DAYS, SessionStore } from './session-store'
import './signed-in'

export const cookieName = ({ secureCookies }: Config): string =>
  secureCookies ? '__Host-tautbook' : 'tautbook'

/** Sessions in the database and the person they are for on every request. */
export function sessions({ config, database, clock }: Services): RequestHandler[] {
  const signIn = new passport.Passport()
  signIn.serializeUser((person, done) => done(null, { id: person.id, companyId: person.companyId }))
  // The session store has already read the person in the session's own query.
  signIn.deserializeUser<unknown, Request>((request, _id, done) =>
    done(null, request.session.account ?? false),
  )
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
    signIn.session() as RequestHandler,
  ]
}
