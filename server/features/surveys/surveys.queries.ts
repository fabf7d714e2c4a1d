import { and, asc, desc, eq, inArray, isNull, lt, sql } from 'drizzle-orm'
import type { Database } from '../../database/client'
import { jobs } from '../../database/tables/jobs'
import { surveyChanges, surveys } from '../../database/tables/surveys'

export interface SurveyKey {
  companyId: string
  surveyId: string
}

export type SurveyRow = typeof surveys.$inferSelect
export type ChangeRow = typeof surveyChanges.$inferSelect
/** What lists show of a survey, kept beside its document. */
export type SurveyDigest = Pick<SurveyRow, 'document' | 'title' | 'posts' | 'bays' | 'gaps' | 'firstPhoto'>

const there = ({ companyId, surveyId }: SurveyKey) =>
  and(eq(surveys.companyId, companyId), eq(surveys.id, surveyId), isNull(surveys.removedAt))

/** The survey with the number and title of its job; none once it is put away. */
export async function selectSurvey(database: Database, key: SurveyKey) {
  const [row] = await database
    .select({ survey: surveys, jobNumber: jobs.number, jobTitle: jobs.title })
    .from(surveys)
    .innerJoin(jobs, and(eq(jobs.companyId, surveys.companyId), eq(jobs.id, surveys.jobId)))
    .where(there(key))
  return row
}

/** The survey, held until the transaction ends, so that changes come one after another. */
export async function lockSurvey(transaction: Database, key: SurveyKey): Promise<SurveyRow | undefined> {
  const [row] = await transaction.select().from(surveys).where(there(key)).for('update')
  return row
}

export async function jobExists(
  database: Database,
  { companyId, jobId }: { companyId: string; jobId: string },
): Promise<boolean> {
  const rows = await database
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.companyId, companyId), eq(jobs.id, jobId)))
  return rows.length > 0
}

export async function insertSurvey(
  database: Database,
  survey: SurveyDigest & { companyId: string; jobId: string },
): Promise<string> {
  const [row] = await database.insert(surveys).values(survey).returning({ id: surveys.id })
  if (!row) throw new Error('A survey was inserted and no row came back.')
  return row.id
}

export async function updateSurvey(
  database: Database,
  key: SurveyKey,
  changes: Partial<SurveyDigest> & { revision?: number; removedAt?: Date },
): Promise<number> {
  const rows = await database
    .update(surveys)
    .set({ ...changes, updatedAt: new Date() })
    .where(there(key))
    .returning({ id: surveys.id })
  return rows.length
}

/** Which of these changes the survey has seen. */
export async function selectSeenChanges(
  database: Database,
  { companyId, surveyId }: SurveyKey,
  changeIds: string[],
): Promise<Map<string, number>> {
  const rows = await database
    .select({ changeId: surveyChanges.changeId, revision: surveyChanges.revision })
    .from(surveyChanges)
    .where(
      and(
        eq(surveyChanges.companyId, companyId),
        eq(surveyChanges.surveyId, surveyId),
        inArray(surveyChanges.changeId, changeIds),
      ),
    )
  return new Map(rows.map(({ changeId, revision }) => [changeId, revision]))
}

export async function insertChanges(database: Database, changes: ChangeRow[]): Promise<void> {
  if (changes.length > 0) await database.insert(surveyChanges).values(changes)
}

/** Changes newest first, below a revision where one is given. */
export const selectHistory = (
  database: Database,
  { companyId, surveyId }: SurveyKey,
  { before, limit }: { before?: number; limit: number },
): Promise<ChangeRow[]> =>
  database
    .select()
    .from(surveyChanges)
    .where(
      and(
        eq(surveyChanges.companyId, companyId),
        eq(surveyChanges.surveyId, surveyId),
        before === undefined ? undefined : lt(surveyChanges.revision, before),
      ),
    )
    .orderBy(desc(surveyChanges.revision))
    .limit(limit)

/** The changes that brought readings of these ids, the oldest first, and who made them. */
export async function selectReadingOperations(
  database: Database,
  { companyId, surveyId }: SurveyKey,
  readingIds: readonly string[],
): Promise<{ operation: unknown; personId: string }[]> {
  if (readingIds.length === 0) return []
  return database
    .select({ operation: surveyChanges.operation, personId: surveyChanges.personId })
    .from(surveyChanges)
    .where(
      and(
        eq(surveyChanges.companyId, companyId),
        eq(surveyChanges.surveyId, surveyId),
        sql`${surveyChanges.operation} ->> 'type' in ('reading.add', 'bay.add', 'run.add', 'group')`,
        // Narrowed by text: the few that name an id elsewhere do no harm.
        sql`exists (select 1 from jsonb_array_elements_text(${JSON.stringify(readingIds)}::jsonb) as wanted
          where position(wanted in ${surveyChanges.operation}::text) > 0)`,
      ),
    )
    .orderBy(surveyChanges.revision)
}

/** The ids of photos that a change has taken out, alone or in a group; a later one may have brought some back. */
export async function selectRemovedPhotoIds(
  database: Database,
  { companyId, surveyId }: SurveyKey,
): Promise<string[]> {
  const rows = await database
    .select({
      ids: sql<string[]>`jsonb_path_query_array(${surveyChanges.operation},
        '$.**{0 to 2} ? (@.type == "photo.remove").id')`,
    })
    .from(surveyChanges)
    .where(
      and(
        eq(surveyChanges.companyId, companyId),
        eq(surveyChanges.surveyId, surveyId),
        sql`position('photo.remove' in ${surveyChanges.operation}::text) > 0`,
      ),
    )
  return rows.flatMap(({ ids }) => ids)
}

/** The picture a list shows: the first one marked, else the first one stored. Named in full: columns inside are not. */
const thumbnailPhotoId = sql<string | null>`(
  select p.id from photos p
  where p.company_id = surveys.company_id and p.survey_id = surveys.id
  order by (p.survey_photo_id is not distinct from surveys.first_photo) desc, p.created_at, p.survey_photo_id
  limit 1)`

export const selectJobSurveys = (
  database: Database,
  { companyId, jobId }: { companyId: string; jobId: string },
) =>
  database
    .select({
      id: surveys.id,
      jobId: surveys.jobId,
      title: surveys.title,
      revision: surveys.revision,
      posts: surveys.posts,
      bays: surveys.bays,
      gaps: surveys.gaps,
      thumbnailPhotoId,
      updatedAt: surveys.updatedAt,
    })
    .from(surveys)
    .where(and(eq(surveys.companyId, companyId), eq(surveys.jobId, jobId), isNull(surveys.removedAt)))
    .orderBy(asc(surveys.createdAt), asc(surveys.id))
