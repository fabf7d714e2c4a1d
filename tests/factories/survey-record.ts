import type { Survey } from '@shared/schemas/survey'
import { newSurvey } from '@shared/survey/new-survey'
import type { Database } from '../../server/database/client'
import { surveys } from '../../server/database/tables/surveys'
import { digest } from '../../server/features/surveys/survey-document'
import { createJob } from './job'

export type SurveyRow = typeof surveys.$inferSelect

export const emptySurvey = (): Survey => newSurvey('Back deck', { length: 'in', force: 'lbf' })

interface Given {
  companyId?: string
  jobId?: string
  survey?: Survey
}

/** An empty survey, of a new job of a new company unless said otherwise. */
export async function createSurveyRow(database: Database, given: Given = {}): Promise<SurveyRow> {
  const { companyId, id } =
    given.companyId !== undefined && given.jobId !== undefined
      ? { companyId: given.companyId, id: given.jobId }
      : await createJob(database, given.companyId === undefined ? {} : { companyId: given.companyId })
  const [row] = await database
    .insert(surveys)
    .values({ companyId, jobId: id, ...digest(given.survey ?? emptySurvey()) })
    .returning()
  return row!
}
