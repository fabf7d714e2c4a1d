import { expect } from 'vitest'
import { starterRules } from '@shared/calculation/starter-rules'
import { hardware } from '@shared/endpoints/hardware'
import { readHouseRules } from '../../../../server/features/house-rules/house-rules.service'
import type { EndpointCase } from '../../../support/endpoint-cases'
import type { Scene } from '../../../support/scene'

const changed = { ...starterRules, reserve: 0.25 }
const rulesHere = ({ database, here }: Scene) => readHouseRules(database, here.company.id)

export const cases: EndpointCase[] = [
  {
    endpoint: hardware.readHouseRules,
    works: ({ answer }) => expect(answer.body).toEqual(starterRules),
    otherCompany: async ({ answer, scene }) => {
      expect(answer.body).toEqual(await readHouseRules(scene.database, scene.elsewhere.company.id))
    },
  },
  {
    endpoint: hardware.changeHouseRules,
    request: () => ({ body: changed }),
    works: async ({ answer, scene }) => {
      expect(answer.body).toEqual(changed)
      expect(await rulesHere(scene)).toEqual(changed)
    },
    otherCompany: async ({ answer, scene }) => {
      expect(answer.status).toBe(200)
      expect(await rulesHere(scene)).toEqual(starterRules)
    },
  },
]
