import { SURVEY_VERSION } from '../schemas/survey'

type Document = Readonly<Record<string, unknown>>

/** One change of the survey's format, named for what it does. Steps are added at the end and never edited. */
export interface VersionStep {
  name: string
  /** The version it makes, one more than it takes. */
  to: number
  /** Takes the survey as the version before wrote it, in whatever units; returns it as this version writes it. */
  up: (survey: Document) => Document
}

/** Every step there has been since version 1. */
export const versionSteps: readonly VersionStep[] = []

/** A survey written by a newer program than this one. */
export class SurveyTooNew extends Error {
  constructor(readonly version: number) {
    super(
      `This survey was written by a newer Tautbook (format ${version}; this one reads up to ${SURVEY_VERSION}). Load the page again to get the newer one.`,
    )
    this.name = 'SurveyTooNew'
  }
}

/**
 * A stored survey as this program writes it, whatever version wrote it. What is no survey, or has no version, is given
 * back as it is: the schema says what is wrong with it.
 * @throws SurveyTooNew when a newer program wrote it.
 */
export function upgradeSurvey(document: unknown, steps: readonly VersionStep[] = versionSteps): unknown {
  if (!hasVersion(document)) return document
  const latest = steps.at(-1)?.to ?? SURVEY_VERSION
  if (document.version > latest) throw new SurveyTooNew(document.version)
  return steps
    .filter(({ to }) => to > document.version)
    .reduce<Document>((survey, { to, up }) => ({ ...up(survey), version: to }), document)
}

const hasVersion = (document: unknown): document is Document & { version: number } =>
  typeof document === 'object' &&
  document !== null &&
  'version' in document &&
  typeof document.version === 'number'
