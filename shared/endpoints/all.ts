import { accounts } from './accounts'
import type { Endpoint } from './endpoint'
import { hardware } from './hardware'
import { jobs } from './jobs'
import { service } from './service'
import { surveys } from './surveys'

/** Every endpoint, for the OpenAPI description and the test that no route goes untested. */
export const allEndpoints: Endpoint[] = [service, accounts, jobs, surveys, hardware].flatMap(
  (group) => Object.values(group) as Endpoint[],
)
