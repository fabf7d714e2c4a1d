import { expect } from 'vitest'
import { service } from '@shared/endpoints/service'
import type { EndpointCase } from '../../../support/endpoint-cases'

const otherCompany = { because: 'it tells nothing of any company' }

export const cases: EndpointCase[] = [
  {
    endpoint: service.health,
    works: ({ answer }) => {
      expect(answer.body).toEqual({ status: 'ok', database: 'ok' })
      expect(answer.headers['cache-control']).toBe('no-store')
    },
    otherCompany,
  },
  {
    endpoint: service.openapi,
    works: ({ answer }) => expect(answer.body).toMatchObject({ openapi: '3.1.0' }),
    otherCompany,
  },
]
