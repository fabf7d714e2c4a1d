import { expect } from 'vitest'
import { accounts } from '@shared/endpoints/accounts'
import { createPerson, testPassword } from '../../../factories/person'
import type { EndpointCase } from '../../../support/endpoint-cases'

export const cases: EndpointCase[] = [
  {
    endpoint: accounts.readSession,
    works: ({ answer }) => expect(answer.body).toMatchObject({ session: null }),
    otherCompany: ({ answer, scene }) =>
      expect(answer.body).toMatchObject({ session: { company: { id: scene.elsewhere.company.id } } }),
  },
  {
    endpoint: accounts.signIn,
    request: async ({ database, here }) => {
      const { email } = await createPerson(database, { companyId: here.company.id })
      return { body: { email, password: testPassword } }
    },
    works: ({ answer, scene }) =>
      expect(answer.body).toMatchObject({ company: { id: scene.here.company.id } }),
    otherCompany: { because: 'it takes only what the person knows' },
  },
  {
    endpoint: accounts.signOut,
    works: async ({ client }) => {
      const answer = await client.send(accounts.readSession)
      expect(answer.body).toMatchObject({ session: null })
    },
    otherCompany: { because: 'it ends the own session alone' },
  },
  {
    endpoint: accounts.changePassword,
    request: () => ({ body: { current: testPassword, next: 'forty feet of cable' } }),
    works: async ({ client, sent }) => {
      const again = await client.send(accounts.changePassword, sent)
      expect(again.body).toMatchObject({ code: 'wrong-password' })
    },
    otherCompany: { because: 'it changes the own password alone' },
  },
]
