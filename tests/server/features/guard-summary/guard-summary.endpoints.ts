import { expect } from 'vitest'
import { surveys } from '@shared/endpoints/surveys'
import type { EndpointCase } from '../../../support/endpoint-cases'
import { pdfText } from '../../../support/pdf-text'
import { surveyHere } from '../../../support/survey-here'

export const cases: EndpointCase[] = [
  {
    endpoint: surveys.exportGuardSummary,
    request: async (scene) => ({ params: await surveyHere(scene) }),
    works: async ({ answer, scene }) => {
      const [text = ''] = await pdfText(answer.body as Buffer)
      expect(text).toContain('Guard summary')
      expect(text).toContain(scene.here.company.name)
      expect(text).toContain('International Residential Code 2021')
      expect(answer.headers['content-disposition']).toBe(
        'attachment; filename="guard-summary-1-two-bays-r0.pdf"',
      )
      expect(answer.headers['cache-control']).toBe('private, no-store')
    },
    otherCompany: 'not found',
  },
]
