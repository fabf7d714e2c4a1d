import type { Router } from 'express'
import { accounts } from '@shared/endpoints/accounts'
import { registerLimit } from '../../http/rate-limit'
import { route } from '../../http/route'
import { beginSession } from '../../http/session-of-request'
import type { Services } from '../../services'
import { changeCompany, readCompany, registerCompany } from './company.service'

export function companyRoutes(router: Router, services: Services): void {
  const at = { router, services }
  const { database } = services
  route(
    at,
    accounts.registerCompany,
    async ({ body, request }) => beginSession(request, await registerCompany(database, body)),
    [registerLimit()],
  )
  route(at, accounts.readCompany, ({ companyId }) => readCompany(database, companyId))
  route(at, accounts.changeCompany, ({ companyId, body }) => changeCompany(database, companyId, body))
}
