import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { starterRules } from '@shared/calculation/starter-rules'
import { inches } from '@shared/units/length'
import {
  addCable,
  addFitting,
  changeCable,
  changeFitting,
  hardwareFor,
  listHardware,
  retireCable,
  retireFitting,
  stockCompany,
} from '../../../../server/features/hardware/hardware.service'
import { changeHouseRules, readHouseRules } from '../../../../server/features/house-rules/house-rules.service'
import { createCompany } from '../../../factories/company'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'

let test: TestDatabase
let companyId: string
beforeAll(async () => {
  test = await openTestDatabase()
})
afterAll(() => test.close())
beforeEach(async () => {
  await test.reset()
  companyId = (await createCompany(test.database)).id
  await test.database.transaction((transaction) => stockCompany(companyId, transaction))
})
const scope = () => ({ database: test.database, companyId })
const [starterCable] = starterHardware.cables
const [starterFitting] = starterHardware.fittings
const cable = { ...starterCable!, id: 'c-new', name: 'Ours' }
const fitting = { ...starterFitting!, id: 'f-new', name: 'Ours', cables: ['c532'] }
const cableNamed = async (id: string) =>
  (await listHardware(scope())).cables.find((entry) => entry.cable.id === id)!
const fittingNamed = async (id: string) =>
  (await listHardware(scope())).fittings.find((entry) => entry.fitting.id === id)!

describe('a new company', () => {
  it('has the starter catalogue and rules, and nobody else’s', async () => {
    const { cables, fittings } = await listHardware(scope())
    const byId = (a: { id: string }, b: { id: string }) => a.id.localeCompare(b.id)
    expect(cables.map((entry) => entry.cable).sort(byId)).toEqual([...starterHardware.cables].sort(byId))
    expect(fittings.map((entry) => entry.fitting).sort(byId)).toEqual(
      [...starterHardware.fittings].sort(byId),
    )
    expect(await readHouseRules(test.database, companyId)).toEqual(starterRules)
    const other = await createCompany(test.database)
    expect(await listHardware({ ...scope(), companyId: other.id })).toEqual({ cables: [], fittings: [] })
  })
})

describe('an entry of the catalogue', () => {
  it('is added under an id of its own', async () => {
    expect((await addCable(scope(), cable)).cable).toEqual(cable)
    await expect(addCable(scope(), cable)).rejects.toMatchObject({ status: 409, code: 'cable-id-taken' })
    expect((await addFitting(scope(), fitting)).fitting).toEqual(fitting)
    await expect(addFitting(scope(), fitting)).rejects.toMatchObject({
      code: 'fitting-id-taken',
      fields: [{ path: 'id' }],
    })
  })

  it('may have the id that another company uses', async () => {
    const other = await createCompany(test.database)
    expect((await addCable({ ...scope(), companyId: other.id }, starterCable!)).cable.id).toBe(
      starterCable!.id,
    )
  })

  it('changes, but for its id', async () => {
    const { key } = await cableNamed('c532')
    const changed = { ...cable, id: 'c532', diameter: inches(0.2) }
    expect((await changeCable(scope(), key, changed)).cable).toEqual(changed)
    await expect(changeCable(scope(), key, cable)).rejects.toMatchObject({
      status: 422,
      code: 'cable-id-changed',
    })
    expect((await cableNamed('c532')).cable).toEqual(changed)
  })

  it('is retired and offered again', async () => {
    const { key } = await fittingNamed('sleeve-short')
    expect((await retireFitting(scope(), key, true)).retired).toBe(true)
    expect((await hardwareFor(scope(), new Set())).fittings.map(({ id }) => id)).not.toContain('sleeve-short')
    expect((await retireFitting(scope(), key, false)).retired).toBe(false)
    expect((await hardwareFor(scope(), new Set())).fittings.map(({ id }) => id)).toContain('sleeve-short')
  })

  it('of another company is not there', async () => {
    const { key } = await cableNamed('c532')
    const other = { ...scope(), companyId: (await createCompany(test.database)).id }
    await expect(retireCable(other, key, true)).rejects.toMatchObject({ status: 404 })
    await expect(changeCable(other, key, starterCable!)).rejects.toMatchObject({ status: 404 })
    expect((await cableNamed('c532')).retired).toBe(false)
  })
})

describe('a fitting', () => {
  it('takes only cables that the company has, retired ones too', async () => {
    await retireCable(scope(), (await cableNamed('c18')).key, true)
    expect((await addFitting(scope(), { ...fitting, cables: ['c18'] })).fitting.cables).toEqual(['c18'])
    const { key } = await fittingNamed('f-new')
    await expect(changeFitting(scope(), key, { ...fitting, cables: ['c18', 'c999'] })).rejects.toMatchObject({
      status: 422,
      code: 'fitting-cable-unknown',
      message: expect.stringMatching(/no cable c999/) as string,
    })
  })
})

describe('a retired cable', () => {
  it('is still there for a survey that names it', async () => {
    await retireCable(scope(), (await cableNamed('c532')).key, true)
    const ids = async (used: string[]) =>
      (await hardwareFor(scope(), new Set(used))).cables.map(({ id }) => id)
    expect(await ids([])).not.toContain('c532')
    expect(await ids(['c532'])).toContain('c532')
  })
})

describe('the house rules', () => {
  it('are replaced as a whole, for one company', async () => {
    const { tapeClass: _, ...rules } = { ...starterRules, reserve: 0.25 }
    await changeHouseRules(test.database, companyId, rules)
    expect(await readHouseRules(test.database, companyId)).toEqual(rules)
    const other = await createCompany(test.database)
    expect(await readHouseRules(test.database, other.id)).toEqual(starterRules)
  })
})
