import type { z } from 'zod'
import type { ReadingOwner } from '@shared/survey/survey-operation'
import type { OperationRefused } from '@shared/survey/operation-refused'
import type { SurveyTooNew } from '@shared/survey/survey-versions'
import { AppError, notFound } from '../../errors'

export const noSuchSurvey = () => notFound('survey')
export const noSuchJob = () => notFound('job')

/** The revision stands in the sentence for people and in a field for programs. */
export const surveyMoved = (revision: number) =>
  new AppError(
    409,
    'survey-moved',
    `The survey has been changed elsewhere and is now at revision ${revision}. Load it again and repeat the change.`,
    { fields: [{ path: 'revision', message: String(revision) }] },
  )

export const operationRefused = (refused: OperationRefused, changeId: string) =>
  new AppError(422, `operation-${refused.code}`, refused.message, {
    fields: [{ path: `changes.${changeId}`, message: refused.message }],
    cause: refused,
  })

/** The operations fit one by one, yet what they leave is no survey. */
export const surveyInvalid = (error: z.ZodError) => {
  const fields = error.issues.map(({ path, message }) => ({ path: path.join('.'), message }))
  const first = fields[0]
  return new AppError(
    422,
    'survey-invalid',
    `The survey would not hold together after this change: ${first?.path ?? 'survey'}: ${first?.message ?? 'not valid'}.`,
    { fields },
  )
}

/** Readings are struck and taken again, never altered. */
export const readingChanged = ({ kind, id: owner }: ReadingOwner, id: string) =>
  new AppError(
    422,
    'reading-changed',
    `Reading ${id} of ${kind} ${owner} was taken before with another figure. Strike it with a reason, and take a new reading.`,
  )

export const notYourReading = ({ kind, id }: ReadingOwner) =>
  new AppError(
    403,
    'not-your-reading',
    `Only who took a reading of ${kind} ${id} can take it back. Strike it with a reason instead; it stays legible.`,
  )

export const mayNotOverrule = () =>
  new AppError(
    403,
    'may-not-overrule',
    'Only an owner or estimator can let a stop pass, or make it stand again. Tell one of them what you found.',
  )

export const cannotBeOverruled = () =>
  new AppError(
    422,
    'cannot-be-overruled',
    'This stop says that something is missing or cannot be cut, which no reason changes. Go to its place and complete it.',
  )

export const cableNotInCatalogue = (runs: readonly { id: string; cable: string }[]) => {
  const cables = [...new Set(runs.map(({ cable }) => cable))].join(', ')
  const where = runs.map(({ id }) => id).join(', ')
  return new AppError(
    422,
    'cable-not-in-catalogue',
    `Run ${where} uses the cable ${cables}, which your hardware does not have. Add that cable under Hardware, or choose another for the run.`,
    {
      fields: runs.map(({ id, cable }) => ({
        path: `survey.runs.${id}.cable`,
        message: `found "${cable}", expected the id of a cable of your hardware`,
      })),
    },
  )
}

/** Every fault of a survey file, one sentence each: path, value, what was expected. */
export const surveyFileFaults = (faults: readonly string[]) =>
  new AppError(
    422,
    'survey-file-invalid',
    faults.length === 1
      ? `The survey file has a fault and nothing was imported. ${faults[0]}.`
      : `The survey file has ${faults.length} faults and nothing was imported. Correct them and import it again.`,
    {
      fields: faults.map((fault) => {
        const end = fault.indexOf(': ')
        return { path: fault.slice(0, Math.max(end, 0)), message: fault.slice(end < 0 ? 0 : end + 2) }
      }),
    },
  )

export const surveyTooNew = (error: SurveyTooNew) =>
  new AppError(
    422,
    'survey-too-new',
    `The survey file was written by a newer program (format ${error.version}). Ask whoever sent it for an older format, or update this server.`,
    { cause: error },
  )
