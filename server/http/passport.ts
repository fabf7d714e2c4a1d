import type { Request } from 'express'
import passport from 'passport'
import './signed-in'

/**
 * The one passport of the server: whichever instance a request met last decides how its person is kept, so there must
 * not be two. The session holds whose it is; the session store has already read the person in the session's own query.
 */
export const serverPassport = new passport.Passport()
serverPassport.serializeUser((person, done) => done(null, { id: person.id, companyId: person.companyId }))
serverPassport.deserializeUser<unknown, Request>((request, _id, done) =>
  done(null, request.session.account ?? false),
)
