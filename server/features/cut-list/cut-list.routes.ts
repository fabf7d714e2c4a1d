import type { Router } from 'express'
import { surveys } from '@shared/endpoints/surveys'
import { cutListCsv } from '../../documents/csv/cut-list-csv'
import type { CutListDocument } from '../../documents/cut-list-document'
import { documentFileName } from '../../documents/file-name'
import { cutListWorkbook } from '../../documents/xlsx/cut-list-workbook'
import { type Call, route } from '../../http/route'
import { sendFile } from '../../http/send-file'
import type { Services } from '../../services'
import { readCutList } from './cut-list.service'

export function cutListRoutes(router: Router, services: Services): void {
  const at = { router, services }
  route(at, surveys.exportWorkbook, async (call) => {
    const document = await cutList(call)
    const bytes = await cutListWorkbook(document)
    sendFile(call.response, { name: fileName(document, 'xlsx'), type: WORKBOOK, bytes })
    return undefined
  })
  route(at, surveys.exportCsv, async (call) => {
    const document = await cutList(call)
    const bytes = Buffer.from(cutListCsv(document))
    sendFile(call.response, { name: fileName(document, 'csv'), type: 'text/csv; charset=utf-8', bytes })
    return undefined
  })
}

const cutList = ({ services, person, params }: Call<{ surveyId: string }, undefined, undefined>) =>
  readCutList(services.database, {
    company: person.company,
    surveyId: params.surveyId,
    now: services.clock(),
  })

const WORKBOOK = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet'

/** With the revision, so that two downloads of one survey can be told apart. */
const fileName = (document: CutListDocument, extension: string): string =>
  documentFileName(['cut list', document.jobNumber, document.surveyTitle, `r${document.revision}`], extension)
