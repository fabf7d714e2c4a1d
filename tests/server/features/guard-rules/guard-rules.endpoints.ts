import { expect } from 'vitest'
import { irc2021 } from '@shared/calculation/guard-rules/irc'
import { hardware } from '@shared/endpoints/hardware'
import type { OwnGuardRules } from '@shared/schemas/catalogue'
import { addGuardRules, listGuardRules } from '../../../../server/features/guard-rules/guard-rules.service'
import type { EndpointCase } from '../../../support/endpoint-cases'
import type { Scene } from '../../../support/scene'

const ours = { ...irc2021, id: 'harbour-town', name: 'Harbour town' }
const scopeOf = ({ database }: Scene, { company }: Scene['here']) => ({ database, companyId: company.id })
const idsHere = async (scene: Scene) =>
  (await listGuardRules(scopeOf(scene, scene.here))).map(({ rules }) => rules.id)
const keptHere = async (scene: Scene) => (await listGuardRules(scopeOf(scene, scene.here)))[0]
/** The rules of the company here, made when first asked for. */
const kept = async (scene: Scene) =>
  (await keptHere(scene)) ?? addGuardRules(scopeOf(scene, scene.here), ours)

export const cases: EndpointCase[] = [
  {
    endpoint: hardware.listGuardRules,
    request: async (scene) => {
      await kept(scene)
      return {}
    },
    works: ({ answer }) => {
      expect((answer.body as OwnGuardRules[]).map(({ rules }) => rules)).toEqual([ours])
    },
    otherCompany: ({ answer }) => {
      expect(answer.body).toEqual([])
    },
  },
  {
    endpoint: hardware.addGuardRules,
    request: () => ({ body: ours }),
    works: async ({ answer, scene }) => {
      expect((answer.body as OwnGuardRules).rules).toEqual(ours)
      expect(await idsHere(scene)).toEqual(['harbour-town'])
    },
    otherCompany: async ({ answer, scene }) => {
      expect(answer.status).toBe(201)
      expect(await idsHere(scene)).toEqual([])
    },
  },
  {
    endpoint: hardware.changeGuardRules,
    request: async (scene) => ({
      params: { key: (await kept(scene)).key },
      body: { ...ours, name: 'Renamed' },
    }),
    works: async ({ answer, scene }) => {
      expect((answer.body as OwnGuardRules).rules.name).toBe('Renamed')
      expect((await keptHere(scene))?.rules.name).toBe('Renamed')
    },
    otherCompany: 'not found',
  },
  {
    endpoint: hardware.retireGuardRules,
    request: async (scene) => ({ params: { key: (await kept(scene)).key }, body: { retired: true } }),
    works: async ({ answer, scene }) => {
      expect((answer.body as OwnGuardRules).retired).toBe(true)
      expect((await keptHere(scene))?.retired).toBe(true)
    },
    otherCompany: 'not found',
  },
]
