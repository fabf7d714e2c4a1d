import { expect } from 'vitest'
import { accounts } from '@shared/endpoints/accounts'
import type { EndpointCase, Told } from '../../../support/endpoint-cases'

let registered = 0

const theirs = ({ answer, scene }: Told) =>
  expect(answer.body).toMatchObject({ id: scene.elsewhere.company.id })

export const cases: EndpointCase[] = [
  {
    endpoint: accounts.registerCompany,
    request: () => ({
      body: {
        company: 'Fernhollow Guards',
        units: { length: 'mm', force: 'N' },
        name: 'Edda Marlow',
        email: `edda-${(registered += 1)}@example.com`,
        password: 'tide table of june',
      },
    }),
    works: ({ answer }) =>
      expect(answer.body).toMatchObject({
        person: { name: 'Edda Marlow', roles: ['owner'], state: 'active' },
        company: { name: 'Fernhollow Guards', units: { length: 'mm', force: 'N' } },
      }),
    otherCompany: { because: 'it makes a new company' },
  },
  {
    endpoint: accounts.readCompany,
    works: ({ answer, scene }) => expect(answer.body).toMatchObject({ id: scene.here.company.id }),
    otherCompany: theirs,
  },
  {
    endpoint: accounts.changeCompany,
    request: () => ({ body: { fraction: 32, keepPhotoPlace: true } }),
    works: ({ answer, scene }) =>
      expect(answer.body).toMatchObject({
        name: scene.here.company.name,
        fraction: 32,
        keepPhotoPlace: true,
      }),
    otherCompany: async (told) => {
      theirs(told)
      const owner = await told.scene.here.as('owner')
      expect((await owner.send(accounts.readCompany)).body).toMatchObject({ fraction: 16 })
    },
  },
]
