import type { Router } from 'express'
import { hardware } from '@shared/endpoints/hardware'
import { route } from '../../http/route'
import type { Services } from '../../services'
import { changeHouseRules, readHouseRules } from './house-rules.service'

export function houseRulesRoutes(router: Router, services: Services): void {
  const at = { router, services }
  route(at, hardware.readHouseRules, ({ companyId }) => readHouseRules(services.database, companyId))
  route(at, hardware.changeHouseRules, ({ companyId, body }) =>
    changeHouseRules(services.database, companyId, body),
  )
}
