import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { accounts } from '@shared/endpoints/accounts'
import { hardware } from '@shared/endpoints/hardware'
import { starterHardware } from '@shared/calculation/starter-hardware'
import type { Catalogue } from '@shared/schemas/catalogue'
import { companies } from '../../../../server/database/tables/companies'
import { createPerson } from '../../../factories/person'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'
import { visitor } from '../../../support/client'
import { createTestApp, type TestApp } from '../../../support/test-app'

let open: TestDatabase
let test: TestApp
beforeAll(async () => {
  open = await openTestDatabase()
})
beforeEach(async () => {
  await open.reset()
  test = createTestApp({ open })
})
afterAll(() => open.close())

const registration = {
  company: ' Fernhollow Guards ',
  units: { length: 'in', force: 'lbf' },
  name: 'Edda Marlow',
  email: 'Edda@Example.com',
  password: 'tide table of june',
}

describe('registering a company', () => {
  it('signs its owner in and stocks it with the starter hardware', async () => {
    const client = visitor(test.app)
    const answer = await client.send(accounts.registerCompany, { body: registration })
    expect(answer.body).toMatchObject({
      company: { name: 'Fernhollow Guards', fraction: 16, keepPhotoPlace: false },
      person: { email: 'edda@example.com', roles: ['owner'] },
    })
    const { cables, fittings } = (await client.send(hardware.listHardware)).body as Catalogue
    expect(cables.map(({ cable }) => cable.id).sort()).toEqual(
      starterHardware.cables.map(({ id }) => id).sort(),
    )
    expect(fittings).toHaveLength(starterHardware.fittings.length)
  })

  it('leaves nothing behind when the address signs in already', async () => {
    await createPerson(open.database, { email: 'edda@example.com' })
    const before = await open.database.select().from(companies)
    const answer = await visitor(test.app).send(accounts.registerCompany, { body: registration })
    expect(answer.body).toMatchObject({ status: 409, code: 'email-taken', fields: [{ path: 'email' }] })
    expect(await open.database.select().from(companies)).toEqual(before)
  })

  it('says at each field what is wrong', async () => {
    const answer = await visitor(test.app).send(accounts.registerCompany, {
      body: { ...registration, email: 'edda', password: 'å'.repeat(40) },
    })
    expect(answer.body).toMatchObject({
      status: 400,
      code: 'not-valid',
      fields: [
        { path: 'email' },
        { path: 'password', message: expect.stringContaining('72 bytes') as string },
      ],
    })
  })

  it('is not without limit from one address', async () => {
    const client = visitor(test.app)
    const statuses: number[] = []
    for (let i = 0; i < 31; i += 1) {
      statuses.push((await client.send(accounts.registerCompany, { body: {} })).status)
    }
    expect(statuses.slice(0, 30)).toEqual(Array<number>(30).fill(400))
    expect(statuses[30]).toBe(429)
  })
})
