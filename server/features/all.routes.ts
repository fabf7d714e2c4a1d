import type { Router } from 'express'
import type { Services } from '../services'
import { companyRoutes } from './company/company.routes'
import { cutListRoutes } from './cut-list/cut-list.routes'
import { guardRulesRoutes } from './guard-rules/guard-rules.routes'
import { guardSummaryRoutes } from './guard-summary/guard-summary.routes'
import { hardwareRoutes } from './hardware/hardware.routes'
import { houseRulesRoutes } from './house-rules/house-rules.routes'
import { jobsRoutes } from './jobs/jobs.routes'
import { peopleRoutes } from './people/people.routes'
import { photosRoutes } from './photos/photos.routes'
import { serviceRoutes } from './service/service.routes'
import { sessionRoutes } from './session/session.routes'
import { surveysRoutes } from './surveys/surveys.routes'

/** Every feature's routes; a new feature adds its line here. */
export function featureRoutes(router: Router, services: Services): void {
  serviceRoutes(router, services)
  sessionRoutes(router, services)
  companyRoutes(router, services)
  peopleRoutes(router, services)
  jobsRoutes(router, services)
  surveysRoutes(router, services)
  photosRoutes(router, services)
  cutListRoutes(router, services)
  hardwareRoutes(router, services)
  guardRulesRoutes(router, services)
  guardSummaryRoutes(router, services)
  houseRulesRoutes(router, services)
}
