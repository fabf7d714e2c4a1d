import type { Router } from 'express'
import { hardware } from '@shared/endpoints/hardware'
import { route } from '../../http/route'
import type { Services } from '../../services'
import {
  addGuardRules,
  changeGuardRules,
  type GuardRulesScope,
  listGuardRules,
  retireGuardRules,
} from './guard-rules.service'

export function guardRulesRoutes(router: Router, services: Services): void {
  const at = { router, services }
  const scope = ({ companyId }: { companyId: string }): GuardRulesScope => ({
    database: services.database,
    companyId,
  })
  route(at, hardware.listGuardRules, (call) => listGuardRules(scope(call)))
  route(at, hardware.addGuardRules, (call) => addGuardRules(scope(call), call.body))
  route(at, hardware.changeGuardRules, (call) => changeGuardRules(scope(call), call.params.key, call.body))
  route(at, hardware.retireGuardRules, (call) =>
    retireGuardRules(scope(call), call.params.key, call.body.retired),
  )
}
