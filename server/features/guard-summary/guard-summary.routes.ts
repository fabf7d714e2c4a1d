import type { Router } from 'express'
import { surveys } from '@shared/endpoints/surveys'
import { documentFileName } from '../../documents/file-name'
import { guardSummaryPdf } from '../../documents/pdf/guard-summary'
import { route } from '../../http/route'
import { sendFile } from '../../http/send-file'
import type { Services } from '../../services'
import { readGuardSummary } from './guard-summary.service'

export function guardSummaryRoutes(router: Router, services: Services): void {
  const at = { router, services }
  route(at, surveys.exportGuardSummary, async ({ person, params, response }) => {
    const document = await readGuardSummary(services.database, {
      company: person.company,
      surveyId: params.surveyId,
      now: services.clock(),
    })
    const { jobNumber, survey, revision } = document
    const name = documentFileName(['guard summary', jobNumber, survey.title, `r${revision}`], 'pdf')
    sendFile(response, { name, type: 'application/pdf', bytes: await guardSummaryPdf(document) })
    return undefined
  })
}
