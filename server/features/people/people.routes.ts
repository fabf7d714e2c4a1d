import type { Request, Router } from 'express'
import { accounts } from '@shared/endpoints/accounts'
import { guessLimit } from '../../http/rate-limit'
import { route } from '../../http/route'
import { beginSession } from '../../http/session-of-request'
import type { Services } from '../../services'
import { acceptInvitation, readInvitation } from './invitations.service'
import { changePerson, invitePerson, listPeople, renewInvitation } from './people.service'

export function peopleRoutes(router: Router, services: Services): void {
  const at = { router, services }
  const { database, clock, config } = services
  /** Where one-time links lead: the address people open. */
  const link = (request: Request) => ({
    now: clock(),
    address: config.publicUrl ?? `${request.protocol}://${request.get('host') ?? 'localhost'}`,
  })
  route(at, accounts.listPeople, async ({ companyId }) => ({ people: await listPeople(database, companyId) }))
  route(at, accounts.invitePerson, ({ companyId, body, request }) =>
    invitePerson(database, { companyId, ...body }, link(request)),
  )
  route(at, accounts.changePerson, ({ companyId, params, body }) =>
    changePerson(database, { companyId, id: params.personId }, { ...body, now: clock() }),
  )
  route(at, accounts.renewInvitation, ({ companyId, params, request }) =>
    renewInvitation(database, { companyId, id: params.personId }, link(request)),
  )
  route(
    at,
    accounts.readInvitation,
    ({ params }) => readInvitation(database, { token: params.token, now: clock() }),
    [guessLimit()],
  )
  route(
    at,
    accounts.acceptInvitation,
    async ({ params, body, request }) =>
      beginSession(request, await acceptInvitation(database, { ...params, ...body, now: clock() })),
    [guessLimit()],
  )
}
