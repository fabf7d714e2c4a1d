import type { SurveyChange } from '@shared/endpoints/surveys'
import type { Role } from '@shared/permissions/roles'
import { type Survey, surveySchema } from '@shared/schemas/survey'
import { applyOperation } from '@shared/survey/apply-operation'
import { OperationRefused } from '@shared/survey/operation-refused'
import { surveyOperationSchema } from '@shared/survey/survey-operation'
import type { Database } from '../../database/client'
import { listHardware } from '../hardware/hardware.service'
import { KnownReadings, readingIdsIn } from './known-readings'
import { stampOverrules } from './stamp-overrules'
import { type Stamp, stampReadings } from './stamp-readings'
import { digest, readDocument } from './survey-document'
import {
  cableNotInCatalogue,
  noSuchSurvey,
  operationRefused,
  surveyInvalid,
  surveyMoved,
} from './surveys.errors'
import {
  insertChanges,
  lockSurvey,
  selectReadingOperations,
  selectSeenChanges,
  type SurveyKey,
  updateSurvey,
} from './surveys.queries'

export interface ChangeRequest {
  survey: SurveyKey
  person: { id: string; name: string; roles: readonly Role[] }
  /** The revision the changes were made on. */
  revision: number
  changes: SurveyChange[]
  now: Date
}

/**
 * Applies changes to a survey in order, all or none: those it has seen are skipped, each other one makes a revision
 * and is added to the history. The survey is held meanwhile, so that two senders take turns.
 */
export async function changeSurvey(
  database: Database,
  request: ChangeRequest,
): Promise<{ revision: number }> {
  return database.transaction(async (transaction) => {
    const row = await lockSurvey(transaction, request.survey)
    if (!row) throw noSuchSurvey()
    const fresh = await unseen(transaction, request, row.revision)
    if (fresh.length === 0) return { revision: row.revision }
    const stamped = await stampAll(transaction, request, fresh)
    const present = readDocument(row.document)
    const survey = applyAll(present, stamped)
    await assertCables(transaction, request.survey.companyId, { present, survey })
    const revision = row.revision + stamped.length
    await updateSurvey(transaction, request.survey, { ...digest(survey), revision })
    await insertChanges(transaction, toHistory(request, stamped, row.revision))
    return { revision }
  })
}

/** The changes that are new here. @throws `survey-moved` when anything else has happened since they were made. */
async function unseen(
  transaction: Database,
  { survey, revision, changes }: ChangeRequest,
  present: number,
): Promise<SurveyChange[]> {
  const seen = await selectSeenChanges(
    transaction,
    survey,
    changes.map(({ id }) => id),
  )
  const fresh = changes.filter(({ id }, i) => !seen.has(id) && changes.findIndex((c) => c.id === id) === i)
  // A repeated request names the revision of its first sending: what it has itself done since does not count.
  const ownSteps = [...seen.values()].filter((made) => made > revision).length
  if (fresh.length > 0 && present !== revision + ownSteps) throw surveyMoved(present)
  return fresh
}

async function stampAll(
  transaction: Database,
  { survey, person, now }: ChangeRequest,
  changes: SurveyChange[],
): Promise<SurveyChange[]> {
  const ids = changes.flatMap(({ operation }) => readingIdsIn(operation))
  const history = await selectReadingOperations(transaction, survey, ids)
  const known = new KnownReadings(
    history.map(({ operation, personId }) => ({
      operation: surveyOperationSchema.parse(operation),
      personId,
    })),
  )
  const stamp: Stamp = { person, now, known }
  return changes.map(({ id, operation }) => ({
    id,
    operation: stampReadings(stampOverrules(operation, { person, now }), stamp),
  }))
}

function applyAll(survey: Survey, changes: SurveyChange[]): Survey {
  let changed = survey
  for (const { id, operation } of changes) {
    try {
      changed = applyOperation(changed, operation)
    } catch (error) {
      if (error instanceof OperationRefused) throw operationRefused(error, id)
      throw error
    }
  }
  const checked = surveySchema.safeParse(changed)
  if (!checked.success) throw surveyInvalid(checked.error)
  return checked.data
}

/** Runs may be given only cables of the company's catalogue, retired ones too: they may come from an older device. */
async function assertCables(
  database: Database,
  companyId: string,
  { present, survey }: { present: Survey; survey: Survey },
): Promise<void> {
  const before = new Set(present.runs.map(({ cable }) => cable))
  const given = survey.runs.filter(({ cable }) => !before.has(cable))
  if (given.length === 0) return
  const { cables } = await listHardware({ database, companyId })
  const known = new Set(cables.map(({ cable }) => cable.id))
  const unknown = given.filter(({ cable }) => !known.has(cable))
  if (unknown.length > 0) throw cableNotInCatalogue(unknown)
}

const toHistory = ({ survey, person, now }: ChangeRequest, changes: SurveyChange[], from: number) =>
  changes.map(({ id, operation }, i) => ({
    ...survey,
    revision: from + i + 1,
    changeId: id,
    operation,
    personId: person.id,
    personName: person.name,
    at: now,
  }))
