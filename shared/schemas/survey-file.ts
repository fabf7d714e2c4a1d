import { z } from 'zod'
import { describeIssues } from './describe-issue'
import { makeGuardRulesSchema } from './guard-rules'
import { makeHardwareSchema } from './hardware'
import { makeHouseRulesSchema } from './house-rules'
import { type Quantities, quantitiesIn, storedQuantities, type Units, unitsSchema } from './quantities'
import { makeSurveySchema } from './survey'

/** The survey file: a survey, and the hardware and rules it is to be calculated with where they are not the starters. */
export const makeSurveyFileSchema = (q: Quantities) =>
  z
    .strictObject({
      survey: makeSurveySchema(q),
      hardware: makeHardwareSchema(q).optional(),
      rules: makeHouseRulesSchema(q).optional(),
      /** Own guard rules that the survey names; published ones need not be given. */
      guardRules: z.array(makeGuardRulesSchema(q)).max(50).optional(),
    })
    .superRefine(({ survey, hardware }, context) => {
      if (!hardware) return
      const cables = new Set(hardware.cables.map((cable) => cable.id))
      survey.runs.forEach((run, i) => {
        if (cables.has(run.cable)) return
        const path = ['survey', 'runs', i, 'cable']
        context.addIssue({
          code: 'custom',
          path,
          input: run.cable,
          message: 'expected the id of a cable of the hardware',
        })
      })
    })

export type SurveyFile = z.infer<ReturnType<typeof makeSurveyFileSchema>>

const unitsOnly = z.object({ survey: z.object({ units: unitsSchema }) })

export class SurveyFileError extends Error {
  /** One sentence per fault: path, value, what was expected. */
  constructor(readonly faults: string[]) {
    super(faults.join('\n'))
    this.name = 'SurveyFileError'
  }
}

/** Reads a parsed survey file in its own units. @throws SurveyFileError naming path, value and expectation of every fault. */
export function readSurveyFile(input: unknown): SurveyFile {
  const units = unitsOnly.safeParse(input)
  if (!units.success) throw new SurveyFileError(describeIssues(units.error.issues, input))
  const parsed = makeSurveyFileSchema(quantitiesIn(units.data.survey.units)).safeParse(input)
  if (!parsed.success) throw new SurveyFileError(describeIssues(parsed.error.issues, input))
  return parsed.data
}

/** Writes a survey file in the units its survey names; the inverse of `readSurveyFile`. */
export const writeSurveyFile = (file: SurveyFile): unknown =>
  z.encode(makeSurveyFileSchema(quantitiesIn(file.survey.units)), file)

/** The survey file as JSON Schema (2020-12), for files in these units. */
export const surveyFileJsonSchema = (units: Units): unknown =>
  z.toJSONSchema(makeSurveyFileSchema(quantitiesIn(units)), { io: 'input' })

/** The same document in the program's own units, for what is stored and sent. */
export const storedSurveyFileSchema = makeSurveyFileSchema(storedQuantities)
