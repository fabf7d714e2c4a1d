import { readFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { checkSurvey } from '../shared/calculation/checks/check-survey'
import { calculateSurvey } from '../shared/calculation/calculate-survey'
import { starterHardware } from '../shared/calculation/starter-hardware'
import { starterRules } from '../shared/calculation/starter-rules'
import type { CalculationInput } from '../shared/calculation/survey-index'
import { readSurveyFile, SurveyFileError } from '../shared/schemas/survey-file'
import { writeChecks } from './calc/write-checks'
import { writeCutList } from './calc/write-cut-list'

/** Bad input: one sentence per fault. */
class BadInput extends Error {
  constructor(readonly faults: string[]) {
    super(faults.join('\n'))
  }
}

/** What can be calculated, by the name given on the command line. */
const calculations: Record<string, (document: unknown) => unknown> = {
  cutlist: (document) => {
    const input = readInput(document)
    return writeCutList(calculateSurvey(input), input.survey.units)
  },
  checks: (document) => {
    const input = readInput(document)
    return writeChecks(checkSurvey(input), input.survey.units)
  },
}

/** Reads a survey file and fills in the starter hardware and rules where it has none. */
function readInput(document: unknown): CalculationInput {
  const { survey, hardware = starterHardware, rules = starterRules, guardRules } = readSurveyFile(document)
  const cables = new Set(hardware.cables.map(({ id }) => id))
  const faults = survey.runs.flatMap(({ cable }, i) =>
    cables.has(cable)
      ? []
      : [
          `survey.runs[${i}].cable: found ${JSON.stringify(cable)}, expected the id of a cable of the hardware: ${[...cables].join(', ')}`,
        ],
  )
  if (faults.length > 0) throw new BadInput(faults)
  return { survey, hardware, rules, guardRules }
}

/** npm runs its scripts in the package's folder; a relative file is meant from where the command was given. */
const startedIn = process.env['npm_lifecycle_event'] === 'calc' ? process.env['INIT_CWD'] : undefined

function readDocument(file: string): unknown {
  let text: string
  try {
    text = readFileSync(resolve(startedIn ?? '.', file), 'utf8')
  } catch (error) {
    throw new BadInput([
      `${file}: cannot be read (${(error as NodeJS.ErrnoException).code ?? 'unknown error'})`,
    ])
  }
  try {
    return JSON.parse(text.replace(/^\uFEFF/, ''))
  } catch (error) {
    throw new BadInput([`${file}: is not JSON (${(error as Error).message.replace(/\s+/g, ' ')})`])
  }
}

/** Runs one calculation and returns what goes to standard output. @throws BadInput, SurveyFileError */
function calculate([what, file, ...more]: string[]): string {
  const names = Object.keys(calculations).join(', ')
  const usage = `expected: npm run --silent calc -- WHAT FILE.json, WHAT being one of ${names}`
  if (what === undefined || file === undefined || more.length > 0) throw new BadInput([usage])
  const calculation = Object.hasOwn(calculations, what) ? calculations[what] : undefined
  if (!calculation) throw new BadInput([`${what}: unknown calculation, expected one of ${names}`])
  return `${JSON.stringify(calculation(readDocument(file)))}\n`
}

try {
  process.stdout.write(calculate(process.argv.slice(2)))
} catch (error) {
  if (!(error instanceof BadInput) && !(error instanceof SurveyFileError)) throw error
  process.stderr.write(`${error.faults.join('\n')}\n`)
  process.exitCode = 2
}
