import type { Router } from 'express'
import { surveys } from '@shared/endpoints/surveys'
import { documentFileName } from '../../documents/file-name'
import { sendFile } from '../../http/send-file'
import { type Call, route } from '../../http/route'
import type { Services } from '../../services'
import { changeSurvey } from './change-survey.service'
import { exportSurveyFile } from './export-survey.service'
import { importSurvey } from './import-survey.service'
import { createSurvey, readHistory, readSurvey, removeSurvey } from './surveys.service'

export function surveysRoutes(router: Router, services: Services): void {
  const at = { router, services }
  const { database, clock } = services
  route(at, surveys.createSurvey, ({ companyId, params, body, person }) =>
    createSurvey(database, {
      companyId,
      jobId: params.jobId,
      title: body.title,
      units: person.company.units,
    }),
  )
  route(at, surveys.importSurvey, ({ companyId, params, body, person }) =>
    importSurvey(database, { companyId, jobId: params.jobId, person, input: body, now: clock() }),
  )
  route(at, surveys.readSurvey, (call) => readSurvey(database, key(call)))
  route(at, surveys.changeSurvey, (call) =>
    changeSurvey(database, { survey: key(call), person: call.person, ...call.body, now: clock() }),
  )
  route(at, surveys.removeSurvey, async (call) => {
    await removeSurvey(database, key(call), clock())
    return undefined
  })
  route(at, surveys.readHistory, (call) => readHistory(database, key(call), call.query))
  route(at, surveys.exportSurveyFile, async (call) => {
    const { record, file } = await exportSurveyFile(database, key(call))
    const name = documentFileName(['survey', record.jobNumber, record.survey.title], 'json')
    sendFile(call.response, { name, type: 'application/json', bytes: JSON.stringify(file, null, 2) })
    return undefined
  })
}

type SurveyCall = Pick<Call<{ surveyId: string }, unknown, unknown>, 'companyId' | 'params'>
const key = ({ companyId, params }: SurveyCall) => ({ companyId, surveyId: params.surveyId })
