import { readFileSync } from 'node:fs'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { surveys } from '../../../../server/database/tables/surveys'
import {
  listHardware,
  retireCable,
  stockCompany,
} from '../../../../server/features/hardware/hardware.service'
import { exportSurveyFile } from '../../../../server/features/surveys/export-survey.service'
import { importSurvey } from '../../../../server/features/surveys/import-survey.service'
import { readHistory } from '../../../../server/features/surveys/surveys.service'
import { createJob, type JobRow } from '../../../factories/job'
import { createPerson, type PersonRow } from '../../../factories/person'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'

let test: TestDatabase
beforeAll(async () => {
  test = await openTestDatabase()
})
afterAll(() => test.close())

let person: PersonRow
let job: JobRow
const now = new Date('2026-05-14T10:00:00.000Z')

beforeEach(async () => {
  await test.reset()
  person = await createPerson(test.database, { name: 'Imre' })
  job = await createJob(test.database, { companyId: person.companyId })
  await stockCompany(person.companyId, test.database)
})

type File = Record<string, unknown> & { survey: Record<string, unknown> }
/** The worked example's file, without hardware and rules unless asked. */
function file(whole = false): File {
  const path = new URL('../../../worked-examples/in/two-bays.json', import.meta.url)
  const read = JSON.parse(readFileSync(path, 'utf8')) as File
  return whole ? read : { survey: read.survey }
}

const bringIn = (input: unknown) =>
  importSurvey(test.database, { companyId: person.companyId, jobId: job.id, person, input, now })

async function refusal(input: unknown) {
  const error: unknown = await bringIn(input).then(
    () => new Error('taken'),
    (reason: unknown) => reason,
  )
  expect(await test.database.select().from(surveys)).toEqual([])
  return error as {
    status: number
    code: string
    message: string
    fields: { path: string; message: string }[]
  }
}

describe('importing a survey file', () => {
  it('begins a survey with a history that says who brought it in', async () => {
    const { survey: record, notes } = await bringIn(file())
    expect(notes).toEqual([])
    expect(record.survey.bays[0]?.readings).toHaveLength(3)
    expect(record.survey.bays[0]?.readings[2]).toMatchObject({ struck: 'digits swapped' })
    const { entries } = await readHistory(
      test.database,
      { companyId: person.companyId, surveyId: record.id },
      { limit: 10 },
    )
    expect(entries.map(({ by, revision }) => [by, revision])).toEqual([['Imre', record.revision]])
  })

  it('lists every fault by path, value and expectation, and writes nothing', async () => {
    const input = file()
    const bays = input.survey['bays'] as Record<string, unknown>[]
    bays[0]!['to'] = 'P9'
    const posts = input.survey['posts'] as Record<string, unknown>[]
    posts[1]!['along'] = -3
    posts[2]!['colour'] = 'red'
    const { status, code, message, fields } = await refusal(input)
    expect([status, code]).toEqual([422, 'survey-file-invalid'])
    expect(message).toMatch(/4 faults and nothing was imported/)
    expect(fields).toEqual([
      { path: 'survey.posts[1].along', message: 'found -3, expected a number above 0' },
      { path: 'survey.posts[2].colour', message: expect.stringMatching(/unknown key/) as string },
      { path: 'survey.bays[0].to', message: 'found "P9", expected the id of a post of this survey' },
      {
        path: 'survey.runs[0].bays[1]',
        message: expect.stringMatching(/expected a bay that begins or ends at post/) as string,
      },
    ])
  })

  it('of a newer program says so', async () => {
    const input = file()
    input.survey['version'] = 99
    expect(await refusal(input)).toMatchObject({ status: 422, code: 'survey-too-new' })
  })

  it.each([null, [], 'text', {}, { survey: {} }, { survey: { units: { length: 'ft', force: 'lbf' } } }])(
    'refuses %j',
    async (input) => {
      expect(await refusal(input)).toMatchObject({ status: 422, code: 'survey-file-invalid' })
    },
  )

  it('says a single fault once, as a sentence', async () => {
    const input = file(true)
    input.survey['title'] = 3
    expect((await refusal(input)).message).toBe(
      'The survey file has a fault and nothing was imported. survey.title: found 3, expected text.',
    )
  })

  it('names the run and the cable that the company lacks', async () => {
    const input = file(true)
    const runs = input.survey['runs'] as Record<string, unknown>[]
    runs[0]!['cable'] = 'c999'
    delete input['hardware']
    expect(await refusal(input)).toMatchObject({
      code: 'cable-not-in-catalogue',
      message: expect.stringMatching(/Run R1 uses the cable c999/) as string,
    })
  })

  it('adds no hardware of the file and says so', async () => {
    const before = await listHardware({ database: test.database, companyId: person.companyId })
    const { notes } = await bringIn(file(true))
    expect(notes[0]).toBe('The file also lists hardware that your catalogue lacks: F1. It was not added.')
    expect(notes[1]).toMatch(/describes c532 otherwise/)
    expect(await listHardware({ database: test.database, companyId: person.companyId })).toEqual(before)
  })

  it('leaves pictures and their marks out and names them', async () => {
    const input = file()
    input.survey['photos'] = [{ id: 'F1', file: 'deck.jpg', posts: { P1: { base: [10, 20] } } }]
    const { survey: record, notes } = await bringIn(input)
    expect(record.survey.photos).toEqual([])
    expect(notes[0]).toMatch(/deck\.jpg are not in the file/)
  })

  it('into another company’s job finds no job', async () => {
    const other = await createJob(test.database)
    const request = { companyId: person.companyId, jobId: other.id, person, input: file(), now }
    await expect(importSurvey(test.database, request)).rejects.toMatchObject({ status: 404 })
  })
})

describe('exporting a survey file', () => {
  it('and importing it gives the same survey', async () => {
    const { survey: first } = await bringIn(file())
    const { file: written } = await exportSurveyFile(test.database, {
      companyId: person.companyId,
      surveyId: first.id,
    })
    const sent: unknown = JSON.parse(JSON.stringify(written))
    const { survey: second, notes } = await bringIn(sent)
    expect(notes).toEqual([])
    expect(second.survey).toEqual(first.survey)
  })

  it('holds what is offered, and retired cables only where a run uses them', async () => {
    const scope = { database: test.database, companyId: person.companyId }
    const { survey: record } = await bringIn(file())
    const { cables } = await listHardware(scope)
    for (const { key, cable } of cables) if (cable.id !== 'c18') await retireCable(scope, key, true)
    const key = { companyId: person.companyId, surveyId: record.id }
    const { file: written } = await exportSurveyFile(test.database, key)
    const { hardware } = written as { hardware: { cables: { id: string }[] } }
    expect(hardware.cables.map(({ id }) => id).sort()).toEqual(['c18', 'c532'])
  })
})
