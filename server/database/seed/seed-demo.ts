import { randomUUID } from 'node:crypto'
import { sql } from 'drizzle-orm'
import type { PhotoStorage } from '../../adapters/photo-storage'
import { addPhoto } from '../../features/photos/photos.service'
import { stockCompany } from '../../features/hardware/hardware.service'
import { changeSurvey } from '../../features/surveys/change-survey.service'
import { createSurvey } from '../../features/surveys/surveys.service'
import type { Database } from '../client'
import { companies } from '../tables/companies'
import { demoCompany, type DemoJob, demoJobs, type DemoPicture } from './demo-company'
import { type DemoPeople, insertDemoCompany, insertDemoJob } from './demo-rows'
import { demoVisit, type DemoVisit } from './demo-survey'
import { readDemoPicture, readDemoTruth } from './demo-truth'

export interface SeedDeps {
  database: Database
  photoStorage: PhotoStorage
  clock: () => Date
  /** Where the demo’s pictures lie. */
  folder: string
}

/** The visit to the ridge deck ended at the fifth bay, before the last post’s material was noted. */
const unfinished: Partial<Record<DemoPicture, DemoVisit['stoppedAt']>> = {
  'ridge-deck': { bay: 5, post: 'E2' },
}

const DEMO_CABLE = 'c532'
/** Any number of our own: of two servers started at once, the second waits and finds the demo there. */
const SEED_LOCK = 460_047

/** Loads the demo company into a database without companies, whole or not at all. Answers whether it did. */
export async function seedDemo(deps: SeedDeps): Promise<boolean> {
  return deps.database.transaction(async (transaction) => {
    await transaction.execute(sql`select pg_advisory_xact_lock(${SEED_LOCK})`)
    const [present] = await transaction.select({ id: companies.id }).from(companies).limit(1)
    if (present) return false
    const people = await insertDemoCompany(transaction)
    await stockCompany(people.companyId, transaction)
    for (const [i, job] of demoJobs.entries()) {
      await seedJob({ ...deps, database: transaction }, { people, job, number: i + 1 })
    }
    return true
  })
}

interface JobSeed {
  people: DemoPeople
  job: DemoJob
  number: number
}

async function seedJob(deps: SeedDeps, { people, job, number }: JobSeed): Promise<void> {
  const jobId = await insertDemoJob(deps.database, {
    people,
    job,
    number,
    // The oldest job first, two days apart, so that the list has an order.
    createdAt: daysFrom(deps.clock(), 2 * (number - demoJobs.length) - 1),
    due: job.dueIn === null ? null : daysFrom(deps.clock(), job.dueIn).toISOString().slice(0, 10),
  })
  if (job.survey) await seedSurvey(deps, { ...job.survey, people, jobId })
}

async function seedSurvey(
  deps: SeedDeps,
  {
    people,
    jobId,
    title,
    picture,
  }: { people: DemoPeople; jobId: string; title: string; picture: DemoPicture },
): Promise<void> {
  const { companyId } = people
  const units = demoCompany.units
  const survey = await createSurvey(deps.database, { companyId, jobId, title, units })
  const name = `${picture}.jpg`
  const bytes = await readDemoPicture(deps.folder, picture)
  const photo = await addPhoto(deps, {
    companyId,
    surveyId: survey.id,
    file: { bytes, name, mediaType: 'image/jpeg' },
    keepPlace: false,
  })
  const operations = demoVisit({
    truth: await readDemoTruth(deps.folder, picture),
    photo: { id: photo.surveyPhotoId, file: name },
    stoppedAt: unfinished[picture],
    cable: DEMO_CABLE,
  })
  await changeSurvey(deps.database, {
    survey: { companyId, surveyId: survey.id },
    person: { ...people.surveyor, roles: ['surveyor'] },
    revision: survey.revision,
    changes: operations.map((operation) => ({ id: randomUUID(), operation })),
    now: deps.clock(),
  })
}

const DAY = 86_400_000
const daysFrom = (day: Date, days: number): Date => new Date(day.getTime() + days * DAY)
