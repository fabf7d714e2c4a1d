import type { Request, Response } from 'express'
import type { Session } from '@shared/schemas/session'
import type { Config } from '../config'
import { asError } from '../errors'
import { csrfToken } from './csrf'
import { hashSessionId } from './session-store'
import { cookieName } from './sessions'
import type { SignedIn } from './signed-in'

export const sessionIdHash = (request: Request): string => hashSessionId(request.sessionID)

/** What a client is told of its session. */
export function presentSession(request: Request, person: SignedIn): Session {
  const { id, name, email, roles, lastSignIn, company } = person
  return {
    person: { id, name, email, roles, state: 'active', lastSignIn },
    company,
    csrfToken: csrfToken(request),
  }
}

/** Begins a new session, under a new id and with a new token, for a person who has just shown who they are. */
export async function beginSession(request: Request, person: SignedIn): Promise<Session> {
  // A new id, so that one planted before sign-in is worth nothing after it.
  await settled((done) => request.session.regenerate(done))
  request.session.person = { id: person.id, companyId: person.companyId }
  request.user = person
  const begun = presentSession(request, person)
  // Kept before the answer begins: whoever has the cookie may use it at once.
  await settled((done) => request.session.save(done))
  return begun
}

/** Ends the session on the server and in the browser. */
export async function endSession(request: Request, response: Response, config: Config): Promise<void> {
  await settled((done) => request.session.destroy(done))
  response.clearCookie(cookieName(config), {
    httpOnly: true,
    sameSite: 'lax',
    secure: config.secureCookies,
    path: '/',
  })
}

type Done = (error?: unknown) => void
const settled = (work: (done: Done) => unknown): Promise<void> =>
  new Promise((resolve, reject) => {
    work((error) => (error ? reject(asError(error)) : resolve()))
  })
