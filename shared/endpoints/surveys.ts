import { z } from 'zod'
import { keySchema } from '../schemas/id'
import { photoRecordSchema, surveyRecordSchema } from '../schemas/survey-record'
import { surveyOperationSchema } from '../survey/survey-operation'
import { endpoint } from './endpoint'

const job = z.object({ jobId: keySchema })
const survey = z.object({ surveyId: keySchema })
const photo = z.object({ photoId: keySchema })

/** One gesture, under an id made where it happened: sent twice, it is done once. */
export const surveyChangeSchema = z.object({ id: keySchema, operation: surveyOperationSchema })
export type SurveyChange = z.infer<typeof surveyChangeSchema>

export const changeSurveyBodySchema = z.object({
  /** The revision these changes were made on; another one on the server answers 409 `survey-moved`. */
  revision: z.int().min(0),
  changes: z.array(surveyChangeSchema).min(1).max(200),
})

export const surveyHistoryEntrySchema = z.object({
  revision: z.int(),
  changeId: keySchema,
  operation: surveyOperationSchema,
  by: z.string(),
  at: z.iso.datetime(),
})
export type SurveyHistoryEntry = z.infer<typeof surveyHistoryEntrySchema>

export const surveys = {
  createSurvey: endpoint({
    id: 'survey.create',
    method: 'POST',
    path: '/api/jobs/:jobId/surveys',
    gate: 'survey:edit',
    summary: 'Begin an empty survey in a job.',
    params: job,
    body: z.object({ title: z.string().trim().min(1, 'Write a title, such as Back deck.').max(120) }),
    response: surveyRecordSchema,
    status: 201,
  }),
  importSurvey: endpoint({
    id: 'survey.import',
    method: 'POST',
    path: '/api/jobs/:jobId/surveys/import',
    gate: 'survey:edit',
    summary: 'Begin a survey from a survey file; everything is checked before anything is written.',
    params: job,
    body: z.unknown(),
    response: z.object({ survey: surveyRecordSchema, notes: z.array(z.string()) }),
    status: 201,
  }),
  readSurvey: endpoint({
    id: 'survey.read',
    method: 'GET',
    path: '/api/surveys/:surveyId',
    gate: 'survey:read',
    summary: 'One survey with its photos.',
    params: survey,
    response: surveyRecordSchema,
  }),
  changeSurvey: endpoint({
    id: 'survey.change',
    method: 'POST',
    path: '/api/surveys/:surveyId/changes',
    gate: 'survey:edit',
    summary: 'Apply changes in order, all or none.',
    params: survey,
    body: changeSurveyBodySchema,
    response: z.object({ revision: z.int() }),
  }),
  removeSurvey: endpoint({
    id: 'survey.remove',
    method: 'DELETE',
    path: '/api/surveys/:surveyId',
    gate: 'survey:remove',
    summary: 'Put a survey away; its history stays.',
    params: survey,
  }),
  readHistory: endpoint({
    id: 'survey.history',
    method: 'GET',
    path: '/api/surveys/:surveyId/history',
    gate: 'survey:read',
    summary: 'Every change of a survey, newest first, a page at a time.',
    params: survey,
    query: z.object({
      before: z.coerce.number().int().optional(),
      limit: z.coerce.number().int().min(1).max(200).default(100),
    }),
    response: z.object({ entries: z.array(surveyHistoryEntrySchema), next: z.int().nullable() }),
  }),
  addPhoto: endpoint({
    id: 'photo.add',
    method: 'POST',
    path: '/api/surveys/:surveyId/photos',
    gate: 'survey:edit',
    summary: 'Store a photo (multipart field `photo`); mark it afterwards with a `photo.add` operation.',
    params: survey,
    upload: 'multipart',
    response: photoRecordSchema,
    status: 201,
  }),
  readPicture: endpoint({
    id: 'photo.picture',
    method: 'GET',
    path: '/api/photos/:photoId/picture',
    gate: 'survey:read',
    summary: 'The upright picture, at most 2560 px.',
    params: photo,
    file: 'image/jpeg',
  }),
  readThumbnail: endpoint({
    id: 'photo.thumbnail',
    method: 'GET',
    path: '/api/photos/:photoId/thumbnail',
    gate: 'survey:read',
    summary: 'A small upright picture.',
    params: photo,
    file: 'image/jpeg',
  }),
  exportSurveyFile: endpoint({
    id: 'survey.file',
    method: 'GET',
    path: '/api/surveys/:surveyId/survey-file',
    gate: 'survey:read',
    summary: 'The survey file, with the company’s hardware and house rules, in the survey’s units.',
    params: survey,
    file: 'application/json',
  }),
  exportWorkbook: endpoint({
    id: 'cut-list.xlsx',
    method: 'GET',
    path: '/api/surveys/:surveyId/cut-list.xlsx',
    gate: 'cut-list:read',
    summary: 'The cut list as a workbook: cut list, fittings to pick, findings.',
    params: survey,
    file: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  }),
  exportGuardSummary: endpoint({
    id: 'guard-summary.pdf',
    method: 'GET',
    path: '/api/surveys/:surveyId/guard-summary.pdf',
    gate: 'survey:read',
    summary: 'One page for the inspector: heights, openings, spacing, cables, loads, assumptions, cautions.',
    params: survey,
    file: 'application/pdf',
  }),
  exportCsv: endpoint({
    id: 'cut-list.csv',
    method: 'GET',
    path: '/api/surveys/:surveyId/cut-list.csv',
    gate: 'cut-list:read',
    summary: 'The cut list as comma-separated values.',
    params: survey,
    file: 'text/csv',
  }),
}
