import { expect } from 'vitest'
import { hardware } from '@shared/endpoints/hardware'
import { starterHardware } from '@shared/calculation/starter-hardware'
import type { Catalogue, CatalogueCable, CatalogueFitting } from '@shared/schemas/catalogue'
import { listHardware } from '../../../../server/features/hardware/hardware.service'
import type { EndpointCase, Told } from '../../../support/endpoint-cases'
import type { Scene } from '../../../support/scene'

const cable = { ...starterHardware.cables[0]!, id: 'ours', name: 'Ours' }
const fitting = { ...starterHardware.fittings[0]!, id: 'ours', name: 'Ours' }

const catalogueOf = ({ database }: Scene, { company }: Scene['here']) =>
  listHardware({ database, companyId: company.id })
const cablesHere = async (scene: Scene) =>
  (await catalogueOf(scene, scene.here)).cables.map((entry) => entry.cable.id)
const fittingsHere = async (scene: Scene) =>
  (await catalogueOf(scene, scene.here)).fittings.map((entry) => entry.fitting.id)
const cableHere = async (scene: Scene) => (await catalogueOf(scene, scene.here)).cables[0]!
const fittingHere = async (scene: Scene) => (await catalogueOf(scene, scene.here)).fittings[0]!

export const cases: EndpointCase[] = [
  {
    endpoint: hardware.listHardware,
    works: async ({ answer, scene }) => {
      expect(answer.body).toEqual(await catalogueOf(scene, scene.here))
      expect((answer.body as Catalogue).cables).toHaveLength(starterHardware.cables.length)
    },
    otherCompany: async ({ answer, scene }) => {
      const keys = [(await cableHere(scene)).key, (await fittingHere(scene)).key]
      for (const key of keys) expect(answer.text).not.toContain(key)
      expect(answer.body).toEqual(await catalogueOf(scene, scene.elsewhere))
    },
  },
  {
    endpoint: hardware.addCable,
    request: () => ({ body: cable }),
    works: async ({ answer, scene }) => {
      expect((answer.body as CatalogueCable).cable).toEqual(cable)
      expect(await cablesHere(scene)).toContain('ours')
    },
    otherCompany: async ({ answer, scene }: Told) => {
      expect(answer.status).toBe(201)
      expect(await cablesHere(scene)).not.toContain('ours')
    },
  },
  {
    endpoint: hardware.changeCable,
    request: async (scene) => {
      const entry = await cableHere(scene)
      return { params: { key: entry.key }, body: { ...entry.cable, name: 'Renamed' } }
    },
    works: async ({ answer, scene }) => {
      expect((answer.body as CatalogueCable).cable.name).toBe('Renamed')
      expect((await cableHere(scene)).cable.name).toBe('Renamed')
    },
    otherCompany: 'not found',
  },
  {
    endpoint: hardware.retireCable,
    request: async (scene) => ({ params: { key: (await cableHere(scene)).key }, body: { retired: true } }),
    works: async ({ answer, scene }) => {
      expect((answer.body as CatalogueCable).retired).toBe(true)
      expect((await cableHere(scene)).retired).toBe(true)
    },
    otherCompany: 'not found',
  },
  {
    endpoint: hardware.addFitting,
    request: () => ({ body: fitting }),
    works: async ({ answer, scene }) => {
      expect((answer.body as CatalogueFitting).fitting).toEqual(fitting)
      expect(await fittingsHere(scene)).toContain('ours')
    },
    otherCompany: async ({ answer, scene }: Told) => {
      expect(answer.status).toBe(201)
      expect(await fittingsHere(scene)).not.toContain('ours')
    },
  },
  {
    endpoint: hardware.changeFitting,
    request: async (scene) => {
      const entry = await fittingHere(scene)
      return { params: { key: entry.key }, body: { ...entry.fitting, name: 'Renamed' } }
    },
    works: async ({ answer, scene }) => {
      expect((answer.body as CatalogueFitting).fitting.name).toBe('Renamed')
      expect((await fittingHere(scene)).fitting.name).toBe('Renamed')
    },
    otherCompany: 'not found',
  },
  {
    endpoint: hardware.retireFitting,
    request: async (scene) => ({ params: { key: (await fittingHere(scene)).key }, body: { retired: true } }),
    works: async ({ answer, scene }) => {
      expect((answer.body as CatalogueFitting).retired).toBe(true)
      expect((await fittingHere(scene)).retired).toBe(true)
    },
    otherCompany: 'not found',
  },
]
