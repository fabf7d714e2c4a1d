import { type Survey, surveySchema } from '@shared/schemas/survey'
import { findGaps } from '@shared/survey/find-gaps'
import { upgradeSurvey } from '@shared/survey/survey-versions'
import type { SurveyDigest } from './surveys.queries'

/** A stored document as the program knows surveys today; older ones are brought up. */
export const readDocument = (document: unknown): Survey => surveySchema.parse(upgradeSurvey(document))

/** The document with what lists show of it. */
export const digest = (survey: Survey): SurveyDigest => ({
  document: survey,
  title: survey.title,
  posts: survey.posts.length,
  bays: survey.bays.length,
  gaps: findGaps(survey).length,
  firstPhoto: survey.photos[0]?.id ?? null,
})
