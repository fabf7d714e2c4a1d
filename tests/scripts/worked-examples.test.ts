import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { starterRules } from '@shared/calculation/starter-rules'
import { readSurveyFile } from '@shared/schemas/survey-file'
import { writeCutList } from '../../scripts/calc/write-cut-list'

const folder = new URL('../worked-examples/', import.meta.url)
const read = (path: string): unknown => JSON.parse(readFileSync(new URL(path, folder), 'utf8'))
const names = readdirSync(new URL('in/', folder))

interface Answer {
  cables: Record<string, string | number>[]
  findings: { level: string; code: string; where: string }[]
}

/**
 * The answers were worked out apart from this program: in decimal arithmetic of forty digits and the file's own units,
 * from the description of the calculation, to ten places.
 */
describe.each(names)('%s', (name) => {
  const expected = read(`out/${name}`) as Answer
  const { survey, hardware = starterHardware, rules = starterRules } = readSurveyFile(read(`in/${name}`))
  const written = writeCutList(calculateSurvey({ survey, hardware, rules }), survey.units)
  const answer = JSON.parse(JSON.stringify(written)) as Answer

  it('gives every cable its figures, and no key more', () => {
    expect(answer.cables.map((cable) => Object.keys(cable).sort())).toEqual(
      expected.cables.map((cable) => Object.keys(cable).sort()),
    )
    for (const [i, cable] of expected.cables.entries()) {
      for (const [key, value] of Object.entries(cable)) {
        const found = answer.cables[i]?.[key]
        if (typeof value === 'number') expect(found, `${i} ${key}`).toBeCloseTo(value, 8)
        else expect(found, `${i} ${key}`).toBe(value)
      }
    }
  })

  it('notices what is to be noticed', () => {
    expect(answer.findings.map(({ level, code, where }) => ({ level, code, where }))).toEqual(
      expected.findings,
    )
    for (const finding of answer.findings)
      expect(Object.keys(finding)).toEqual(['level', 'code', 'where', 'text'])
  })
})
