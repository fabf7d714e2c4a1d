import type { Request, Response } from 'express'
import passport from 'passport'
import { Strategy } from 'passport-local'
import { AppError, asError } from '../errors'
import type { SignedIn } from './signed-in'

const wrong = () =>
  new AppError(401, 'wrong-sign-in', 'E-mail address or password is not right. Check both and try again.')

/** Signs in by e-mail address and password. @throws AppError 401 `wrong-sign-in`, the same whichever was wrong. */
export function signInWithPassword(
  { request, response }: { request: Request; response: Response },
  check: (email: string, password: string) => Promise<SignedIn | undefined>,
): Promise<SignedIn> {
  const strategy = new Strategy(
    { usernameField: 'email', passwordField: 'password' },
    (email, password, done) => {
      check(email, password).then((person) => done(null, person ?? false), done)
    },
  )
  return new Promise((resolve, reject) => {
    const answer = (error: unknown, person?: SignedIn | false) => {
      if (error) reject(asError(error))
      else if (person) resolve(person)
      else reject(wrong())
    }
    const authenticate = passport.authenticate(strategy, { session: false }, answer) as (
      request: Request,
      response: Response,
      next: (error?: unknown) => void,
    ) => void
    authenticate(request, response, answer)
  })
}
