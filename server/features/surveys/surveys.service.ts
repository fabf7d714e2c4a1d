import type { SurveyHistoryEntry } from '@shared/endpoints/surveys'
import type { Units } from '@shared/schemas/quantities'
import type { SurveyRecord, SurveySummary } from '@shared/schemas/survey-record'
import { newSurvey } from '@shared/survey/new-survey'
import { surveyOperationSchema } from '@shared/survey/survey-operation'
import type { Database } from '../../database/client'
import { listPhotos } from '../photos/photo-records.service'
import { digest, readDocument } from './survey-document'
import { noSuchJob, noSuchSurvey } from './surveys.errors'
import {
  insertSurvey,
  jobExists,
  selectHistory,
  selectJobSurveys,
  selectSurvey,
  type SurveyKey,
  updateSurvey,
} from './surveys.queries'

/** Begins an empty survey in a job, in the company's units. */
export async function createSurvey(
  database: Database,
  { companyId, jobId, title, units }: { companyId: string; jobId: string; title: string; units: Units },
): Promise<SurveyRecord> {
  if (!(await jobExists(database, { companyId, jobId }))) throw noSuchJob()
  const survey = newSurvey(title, units)
  const surveyId = await insertSurvey(database, { companyId, jobId, ...digest(survey) })
  return readSurvey(database, { companyId, surveyId })
}

/** A survey with its photos and the job it belongs to. */
export async function readSurvey(database: Database, key: SurveyKey): Promise<SurveyRecord> {
  const row = await selectSurvey(database, key)
  if (!row) throw noSuchSurvey()
  return {
    id: row.survey.id,
    jobId: row.survey.jobId,
    jobNumber: row.jobNumber,
    jobTitle: row.jobTitle,
    revision: row.survey.revision,
    survey: readDocument(row.survey.document),
    photos: await listPhotos(database, key),
    updatedAt: row.survey.updatedAt.toISOString(),
  }
}

/** Puts a survey away; its history and photos stay in the database. */
export async function removeSurvey(database: Database, key: SurveyKey, now: Date): Promise<void> {
  if ((await updateSurvey(database, key, { removedAt: now })) === 0) throw noSuchSurvey()
}

/** The surveys of a job as lists show them, without opening a document. */
export async function listJobSurveys(
  database: Database,
  job: { companyId: string; jobId: string },
): Promise<SurveySummary[]> {
  const rows = await selectJobSurveys(database, job)
  return rows.map((row) => ({ ...row, updatedAt: row.updatedAt.toISOString() }))
}

/** The largest number that the database's revision can hold. */
const MAX_REVISION = 2_147_483_647

/** A page of a survey's changes, the newest first. */
export async function readHistory(
  database: Database,
  key: SurveyKey,
  page: { before?: number; limit: number },
): Promise<{ entries: SurveyHistoryEntry[]; next: number | null }> {
  if (!(await selectSurvey(database, key))) throw noSuchSurvey()
  const before = page.before === undefined ? undefined : Math.min(page.before, MAX_REVISION)
  const rows = await selectHistory(database, key, { before, limit: page.limit + 1 })
  const entries = rows
    .slice(0, page.limit)
    .map(({ revision, changeId, operation, personName, at }): SurveyHistoryEntry => ({
      revision,
      changeId,
      operation: surveyOperationSchema.parse(operation),
      by: personName,
      at: at.toISOString(),
    }))
  return { entries, next: rows.length > page.limit ? (entries.at(-1)?.revision ?? null) : null }
}
