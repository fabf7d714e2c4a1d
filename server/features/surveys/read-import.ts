import { readSurveyFile, type SurveyFile, SurveyFileError } from '@shared/schemas/survey-file'
import { SurveyTooNew, upgradeSurvey } from '@shared/survey/survey-versions'
import { cableNotInCatalogue, surveyFileFaults, surveyTooNew } from './surveys.errors'

/**
 * Reads a parsed survey file for a company, without writing anything. @throws an error that lists every fault by path,
 * value and expectation, or that names the cables of runs that the company does not have.
 */
export function readImport(input: unknown, companyCables: ReadonlySet<string>): SurveyFile {
  const file = readFile(input)
  const unknown = file.survey.runs.filter(({ cable }) => !companyCables.has(cable))
  if (unknown.length > 0) throw cableNotInCatalogue(unknown)
  return file
}

function readFile(input: unknown): SurveyFile {
  try {
    return readSurveyFile(hasSurvey(input) ? { ...input, survey: upgradeSurvey(input.survey) } : input)
  } catch (error) {
    if (error instanceof SurveyFileError) throw surveyFileFaults(error.faults)
    if (error instanceof SurveyTooNew) throw surveyTooNew(error)
    throw error
  }
}

const hasSurvey = (input: unknown): input is { survey: unknown } =>
  typeof input === 'object' && input !== null && !Array.isArray(input) && 'survey' in input
