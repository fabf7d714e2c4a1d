import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest'
import { irc2021 } from '@shared/calculation/guard-rules/irc'
import {
  addGuardRules,
  changeGuardRules,
  type GuardRulesScope,
  ownGuardRules,
  retireGuardRules,
} from '../../../../server/features/guard-rules/guard-rules.service'
import { createCompany } from '../../../factories/company'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'

let test: TestDatabase
let scope: GuardRulesScope
beforeAll(async () => {
  test = await openTestDatabase()
})
afterAll(() => test.close())
beforeEach(async () => {
  await test.reset()
  scope = { database: test.database, companyId: (await createCompany(test.database)).id }
})

const own = { ...irc2021, id: 'harbour-town', name: 'Harbour town' }

it('keeps own rules under an id of their own, which neither changes nor is taken twice', async () => {
  const { key } = await addGuardRules(scope, own)
  await expect(addGuardRules(scope, own)).rejects.toMatchObject({ status: 409, code: 'guard-rules-id-taken' })
  await expect(changeGuardRules(scope, key, { ...own, id: 'elsewhere' })).rejects.toMatchObject({
    status: 422,
    code: 'guard-rules-id-changed',
  })
  expect(await ownGuardRules(scope)).toEqual([own])
})

it('never lets own rules stand in the place of published ones', async () => {
  await expect(addGuardRules(scope, irc2021)).rejects.toMatchObject({ code: 'guard-rules-id-taken' })
})

it('checks surveys with retired rules too, since a survey may name them still', async () => {
  const { key } = await addGuardRules(scope, own)
  expect(await retireGuardRules(scope, key, true)).toMatchObject({ retired: true })
  expect(await ownGuardRules(scope)).toEqual([own])
})
