import type { Router } from 'express'
import { accounts } from '@shared/endpoints/accounts'
import { csrfToken } from '../../http/csrf'
import { emailLimit, guessLimit } from '../../http/rate-limit'
import { route } from '../../http/route'
import { beginSession, endSession, presentSession, sessionIdHash } from '../../http/session-of-request'
import { signInWithPassword } from '../../http/sign-in'
import type { Services } from '../../services'
import { changePassword, checkPassword } from './session.service'

export function sessionRoutes(router: Router, services: Services): void {
  const at = { router, services }
  const { database, clock } = services
  route(at, accounts.readSession, async ({ request }) => {
    const session = request.user ? presentSession(request, request.user) : null
    return Promise.resolve({ session, csrfToken: csrfToken(request) })
  })
  route(
    at,
    accounts.signIn,
    async ({ request, response }) => {
      const person = await signInWithPassword({ request, response }, (email, password) =>
        checkPassword(database, { email, password, now: clock() }),
      )
      return beginSession(request, person)
    },
    [guessLimit(), emailLimit()],
  )
  route(at, accounts.signOut, async ({ request, response }) => {
    await endSession(request, response, services.config)
    return undefined
  })
  route(
    at,
    accounts.changePassword,
    async ({ person, body, request }) => {
      await changePassword(database, { person, ...body, keepSession: sessionIdHash(request) })
      return undefined
    },
    [guessLimit()],
  )
}
