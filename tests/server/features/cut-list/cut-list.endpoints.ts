import { parse } from 'csv-parse/sync'
import readWorkbook from 'read-excel-file/node'
import { expect } from 'vitest'
import { surveys } from '@shared/endpoints/surveys'
import type { EndpointCase } from '../../../support/endpoint-cases'
import { surveyHere } from '../../../support/survey-here'

/** The worked example’s lengths by the starter hardware: its short sleeve is the same, and no cut depends on stiffness. */
const cuts = { 10: 95.75, 11: 95.8125 }

export const cases: EndpointCase[] = [
  {
    endpoint: surveys.exportWorkbook,
    request: async (scene) => ({ params: await surveyHere(scene) }),
    works: async ({ answer }) => {
      const sheets = await readWorkbook(answer.body as Buffer)
      expect(sheets.map(({ sheet }) => sheet)).toEqual(['Cut list', 'Fittings to pick', 'Findings'])
      const rows = sheets[0]?.data ?? []
      expect([rows[10]?.[4], rows[11]?.[4]]).toEqual([cuts[10], cuts[11]])
      expect(answer.headers['content-disposition']).toBe('attachment; filename="cut-list-1-two-bays-r0.xlsx"')
      expect(answer.headers['cache-control']).toBe('private, no-store')
    },
    otherCompany: 'not found',
  },
  {
    endpoint: surveys.exportCsv,
    request: async (scene) => ({ params: await surveyHere(scene) }),
    works: ({ answer }) => {
      const rows: Record<string, string>[] = parse(answer.body as Buffer, { bom: true, columns: true })
      expect(rows).toHaveLength(11)
      expect(rows[9]?.['cut_or_shop_length_in']).toBe(String(cuts[10]))
      expect(rows[10]?.['cut_or_shop_length_in']).toBe(String(cuts[11]))
      expect(answer.headers['content-disposition']).toBe('attachment; filename="cut-list-1-two-bays-r0.csv"')
    },
    otherCompany: 'not found',
  },
]
