import { expect } from 'vitest'
import { accounts } from '@shared/endpoints/accounts'
import type { Person } from '@shared/schemas/person'
import { createPerson } from '../../../factories/person'
import type { EndpointCase } from '../../../support/endpoint-cases'
import type { Scene } from '../../../support/scene'

let invited = 0

const personHere = async ({ database, here }: Scene) => ({
  personId: (await createPerson(database, { companyId: here.company.id, name: 'Wren Tillotson' })).id,
})

/** A link as an owner hands it over; its last part is the token. */
async function tokenHere(scene: Scene): Promise<{ token: string }> {
  const owner = await scene.here.as('owner')
  const answer = await owner.send(accounts.invitePerson, { body: newcomer() })
  return { token: (answer.body as { link: string }).link.replace(/.*\//, '') }
}

const newcomer = () => ({
  name: 'Wren Tillotson',
  email: `wren-${(invited += 1)}@example.com`,
  roles: ['shop', 'fitter'],
})

export const cases: EndpointCase[] = [
  {
    endpoint: accounts.listPeople,
    request: async (scene) => {
      await personHere(scene)
      return {}
    },
    works: ({ answer }) =>
      expect((answer.body as { people: Person[] }).people.map(({ name }) => name)).toContain(
        'Wren Tillotson',
      ),
    otherCompany: async ({ answer, scene }) => {
      const { id } = await scene.elsewhere.person('owner')
      expect((answer.body as { people: Person[] }).people.map((each) => each.id)).toEqual([id])
    },
  },
  {
    endpoint: accounts.invitePerson,
    request: () => ({ body: newcomer() }),
    works: ({ answer }) =>
      expect(answer.body).toMatchObject({ person: { state: 'invited', roles: ['shop', 'fitter'] } }),
    otherCompany: async ({ scene }) => {
      const owner = await scene.here.as('owner')
      const answer = await owner.send(accounts.listPeople)
      expect((answer.body as { people: Person[] }).people.map(({ state }) => state)).toEqual(['active'])
    },
  },
  {
    endpoint: accounts.changePerson,
    request: async (scene) => ({ params: await personHere(scene), body: { roles: ['estimator'] } }),
    works: ({ answer }) =>
      expect(answer.body).toMatchObject({ name: 'Wren Tillotson', roles: ['estimator'], state: 'active' }),
    otherCompany: 'not found',
  },
  {
    endpoint: accounts.renewInvitation,
    request: async (scene) => ({ params: await personHere(scene) }),
    works: ({ answer }) => expect((answer.body as { link: string }).link).toMatch(/\/invite\/[\w-]{43}$/),
    otherCompany: 'not found',
  },
  {
    endpoint: accounts.readInvitation,
    request: async (scene) => ({ params: await tokenHere(scene) }),
    works: ({ answer, scene }) =>
      expect(answer.body).toMatchObject({ company: scene.here.company.name, name: 'Wren Tillotson' }),
    otherCompany: { because: 'whoever holds the link is meant' },
  },
  {
    endpoint: accounts.acceptInvitation,
    request: async (scene) => ({
      params: await tokenHere(scene),
      body: { password: 'nine coils of twine' },
    }),
    works: async ({ answer, client, sent, scene }) => {
      expect(answer.body).toMatchObject({
        person: { name: 'Wren Tillotson', state: 'active' },
        company: { id: scene.here.company.id },
      })
      const again = await client.send(accounts.acceptInvitation, sent)
      expect(again.body).toMatchObject({ code: 'link-used-up' })
    },
    otherCompany: { because: 'whoever holds the link is meant' },
  },
]
